package sliprung.runup;

/**
 * Samples of one stage at rising times: an odd number, so that samples (0,1,2), (2,3,4) … are
 * pieces whose middle sample lies halfway in time and Simpson's rule holds.
 *
 * @param seconds from line closing
 * @param speed rad/s
 * @param statorAmps RMS
 * @param ringAmps RMS
 * @param torque air-gap, N·m
 * @param loadTorque N·m
 * @param terminalVolts line to line
 * @param inputWatts active power into the terminals
 */
public record Trace(
    double[] seconds,
    double[] speed,
    double[] statorAmps,
    double[] ringAmps,
    double[] torque,
    double[] loadTorque,
    double[] terminalVolts,
    double[] inputWatts) {

  /** Checks the lengths. Arrays are not copied: nobody outside this package may write them. */
  public Trace {
    if (seconds.length < 3 || seconds.length % 2 == 0) {
      throw new IllegalArgumentException("an odd number of samples, 3 or more");
    }
  }

  /** Number of samples. */
  public int size() {
    return seconds.length;
  }

  /** Index of the last sample. */
  public int last() {
    return seconds.length - 1;
  }

  /** Integral over time of a sampled quantity, Simpson's rule over every piece. */
  public double integral(double[] quantity) {
    double sum = 0.0;
    for (int i = 0; i + 2 < seconds.length; i += 2) {
      double h = seconds[i + 2] - seconds[i];
      sum += h * (quantity[i] + 4.0 * quantity[i + 1] + quantity[i + 2]) / 6.0;
    }
    return sum;
  }

  /** Integral over time of the square of a sampled quantity. */
  public double integralOfSquare(double[] quantity) {
    double sum = 0.0;
    for (int i = 0; i + 2 < seconds.length; i += 2) {
      double h = seconds[i + 2] - seconds[i];
      double a = quantity[i];
      double m = quantity[i + 1];
      double b = quantity[i + 2];
      sum += h * (a * a + 4.0 * m * m + b * b) / 6.0;
    }
    return sum;
  }
}
