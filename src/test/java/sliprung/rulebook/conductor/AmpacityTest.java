package sliprung.rulebook.conductor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.tolerance.Corner;

class AmpacityTest {
  private static final Rule RULE = new TheCablesCarryTheirCurrent();

  private static Facts facts(double stator, double rotor, String... more) {
    String[] all = new String[more.length + 2];
    all[0] = "duty:\n";
    all[1] =
        "conductors:\n"
            + "  stator: {area: 120 mm2, metal: copper, insulation: XLPE, ampacity: "
            + stator
            + " A}\n  rotor: {area: 150 mm2, metal: copper, insulation: XLPE, ampacity: "
            + rotor
            + " A}\nduty:\n";
    System.arraycopy(more, 0, all, 2, more.length);
    return CrusherFacts.of(all);
  }

  private static Finding stator(double ampacity, String... more) {
    return CrusherFacts.finding(RULE, facts(ampacity, 400, more), "stator cable");
  }

  private static Finding rotor(double ampacity, String... more) {
    return CrusherFacts.finding(RULE, facts(400, ampacity, more), "rotor cable");
  }

  @Test
  void running_current_and_rms_of_the_duty_decide_under_iec() {
    Facts facts = facts(280, 340);
    double running = facts.running().get(Corner.NOMINAL).orElseThrow().point().ringAmps();
    Finding finding = CrusherFacts.finding(RULE, facts, "rotor cable");

    assertThat(finding.value().getAsDouble()).isBetween(running * 0.999999, running * 1.05);
    assertThat(CrusherFacts.says(finding))
        .contains("RMS over 4 starts an hour")
        .contains("for good");
  }

  @Test
  void one_per_cent_about_the_ampacity_turns_the_verdict() {
    double amps = stator(280).value().getAsDouble();

    assertThat(stator(amps * 1.01).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(stator(amps * 0.99).verdict()).isEqualTo(Verdict.BREACH);
    double ring = rotor(340).value().getAsDouble();
    assertThat(rotor(ring * 1.01).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(rotor(ring * 0.99).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void under_nec_125_per_cent_are_asked() {
    String[] nec = {"practice: iec", "practice: nec"};

    assertThat(stator(1.25 * 208 * 1.01, nec).verdict()).isEqualTo(Verdict.CLEAR);
    Finding below = stator(1.25 * 208 * 0.99, nec);
    assertThat(below.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(below.value()).hasValueCloseTo(260.0, within(1e-9));
    assertThat(rotor(1.25 * 285 * 1.01, nec).verdict()).isEqualTo(Verdict.CLEAR);
    Finding ring = rotor(1.25 * 285 * 0.99, nec);
    assertThat(ring.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(ring)).contains("To a separate bank 430.23(C) asks");
  }

  @Test
  void above_1000_V_nec_has_no_such_part() {
    Finding finding =
        CrusherFacts.finding(
            RULE,
            facts(400, 400, "practice: iec", "practice: nec", "690 V", "4160 V"),
            "rotor cable");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void missing_inputs_are_named() {
    Facts without =
        CrusherFacts.of(
            "duty:\n",
            "conductors:\n  stator: {area: 120 mm2, metal: copper, insulation: XLPE}\nduty:\n");
    assertThat(CrusherFacts.finding(RULE, without, "stator cable").missing())
        .containsExactly("conductors.stator.ampacity");
    Finding rotor = CrusherFacts.finding(RULE, without, "rotor cable");
    assertThat(rotor.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(rotor.missing()).containsExactly("conductors.rotor.ampacity");
    double running = stator(280).value().getAsDouble();
    assertThat(stator(running * 1.02, ", per-hour: 4", "").missing())
        .containsExactly("duty.starts.per-hour");
  }

  @Test
  void cables_that_are_not_described_are_not_judged() {
    Rule.Answer answer = RULE.judge(CrusherFacts.bare());
    assertThat(((Rule.Answer.Findings) answer).findings())
        .hasSize(2)
        .allSatisfy(f -> assertThat(f.verdict()).isEqualTo(Verdict.NOT_JUDGED))
        .allSatisfy(f -> assertThat(f.missing()).isNotEmpty());
  }
}
