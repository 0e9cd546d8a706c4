package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class OrderTest {
  private static final Rule RULE = new TheLineContactorOpensFirst();

  private static Verdict opening(double milliseconds) {
    return CrusherFacts.finding(
            RULE,
            CrusherFacts.bare(
                "rotor-rating: 315 A, rated-voltage: 690 V, closing: 60 ms, opening: 60 ms",
                "rotor-rating: 315 A, rated-voltage: 690 V, closing: 60 ms, opening: "
                    + milliseconds
                    + " ms"),
            "K11")
        .verdict();
  }

  @Test
  void half_a_period_after_the_line_contactor_the_arc_is_out() {
    // 60 ms and 10 ms of arc at 50 Hz
    assertThat(opening(70.0)).isEqualTo(Verdict.CLEAR);
    assertThat(opening(70.7)).isEqualTo(Verdict.CLEAR);
    assertThat(opening(69.3)).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void before_the_line_contactor_is_a_breach() {
    assertThat(opening(60.6)).isEqualTo(Verdict.TIGHT);
    assertThat(opening(60.0)).isEqualTo(Verdict.TIGHT);
    assertThat(opening(59.4)).isEqualTo(Verdict.BREACH);
  }

  @Test
  void the_current_and_frequency_it_would_break_are_told() {
    Finding finding = CrusherFacts.finding(RULE, CrusherFacts.of(), "K12");

    assertThat(CrusherFacts.says(finding)).contains("a pole at ").contains(" Hz");
  }

  @Test
  void a_device_that_opens_a_step_contactor_is_a_breach() {
    Finding finding =
        CrusherFacts.finding(
            RULE,
            CrusherFacts.bare("until: last-step, trips: K1", "until: last-step, trips: K11"),
            "F5");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.mend(finding)).contains("open the line contactor");
  }

  @Test
  void without_a_line_contactor_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withoutLineContactor()))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
