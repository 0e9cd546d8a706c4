package sliprung.sampling;

import org.apache.commons.math3.distribution.BetaDistribution;

/**
 * Exact bounds of a share that was counted: those of Clopper and Pearson (Biometrika 26, 1934, from
 * memory), each missed with a chance of at most 2.5 %.
 *
 * @param low lower bound
 * @param high upper bound
 */
public record BinomialBounds(double low, double high) {
  private static final double EACH_SIDE = 0.025;

  /**
   * Of a count.
   *
   * @param hits 0 to trials
   * @param trials 1 or more
   */
  public static BinomialBounds of(int hits, int trials) {
    double low =
        hits == 0
            ? 0.0
            : new BetaDistribution(hits, trials - hits + 1.0)
                .inverseCumulativeProbability(EACH_SIDE);
    double high =
        hits == trials
            ? 1.0
            : new BetaDistribution(hits + 1.0, trials - hits)
                .inverseCumulativeProbability(1.0 - EACH_SIDE);
    return new BinomialBounds(low, high);
  }
}
