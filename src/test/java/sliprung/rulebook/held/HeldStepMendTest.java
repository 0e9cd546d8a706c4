package sliprung.rulebook.held;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.fixture.StarterText;
import sliprung.machine.Identification;
import sliprung.machine.NameplateIdentification;
import sliprung.review.Reviewer;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** The mend that held/blind names is fitted, and the review says what it promised. */
class HeldStepMendTest {
  private static final StarterText SMALL = StarterText.small();
  private static final StarterText NO_TIMER = SMALL.without("F5:");

  private static Facts facts(StarterText text) {
    Starter starter = text.starter();
    Identification plate = NameplateIdentification.identify(starter.motor()).get(0);
    return Reviewer.facts(starter, Reviewer.machine(starter, plate), plate, "");
  }

  private static HeldStepMend cheapest(StarterText text) {
    return HeldStepMend.cheapest(facts(text)).orElseThrow();
  }

  private static Verdict worst(StarterText text, String rule) {
    return text.review().findings().stream()
        .filter(f -> f.rule().equals(rule))
        .map(Finding::verdict)
        .min(Verdict::compareTo)
        .orElseThrow();
  }

  /** Line closing to the last closing: 4 s and 2 s with 50 ms each; wanted 1.10. */
  @Test
  void chained_steps_need_no_more_than_a_sequence_timer() {
    HeldStepMend mend = cheapest(NO_TIMER);
    assertThat(mend.what()).startsWith("a sequence timer");
    assertThat(mend.window().low()).isCloseTo(6.10 * 1.10, within(0.01));
    assertThat(mend.why()).hasSize(1).allMatch(w -> w.startsWith("F2 "));

    double low = mend.window().low();
    double high = mend.window().high();
    assertThat(worst(timer(1.002 * low), "trip/start")).isNotEqualTo(Verdict.BREACH);
    assertThat(timer(1.002 * low).finding("sequence/supervision", "F5").verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(timer(0.99 * low).finding("sequence/supervision", "F5").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(worst(timer(0.999 * high), "held/exposure")).isEqualTo(Verdict.CLEAR);
    assertThat(worst(timer(1.01 * high), "held/exposure")).isEqualTo(Verdict.TIGHT);
  }

  private static StarterText timer(double seconds) {
    return SMALL.line(
        "F5:",
        StarterText.text(
            "F5: {kind: sequence-timer, time: %s s, until: last-step, trips: K1}", seconds));
  }

  /** A section that a bridging bank keeps for good ends no sequence: its contactor is asked. */
  @Test
  void a_cascade_over_a_bridging_bank_needs_a_proof_of_steps() {
    StarterText cascade =
        SMALL
            .with("cut-out: star-point", "cut-out: bridging")
            .with("sequence: chained", "sequence: cascaded");
    HeldStepMend mend = cheapest(cascade.without("F5:"));
    assertThat(mend.what()).startsWith("a proof of steps");
    assertThat(mend.why()).anyMatch(w -> w.startsWith("A sequence timer "));
    assertThat(mend.window().low()).isCloseTo(4.05 * 1.10, within(0.01));

    double high = mend.window().high();
    assertThat(worst(proof(cascade, 0.999 * high), "held/exposure")).isEqualTo(Verdict.CLEAR);
    assertThat(worst(proof(cascade, 0.999 * high), "held/blind")).isEqualTo(Verdict.CLEAR);
    assertThat(worst(proof(cascade, 1.01 * high), "held/exposure")).isEqualTo(Verdict.TIGHT);
  }

  private static StarterText proof(StarterText text, double seconds) {
    return text.line(
        "F5:", StarterText.text("F5: {kind: step-proof, time: %s s, trips: K1}", seconds));
  }

  /** A relay that already sits in the resistor leads costs a turn of its dial. */
  @Test
  void a_fitted_relay_that_can_be_turned_comes_first() {
    HeldStepMend mend = cheapest(bank(300.0));
    assertThat(mend.what()).startsWith("F5 as fitted");
    assertThat(mend.unit()).isEqualTo("A");
    double low = mend.window().low();
    double high = mend.window().high();
    assertThat(low).isLessThan(high);

    assertThat(worst(bank(0.999 * high), "held/exposure")).isEqualTo(Verdict.CLEAR);
    assertThat(worst(bank(1.01 * high), "held/exposure")).isNotEqualTo(Verdict.CLEAR);
    assertThat(bank(1.002 * low).finding("trip/start", "F5").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(bank(0.99 * low).finding("trip/start", "F5").verdict()).isEqualTo(Verdict.TIGHT);
  }

  private static StarterText bank(double dial) {
    return SMALL.line(
        "F5:",
        StarterText.text(
            "F5: {kind: thermal, base: %s A, factor: 1.05, time-constant: 120 s, place: bank,"
                + " measures-by: direct, memory: kept, trips: K1}",
            dial));
  }

  @Test
  void a_sensor_on_the_elements_has_a_window_of_kelvins() {
    StarterText rises =
        NO_TIMER
            .with(
                "time: 20 s}}\n    - {resistance: 0.25",
                "time: 20 s}, " + RISE + "}\n    - {resistance: 0.25")
            .with("current: 250 A, time: 20 s}}", "current: 250 A, time: 20 s}, " + RISE + "}");
    Facts facts = facts(rises);
    SettingWindow window =
        new HeldStepTrials(facts)
            .window(rise -> sensor(rise), 1.0, 1000.0, 1.21)
            .window()
            .orElseThrow();
    StarterText inside = rises.under("F2:", sensorText(0.999 * window.high()));
    assertThat(worst(inside, "held/exposure")).isEqualTo(Verdict.CLEAR);
    StarterText outside = rises.under("F2:", sensorText(1.5 * window.high()));
    assertThat(worst(outside, "held/exposure")).isNotEqualTo(Verdict.CLEAR);
    assertThat(
            rises
                .under("F2:", sensorText(1.002 * window.low()))
                .finding("trip/start", "T1")
                .verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  private static final String RISE = "rise: {continuous: 375 K, short-time: 375 K}";

  private static Device sensor(double rise) {
    return new Device.Temperature(
        new Device.Fitting("T1", Device.Place.BANK, Optional.of("K1"), Device.Measurement.DIRECT),
        List.of(1, 2),
        rise,
        false,
        new Device.Air(-5.0, 40.0),
        20.0,
        new Device.Accuracy(0.05, 0.20));
  }

  private static String sensorText(double rise) {
    return StarterText.text("  T1: {kind: temperature, rise: %s K, lag: 20 s, trips: K1}", rise);
  }

  @Test
  void without_anything_proven_to_break_no_mend_is_promised() {
    StarterText unproven =
        NO_TIMER
            .with("ratings: {AC-2: 125 A, AC-3: 125 A}, ", "")
            .with("Q1: {breaking: 20 kA, opening: 50 ms}", "Q1: {opening: 50 ms}");
    assertThat(HeldStepMend.cheapest(facts(unproven))).isEmpty();
  }

  @Test
  void the_finding_carries_the_window_and_what_a_declared_interlock_is_worth() {
    Finding finding = NO_TIMER.finding("held/blind", "step 1");
    assertThat(CrusherFacts.mend(finding))
        .contains("a sequence timer on the last step's auxiliary contact, opening K1, set between")
        .contains("6.72 s (the cold start must pass)")
        .contains("A rotation sensor sees nothing: the rotor turns at")
        .contains("interlocks.every-step-proven names no time");
  }
}
