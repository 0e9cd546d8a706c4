package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.curve.AmBounds;
import sliprung.curve.GgBounds;
import sliprung.curve.TimeCurrentEdge;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;

class FuseEdgesTest {
  private static final TimeCurrentEdge FAST = GgBounds.fast(Devices.GG_250, 1.0);
  private static final TimeCurrentEdge SLOW = GgBounds.slow(Devices.GG_250);

  @Test
  void the_fast_edge_lies_below_the_middle_and_the_slow_edge_everywhere() {
    TimeCurrentEdge middle = GgBounds.middle(Devices.GG_250);
    double before = Double.POSITIVE_INFINITY;
    for (double amps = 100; amps < 30000; amps *= 1.003) {
      assertThat(FAST.seconds(amps)).isLessThanOrEqualTo(middle.seconds(amps));
      assertThat(middle.seconds(amps)).as("%f A", amps).isLessThanOrEqualTo(SLOW.seconds(amps));
      assertThat(SLOW.seconds(amps)).isLessThanOrEqualTo(before);
      before = SLOW.seconds(amps);
    }
  }

  @Test
  void below_the_non_fusing_current_nothing_adds_up() {
    assertThat(FAST.seconds(312.5)).isInfinite();
    assertThat(FAST.seconds(312.6)).isCloseTo(10 * Math.pow(750 / 312.6, 2), within(1e-9));
    assertThat(SLOW.seconds(399)).isInfinite();
    assertThat(SLOW.seconds(401)).isEqualTo(10800);
  }

  @Test
  void a_link_warm_from_load_is_judged_at_0_85_of_the_gates_but_not_of_the_non_fusing_current() {
    TimeCurrentEdge warm = GgBounds.fast(Devices.GG_250, 0.85);
    assertThat(warm.seconds(0.85 * 750)).isCloseTo(10, within(1e-9));
    assertThat(warm.seconds(312.5)).isInfinite();
    assertThat(warm.seconds(9000)).isCloseTo(250e3 * 0.7225 / 81e6, within(1e-12));
  }

  private static DeviceResponse fast(StartHistory history, DevicePreload preload, int starts) {
    Plants plant = Plants.fan500().protectedBy(Devices.gg(Devices.GG_250));
    return plant.evaluator().devices(history, preload, starts).get(0);
  }

  @Test
  void the_share_melted_is_kept_over_the_starts_of_a_series() {
    StartHistory start =
        Histories.start().stage(4, List.of(1), 500, 600, 50).running(160, 200, 102).permitted();
    double one = fast(start, DevicePreload.COLD, 1).use();
    assertThat(one).isCloseTo(4.0 / (10 * 2.25), within(1e-9));
    assertThat(fast(start, DevicePreload.COLD, 3).use()).isCloseTo(3 * one, within(1e-9));
    assertThat(fast(start, DevicePreload.running(160, 200), 1).use())
        .isCloseTo(one / 0.7225, within(1e-9));
  }

  @Test
  void an_operation_below_the_first_gate_is_said_to_be_a_bound_only() {
    StartHistory long400 = Histories.start().stage(60, List.of(1), 400, 480, 50).held();
    DeviceResponse bound = fast(long400, DevicePreload.COLD, 1);
    assertThat(bound.operates()).isTrue();
    assertThat(bound.bound().orElseThrow()).contains("first gate");

    StartHistory short3000 = Histories.start().stage(60, List.of(1), 3000, 3600, 0).locked();
    DeviceResponse proven = fast(short3000, DevicePreload.COLD, 1);
    assertThat(proven.operates()).isTrue();
    assertThat(proven.bound()).isEmpty();
    assertThat(proven.clearsAtSeconds()).isEqualTo(proven.operatesAtSeconds());
  }

  @Test
  void a_back_up_fuse_is_never_credited_below_its_least_breaking_current() {
    TimeCurrentEdge slow = AmBounds.slow(Devices.AM, 100);
    assertThat(slow.seconds(629)).isInfinite();
    assertThat(slow.seconds(630)).isCloseTo(60, within(1e-9));
    assertThat(slow.seconds(1250)).isCloseTo(0.5, within(1e-9));
    assertThat(slow.seconds(1900)).isCloseTo(0.1, within(1e-9));
    assertThat(slow.seconds(3800)).isCloseTo(0.025, within(1e-9));
    TimeCurrentEdge fast = AmBounds.fast(Devices.AM, 100, 1.0);
    assertThat(fast.seconds(100)).isInfinite();
    assertThat(fast.seconds(400)).isCloseTo(60, within(1e-9));
    assertThat(fast.seconds(800)).isCloseTo(0.5, within(1e-9));
    for (double amps = 50; amps < 10000; amps *= 1.01) {
      assertThat(fast.seconds(amps)).isLessThanOrEqualTo(slow.seconds(amps));
    }
  }

  @Test
  void a_fuse_without_gates_is_not_judged() {
    Device.Fuse odd =
        new Device.Fuse(
            Devices.at("F1", Device.Place.STATOR, null),
            Device.FuseClass.GG,
            170,
            java.util.Optional.empty(),
            java.util.Optional.empty());
    StartHistory start = Histories.start().stage(4, List.of(1), 500, 600, 50).permitted();
    assertThat(Plants.fan500().protectedBy(odd).evaluator().devices(start, DevicePreload.COLD))
        .hasSize(3)
        .allSatisfy(d -> assertThat(d.notJudged().orElseThrow()).contains("170"));
  }
}
