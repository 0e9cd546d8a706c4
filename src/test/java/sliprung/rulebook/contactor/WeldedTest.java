package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class WeldedTest {
  private static final Rule RULE = new NothingClosesOntoShortedRings();
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final String PROVEN = "steps-open-before-line: true";
  private static final String NOT_PROVEN = "steps-open-before-line: false";

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "K1");
  }

  @Test
  void the_interlock_makes_it_clear_and_tells_what_it_keeps_away() {
    StandstillCurrent shorted = StandstillCurrent.ringsShorted(CrusherFacts.of()).orElseThrow();

    assertThat(judge().verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(judge()))
        .contains(sliprung.quantity.Show.three(shorted.amps()).replace('\u00a0', ' ') + " A");
  }

  @Test
  void without_it_it_is_at_best_tight_and_one_per_cent_about_the_capacity_turns_it() {
    StandstillCurrent shorted = StandstillCurrent.ringsShorted(CrusherFacts.of()).orElseThrow();
    double needed = shorted.amps() * Asymmetry.against(shorted.powerFactor(), 0.65) / 4.0;

    Finding inside = judge(PROVEN, NOT_PROVEN, RATINGS, "ratings: {AC-2: " + needed * 1.01 + " A}");
    Finding outside =
        judge(PROVEN, NOT_PROVEN, RATINGS, "ratings: {AC-2: " + needed * 0.99 + " A}");
    assertThat(inside.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(outside.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(outside.margin()).hasValueCloseTo(0.99, within(1e-9));
    assertThat(CrusherFacts.says(inside)).contains("with K12 welded");
  }

  @Test
  void missing_inputs_are_named() {
    assertThat(judge(PROVEN, NOT_PROVEN, RATINGS + ", ", "").missing())
        .containsExactly("contactors.K1.ratings");
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(PROVEN, NOT_PROVEN), "K1").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_a_line_contactor_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.withoutLineContactor()))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
