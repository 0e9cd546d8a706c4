package sliprung.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.review.CrusherReview;
import sliprung.review.Review;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/** What the start over time and the time-current sheet show. */
class SeriesOfAStartTest {
  private static final Review REVIEW = CrusherReview.plain();

  @Test
  void should_begin_a_column_at_every_closing() {
    StartOverTime chart = StartOverTime.of(REVIEW).orElseThrow();
    assertThat(chart.stages())
        .extracting(StartOverTime.Column::closedBy)
        .containsExactly("K1", "K11", "K12", "K13", "K14", "K15");
    assertThat(chart.stages().get(1).fromSeconds()).isCloseTo(4.26, within(1e-9));
    assertThat(chart.stages().get(5).toSeconds()).isEqualTo(chart.endSeconds());
  }

  @Test
  void should_keep_the_nominal_line_inside_the_band_of_all_corners() {
    StartOverTime chart = StartOverTime.of(REVIEW).orElseThrow();
    assertThat(chart.corners()).isEqualTo(3);
    double[] low = chart.speedRpm().low().values();
    double[] high = chart.speedRpm().high().values();
    double[] seconds = chart.speedRpm().low().seconds();
    double[] nominal =
        Sampling.edges(
                List.of(REVIEW.start("cold").orElseThrow().history()),
                Trace::speed,
                30.0 / Math.PI,
                chart.endSeconds())
            .get(0)
            .values();
    for (int i = 0; i < seconds.length; i++) {
      assertThat(nominal[i]).isBetween(low[i] - 1e-6, high[i] + 1e-6);
    }
    assertThat(nominal[nominal.length - 1]).isGreaterThan(1000.0);
  }

  @Test
  void should_mark_the_sequence_timer_with_its_spread() {
    StartOverTime chart = StartOverTime.of(REVIEW).orElseThrow();
    assertThat(chart.timers())
        .containsExactly(new StartOverTime.TimerTick("F5", 13.0, 13.0 * 0.95, 13.0 * 1.05));
    assertThat(chart.endSeconds()).isGreaterThan(13.65);
  }

  @Test
  void should_say_run_up_and_peak_of_the_nominal_start() {
    assertThat(StartOverTime.of(REVIEW).orElseThrow().says())
        .startsWith("The nominal cold start runs up in ")
        .contains("draws at most ");
  }

  @Test
  void should_measure_how_long_a_current_stays_at_or_above_a_level() {
    // a triangle: up from 100 A to 300 A in 2 s and down again
    Stage stage = triangle();
    assertThat(DurationCurve.secondsAtOrAbove(List.of(stage), 200.0, 100.0))
        .isCloseTo(2.0, within(1e-12));
    assertThat(DurationCurve.secondsAtOrAbove(List.of(stage), 100.0, 100.0))
        .isCloseTo(4.0, within(1e-12));
    assertThat(DurationCurve.secondsAtOrAbove(List.of(stage), 200.0, 2.0))
        .isCloseTo(1.0, within(1e-12));
    DurationCurve curve = DurationCurve.stator("start", List.of(stage), 100.0);
    assertThat(curve.seconds()[0]).isCloseTo(0.0, within(1e-6));
    assertThat(curve.seconds()[curve.seconds().length - 1]).isCloseTo(4.0, within(1e-6));
  }

  @Test
  void should_begin_above_nothing_where_a_current_builds_up_from_zero() {
    double[] zero = new double[3];
    double[] amps = {0.0, 100.0, 200.0};
    Trace trace = new Trace(new double[] {0, 1, 2}, zero, amps, zero, zero, zero, zero, zero);
    Stage stage = new Stage(1, List.of(1), 0.1, 0.0, 2.0, false, "K1", trace);
    DurationCurve curve = DurationCurve.stator("start", List.of(stage), 2.0);
    assertThat(curve.amps()[curve.amps().length - 1]).isCloseTo(40.0, within(1e-6));
  }

  @Test
  void should_draw_held_steps_that_settle_alike_as_one_line() {
    TimeCurrentSheet sheet = TimeCurrentSheet.of(REVIEW, List.of());
    assertThat(sheet.held())
        .extracting(TimeCurrentSheet.HeldCurrent::label)
        .satisfiesExactly(
            l -> assertThat(l).startsWith("held on steps 1–5: "),
            l -> assertThat(l).startsWith("held on steps 1–5 at running load: "));
    assertThat(sheet.says()).contains("no single point").contains("below its rated 208\u00a0A");
  }

  @Test
  void should_label_only_the_outermost_of_many_held_currents() {
    List<TimeCurrentSheet.HeldCurrent> many =
        java.util.stream.IntStream.rangeClosed(1, 5)
            .mapToObj(k -> new TimeCurrentSheet.HeldCurrent("held on step " + k, 100.0 * k))
            .toList();
    assertThat(TimeCurrentSheet.outermostLabelled(many))
        .extracting(TimeCurrentSheet.HeldCurrent::label)
        .containsExactly("least: held on step 1", "", "", "", "greatest: held on step 5");
  }

  @Test
  void should_show_the_stall_limits_at_the_current_with_rings_shorted() {
    TimeCurrentSheet sheet = TimeCurrentSheet.of(REVIEW, List.of());
    assertThat(sheet.stall())
        .extracting(TimeCurrentSheet.Stall::seconds)
        .as("the cold one is a point of the winding's own line")
        .containsExactly(14.0);
    double shorted =
        REVIEW
            .start("rings-shorted")
            .orElseThrow()
            .history()
            .stages()
            .get(0)
            .trace()
            .statorAmps()[0];
    // declared at rated voltage; the supply's dip takes some of it
    assertThat(sheet.stall().get(0).amps()).isBetween(shorted, 1.2 * shorted);
  }

  private static Stage triangle() {
    double[] zero = new double[3];
    double[] amps = {100.0, 300.0, 100.0};
    Trace trace = new Trace(new double[] {0, 2, 4}, zero, amps, zero, zero, zero, zero, zero);
    return new Stage(1, List.of(1), 0.1, 0.0, 4.0, false, "K1", trace);
  }
}
