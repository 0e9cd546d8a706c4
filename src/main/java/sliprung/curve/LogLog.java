package sliprung.curve;

/** Straight lines on a sheet with two logarithmic axes. */
final class LogLog {
  private LogLog() {}

  /**
   * Ordinate on the line through two points.
   *
   * @param x0 above 0
   * @param y0 at {@code x0}, above 0
   * @param x1 above 0, not {@code x0}
   * @param y1 at {@code x1}, above 0
   * @param x above 0
   */
  static double at(double x0, double y0, double x1, double y1, double x) {
    double share = Math.log(x / x0) / Math.log(x1 / x0);
    return y0 * Math.exp(share * Math.log(y1 / y0));
  }
}
