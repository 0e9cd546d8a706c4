package sliprung.dial;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.dial.Judgement.Question;

/** Windows of known functions: where they end, where they have holes, where there is none. */
class WindowSearchTest {

  private static Offset<Double> thousandth(double of) {
    return within(1.01e-3 * of);
  }

  private static String rule(Window.Bound bound) {
    return bound.breaks().orElseThrow().rule();
  }

  @Test
  void should_end_where_the_margins_reach_their_limits_and_name_the_rules() {
    DialReport report =
        new Synthetic().rule("low", x -> x / 1.3).rule("high", x -> 5.7 / x).search();

    assertThat(report.windows()).hasSize(1);
    Window window = report.windows().get(0);
    assertThat(window.low()).isCloseTo(1.3, thousandth(1.3)).isGreaterThanOrEqualTo(1.3);
    assertThat(window.high()).isCloseTo(5.7, thousandth(5.7)).isLessThanOrEqualTo(5.7);
    assertThat(rule(window.below())).isEqualTo("test/low");
    assertThat(rule(window.above())).isEqualTo("test/high");
    assertThat(window.below().outside()).isLessThan(1.3);
    assertThat(window.above().outside()).isGreaterThan(5.7);
    assertThat(report.looked()).isLessThan(35);
  }

  @Test
  void should_recommend_the_thickest_thinnest_margin_to_three_figures() {
    DialReport report =
        new Synthetic().rule("low", x -> x / 1.7).rule("high", x -> 2.8 / x).search();

    double setting = report.recommended().orElseThrow();
    assertThat(setting).isCloseTo(Math.sqrt(1.7 * 2.8), within(0.02));
    assertThat(Dial.threeFigures(setting)).isEqualTo(setting);
  }

  @Test
  void a_rule_that_speaks_only_far_outside_says_nothing_of_the_inside() {
    DialReport report =
        new Synthetic()
            .rule("low", x -> x / 1.7)
            .rule("high", x -> 2.8 / x)
            .rule("far", x -> x > 12 ? 0.0 : Double.NEGATIVE_INFINITY)
            .search();

    assertThat(report.recommended().orElseThrow()).isCloseTo(Math.sqrt(1.7 * 2.8), within(0.02));
  }

  @Test
  void should_keep_a_setting_of_today_that_is_as_good_as_any() {
    DialReport report = new Synthetic().rule("flat", x -> 1.5 + 0 * x).search();

    assertThat(report.recommended()).contains(2.0);
    assertThat(report.windows().get(0).below().breaks()).isEmpty();
    assertThat(report.windows().get(0).low()).isEqualTo(0.25);
    assertThat(report.windows().get(0).high()).isEqualTo(16.0);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.61, 3.1, 4.4, 7.9})
  void should_find_a_hole_far_narrower_than_the_grid(double centre) {
    DialReport report =
        new Synthetic().rule("vee", x -> 0.985 + Math.abs(Math.log(x / centre))).search();

    assertThat(report.windows()).hasSize(2);
    double half = Math.exp(0.015);
    assertThat(report.windows().get(0).high()).isCloseTo(centre / half, thousandth(centre));
    assertThat(report.windows().get(1).low()).isCloseTo(centre * half, thousandth(centre));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.61, 3.1, 4.4, 7.9})
  void should_find_a_hole_in_a_smooth_margin(double centre) {
    DialReport report =
        new Synthetic().rule("bowl", x -> 0.998 + 1.5 * Math.pow(Math.log(x / centre), 2)).search();

    assertThat(report.windows()).hasSize(2);
    double half = Math.exp(Math.sqrt(0.002 / 1.5));
    assertThat(report.windows().get(0).high()).isCloseTo(centre / half, thousandth(centre));
    assertThat(report.windows().get(1).low()).isCloseTo(centre * half, thousandth(centre));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.7, 3.3, 9.1})
  void should_find_a_window_far_narrower_than_the_grid(double centre) {
    DialReport report =
        new Synthetic()
            .rule("low", x -> x / (0.99 * centre))
            .rule("high", x -> 1.01 * centre / x)
            .search();

    assertThat(report.windows()).hasSize(1);
    assertThat(report.windows().get(0).low()).isCloseTo(0.99 * centre, thousandth(centre));
    assertThat(report.windows().get(0).high()).isCloseTo(1.01 * centre, thousandth(centre));
    assertThat(report.isSetInside()).isFalse();
  }

  @Test
  void should_leave_a_dial_alone_whose_margins_are_ample() {
    DialReport report =
        new Synthetic().rule("low", x -> x / 0.9).rule("high", x -> 40.0 / x).search();

    assertThat(report.recommended()).contains(2.0);
  }

  @Test
  void should_end_at_a_jump_of_the_margin() {
    DialReport report = new Synthetic().rule("jump", x -> x <= 4.0 ? 1.5 : 0.3).search();

    assertThat(report.windows().get(0).high()).isCloseTo(4.0, thousandth(4.0));
    assertThat(report.windows().get(0).above().outside()).isCloseTo(4.0, thousandth(4.0));
  }

  @Test
  void should_end_where_several_rules_break_at_the_first_of_them() {
    DialReport report =
        new Synthetic()
            .rule("late", x -> 5.0 / x)
            .rule("first", x -> 3.0 / Math.sqrt(x * 3.0))
            .search();

    assertThat(rule(report.windows().get(0).above())).isEqualTo("test/first");
    assertThat(report.windows().get(0).high()).isCloseTo(3.0, thousandth(3.0));
  }

  @Test
  void a_verdict_that_goes_missing_ends_the_window() {
    DialReport notJudged = new Synthetic().rule("blind", x -> x < 3.7 ? 1.5 : Double.NaN).search();
    DialReport gone =
        new Synthetic().rule("gone", x -> x < 3.7 ? 1.5 : Double.NEGATIVE_INFINITY).search();

    assertThat(notJudged.windows().get(0).high()).isCloseTo(3.7, thousandth(3.7));
    assertThat(rule(notJudged.windows().get(0).above())).isEqualTo("test/blind");
    assertThat(gone.windows().get(0).high()).isCloseTo(3.7, thousandth(3.7));
    assertThat(rule(gone.windows().get(0).above())).isEqualTo("test/gone");
    assertThat(gone.windows().get(0).above().answer()).isEmpty();
  }

  @Test
  void what_was_never_judged_does_not_end_it() {
    DialReport report = new Synthetic().rule("blind", x -> Double.NaN).search();

    assertThat(report.windows().get(0).high()).isEqualTo(16.0);
  }

  @Test
  void should_set_apart_only_what_the_dial_cannot_move() {
    DialReport apart =
        new Synthetic().rule("fixed", x -> 0.4 + 0 * x).rule("low", x -> x / 1.3).search();
    DialReport counted =
        new Synthetic().rule("moves", x -> 0.4 + 0.01 * x).rule("low", x -> x / 1.3).search();

    assertThat(apart.apart()).containsExactly(new Question("test/fixed", "it"));
    assertThat(apart.windows()).hasSize(1);
    assertThat(counted.apart()).isEmpty();
    assertThat(counted.windows()).isEmpty();
  }

  @Test
  void should_say_what_is_left_where_there_is_no_window() {
    DialReport report =
        new Synthetic().rule("low", x -> x / 4.0).rule("high", x -> 3.0 / x).search();

    assertThat(report.windows()).isEmpty();
    assertThat(report.recommended()).isEmpty();
    assertThat(report.left()).isNotEmpty();
    assertThat(report.noFurther()).hasSize(1);
    assertThat(report.noFurther().get(0).high()).isCloseTo(3.0, thousandth(3.0));
    assertThat(rule(report.noFurther().get(0).above())).isEqualTo("test/high");
  }

  @Test
  void should_keep_the_true_value_inside_over_the_error_of_the_dial() {
    DialReport report =
        new Synthetic()
            .rule("low", x -> 1.0 + 0.001 * (x - 1.3))
            .rule("high", x -> 5.7 / x)
            .search(Synthetic.first(0.5, 10.0, 0.25, 0.05));

    // the margins alone would draw it to the low end
    assertThat(report.recommended().orElseThrow()).isBetween(1.8, 5.2);
    assertThat(report.recommended().orElseThrow() / 0.25)
        .isEqualTo(Math.rint(report.recommended().orElseThrow() / 0.25));
  }

  @Test
  void should_recommend_nothing_where_the_dial_is_too_coarse_or_too_inexact() {
    Synthetic narrow = new Synthetic().rule("low", x -> x / 1.9).rule("high", x -> 2.2 / x);
    DialReport inexact = narrow.search(Synthetic.first(0.5, 10.0, 0.1, 0.05));
    DialReport coarse = narrow.search(Synthetic.first(0.5, 10.0, 0.9, 0.0));

    assertThat(inexact.recommended()).isEmpty();
    assertThat(inexact.noneBecause()).contains("error");
    assertThat(coarse.windows()).hasSize(1);
    assertThat(coarse.recommended().orElse(2.0)).isEqualTo(2.0);
  }

  @Test
  void should_search_a_declared_range_and_no_further() {
    DialReport report =
        new Synthetic().rule("high", x -> 50.0 / x).search(Synthetic.first(0.0, 10.0, 0.1, 0.0));

    assertThat(report.windows().get(0).low()).isZero();
    assertThat(report.windows().get(0).high()).isEqualTo(10.0);
  }

  @Test
  void should_find_two_dials_that_mend_together_what_neither_mends_alone() {
    Synthetic both =
        new Synthetic()
            .rule("product", (x, y) -> x * y / 8.0)
            .rule("x", (x, y) -> 3.0 / x)
            .rule("y", (x, y) -> 3.0 / y);
    DialSurvey survey = DialSurvey.of(Synthetic.STARTER, both::at);

    for (DialReport report : survey.reports()) {
      assertThat(report.windows()).isEmpty();
      DialReport.Pair pair = report.pair().orElseThrow();
      assertThat(pair.other().path()).isNotEqualTo(report.dial().path());
      double other = pair.value();
      assertThat(pair.window().low() * other).isGreaterThanOrEqualTo(8.0);
      assertThat(pair.window().high()).isLessThanOrEqualTo(3.0);
      assertThat(other).isLessThanOrEqualTo(3.0).isEqualTo(Dial.threeFigures(other));
    }
  }

  @Test
  void should_not_invent_a_pair() {
    Synthetic hopeless =
        new Synthetic()
            .rule("product", (x, y) -> x * y / 20.0)
            .rule("x", (x, y) -> 3.0 / x)
            .rule("y", (x, y) -> 3.0 / y);

    assertThat(DialSurvey.of(Synthetic.STARTER, hopeless::at).reports())
        .allSatisfy(r -> assertThat(r.pair()).isEmpty());
  }

  @Test
  void should_judge_no_setting_twice() {
    java.util.Map<Double, Integer> asked = new java.util.concurrent.ConcurrentHashMap<>();
    Synthetic rules =
        new Synthetic()
            .rule(
                "low",
                x -> {
                  asked.merge(x, 1, Integer::sum);
                  return x / 1.3;
                });
    rules.search();

    assertThat(asked.values()).allMatch(n -> n == 1);
  }
}
