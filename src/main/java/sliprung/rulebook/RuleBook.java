package sliprung.rulebook;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import sliprung.starter.AcceptedDeviation;

/** Asks every rule, applies the accepted deviations, and says what could not be judged. */
public final class RuleBook {

  /** Rules that must be judged: without them no review reads clear. */
  public static final List<String> MUST_JUDGE =
      List.of(
          "trip/start",
          "held/exposure",
          "locked/sequence",
          "contactor/breaking",
          "resistor/start",
          "sequence/supervision");

  /** What the catalogue says of accepted deviations, which the engine answers itself. */
  public static final Rule.Info ACCEPTED = Acceptance.INFO;

  private final List<Rule> rules;

  /** A book of these rules. */
  public RuleBook(List<Rule> rules) {
    this.rules = List.copyOf(rules);
  }

  /**
   * Every answer.
   *
   * @param findings worst first, then thinnest margin, then name and subject
   * @param notApplicable reason by rule
   * @param mustJudgeMissing must-judge rules that were not judged, sorted
   */
  public record Answers(
      List<Finding> findings,
      TreeMap<String, String> notApplicable,
      List<String> mustJudgeMissing) {}

  /** Asks every rule about the facts, at a date for the accepted deviations. */
  public Answers ask(Facts facts, LocalDate date) {
    List<Finding> findings = new ArrayList<>();
    TreeMap<String, String> notApplicable = new TreeMap<>();
    for (Rule rule : rules) {
      Rule.Answer answer = rule.judge(facts);
      if (answer instanceof Rule.Answer.Findings some) {
        findings.addAll(some.findings());
      } else if (answer instanceof Rule.Answer.NotApplicable none) {
        notApplicable.put(rule.info().name(), none.because());
      }
    }
    findings.addAll(DecidingDefaults.findings(facts, rules, findings));
    Acceptance acceptance = new Acceptance(facts, date);
    List<Finding> judged = new ArrayList<>(findings.stream().map(acceptance::apply).toList());
    judged.addAll(acceptance.findings());
    judged.sort(ORDER);
    return new Answers(judged, notApplicable, mustJudgeMissing(judged, notApplicable));
  }

  private static final Comparator<Finding> ORDER =
      Comparator.comparing(Finding::verdict)
          .thenComparingDouble(RuleBook::relativeMargin)
          .thenComparing(Finding::rule)
          .thenComparing(Finding::subject);

  /** Margin over wanted margin; infinite where there is none. */
  public static double relativeMargin(Finding finding) {
    if (finding.margin().isEmpty() || finding.wanted().isEmpty()) {
      return Double.POSITIVE_INFINITY;
    }
    return finding.margin().getAsDouble() / finding.wanted().getAsDouble();
  }

  private List<String> mustJudgeMissing(
      List<Finding> findings, TreeMap<String, String> notApplicable) {
    return MUST_JUDGE.stream()
        .filter(
            name ->
                notApplicable.containsKey(name)
                    || findings.stream().noneMatch(f -> f.rule().equals(name))
                    || findings.stream()
                        .anyMatch(f -> f.rule().equals(name) && f.verdict() == Verdict.NOT_JUDGED))
        .sorted()
        .toList();
  }

  /** The deviation that a finding falls under, if any. */
  static Optional<AcceptedDeviation> matching(Finding finding, List<AcceptedDeviation> accepted) {
    return accepted.stream()
        .filter(a -> a.rule().equals(finding.rule()) && a.subject().equals(finding.subject()))
        .findFirst();
  }
}
