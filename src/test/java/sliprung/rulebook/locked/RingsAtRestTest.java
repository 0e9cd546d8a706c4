package sliprung.rulebook.locked;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario.Kind;

class RingsAtRestTest {
  private static final TheRingsStandARotorAtRest RULE = new TheRingsStandARotorAtRest();
  private static final String BEFORE = "  cooling: 90 min\n";
  private static final String TIMER =
      "F5: {kind: sequence-timer, time: 15 s, until: last-step, trips: K1}";
  private static final String SENSOR = TIMER + "\n  F6: {kind: standstill, time: 4 s, trips: Q1}";

  private static Finding judged(String rings, String... more) {
    String[] all = new String[more.length + 2];
    all[0] = BEFORE;
    all[1] = BEFORE + rings;
    System.arraycopy(more, 0, all, 2, more.length);
    return finding(RULE, CrusherFacts.of(all), "slip rings");
  }

  private static String rated(double amps, double seconds) {
    return "  rings-at-rest: {current: " + amps + " A, time: " + seconds + " s}\n";
  }

  @Test
  void should_pass_with_a_rotation_sensor() {
    Finding finding = judged(rated(600, 60), TIMER, SENSOR);

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("the slip rings reach their limit after");
  }

  @Test
  void should_fail_where_nothing_clears_a_standing_rotor_in_time() {
    assertThat(judged(rated(600, 5)).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_turn_where_the_limit_comes_with_the_clearing() {
    // with the sensor alone in time, the greatest ring current at rest decides
    double amps =
        CrusherFacts.of(TIMER, SENSOR)
            .faults(Kind.RINGS_SHORTED)
            .findFirst()
            .orElseThrow()
            .history()
            .stages()
            .get(0)
            .trace()
            .ringAmps()[0];
    double cleared = 4.05;

    Finding inside = judged(rated(amps, cleared * 1.01), TIMER, SENSOR);
    Finding outside = judged(rated(amps, cleared * 0.99), TIMER, SENSOR);

    assertThat(inside.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(inside.margin().getAsDouble()).isCloseTo(1.01, within(1e-3));
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_hold_a_brake_that_releases_late_against_the_rings_too() {
    String brake = "  spread: [0 %, 0 %]\n  active: true\n  brake: 60 s\n";
    Finding finding = judged(rated(1000, 8), "  spread: [0 %, 0 %]\n", brake, TIMER, SENSOR);

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(says(finding)).contains("the rotor stands until the slip rings come to");
  }

  @Test
  void should_not_judge_without_their_rating() {
    Finding finding = judged("");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("motor.rings-at-rest");
  }
}
