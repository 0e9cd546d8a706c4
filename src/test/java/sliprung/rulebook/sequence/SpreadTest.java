package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class SpreadTest {
  private static final TheStepsKeepTheirOrder RULE = new TheStepsKeepTheirOrder();
  private static final String CASCADED = "timer-spread: 0 %\nsequence: cascaded";
  private static final String K11 =
      "K11: {place: rotor, poles: delta, rotor-rating: 315 A, rated-voltage: 690 V, closing: 60 ms";

  private static Finding judged(String subject, String... replacements) {
    return finding(RULE, CrusherFacts.bare(replacements), subject);
  }

  @Test
  void should_pass_a_chain_by_its_wiring() {
    Finding finding = judged("sequence");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.says()).contains("chained");
  }

  @Test
  void should_pass_a_cascade_with_long_timers() {
    assertThat(judged("step 2", "timer-spread: 0 %", CASCADED).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void should_fail_a_cascaded_level_without_dwell_behind_a_slow_contactor() {
    Finding finding =
        judged(
            "step 2",
            "timer-spread: 0 %",
            CASCADED,
            "after: 4 s",
            "stator-below: 300 A",
            K11,
            K11.replace("60 ms", "80 ms"));

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.says()).contains("two sections go at once");
    assertThat(finding.margin().getAsDouble()).isCloseTo(60.0 / 80.0, within(1e-9));
  }

  @Test
  void should_turn_where_the_later_contactor_may_come_first() {
    // 0.2 s less 10 % and 60 ms to close against the one before
    assertThat(cascade(0.2401).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(cascade(0.2399).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(cascade(0.24 / 1.101).verdict()).isEqualTo(Verdict.CLEAR);
  }

  private static Finding cascade(double closing) {
    return judged(
        "step 2",
        "timer-spread: 0 %",
        "timer-spread: 10 %\nsequence: cascaded",
        "after: 4 s",
        "after: 0.2 s",
        K11,
        K11.replace("60 ms", 1000.0 * closing + " ms"));
  }

  @Test
  void should_not_apply_to_a_single_step() {
    Rule.Answer answer =
        RULE.judge(
            CrusherFacts.bare(
                "    - {resistance: 0.0930 ohm, continuous: 175 A, short-time: {current: 760 A, time:"
                    + " 16 s}}\n",
                "",
                "  - {contactor: K12, after: 4 s}\n",
                ""));

    assertThat(answer).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
