package sliprung.rulebook.shortcircuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class MinimumTest {
  private static final String FAULT = "fault-current: {max: 18 kA, min: 9 kA}";

  /** Five seconds at 1000 A. */
  private static final Rule RULE =
      new TheLeastFaultCurrentIsCleared(f -> new FixedTimes(i -> 5e6 / (i * i)));

  private static Finding judge(Rule rule, String... replacements) {
    return CrusherFacts.finding(rule, CrusherFacts.bare(replacements), "F1");
  }

  private static Finding least(double amps) {
    return judge(RULE, FAULT, "fault-current: {max: 18 kA, min: " + amps + " A}");
  }

  @Test
  void one_per_cent_about_the_current_cleared_in_five_seconds_turns_the_verdict() {
    double threePhase = 1000 / (Math.sqrt(3) / 2);

    assertThat(least(threePhase * 1.01).verdict()).isEqualTo(Verdict.CLEAR);
    Finding outside = least(threePhase * 0.99);
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.margin()).hasValueCloseTo(0.99, within(1e-6));
  }

  @Test
  void the_fuse_of_the_crusher_clears_its_least_fault_and_the_cables_end_is_not_modelled() {
    Finding finding = judge(new TheLeastFaultCurrentIsCleared());

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    // I_max(5 s) of gG 250 A
    assertThat(finding.limit()).hasValueCloseTo(1650.0, within(0.01));
    assertThat(CrusherFacts.says(finding)).contains("At the cable's end there is less");
  }

  @Test
  void a_device_that_never_clears_is_a_breach() {
    Rule never =
        new TheLeastFaultCurrentIsCleared(f -> new FixedTimes(i -> Double.POSITIVE_INFINITY));

    assertThat(judge(never).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void without_the_least_fault_current_nothing_is_judged() {
    Finding finding = judge(RULE, FAULT, "fault-current: {max: 18 kA}");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("supply.fault-current.min");
  }

  @Test
  void without_a_short_circuit_device_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.bare("  F1: {kind: fuse, class: gG, rating: 250 A}\n", "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
