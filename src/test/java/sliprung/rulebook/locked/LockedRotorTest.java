package sliprung.rulebook.locked;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/**
 * {@code locked/sequence}, {@code locked/step} and {@code locked/shorted} on a starter with a
 * rotation sensor.
 */
class LockedRotorTest {
  private static final StarterText SMALL = StarterText.small();
  private static final StarterText SENSOR = sensor(3.0);

  private static StarterText sensor(double seconds) {
    return SMALL.under(
        "F5:", StarterText.text("  F6: {kind: standstill, time: %s s, trips: K1}", seconds));
  }

  private static StarterText timer(String until) {
    return SMALL.line(
        "F5:", "F5: {kind: sequence-timer, time: 9 s, until: " + until + ", trips: K1}");
  }

  @ParameterizedTest
  @CsvSource({
    "locked/sequence, sequence",
    "locked/step, step 1",
    "locked/step, step 2",
    "locked/shorted, rings shorted"
  })
  void a_rotation_sensor_must_clear_before_the_first_limit(String rule, String subject) {
    Finding now = SENSOR.finding(rule, subject);
    assertThat(now.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(now.value().orElseThrow()).isCloseTo(3.05, within(1e-6));
    double limit = now.limit().orElseThrow();
    assertThat(limit).isBetween(6.0, 25.0);

    // the sequence timer would clear a step at 9.05 s: it is taken out
    Judged.over(rule, subject, s -> sensor(s).without("F5:"))
        .turns(limit / 1.25 - 0.05, Verdict.CLEAR, Verdict.TIGHT)
        .turns(limit - 0.05, Verdict.TIGHT, Verdict.BREACH);
  }

  /** Time-closed steps close on a standing rotor: the timer's stop event comes after 6.10 s. */
  @Test
  void a_timer_on_the_last_step_is_satisfied_by_time_closed_steps() {
    Finding satisfied = timer("last-step").finding("locked/sequence", "sequence");
    assertThat(satisfied.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(satisfied.value().orElseThrow()).isGreaterThan(20.0);
    assertThat(satisfied.says()).contains("sequence timer that waits for the last step");

    Finding waiting = timer("{speed: 90 %}").finding("locked/sequence", "sequence");
    assertThat(waiting.value().orElseThrow()).isCloseTo(9.05, within(1e-6));
    assertThat(waiting.verdict()).isNotEqualTo(Verdict.BREACH);
  }

  /** A rotor frequency never falls on a standing rotor: the sequence stops, the timer runs on. */
  @Test
  void a_timer_on_the_last_step_sees_a_sequence_that_a_frequency_stops() {
    StarterText frequency =
        SMALL.with(
            "{contactor: K12, after: 2 s}", "{contactor: K12, rotor-frequency-below: 12 Hz}");
    Finding finding = frequency.finding("locked/sequence", "sequence");

    assertThat(finding.value().orElseThrow()).isCloseTo(9.05, within(1e-6));
    assertThat(finding.start().orElseThrow().history().stages()).hasSize(2);
  }

  /** With the last step in from the beginning its auxiliary contact tells the timer nothing. */
  @Test
  void a_timer_on_the_last_step_is_no_help_with_rings_shorted() {
    Finding satisfied = timer("last-step").finding("locked/shorted", "rings shorted");
    Finding waiting = timer("{speed: 90 %}").finding("locked/shorted", "rings shorted");

    assertThat(satisfied.value().orElse(Double.POSITIVE_INFINITY)).isGreaterThan(10.0);
    assertThat(waiting.value().orElseThrow()).isCloseTo(9.05, within(1e-6));
  }

  @Test
  void a_motor_hot_from_running_reaches_its_limits_sooner() {
    StarterText noRings =
        new StarterText(SENSOR.yaml()).with("  rings-at-rest: {current: 300 A, time: 30 s}\n", "");
    Finding finding = noRings.finding("locked/shorted", "rings shorted");

    assertThat(finding.start().orElseThrow().id()).isEqualTo("rings-shorted-hot");
  }

  @ParameterizedTest
  @CsvSource({
    "locked/sequence, sequence, '  stall-limit: {cold: 20 s, hot: 12 s}', motor.stall-limit",
    "locked/shorted, rings shorted, '  stall-limit: {cold: 20 s, hot: 12 s}', motor.stall-limit",
    "locked/step, step 1, '  stall-limit: {cold: 20 s, hot: 12 s}', motor.stall-limit",
    "locked/sequence, sequence, '  heating: 30 min', motor.heating",
    "locked/step, step 2, '  same-limit: true', resistors.same-limit",
  })
  void a_missing_limit_is_named_and_never_passes(
      String rule, String subject, String piece, String path) {
    Finding finding =
        SENSOR
            .with(piece, piece.contains("same-limit") ? "  same-limit: false" : "")
            .finding(rule, subject);

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).anyMatch(m -> m.startsWith(path));
  }

  @Test
  void a_rule_that_must_be_judged_and_is_not_ends_the_clear_review() {
    StarterText text = SENSOR.with("  stall-limit: {cold: 20 s, hot: 12 s}\n", "");

    assertThat(text.review().mustJudgeMissing()).contains("locked/sequence");
  }
}
