package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

class AnswersTest {
  private static final Review BREACHED = CrusherReview.plain();
  private static final Review TIGHT = CrusherReview.of("JC-1", "unused", false);

  @Test
  void should_put_each_rule_under_its_question() {
    assertThat(Question.of("trip/start")).isEqualTo(Question.GOOD_START);
    assertThat(Question.of("sequence/pull-through")).isEqualTo(Question.GOOD_START);
    assertThat(Question.of("sequence/supervision")).isEqualTo(Question.FAILED_START);
    assertThat(Question.of("held/exposure")).isEqualTo(Question.FAILED_START);
    assertThat(Question.of("short-circuit/rating")).isEqualTo(Question.PARTS);
    assertThat(Question.of("data/assumed")).isEqualTo(Question.UNKNOWN);
  }

  @Test
  void should_list_what_was_not_judged_under_the_last_question_only() {
    Answers answers = Answers.of(TIGHT);
    assertThat(answers.to(Question.UNKNOWN).findings())
        .extracting(Finding::rule)
        .containsExactly("locked/rings");
    assertThat(answers.to(Question.FAILED_START).findings())
        .extracting(Finding::rule)
        .containsExactly("locked/sequence");
    assertThat(answers.to(Question.FAILED_START).elsewhere())
        .extracting(Finding::rule)
        .containsExactly("locked/rings");
  }

  @Test
  void should_never_call_a_question_clear_while_a_rule_of_it_is_not_judged() {
    assertThat(Answers.of(TIGHT).to(Question.FAILED_START).worst()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void should_not_judge_a_question_without_findings() {
    Review empty = with(TIGHT, List.of(), List.of());
    assertThat(Answers.of(empty).to(Question.PARTS).worst()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(Answers.of(empty).headline()).isEqualTo("Nothing could be judged.");
  }

  @Test
  void should_name_a_missing_must_judge_rule_in_the_headline_and_in_its_question() {
    Review missing = with(TIGHT, TIGHT.findings(), List.of("resistor/start"));
    Answers answers = Answers.of(missing);
    assertThat(answers.headline())
        .startsWith("No breach found")
        .contains("must be judged was not judged: resistor/start.");
    assertThat(answers.to(Question.PARTS).worst()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void should_say_the_breach_first_and_in_its_own_words() {
    assertThat(Answers.of(BREACHED).headline())
        .isEqualTo("One breach. Worst: Held on step 2 the motor draws 152 A.");
  }

  @Test
  void should_say_the_thinnest_margin_where_nothing_is_breached() {
    assertThat(Answers.of(TIGHT).headline())
        .isEqualTo("No breach but 1 accepted deviation. Thinnest: K1 makes 1 299 A.");
    List<Finding> trips =
        TIGHT.findings().stream().filter(f -> f.rule().startsWith("trip")).toList();
    assertThat(Answers.of(with(TIGHT, trips, List.of())).headline())
        .isEqualTo("No breach. Thinnest: F3 comes within 7\u00a0% of tripping a hot start.");
  }

  @Test
  void should_never_round_a_thin_margin_up_to_the_wanted_one() {
    Finding thin = margin(1.0996, 1.10);
    assertThat(FindingText.marginOfWanted(thin)).isEqualTo("1.0996 of 1.10");
    assertThat(FindingText.marginOfWanted(margin(1.07, 1.10))).isEqualTo("1.07 of 1.10");
  }

  @Test
  void should_end_a_sentence_at_its_stop_not_at_a_decimal_point() {
    assertThat(FindingText.firstSentence("F5 clears after 13.7 s. Clearing ratio 7.9."))
        .isEqualTo("F5 clears after 13.7 s.");
    assertThat(FindingText.furtherSentences("F5 clears after 13.7 s. Clearing ratio 7.9."))
        .isEqualTo("Clearing ratio 7.9.");
  }

  @Test
  void should_say_what_to_give_where_nothing_could_be_judged() {
    Finding rings = Answers.of(TIGHT).to(Question.UNKNOWN).findings().get(0);
    assertThat(FindingText.because(rings))
        .isEqualTo("Slip rings at rest are not described: give motor.rings-at-rest");
  }

  private static Finding margin(double margin, double wanted) {
    return new Finding(
        "resistor/start",
        Verdict.TIGHT,
        "section-1",
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.of(margin),
        OptionalDouble.of(wanted),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        "",
        "Says.",
        "",
        "",
        List.of(),
        "",
        Optional.empty(),
        Optional.empty());
  }

  private static Review with(Review review, List<Finding> findings, List<String> missing) {
    return new Review(
        review.starter(),
        review.date(),
        review.machine(),
        review.identification(),
        review.starts(),
        new ArrayList<>(findings),
        review.notApplicable(),
        review.notBuilt(),
        missing);
  }
}
