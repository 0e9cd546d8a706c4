package sliprung.rulebook.resistor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.protection.SectionElement;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.starter.Starter;

class FanTest {
  private static final String RULE = "resistor/fan";
  private static final String RISE = "rise: {continuous: 375 K, short-time: 375 K}";
  private static final StarterText SMALL =
      StarterText.small()
          .with(
              "time: 20 s}}\n    - {resistance: 0.25",
              "time: 20 s}, " + RISE + "}\n    - {resistance: 0.25")
          .with("current: 250 A, time: 20 s}}", "current: 250 A, time: 20 s}, " + RISE + "}");

  private static StarterText fan(String inside) {
    return SMALL.under("hot-rise:", "  fan: {" + inside + "}");
  }

  private static StarterText left(double share) {
    return fan(StarterText.text("continuous-without: %s %%", 100.0 * share));
  }

  /** One start alone is too short to miss the air: it takes many in a row. */
  private static StarterText often(double share) {
    return left(share)
        .with("starts: {cold: 2, hot: 1, per-hour: 4}", "starts: {cold: 18, hot: 1, per-hour: 18}");
  }

  /** Or many an hour. */
  private static StarterText hourly(double share) {
    return left(share)
        .with("starts: {cold: 2, hot: 1, per-hour: 4}", "starts: {cold: 2, hot: 1, per-hour: 18}");
  }

  @Test
  void without_a_fan_there_is_no_question() {
    assertThat(SMALL.review().notApplicable()).anyMatch(n -> n.rule().equals(RULE));
  }

  @Test
  void a_fan_without_figures_is_not_judged() {
    Finding finding = fan("time-constant-without: 200 %").finding(RULE, "bank");
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("resistors.fan.continuous-without");
  }

  @Test
  void a_section_without_ratings_is_not_judged() {
    Finding finding =
        left(0.8).with("0.60 ohm, continuous: 45 A,", "0.60 ohm,").finding(RULE, "bank");
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("resistors.sections[1].continuous");
  }

  @Test
  void the_heat_capacity_stays_unless_a_time_constant_is_declared() {
    Starter starter = left(0.5).starter();
    SectionElement with = SectionElement.of(starter.resistors(), 1).orElseThrow();
    SectionElement without =
        SectionElement.of(WithoutFan.of(starter).orElseThrow().resistors(), 1).orElseThrow();
    assertThat(without.referenceAmps()).isCloseTo(0.5 * with.referenceAmps(), within(1e-9));
    assertThat(without.timeConstantSeconds())
        .isCloseTo(4.0 * with.timeConstantSeconds(), within(1e-6));

    Starter declared = fan("continuous-without: 50 %, time-constant-without: 200 %").starter();
    SectionElement slower =
        SectionElement.of(WithoutFan.of(declared).orElseThrow().resistors(), 1).orElseThrow();
    assertThat(slower.timeConstantSeconds())
        .isCloseTo(2.0 * with.timeConstantSeconds(), within(1e-6));
  }

  /** With the fan still there in full, the answer is the worse of resistor/start and /duty. */
  @Test
  void a_fan_that_carries_nothing_away_changes_nothing() {
    StarterText same = left(1.0);
    double start = same.finding("resistor/start", "section 1").margin().orElseThrow();
    double hour = same.finding("resistor/duty", "section 1").margin().orElseThrow();
    assertThat(same.finding(RULE, "section 1").margin().orElseThrow())
        .isCloseTo(Math.min(start, hour), within(1e-6));
  }

  @Test
  void it_turns_where_a_section_comes_to_its_limit() {
    double low = 0.35; // above: time constants that are no section's
    double high = 1.0;
    assertThat(hourly(high).finding(RULE, "section 1").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(hourly(low).finding(RULE, "section 1").verdict()).isEqualTo(Verdict.BREACH);
    for (int i = 0; i < 4; i++) {
      double middle = 0.5 * (low + high);
      if (hourly(middle).finding(RULE, "section 1").margin().orElseThrow() < 1.0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    assertThat(hourly(high + 0.03).finding(RULE, "section 1").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(hourly(low - 0.03).finding(RULE, "section 1").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(high).isBetween(0.4, 0.99);
  }

  /** A series that burns a section without the fan is tight where a sensor ends it before. */
  @Test
  void a_sensor_on_its_elements_is_credited_in_a_series() {
    Finding blind = often(0.36).finding(RULE, "section 1");
    assertThat(blind.says()).contains("no fitted device sees it");
    StarterText seen =
        often(0.36).under("F5:", "  T1: {kind: temperature, rise: 300 K, lag: 5 s, trips: K1}");
    Finding finding = seen.finding(RULE, "section 1");
    assertThat(finding.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(finding.says()).contains("T1 sees it");
    StarterText late =
        often(0.36).under("F5:", "  T1: {kind: temperature, rise: 390 K, lag: 5 s, trips: K1}");
    assertThat(late.finding(RULE, "section 1").verdict()).isEqualTo(Verdict.BREACH);
  }
}
