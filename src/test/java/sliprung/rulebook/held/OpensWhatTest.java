package sliprung.rulebook.held;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code held/opens-what}. */
class OpensWhatTest {
  private static final String RULE = "held/opens-what";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText rated(String ratings) {
    return SMALL.with("ratings: {AC-2: 125 A, AC-3: 125 A}", "ratings: {" + ratings + "}");
  }

  /** AC-2 and AC-3 are proven to break 4 and 8 times their rating (IEC 60947-4-1 table 7). */
  @ParameterizedTest
  @CsvSource({"AC-2, 4", "AC-3, 8", "AC-4, 10"})
  void the_current_it_opens_is_held_against_the_proven_multiple(String category, double multiple) {
    double opened = SMALL.finding(RULE, "F2").value().orElseThrow();
    assertThat(opened).isBetween(500.0, 530.0);

    Judged.over(RULE, "F2", amps -> rated(StarterText.text(category + ": %s A", amps)))
        .turns(opened / multiple, Verdict.BREACH, Verdict.CLEAR);
  }

  @Test
  void of_several_categories_the_greatest_proven_figure_counts() {
    assertThat(rated("AC-2: 125 A, AC-3: 60 A").finding(RULE, "F2").limit().orElseThrow())
        .isEqualTo(500.0);
    assertThat(rated("AC-2: 100 A, AC-3: 60 A").finding(RULE, "F2").limit().orElseThrow())
        .isEqualTo(480.0);
  }

  @Test
  void a_step_contactor_clears_nothing() {
    Finding finding =
        SMALL.with("dial: 104 A, trips: K1", "dial: 104 A, trips: K11").finding(RULE, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin().orElseThrow()).isZero();
    assertThat(finding.says()).contains("rotor circuit");
  }

  @ParameterizedTest
  @CsvSource({
    "'ratings: {AC-2: 125 A, AC-3: 125 A}, ', '', contactors.K1.ratings",
    "'AC-3: 125 A}, rated-voltage: 400 V, ', 'AC-3: 125 A}, ', contactors.K1.rated-voltage",
    "'dial: 104 A, trips: K1', 'dial: 104 A, trips: Q2', breakers.Q2.breaking"
  })
  void what_is_not_proven_is_not_judged(String piece, String by, String path) {
    Finding finding =
        SMALL.under("Q1:", "  Q2: {opening: 50 ms}").with(piece, by).finding(RULE, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly(path);
  }

  /** A rating at a lower voltage proves nothing at the starter's. */
  @Test
  void a_rating_below_the_supply_voltage_proves_nothing() {
    Finding finding =
        SMALL
            .with("AC-3: 125 A}, rated-voltage: 400 V", "AC-3: 125 A}, rated-voltage: 230 V")
            .finding(RULE, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  /** Once the fuse has certainly cleared, a slower device opens nothing any more. */
  @Test
  void a_device_that_comes_after_a_certain_clearing_is_not_asked() {
    Finding alone = SMALL.finding(RULE, "F2");
    assertThat(alone.start().orElseThrow().scenario().id()).isEqualTo("locked");
    StarterText fast =
        SMALL.under("F2:", "  F3: {kind: definite-time, pick-up: 300 A, time: 0 s, trips: Q1}");

    assertThat(fast.review().findings())
        .anyMatch(f -> f.rule().equals(RULE) && f.subject().equals("F3"))
        .noneMatch(f -> f.rule().equals(RULE) && f.subject().equals("F2"));
  }

  @Test
  void without_a_device_that_trips_anything_it_has_no_subject() {
    StarterText text = SMALL.without("F2:").without("F5:");

    assertThat(text.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
  }
}
