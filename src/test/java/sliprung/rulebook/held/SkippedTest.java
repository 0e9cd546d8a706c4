package sliprung.rulebook.held;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.findings;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario.Kind;

class SkippedTest {
  private static final TwoSectionsAtOnceAreStood RULE = new TwoSectionsAtOnceAreStood();
  private static final String CHAIN = "timer-spread: 0 %";
  private static final String CASCADE = "timer-spread: 0 %\nsequence: cascaded";
  private static final String PROVEN = "steps-open-before-line: true";
  private static final String OPEN = "steps-open-before-line: false";
  private static final String K12 = "K12: {place: rotor, poles: delta, rotor-rating: 315 A";
  private static final String SKIPPED = "step 1 skipped";

  private static Finding judged(String subject, String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), subject);
  }

  private static Finding rated(double amps) {
    return judged(SKIPPED, CHAIN, CASCADE, K12, K12.replace("315", Double.toString(amps)));
  }

  @Test
  void should_pass_where_the_next_contactor_makes_both_sections() {
    Finding finding = judged(SKIPPED, CHAIN, CASCADE);

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("cuts out sections 1 and 2 at once").contains("RMS figure");
  }

  @Test
  void should_turn_at_four_times_the_rotor_rating() {
    Facts facts = CrusherFacts.of(CHAIN, CASCADE);
    double ring =
        facts
            .faults(Kind.SKIPPED)
            .findFirst()
            .orElseThrow()
            .history()
            .stages()
            .get(1)
            .trace()
            .ringAmps()[0];
    double rating = ring / 1.4 / 4.0;

    assertThat(rated(rating * 1.001).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(rated(rating * 0.999).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(rated(rating).margin().getAsDouble()).isCloseTo(1.0, within(1e-9));
  }

  @Test
  void should_be_at_best_tight_where_the_plant_limits_the_torque_peak() {
    String interlocks = "interlocks: {steps-open-before-line: true, every-step-proven: true}";
    Finding wide =
        judged(
            SKIPPED, CHAIN, CASCADE, interlocks, interlocks + "\nlimits: {torque-peak: 90000 N·m}");
    Finding low =
        judged(
            SKIPPED, CHAIN, CASCADE, interlocks, interlocks + "\nlimits: {torque-peak: 100 N·m}");

    assertThat(wide.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(low.verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_not_judge_without_a_rotor_rating() {
    Finding finding = judged(SKIPPED, CHAIN, CASCADE, K12, "K12: {place: rotor, poles: delta");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K12.rotor-rating");
  }

  @Test
  void should_ask_the_line_contactor_where_nothing_proves_the_steps_open() {
    Facts facts = CrusherFacts.of(PROVEN, OPEN);
    double amps =
        facts
            .faults(Kind.RINGS_SHORTED)
            .findFirst()
            .orElseThrow()
            .history()
            .stages()
            .get(0)
            .trace()
            .statorAmps()[0];
    Finding shorted = finding(RULE, facts, "started with rings shorted");

    assertThat(shorted.value().getAsDouble()).isCloseTo(amps, within(1e-9));
    assertThat(shorted.margin().getAsDouble()).isCloseTo(3150.0 / amps, within(1e-9));
    assertThat(findings(RULE, facts))
        .extracting(Finding::subject)
        .containsExactly(
            "started with step contactor 1 welded",
            "clearing, started with step contactor 1 welded",
            "started with rings shorted",
            "clearing, started with rings shorted",
            "reclosed with every step contactor closed",
            "clearing, reclosed with every step contactor closed");
  }

  @Test
  void should_turn_at_the_making_capacity_of_the_line_contactor() {
    double amps =
        CrusherFacts.of()
            .faults(Kind.RINGS_SHORTED)
            .findFirst()
            .orElseThrow()
            .history()
            .stages()
            .get(0)
            .trace()
            .statorAmps()[0];

    assertThat(line(amps / 4.0 * 1.001).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(line(amps / 4.0 * 0.999).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void no_making_capacity_proves_a_closing_onto_a_residual_voltage() {
    String reclosed = "reclosed with every step contactor closed";
    Finding ample = judged(reclosed, PROVEN, OPEN);
    assertThat(ample.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(ample.margin()).isEmpty();
    assertThat(ample.missing()).containsExactly("interlocks.steps-open-before-line");
    // what does not even make the current at rest needs no peak to be a breach
    String rated = "ratings: {AC-2: 315 A, AC-3: 315 A}";
    Finding weak = judged(reclosed, PROVEN, OPEN, rated, "ratings: {AC-2: 60 A, AC-3: 60 A}");
    assertThat(weak.verdict()).isEqualTo(Verdict.BREACH);
  }

  private static Finding line(double amps) {
    return judged(
        "started with rings shorted",
        PROVEN,
        OPEN,
        "ratings: {AC-2: 315 A, AC-3: 315 A}",
        "ratings: {AC-2: " + amps + " A}");
  }

  @Test
  void should_not_count_a_timer_that_a_welded_last_contactor_satisfies() {
    Finding finding =
        judged(
            "clearing, started with rings shorted",
            PROVEN,
            OPEN,
            "breakaway: 700",
            "breakaway: 9000");

    assertThat(says(finding)).doesNotContain("F5 clears");
  }

  @Test
  void should_not_apply_to_a_chain_with_every_step_proven_open() {
    Rule.Answer answer = RULE.judge(CrusherFacts.of());

    assertThat(answer)
        .isInstanceOfSatisfying(
            Rule.Answer.NotApplicable.class, n -> assertThat(n.because()).contains("chained"));
  }
}
