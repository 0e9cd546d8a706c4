package sliprung.sampling;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.distribution.BinomialDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Exact bounds of a share against closed forms and against the binomial distribution itself. */
class BinomialBoundsOutsideTest {

  @Tag("outside")
  @Test
  void none_of_n_has_the_closed_form_upper_bound() {
    // 1 − (α/2)^(1/n): Clopper and Pearson, Biometrika 26 (1934), from memory
    for (int n : new int[] {10, 100, 10_000}) {
      BinomialBounds none = BinomialBounds.of(0, n);
      assertThat(none.low()).isZero();
      assertThat(none.high()).isCloseTo(1 - Math.pow(0.025, 1.0 / n), within(1e-9));
      BinomialBounds all = BinomialBounds.of(n, n);
      assertThat(all.high()).isEqualTo(1);
      assertThat(all.low()).isCloseTo(Math.pow(0.025, 1.0 / n), within(1e-9));
    }
  }

  @Tag("outside")
  @Test
  void at_each_bound_the_count_is_just_as_unlikely_as_promised() {
    // definition of the exact interval: P(X ≥ k | low) = P(X ≤ k | high) = 2.5 %
    for (int[] kn : new int[][] {{1, 20}, {5, 50}, {37, 1000}, {9_000, 10_000}}) {
      BinomialBounds bounds = BinomialBounds.of(kn[0], kn[1]);
      double atLeast =
          1 - new BinomialDistribution(kn[1], bounds.low()).cumulativeProbability(kn[0] - 1);
      double atMost = new BinomialDistribution(kn[1], bounds.high()).cumulativeProbability(kn[0]);
      assertThat(atLeast).isCloseTo(0.025, within(1e-6));
      assertThat(atMost).isCloseTo(0.025, within(1e-6));
    }
  }

  @Tag("outside")
  @Test
  void five_of_fifty_by_the_handbooks_figures() {
    // 0.0333 to 0.2181: tables of exact binomial limits, from memory
    BinomialBounds bounds = BinomialBounds.of(5, 50);
    assertThat(bounds.low()).isCloseTo(0.0333, within(5e-5));
    assertThat(bounds.high()).isCloseTo(0.2181, within(5e-5));
  }
}
