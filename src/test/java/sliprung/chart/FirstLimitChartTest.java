package sliprung.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.review.Crusher;
import sliprung.review.CrusherReview;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.starter.Starter;

class FirstLimitChartTest {
  private static final Review REVIEW = CrusherReview.plain();

  @Test
  void should_have_one_row_for_each_kind_of_fault_and_step() {
    assertThat(FirstLimitChart.of(REVIEW).rows())
        .extracting(r -> r.start().scenario().kind() + "-" + r.start().scenario().step())
        .containsExactlyInAnyOrder(
            "HELD-1",
            "HELD-2",
            "HELD-3",
            "HELD-4",
            "HELD-5",
            "LOCKED-0",
            "LOCKED_STEP-1",
            "RINGS_SHORTED-0");
  }

  @Test
  void should_show_the_state_and_corner_with_the_smallest_clearing_ratio() {
    FaultRow row =
        chart(fault("F5", 20.0, "section-1", 100.0), hard("F5", 50.0, "section-1", 100.0))
            .rows()
            .get(0);
    assertThat(row.start().corner()).isEqualTo(CrusherReview.HARD);
    assertThat(row.ratio()).isEqualTo(2.0);
    assertThat(row.circumstances()).isEqualTo("from cold, 90 % V, heavy, low bank, late");
  }

  @Test
  void should_say_that_nothing_clears_where_a_limit_comes_and_no_device_opens() {
    FirstLimitChart chart = chart(fault("F5", never(), "section-2", 109.0));
    FaultRow row = chart.rows().get(0);
    assertThat(row.state()).isEqualTo(FaultRow.State.NOT_CLEARED);
    assertThat(row.finding()).isEqualTo("nothing clears it");
    assertThat(row.times()).isEqualTo("no device opens, section 2 109\u00a0s");
    assertThat(chart.says())
        .startsWith("1 of 1 faults takes a part past its limit before anything clears.")
        .contains("section 2 reaches its limit at 109\u00a0s");
  }

  @Test
  void should_tell_late_barely_and_in_time_apart() {
    assertThat(state(20.0, 10.0)).isEqualTo(FaultRow.State.LATE);
    assertThat(state(10.0, 12.0)).isEqualTo(FaultRow.State.THIN);
    assertThat(state(10.0, 13.0)).isEqualTo(FaultRow.State.IN_TIME);
    assertThat(state(10.0, never())).isEqualTo(FaultRow.State.NO_LIMIT);
  }

  @Test
  void should_not_judge_a_fault_whose_sections_have_no_limits() {
    ComputedStart start =
        with(
            REVIEW.start("held-2").orElseThrow(),
            List.of(),
            List.of(PartResponse.missing("section-1", "resistors.sections")));
    FirstLimitChart chart = chart(start);
    assertThat(chart.rows().get(0).state()).isEqualTo(FaultRow.State.UNKNOWN);
    assertThat(chart.rows().get(0).finding()).isEqualTo("not judged");
    assertThat(chart.says()).isEqualTo("No fault could be judged.");
    assertThat(chart.withoutData()).containsExactly("section 1");
  }

  @Test
  void should_put_what_is_lost_first() {
    ComputedStart locked = REVIEW.start("locked").orElseThrow();
    FirstLimitChart chart =
        chart(
            fault("F5", 10.0, "section-1", 100.0),
            with(locked, List.of(), List.of(part("rotor", 14.0))));
    assertThat(chart.rows())
        .extracting(FaultRow::state)
        .containsExactly(FaultRow.State.NOT_CLEARED, FaultRow.State.IN_TIME);
    assertThat(chart.row("locked")).isPresent();
    assertThat(chart.row("held-2")).isPresent();
  }

  @Test
  void should_never_credit_a_contactor_beyond_what_it_is_proven_to_break() {
    ComputedStart base = REVIEW.start("held-2").orElseThrow();
    ComputedStart start = with(base, List.of(slow("F5", 10.0)), List.of(part("section-1", 100.0)));
    Starter unrated = Crusher.withoutLineRatings("JC-1");
    Review review =
        new Review(
            unrated,
            REVIEW.date(),
            REVIEW.machine(),
            REVIEW.identification(),
            List.of(start),
            List.of(),
            List.of(),
            List.of(),
            List.of());
    FaultRow row = FirstLimitChart.of(review).rows().get(0);
    assertThat(row.clearings()).isEmpty();
    assertThat(row.state()).isEqualTo(FaultRow.State.UNKNOWN);
    assertThat(row.times()).isEqualTo("F5: breaking not proven");
  }

  private static FaultRow.State state(double clears, double limit) {
    return chart(fault("F5", clears, "section-1", limit)).rows().get(0).state();
  }

  private static FirstLimitChart chart(ComputedStart... starts) {
    return FirstLimitChart.of(
        new Review(
            REVIEW.starter(),
            REVIEW.date(),
            REVIEW.machine(),
            REVIEW.identification(),
            List.of(starts),
            List.of(),
            List.of(),
            List.of(),
            List.of()));
  }

  private static ComputedStart fault(String device, double clears, String part, double limit) {
    return with(
        REVIEW.start("held-2").orElseThrow(),
        List.of(slow(device, clears)),
        List.of(part(part, limit)));
  }

  private static ComputedStart hard(String device, double clears, String part, double limit) {
    ComputedStart base =
        REVIEW.starts().stream()
            .filter(s -> s.corner().equals(CrusherReview.HARD))
            .filter(s -> s.scenario().id().equals("held-2"))
            .findFirst()
            .orElseThrow();
    return with(base, List.of(slow(device, clears)), List.of(part(part, limit)));
  }

  private static ComputedStart with(
      ComputedStart start, List<DeviceResponse> devices, List<PartResponse> parts) {
    return new ComputedStart(
        start.scenario(), start.from(), 1, start.corner(), start.history(), devices, parts);
  }

  private static DeviceResponse slow(String device, double clears) {
    return new DeviceResponse(
        device,
        Edge.SLOW,
        2,
        2,
        clears,
        clears,
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  private static PartResponse part(String part, double limit) {
    return new PartResponse(part, 2, limit, OptionalDouble.empty(), Optional.empty());
  }

  private static double never() {
    return Double.POSITIVE_INFINITY;
  }

  @Test
  void should_say_that_a_part_was_past_its_limit_before_the_fault() {
    FirstLimitChart chart = chart(fault("F5", 10.0, "stator", 0.0));
    assertThat(chart.rows().get(0).state()).isEqualTo(FaultRow.State.LATE);
    assertThat(chart.rows().get(0).times()).endsWith("stator winding before it");
    assertThat(chart.says()).contains("is past its limit before the fault begins");
    assertThat(chart.fromSeconds()).isEqualTo(1.0);
  }

  @Test
  void should_speak_of_slip_rings_in_the_plural() {
    assertThat(chart(fault("F5", 10.0, "rings", 12.0)).says())
        .contains("slip rings reach their limit at 12\u00a0s");
  }

  @Test
  void should_call_the_nominal_corner_nominal() {
    ComputedStart start = REVIEW.start("held-2").orElseThrow();
    assertThat(chart(start).rows().get(0).circumstances()).isEqualTo("from cold, nominal");
  }
}
