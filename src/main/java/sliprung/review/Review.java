package sliprung.review;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import sliprung.machine.Identification;
import sliprung.machine.Machine;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.rulebook.resistor.Restart;
import sliprung.starter.Starter;

/**
 * The result of a review.
 *
 * @param starter what was reviewed
 * @param date at which accepted deviations were judged
 * @param machine the circuit it was computed with
 * @param identification how the circuit was come by
 * @param starts every computed start, nominal ones first
 * @param findings worst first, then thinnest margin
 * @param notApplicable rules without a subject, each with its reason
 * @param notBuilt rules of the rule book that this version does not hold
 * @param mustJudgeMissing must-judge rules that could not be judged
 * @param method how the starts were computed; empty where none was
 * @param restarts the earliest restart after a stop, a trip, a held and a locked start; empty where
 *     inputs are missing
 */
public record Review(
    Starter starter,
    LocalDate date,
    Machine machine,
    Identification identification,
    List<ComputedStart> starts,
    List<Finding> findings,
    List<NotApplicable> notApplicable,
    List<String> notBuilt,
    List<String> mustJudgeMissing,
    Optional<RunUpMethod> method,
    List<Restart> restarts) {

  /**
   * A rule without a subject in this starter.
   *
   * @param rule {@code family/slug}
   * @param because why
   */
  public record NotApplicable(String rule, String because) {}

  /** A review without restarts. */
  public Review(
      Starter starter,
      LocalDate date,
      Machine machine,
      Identification identification,
      List<ComputedStart> starts,
      List<Finding> findings,
      List<NotApplicable> notApplicable,
      List<String> notBuilt,
      List<String> mustJudgeMissing,
      Optional<RunUpMethod> method) {
    this(
        starter,
        date,
        machine,
        identification,
        starts,
        findings,
        notApplicable,
        notBuilt,
        mustJudgeMissing,
        method,
        List.of());
  }

  /** A review without the model error. */
  public Review(
      Starter starter,
      LocalDate date,
      Machine machine,
      Identification identification,
      List<ComputedStart> starts,
      List<Finding> findings,
      List<NotApplicable> notApplicable,
      List<String> notBuilt,
      List<String> mustJudgeMissing) {
    this(
        starter,
        date,
        machine,
        identification,
        starts,
        findings,
        notApplicable,
        notBuilt,
        mustJudgeMissing,
        Optional.empty());
  }

  /** Copies the lists. */
  public Review {
    starts = List.copyOf(starts);
    findings = List.copyOf(findings);
    notApplicable = List.copyOf(notApplicable);
    notBuilt = List.copyOf(notBuilt);
    mustJudgeMissing = List.copyOf(mustJudgeMissing);
    restarts = List.copyOf(restarts);
  }

  /** Exit status: 1 a breach that nobody accepted; 4 a must-judge rule not judged; else 0. */
  public int exitStatus() {
    if (findings.stream().anyMatch(f -> f.verdict() == Verdict.BREACH)) {
      return 1;
    }
    return mustJudgeMissing.isEmpty() ? 0 : 4;
  }

  /** The start of that id. */
  public Optional<ComputedStart> start(String id) {
    return starts.stream().filter(s -> s.id().equals(id)).findFirst();
  }
}
