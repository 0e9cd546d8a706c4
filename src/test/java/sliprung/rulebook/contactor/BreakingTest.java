package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.Edge;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class BreakingTest {
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final String F1 = "  F1: {kind: fuse, class: gG, rating: 250 A}\n";
  private static final String F2 = "F2: {kind: overload, class: 10, dial: 208 A, trips: K1}";

  /** The relay takes 10⁷/I² s, the fuse 10¹⁴/I⁴ s: they cross at 10^3.5 A. */
  private static final double CROSSING = Math.sqrt(1e7);

  private static PowerLaws laws() {
    return new PowerLaws()
        .law("F2", Edge.FAST, i -> 1e7 / (i * i))
        .law("F1", Edge.SLOW, i -> 1e14 / (i * i * i * i));
  }

  private static Finding judge(PowerLaws laws, String subject, String... replacements) {
    Rule rule = new EveryContactorBreaksWhatItOpens(facts -> laws);
    return CrusherFacts.finding(rule, CrusherFacts.of(replacements), subject);
  }

  private static String ac3(double amps) {
    return "ratings: {AC-3: " + amps + " A}";
  }

  @Test
  void the_greatest_current_at_which_the_device_wins_decides_one_per_cent_either_side() {
    Finding able = judge(laws(), "F2", RATINGS, ac3(CROSSING / 8 * 1.01));
    Finding unable = judge(laws(), "F2", RATINGS, ac3(CROSSING / 8 * 0.99));

    assertThat(able.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(able.value()).hasValueCloseTo(CROSSING, within(1e-3));
    assertThat(able.margin()).hasValueCloseTo(1.01, within(1e-6));
    assertThat(able.edge()).contains(Edge.FAST);
    assertThat(unable.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(unable.margin()).hasValueCloseTo(0.99, within(1e-6));
    assertThat(CrusherFacts.says(unable)).startsWith("F2 may open K1 before F1 at up to 3 160 A");
    assertThat(CrusherFacts.mend(unable)).isNotEmpty().doesNotContain("block F2");
  }

  @Test
  void the_hot_crossing_is_printed_and_never_decides() {
    // a tenth of the time from hot: 10⁶/I² = 10¹⁴/I⁴ at 10 kA, far beyond what K1 breaks
    Finding finding = judge(laws(), "F2", RATINGS, ac3(CROSSING / 8 * 1.01));

    assertThat(CrusherFacts.says(finding))
        .contains("the crossing lies at 10 kA")
        .contains("not judged");
    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void of_several_categories_the_greatest_proven_figure_counts() {
    Finding finding =
        judge(laws(), "F2", RATINGS, "ratings: {AC-2: 500 A, AC-3: 315 A, AC-4: 100 A}");

    assertThat(finding.limit()).hasValue(8 * 315);
  }

  @Test
  void a_device_blocked_above_a_level_wins_no_further_than_that_and_its_accuracy() {
    String relay =
        "F2: {kind: inverse-time, curve: iec-very-inverse, pick-up: 265 A, time-multiplier: 0.25,"
            + " accuracy: {pick-up: 5 %, time: 7.5 %}, blocked-above: 2000 A, trips: K1}";
    Finding able = judge(laws(), "F2", F2, relay, RATINGS, ac3(2100.0 / 8 * 1.001));
    Finding unable = judge(laws(), "F2", F2, relay, RATINGS, ac3(2100.0 / 8 * 0.999));

    assertThat(able.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(able.value()).hasValueCloseTo(2100.0, within(1e-3));
    assertThat(CrusherFacts.says(able)).contains("blocked above 2 100 A");
    assertThat(unable.verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void without_a_short_circuit_device_the_fault_current_bounds_it() {
    Finding finding = judge(laws(), "F2", F1, "");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.value()).hasValue(18e3);
    assertThat(CrusherFacts.says(finding))
        .contains("Nothing clears a short circuit")
        .contains("18 kA");
  }

  @Test
  void without_short_circuit_device_and_fault_current_it_is_not_judged() {
    Finding finding = judge(laws(), "F2", F1, "", "  fault-current: {max: 18 kA, min: 9 kA}\n", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("supply.fault-current");
  }

  @Test
  void a_device_without_a_fast_edge_is_not_judged_unless_any_fault_is_broken() {
    PowerLaws silent =
        laws().law("F2", Edge.FAST, i -> Double.NaN).unknown("F2", Edge.FAST, "no shortest time");
    Finding finding = judge(silent, "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).contains("protection.F2.curve");
    assertThat(CrusherFacts.says(finding)).contains("no shortest time");
    assertThat(
            judge(silent, "F2", "{max: 18 kA, min: 9 kA}", "{max: 2500 A, min: 2200 A}").verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_curve_that_ends_too_early_is_judged_only_where_it_cannot_matter() {
    // F2's points end at 3 kA; F1's law is known throughout
    PowerLaws ends = laws().law("F2", Edge.FAST, i -> i > 3000 ? Double.NaN : 1e7 / (i * i));

    // beyond its end F2 may be at once: it then wins as long as the fuse needs any time
    assertThat(judge(ends, "F2", RATINGS, ac3(3100.0 / 8)).verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(judge(ends, "F2", RATINGS, ac3(2900.0 / 8)).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judge(ends, "F2", RATINGS, ac3(18100.0 / 8)).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_fuse_that_is_always_quicker_leaves_nothing_to_break() {
    Finding finding = judge(laws().law("F1", Edge.SLOW, i -> 1e-3), "F2");

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.margin()).isEmpty();
  }

  @Test
  void a_sequence_timer_wins_until_the_fuse_is_quicker_than_its_time() {
    // 15 s = 10¹⁴/I⁴
    Finding finding = judge(laws(), "F5");

    assertThat(finding.value()).hasValueCloseTo(Math.pow(1e14 / 15, 0.25), within(1e-3));
    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_delayed_relay_on_a_breaker_counts_only_without_a_fuse() {
    String both =
        F2
            + "\n  F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: 265 A,"
            + " time-multiplier: 0.25, trips: Q1}";
    PowerLaws laws = laws().law("F3", Edge.SLOW, i -> 1e-3);

    assertThat(judge(laws, "F2", F2, both).value()).hasValueCloseTo(CROSSING, within(1e-3));
    // Q1 takes 50 ms: 10⁷/I² is longer up to √(10⁷/0.051)
    Finding alone = judge(laws, "F2", F2, both, F1, "");
    assertThat(alone.value()).hasValueCloseTo(18e3, within(1e-3));
    assertThat(CrusherFacts.says(alone)).contains("before F3");
  }

  @Test
  void an_instantaneous_element_on_a_breaker_is_a_short_circuit_device() {
    String both = F2 + "\n  F4: {kind: instantaneous, pick-up: 2600 A, trips: Q1}";
    PowerLaws laws = laws().law("F4", Edge.SLOW, i -> i > 2800 ? 0.0 : Double.POSITIVE_INFINITY);

    assertThat(judge(laws, "F2", F2, both).value()).hasValueCloseTo(2800.0, within(1e-3));
  }

  @Test
  void a_device_in_the_rotor_circuit_meets_the_currents_of_starts_only() {
    String rotor = "F2: {kind: overload, class: 10, dial: 285 A, place: rotor, trips: K1}";
    Finding finding = judge(laws(), "F2", F2, rotor);

    assertThat(finding.value())
        .hasValueCloseTo(
            GreatestStatorCurrent.of(CrusherFacts.of(F2, rotor)).orElseThrow().amps(),
            within(1e-6));
    assertThat(CrusherFacts.says(finding)).contains("sees no short circuit");
  }

  @Test
  void a_stop_may_find_the_rings_shorted_at_rest() {
    double shorted = StandstillCurrent.ringsShorted(CrusherFacts.of()).orElseThrow().amps();
    Finding able = judge(laws(), "K1", RATINGS, ac3(shorted / 8 * 1.01));
    Finding unable = judge(laws(), "K1", RATINGS, ac3(shorted / 8 * 0.99));

    assertThat(able.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(able.margin()).hasValueCloseTo(1.01, within(1e-9));
    assertThat(able.start()).isPresent();
    assertThat(unable.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(CrusherFacts.says(unable)).startsWith("A stop may find ").contains("AC-3: 8 × ");
  }

  @Test
  void plugging_raises_what_a_stop_may_find() {
    String[] small = {"resistance: 0.0930 ohm", "resistance: 0.0010 ohm"};
    Facts without = CrusherFacts.of(small);
    Facts with =
        CrusherFacts.of(small[0], small[1], "plugging: none", "plugging: {per-hour: 5, step: 2}");

    assertThat(GreatestStatorCurrent.of(with).orElseThrow().amps())
        .isGreaterThan(GreatestStatorCurrent.of(without).orElseThrow().amps());
    assertThat(GreatestStatorCurrent.of(with).orElseThrow().when()).isEqualTo("plugging");
  }

  @Test
  void a_step_contactor_opened_by_a_device_is_tight_at_best() {
    Finding finding = judge(laws(), "F2", F2, F2.replace("trips: K1", "trips: K12"));
    Finding small =
        judge(
            laws(),
            "F2",
            F2,
            F2.replace("trips: K1", "trips: K12"),
            "K12: {place: rotor, poles: delta, rotor-rating: 315 A",
            "K12: {place: rotor, poles: delta, rotor-rating: 50 A");
    Finding silent =
        judge(
            laws(),
            "F2",
            F2,
            F2.replace("trips: K1", "trips: K12"),
            "K12: {place: rotor, poles: delta, rotor-rating: 315 A",
            "K12: {place: rotor, poles: delta");

    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.limit()).hasValue(4 * 315);
    assertThat(CrusherFacts.says(finding)).contains("1 to 3 Hz");
    assertThat(small.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(silent.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(silent.missing()).containsExactly("contactors.K12.rotor-rating");
  }

  @Test
  void without_a_category_neither_stop_nor_device_is_judged() {
    assertThat(judge(laws(), "K1", RATINGS + ", ", "").verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(judge(laws(), "F2", RATINGS + ", ", "").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void with_nothing_to_ask_about_it_is_not_judged_rather_than_silent() {
    Rule rule = new EveryContactorBreaksWhatItOpens(facts -> laws());
    Finding finding =
        CrusherFacts.finding(
            rule,
            CrusherFacts.withoutLineContactor(", trips: K1}", ", trips: Q1}"),
            "line contactor");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors");
  }

  @Test
  void the_bands_of_the_real_devices_give_the_crossing_of_class_10_and_a_fuse() {
    Finding finding =
        CrusherFacts.finding(new EveryContactorBreaksWhatItOpens(), CrusherFacts.of(), "F2");

    // by hand: the quickest class 10 relay needs 4 s · (7.2 · 208 A/I)² or less, the slowest 250 A
    // link lies on the chord from (1650 A; 5 s) on
    assertThat(finding.value().getAsDouble()).isBetween(1650.0, 2300.0);
    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
  }
}
