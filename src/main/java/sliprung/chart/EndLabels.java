package sliprung.chart;

import java.util.Arrays;
import java.util.Comparator;

/** Moves labels at the ends of lines apart so that none covers another. */
final class EndLabels {
  private EndLabels() {}

  /**
   * Places near the wanted ones, at least a gap apart, in the same order, between two bounds where
   * they have room.
   *
   * @param wanted places
   * @param gap least distance
   * @param least least place
   * @param greatest greatest place
   */
  static double[] spread(double[] wanted, double gap, double least, double greatest) {
    Integer[] order = new Integer[wanted.length];
    Arrays.setAll(order, i -> i);
    Arrays.sort(order, Comparator.comparingDouble(i -> wanted[i]));
    double[] placed = new double[wanted.length];
    double before = Double.NEGATIVE_INFINITY;
    for (int i : order) {
      placed[i] = Math.max(Math.max(wanted[i], least), before + gap);
      before = placed[i];
    }
    double after = greatest + gap;
    for (int k = order.length - 1; k >= 0; k--) {
      int i = order[k];
      placed[i] = Math.min(placed[i], after - gap);
      after = placed[i];
    }
    return placed;
  }
}
