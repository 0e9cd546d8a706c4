package sliprung.rulebook.sequence;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.findings;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

class EarlyTest {
  private static final NoStepClosesTooEarly RULE = new NoStepClosesTooEarly();
  private static final String INTERLOCKS =
      "interlocks: {steps-open-before-line: true, every-step-proven: true}";
  private static final String LATE = "after: 4 s";

  private static Finding judged(String subject, String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), subject);
  }

  private static String limit(String side, double amps) {
    return INTERLOCKS + "\nlimits: {closing-current: {" + side + ": " + amps + " A}}";
  }

  @Test
  void should_pass_where_the_last_step_closes_near_its_running_slip() {
    assertThat(judged("step 2", "0.0930 ohm", "0.030 ohm", LATE, "after: 9 s").verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void should_fail_where_a_step_closes_past_its_breakdown() {
    Finding finding = judged("step 2", LATE, "after: 0.2 s");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(says(finding)).contains("current rises while torque falls");
  }

  @Test
  void should_turn_where_slip_meets_breakdown_slip() {
    Facts facts = CrusherFacts.of();
    Closing closing = Closing.of(facts, 2).get(0);
    double slip = facts.machine().slip(closing.speed());
    double breakdown =
        facts.machine().breakdownSlip(closing.start().history().conditions().source(), 0.0);
    Finding finding = finding(RULE, facts, "step 2");

    assertThat(finding.margin().getAsDouble()).isCloseTo(breakdown / slip, within(1e-12));
    assertThat(finding.verdict()).isEqualTo(slip > breakdown ? Verdict.BREACH : Verdict.CLEAR);
    double early = 0.2;
    double late = 9.0;
    while (late - early > 1e-4) {
      double middle = 0.5 * (early + late);
      if (after(middle).verdict() == Verdict.BREACH) {
        early = middle;
      } else {
        late = middle;
      }
    }
    assertThat(after(late).margin().getAsDouble()).isGreaterThanOrEqualTo(1.0).isLessThan(1.001);
    assertThat(after(early).margin().getAsDouble()).isLessThan(1.0).isGreaterThan(0.999);
  }

  private static Finding after(double seconds) {
    return judged("step 2", LATE, "after: " + seconds + " s");
  }

  @Test
  void should_hold_the_closing_current_against_the_plants_limit() {
    String[] calm = {"0.0930 ohm", "0.030 ohm", LATE, "after: 9 s"};
    double amps = Closing.of(CrusherFacts.of(calm), 1).get(0).statorAmps();

    Finding inside = judged("step 1", with(calm, limit("stator", amps * 1.001)));
    Finding outside = judged("step 1", with(calm, limit("stator", amps * 0.999)));

    assertThat(inside.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.unit()).isEqualTo("A");
  }

  @Test
  void should_hold_the_rings_and_the_line_closing_against_it_too() {
    Finding rings = judged("step 1", INTERLOCKS, limit("rotor", 50));
    Finding line = judged("line closing", INTERLOCKS, limit("stator", 50));

    assertThat(rings.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(says(rings)).contains("in the rings");
    assertThat(line.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(says(line)).contains("the line contactor closes onto");
  }

  @Test
  void should_not_ask_the_line_closing_without_a_limit() {
    assertThat(findings(RULE, CrusherFacts.of()))
        .extracting(Finding::subject)
        .containsExactly("step 1", "step 2");
  }

  @Test
  void should_not_apply_where_no_start_was_computed() {
    assertThat(findings(RULE, CrusherFacts.bare())).isEmpty();
  }

  private static String[] with(String[] calm, String limit) {
    String[] all = java.util.Arrays.copyOf(calm, calm.length + 2);
    all[calm.length] = INTERLOCKS;
    all[calm.length + 1] = limit;
    return all;
  }
}
