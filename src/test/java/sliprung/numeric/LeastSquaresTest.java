package sliprung.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class LeastSquaresTest {

  @Test
  void should_reach_the_floor_of_a_curved_valley() {
    LeastSquares.Solution s =
        LeastSquares.minimize(
            p -> new double[] {10.0 * (p[1] - p[0] * p[0]), 1.0 - p[0]}, new double[] {-1.2, 1.0});
    assertThat(s.point()[0]).isCloseTo(1.0, within(1e-7));
    assertThat(s.point()[1]).isCloseTo(1.0, within(1e-7));
    assertThat(s.cost()).isLessThan(1e-14);
  }

  @Test
  void should_weigh_contradicting_figures() {
    // 1 at spread 0.1 against 2 at spread 0.2: the mean weighted by 1/spread²
    LeastSquares.Solution s =
        LeastSquares.minimize(
            p -> new double[] {(p[0] - 1.0) / 0.1, (p[0] - 2.0) / 0.2}, new double[] {5.0});
    assertThat(s.point()[0]).isCloseTo(1.2, within(1e-8));
  }

  @Test
  void should_give_the_best_point_met_when_there_is_no_floor() {
    LeastSquares.Solution s =
        LeastSquares.minimize(p -> new double[] {Math.exp(-p[0])}, new double[] {0.0});
    assertThat(s.cost()).isLessThan(0.5);
    assertThat(s.point()[0]).isPositive();
  }
}
