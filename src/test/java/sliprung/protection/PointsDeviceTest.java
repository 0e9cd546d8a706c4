package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.curve.PointCurve.Point;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;

class PointsDeviceTest {
  private static final Device.Points DEVICE =
      Devices.points(
          100,
          List.of(new Point(130, 600), new Point(300, 30), new Point(1000, 2)),
          List.of(new Point(150, 1200), new Point(300, 60), new Point(1000, 5)));

  private static DeviceResponse over(Edge edge, StartHistory history) {
    return over(DEVICE, edge, history);
  }

  private static DeviceResponse over(Device device, Edge edge, StartHistory history) {
    return Plants.fan500()
        .protectedBy(device)
        .evaluator()
        .devices(history, DevicePreload.COLD)
        .stream()
        .filter(d -> d.edge() == edge)
        .findFirst()
        .orElseThrow();
  }

  private static StartHistory constant(double seconds, double amps) {
    return Histories.start().stage(seconds, List.of(1), amps, amps, 50).held();
  }

  @Test
  void between_its_points_it_is_straight_on_a_log_log_sheet() {
    assertThat(over(Edge.FAST, constant(100, 300)).operatesAtSeconds()).isCloseTo(30, within(1e-9));
    double middle = Math.sqrt(300 * 1000.0);
    assertThat(over(Edge.SLOW, constant(100, middle)).operatesAtSeconds())
        .isCloseTo(Math.sqrt(60 * 5.0), within(1e-9));
  }

  @Test
  void at_its_rating_it_never_operates() {
    for (Edge edge : Edge.values()) {
      DeviceResponse response = over(edge, constant(1800, 100));
      assertThat(response.notJudged()).isEmpty();
      assertThat(response.use()).isZero();
    }
  }

  @Test
  void between_rating_and_first_point_a_short_time_is_judged_and_a_long_one_is_not() {
    DeviceResponse brief = over(Edge.FAST, constant(60, 120));
    assertThat(brief.notJudged()).isEmpty();
    assertThat(brief.use()).isCloseTo(0.1, within(1e-9));
    for (Edge edge : List.of(Edge.FAST, Edge.SLOW)) {
      assertThat(over(edge, constant(1800, 120)).notJudged().orElseThrow())
          .startsWith("outside the curve's points");
    }
  }

  @Test
  void above_the_last_point_it_is_not_judged_unless_it_had_operated_before() {
    for (Edge edge : Edge.values()) {
      assertThat(over(edge, constant(1, 1200)).notJudged().orElseThrow())
          .startsWith("outside the curve's points");
    }
    StartHistory late =
        Histories.start()
            .stage(100, List.of(1), 300, 300, 50)
            .stage(1, List.of(), 1200, 1200, 50)
            .held();
    assertThat(over(Edge.SLOW, late).operatesAtSeconds()).isCloseTo(60, within(1e-9));
  }

  @Test
  void a_curve_that_begins_vertically_says_that_it_never_operates_below() {
    List<Point> edge = List.of(new Point(130, 7200), new Point(130, 600), new Point(1000, 2));
    Device.Points vertical = Devices.points(100, edge, edge);
    for (Edge e : List.of(Edge.FAST, Edge.SLOW)) {
      DeviceResponse response = over(vertical, e, constant(1800, 129));
      assertThat(response.notJudged()).isEmpty();
      assertThat(response.operates()).isFalse();
    }
    assertThat(over(vertical, Edge.SLOW, constant(1800, 130)).operatesAtSeconds())
        .isCloseTo(600, within(1e-6));
  }
}
