package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.StarterText;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** Deviations that someone answers for; the start takes 6.10 s. */
class AcceptedDeviationTest {
  private static final LocalDate DAY = StarterText.DAY;

  private static StarterText timer(double seconds) {
    return StarterText.sound()
        .line(
            "F5:",
            StarterText.text(
                "F5: {kind: sequence-timer, time: %s s, until: last-step, trips: K1}", seconds));
  }

  /** The timer breaches trip/start and sequence/supervision alike; both are accepted, or one. */
  private static StarterText accepting(
      double seconds, String subject, String notBelow, LocalDate until) {
    String entry =
        "  - {rule: %s, subject: "
            + subject
            + ", not-below: "
            + notBelow
            + ", reason: tested on site, by: chief electrician, until: "
            + until
            + "}\n";
    return timer(seconds)
        .plus(
            "accepted:\n"
                + entry.replace("%s", "trip/start")
                + entry.replace("%s", "sequence/supervision"));
  }

  @Test
  void a_breach_is_a_breach_until_someone_answers_for_it() {
    assertThat(timer(6.0).review().exitStatus()).isEqualTo(1);

    StarterText text = accepting(6.0, "F5", "0.95", DAY.plusDays(1));
    Finding finding = text.finding("trip/start", "F5");
    assertThat(finding.verdict()).isEqualTo(Verdict.ACCEPTED);
    assertThat(finding.by()).contains("chief electrician");
    assertThat(finding.until()).contains(DAY.plusDays(1));
    assertThat(finding.margin().orElseThrow()).isCloseTo(6.0 / 6.1, within(1e-9));
    assertThat(finding.says()).contains("tested on site");
    assertThat(text.finding("sequence/supervision", "F5").verdict()).isEqualTo(Verdict.ACCEPTED);
    assertThat(text.review().exitStatus()).isZero();
    assertThat(text.review().findings()).noneMatch(f -> f.rule().equals("data/accepted"));
  }

  @Test
  void a_tight_margin_may_be_accepted_too() {
    assertThat(timer(6.3).finding("trip/start", "F5").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(accepting(6.3, "F5", "1.0", DAY.plusYears(1)).finding("trip/start", "F5").verdict())
        .isEqualTo(Verdict.ACCEPTED);
  }

  @ParameterizedTest
  @CsvSource({"0, ACCEPTED", "1, ACCEPTED", "-1, BREACH", "-400, BREACH"})
  void it_holds_to_the_end_of_its_last_day(int daysLeft, Verdict verdict) {
    StarterText text = accepting(6.0, "F5", "0.95", DAY.plusDays(daysLeft));
    Finding finding = text.finding("trip/start", "F5");

    assertThat(finding.verdict()).isEqualTo(verdict);
    assertThat(text.review().exitStatus()).isEqualTo(verdict == Verdict.BREACH ? 1 : 0);
    if (verdict == Verdict.BREACH) {
      assertThat(finding.says()).contains(DAY.plusDays(daysLeft).toString());
      assertThat(finding.by()).isEmpty();
    }
  }

  /** 6.0 s against 6.10 s: 0.984. */
  @ParameterizedTest
  @CsvSource({"0.98, ACCEPTED", "0.99, BREACH"})
  void it_covers_no_margin_below_its_own(String notBelow, Verdict verdict) {
    assertThat(
            accepting(6.0, "F5", notBelow, DAY.plusDays(9)).finding("trip/start", "F5").verdict())
        .isEqualTo(verdict);
  }

  @Test
  void a_wrong_subject_covers_nothing_and_is_a_finding_itself() {
    StarterText text = accepting(6.0, "F2", "0.95", DAY.plusDays(9));

    assertThat(text.finding("trip/start", "F5").verdict()).isEqualTo(Verdict.BREACH);
    assertThat(text.finding("data/accepted", "trip/start F2").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(text.review().exitStatus()).isEqualTo(1);
  }

  @Test
  void one_that_meets_no_breach_is_a_finding() {
    StarterText text = accepting(9.0, "F5", "0.95", DAY.plusDays(9));

    assertThat(text.finding("trip/start", "F5").verdict()).isEqualTo(Verdict.CLEAR);
    assertThat(text.finding("data/accepted", "trip/start F5").verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(text.review().exitStatus()).isZero();
  }

  /** Nothing says how far an answer without a margin lies from its limit. */
  @Test
  void a_breach_without_a_margin_cannot_be_accepted() {
    StarterText text =
        StarterText.sound()
            .without("F5:")
            .plus(
                "accepted:\n  - {rule: held/blind, subject: step 1, not-below: 0, reason: seen by"
                    + " the operator, by: plant manager, until: 2030-01-01}");

    assertThat(text.finding("held/blind", "step 1").verdict()).isEqualTo(Verdict.BREACH);
  }

  /** Nobody can answer for what nobody knows. */
  @Test
  void a_rule_that_is_not_judged_cannot_be_accepted() {
    StarterText text =
        StarterText.sound()
            .without("stall-limit:")
            .plus(
                "accepted:\n  - {rule: locked/sequence, subject: sequence, not-below: 0, reason:"
                    + " unknown, by: plant manager, until: 2030-01-01}");

    assertThat(text.finding("locked/sequence", "sequence").verdict()).isEqualTo(Verdict.NOT_JUDGED);
    assertThat(text.review().mustJudgeMissing()).contains("locked/sequence");
    assertThat(text.review().exitStatus()).isEqualTo(4);
  }
}
