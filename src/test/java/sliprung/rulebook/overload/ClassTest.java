package sliprung.rulebook.overload;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.config.CurveLibraryReader;
import sliprung.curve.TripClass;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.Edge;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class ClassTest {
  private static final Rule RULE = new TheClassFitsStartAndStall();
  private static final String RELAY = "class: 10, dial: 208 A";

  /** A stall relay in the place of the timer, so that a rotor at rest is cleared in time. */
  private static final String STALL = "  F9: {kind: standstill, time: 1 s, trips: K1}\n  F5: {";

  private static Facts facts(String relay, String margins) {
    return CrusherFacts.of(RELAY, relay, "  F5: {", STALL, "interlocks:", margins + "interlocks:");
  }

  private static Finding judge(String relay, String margins) {
    return CrusherFacts.finding(RULE, facts(relay, margins), "F2");
  }

  private static String wanted(double margin) {
    return "margins: {overload/class: " + margin + "}\n";
  }

  @Test
  void the_margin_is_that_of_the_nearest_permitted_start() {
    Facts facts = facts(RELAY, "");
    double nearest =
        facts
            .permitted()
            .mapToDouble(s -> s.device("F2", Edge.FAST).get().currentMargin().getAsDouble())
            .min()
            .getAsDouble();

    assertThat(CrusherFacts.finding(RULE, facts, "F2").margin())
        .hasValueCloseTo(nearest, within(0.0));
  }

  @Test
  void one_per_cent_about_the_wanted_margin_turns_the_verdict() {
    double margin = judge(RELAY, "").margin().getAsDouble();

    assertThat(judge(RELAY, wanted(margin / 1.01)).verdict()).isEqualTo(Verdict.CLEAR);
    Finding outside = judge(RELAY, wanted(margin * 1.01));
    assertThat(outside.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(outside.mend()).startsWith("Take class 20");
  }

  @Test
  void a_start_that_trips_it_is_a_breach_and_the_least_class_with_its_cost_is_told() {
    Finding finding = judge("class: 5, dial: 160 A", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(finding))
        .contains("The least class that does with the wanted margin is ")
        .contains("it takes up to ");
  }

  @Test
  void where_nothing_clears_the_stall_it_is_at_best_tight() {
    Finding alone = CrusherFacts.finding(RULE, CrusherFacts.of("time: 15 s", "time: 60 s"), "F2");

    assertThat(alone.margin()).isEqualTo(judge(RELAY, "").margin());
    assertThat(alone.margin().getAsDouble()).isGreaterThan(1.1);
    assertThat(alone.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(alone.mend()).contains("rotation sensor");
  }

  @Test
  void missing_inputs_are_named() {
    Finding nema = judge("class: nema-20, dial: 208 A", "");
    assertThat(nema.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(nema.missing()).containsExactly("protection.F2.curve");

    Finding stall =
        CrusherFacts.finding(
            RULE, CrusherFacts.of("  stall-limit: {cold: 20 s, hot: 14 s}\n", ""), "F2");
    assertThat(stall.missing()).containsExactly("motor.stall-limit");
    assertThat(CrusherFacts.finding(RULE, CrusherFacts.bare(), "F2").verdict())
        .isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void without_an_overload_in_the_stator_it_is_not_applicable() {
    assertThat(RULE.judge(CrusherFacts.bare(RELAY, RELAY + ", place: bank")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }

  @Test
  void the_practices_classes_are_those_of_the_curve_library() {
    for (TripClass own : TheClassFitsStartAndStall.classes(CrusherFacts.bare())) {
      TripClass library = CurveLibraryReader.builtIn().tripClasses().get(own.name());
      assertThat(own.shortestSeconds()).isEqualTo(library.shortestSeconds());
      assertThat(own.longestSeconds()).isEqualTo(library.longestSeconds());
      assertThat(own.warmLimitSeconds()).isEqualTo(library.warmLimitSeconds());
      assertThat(own.multiple()).isEqualTo(library.multiple());
    }
  }

  @Test
  void a_relay_that_need_never_see_the_current_at_rest_says_why() {
    // with a weak supply and a dial far above rated current nothing makes the slowest relay move
    Facts facts = facts("class: 10, dial: 1500 A", "");
    String says = CrusherFacts.says(CrusherFacts.finding(RULE, facts, "F2"));

    assertThat(says)
        .contains("F2 need never trip at ")
        .contains(", since the slowest relay that the standard allows begins at 1 800 A;");
  }
}
