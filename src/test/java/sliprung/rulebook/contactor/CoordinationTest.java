package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class CoordinationTest {
  private static final Rule RULE = new TheCoordinationIsDeclared();
  private static final String LINE = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final String FAULT = "fault-current: {max: 18 kA, min: 9 kA}";

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.bare(replacements), "K1");
  }

  private static String declared(String text) {
    return LINE + ", coordination: {" + text + "}";
  }

  @Test
  void one_per_cent_about_the_declared_current_turns_the_verdict() {
    assertThat(judge(LINE, declared("type: 2, with: F1, up-to: 18.18 kA")).verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(judge(LINE, declared("type: 2, with: F1, up-to: 17.82 kA")).verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void without_a_declared_current_the_test_current_of_its_size_counts() {
    String below = "fault-current: {max: 9.9 kA, min: 9 kA}";
    String above = "fault-current: {max: 10.1 kA, min: 9 kA}";

    assertThat(judge(LINE, declared("type: 1, with: F1"), FAULT, below).verdict())
        .isEqualTo(Verdict.CLEAR);
    Finding tight = judge(LINE, declared("type: 1, with: F1"), FAULT, above);
    assertThat(tight.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(tight.mend()).contains("coordination.up-to");
    assertThat(CrusherFacts.says(tight)).contains("may need new parts");
  }

  @Test
  void a_declaration_with_what_is_no_short_circuit_device_is_a_breach() {
    assertThat(judge(LINE, declared("type: 2, with: F2, up-to: 50 kA")).verdict())
        .isEqualTo(Verdict.BREACH);
  }

  @Test
  void what_is_not_declared_is_not_judged_and_asks_for_the_declaration() {
    Finding finding = judge();

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K1.coordination");
    assertThat(finding.mend()).startsWith("Declare");
    assertThat(CrusherFacts.says(finding)).contains("begin at 10 kA for its size");
  }

  @Test
  void missing_inputs_are_named() {
    assertThat(judge(LINE, declared("type: 2, with: F1"), "  " + FAULT + "\n", "").missing())
        .containsExactly("supply.fault-current");
    assertThat(judge(LINE, "ratings: {AC-2: 315 A}, coordination: {type: 2, with: F1}").missing())
        .containsExactly("contactors.K1.coordination.up-to");
  }

  @Test
  void without_a_line_contactor_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withoutLineContactor()))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
