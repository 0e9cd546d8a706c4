package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/** A history up to a moment, without what would have come after. */
final class CutHistory {
  private CutHistory() {}

  /** The start alone, without the running after it. */
  static StartHistory startOnly(StartHistory history) {
    return with(history, history.stages());
  }

  /**
   * Up to a moment.
   *
   * @param seconds above 0, from line closing; infinite: all of it
   */
  static StartHistory until(StartHistory history, double seconds) {
    List<Stage> stages = new ArrayList<>();
    for (Stage stage : history.stages()) {
      if (stage.toSeconds() <= seconds) {
        stages.add(stage);
      } else if (stage.fromSeconds() < seconds) {
        stages.add(cut(stage, seconds));
      }
    }
    return with(history, stages);
  }

  private static StartHistory with(StartHistory history, List<Stage> stages) {
    return new StartHistory(
        history.scenario(),
        history.conditions(),
        history.outcome(),
        stages,
        Optional.empty(),
        history.lastClosingSeconds(),
        history.runUpSeconds(),
        history.levelNeverReached());
  }

  private static Stage cut(Stage stage, double seconds) {
    Trace t = stage.trace();
    int whole = 0;
    while (whole + 2 <= t.last() && t.seconds()[whole + 2] <= seconds) {
      whole += 2;
    }
    // the piece in which the moment lies, as the quadratic through its three samples
    double length = t.seconds()[whole + 2] - t.seconds()[whole];
    double share = (seconds - t.seconds()[whole]) / length;
    Trace cut =
        new Trace(
            ended(t.seconds(), whole, share),
            ended(t.speed(), whole, share),
            ended(t.statorAmps(), whole, share),
            ended(t.ringAmps(), whole, share),
            ended(t.torque(), whole, share),
            ended(t.loadTorque(), whole, share),
            ended(t.terminalVolts(), whole, share),
            ended(t.inputWatts(), whole, share));
    return new Stage(
        stage.step(),
        stage.sectionsIn(),
        stage.externalOhms(),
        stage.fromSeconds(),
        seconds,
        false,
        stage.closedBy(),
        cut,
        stage.entry(),
        stage.peak());
  }

  private static double[] ended(double[] row, int whole, double share) {
    double[] out = Arrays.copyOf(row, whole + 3);
    out[whole + 1] = at(row, whole, 0.5 * share);
    out[whole + 2] = at(row, whole, share);
    return out;
  }

  private static double at(double[] row, int from, double x) {
    double a = row[from];
    double m = row[from + 1];
    double b = row[from + 2];
    return a + x * (-3.0 * a + 4.0 * m - b) + 2.0 * x * x * (a - 2.0 * m + b);
  }
}
