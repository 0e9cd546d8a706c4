package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code sequence/supervision}. */
class SupervisionTest {
  private static final String RULE = "sequence/supervision";
  private static final StarterText SMALL = StarterText.small();

  /** Sections of a stronger bank, so that the window is wide. */
  private static final StarterText STRONG =
      SMALL
          .with("current: 200 A, time: 20 s", "current: 200 A, time: 60 s")
          .with("current: 250 A, time: 20 s", "current: 250 A, time: 60 s");

  private static StarterText timer(double seconds) {
    return STRONG.line(
        "F5:",
        StarterText.text(
            "F5: {kind: sequence-timer, time: %s s, until: last-step, trips: K1}", seconds));
  }

  /** The stop event comes at 6.10 s; the timer's spread takes the rest. */
  @ParameterizedTest
  @CsvSource({"0, 1.0", "10, 0.9"})
  void the_window_begins_at_the_stop_event_of_the_slowest_start(double spread, double shortest) {
    // later by the spread of the step timers, 4 s and 2 s
    double stop = 0.1 + 6.0 * (1.0 + spread / 100.0);

    Judged.over(
            RULE,
            "F5",
            s ->
                timer(s).with("timer-spread: 0 %", StarterText.text("timer-spread: %s %%", spread)))
        .turns(stop / shortest, Verdict.BREACH, Verdict.TIGHT)
        .turns(1.10 * stop / shortest, Verdict.TIGHT, Verdict.CLEAR);
  }

  @Test
  void the_window_ends_before_the_first_limit_that_the_timer_alone_can_stop() {
    Finding late = timer(200.0).finding(RULE, "F5");
    assertThat(late.verdict()).isEqualTo(Verdict.BREACH);
    double limit = late.limit().orElseThrow();
    assertThat(late.value().orElseThrow()).isCloseTo(200.05, within(1e-9));

    Judged.over(RULE, "F5", SupervisionTest::timer)
        .turns(limit / 1.10 - 0.05, Verdict.CLEAR, Verdict.TIGHT)
        .turns(limit - 0.05, Verdict.TIGHT, Verdict.BREACH);
  }

  @Test
  void a_start_longer_than_the_bank_stands_leaves_no_window() {
    StarterText text =
        SMALL
            .with("{contactor: K11, after: 4 s}", "{contactor: K11, after: 30 s}")
            .line("F5:", "F5: {kind: sequence-timer, time: 33 s, until: last-step, trips: K1}");
    Finding finding = text.finding(RULE, "F5");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.says()).contains("no window");
  }

  /** The stop event of its own, not the last closing. */
  @Test
  void a_timer_that_waits_for_a_speed_is_held_against_that_speed() {
    Finding finding =
        STRONG
            .line("F5:", "F5: {kind: sequence-timer, time: 2.2 s, until: {speed: 50 %}, trips: K1}")
            .finding(RULE, "F5");
    var trace = STRONG.review().start("cold").orElseThrow().history().stages().get(0).trace();
    int i = 0;
    while (trace.speed()[i] < 25.0 * Math.PI) {
      i++;
    }

    assertThat(finding.margin().orElseThrow())
        .isBetween(2.2 / trace.seconds()[i], 2.2 / trace.seconds()[i - 1]);
  }

  @Test
  void a_start_that_never_stops_the_timer_is_a_breach() {
    StarterText hangs =
        STRONG.with("{contactor: K12, after: 2 s}", "{contactor: K12, rotor-below: 10 A}");

    Finding finding = hangs.finding(RULE, "F5");
    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin()).hasValue(0.0);
    assertThat(finding.says())
        .contains("never comes in a cold start")
        .contains("the last step never closes")
        .doesNotContain("1 800")
        .doesNotContain("30\u00a0min");
  }

  @Test
  void a_speed_that_is_never_reached_stops_no_timer_either() {
    Finding finding =
        STRONG
            .line("F5:", "F5: {kind: sequence-timer, time: 9 s, until: {speed: 99.9 %}, trips: K1}")
            .finding(RULE, "F5");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.says()).contains("does not reach 99.9");
  }

  @Test
  void without_a_timer_an_unseen_held_step_that_burns_is_a_breach() {
    Finding finding = SMALL.without("F5:").finding(RULE, "sequence timer");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.mend()).contains("Fit one");
  }

  /** An overload in the bank's leads, set below the held current, sees every held step. */
  @Test
  void without_a_timer_another_device_may_see_every_held_step() {
    StarterText text =
        SMALL.line(
            "F5:",
            "F5: {kind: definite-time, pick-up: 30 A, time: 12 s, place: bank,"
                + " measures-by: dc-capable, trips: K1}");

    assertThat(text.finding(RULE, "sequence timer").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(text.finding("held/exposure", "step 1").verdict()).isEqualTo(Verdict.CLEAR);
  }

  /** A transformer reads nothing at the slip frequency of a held step: it cannot be the one. */
  @Test
  void a_transformer_in_the_leads_sees_no_slow_step() {
    StarterText text =
        SMALL
            .with("resistance: 0.60 ohm", "resistance: 0.06 ohm")
            .with("resistance: 0.25 ohm", "resistance: 0.04 ohm")
            .line(
                "F5:",
                "F5: {kind: definite-time, pick-up: 30 A, time: 12 s, place: bank,"
                    + " measures-by: ct, trips: K1}");

    assertThat(text.finding(RULE, "sequence timer").verdict()).isEqualTo(Verdict.BREACH);
  }

  @ParameterizedTest
  @CsvSource({
    "F5, '  same-limit: true', '  same-limit: false', resistors.same-limit",
    "F5, '  stall-limit: {cold: 20 s, hot: 12 s}', '', motor.stall-limit",
    "sequence timer, '  same-limit: true', '  same-limit: false', resistors.same-limit"
  })
  void a_missing_limit_is_named_and_never_passes(
      String subject, String piece, String by, String path) {
    StarterText text = SMALL.with(piece, by);
    StarterText asked = subject.equals("F5") ? text : text.without("F5:");
    Finding finding = asked.finding(RULE, subject);

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).anyMatch(m -> m.startsWith(path));
    assertThat(asked.review().mustJudgeMissing()).contains(RULE);
  }

  @Test
  void a_timer_that_opens_an_unproven_contactor_is_not_judged() {
    Finding finding = SMALL.with("ratings: {AC-2: 125 A, AC-3: 125 A}, ", "").finding(RULE, "F5");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K1.ratings");
  }
}
