package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class GradingTest {
  private static final TheClosingsAreEven RULE = new TheClosingsAreEven();

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), "closings");
  }

  /** The ratio that a second section of that many ohms gives. */
  private static Finding second(double ohms) {
    return judged("0.0930 ohm", ohms + " ohm");
  }

  @Test
  void should_be_tight_and_name_the_section_where_the_last_closing_stands_out() {
    Finding finding = second(0.14);

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.mend()).contains("section 2");
    assertThat(finding.margin()).isEmpty();
    assertThat(finding.value().getAsDouble()).isGreaterThan(finding.limit().getAsDouble());
  }

  @Test
  void should_turn_at_the_stated_ratio() {
    double even = 0.001;
    double uneven = 0.14;
    assertThat(second(uneven).verdict()).isEqualTo(Verdict.TIGHT);
    for (double ohms = 0.03; ohms < 0.14; ohms += 0.005) {
      if (second(ohms).verdict() == Verdict.CLEAR) {
        even = ohms;
      }
    }
    assertThat(second(even).verdict()).isEqualTo(Verdict.CLEAR);
    uneven = even + 0.005;
    while (uneven - even > 1e-5) {
      double middle = 0.5 * (even + uneven);
      if (second(middle).verdict() == Verdict.CLEAR) {
        even = middle;
      } else {
        uneven = middle;
      }
    }
    assertThat(second(even).value().getAsDouble()).isCloseTo(1.25, within(1e-3));
    assertThat(second(uneven).value().getAsDouble()).isCloseTo(1.25, within(1e-3));
  }

  @Test
  void should_take_the_ring_currents_just_after_the_closings() {
    Facts facts = CrusherFacts.of();
    List<Double> amps =
        Closing.of(facts.starter(), facts.permitted().findFirst().orElseThrow()).stream()
            .map(Closing::ringAmps)
            .toList();

    double ratio = Math.max(amps.get(0), amps.get(1)) / Math.min(amps.get(0), amps.get(1));
    assertThat(finding(RULE, facts, "closings").value().getAsDouble())
        .isCloseTo(ratio, within(1e-12));
  }

  @Test
  void should_not_judge_a_start_that_hangs() {
    Finding finding = judged("after: 4 s", "stator-below: 40 A");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void should_not_apply_to_a_single_step() {
    Rule.Answer answer =
        RULE.judge(
            CrusherFacts.of(
                "    - {resistance: 0.0930 ohm, continuous: 175 A, short-time: {current: 760 A, time:"
                    + " 16 s}}\n",
                "",
                "  - {contactor: K12, after: 4 s}\n",
                ""));

    assertThat(answer).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
