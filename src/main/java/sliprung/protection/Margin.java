package sliprung.protection;

import java.util.function.DoubleUnaryOperator;

/** The factor on a current or on a time axis at which a use reaches 1. */
final class Margin {
  /** Above it a margin is called infinite. */
  static final double GREATEST = 100.0;

  private static final double LEAST = 1e-3;
  private static final double PRECISION = 1e-5;

  /** Stride where use never falls with a rising factor. */
  static final double COARSE = 1.5;

  /** Stride where it may. */
  static final double FINE = 1.04;

  private Margin() {}

  /**
   * Searches the factor.
   *
   * @param use of a factor; may jump; where it falls again with a rising factor (a relay that is
   *     blocked above a current) the stride must be small
   * @param atOne use at factor 1
   * @param stride ratio of two factors tried in turn until one is past the first at which use is 1
   * @return 0 where no factor from 0.001 up keeps it below 1; infinite where none up to 100 brings
   *     it to 1
   */
  static double of(DoubleUnaryOperator use, double atOne, double stride) {
    double low;
    double lowUse;
    double high;
    double highUse;
    if (atOne < 1.0) {
      low = 1.0;
      lowUse = atOne;
      // heat goes with the square of the current: where all of it is the start's, it is there
      boolean jumps = stride >= COARSE && atOne > 0.0;
      high = jumps ? Math.min(GREATEST, 1.001 / Math.sqrt(atOne)) : stride;
      highUse = use.applyAsDouble(high);
      while (highUse < 1.0) {
        if (high >= GREATEST) {
          return Double.POSITIVE_INFINITY;
        }
        low = high;
        lowUse = highUse;
        high = Math.min(GREATEST, stride * high);
        highUse = use.applyAsDouble(high);
      }
    } else {
      high = 1.0;
      highUse = atOne;
      low = 1.0 / stride;
      lowUse = use.applyAsDouble(low);
      while (lowUse >= 1.0) {
        if (low <= LEAST) {
          return 0.0;
        }
        high = low;
        highUse = lowUse;
        low = low / stride;
        lowUse = use.applyAsDouble(low);
      }
    }
    return between(use, low, lowUse, high, highUse);
  }

  /**
   * False position on the square of the factor, in which first-order elements are straight; where
   * it does not halve the bracket, halving does.
   */
  private static double between(
      DoubleUnaryOperator use, double low0, double lowUse0, double high0, double highUse0) {
    double low = low0;
    double lowUse = lowUse0;
    double high = high0;
    double highUse = highUse0;
    while (high - low > PRECISION * high) {
      double width = high - low;
      double share = (1.0 - lowUse) / (highUse - lowUse);
      double guess = Math.sqrt(low * low + share * (high * high - low * low));
      // a little beyond the guess on the safe side closes the bracket from both ends
      double nudge = 0.25 * PRECISION * high;
      for (double factor : new double[] {guess - nudge, guess + nudge}) {
        if (factor <= low || factor >= high) {
          continue;
        }
        double value = use.applyAsDouble(factor);
        if (value < 1.0) {
          low = factor;
          lowUse = value;
        } else {
          high = factor;
          highUse = value;
        }
      }
      if (high - low > 0.5 * width) {
        double middle = 0.5 * (low + high);
        double value = use.applyAsDouble(middle);
        if (value < 1.0) {
          low = middle;
          lowUse = value;
        } else {
          high = middle;
          highUse = value;
        }
      }
    }
    return low;
  }
}
