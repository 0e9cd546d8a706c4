package sliprung.rulebook.resistor;

import static org.assertj.core.api.Assertions.assertThat;
import static sliprung.fixture.CrusherFacts.finding;
import static sliprung.fixture.CrusherFacts.says;

import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

class ClassTest {
  private static final TheBankHasADutyClass RULE = new TheBankHasADutyClass();

  private static Finding judged(String... replacements) {
    return finding(RULE, CrusherFacts.of(replacements), "bank");
  }

  /** The bank is in for that long: two steps with closing times of nothing worth counting. */
  private static Finding in(double seconds, double perHour) {
    double second = seconds - 3.0 - 0.12;
    return judged(
        "after: 6 s",
        "after: 3 s",
        "after: 4 s",
        "after: " + second + " s",
        "per-hour: 4",
        "per-hour: " + perHour);
  }

  @Test
  void should_name_the_class_by_time_in_and_current_on_the_first_point() {
    Finding finding = in(9.9, 4);

    assertThat(finding.verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(says(finding)).contains("class 136").contains("10 s on, 70 s off");
  }

  @Test
  void should_turn_where_the_time_in_passes_that_of_a_row() {
    assertThat(says(in(9.99, 4))).contains("class 13");
    assertThat(says(in(10.01, 4))).contains("class 14");
    assertThat(in(14.99, 4).verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(in(15.01, 4).verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(says(in(15.01, 4))).contains("class 96");
  }

  @Test
  void should_turn_where_the_share_of_the_time_passes_that_of_a_row() {
    // 10 s in, twelve and a half per cent of the time: 45 starts an hour
    assertThat(says(in(9.99, 45))).contains("class 13");
    assertThat(says(in(9.99, 46))).contains("class 14");
  }

  @Test
  void should_take_the_nearest_current_on_the_first_point() {
    assertThat(says(judged("0.1845 ohm", "0.72 ohm")))
        .contains("first point")
        .contains("class 144");
  }

  @Test
  void should_not_judge_without_starts_of_an_hour() {
    Finding starts = judged(", per-hour: 4", "");

    assertThat(starts.missing()).containsExactly("duty.starts.per-hour");
    assertThat(starts.verdict()).isEqualTo(Verdict.NOT_JUDGED);
  }
}
