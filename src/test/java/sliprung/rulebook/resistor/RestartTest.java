package sliprung.rulebook.resistor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.findings;
import static sliprung.fixture.CrusherFacts.says;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario.Kind;
import sliprung.runup.StartHistory;

class RestartTest {
  private static final TheRestartIsKnown RULE = new TheRestartIsKnown();
  private static final String DUTY = "starts: {cold: 1, hot: 1, per-hour: 4}";

  private static Restart restart(Facts facts, Restart.After after) {
    return Restarts.of(facts).stream().filter(r -> r.after() == after).findFirst().orElseThrow();
  }

  @Test
  void should_tell_the_pause_after_each_of_the_four() {
    List<Finding> all = findings(RULE, CrusherFacts.of());

    assertThat(all)
        .extracting(Finding::subject)
        .containsExactly(
            "after a stop", "after a trip", "after a held start", "after a locked start");
    assertThat(says(all.get(1))).contains("limits it");
  }

  private static double next(String ago) {
    Facts facts =
        CrusherFacts.of("class: 10,", "class: 5,", DUTY, DUTY + "\n  past-starts: " + ago);
    return restart(facts, Restart.After.PAST).seconds();
  }

  @Test
  void should_tell_when_the_next_may_follow_a_list_of_past_starts() {
    double now = next("[60 s, 2 s]");
    assertThat(now).isGreaterThan(100.0);
    // what is left shrinks by one factor for every second that all of it is older
    assertThat(next("[90 s, 32 s]")).isCloseTo(now - 30.0, within(1e-6 * now));
    assertThat(next("[60 s, 30 s, 2 s]")).isGreaterThan(now);
    assertThat(next("[2 s]")).isLessThan(now + 60.0);
    assertThat(next("[20 h]")).isZero();
  }

  @Test
  void should_turn_at_the_pause_that_the_duty_permits() {
    // a second start on a warm relay and winding needs a pause here
    String[] warm = {"class: 10,", "class: 5,"};
    double needed = restart(CrusherFacts.of(warm), Restart.After.STOP).seconds();
    assertThat(needed).isGreaterThan(1.0);

    assertThat(after(needed * 1.001, warm).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(after(needed * 0.999, warm).verdict()).isEqualTo(Verdict.TIGHT);
  }

  private static Finding after(double seconds, String... more) {
    String[] all = java.util.Arrays.copyOf(more, more.length + 2);
    all[more.length] = DUTY;
    all[more.length + 1] = DUTY + "\n  restart-after: " + seconds + " s";
    return finding(RULE, CrusherFacts.of(all), "after a stop");
  }

  @Test
  void should_never_be_sooner_than_a_restart_on_hot_sections_stands() {
    Facts facts = CrusherFacts.of();
    Restart trip = restart(facts, Restart.After.TRIP);
    StartHistory start = facts.permitted().findFirst().orElseThrow().history();
    ProtectionEvaluator evaluator = new ProtectionEvaluator(facts.starter(), facts.machine());
    List<Double> hot = evaluator.sectionLevelsAfter(start, PartPreload.COLD, 1);
    // after the pause each section has cooled at least with its own time constant
    List<Double> left =
        List.of(
            hot.get(0) * Math.exp(-trip.seconds() / 1200.0),
            hot.get(1) * Math.exp(-trip.seconds() / 1200.0));

    for (PartResponse part :
        evaluator.parts(CutHistory.startOnly(start), new PartPreload(0, 0, 0, left), 1)) {
      if (part.part().startsWith("section-")) {
        assertThat(part.use()).as(part.part()).isLessThan(1.0);
      }
    }
  }

  @Test
  void should_ask_for_an_inspection_where_nothing_cleared_in_time() {
    Finding finding =
        finding(
            RULE,
            CrusherFacts.of(
                "  F5: {kind: sequence-timer, time: 15 s, until: last-step, trips: K1}\n", ""),
            "after a held start");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(says(finding)).contains("past its limit: no pause makes that good");
  }

  @Test
  void should_cut_a_history_without_losing_heat() {
    StartHistory held = CrusherFacts.of().faults(Kind.HELD).findFirst().orElseThrow().history();
    StartHistory cut = CutHistory.until(held, 7.321);
    StartHistory rest = CutHistory.until(held, 14.642);

    double first = joule(cut);
    assertThat(cut.endSeconds()).isCloseTo(7.321, within(1e-9));
    assertThat(rest.endSeconds()).isCloseTo(14.642, within(1e-9));
    assertThat(joule(rest)).isGreaterThan(first);
    assertThat(joule(CutHistory.until(held, Double.POSITIVE_INFINITY))).isEqualTo(joule(held));
  }

  private static double joule(StartHistory history) {
    return history.stages().stream()
        .mapToDouble(s -> s.trace().integralOfSquare(s.trace().ringAmps()))
        .sum();
  }

  @Test
  void should_not_judge_without_the_cooling_of_the_motor() {
    Finding finding = finding(RULE, CrusherFacts.of("  cooling: 90 min\n", ""), "restart");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).contains("motor.cooling");
  }
}
