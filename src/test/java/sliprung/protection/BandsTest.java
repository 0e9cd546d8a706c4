package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.starter.Device;

class BandsTest {
  private final Device overload = Devices.overload("F2", Devices.CLASS_10, 185);
  private final Device fuse = Devices.gg(Devices.GG_250);
  private final Bands bands = new Bands(Plants.fan500().starter());

  @Test
  void the_edges_keep_their_order_at_every_current() {
    for (Device device :
        List.of(overload, fuse, Devices.inverse(Devices.EXTREMELY_INVERSE, 240, 0.4))) {
      for (double amps = 200; amps < 20000; amps *= 1.07) {
        double fast = bands.operatingSeconds(device, Edge.FAST, amps).orElseThrow();
        double middle = bands.operatingSeconds(device, Edge.MIDDLE, amps).orElseThrow();
        double slow = bands.operatingSeconds(device, Edge.SLOW, amps).orElseThrow();
        assertThat(fast).as("%s %f A", device.tag(), amps).isLessThanOrEqualTo(middle);
        assertThat(middle).isLessThanOrEqualTo(slow);
      }
    }
  }

  @Test
  void the_slow_edge_of_an_overload_falls_with_rising_current() {
    double before = Double.POSITIVE_INFINITY;
    for (Bands.Point point : bands.points(overload, Edge.SLOW, 200, 5000)) {
      assertThat(point.seconds()).isLessThan(before);
      before = point.seconds();
    }
    assertThat(before).isLessThan(1);
  }

  @Test
  void a_pick_up_is_the_least_current_that_ever_operates() {
    // 1.05 is promised at 20 °C alone; this panel is at 25 °C
    assertThat(bands.pickUpAmps(overload, Edge.FAST).getAsDouble()).isCloseTo(185, within(1e-3));
    assertThat(bands.pickUpAmps(overload, Edge.SLOW).getAsDouble())
        .isCloseTo(1.20 * 185, within(1e-3));
    assertThat(bands.pickUpAmps(fuse, Edge.FAST).getAsDouble()).isCloseTo(312.5, within(1e-3));
    assertThat(bands.pickUpAmps(fuse, Edge.SLOW).getAsDouble()).isCloseTo(400, within(1e-3));
    assertThat(bands.pickUpAmps(Devices.sequence(10), Edge.FAST)).isEmpty();
  }

  @Test
  void the_greatest_current_at_which_one_device_wins_is_the_last_crossing() {
    double limit =
        bands.greatestFasterAmps(overload, Edge.FAST, fuse, Edge.SLOW, 200, 20000).getAsDouble();
    double device = bands.operatingSeconds(overload, Edge.FAST, limit).orElseThrow();
    double other = bands.operatingSeconds(fuse, Edge.SLOW, limit).orElseThrow();
    assertThat(device).isCloseTo(other, within(1e-5 * other));
    for (double amps = 1.001 * limit; amps < 20000; amps *= 1.01) {
      assertThat(bands.operatingSeconds(overload, Edge.FAST, amps).orElseThrow())
          .isGreaterThan(bands.operatingSeconds(fuse, Edge.SLOW, amps).orElseThrow());
    }
  }

  @Test
  void a_device_that_always_wins_wins_up_to_the_end_of_the_range() {
    Device instant =
        new Device.Instantaneous(
            Devices.at("I", Device.Place.STATOR, "Q1"),
            500,
            Device.Measures.RMS,
            0,
            Devices.EXACT,
            java.util.OptionalDouble.empty());
    assertThat(bands.greatestFasterAmps(instant, Edge.FAST, fuse, Edge.SLOW, 200, 20000))
        .hasValue(20000);
    assertThat(bands.greatestFasterAmps(instant, Edge.FAST, fuse, Edge.SLOW, 100, 400)).isEmpty();
  }

  @Test
  void what_measures_rest_or_time_has_no_level_in_amperes() {
    Device.Fitting fitting = Devices.at("F6", Device.Place.STATOR, "K1");
    Device sensor = new Device.Standstill(fitting, 2.0);
    Device timer = new Device.SequenceTimer(fitting, 9.0, java.util.OptionalDouble.empty());
    for (Edge edge : Edge.values()) {
      assertThat(bands.pickUpAmps(sensor, edge)).isEmpty();
      assertThat(bands.pickUpAmps(timer, edge)).isEmpty();
    }
  }
}
