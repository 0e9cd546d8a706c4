package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.fixture.WithoutPeaks;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario;

class TorquePeakTest {
  private static final Rule RULE = new NoTorquePeakExceedsTheLimit();
  private static final String DUTY = "duty:\n";

  private static Facts facts(double limit) {
    return CrusherFacts.of(
        DUTY, String.format(Locale.ROOT, "limits: {torque-peak: %.9f N·m}\n", limit) + DUTY);
  }

  private static Finding judge(double limit) {
    return CrusherFacts.finding(RULE, facts(limit), "gear or belt");
  }

  private static double greatest() {
    return CrusherFacts.of()
        .permitted()
        .flatMap(s -> s.history().stages().stream())
        .mapToDouble(
            s -> Math.max(s.peak().orElseThrow().torque(), -s.peak().orElseThrow().leastTorque()))
        .max()
        .orElseThrow();
  }

  @Test
  void the_swing_of_line_closing_exceeds_what_the_steady_circuit_tells() {
    double steady =
        CrusherFacts.of().starts().get(0).history().stages().stream()
            .mapToDouble(s -> s.entry().torque())
            .max()
            .orElseThrow();
    assertThat(greatest()).isGreaterThan(1.3 * steady);
  }

  @Test
  void a_limit_just_above_the_peak_is_clear_and_just_below_it_a_breach() {
    Finding clear = judge(1.001 * greatest());
    assertThat(clear.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(clear.margin().getAsDouble()).isCloseTo(1.001, within(1e-6));
    assertThat(CrusherFacts.mend(clear)).isEmpty();

    Finding breach = judge(0.999 * greatest());
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(breach)).contains("at the peak after K1 has closed (step 1)");
    assertThat(CrusherFacts.mend(breach)).isNotEmpty();
  }

  @Test
  void without_peaks_nothing_is_clear() {
    Finding finding = CrusherFacts.finding(RULE, WithoutPeaks.of(facts(1e6)), "gear or belt");
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  private static Facts open(double limit) {
    return CrusherFacts.of(
        DUTY,
        String.format(Locale.ROOT, "limits: {torque-peak: %.9f N·m}\n", limit) + DUTY,
        "steps-open-before-line: true",
        "steps-open-before-line: false");
  }

  private static double reclosed() {
    return open(1e6)
        .faults(Scenario.Kind.RECLOSED)
        .mapToDouble(s -> s.history().stages().get(0).peak().orElseThrow().greatestTorque())
        .max()
        .orElseThrow();
  }

  @Test
  void a_reclosing_that_no_interlock_rules_out_is_held_against_the_limit() {
    assertThat(reclosed()).isGreaterThan(2.0 * greatest());
    Finding breach = CrusherFacts.finding(RULE, open(0.999 * reclosed()), "gear or belt, reclosed");
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(breach)).contains("the worst of any dead time counts");
    Finding clear = CrusherFacts.finding(RULE, open(1.001 * reclosed()), "gear or belt, reclosed");
    assertThat(clear.verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void an_interlock_that_proves_the_steps_open_leaves_only_permitted_starts() {
    Rule.Answer answer = RULE.judge(facts(1e6));
    assertThat(((Rule.Answer.Findings) answer).findings()).hasSize(1);
  }

  @Test
  void without_a_limit_it_has_no_subject() {
    assertThat(RULE.judge(CrusherFacts.of())).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
