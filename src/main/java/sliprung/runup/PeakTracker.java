package sliprung.runup;

import java.util.function.DoubleUnaryOperator;

/** The greatest value of a quantity over time: by samples first, then between them. */
final class PeakTracker {
  private static final double GOLDEN = 0.5 * (Math.sqrt(5.0) - 1.0);

  /** Leaves less than a thousandth of the spacing, so a millionth of a top's own height over it. */
  private static final int CUTS = 18;

  /** Share of the spacing by which a slope is felt. */
  private static final double NEAR = 1e-3;

  private double time = Double.NaN;
  private double value = Double.NEGATIVE_INFINITY;
  private boolean risen;

  /** The next sample. */
  void add(double at, double amount) {
    if (amount > value) {
      time = at;
      value = amount;
      risen = true;
    }
  }

  /**
   * Seeks the top around the sample that was greatest, if it lies in the span or just before it:
   * golden section.
   *
   * @param from beginning of the span in which the quantity is known
   * @param to its end
   * @param spacing of the samples, s
   * @param quantity at a time of the span
   */
  void refine(double from, double to, double spacing, DoubleUnaryOperator quantity) {
    // a top just behind the last sample of one span is found from the next
    if (!risen && !(time >= from - spacing)) {
      return;
    }
    risen = false;
    double a = Math.max(from, time - spacing);
    double b = Math.min(to, time + spacing);
    if (b <= a) {
      return;
    }
    // a sample at an end of the span, with the way on into the span leading down, is no top of it
    if (time <= a && quantity.applyAsDouble(a + NEAR * (b - a)) <= value
        || time >= b && quantity.applyAsDouble(b - NEAR * (b - a)) <= value) {
      return;
    }
    double c = b - GOLDEN * (b - a);
    double d = a + GOLDEN * (b - a);
    double atC = quantity.applyAsDouble(c);
    double atD = quantity.applyAsDouble(d);
    for (int i = 0; i < CUTS; i++) {
      if (atC > atD) {
        b = d;
        d = c;
        atD = atC;
        c = b - GOLDEN * (b - a);
        atC = quantity.applyAsDouble(c);
      } else {
        a = c;
        c = d;
        atC = atD;
        d = a + GOLDEN * (b - a);
        atD = quantity.applyAsDouble(d);
      }
    }
    keep(c, atC);
    keep(d, atD);
  }

  private void keep(double at, double amount) {
    if (amount > value) {
      time = at;
      value = amount;
    }
  }

  double value() {
    return value;
  }

  double time() {
    return time;
  }
}
