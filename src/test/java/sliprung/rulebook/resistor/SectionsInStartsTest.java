package sliprung.rulebook.resistor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code resistor/start}. */
class SectionsInStartsTest {
  private static final String RULE = "resistor/start";
  private static final StarterText SMALL = StarterText.small();

  /** Section 1 with both its currents scaled: one time constant, another limit. */
  private static StarterText strength(double factor) {
    return SMALL.with(
        "continuous: 45 A, short-time: {current: 200 A, time: 20 s}",
        StarterText.text(
            "continuous: %s A, short-time: {current: %s A, time: 20 s}",
            45.0 * factor, 200.0 * factor));
  }

  /** Temperature goes with the square of the current over the rating. */
  @Test
  void a_rating_scaled_by_the_root_of_the_use_is_the_limit() {
    double use = SMALL.finding(RULE, "section 1").value().orElseThrow();
    assertThat(use).isBetween(0.1, 0.3);

    Judged.over(RULE, "section 1", SectionsInStartsTest::strength)
        .turns(Math.sqrt(use), 0.005, Verdict.BREACH, Verdict.TIGHT)
        .turns(Math.sqrt(use * 1.10), 0.005, Verdict.TIGHT, Verdict.CLEAR);
  }

  /** Both sections are warm from the two cold starts before. */
  @Test
  void the_hot_start_after_the_longest_series_decides() {
    Finding finding = SMALL.finding(RULE, "section 2");
    assertThat(finding.start().orElseThrow().id()).isEqualTo("hot");

    Finding four = SMALL.with("{cold: 2, hot: 1,", "{cold: 4, hot: 1,").finding(RULE, "section 2");
    assertThat(four.value().orElseThrow()).isGreaterThan(finding.value().orElseThrow());
  }

  /** ∫3 I² R dt of the stages in which the section carries current, of one start. */
  @Test
  void the_energy_it_names_is_that_of_three_phases() {
    double joules = 0.0;
    for (var stage : SMALL.review().start("cold").orElseThrow().history().stages()) {
      if (stage.sectionsIn().contains(2)) {
        joules += 3.0 * 0.25 * stage.trace().integralOfSquare(stage.trace().ringAmps());
      }
    }
    double told =
        SMALL
            .finding(RULE, "section 2")
            .start()
            .orElseThrow()
            .part("section-2")
            .orElseThrow()
            .energyJoules()
            .orElseThrow();
    assertThat(told).isCloseTo(joules, within(1e-3 * joules));
  }

  @ParameterizedTest
  @CsvSource({
    "'0.60 ohm, continuous: 45 A, short', '0.60 ohm, short', resistors.sections[1].continuous",
    "', short-time: {current: 200 A, time: 20 s}', '', resistors.sections[1].short-time",
    "'same-limit: true', 'same-limit: false', resistors.same-limit"
  })
  void a_missing_rating_is_named_and_never_passes(String piece, String by, String path) {
    StarterText text = SMALL.with(piece, by);
    Finding finding = text.finding(RULE, "section 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly(path);
    assertThat(text.review().mustJudgeMissing()).contains(RULE);
  }

  /** Ratings whose time constant no metal section has contradict each other. */
  @Test
  void ratings_that_contradict_each_other_are_not_judged() {
    Finding finding =
        SMALL
            .with("current: 200 A, time: 20 s", "current: 50 A, time: 5 s")
            .finding(RULE, "section 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("resistors.sections[1].short-time");
  }

  /** A delta section carries the ring current over √3. */
  @Test
  void a_delta_section_with_three_times_the_ohms_carries_less() {
    StarterText delta =
        SMALL
            .with("connection: star", "connection: delta")
            .with("cut-out: star-point", "cut-out: bridging")
            .with("resistance: 0.60 ohm", "resistance: 1.80 ohm")
            .with("resistance: 0.25 ohm", "resistance: 0.75 ohm");

    assertThat(delta.finding(RULE, "section 1").value().orElseThrow())
        .isCloseTo(SMALL.finding(RULE, "section 1").value().orElseThrow() / 3.0, within(1e-6));
  }
}
