package sliprung.rulebook.resistor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.protection.SectionElement;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.StartHistory;
import sliprung.starter.ResistorBank;

class DutyTest {
  private static final EverySectionStandsTheStartsOfAnHour RULE =
      new EverySectionStandsTheStartsOfAnHour();
  private static final String PER_HOUR = "per-hour: 4";

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), "section 2");
  }

  private static Finding perHour(double starts) {
    return judged(PER_HOUR, "per-hour: " + starts);
  }

  private static RepeatedStarts section(int number) {
    Facts facts = CrusherFacts.of();
    ResistorBank bank = facts.starter().resistors();
    StartHistory start = facts.permitted().findFirst().orElseThrow().history();
    List<SectionElement> elements =
        List.of(SectionElement.of(bank, 1).orElseThrow(), SectionElement.of(bank, 2).orElseThrow());
    return RepeatedStarts.of(bank, elements, number, start);
  }

  @Test
  void should_pass_a_few_starts_an_hour() {
    Finding finding = perHour(1);

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("1 starts an hour").contains("20 min");
  }

  @Test
  void should_fail_hundreds() {
    assertThat(perHour(200).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_turn_at_the_limit_and_at_the_wanted_margin() {
    double clear = 1;
    double breach = 200;
    while (breach - clear > 0.01) {
      double middle = 0.5 * (clear + breach);
      if (perHour(middle).margin().orElseThrow() >= 1.0) {
        clear = middle;
      } else {
        breach = middle;
      }
    }
    assertThat(perHour(clear * 0.999).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(perHour(breach * 1.001).verdict()).isEqualTo(Verdict.BREACH);
  }

  @Test
  void should_begin_like_a_single_start_where_the_period_is_very_long() {
    Facts facts = CrusherFacts.of();
    double single =
        facts.permitted().findFirst().orElseThrow().part("section-2").orElseThrow().use();

    assertThat(section(2).peak(1, 1e7, 0.0)).isCloseTo(single, within(0.01 * single));
  }

  @Test
  void should_come_to_more_with_the_air_than_without_and_more_bunched_than_apart() {
    double without = section(2).peak(1, 900.0, 0.0);

    assertThat(section(2).peak(1, 900.0, 0.467)).isGreaterThanOrEqualTo(without);
    assertThat(section(2).peak(2, 1800.0, 0.467)).isGreaterThan(section(2).peak(1, 900.0, 0.467));
  }

  @Test
  void should_tend_to_the_mean_square_over_the_continuous_rating() {
    // starts back to back for ever: the elements end between the mean and the greatest drive
    Facts facts = CrusherFacts.of();
    StartHistory start = facts.permitted().findFirst().orElseThrow().history();
    double end = start.stages().get(start.stages().size() - 1).toSeconds();
    double joule = 0.0;
    for (int k = 0; k < 2; k++) {
      var trace = start.stages().get(k).trace();
      joule += trace.integralOfSquare(trace.ringAmps());
    }
    double mean = joule / end / (175.0 * 175.0);

    assertThat(section(2).peak(1, end, 0.0)).isGreaterThan(mean).isLessThan(1.2 * mean);
  }

  @Test
  void should_count_inching_as_half_a_start() {
    double three = perHour(7).value().orElseThrow();
    double inched =
        judged("inching: none", "inching: {per-hour: 6, step: 1}").value().orElseThrow();

    assertThat(inched).isCloseTo(three, within(1e-12));
  }

  @Test
  void should_not_judge_without_the_starts_of_an_hour() {
    Finding finding = judged(", per-hour: 4", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("duty.starts.per-hour");
  }

  @Test
  void should_not_judge_where_any_section_has_no_ratings() {
    Finding finding = judged("continuous: 130 A, ", "");

    assertThat(finding.verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(finding.missing()).containsExactly("resistors.sections[1].continuous");
  }

  @Test
  void should_say_how_many_starts_a_plugging_counts_as() {
    Finding finding = judged("plugging: none", "plugging: {per-hour: 20, step: 1}");

    assertThat(says(finding))
        .contains("84 starts an hour (4 as such, 80 from 20 times plugging, which counts as 4")
        .contains("starts each)");
  }
}
