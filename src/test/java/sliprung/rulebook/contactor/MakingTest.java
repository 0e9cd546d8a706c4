package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.tolerance.Corner;

class MakingTest {
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final Rule RULE = new TheLineContactorMakesWhatItClosesOnto();

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "K1");
  }

  private static double closing() {
    return StandstillCurrent.on(CrusherFacts.of(), 1, 1.0).orElseThrow().amps();
  }

  @Test
  void the_closing_current_is_that_of_the_circuit_at_rest_on_step_one() {
    Facts facts = CrusherFacts.of();
    double reactance = Source.reactanceOf(690, 9000);
    OperatingPoint at = facts.machine().at(new Source(690, reactance), 0.1845 + 0.0930, 1.0);
    StandstillCurrent found = StandstillCurrent.on(facts, 1, 1.0).orElseThrow();

    assertThat(found.amps()).isCloseTo(at.statorAmps(), within(1e-9));
    assertThat(found.powerFactor()).isCloseTo(at.powerFactor(), within(1e-12));
    assertThat(found.amps())
        .isCloseTo(
            facts.starts().get(0).history().stages().get(0).trace().statorAmps()[0], within(1e-6));
  }

  @Test
  void a_closing_current_one_per_cent_over_the_routine_capacity_is_tight() {
    // AC-2: routine 2, occasional 4 times the rating
    Finding below = judge(RATINGS, "ratings: {AC-2: " + closing() / 2 * 1.01 + " A}");
    Finding above = judge(RATINGS, "ratings: {AC-2: " + closing() / 2 * 0.99 + " A}");

    assertThat(below.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(above.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(above.wanted()).hasValueCloseTo(2.0, within(1e-12));
    assertThat(above.margin()).hasValueCloseTo(1.98, within(1e-9));
    assertThat(CrusherFacts.mend(above)).isNotEmpty();
  }

  @Test
  void one_per_cent_over_the_occasional_capacity_is_a_breach() {
    assertThat(judge(RATINGS, "ratings: {AC-2: " + closing() / 4 * 1.01 + " A}").verdict())
        .isEqualTo(Verdict.TIGHT);
    assertThat(judge(RATINGS, "ratings: {AC-2: " + closing() / 4 * 0.99 + " A}").verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void both_power_factors_are_stated() {
    assertThat(CrusherFacts.says(judge()))
        .startsWith("K1 closes onto ")
        .contains("on step 1 at a power factor of 0.8")
        .contains("AC-2: 2 × 315 A")
        .contains("AC-3: 10 × 315 A")
        .contains("at a power factor of 0.35")
        .contains("the interlock that proves every step open keeps it from that");
  }

  @Test
  void rings_shorted_count_only_where_no_interlock_rules_them_out() {
    Facts facts = CrusherFacts.of();
    StandstillCurrent shorted = StandstillCurrent.ringsShorted(facts).orElseThrow();
    double harder = Asymmetry.against(shorted.powerFactor(), 0.65);
    double needed = shorted.amps() * harder / 4.0;
    String open = "steps-open-before-line: false";
    String proven = "steps-open-before-line: true";

    Finding breach = judge(RATINGS, "ratings: {AC-2: " + needed * 0.99 + " A}", proven, open);
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(breach.margin()).hasValueCloseTo(0.99, within(1e-9));
    assertThat(CrusherFacts.says(breach)).startsWith("With rings shorted K1 would close onto ");
    assertThat(judge(RATINGS, "ratings: {AC-2: " + needed * 1.01 + " A}", proven, open).verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(judge(RATINGS, "ratings: {AC-2: " + needed * 0.99 + " A}").verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_lower_power_factor_than_tested_counts_by_its_peak() {
    assertThat(Asymmetry.factor(1.0)).isEqualTo(1.02);
    assertThat(Asymmetry.factor(0.0)).isCloseTo(2.0, within(1e-12));
    assertThat(Asymmetry.against(0.9, 0.65)).isEqualTo(1.0);
    assertThat(Asymmetry.against(0.2, 0.35))
        .isCloseTo(Asymmetry.factor(0.2) / Asymmetry.factor(0.35), within(1e-12))
        .isGreaterThan(1.1);
  }

  @Test
  void the_corner_of_the_greatest_closing_current_decides() {
    Facts facts =
        CrusherFacts.of(
            "band: [0 %, 0 %]", "band: [-5 %, +10 %]", "tolerance: 0 %", "tolerance: 8 %");
    Finding finding = CrusherFacts.finding(RULE, facts, "K1");
    Corner corner = finding.start().orElseThrow().corner();

    assertThat(corner.supplyPu()).isCloseTo(1.10, within(1e-12));
    assertThat(corner.bank()).isEqualTo(Corner.Bank.LOW);
    assertThat(finding.value().getAsDouble()).isGreaterThan(closing() * 1.09);
  }

  @Test
  void without_a_category_nothing_is_judged() {
    Finding finding = judge(RATINGS + ", ", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K1.ratings");
  }

  @Test
  void without_a_computed_start_nothing_is_judged() {
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "K1").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_a_line_contactor_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withoutLineContactor()))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
