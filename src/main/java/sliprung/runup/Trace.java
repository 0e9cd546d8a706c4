package sliprung.runup;

import java.util.Arrays;

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

  /** Two lengths that differ by less are one, rounded: per unit of the time they end at. */
  private static final double EQUAL = 1e-13;

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

  /**
   * A sampled quantity at a time in s: the quadratic through the three samples of the piece; before
   * the first sample and after the last, theirs.
   */
  public double at(double[] quantity, double time) {
    if (time <= seconds[0]) {
      return quantity[0];
    }
    if (time >= seconds[last()]) {
      return quantity[last()];
    }
    int found = Arrays.binarySearch(seconds, time);
    int i = (found >= 0 ? found : -found - 2) & ~1;
    double x = (time - seconds[i]) / (seconds[i + 2] - seconds[i]);
    double a = quantity[i];
    double m = quantity[i + 1];
    double b = quantity[i + 2];
    return a + x * (-3.0 * a + 4.0 * m - b) + 2.0 * x * x * (a - 2.0 * m + b);
  }

  /** Integral over time of a sampled quantity. */
  public double integral(double[] quantity) {
    return integral(sample -> quantity[sample]);
  }

  /** Integral over time of the square of a sampled quantity. */
  public double integralOfSquare(double[] quantity) {
    return integral(sample -> quantity[sample] * quantity[sample]);
  }

  private interface Sampled {
    double at(int sample);
  }

  /**
   * Boole's rule over two pieces of one length, which a step of the integrator makes; Simpson's.
   */
  private double integral(Sampled f) {
    double sum = 0.0;
    int i = 0;
    while (i + 2 < seconds.length) {
      double h = seconds[i + 2] - seconds[i];
      boolean pair =
          i + 4 < seconds.length
              && Math.abs(seconds[i + 4] - seconds[i + 2] - h) <= EQUAL * seconds[i + 4];
      if (pair) {
        double ends = 7.0 * (f.at(i) + f.at(i + 4));
        sum += h * (ends + 32.0 * (f.at(i + 1) + f.at(i + 3)) + 12.0 * f.at(i + 2)) / 45.0;
        i += 4;
      } else {
        sum += h * (f.at(i) + 4.0 * f.at(i + 1) + f.at(i + 2)) / 6.0;
        i += 2;
      }
    }
    return sum;
  }
}
