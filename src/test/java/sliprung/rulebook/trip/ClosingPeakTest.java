package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code trip/closing-peak}: the steady current alone, as long as no transient is computed. */
class ClosingPeakTest {
  private static final String RULE = "trip/closing-peak";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText instantaneous(String measures, double amps) {
    return SMALL.under(
        "F2:",
        StarterText.text(
            "  F4: {kind: instantaneous, pick-up: %s A, measures: "
                + measures
                + ", overreach: 20 %%, accuracy: {pick-up: 4 %%, time: 5 %%}, trips: Q1}",
            amps));
  }

  private static double greatestSteadyAmps() {
    return SMALL.review().start("cold").orElseThrow().history().everything().stream()
        .flatMapToDouble(s -> Arrays.stream(s.trace().statorAmps()))
        .max()
        .orElseThrow();
  }

  /**
   * Earliest element: accuracy below its pick-up, and reaching over by its overreach. A pick-up is
   * the RMS of a sine wave also where peaks are measured.
   */
  @ParameterizedTest
  @ValueSource(strings = {"rms", "peak"})
  void a_pick_up_within_reach_of_the_steady_current_is_a_breach(String measures) {
    double limit = greatestSteadyAmps() * 1.20 / 0.96;

    Finding below = instantaneous(measures, 0.99 * limit).finding(RULE, "F4");
    assertThat(below.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(below.margin().orElseThrow()).isBetween(0.98, 1.0);
    assertThat(instantaneous(measures, 1.01 * limit).finding(RULE, "F4").verdict())
        .isNotIn(Verdict.BREACH, Verdict.CLEAR);
  }

  @Test
  void the_limit_found_by_halving_is_the_same() {
    double limit = Judged.over(RULE, "F4", amps -> instantaneous("rms", amps)).limit(200.0, 600.0);

    assertThat(limit / (greatestSteadyAmps() * 1.20 / 0.96)).isBetween(0.999, 1.001);
  }

  @Test
  void without_an_instantaneous_element_it_has_no_subject() {
    assertThat(SMALL.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
  }

  @Test
  void an_instantaneous_element_is_not_asked_by_the_rule_on_starts() {
    assertThat(instantaneous("peak", 3000.0).review().findings())
        .noneMatch(f -> f.rule().equals("trip/start") && f.subject().equals("F4"));
  }
}
