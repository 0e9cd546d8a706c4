package sliprung.outside;

/** Reads between samples: the cubic through the four nearest. */
final class Samples {
  private Samples() {}

  /** A sampled quantity at a time within the samples. */
  static double at(double[] times, double[] values, double time) {
    int i = 0;
    while (i + 2 < times.length && times[i + 1] < time) {
      i++;
    }
    return cubic(times, values, i, time);
  }

  /** Through the samples around the interval that begins with sample {@code index}. */
  static double cubic(double[] x, double[] y, int index, double at) {
    int first = Math.max(0, Math.min(index - 1, x.length - 4));
    double sum = 0.0;
    for (int i = first; i < first + 4; i++) {
      double term = y[i];
      for (int j = first; j < first + 4; j++) {
        if (j != i) {
          term *= (at - x[j]) / (x[i] - x[j]);
        }
      }
      sum += term;
    }
    return sum;
  }
}
