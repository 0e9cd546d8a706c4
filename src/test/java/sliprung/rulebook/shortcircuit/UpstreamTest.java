package sliprung.rulebook.shortcircuit;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class UpstreamTest {
  private static final Rule RULE = new TheUpstreamFuseStaysWhole();

  private static Finding above(String upstream) {
    return CrusherFacts.finding(
        RULE, CrusherFacts.bare("  F1: {", "  F0: {kind: fuse, " + upstream + "}\n  F1: {"), "F0");
  }

  @Test
  void two_steps_of_the_series_are_selective_and_one_is_not() {
    assertThat(above("class: gG, rating: 400 A").verdict()).isEqualTo(Verdict.CLEAR);
    Finding one = above("class: gG, rating: 315 A");
    assertThat(one.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(one)).contains("1 step of the rating series apart");
  }

  @Test
  void another_class_or_rating_is_not_judged() {
    assertThat(above("class: aM, rating: 400 A").verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(above("class: gG, rating: 425 A").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void a_single_fuse_has_nothing_upstream() {
    assertThat(RULE.judge(CrusherFacts.bare())).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
