package sliprung.rulebook.overload;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class RotorTest {
  private static final Rule RULE = new NoOverloadIsCreditedWithTheBank();
  private static final String TIMER =
      "  F5: {kind: sequence-timer, time: 15 s, until: last-step, trips: K1}\n";

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "F2");
  }

  @Test
  void where_a_timer_clears_the_held_steps_the_relay_is_not_needed() {
    assertThat(judge().verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(judge()))
        .startsWith("F2 sees nothing of the bank held on step 1, 2.")
        .contains("It is not needed");
  }

  @Test
  void where_nothing_else_does_it_is_tight_and_never_a_breach() {
    Finding finding = judge(TIMER, "");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.mend()).startsWith("Fit a sequence timer");
  }

  @Test
  void one_per_cent_about_the_wanted_clearing_ratio_turns_the_verdict() {
    double ratio = judge().margin().getAsDouble();

    assertThat(
            judge("interlocks:", "margins: {overload/rotor: " + ratio / 1.01 + "}\ninterlocks:")
                .verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(
            judge("interlocks:", "margins: {overload/rotor: " + ratio * 1.01 + "}\ninterlocks:")
                .verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_relay_in_the_resistor_leads_is_the_banks_own() {
    Finding finding = judge("class: 10, dial: 208 A", "class: 10, dial: 208 A, place: bank");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(finding)).contains("resistor leads");
  }

  @Test
  void under_nec_the_code_and_the_physics_are_told_apart() {
    assertThat(CrusherFacts.says(judge("practice: iec", "practice: nec")))
        .contains("430.32(E)")
        .contains("the physics does not");
  }

  @Test
  void missing_inputs_are_named() {
    Finding finding = judge("continuous: 130 A, ", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).anyMatch(m -> m.startsWith("resistors.sections"));
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "F2").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_an_overload_it_is_not_applicable() {
    assertThat(
            RULE.judge(
                CrusherFacts.bare(
                    "  F2: {kind: overload, class: 10, dial: 208 A, trips: K1}\n", "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }

  /** A plant may want less than the book: what is past a limit is still told without a margin. */
  @Test
  void a_wanted_margin_below_one_never_makes_a_limit_that_is_passed_clear() {
    double limit = judge().limit().getAsDouble();
    Finding finding =
        judge(
            "time: 15 s, until",
            "time: " + limit / 0.95 + " s, until",
            "interlocks:",
            "margins: {overload/rotor: 0.9}\ninterlocks:");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
  }
}
