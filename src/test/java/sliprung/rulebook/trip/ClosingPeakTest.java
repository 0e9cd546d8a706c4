package sliprung.rulebook.trip;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.fixture.WithoutPeaks;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Stage;

class ClosingPeakTest {
  private static final Rule RULE = new NoClosingPeakPicksUp();
  private static final String F5 = "  F5: {kind: sequence-timer";

  /** With an element without tolerance, so that its pick-up is its setting. */
  private static Facts facts(double pickUp, String more) {
    String element =
        String.format(
            Locale.ROOT,
            "  F4: {kind: instantaneous, pick-up: %.9f A, accuracy: {pick-up: 0 %%}, %s,"
                + " trips: Q1}\n",
            pickUp,
            more);
    return CrusherFacts.of(F5, element + F5);
  }

  private static Finding judge(double pickUp, String more) {
    return CrusherFacts.finding(RULE, facts(pickUp, more), "F4");
  }

  private static double greatest(ToDoubleFunction<Stage> quantity) {
    return CrusherFacts.of()
        .permitted()
        .flatMap(s -> s.history().stages().stream())
        .mapToDouble(quantity)
        .max()
        .orElseThrow();
  }

  private static double ofPeak(ToDoubleFunction<ClosingPeak> quantity) {
    return greatest(s -> quantity.applyAsDouble(s.peak().orElseThrow()));
  }

  @Test
  void an_element_that_measures_peaks_operates_above_root_two_of_its_setting() {
    double limit = ofPeak(ClosingPeak::statorAmps) / Math.sqrt(2.0);
    String peak = "measures: peak, overreach: 0 %";

    assertThat(judge(0.999 * limit, peak).verdict()).isEqualTo(Verdict.BREACH);
    Finding tight = judge(1.001 * limit, peak);
    assertThat(tight.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(tight.margin().getAsDouble()).isCloseTo(1.001, within(1e-6));
    assertThat(judge(1.099 * limit, peak).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(judge(1.101 * limit, peak).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void an_element_that_measures_rms_sees_the_fundamental_without_its_offset() {
    double limit =
        greatest(s -> Math.max(s.peak().orElseThrow().statorRms(), s.entry().statorAmps()));
    String rms = "measures: rms, overreach: 0 %";

    assertThat(limit).isLessThan(ofPeak(ClosingPeak::statorAmps) / Math.sqrt(2.0));
    assertThat(judge(0.999 * limit, rms).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judge(1.001 * limit, rms).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(judge(1.101 * limit, rms).verdict()).isEqualTo(Verdict.CLEAR);
  }

  @Test
  void overreach_and_accuracy_make_it_pick_up_earlier() {
    double exact = judge(2000, "measures: rms, overreach: 0 %").margin().getAsDouble();
    assertThat(judge(2000, "measures: rms, overreach: 10 %").margin().getAsDouble())
        .isCloseTo(exact / 1.1, within(1e-9));
    Finding usual =
        CrusherFacts.finding(
            RULE,
            CrusherFacts.of(
                F5,
                "  F4: {kind: instantaneous, pick-up: 2000 A, measures: rms, overreach: 0 %,"
                    + " trips: Q1}\n"
                    + F5),
            "F4");
    assertThat(usual.margin().getAsDouble()).isCloseTo(exact * 0.95, within(1e-9));
  }

  @Test
  void in_the_rings_the_ring_current_counts() {
    double limit = ofPeak(ClosingPeak::ringAmps) / Math.sqrt(2.0);
    String rotor = "measures: peak, overreach: 0 %, place: rotor, measures-by: direct";

    assertThat(judge(0.999 * limit, rotor).verdict()).isEqualTo(Verdict.BREACH);
    assertThat(judge(1.001 * limit, rotor).verdict()).isEqualTo(Verdict.TIGHT);
  }

  @Test
  void it_says_amperes_and_what_closed() {
    Finding breach = judge(200, "measures: peak, overreach: 10 %");
    assertThat(CrusherFacts.says(breach))
        .contains("A peak at F4 after K")
        .contains("it may pick up from 257 A peak")
        .contains("set to 200 A RMS, overreach 10 %");
    assertThat(CrusherFacts.mend(breach)).contains("Raise its pick-up");
  }

  @Test
  void without_peaks_nothing_is_clear() {
    Facts facts = WithoutPeaks.of(facts(1e5, "measures: peak"));
    Finding finding = CrusherFacts.finding(RULE, facts, "F4");
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(CrusherFacts.says(finding)).contains("transient of step 1 was not computed");
  }

  @Test
  void without_an_element_it_has_no_subject() {
    assertThat(RULE.judge(CrusherFacts.of())).isInstanceOf(Rule.Answer.NotApplicable.class);
    assertThat(CrusherFacts.findings(RULE, CrusherFacts.of())).isEqualTo(List.of());
  }
}
