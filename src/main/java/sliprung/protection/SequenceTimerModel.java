package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Device;

/**
 * A sequence timer: it starts with the line contactor and trips when its stop event has not come in
 * time. Use is the time elapsed over the time set.
 */
final class SequenceTimerModel implements EdgeModel {
  private final double setSeconds;
  private final OptionalDouble untilSpeedShare;

  /**
   * An edge.
   *
   * @param device the timer
   * @param timeFactor spread of this edge
   */
  SequenceTimerModel(Device.SequenceTimer device, double timeFactor) {
    this.setSeconds = Math.max(1e-9, device.seconds() * timeFactor);
    this.untilSpeedShare = device.untilSpeedShare();
  }

  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    StartHistory history = starts.currents().history();
    double stop = stopSeconds(history, starts.currents().synchronousSpeed());
    double elapsed = Math.min(stop, history.endSeconds());
    double runUp =
        history.scenario().isFault()
            ? elapsed
            : Math.min(elapsed, history.runUpSeconds().orElse(elapsed));
    Passage passage =
        new Passage(
            elapsed / setSeconds,
            runUp / setSeconds,
            elapsed >= setSeconds ? setSeconds : Double.POSITIVE_INFINITY);
    if (!withMargins) {
      return new EdgeOutcome(passage, Optional.empty(), Optional.empty(), Optional.empty());
    }
    double stretch = elapsed > 0.0 ? setSeconds / elapsed : Double.POSITIVE_INFINITY;
    return new EdgeOutcome(
        passage,
        // no current moves a timer
        Optional.of(
            StartMargins.known(
                elapsed >= setSeconds ? 0.0 : Double.POSITIVE_INFINITY,
                stretch > 100.0 ? Double.POSITIVE_INFINITY : stretch)),
        Optional.empty(),
        Optional.empty());
  }

  private double stopSeconds(StartHistory history, double synchronousSpeed) {
    if (history.scenario().kind() == Scenario.Kind.RUNNING_LOCKED) {
      return 0.0; // its stop event came long ago, whichever it is
    }
    if (untilSpeedShare.isEmpty() && history.scenario().kind() == Scenario.Kind.RINGS_SHORTED) {
      // the last step's contactor is closed, or reports so: the timer has nothing to wait for
      return 0.0;
    }
    return untilSpeedShare.isEmpty()
        ? history.lastClosingSeconds().orElse(Double.POSITIVE_INFINITY)
        : reachedSeconds(history, untilSpeedShare.getAsDouble() * synchronousSpeed);
  }

  /** When the speed first reaches a value, linear between samples; infinite: never. */
  private static double reachedSeconds(StartHistory history, double speed) {
    for (Stage stage : history.everything()) {
      Trace trace = stage.trace();
      for (int i = 1; i < trace.size(); i++) {
        double before = trace.speed()[i - 1];
        double after = trace.speed()[i];
        if (after >= speed) {
          double share = before >= speed ? 0.0 : (speed - before) / (after - before);
          return trace.seconds()[i - 1] + share * (trace.seconds()[i] - trace.seconds()[i - 1]);
        }
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  /** Straight up from line closing to the stop event, then back to nothing. */
  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    StartHistory history = starts.currents().history();
    double stop = stopSeconds(history, starts.currents().synchronousSpeed());
    double end = history.endSeconds();
    double reached = Math.min(stop, end);
    return Optional.of(
        stop < end
            ? new LevelOverTime(
                new double[] {0.0, reached, reached, end},
                new double[] {0.0, reached / setSeconds, 0.0, 0.0})
            : new LevelOverTime(
                new double[] {0.0, reached}, new double[] {0.0, reached / setSeconds}));
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return OptionalDouble.empty();
  }
}
