package sliprung.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class SystemFlowTest {
  private static final SystemFlow.Rates CIRCLE =
      (y, rate) -> {
        rate[0] = -y[1];
        rate[1] = y[0];
      };
  private static final double[] FINE = {1e-12, 1e-12};
  private static final double[] EAST = {1.0, 0.0};

  @Test
  void a_circle_is_followed_between_and_at_the_steps() {
    double[] worst = {0.0};
    int[] pieces = {0};
    SystemFlow.End end =
        SystemFlow.run(
            CIRCLE,
            FINE,
            0.0,
            EAST,
            20.0,
            (from, to, solution) -> {
              pieces[0]++;
              for (double t : new double[] {from, 0.7 * from + 0.3 * to, to}) {
                double[] y = solution.at(t);
                worst[0] = Math.max(worst[0], Math.abs(y[0] - Math.cos(t)));
                worst[0] = Math.max(worst[0], Math.abs(y[1] - Math.sin(t)));
              }
            });

    assertThat(end.crossed()).isEqualTo(-1);
    assertThat(end.time()).isEqualTo(20.0);
    assertThat(end.state()[0]).isCloseTo(Math.cos(20.0), within(1e-10));
    assertThat(worst[0]).isLessThan(1e-9);
    assertThat(pieces[0]).isBetween(10, 200);
  }

  @Test
  void the_first_function_to_change_its_sign_ends_it_on_the_far_side() {
    SystemFlow.End end =
        SystemFlow.run(
            CIRCLE,
            FINE,
            0.0,
            EAST,
            20.0,
            (from, to, solution) -> {},
            y -> y[0] + 0.5,
            y -> y[0] - 0.5);

    assertThat(end.crossed()).isEqualTo(1);
    assertThat(end.time()).isCloseTo(Math.PI / 3.0, within(1e-9));
    assertThat(end.state()[0]).isLessThanOrEqualTo(0.5);
  }

  @Test
  void a_function_that_begins_at_zero_does_not_end_it_there() {
    SystemFlow.End end =
        SystemFlow.run(CIRCLE, FINE, 0.0, EAST, 20.0, (from, to, solution) -> {}, y -> y[1]);

    assertThat(end.time()).isCloseTo(Math.PI, within(1e-9));
  }

  @Test
  void a_jump_in_the_rates_is_passed() {
    SystemFlow.End end =
        SystemFlow.run(
            (y, rate) -> rate[0] = y[0] < 1.0 ? 1.0 : 3.0,
            new double[] {1e-9},
            0.0,
            new double[] {0.0},
            2.0,
            (from, to, solution) -> {});

    assertThat(end.state()[0]).isCloseTo(4.0, within(1e-6));
  }
}
