package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.findings;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

class LateTest {
  private static final NoStepLingers RULE = new NoStepLingers();

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), "step 1");
  }

  private static Finding after(double seconds) {
    return judged("after: 6 s", "after: " + seconds + " s");
  }

  @Test
  void should_pass_while_the_motor_still_accelerates() {
    assertThat(after(3).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void should_be_tight_and_no_more_where_the_motor_waits_settled() {
    Finding finding = after(120);

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.margin()).isEmpty();
    assertThat(finding.value().getAsDouble()).isGreaterThan(finding.limit().getAsDouble());
    assertThat(CrusherFacts.says(finding)).contains("gain less than 0.5 %");
  }

  @Test
  void should_turn_where_half_of_the_step_is_waiting() {
    double low = 3;
    double high = 120;
    while (high - low > 0.2) {
      double middle = 0.5 * (low + high);
      if (after(middle).verdict() == Verdict.CLEAR) {
        low = middle;
      } else {
        high = middle;
      }
    }
    Finding inside = after(low);
    Finding outside = after(high);
    assertThat(inside.value().getAsDouble()).isLessThanOrEqualTo(0.5).isCloseTo(0.5, within(0.05));
    assertThat(outside.value().getAsDouble()).isGreaterThan(0.5).isCloseTo(0.5, within(0.05));
  }

  @Test
  void should_ask_the_corner_that_settles_latest() {
    Finding even = after(20);
    Finding spread = judged("after: 6 s", "after: 20 s", "band: [0 %, 0 %]", "band: [-20 %, 0 %]");

    assertThat(spread.value().getAsDouble()).isLessThan(even.value().getAsDouble());
  }

  @Test
  void should_not_apply_where_nothing_closes() {
    assertThat(findings(RULE, CrusherFacts.bare())).isEmpty();
  }
}
