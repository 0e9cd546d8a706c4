package sliprung.rulebook.overload;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class DialTest {
  private static final Rule RULE = new TheDialFitsTheMotor();
  private static final String DIAL = "class: 10, dial: 208 A";
  private static final String NEC = "practice: nec";
  private static final String IEC = "practice: iec";

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.bare(replacements), "F2");
  }

  @Test
  void a_dial_at_rated_current_is_clear_with_exactly_the_margin_wanted() {
    Finding finding = judge();

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.margin()).hasValue(1.05);
    assertThat(finding.wanted()).hasValue(1.05);
    assertThat(CrusherFacts.says(finding))
        .startsWith("F2 is set to 208 A of full-load current and trips in the end at 250 A, 1.20");
  }

  @Test
  void up_to_five_per_cent_above_it_is_tight_and_names_the_dial() {
    Finding finding = judge(DIAL, "class: 10, dial: " + 208 * 1.01 + " A");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.margin()).hasValueCloseTo(1.05 / 1.01, within(1e-9));
    assertThat(CrusherFacts.mend(finding)).contains("208 A");
    assertThat(judge(DIAL, "class: 10, dial: " + 208 * 1.049 + " A").verdict())
        .isEqualTo(Verdict.TIGHT);
    Finding beyond = judge(DIAL, "class: 10, dial: " + 208 * 1.051 + " A");
    assertThat(beyond.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(beyond.limit()).hasValueCloseTo(1.05 * 1.2 * 208, within(1e-9));
  }

  @Test
  void a_service_factor_raises_the_limit() {
    assertThat(
            judge(DIAL, "class: 10, dial: 235 A", "service-factor: 1.0", "service-factor: 1.15")
                .verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_dial_that_means_ultimate_trip_counts_as_it_stands() {
    String dial = "class: 10, dial-means: ultimate-trip, dial: ";

    assertThat(judge(DIAL, dial + 249 + " A").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(judge(DIAL, dial + 252 + " A").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(judge(DIAL, dial + 263 + " A").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judge(DIAL, dial + 249 + " A").value()).hasValue(249.0);
  }

  @Test
  void a_dial_that_trips_in_service_is_tight_one_per_cent_either_side() {
    // the most sensitive relay of the class trips from 1.05 times the dial on
    assertThat(judge(DIAL, "class: 10, dial: " + 208 / 1.05 * 1.01 + " A").verdict())
        .isEqualTo(Verdict.CLEAR);
    Finding low = judge(DIAL, "class: 10, dial: " + 208 / 1.05 * 0.99 + " A");
    assertThat(low.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.says(low)).contains("it trips in service");
  }

  @Test
  void a_warm_panel_makes_the_relay_more_sensitive() {
    String dial = "class: 10, dial: " + 208 / 1.05 * 1.01 + " A";

    assertThat(judge(DIAL, dial, "panel: 20 °C", "panel: 40 °C").verdict())
        .isEqualTo(Verdict.TIGHT);
    // between its points the standard promises nothing
    assertThat(judge(DIAL, dial, "panel: 20 °C", "panel: 21 °C").verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_drive_that_needs_less_than_rated_current_may_be_set_lower() {
    String dial = "class: 10, dial: 170 A";

    assertThat(judge(DIAL, dial).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.of(DIAL, dial), "F2").verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void nec_counts_the_ultimate_trip_with_the_dials_own_quarter() {
    String sf = "service-factor: 1.15";

    Finding clear = judge(IEC, NEC, "service-factor: 1.0", sf);
    assertThat(clear.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(clear.value()).hasValueCloseTo(260.0, within(1e-9));
    assertThat(clear.limit()).hasValueCloseTo(260.0, within(1e-9));
    // full-load current on the dial of a motor without service factor: 125 % is over 115 %
    Finding tight = judge(IEC, NEC);
    assertThat(tight.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(tight.wanted()).hasValueCloseTo(1.30 / 1.15, within(1e-12));
    assertThat(judge(IEC, NEC, DIAL, "class: 10, dial: " + 208 * 0.92 + " A").verdict())
        .isNotEqualTo(Verdict.BREACH);
  }

  @Test
  void one_hundred_and_twenty_five_per_cent_on_a_dial_that_adds_a_quarter_is_a_breach() {
    Finding finding =
        judge(
            IEC,
            NEC,
            "service-factor: 1.0",
            "service-factor: 1.15",
            DIAL,
            "class: nema-20, dial: 260 A");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(finding)).contains("1.56 times the rated 208 A");
  }

  @Test
  void nec_is_tight_up_to_the_cap_and_a_breach_one_per_cent_beyond() {
    String ultimate = "class: 10, dial-means: ultimate-trip, dial: ";

    assertThat(judge(IEC, NEC, DIAL, ultimate + 208 * 1.30 * 0.99 + " A").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(judge(IEC, NEC, DIAL, ultimate + 208 * 1.30 * 1.01 + " A").verdict())
        .isEqualTo(Verdict.BREACH);
    assertThat(judge(IEC, NEC, DIAL, ultimate + 208 * 1.15 * 1.01 + " A").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(judge(IEC, NEC, DIAL, ultimate + 208 * 1.15 + " A").verdict())
        .isNotEqualTo(Verdict.BREACH);
  }

  @Test
  void nec_says_that_no_service_factor_was_given() {
    Finding finding = judge(IEC, NEC, "  service-factor: 1.0\n", "");

    assertThat(CrusherFacts.says(finding)).contains("no service factor given").contains("115 %");
  }

  @Test
  void nec_above_1500_hp_or_1000_volts_is_not_judged() {
    assertThat(judge(IEC, NEC, "power: 200 kW", "power: 1600 hp").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
    assertThat(judge(IEC, NEC, "voltage: 690 V", "voltage: 2300 V").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void in_the_rotor_the_rated_rotor_current_counts_and_in_bank_leads_none() {
    Finding rotor = judge(DIAL, "class: 10, dial: 285 A, place: rotor");
    // a relay in the rings leaves the stator line without one
    assertThat(
            CrusherFacts.findings(
                RULE, CrusherFacts.bare(DIAL, "class: 10, dial: 285 A, place: rotor")))
        .extracting(Finding::subject)
        .containsExactly("F2", "motor");
    Finding bank = judge(DIAL, "class: 10, dial: 130 A, place: bank");

    assertThat(rotor.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(rotor.limit()).hasValueCloseTo(1.2 * 285, within(1e-9));
    assertThat(judge(DIAL, "class: 10, dial: 302 A, place: rotor").verdict())
        .isEqualTo(Verdict.BREACH);
    assertThat(bank.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  private static final String F2 = "F2: {kind: overload, class: 10, dial: 208 A, trips: K1}";

  @Test
  void a_motor_without_any_overload_protection_is_a_breach_of_its_own() {
    Finding iec = CrusherFacts.finding(RULE, CrusherFacts.bare("  " + F2 + "\n", ""), "motor");

    assertThat(iec.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(iec)).startsWith("Nothing in the stator line protects the motor");
    assertThat(iec.reference()).startsWith("IEC 60204-1");
    Finding nec =
        CrusherFacts.finding(RULE, CrusherFacts.bare(IEC, NEC, "  " + F2 + "\n", ""), "motor");
    assertThat(nec.reference()).startsWith("NFPA 70 430.32");
  }

  @Test
  void an_element_set_for_short_circuits_protects_no_motor() {
    assertThat(
            CrusherFacts.finding(
                    RULE,
                    CrusherFacts.bare(F2, "F2: {kind: instantaneous, pick-up: 3000 A, trips: Q1}"),
                    "motor")
                .verdict())
        .isEqualTo(Verdict.BREACH);
  }

  private static Finding standIn(String... replacements) {
    return ((Rule.Answer.Findings) new TheDialFitsTheMotor().judge(CrusherFacts.bare(replacements)))
        .findings().stream().filter(f -> !f.subject().equals("motor")).findFirst().orElseThrow();
  }

  /** 300 A × 1.2 = 360 A, 173 % of 208 A: whatever else it does, it lets the winding burn. */
  @Test
  void a_thermal_relay_in_its_place_is_held_against_the_motor_too() {
    String relay = "kind: overload, class: 10, dial: 208 A, trips: K1";
    Finding far =
        standIn(relay, "kind: thermal, base: 300 A, factor: 1.2, time-constant: 10 min, trips: K1");
    assertThat(far.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(far.says()).contains("stands in for it");
    Finding near =
        standIn(relay, "kind: thermal, base: 208 A, factor: 1.1, time-constant: 10 min, trips: K1");
    assertThat(near.verdict()).isEqualTo(Verdict.CLEAR);
  }
}
