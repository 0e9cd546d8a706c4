package sliprung.protection;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/**
 * A proof of steps: from each closing it waits for the next step contactor to report closed. Use is
 * the longest wait over the time set.
 *
 * <p>Where a contactor is closed that should not be, or every one is, it has nothing to wait for:
 * it is not credited with a welded contactor, shorted rings or a jam while running.
 */
final class StepProofModel implements EdgeModel {
  private static final Set<Scenario.Kind> WAITS_IN =
      EnumSet.of(
          Scenario.Kind.PERMITTED,
          Scenario.Kind.HELD,
          Scenario.Kind.SKIPPED,
          Scenario.Kind.LOCKED,
          Scenario.Kind.LOCKED_STEP);

  private final List<String> contactors;
  private final double setSeconds;

  /**
   * An edge.
   *
   * @param starter with its steps
   * @param setSeconds at this edge
   */
  StepProofModel(Starter starter, double setSeconds) {
    this.contactors = starter.steps().stream().map(Step::contactor).toList();
    this.setSeconds = Math.max(1e-9, setSeconds);
  }

  /** From one closing to the next, or to the end of the history where it never comes, s. */
  private record Wait(double from, double seconds) {}

  /** The longest wait; the first of a length that operates is the one that trips. */
  private Wait deciding(StartHistory history) {
    Wait longest = new Wait(0.0, 0.0);
    double from = 0.0;
    for (String contactor : WAITS_IN.contains(history.scenario().kind()) ? contactors : none()) {
      OptionalDouble closes = closing(history, contactor);
      Wait wait = new Wait(from, closes.orElse(history.endSeconds()) - from);
      if (wait.seconds() >= setSeconds) {
        return wait;
      }
      longest = wait.seconds() > longest.seconds() ? wait : longest;
      if (closes.isEmpty()) {
        break;
      }
      from = closes.getAsDouble();
    }
    return longest;
  }

  private static List<String> none() {
    return List.of();
  }

  private static OptionalDouble closing(StartHistory history, String contactor) {
    return history.stages().stream()
        .filter(s -> s.closedBy().equals(contactor))
        .mapToDouble(Stage::fromSeconds)
        .findFirst();
  }

  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    Wait wait = deciding(starts.currents().history());
    boolean operates = wait.seconds() >= setSeconds;
    Passage passage =
        new Passage(
            wait.seconds() / setSeconds,
            wait.seconds() / setSeconds,
            operates ? wait.from() + setSeconds : Double.POSITIVE_INFINITY);
    if (!withMargins) {
      return new EdgeOutcome(passage, Optional.empty(), Optional.empty(), Optional.empty());
    }
    double stretch = wait.seconds() > 0.0 ? setSeconds / wait.seconds() : Double.POSITIVE_INFINITY;
    return new EdgeOutcome(
        passage,
        // no current moves a timer
        Optional.of(
            StartMargins.known(
                operates ? 0.0 : Double.POSITIVE_INFINITY,
                stretch > 100.0 ? Double.POSITIVE_INFINITY : stretch)),
        Optional.empty(),
        Optional.empty());
  }

  /** Up from the closing before to the one that is waited for longest. */
  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    StartHistory history = starts.currents().history();
    Wait wait = deciding(history);
    double end = history.endSeconds();
    double reached = Math.min(end, wait.from() + wait.seconds());
    double level = wait.seconds() / setSeconds;
    return Optional.of(
        new LevelOverTime(
            new double[] {0.0, wait.from(), reached, reached, end},
            new double[] {
              0.0, 0.0, level, reached < end ? 0.0 : level, reached < end ? 0.0 : level
            }));
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return OptionalDouble.empty();
  }
}
