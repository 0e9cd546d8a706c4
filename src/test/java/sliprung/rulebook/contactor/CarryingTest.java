package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.tolerance.Corner;

class CarryingTest {
  private static final Rule RULE = new EveryContactorCarriesItsCurrent();
  private static final String ROTOR = "rotor-rating: 315 A";
  private static final String STANDS = ", short-time: {current: 5000 A, time: 10 s}";

  private static Finding judge(String tag, String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), tag);
  }

  private static Finding rated(String tag, double amps) {
    return judge(tag, ROTOR, "thermal: " + amps + " A, " + ROTOR + STANDS);
  }

  @Test
  void the_last_contactor_of_a_star_point_bank_carries_running_current_for_good() {
    Facts facts = CrusherFacts.of(ROTOR, ROTOR + STANDS);
    double running = facts.running().get(Corner.NOMINAL).orElseThrow().point().ringAmps() / 1.4;
    Finding last = CrusherFacts.finding(RULE, facts, "K12");

    assertThat(last.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(last.value().getAsDouble()).isBetween(running * 0.999999, running * 1.05);
    assertThat(CrusherFacts.says(last)).contains("for good").contains("makes the star point");
    assertThat(CrusherFacts.says(CrusherFacts.finding(RULE, facts, "K11")))
        .contains("carries nothing for good");
  }

  @Test
  void each_contactor_of_a_bridging_bank_carries_for_good() {
    Finding first = judge("K11", "cut-out: star-point", "cut-out: bridging", ROTOR, ROTOR + STANDS);

    assertThat(CrusherFacts.says(first)).contains("Each contactor of a bridging bank");
    assertThat(first.margin().getAsDouble())
        .isCloseTo(
            judge("K12", "cut-out: star-point", "cut-out: bridging", ROTOR, ROTOR + STANDS)
                .margin()
                .getAsDouble(),
            within(0.1));
  }

  @Test
  void one_per_cent_about_the_thermal_current_turns_the_verdict() {
    double carried = rated("K12", 400).value().getAsDouble();

    assertThat(rated("K12", carried * 1.01).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(rated("K12", carried * 0.99).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(rated("K12", carried * 0.99).mend()).isNotEmpty();
  }

  @Test
  void one_per_cent_about_the_short_time_withstand_turns_the_verdict() {
    // K11 carries more than its rating while step 2 lasts
    double use = 1.0 / withstand(300).margin().getAsDouble();
    double just = 300 * Math.sqrt(use);

    assertThat(withstand(just * Math.sqrt(1.01)).verdict()).isEqualTo(Verdict.CLEAR);
    Finding outside = withstand(just * Math.sqrt(0.99));
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.unit()).isEqualTo("A²s");
  }

  private static Finding withstand(double amps) {
    return judge(
        "K11",
        ROTOR,
        "thermal: 200 A, " + ROTOR + ", short-time: {current: " + amps + " A, time: 10 s}");
  }

  @Test
  void a_star_carries_the_whole_ring_current() {
    double delta = rated("K12", 400).value().getAsDouble();
    double star =
        judge("K12", "poles: delta", "poles: star", ROTOR, ROTOR + STANDS).value().getAsDouble();

    assertThat(star / delta).isCloseTo(1.4, within(1e-9));
  }

  @Test
  void inching_counts_for_the_line_contactor_and_not_for_contactors_it_does_not_close() {
    String inching = "inching: {per-hour: 300, step: 1}";
    assertThat(judge("K1", "inching: none", inching).value().getAsDouble())
        .isGreaterThan(judge("K1").value().getAsDouble() * 1.01);
    assertThat(judge("K12", "inching: none", inching, ROTOR, ROTOR + STANDS).value().getAsDouble())
        .isEqualTo(judge("K12", ROTOR, ROTOR + STANDS).value().getAsDouble());
  }

  @Test
  void missing_inputs_are_named() {
    assertThat(judge("K11").missing()).containsExactly("contactors.K11.short-time");
    assertThat(judge("K12", ROTOR + ", ", "").missing()).containsExactly("contactors.K12.thermal");
    Finding often =
        judge(
            "K1",
            ", per-hour: 4",
            "",
            "ratings: {AC-2: 315 A, AC-3: 315 A}",
            "ratings: {AC-3: 200 A}");
    assertThat(often.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(often.missing()).containsExactly("duty.starts.per-hour");
  }

  @Test
  void a_contactor_that_carries_starts_without_any_pause_needs_no_starts_an_hour() {
    Finding finding =
        judge(
            "K1",
            ", per-hour: 4",
            "",
            "ratings: {AC-2: 315 A, AC-3: 315 A}",
            "ratings: {AC-3: 630 A}");
    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(finding)).contains("start after start without a pause");
  }

  @Test
  void without_a_computed_start_nothing_is_judged() {
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "K1").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_contactors_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withContactors(c -> false)))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
