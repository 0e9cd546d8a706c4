package sliprung.rulebook.shortcircuit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class CapacityTest {
  private static final Rule RULE = new TheGreatestFaultCurrentIsBroken();
  private static final String FUSE = "class: gG, rating: 250 A";

  private static Finding judge(String subject, String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.bare(replacements), subject);
  }

  @Test
  void one_per_cent_about_the_fault_current_turns_the_verdict_of_a_breaker() {
    assertThat(judge("Q1", "breaking: 25 kA", "breaking: 18.18 kA").verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(judge("Q1", "breaking: 25 kA", "breaking: 17.82 kA").verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void one_per_cent_about_the_fault_current_turns_the_verdict_of_a_fuse() {
    assertThat(judge("F1", FUSE, FUSE + ", breaking: 18.18 kA").verdict()).isEqualTo(Verdict.CLEAR);
    Finding outside = judge("F1", FUSE, FUSE + ", breaking: 17.82 kA");
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.mend()).isNotEmpty();
  }

  @Test
  void missing_inputs_are_named() {
    assertThat(judge("F1").missing()).containsExactly("protection.F1.breaking");
    assertThat(judge("Q1", "breaking: 25 kA, ", "").missing())
        .containsExactly("breakers.Q1.breaking");
    Finding fault = judge("Q1", "  fault-current: {max: 18 kA, min: 9 kA}\n", "");
    assertThat(fault.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(fault.missing()).containsExactly("supply.fault-current");
  }

  @Test
  void without_breaker_and_fuse_it_is_not_applicable() {
    assertThat(
            RULE.judge(
                CrusherFacts.bare(
                    "  F1: {kind: fuse, class: gG, rating: 250 A}\n",
                    "",
                    "breakers:\n  Q1: {breaking: 25 kA, opening: 50 ms}\n",
                    "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
