package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.Edge;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class TakeOverTest {
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final String K1_END =
      "rated-voltage: 690 V, closing: 60 ms, opening: 60 ms}\n  K11";
  private static final String F2 = "F2: {kind: overload, class: 10, dial: 208 A, trips: K1}";

  /** Relay 10⁷/I² s in the mean, fuse 10¹³/I⁴ s: they cross at 1000 A. Edges lie beside them. */
  private static PowerLaws laws(
      double relayFast, double relaySlow, double fuseFast, double fuseSlow) {
    return new PowerLaws()
        .law("F2", Edge.FAST, i -> relayFast * 1e7 / (i * i))
        .law("F2", Edge.MIDDLE, i -> 1e7 / (i * i))
        .law("F2", Edge.SLOW, i -> relaySlow * 1e7 / (i * i))
        .law("F1", Edge.FAST, i -> fuseFast * 1e13 / (i * i * i * i))
        .law("F1", Edge.MIDDLE, i -> 1e13 / (i * i * i * i))
        .law("F1", Edge.SLOW, i -> fuseSlow * 1e13 / (i * i * i * i));
  }

  /**
   * Narrow bands: the quickest relay may be first up to 1118 A, the quickest fuse from 905 A on.
   */
  private static PowerLaws narrow() {
    return laws(0.9, 1.1, 0.9, 1.125);
  }

  private static Finding judge(PowerLaws laws, String... replacements) {
    Rule rule = new TheRelayTakesOverFromTheFuse(facts -> laws);
    return CrusherFacts.finding(rule, CrusherFacts.bare(replacements), "K1");
  }

  private static String ac3(double amps) {
    return "ratings: {AC-3: " + amps + " A}";
  }

  @Test
  void narrow_bands_that_keep_the_order_are_clear_and_show_the_standards_points() {
    Finding finding = judge(narrow());

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.value()).hasValueCloseTo(Math.sqrt(1.25e6), within(1e-3));
    assertThat(CrusherFacts.says(finding))
        .contains("cross at 1 000 A")
        .contains("alone to open at 750 A")
        .contains("the fuse first at 1 250 A");
  }

  @Test
  void a_capacity_one_per_cent_below_the_band_is_tight_and_asks_for_the_tested_coordination() {
    double band = Math.sqrt(1.25e6);

    assertThat(judge(narrow(), RATINGS, ac3(band / 8 * 1.01)).verdict()).isEqualTo(Verdict.CLEAR);
    Finding tight = judge(narrow(), RATINGS, ac3(band / 8 * 0.99));
    assertThat(tight.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(CrusherFacts.mend(tight)).contains("Declare the tested coordination");
    assertThat(tight.margin()).hasValueCloseTo(band * 0.99 / 1000, within(1e-6));
  }

  @Test
  void a_capacity_one_per_cent_below_the_mean_crossing_is_a_breach() {
    assertThat(judge(narrow(), RATINGS, ac3(1000.0 / 8 * 1.01)).verdict()).isEqualTo(Verdict.TIGHT);
    Finding breach = judge(narrow(), RATINGS, ac3(1000.0 / 8 * 0.99));
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(breach.margin()).hasValueCloseTo(0.99, within(1e-6));
  }

  @Test
  void a_fuse_that_may_melt_below_the_relay_point_is_tight() {
    // the contactor needs no time here: quick fuse against slow relay at I² = 10⁶·f/s
    String at_once = "closing: 60 ms, opening: 60 ms";
    double share = 0.75 * 0.75;

    Finding above =
        judge(laws(0.9, 1.0, share * 1.02, 1.1), at_once, "closing: 60 ms, opening: 0 ms");
    Finding below =
        judge(laws(0.9, 1.0, share * 0.98, 1.1), at_once, "closing: 60 ms, opening: 0 ms");

    assertThat(above.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(above.margin()).hasValueCloseTo(Math.sqrt(1.02), within(1e-6));
    assertThat(below.verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void the_contactors_opening_counts_against_the_fuse() {
    double share = 0.75 * 0.75;

    // 10⁷/750² is 17.8 s: a second of opening moves the crossing past the relay point
    assertThat(
            judge(
                    laws(0.9, 1.0, share * 1.02, 1.1),
                    "opening: 60 ms}\n  K11",
                    "opening: 1 s}\n  K11")
                .verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_declared_coordination_with_that_fuse_is_clear_by_its_tests() {
    String declared = K1_END.replace("}\n", ", coordination: {type: 2, with: F1}}\n");
    PowerLaws wide = laws(0.5, 2.0, 0.3, 3.0);

    assertThat(judge(wide).verdict()).isEqualTo(Verdict.TIGHT);
    Finding finding = judge(wide, K1_END, declared);
    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(CrusherFacts.says(finding))
        .contains("Type 2 coordination of K1 with F1 is declared");
    // curves that contradict the declaration are said, never silenced
    assertThat(judge(wide, K1_END, declared, RATINGS, ac3(100)).verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_declaration_with_another_fuse_covers_nothing() {
    String declared = K1_END.replace("}\n", ", coordination: {type: 2, with: F9}}\n");
    String other = "F1: {kind: fuse, class: gG, rating: 250 A}\n";

    assertThat(
            judge(
                    laws(0.5, 2.0, 0.3, 3.0),
                    K1_END,
                    declared,
                    other,
                    other + "  F9: {kind: fuse, class: gG, rating: 400 A, place: rotor}\n")
                .verdict())
        .isEqualTo(Verdict.TIGHT);
  }

  @Test
  void a_fuse_that_is_first_everywhere_is_a_breach() {
    Finding finding = judge(narrow().law("F1", Edge.MIDDLE, i -> 1e-3));

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin()).hasValue(0.0);
  }

  @Test
  void mean_curves_that_never_cross_need_the_fault_current() {
    PowerLaws never = narrow().law("F1", Edge.MIDDLE, i -> 1e9).law("F1", Edge.SLOW, i -> 1e9);

    Finding with = judge(never);
    assertThat(with.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(with.value()).hasValue(18e3);
    Finding without = judge(never, "  fault-current: {max: 18 kA, min: 9 kA}\n", "");
    assertThat(without.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(without.missing()).containsExactly("supply.fault-current");
  }

  @Test
  void an_edge_that_cannot_be_computed_is_not_judged_unless_declared() {
    PowerLaws unknown = narrow().unknown("F2", Edge.FAST, "no shortest time");
    String declared = K1_END.replace("}\n", ", coordination: {type: 1, with: F1}}\n");

    Finding finding = judge(unknown);
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing())
        .containsExactly("protection.F2.curve", "contactors.K1.coordination");
    assertThat(judge(unknown, K1_END, declared).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void without_a_category_nothing_is_judged() {
    assertThat(judge(narrow(), RATINGS + ", ", "").missing())
        .containsExactly("contactors.K1.ratings");
  }

  @Test
  void without_fuse_or_overload_it_is_not_applicable() {
    Rule rule = new TheRelayTakesOverFromTheFuse();

    assertThat(rule.judge(CrusherFacts.bare("  F1: {kind: fuse, class: gG, rating: 250 A}\n", "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
    assertThat(rule.judge(CrusherFacts.bare("  " + F2 + "\n", "")))
        .isInstanceOf(Rule.Answer.NotApplicable.class);
  }

  @Test
  void a_trip_class_and_gates_alone_are_never_clear() {
    Finding finding =
        CrusherFacts.finding(new TheRelayTakesOverFromTheFuse(), CrusherFacts.bare(), "K1");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
  }
}
