package sliprung.runup;

import java.util.Arrays;

/**
 * Means over one supply period of two space vectors in the frame of the supply, as time goes by:
 * the fundamental of the last period, without the offset, which turns there and averages out.
 */
final class CycleMean {
  private static final int FIRST_SIZE = 128;

  private final double period;
  private double[] seconds = new double[FIRST_SIZE];
  private final double[][] integrals = new double[4][FIRST_SIZE];
  private final double[][] values = new double[4][FIRST_SIZE];
  private int count = 1;
  private int behind;

  /** Means over a period in s; before time 0 everything was 0. */
  CycleMean(double period) {
    this.period = period;
  }

  /** Adds a piece of Simpson's rule: its length and each component at its start, middle and end. */
  void add(double length, double[] first, double[] middle, double[] last) {
    if (count == seconds.length && behind > count / 2) {
      forgetBehind();
    }
    if (count == seconds.length) {
      seconds = Arrays.copyOf(seconds, 2 * count);
      for (int k = 0; k < integrals.length; k++) {
        integrals[k] = Arrays.copyOf(integrals[k], 2 * count);
        values[k] = Arrays.copyOf(values[k], 2 * count);
      }
    }
    seconds[count] = seconds[count - 1] + length;
    for (int k = 0; k < integrals.length; k++) {
      integrals[k][count] =
          integrals[k][count - 1] + length * (first[k] + 4.0 * middle[k] + last[k]) / 6.0;
      values[k][count] = last[k];
    }
    count++;
  }

  /** Only the last period is ever looked back on. */
  private void forgetBehind() {
    count -= behind;
    System.arraycopy(seconds, behind, seconds, 0, count);
    for (int k = 0; k < integrals.length; k++) {
      System.arraycopy(integrals[k], behind, integrals[k], 0, count);
      System.arraycopy(values[k], behind, values[k], 0, count);
    }
    behind = 0;
  }

  /** Magnitude over √2 of the mean of the vector whose components are k and k + 1, up to now. */
  double rms(int k) {
    double from = seconds[count - 1] - period;
    while (behind + 1 < count && seconds[behind + 1] < from) {
      behind++;
    }
    double real = (integrals[k][count - 1] - at(k, from)) / period;
    double imaginary = (integrals[k + 1][count - 1] - at(k + 1, from)) / period;
    return Math.sqrt(0.5 * (real * real + imaginary * imaginary));
  }

  private double at(int k, double time) {
    if (time <= 0.0) {
      return 0.0;
    }
    double length = seconds[behind + 1] - seconds[behind];
    double share = (time - seconds[behind]) / length;
    // the vector taken as straight within the piece, scaled to the piece's own integral
    double first = values[k][behind];
    double last = values[k][behind + 1];
    double straight = length * 0.5 * (first + last);
    double rest = integrals[k][behind + 1] - integrals[k][behind] - straight;
    double within = share * length * (first + 0.5 * share * (last - first));
    return integrals[k][behind] + within + share * rest;
  }
}
