package sliprung.numeric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class RootTest {

  @Test
  void should_find_a_root_to_the_accuracy_asked_for() {
    assertThat(Root.find(x -> x * x - 2.0, 0.0, 2.0, 1e-14))
        .isCloseTo(Math.sqrt(2.0), within(1e-13));
    double tiny = Root.find(x -> Math.log(x / 3e-9), 1e-12, 1.0, 1e-12);
    assertThat(tiny / 3e-9).isCloseTo(1.0, within(1e-10));
  }

  @Test
  void should_accept_a_root_at_either_end() {
    assertThat(Root.find(x -> x, 0.0, 1.0, 1e-9)).isZero();
    assertThat(Root.find(x -> x - 1.0, 0.0, 1.0, 1e-9)).isEqualTo(1.0);
  }

  @Test
  void should_refuse_ends_that_bracket_nothing() {
    assertThatThrownBy(() -> Root.find(x -> x * x + 1.0, -1.0, 1.0, 1e-9))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("no change of sign");
  }
}
