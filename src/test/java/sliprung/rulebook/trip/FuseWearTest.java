package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.StartHistory;

class FuseWearTest {
  private static final TheStartSparesTheFuse RULE = new TheStartSparesTheFuse();
  private static final String RATING = "rating: 250 A";

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), "F1");
  }

  private static String k(double k) {
    return "interlocks: {steps-open-before-line: true, every-step-proven: true}\nfuse-wear: " + k;
  }

  private static final String INTERLOCKS =
      "interlocks: {steps-open-before-line: true, every-step-proven: true}";

  @Test
  void should_pass_behind_a_large_fuse_and_say_that_it_rests_on_gates() {
    Finding finding = judged(RATING, "rating: 400 A");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("most loaded").contains("rests on the gates");
  }

  @Test
  void should_fail_behind_a_fuse_that_even_at_its_slowest_is_worn() {
    assertThat(judged(RATING, "rating: 80 A").verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_turn_at_k() {
    double share = judged(RATING, "rating: 400 A").value().orElseThrow();

    Finding inside = judged(RATING, "rating: 400 A", INTERLOCKS, k(share * 1.01));
    Finding outside = judged(RATING, "rating: 400 A", INTERLOCKS, k(share * 0.99));

    assertThat(inside.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(inside.margin().getAsDouble()).isCloseTo(1.01, within(1e-9));
    // over K at the fast edge alone: the gates leave it open
    assertThat(outside.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(says(outside)).contains("Over the whole band");
  }

  @Test
  void should_breach_only_where_the_slow_edge_is_over_k_too() {
    Finding breach = judged(RATING, "rating: 80 A");
    double slow = breach.value().orElseThrow();

    assertThat(slow).isGreaterThan(0.65);
    Finding open = judged(RATING, "rating: 80 A", INTERLOCKS, k(slow * 1.01));
    assertThat(open.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(open.missing()).containsExactly("protection.F1.curve");
  }

  @Test
  void should_not_apply_without_a_fuse() {
    Rule.Answer answer =
        RULE.judge(CrusherFacts.of("  F1: {kind: fuse, class: gG, rating: 250 A}\n", ""));

    assertThat(answer).isInstanceOf(Rule.Answer.NotApplicable.class);
  }

  @Test
  void should_not_judge_a_rating_that_has_no_gates() {
    Finding finding = judged(RATING, "rating: 251 A");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("protection.F1.curve");
  }

  @Test
  void should_never_find_a_stretch_with_a_greater_rms_than_the_most_loaded_seconds() {
    Facts facts = CrusherFacts.of();
    StartHistory start = facts.permitted().findFirst().orElseThrow().history();
    MostLoaded loaded = MostLoaded.of(start);
    var first = start.stages().get(0).trace();

    double stage = first.seconds()[first.last()] - first.seconds()[0];
    double rms = Math.sqrt(first.integralOfSquare(first.statorAmps()) / stage);
    assertThat(loaded.rmsOver(stage)).isGreaterThanOrEqualTo(rms);
    assertThat(loaded.rmsOver(1e-9)).isLessThanOrEqualTo(loaded.greatestAmps() * (1 + 1e-12));
    assertThat(loaded.seconds()).isCloseTo(start.runUpSeconds().orElseThrow(), within(1e-9));
  }
}
