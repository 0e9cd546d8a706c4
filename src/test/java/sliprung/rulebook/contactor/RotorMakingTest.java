package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class RotorMakingTest {
  private static final Rule RULE = new EveryStepContactorMakesWhatItClosesOnto();
  private static final String ROTOR = "rotor-rating: 315 A";

  /** A rotation sensor clears a standing rotor before any step closes. */
  private static final String[] NO_LOCKED_CLOSING = {
    "  F5: {", "  F9: {kind: standstill, time: 1 s, trips: K1}\n  F5: {"
  };

  private static Finding judge(String tag, String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), tag);
  }

  @Test
  void the_current_is_that_of_the_beginning_of_the_stage_over_1_4() {
    Facts facts = CrusherFacts.of(NO_LOCKED_CLOSING);
    double ring = facts.starts().get(0).history().stages().get(1).trace().ringAmps()[0];

    Finding finding = CrusherFacts.finding(RULE, facts, "K11");
    assertThat(finding.value()).hasValueCloseTo(ring / 1.4, within(1e-9));
    assertThat(finding.margin()).hasValueCloseTo(4 * 315 / (ring / 1.4), within(1e-9));
    assertThat(CrusherFacts.says(finding)).contains("4 × 315 A").contains("cold start");
  }

  @Test
  void a_closing_on_a_rotor_at_rest_counts_until_it_is_cleared() {
    Finding finding = judge("K12");

    assertThat(finding.start().orElseThrow().scenario().id()).isEqualTo("locked");
    assertThat(CrusherFacts.says(finding)).contains("In a permitted start it is ");
  }

  @Test
  void one_per_cent_about_four_times_the_rating_turns_the_verdict() {
    double rating = judge("K12").value().getAsDouble() / 4;

    assertThat(judge("K12", ROTOR, "rotor-rating: " + rating * 1.01 + " A").verdict())
        .isEqualTo(Verdict.CLEAR);
    Finding outside = judge("K12", ROTOR, "rotor-rating: " + rating * 0.99 + " A");
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.mend()).isNotEmpty();
  }

  @Test
  void a_rating_in_ac_2_stands_for_a_rotor_rating() {
    assertThat(judge("K12", ROTOR, "ratings: {AC-2: 315 A}").margin())
        .isEqualTo(judge("K12").margin());
  }

  @Test
  void missing_inputs_are_named() {
    Finding finding = judge("K12", ROTOR + ", ", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K12.rotor-rating");
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "K12").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void above_1000_V_in_the_rotor_nothing_is_judged() {
    Facts facts =
        CrusherFacts.bare("rotor-voltage: 420 V", "rotor-voltage: 1100 V", "285 A", "109 A");

    assertThat(CrusherFacts.finding(RULE, facts, "K12").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_step_contactors_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withContactors(c -> c.tag().equals("K1"))))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
