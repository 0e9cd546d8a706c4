package sliprung.chart;

/**
 * A quantity over time.
 *
 * @param seconds rising, from line closing; twice the same at a closing
 * @param values at these
 */
public record Series(double[] seconds, double[] values) {

  /** Copies and checks. */
  public Series {
    seconds = seconds.clone();
    values = values.clone();
    if (seconds.length != values.length) {
      throw new IllegalArgumentException("a value for each time");
    }
  }

  @Override
  public double[] seconds() {
    return seconds.clone();
  }

  @Override
  public double[] values() {
    return values.clone();
  }

  /** Greatest value; 0 without any. */
  public double greatest() {
    double greatest = 0.0;
    for (double value : values) {
      greatest = Math.max(greatest, value);
    }
    return greatest;
  }

  /** Last value; not a number without any. */
  public double last() {
    return values.length == 0 ? Double.NaN : values[values.length - 1];
  }
}
