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

  /** A quantity of a history with its stages laid out once, to be read at many times. */
  private record Laid(List<Stage> stages, List<double[]> seconds, List<double[]> values) {
    static Laid of(StartHistory history, Function<Trace, double[]> quantity) {
      List<Stage> stages = history.everything();
      return new Laid(
          stages,
          stages.stream().map(s -> s.trace().seconds()).toList(),
          stages.stream().map(s -> quantity.apply(s.trace())).toList());
    }

    /** At a time; after the end of the history its last value. */
    double at(double time) {
      int stage = 0;
      while (stage < stages.size() - 1 && !(time < stages.get(stage).toSeconds())) {
        stage++;
      }
      double[] t = seconds.get(stage);
      double[] v = values.get(stage);
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

  /**
   * Least and greatest of a quantity over several histories, on an even grid of times.
   *
   * @return the least, then the greatest
   */
  static List<Series> edges(
      List<StartHistory> histories, Function<Trace, double[]> quantity, double factor, double end) {
    List<Laid> laid = histories.stream().map(h -> Laid.of(h, quantity)).toList();
    double[] seconds = new double[GRID + 1];
    double[] least = new double[GRID + 1];
    double[] greatest = new double[GRID + 1];
    for (int k = 0; k <= GRID; k++) {
      double t = end * k / GRID;
      least[k] = Double.POSITIVE_INFINITY;
      greatest[k] = Double.NEGATIVE_INFINITY;
      for (Laid history : laid) {
        double value = history.at(t) * factor;
        least[k] = Math.min(least[k], value);
        greatest[k] = Math.max(greatest[k], value);
      }
      seconds[k] = t;
    }
    return List.of(new Series(seconds, least), new Series(seconds, greatest));
  }
}
