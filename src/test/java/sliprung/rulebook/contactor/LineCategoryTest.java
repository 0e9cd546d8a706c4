package sliprung.rulebook.contactor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

class LineCategoryTest {
  private static final String RATINGS = "ratings: {AC-2: 315 A, AC-3: 315 A}";
  private static final Rule RULE = new TheLineContactorFitsItsDuty();

  private static Finding judge(String... replacements) {
    return CrusherFacts.finding(RULE, CrusherFacts.of(replacements), "K1");
  }

  private static String ac2(double amps) {
    return "ratings: {AC-2: " + amps + " A}";
  }

  private static String ac3(double amps) {
    return "ratings: {AC-3: " + amps + " A}";
  }

  private static double onStepOne(double slip) {
    return StandstillCurrent.on(CrusherFacts.of(), 1, slip).orElseThrow().amps();
  }

  @Test
  void start_and_stop_alone_are_covered_by_ac_3_and_say_why() {
    Finding finding = judge(RATINGS, ac3(315));

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(finding.margin()).hasValueCloseTo(315.0 / 208.0, within(1e-12));
    assertThat(CrusherFacts.says(finding))
        .contains("208 A")
        .contains("AC-3 covers AC-2")
        .contains("10 and breaks 8")
        .contains("Edition");
  }

  @Test
  void a_rating_one_per_cent_below_the_motor_is_a_breach_and_one_above_is_clear() {
    assertThat(judge(RATINGS, ac2(208 * 0.99)).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judge(RATINGS, ac2(208 * 1.01)).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void regular_inching_on_ac_3_alone_is_a_breach_that_names_the_figures_and_the_cure() {
    double inching = onStepOne(StandstillCurrent.AT_REST);
    Finding finding = judge(RATINGS, ac3(315), "inching: none", "inching: {per-hour: 60, step: 1}");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.margin()).hasValue(0.17);
    assertThat(finding.value()).hasValueCloseTo(inching, within(1e-9));
    assertThat(finding.limit()).hasValue(315);
    assertThat(CrusherFacts.says(finding))
        .startsWith("Inching on step 1, 60 times an hour, K1 breaks ")
        .contains("at full voltage")
        .contains("AC-3: 1 × 315 A")
        .contains("0.17 of the voltage")
        .contains("5.88 times");
    assertThat(CrusherFacts.mend(finding))
        .contains("in AC-2")
        .contains("in AC-4")
        .contains("give up inching");
    assertThat(finding.start()).isPresent();
  }

  @Test
  void ten_an_hour_are_occasional_and_tight_eleven_are_a_breach() {
    Finding ten = judge(RATINGS, ac3(315), "inching: none", "inching: {per-hour: 10, step: 1}");
    Finding eleven = judge(RATINGS, ac3(315), "inching: none", "inching: {per-hour: 11, step: 1}");

    assertThat(ten.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(ten.margin())
        .hasValueCloseTo(8 * 315 / onStepOne(StandstillCurrent.AT_REST), within(1e-9));
    assertThat(CrusherFacts.says(ten)).contains("8 × 315 A");
    assertThat(eleven.verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void ac_2_covers_regular_inching_up_to_two_and_a_half_times_its_rating() {
    double needed = onStepOne(StandstillCurrent.AT_REST) / 2.5;
    String often = "inching: {per-hour: 60, step: 1}";
    // the motor is made small so that inching alone decides
    Finding below =
        judge(
            RATINGS,
            ac2(needed * 0.99),
            "inching: none",
            often,
            "  current: 208 A",
            "  current: 120 A");
    Finding above =
        judge(
            RATINGS,
            ac2(needed * 1.01),
            "inching: none",
            often,
            "  current: 208 A",
            "  current: 120 A");

    assertThat(needed).isGreaterThan(121);
    assertThat(CrusherFacts.says(below)).contains("Inching");
    // another plate gives another circuit: the demand is measured with its own current
    assertThat(below.margin().getAsDouble())
        .isCloseTo(2.5 * needed * 0.99 / below.value().getAsDouble(), within(1e-9));
    assertThat(above.margin().getAsDouble()).isGreaterThan(below.margin().getAsDouble());
  }

  @Test
  void inching_decides_one_per_cent_either_side_of_ac_4() {
    double needed = onStepOne(StandstillCurrent.AT_REST) / 6.0;
    String often = "inching: {per-hour: 60, step: 1}";
    String with = "ratings: {AC-3: 315 A, AC-4: %s A}";

    assertThat(judge(RATINGS, String.format(with, needed * 1.01), "inching: none", often).verdict())
        .isEqualTo(Verdict.CLEAR);
    Finding below = judge(RATINGS, String.format(with, needed * 0.99), "inching: none", often);
    assertThat(below.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(below.margin()).hasValueCloseTo(0.99, within(1e-9));
  }

  @Test
  void plugging_counts_the_current_at_slip_two() {
    Finding finding =
        judge(RATINGS, ac3(315), "plugging: none", "plugging: {per-hour: 20, step: 1}");

    assertThat(finding.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(finding.value()).hasValueCloseTo(onStepOne(StandstillCurrent.PLUGGED), within(1e-9));
    assertThat(onStepOne(StandstillCurrent.PLUGGED))
        .isGreaterThan(onStepOne(StandstillCurrent.AT_REST));
  }

  @Test
  void rings_shorted_over_four_times_ac_2_is_a_breach_only_where_it_may_be_met() {
    double shorted = StandstillCurrent.ringsShorted(CrusherFacts.of()).orElseThrow().amps();
    String open = "steps-open-before-line: false";
    String proven = "steps-open-before-line: true";

    Finding breach = judge(RATINGS, ac2(shorted / 4 * 0.99), proven, open);
    assertThat(breach.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(breach.margin()).hasValueCloseTo(0.99, within(1e-9));
    assertThat(CrusherFacts.says(breach)).contains("step contactors closed");
    assertThat(judge(RATINGS, ac2(shorted / 4 * 1.01), proven, open).verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(judge(RATINGS, ac2(shorted / 4 * 0.99)).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(
            judge(
                    RATINGS,
                    "ratings: {AC-2: " + shorted / 4 * 0.99 + " A, AC-3: 315 A}",
                    proven,
                    open)
                .verdict())
        .isEqualTo(Verdict.CLEAR);
  }

  @Test
  void a_resistive_rating_alone_never_clears_a_motor() {
    Finding wide = judge(RATINGS, "ratings: {AC-1: 2000 A}");
    Finding inching =
        judge(
            RATINGS,
            "ratings: {AC-1: 2000 A}",
            "inching: none",
            "inching: {per-hour: 60, step: 1}");

    assertThat(wide.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(judge(RATINGS, "ratings: {AC-1: 500 A}").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(inching.verdict()).isEqualTo(Verdict.BREACH);
    assertThat(inching.margin()).isEmpty();
  }

  @Test
  void without_a_category_nothing_is_judged() {
    Finding finding = judge(RATINGS + ", ", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("contactors.K1.ratings");
    assertThat(CrusherFacts.says(finding)).contains("NEMA").contains("would let it be judged");
  }

  @Test
  void without_a_rated_voltage_or_above_it_nothing_is_judged() {
    Finding none = judge("AC-3: 315 A}, rated-voltage: 690 V", "AC-3: 315 A}");
    Finding low = judge("AC-3: 315 A}, rated-voltage: 690 V", "AC-3: 315 A}, rated-voltage: 400 V");

    assertThat(none.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(none.missing()).containsExactly("contactors.K1.rated-voltage");
    assertThat(low.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(CrusherFacts.says(low)).contains("400 V").contains("690 V");
  }

  @Test
  void above_a_thousand_volts_nothing_is_judged() {
    Finding finding = judge("voltage: 690 V", "voltage: 6600 V", "current: 208 A", "current: 22 A");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(CrusherFacts.says(finding)).contains("IEC 62271-106");
  }

  @Test
  void without_a_line_contactor_it_is_not_applicable() {
    Facts facts = CrusherFacts.withoutLineContactor();

    assertThat(RULE.judge(facts)).isInstanceOf(Rule.Answer.NotApplicable.class);
  }
}
