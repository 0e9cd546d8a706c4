package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.Judged;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** {@code trip/running}. */
class RunningTest {
  private static final String RULE = "trip/running";
  private static final StarterText SMALL = StarterText.small();

  private static StarterText dial(double amps) {
    return SMALL.line(
        "F2:", StarterText.text("F2: {kind: overload, class: 10, dial: %s A, trips: K1}", amps));
  }

  /** The earliest compliant relay holds 1.05 times its dial (panel at 20 °C). */
  @Test
  void an_overload_holds_the_running_current_from_a_dial_of_it_over_1_05() {
    double running = SMALL.finding(RULE, "F2").value().orElseThrow();

    assertThat(running).isBetween(65.0, 80.0);
    Judged.over(RULE, "F2", RunningTest::dial)
        .turns(running / 1.05, Verdict.BREACH, Verdict.TIGHT)
        .turns(1.10 * running / 1.05, Verdict.TIGHT, Verdict.CLEAR);
  }

  /** With a panel at 40 °C or more the earliest relay holds no more than its dial. */
  @Test
  void a_hot_panel_takes_the_five_per_cent_away() {
    Finding cool = SMALL.finding(RULE, "F2");
    Finding hot = SMALL.with("panel: 20 °C", "panel: 45 °C").finding(RULE, "F2");

    assertThat(hot.margin().orElseThrow() * 1.05)
        .isCloseTo(cool.margin().orElseThrow(), within(1e-6));
  }

  @Test
  void the_greatest_running_current_decides_low_volts_and_heavy_load() {
    Finding finding = StarterText.crusher().finding(RULE, "F2");

    assertThat(finding.start().orElseThrow().corner().id()).startsWith("90v-heavy");
    // its panel is at 35 °C, where nothing promises the 1.05 of 20 °C
    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_device_on_the_rotor_side_is_held_against_the_ring_current() {
    Finding finding =
        SMALL
            .under(
                "F2:",
                "  F6: {kind: thermal, base: 200 A, factor: 1, time-constant: 10 min, place: rotor,"
                    + " measures-by: dc-capable, trips: K1}")
            .finding(RULE, "F6");

    double ring = finding.value().orElseThrow();
    assertThat(ring).isNotCloseTo(SMALL.finding(RULE, "F2").value().orElseThrow(), within(0.1));
    assertThat(finding.margin().orElseThrow()).isCloseTo(200.0 * 0.95 / ring, within(1e-6));
  }

  @Test
  void a_motor_that_cannot_carry_its_load_is_a_breach() {
    Finding finding = SMALL.with("running: 70 %", "running: 300 %").finding(RULE, "motor");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
  }

  /** Its least pick-up is not known: silence would read as a pass. */
  @Test
  void a_class_without_a_shortest_time_is_not_judged() {
    Finding finding =
        SMALL
            .line("F2:", "F2: {kind: overload, class: nema-20, dial: 104 A, trips: K1}")
            .finding(RULE, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("protection.F2.curve");
  }

  @Test
  void timers_measure_no_current_in_service() {
    StarterText text = SMALL.without("F1:").without("F2:");

    assertThat(text.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
  }
}
