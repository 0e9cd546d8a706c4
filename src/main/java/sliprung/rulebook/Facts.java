package sliprung.rulebook;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.Stream;
import sliprung.machine.Identification;
import sliprung.machine.Machine;
import sliprung.protection.Bands;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Assumption;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/**
 * Everything a rule may look at: computed once, read by all.
 *
 * @param starter what is judged
 * @param practice figures and wanted margins
 * @param machine the circuit
 * @param identification how the circuit was come by
 * @param starts every start at every corner, nominal first
 * @param running the running point at each corner; empty where the motor cannot carry the load
 * @param fastPickUps by device: the least constant current, where it measures, that ever operates
 *     the fast edge, A; a device without one has no entry
 */
public record Facts(
    Starter starter,
    Practice practice,
    Machine machine,
    Identification identification,
    List<ComputedStart> starts,
    Map<Corner, Optional<RunningPoint>> running,
    Map<String, Double> fastPickUps,
    Bands bands) {

  /** Copies the list. */
  public Facts {
    starts = List.copyOf(starts);
  }

  /** Wanted margin of a rule: the user's own, else the practice's. */
  public double wanted(String rule) {
    Double own = starter.margins().get(rule);
    return own != null ? own : practice.figure("wanted." + rule).value();
  }

  /** Permitted starts of every series at every corner. */
  public Stream<ComputedStart> permitted() {
    return starts.stream().filter(s -> !s.scenario().isFault());
  }

  /** Faults of one kind at every corner, from cold and hot. */
  public Stream<ComputedStart> faults(Scenario.Kind kind) {
    return starts.stream().filter(s -> s.scenario().kind() == kind);
  }

  /** Faults of some kinds on one step. */
  public Stream<ComputedStart> faultsOnStep(int step, Predicate<Scenario.Kind> kinds) {
    return starts.stream()
        .filter(s -> kinds.test(s.scenario().kind()) && s.scenario().step() == step);
  }

  /** The start of that scenario and thermal state at a corner. */
  public Optional<ComputedStart> find(Scenario scenario, ComputedStart.From from, Corner corner) {
    return starts.stream()
        .filter(
            s ->
                s.scenario().equals(scenario)
                    && s.from() == from
                    && s.place() == 1
                    && s.corner().equals(corner))
        .findFirst();
  }

  /** The weakest input that a rule's answer rests on, as {@code path: grade}. */
  public String weakestInput(Rule.Info info, String subject) {
    List<String> roots =
        info.inputs().stream().map(path -> path.replace("{subject}", subject)).toList();
    Optional<Assumption> assumed =
        starter.assumptions().stream().filter(a -> underAny(a.path(), roots)).findFirst();
    Optional<Map.Entry<String, EvidenceGrade>> graded =
        starter.evidence().entrySet().stream()
            .filter(e -> underAny(e.getKey(), roots) || anyUnder(roots, e.getKey()))
            .max(Comparator.comparing(Map.Entry::getValue));
    EvidenceGrade common =
        roots.stream().anyMatch(r -> !r.startsWith("motor"))
            ? EvidenceGrade.DRAWING
            : EvidenceGrade.PLATE;
    if (graded.isPresent() && graded.get().getValue().compareTo(EvidenceGrade.TOLD) >= 0) {
      return graded.get().getKey() + ": " + graded.get().getValue().word();
    }
    if (assumed.isPresent()) {
      return assumed.get().path() + ": default " + assumed.get().value();
    }
    if (graded.isPresent() && graded.get().getValue().compareTo(common) >= 0) {
      return graded.get().getKey() + ": " + graded.get().getValue().word();
    }
    return (roots.isEmpty() ? "file" : roots.get(roots.size() - 1)) + ": " + common.word();
  }

  /** Whether one of these paths lies below a path. */
  private static boolean anyUnder(List<String> roots, String path) {
    return roots.stream().anyMatch(root -> root.startsWith(path + "."));
  }

  /** Whether a path is one of these or lies below one. */
  static boolean underAny(String path, List<String> roots) {
    for (String root : roots) {
      if (path.startsWith(root)
          && (path.length() == root.length() || path.charAt(root.length()) == '.')) {
        return true;
      }
    }
    return false;
  }
}
