package sliprung.rulebook.locked;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario.Kind;

class JammedWhileRunningTest {
  private static final JammedWhileRunningIsCleared RULE = new JammedWhileRunningIsCleared();
  private static final String SUBJECT = "running rotor";
  private static final String TIMER =
      "F5: {kind: sequence-timer, time: 15 s, until: last-step, trips: K1}";

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), SUBJECT);
  }

  private static String relay(double seconds) {
    return TIMER
        + "\n  F6: {kind: definite-time, pick-up: 500 A, time: "
        + seconds
        + " s, trips: Q1}";
  }

  @Test
  void should_pass_where_a_relay_opens_the_breaker_in_two_seconds() {
    Finding finding = judged(TIMER, relay(2.0));

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).startsWith("Jammed while running the motor draws").contains("F6");
  }

  @Test
  void should_turn_at_the_first_limit_over_the_clearing_time() {
    Facts facts = CrusherFacts.of(TIMER, relay(2.0));
    ComputedStart jammed = facts.faults(Kind.RUNNING_LOCKED).findFirst().orElseThrow();
    double limit =
        jammed.parts().stream()
            .filter(p -> p.missing().isEmpty())
            .mapToDouble(PartResponse::limitAtSeconds)
            .min()
            .orElseThrow();
    double opening = 0.05;

    Finding inside = judged("class: 10", "class: 30", TIMER, relay(limit / 1.001 - opening));
    Finding outside = judged("class: 10", "class: 30", TIMER, relay(limit / 0.999 - opening));

    assertThat(inside.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(inside.margin().getAsDouble()).isCloseTo(1.001, within(1e-9));
    Finding wanted = judged("class: 10", "class: 30", TIMER, relay(limit / 1.2501 - opening));
    assertThat(wanted.verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void should_not_count_a_sequence_timer_that_was_satisfied_long_before() {
    Facts facts = CrusherFacts.of();
    ComputedStart jammed = facts.faults(Kind.RUNNING_LOCKED).findFirst().orElseThrow();
    ComputedStart bySpeed =
        CrusherFacts.of("until: last-step", "until: {speed: 90 %}")
            .faults(Kind.RUNNING_LOCKED)
            .findFirst()
            .orElseThrow();

    assertThat(jammed.device("F5", Edge.SLOW).orElseThrow().operates()).isFalse();
    assertThat(bySpeed.device("F5", Edge.SLOW).orElseThrow().operates()).isFalse();
  }

  @Test
  void should_leave_the_relay_as_warm_as_the_least_load_of_the_spread() {
    Facts even = CrusherFacts.of();
    Facts spread = CrusherFacts.of("spread: [0 %, 0 %]", "spread: [-30 %, 0 %]");
    double all = clears(even);
    double less = clears(spread);
    double cold =
        even.faults(Kind.RINGS_SHORTED)
            .findFirst()
            .orElseThrow()
            .device("F2", Edge.SLOW)
            .orElseThrow()
            .operatesAtSeconds();

    assertThat(all).isLessThan(less);
    assertThat(less).isLessThan(cold);
  }

  private static double clears(Facts facts) {
    return facts
        .faults(Kind.RUNNING_LOCKED)
        .filter(s -> s.corner().isNominal())
        .findFirst()
        .orElseThrow()
        .device("F2", Edge.SLOW)
        .orElseThrow()
        .operatesAtSeconds();
  }

  @Test
  void should_not_judge_without_the_stall_limit() {
    Finding finding = judged("  stall-limit: {cold: 20 s, hot: 14 s}\n", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).contains("motor.stall-limit.cold");
  }
}
