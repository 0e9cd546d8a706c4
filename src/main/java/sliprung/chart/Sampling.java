package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/** Reads series out of histories. */
final class Sampling {
  private static final int GRID = 400;

  private Sampling() {}

  /** A quantity of a history, sample by sample, to the end of the picture. */
  static Series series(
      StartHistory history, Function<Trace, double[]> quantity, double factor, double end) {
    List<double[]> points = new ArrayList<>();
    for (Stage stage : history.everything()) {
      double[] t = stage.trace().seconds();
      double[] v = quantity.apply(stage.trace());
      for (int i = 0; i < t.length; i++) {
        if (t[i] <= end) {
          points.add(new double[] {t[i], v[i] * factor});
        } else if (i > 0 && t[i - 1] < end) {
          double w = (end - t[i - 1]) / (t[i] - t[i - 1]);
          points.add(new double[] {end, (v[i - 1] + w * (v[i] - v[i - 1])) * factor});
        }
      }
    }
    return new Series(
        points.stream().mapToDouble(p -> p[0]).toArray(),
        points.stream().mapToDouble(p -> p[1]).toArray());
  }

  /** Least (or greatest) of a quantity over several histories, on an even grid of times. */
  static Series edge(
      List<StartHistory> histories,
      Function<Trace, double[]> quantity,
      double factor,
      double end,
      boolean greatest) {
    double[] seconds = new double[GRID + 1];
    double[] values = new double[GRID + 1];
    for (int k = 0; k <= GRID; k++) {
      double t = end * k / GRID;
      double extreme = greatest ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
      for (StartHistory history : histories) {
        double value = at(history, quantity, t) * factor;
        extreme = greatest ? Math.max(extreme, value) : Math.min(extreme, value);
      }
      seconds[k] = t;
      values[k] = extreme;
    }
    return new Series(seconds, values);
  }

  /** A quantity at a time; after the end of the history its last value. */
  static double at(StartHistory history, Function<Trace, double[]> quantity, double time) {
    List<Stage> stages = history.everything();
    Stage stage = stages.get(stages.size() - 1);
    for (Stage candidate : stages) {
      if (time < candidate.toSeconds()) {
        stage = candidate;
        break;
      }
    }
    double[] t = stage.trace().seconds();
    double[] v = quantity.apply(stage.trace());
    int found = java.util.Arrays.binarySearch(t, time);
    if (found >= 0) {
      return v[found];
    }
    int upper = -found - 1;
    if (upper == 0) {
      return v[0];
    }
    if (upper >= t.length) {
      return v[t.length - 1];
    }
    double w = (time - t[upper - 1]) / (t[upper] - t[upper - 1]);
    return v[upper - 1] + w * (v[upper] - v[upper - 1]);
  }
}
