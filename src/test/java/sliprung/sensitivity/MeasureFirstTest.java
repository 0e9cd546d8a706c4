package sliprung.sensitivity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.sensitivity.MeasureFirst.Question;
import sliprung.starter.EvidenceGrade;

class MeasureFirstTest {
  private static final String INERTIA = "load.inertia";

  /** Its sequence timer waits for a speed, which takes as long as the inertia makes it. */
  private static final StarterText BY_SPEED =
      StarterText.small().with("until: last-step", "until: {speed: 90 %}");

  private static StarterText graded(String grade) {
    return BY_SPEED.plus("evidence:\n  load.inertia: " + grade);
  }

  /** What moves the margin of the sequence timer, the furthest first. */
  private static List<Sensitivity> timer(StarterText text) {
    Review review = text.review();
    Finding timer = text.finding("trip/start", "F5");
    DecidingStarts starts = DecidingStarts.of(review, List.of(timer)).get(0);
    return MeasureFirst.moved(starts, UncertainInputs.of(review.starter())).get(Question.of(timer));
  }

  private static Sensitivity timerByInertia(StarterText text) {
    return timer(text).stream().filter(s -> s.input().equals(INERTIA)).findFirst().orElseThrow();
  }

  @Test
  void more_inertia_takes_longer_and_thins_the_margin_of_a_timer_that_waits_for_speed() {
    Sensitivity moved = timerByInertia(graded("estimated"));

    assertThat(moved.low().orElseThrow()).isGreaterThan(moved.margin());
    assertThat(moved.high().orElseThrow()).isLessThan(moved.margin());
    // the margin is time set over time taken; the time goes with the inertia, so a quarter more
    // takes at most a quarter of the margin's reciprocal
    assertThat(moved.margin() / moved.high().orElseThrow()).isBetween(1.02, 1.25);
  }

  @Test
  void the_ends_are_the_margins_of_whole_reviews() {
    Sensitivity moved = timerByInertia(graded("estimated"));
    StarterText heavier = graded("estimated").with("\n  inertia: 8 kg·m²", "\n  inertia: 10 kg·m²");

    assertThat(moved.high().orElseThrow())
        .isCloseTo(heavier.finding("trip/start", "F5").margin().orElseThrow(), within(1e-9));
  }

  @Test
  void what_was_measured_ranks_below_what_was_estimated() {
    List<String> guessed = timer(graded("estimated")).stream().map(Sensitivity::input).toList();
    List<String> known = timer(graded("measured")).stream().map(Sensitivity::input).toList();

    assertThat(guessed.get(0)).isEqualTo(INERTIA);
    assertThat(known.get(0)).isNotEqualTo(INERTIA);
    assertThat(timerByInertia(graded("estimated")).reach())
        .isGreaterThan(5.0 * timerByInertia(graded("measured")).reach());
  }

  @Test
  void each_rule_is_asked_once_thinnest_first_and_its_inputs_by_reach() {
    Review review = BY_SPEED.review();
    MeasureFirst first = MeasureFirst.of(review);

    assertThat(first.margins()).hasSize(MeasureFirst.RULES);
    assertThat(first.margins()).extracting(m -> m.finding().rule()).doesNotHaveDuplicates();
    assertThat(first.margins())
        .extracting(m -> m.finding().margin().orElseThrow() / m.finding().wanted().orElseThrow())
        .isSorted();
    assertThat(first.margins())
        .allSatisfy(
            m -> {
              assertThat(m.finding().verdict()).isNotEqualTo(Verdict.NOT_JUDGED);
              assertThat(m.finding().start()).isPresent();
              assertThat(m.inputs())
                  .isSortedAccordingTo(Comparator.comparingDouble(Sensitivity::reach).reversed());
            });
    assertThat(first.says().orElseThrow()).contains(" from ").contains(" to between ");
  }

  @Test
  void the_deciding_starts_of_the_crusher_give_the_margins_of_its_whole_review() {
    Review review = StarterText.crusher().review();
    List<Finding> thin = MeasureFirst.thinnest(review);
    List<DecidingStarts> deciding = DecidingStarts.of(review, thin);

    assertThat(deciding.stream().mapToInt(d -> d.findings().size()).sum()).isEqualTo(thin.size());
    assertThat(deciding.get(0).selection().corners().size()).isLessThan(10);
    for (DecidingStarts some : deciding) {
      var margins = some.margins(review.starter());
      for (Finding finding : some.findings()) {
        assertThat(margins.get(Question.of(finding)).orElseThrow())
            .isCloseTo(finding.margin().orElseThrow(), within(1e-9));
      }
    }
  }

  @Test
  void words_of_a_sensitivity() {
    Sensitivity estimated = sensitivity(EvidenceGrade.ESTIMATED, 1.15, OptionalDouble.of(0.97));
    Sensitivity measured = sensitivity(EvidenceGrade.MEASURED, 1.15, OptionalDouble.of(0.97));
    Sensitivity none = sensitivity(EvidenceGrade.TOLD, 1.15, OptionalDouble.empty());

    assertThat(estimated.says())
        .isEqualTo(
            "Measure the load's inertia first (estimated, ±25\u00a0%): it would move this margin from"
                + " 1.04 to between 0.97 and 1.15.");
    assertThat(measured.says())
        .startsWith("The load's inertia (measured, ±2\u00a0%) still counts most: it would move");
    assertThat(none.says())
        .isEqualTo(
            "Measure the load's inertia first (told, ±15\u00a0%): it could leave no margin to give,"
                + " against 1.04 as judged, at its greatest.");
    assertThat(none.reach()).isInfinite();
    assertThat(estimated.reach()).isCloseTo(0.18 / 1.1, within(1e-12));
    assertThat(sensitivity(EvidenceGrade.TOLD, 50.0, OptionalDouble.of(0.97)).reach())
        .isCloseTo(3.0 - 0.97 / 1.1, within(1e-12));
  }

  private static Sensitivity sensitivity(EvidenceGrade grade, double low, OptionalDouble high) {
    return new Sensitivity(
        "trip/start",
        "F5",
        1.04,
        1.1,
        INERTIA,
        "the load's inertia",
        grade,
        1.0 - grade.spread(),
        1.0 + grade.spread(),
        OptionalDouble.of(low),
        high);
  }
}
