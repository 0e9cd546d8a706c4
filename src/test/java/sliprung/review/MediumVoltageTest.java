package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** A starter at 4160 V: no figure of low-voltage gear is held against it. */
class MediumVoltageTest {
  private static final String GG = "FU: {kind: fuse, class: gG, rating: 200 A, breaking: 100 kA}";
  private static final StarterText GG_MILL =
      StarterText.mill(GG).with("practice: nec", "practice: iec");

  /** Behind a breaker with an instantaneous element, as the mill without its fuse would be. */
  private static final StarterText NO_FUSE =
      StarterText.mill("50: {kind: instantaneous, pick-up: 2 kA, trips: M, blocked-above: 3.5 kA}")
          .with(", with: FU,", ", with: 50,");

  @ParameterizedTest
  @CsvSource({
    "trip/start, FU",
    "trip/fuse-wear, FU",
    "short-circuit/capacity, FU",
    "short-circuit/minimum, FU",
    "short-circuit/rating, FU",
    "contactor/short-circuit, M",
    "conductor/withstand, stator cable"
  })
  void nothing_of_a_low_voltage_fuse_counts(String rule, String subject) {
    Finding finding = GG_MILL.finding(rule, subject);
    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void that_it_is_one_stays_implausible() {
    assertThat(GG_MILL.review().findings())
        .anyMatch(f -> f.rule().equals("data/plausible") && f.verdict() == Verdict.BREACH);
    assertThat(GG_MILL.review().mustJudgeMissing()).contains("trip/start");
  }

  @Test
  void two_low_voltage_fuses_in_series_have_no_ratio_there() {
    StarterText two =
        GG_MILL.under("FU:", "  FV: {kind: fuse, class: gG, rating: 400 A, breaking: 100 kA}");
    assertThat(two.finding("short-circuit/upstream", "FV").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void its_own_tested_breaking_current_lets_a_contactor_be_judged() {
    Finding stop = NO_FUSE.finding("contactor/breaking", "M");
    assertThat(stop.verdict()).isEqualTo(Verdict.CLEAR);
    double greatest = stop.value().orElseThrow();
    assertThat(breaking(1.01 * greatest).finding("contactor/breaking", "M").verdict())
        .isEqualTo(Verdict.CLEAR);
    assertThat(breaking(0.99 * greatest).finding("contactor/breaking", "M").verdict())
        .isEqualTo(Verdict.BREACH);
  }

  private static StarterText breaking(double amps) {
    return NO_FUSE.with("breaking: 4 kA", StarterText.text("breaking: %s A", amps));
  }

  @Test
  void without_one_it_is_not_judged_and_the_path_is_one_that_helps() {
    StarterText without = NO_FUSE.with(" breaking: 4 kA,", "");
    Finding stop = without.finding("contactor/breaking", "M");
    assertThat(stop.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(stop.missing()).containsExactly("contactors.M.breaking");
    Finding exposure = without.finding("held/exposure", "step 1");
    assertThat(exposure.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(exposure.missing()).containsExactly("contactors.M.breaking");
  }

  @Test
  void a_rated_voltage_below_the_supply_proves_nothing() {
    StarterText low = NO_FUSE.with("rated-voltage: 5000 V", "rated-voltage: 3600 V");
    assertThat(low.finding("contactor/breaking", "M").verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }

  @Test
  void categories_end_at_a_thousand_volts_whatever_is_given() {
    for (String rule : List.of("contactor/making", "contactor/line-category")) {
      Finding finding = NO_FUSE.finding(rule, "M");
      assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
      assertThat(finding.says()).contains("IEC 62271-106").doesNotContain("tested breaking");
    }
  }
}
