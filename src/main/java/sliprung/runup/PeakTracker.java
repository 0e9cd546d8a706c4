package sliprung.runup;

/** The greatest value of a sampled quantity, by the parabola through the highest three samples. */
final class PeakTracker {
  private double time0 = Double.NaN;
  private double value0;
  private double time1 = Double.NaN;
  private double value1;
  private double time = Double.NaN;
  private double value = Double.NEGATIVE_INFINITY;

  /** The next sample. */
  void add(double at, double amount) {
    if (amount > value) {
      time = at;
      value = amount;
    }
    if (value1 > value0 && value1 >= amount && !Double.isNaN(time0)) {
      parabola(at, amount);
    }
    time0 = time1;
    value0 = value1;
    time1 = at;
    value1 = amount;
  }

  private void parabola(double at, double amount) {
    double left = (value1 - value0) / (time1 - time0);
    double right = (amount - value1) / (at - time1);
    double bend = (right - left) / (at - time0);
    if (!(bend < 0.0)) {
      return;
    }
    // slope of the parabola at the middle sample
    double slope = left + bend * (time1 - time0);
    double offset = -slope / (2.0 * bend);
    double top = value1 - slope * slope / (4.0 * bend);
    if (top > value) {
      time = time1 + offset;
      value = top;
    }
  }

  double value() {
    return value;
  }

  double time() {
    return time;
  }
}
