package sliprung.rulebook.shortcircuit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class RatingTest {
  private static final Rule RULE = new TheShortCircuitDeviceIsRatedAsAllowed();
  private static final String FUSE = "rating: 250 A";
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final String DECLARED = RATINGS + ", coordination: {type: 2, with: F1}";

  private static Finding nec(String... replacements) {
    String[] all = new String[replacements.length + 2];
    all[0] = "practice: iec";
    all[1] = "practice: nec";
    System.arraycopy(replacements, 0, all, 2, replacements.length);
    return CrusherFacts.finding(RULE, CrusherFacts.bare(all), "F1");
  }

  private static Finding iec(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "F1");
  }

  @Test
  void one_per_cent_about_the_next_standard_size_turns_clear_to_tight() {
    // 150 % of the plate's 208 A is 312 A, next standard size 350 A
    assertThat(nec(FUSE, "rating: 350 A").verdict()).isEqualTo(Verdict.CLEAR);
    Finding above = nec(FUSE, "rating: 353.5 A");
    assertThat(above.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.says(above)).contains("the plate; table 430.250 has no such motor");
  }

  @Test
  void one_per_cent_about_the_second_exception_turns_tight_to_a_breach() {
    // 225 % of 208 A is 468 A
    assertThat(nec(FUSE, "rating: 463.3 A").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(nec(FUSE, "rating: 472.7 A").verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void an_instantaneous_breaker_goes_by_its_own_row() {
    String[] f4 = {
      "practice: iec",
      "practice: nec",
      "  F5: {",
      "  F4: {kind: instantaneous, pick-up: 1680 A, trips: Q1}\n  F5: {"
    };
    Finding finding = CrusherFacts.finding(RULE, CrusherFacts.bare(f4), "F4");

    // 800 % of 208 A is 1664 A
    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.limit().getAsDouble()).isEqualTo(1664);
  }

  @Test
  void above_1000_V_the_section_does_not_apply() {
    assertThat(nec("690 V", "4160 V").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void under_iec_it_rides_through_the_start_as_the_declared_device() {
    Finding finding = iec(RATINGS, DECLARED);
    double margin = finding.margin().getAsDouble();

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(iec(RATINGS, DECLARED, "interlocks:", wanted(margin / 1.01)).verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(iec(RATINGS, DECLARED, "interlocks:", wanted(margin * 1.01)).verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  private static String wanted(double margin) {
    return "margins: {short-circuit/rating: " + margin + "}\ninterlocks:";
  }

  @Test
  void a_fuse_that_melts_in_a_permitted_start_is_a_breach() {
    assertThat(iec(RATINGS, DECLARED, FUSE, "rating: 100 A").verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void without_a_declared_coordination_it_is_at_best_tight() {
    Finding finding = iec();

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.mend()).contains("contactors.K1.coordination");
  }

  @Test
  void without_a_computed_start_nothing_is_judged() {
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "F1").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_a_short_circuit_device_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.bare("  F1: {kind: fuse, class: gG, rating: 250 A}\n", "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
