package sliprung.dial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.Starters;
import sliprung.outside.OutsideTable;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

class BankGradingTest {
  private static final CircuitData CIRCUIT = new CircuitData(0.03, 0.18, 4.8, 0.03, 0.18, 1.5);

  @TestFactory
  @Tag("outside")
  Stream<DynamicTest> published_banks() {
    return OutsideTable.read("bank-grading")
        .tests(
            row -> {
              double[] ohms =
                  BankGrading.geometric(
                      row.number("first_ohm"),
                      row.number("last_ohm"),
                      (int) row.number("sections"));
              assertThat(ohms[(int) row.number("section") - 1])
                  .isCloseTo(row.number("expected"), within(row.number("tolerance")));
            });
  }

  @Test
  void the_sections_are_what_the_totals_fall_by() {
    assertThat(Arrays.stream(BankGrading.geometric(1.0, 0.02, 5)).sum())
        .isCloseTo(0.98, within(1e-12));
    assertThatThrownBy(() -> BankGrading.geometric(0.02, 1.0, 5))
        .isInstanceOf(IllegalArgumentException.class);
  }

  private static Starter starter(double[] ohms, Step.ClosingRule... rules) {
    return Starters.bare(
        400.0, 50.0, 970.0, 55e3, CIRCUIT, 10.0, new TorqueCurve.Constant(150.0), ohms, rules);
  }

  @Test
  void the_progression_gives_even_closings_where_all_steps_close_at_one_current() {
    Step.ClosingRule level = new Step.RotorBelow(150.0);
    BankGrading.Graded graded =
        BankGrading.of(starter(new double[] {0.3, 0.3, 0.1}, level, level, level));

    assertThat(graded.today().isEven()).isFalse();
    assertThat(graded.geometric().isEven()).isTrue();
    assertThat(graded.geometric().spread().getAsDouble()).isCloseTo(1.0, within(1e-3));
    assertThat(graded.numeric()).isEmpty();
    assertThat(graded.geometric().ohms().stream().mapToDouble(r -> r).sum())
        .isCloseTo(0.7, within(1e-12));
  }

  @Test
  void timers_that_close_at_other_currents_are_evened_numerically() {
    BankGrading.Graded graded =
        BankGrading.of(
            starter(
                new double[] {0.3, 0.3, 0.1},
                new Step.After(1.2),
                new Step.After(0.5),
                new Step.After(0.6)));

    assertThat(graded.geometric().isEven()).isFalse();
    BankGrading.Shared numeric = graded.numeric().orElseThrow();
    assertThat(numeric.spread().getAsDouble())
        .isLessThan(graded.geometric().spread().getAsDouble())
        .isLessThan(graded.today().spread().getAsDouble());
    assertThat(numeric.ohms().stream().mapToDouble(r -> r).sum()).isCloseTo(0.7, within(1e-9));
  }
}
