package sliprung.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import sliprung.fixture.CrusherFacts;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.review.CrusherReview;
import sliprung.review.Question;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/** The numbers that charts of a really computed review show. */
class ChartsOfAReviewTest {
  private static final Review REVIEW =
      Reviewer.review(
          CrusherFacts.starter(
              "stall-limit: {cold: 20 s, hot: 14 s}",
              "stall-limit: {cold: 20 s, hot: 14 s}\n"
                  + "  rings-at-rest: {current: 600 A, time: 15 s}",
              "F5: {kind",
              "F3: {kind: inverse-time, curve: iec-very-inverse, pick-up: 265 A, time-multiplier:"
                  + " 0.25, ct: 300/5, trips: Q1}\n  F5: {kind"),
          LocalDate.of(2026, 12, 1));

  private static TimeCurrentSheet sheet() {
    return TimeCurrentSheet.of(REVIEW, StatorBands.of(REVIEW.starter()));
  }

  private static ComputedStart start(String id) {
    return REVIEW.start(id).orElseThrow();
  }

  @Test
  void should_scale_ring_amperes_as_at_rest_and_say_how_far_running_differs() {
    double reactance = Source.reactanceOf(690.0, 9000.0);
    OperatingPoint rest = REVIEW.machine().at(new Source(690.0, reactance), 0.0, 1.0);
    SheetScales scales = sheet().scales();
    assertThat(scales.ringPerStator())
        .isCloseTo(rest.ringAmps() / rest.statorAmps(), within(1e-12));
    assertThat(scales.leastRingPerStator()).isLessThan(scales.ringPerStator());
    assertThat(sheet().says()).contains("holds at rest").contains("over the start the ratio falls");
  }

  @Test
  void should_scale_a_transformer_once() {
    assertThat(sheet().scales().transformers())
        .containsExactly(new SheetScales.Transformer("F3", "300/5", 5.0 / 300.0));
  }

  @Test
  void should_draw_the_withstand_of_rings_and_sections_at_the_stator_current_that_goes_with_it() {
    double ratio = sheet().scales().ringPerStator();
    Withstand rings = withstand("slip rings, at rest");
    Withstand first = withstand("section 1");
    for (int i = 0; i < rings.amps().length; i++) {
      double ring = rings.amps()[i] * ratio;
      assertThat(rings.seconds()[i]).isCloseTo(600.0 * 600.0 * 15.0 / ring / ring, within(1e-6));
      if (ring < 130.0) {
        assertThat(first.seconds()[i]).isInfinite();
      }
    }
    assertThat(sheet().withstand()).extracting(Withstand::label).doesNotContain("rotor cable");
  }

  @Test
  void should_draw_the_rotor_through_its_cold_stall_limit_and_contactors_by_their_short_time() {
    Withstand rotor = withstand("rotor winding, at rest");
    double shorted = sheet().stall().get(0).amps();
    int near = 0;
    while (rotor.amps()[near] < shorted) {
      near++;
    }
    double budget = shorted * shorted * 20.0;
    double there = rotor.amps()[near];
    assertThat(rotor.seconds()[near] * there * there).isCloseTo(budget, within(0.02 * budget));
    assertThat(rotor.isSwitchgear()).isFalse();
    Withstand line = withstand("K1, closed");
    int last = line.amps().length - 1;
    // IEC 60947-4-1, 9.3.5 (from memory): 8 times its greatest rated current for 10 s
    double rated = REVIEW.starter().contactor("K1").orElseThrow().ratings().get("AC-3");
    assertThat(line.seconds()[last] * Math.pow(line.amps()[last], 2.0))
        .isCloseTo(64.0 * rated * rated * 10.0, within(1.0));
    assertThat(line.isSwitchgear()).isTrue();
  }

  @Test
  void should_mark_where_each_step_hangs_at_running_load() {
    TorqueSpeed chart = TorqueSpeed.of(REVIEW).orElseThrow();
    assertThat(chart.runningHangs()).isNotEmpty();
    for (TorqueSpeed.Hang hang : chart.runningHangs()) {
      assertThat(hang.torque())
          .isCloseTo(chart.runningTorque(), within(1e-3 * chart.runningTorque()));
      assertThat(hang.rpm()).isPositive();
    }
  }

  private static Withstand withstand(String label) {
    return sheet().withstand().stream()
        .filter(w -> w.label().equals(label))
        .findFirst()
        .orElseThrow();
  }

  @Test
  void should_mark_the_take_over_where_both_middle_curves_have_one_time() {
    TakeOverMark mark = sheet().takeOvers().get(0);
    assertThat(mark.label()).isEqualTo("F1 takes over from F2");
    var bands = new sliprung.protection.Bands(REVIEW.starter());
    var fuse = REVIEW.starter().device("F1").orElseThrow();
    assertThat(
            bands
                .operatingSeconds(fuse, sliprung.protection.Edge.MIDDLE, mark.amps())
                .orElseThrow())
        .isCloseTo(mark.seconds(), within(1e-4 * mark.seconds()));
  }

  @Test
  void should_keep_a_middle_between_the_edges_of_a_band() {
    for (Band band : sheet().bands()) {
      for (int i = 0; i < band.amps().length; i++) {
        double middle = band.middleSeconds()[i];
        if (Double.isFinite(middle)) {
          assertThat(middle).isGreaterThanOrEqualTo(band.fastSeconds()[i] * (1.0 - 1e-9));
          assertThat(middle).isLessThanOrEqualTo(band.slowSeconds()[i] * (1.0 + 1e-9));
        }
      }
    }
  }

  @Test
  void should_leave_out_the_corner_band_where_there_is_one_corner() {
    assertThat(sheet().corners()).isEmpty();
    CornerBand band = CornerBand.of(CrusherReview.plain()).orElseThrow();
    assertThat(band.corners()).isEqualTo(3);
    for (int i = 0; i < band.amps().length; i++) {
      assertThat(band.leastSeconds()[i]).isLessThanOrEqualTo(band.greatestSeconds()[i]);
    }
  }

  @Test
  void should_hang_where_the_held_history_settles_and_follow_the_start() {
    TorqueSpeed chart = TorqueSpeed.of(REVIEW).orElseThrow();
    assertThat(chart.steps())
        .extracting(TorqueSpeed.StepCurve::label)
        .containsExactly("step 1", "step 2", "all cut out");
    Stage last = start("held-1").history().stages().get(0);
    Trace trace = last.trace();
    TorqueSpeed.Hang hang = chart.hangs().get(0);
    assertThat(hang.step()).isEqualTo(1);
    assertThat(hang.rpm()).isCloseTo(trace.speed()[trace.last()] * 30.0 / Math.PI, within(1e-9));
    assertThat(hang.torque()).isEqualTo(trace.torque()[trace.last()]);
    assertThat(chart.breakawayTorque()).isEqualTo(700.0);
    // the start begins on the first step's curve
    double[] rpm = chart.steps().get(0).curve().across();
    assertThat(rpm[0]).isZero();
    assertThat(chart.path().up()[0]).isCloseTo(chart.steps().get(0).curve().up()[0], within(1e-6));
    assertThat(chart.says()).contains("on step 1").contains("rpm");
  }

  @Test
  void should_show_the_use_that_the_responses_name_and_who_comes_closest() {
    UseOverTime chart = UseOverTime.of(REVIEW).orElseThrow();
    assertThat(chart.rows()).extracting(UseOverTime.Row::device).contains("F1", "F2", "F3", "F5");
    for (UseOverTime.Row row : chart.rows()) {
      double use =
          start("cold").device(row.device(), sliprung.protection.Edge.FAST).orElseThrow().use();
      assertThat(row.cold().orElseThrow().greatest())
          .isCloseTo(use, within(2e-3 * Math.max(1.0, use)));
      double hot =
          start("hot").device(row.device(), sliprung.protection.Edge.FAST).orElseThrow().use();
      assertThat(row.hot().orElseThrow().greatest())
          .isCloseTo(hot, within(2e-3 * Math.max(1.0, hot)));
    }
  }

  @Test
  void should_name_what_rises_after_the_last_closing() {
    var late =
        new sliprung.protection.LevelOverTime(new double[] {0, 5, 50}, new double[] {0, 0.2, 0.5});
    assertThat(UseOverTime.peaksAfter(late, 5.0)).isTrue();
    assertThat(UseOverTime.peaksAfter(late, 50.0)).isFalse();
  }

  @Test
  void should_heat_the_sections_as_far_as_the_parts_say() {
    SectionLevels chart = SectionLevels.of(REVIEW).orElseThrow();
    assertThat(chart.rows()).hasSize(2);
    assertThat(chart.missing()).isEmpty();
    for (int number = 1; number <= 2; number++) {
      double use = start("cold").part("section-" + number).orElseThrow().use();
      assertThat(chart.rows().get(0).sections().get(number - 1).level().greatest())
          .isCloseTo(use, within(1e-3));
      double hot = start("hot").part("section-" + number).orElseThrow().use();
      assertThat(chart.rows().get(1).sections().get(number - 1).level().greatest())
          .isCloseTo(hot, within(1e-3));
    }
    assertThat(chart.says()).startsWith("Hottest: section ");
  }

  @Test
  void should_never_show_sections_without_data_as_cold() {
    Review without =
        Reviewer.review(
            CrusherFacts.starter("same-limit: true", "same-limit: false"),
            LocalDate.of(2026, 12, 1));
    assertThat(SectionLevels.of(without)).isEmpty();
  }

  @Test
  void should_hold_every_margin_against_the_wanted_one_and_count_what_has_none() {
    MarginOverview chart = MarginOverview.of(CrusherReview.plain());
    assertThat(chart.groups())
        .extracting(MarginOverview.Group::question)
        .containsExactly(Question.GOOD_START, Question.FAILED_START, Question.PARTS);
    MarginOverview.Row thin = chart.groups().get(0).rows().get(0);
    assertThat(thin.subject()).isEqualTo("F3");
    assertThat(thin.share()).isCloseTo(1.07 / 1.10, within(1e-12));
    assertThat(thin.text()).isEqualTo("1.07 of 1.10");
    assertThat(thin.isShort()).isTrue();
    assertThat(chart.without()).isEqualTo(1);
    assertThat(chart.says())
        .startsWith("2 of 4 margins are too thin. Thinnest: K1")
        .endsWith("1 finding could not be judged and has no bar here.");
  }

  @Test
  void should_part_many_margins_into_pictures_without_losing_one() {
    MarginOverview chart = MarginOverview.of(CrusherReview.plain());
    List<MarginOverview> parts = chart.parts(1);
    assertThat(parts).hasSize(4);
    assertThat(parts.stream().flatMap(p -> p.groups().stream()).flatMap(g -> g.rows().stream()))
        .containsExactlyElementsOf(
            chart.groups().stream().flatMap(g -> g.rows().stream()).toList());
    assertThat(parts.get(0).says()).isEqualTo(chart.says());
    assertThat(parts.get(1).says()).isEqualTo("Margins, continued.");
    assertThat(chart.parts(100)).containsExactly(chart);
    assertThat(MarginDrawing.pictures(MarginOverview.of(REVIEW)))
        .extracting(Picture::height)
        .allSatisfy(h -> assertThat(h).isLessThan(1100));
  }

  @Test
  void should_start_a_device_line_where_the_device_picks_up() {
    FirstLimitChart chart = FirstLimitChart.of(REVIEW);
    FaultRow shorted = chart.row("rings-shorted").orElseThrow();
    assertThat(shorted.clearings())
        .filteredOn(c -> c.device().equals("F3"))
        .allSatisfy(c -> assertThat(c.pickedUpSeconds()).isZero());
    for (FaultRow row : chart.rows()) {
      for (FaultRow.Clearing clearing : row.clearings()) {
        assertThat(clearing.pickedUpSeconds()).isBetween(0.0, clearing.seconds());
      }
    }
  }

  @Test
  void should_show_the_terminal_voltage_behind_the_source() {
    StartOverTime chart = StartOverTime.of(REVIEW).orElseThrow();
    double first = start("cold").history().stages().get(0).trace().terminalVolts()[0];
    assertThat(chart.terminalVolts().nominal().values()[0]).isEqualTo(first);
    assertThat(first).isLessThan(690.0);
    assertThat(chart.ratedVolts()).isEqualTo(690.0);
  }

  @Test
  void should_never_lay_a_label_over_another() {
    FreeSpace space = new FreeSpace(new Rectangle2D.Double(0, 0, 300, 200));
    List<Rectangle2D> placed = new ArrayList<>();
    for (int i = 0; i < 12; i++) {
      Optional<Point2D> place = space.place(90, 17, List.of(new Point2D.Double(100, 100)));
      place.ifPresent(
          p -> {
            Rectangle2D box = new Rectangle2D.Double(p.getX(), p.getY(), 90, 17);
            assertThat(placed).noneMatch(box::intersects);
            placed.add(box);
          });
    }
    assertThat(placed).hasSizeGreaterThan(6);
    assertThat(space.place(400, 17, List.of(new Point2D.Double(0, 0)))).isEmpty();
  }
}
