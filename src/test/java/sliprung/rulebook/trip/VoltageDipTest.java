package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.machine.Source;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Stage;

class VoltageDipTest {
  private static final EveryContactorStandsTheDip RULE = new EveryContactorStandsTheDip();
  private static final String FAULT = "fault-current: {max: 18 kA, min: 9 kA}";
  private static final String BAND = "band: [0 %, 0 %]";

  private static Finding judged(String subject, String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), subject);
  }

  @Test
  void should_pass_on_a_stiff_supply_and_say_what_it_assumes() {
    Finding finding = judged("K12");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("assumed on the same supply");
  }

  @Test
  void should_fail_on_a_weak_supply() {
    assertThat(judged("K12", FAULT, "fault-current: {max: 3 kA, min: 1.4 kA}").verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_take_the_voltage_behind_the_source_reactance() {
    Facts facts = CrusherFacts.of();
    Stage last = facts.permitted().findFirst().orElseThrow().history().stages().get(2);
    double slip = facts.machine().slip(last.trace().speed()[0]);
    Source source = new Source(690.0, Source.reactanceOf(690.0, 9000.0));
    double volts = facts.machine().at(source, 0.0, slip).terminalVolts();

    Finding finding = finding(RULE, facts, "K12");
    assertThat(finding.value().getAsDouble()).isCloseTo(volts, within(1e-6));
    assertThat(finding.limit().getAsDouble()).isCloseTo(0.85 * 690.0, within(1e-9));
  }

  @Test
  void should_turn_at_the_limits_of_operation() {
    double dip = judged("K12").value().getAsDouble() / 690.0;
    // voltage and dip scale together on a linear circuit, up to the speed then reached
    Finding outside = judged("K12", BAND, band(0.85 / dip - 1.0 - 0.02));
    Finding inside = judged("K12", BAND, band(0.85 / dip - 1.0 + 0.02));

    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(inside.verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void should_ask_the_line_contactor_to_close_on_its_own_dip() {
    Finding line = judged("K1");

    assertThat(line.limit().getAsDouble()).isCloseTo(0.85 * 690.0, within(1e-9));
  }

  @Test
  void should_ask_the_line_contactor_to_stay_in_where_a_later_dip_is_deeper() {
    // a small first step and a closing onto nearly all of the locked current
    String[] late = {
      FAULT,
      "fault-current: {max: 18 kA, min: 2.2 kA}",
      "0.1845 ohm",
      "0.9 ohm",
      "after: 6 s",
      "after: 0.5 s",
      "after: 4 s",
      "after: 0.4 s",
      "breakaway: 700 N·m",
      "breakaway: 300 N·m"
    };
    Finding line = judged("K1", late);

    assertThat(line.limit().getAsDouble()).isCloseTo(0.75 * 690.0, within(1e-9));
    assertThat(says(line)).contains("stay in");
  }

  private static String band(double low) {
    return String.format(java.util.Locale.ROOT, "band: [%.6f %%, 0 %%]", 100.0 * low);
  }

  @Test
  void should_not_judge_on_an_ideal_source() {
    Finding finding = judged("contactors", "  " + FAULT + "\n", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("supply.fault-current.min");
  }

  private static String[] undervoltage(double share, String time) {
    return new String[] {
      "F1: {kind: fuse",
      String.format(
          java.util.Locale.ROOT,
          "F7: {kind: undervoltage, below: %.4f %%, time: %s, accuracy: {pick-up: 5 %%}, trips: K1}"
              + "%n  F1: {kind: fuse",
          100.0 * share,
          time)
    };
  }

  /** The least voltage of the start, as a share of rated: the relay's 5 % come on top. */
  @Test
  void should_turn_where_the_highest_setting_meets_the_least_voltage() {
    double least = judged("F7", undervoltage(0.5, "0 s")).value().getAsDouble() / 690.0;
    assertThat(least).isBetween(0.8, 1.0);

    Finding inside = judged("F7", undervoltage(0.999 * least / 1.05, "0 s"));
    Finding outside = judged("F7", undervoltage(1.001 * least / 1.05, "0 s"));
    assertThat(inside.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(says(outside)).contains("opens K1");
  }

  @Test
  void should_call_it_tight_where_the_delay_alone_rides_through() {
    double least = judged("F7", undervoltage(0.5, "0 s")).value().getAsDouble() / 690.0;
    Finding delayed = judged("F7", undervoltage(1.001 * least / 1.05, "20 s"));

    assertThat(delayed.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(says(delayed)).contains("on its delay of 20 s alone");
  }

  @Test
  void should_not_judge_an_undervoltage_relay_on_an_ideal_source() {
    String[] relay = undervoltage(0.7, "1 s");
    Finding finding = judged("F7", relay[0], relay[1], "  " + FAULT + "\n", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void should_say_what_keeps_steps_from_being_in_when_the_voltage_returns() {
    assertThat(judged("return of the voltage").verdict()).isEqualTo(Verdict.CLEAR);
    Finding unproven =
        judged(
            "return of the voltage",
            "steps-open-before-line: true",
            "steps-open-before-line: false");
    assertThat(unproven.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(says(unproven)).contains("with steps still in");
  }
}
