package sliprung.rulebook.held;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code held/exposure} and {@code held/blind} on a starter whose sequence timer sees all. */
class HeldStepTest {
  private static final String EXPOSURE = "held/exposure";
  private static final String BLIND = "held/blind";
  private static final StarterText SMALL = StarterText.small();
  private static final StarterText NO_TIMER = SMALL.without("F5:");

  private static StarterText timer(double seconds) {
    return SMALL.line(
        "F5:",
        StarterText.text(
            "F5: {kind: sequence-timer, time: %s s, until: last-step, trips: K1}", seconds));
  }

  private static StarterText dial(double amps) {
    return NO_TIMER.line(
        "F2:", StarterText.text("F2: {kind: overload, class: 10, dial: %s A, trips: K1}", amps));
  }

  /** Nothing heats a section further once K1, which opens in 50 ms, has parted. */
  @ParameterizedTest
  @ValueSource(strings = {"step 1", "step 2"})
  void the_timer_and_the_opening_must_come_before_the_first_limit(String step) {
    Finding now = SMALL.finding(EXPOSURE, step);
    double limit = now.limit().orElseThrow();
    assertThat(now.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(now.value().orElseThrow()).isCloseTo(9.05, within(1e-9));
    assertThat(limit).isBetween(100.0, 400.0);

    Judged.over(EXPOSURE, step, HeldStepTest::timer)
        .turns(limit / 1.25 - 0.05, Verdict.CLEAR, Verdict.TIGHT)
        .turns(limit - 0.05, Verdict.TIGHT, Verdict.BREACH);
  }

  /** At the running torque, from hot, every element stays warmer than at the starting torque. */
  @Test
  void the_running_load_from_hot_decides() {
    assertThat(SMALL.finding(EXPOSURE, "step 1").start().orElseThrow().id())
        .isEqualTo("held-1-running-hot");
  }

  @ParameterizedTest
  @ValueSource(strings = {"step 1", "step 2"})
  void without_the_timer_nothing_clears_it(String step) {
    Finding finding = NO_TIMER.finding(EXPOSURE, step);

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin().orElseThrow()).isZero();
    assertThat(finding.value()).isEmpty();
  }

  /** It operates, and the stator stays closed: nothing is cleared. */
  @ParameterizedTest
  @ValueSource(strings = {", trips: K11", ""})
  void a_timer_that_opens_no_stator_contactor_clears_nothing(String trips) {
    StarterText text =
        SMALL.line("F5:", "F5: {kind: sequence-timer, time: 9 s, until: last-step" + trips + "}");

    assertThat(text.finding(EXPOSURE, "step 1").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(text.finding(EXPOSURE, "step 2").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(text.finding("sequence/supervision", "F5").verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void sections_that_carry_the_running_current_for_good_need_no_clearing() {
    StarterText strong =
        NO_TIMER
            .with("0.60 ohm, continuous: 45 A", "0.60 ohm, continuous: 90 A")
            .with("0.25 ohm, continuous: 55 A", "0.25 ohm, continuous: 90 A");

    assertThat(strong.finding(EXPOSURE, "step 1").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(strong.finding(BLIND, "step 1").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(strong.finding("sequence/supervision", "sequence timer").verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  /** Path of the input that is missing, and where it stood. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "{resistance: 0.60 ohm, continuous: 45 A, short-time: {current: 200 A, time: 20 s}}"
            + " | {resistance: 0.60 ohm, continuous: 45 A} | resistors.sections[1].short-time",
        "{resistance: 0.60 ohm, continuous: 45 A, short-time: {current: 200 A, time: 20 s}}"
            + " | {resistance: 0.60 ohm, short-time: {current: 200 A, time: 20 s}}"
            + " | resistors.sections[1].continuous",
        "same-limit: true | same-limit: false | resistors.same-limit",
        "  heating: 30 min | | motor.heating",
        "  stall-limit: {cold: 20 s, hot: 12 s} | | motor.stall-limit",
      })
  void a_missing_limit_is_named_and_never_passes(String piece, String by, String path) {
    StarterText text = SMALL.with(piece, by == null ? "" : by);
    for (String step : List.of("step 1", "step 2")) {
      Finding finding = text.finding(EXPOSURE, step);
      assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
      assertThat(finding.missing()).anyMatch(m -> m.startsWith(path));
    }
    assertThat(text.review().mustJudgeMissing()).contains(EXPOSURE);
  }

  /** Section 1 is known to burn; that the winding's limit is not known makes it no better. */
  @Test
  void a_known_limit_that_is_passed_is_a_breach_whatever_else_is_missing() {
    StarterText text = NO_TIMER.without("stall-limit:");

    assertThat(text.finding(EXPOSURE, "step 1").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(text.finding(BLIND, "step 1").verdict()).isEqualTo(Verdict.BREACH);
  }

  @ParameterizedTest
  @CsvSource({
    "'ratings: {AC-2: 125 A, AC-3: 125 A}, ', contactors.K1.ratings",
    "'ratings: {AC-2: 125 A, AC-3: 125 A}, rated-voltage: 400 V, ', contactors.K1.rated-voltage"
  })
  void a_contactor_that_nothing_proves_to_break_leaves_it_open(String piece, String path) {
    Finding finding = SMALL.with(piece, "").finding(EXPOSURE, "step 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly(path);
  }

  @Test
  void what_the_timer_sees_the_others_need_not() {
    Finding finding = SMALL.finding(BLIND, "step 2");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.says()).contains("F5 sees it").contains("F1, F2 stay blind");
  }

  @Test
  void without_the_timer_every_device_is_blind_and_the_part_that_heats_is_named() {
    Finding finding = NO_TIMER.finding(BLIND, "step 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.says()).containsIgnoringCase("section 1");
    assertThat(finding.mend()).contains("sequence timer");
  }

  /** The slowest compliant relay needs 1.20 times its dial, and then half an hour at most. */
  @Test
  void a_relay_sees_a_held_step_only_above_its_slow_pick_up() {
    double held = SMALL.finding(BLIND, "step 1").value().orElseThrow();

    assertThat(Judged.over(BLIND, "step 1", HeldStepTest::dial).verdict(held / 1.20 * 1.001))
        .isEqualTo(Verdict.BREACH);
    assertThat(Judged.over(BLIND, "step 1", HeldStepTest::dial).verdict(held / 1.20 * 0.95))
        .isEqualTo(Verdict.CLEAR);
  }

  /** The corner of least current decides: what is seen at heavy load alone is not seen. */
  @Test
  void seen_at_heavy_load_alone_is_blind() {
    double held = SMALL.finding(BLIND, "step 1").value().orElseThrow();
    StarterText spread =
        dial(held / 1.20 * 0.95).with("spread: [0 %, 0 %]", "spread: [-30 %, 0 %]");

    assertThat(spread.finding(BLIND, "step 1").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(spread.finding(BLIND, "step 1").value().orElseThrow()).isLessThan(held);
  }

  @Test
  void blind_and_without_the_sections_ratings_is_not_judged() {
    Finding finding =
        NO_TIMER.with("same-limit: true", "same-limit: false").finding(BLIND, "step 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).contains("resistors.same-limit");
  }

  /** The code counts the bank as protected; the answer stays a breach and says so. */
  @Test
  void under_the_american_code_the_physics_stays_what_it_is() {
    Finding finding = NO_TIMER.with("practice: iec", "practice: nec").finding(BLIND, "step 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.says()).contains("430.32(E)");
  }

  /** A section that a bridging bank keeps for good is a held step that ends no sequence. */
  @Test
  void a_skipped_section_of_a_bridging_bank_is_not_seen_by_a_timer_on_the_last_step() {
    StarterText bridging =
        SMALL
            .with("cut-out: star-point", "cut-out: bridging")
            .with("sequence: chained", "sequence: cascaded");
    Finding finding = bridging.finding(EXPOSURE, "step 1");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.start().orElseThrow().scenario().id()).startsWith("skipped-1");
    assertThat(bridging.finding(EXPOSURE, "step 2").verdict()).isEqualTo(Verdict.CLEAR);
  }
}
