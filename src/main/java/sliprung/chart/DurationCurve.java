package sliprung.chart;

import java.util.List;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;

/**
 * How long a varying current stays at or above each current. A device's curve crossed by it is a
 * hint, no verdict: the verdict comes from running the current through the device.
 *
 * @param label shown at its end
 * @param amps falling
 * @param seconds rising, at or above these
 */
public record DurationCurve(String label, double[] amps, double[] seconds) {
  private static final int LEVELS = 160;

  /** A current builds up from nothing after line closing; a log axis begins above that. */
  static final double LEAST_SHARE = 0.2;

  /** Copies. */
  public DurationCurve {
    amps = amps.clone();
    seconds = seconds.clone();
  }

  /**
   * Of the stator current over some stages, taken as straight between samples.
   *
   * @param stages one or more
   * @param untilSeconds later samples do not count
   */
  public static DurationCurve stator(String label, List<Stage> stages, double untilSeconds) {
    double least = Double.POSITIVE_INFINITY;
    double greatest = 0.0;
    for (Stage stage : stages) {
      double[] t = stage.trace().seconds();
      double[] amps = stage.trace().statorAmps();
      for (int i = 0; i < amps.length && (t[i] <= untilSeconds || i == 0); i++) {
        least = Math.min(least, amps[i]);
        greatest = Math.max(greatest, amps[i]);
      }
    }
    least = Math.max(least, LEAST_SHARE * greatest);
    double[] levels = new double[LEVELS];
    double[] seconds = new double[LEVELS];
    for (int k = 0; k < LEVELS; k++) {
      // just inside both ends, so that a constant current has its whole time
      double share = k / (LEVELS - 1.0);
      levels[k] = greatest * (1.0 - 1e-9) * Math.pow(least / greatest, share);
      seconds[k] = secondsAtOrAbove(stages, levels[k], untilSeconds);
    }
    return new DurationCurve(label, levels, seconds);
  }

  /** How far the curve of a start counts: to the end of its run-up, a fault to its end, s. */
  static double until(ComputedStart start) {
    double end = start.history().endSeconds();
    return start.scenario().isFault() ? end : start.history().runUpSeconds().orElse(end);
  }

  /** Time in s for which the stator current is at or above a level in A. */
  static double secondsAtOrAbove(List<Stage> stages, double level, double untilSeconds) {
    double sum = 0.0;
    for (Stage stage : stages) {
      double[] t = stage.trace().seconds();
      double[] amps = stage.trace().statorAmps();
      for (int i = 0; i + 1 < t.length && t[i] < untilSeconds; i++) {
        double end = Math.min(t[i + 1], untilSeconds);
        double whole = t[i + 1] - t[i];
        if (!(whole > 0.0)) {
          continue;
        }
        double last = amps[i] + (amps[i + 1] - amps[i]) * (end - t[i]) / whole;
        sum += (end - t[i]) * shareAtOrAbove(amps[i], last, level);
      }
    }
    return sum;
  }

  private static double shareAtOrAbove(double a, double b, double level) {
    if (a >= level && b >= level) {
      return 1.0;
    }
    if (a < level && b < level) {
      return 0.0;
    }
    return (Math.max(a, b) - level) / Math.abs(a - b);
  }

  @Override
  public double[] amps() {
    return amps.clone();
  }

  @Override
  public double[] seconds() {
    return seconds.clone();
  }
}
