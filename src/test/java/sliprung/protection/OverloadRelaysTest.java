package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import sliprung.curve.TripClass;
import sliprung.starter.Device;

class OverloadRelaysTest {
  private static final double TWO_HOURS = 7200;

  private static OverloadRelays relays(TripClass tripClass, double panelCelsius) {
    return new OverloadRelays(Devices.overload("F2", tripClass, 100), panelCelsius);
  }

  private static double trips(Meter meter, double seconds, double amps) {
    return meter.advance(Piece.constant(seconds, amps));
  }

  @Test
  void at_1_05_no_relay_of_a_class_trips_in_two_hours_and_at_1_20_the_slowest_does() {
    for (TripClass tripClass : List.of(Devices.CLASS_10, Devices.CLASS_20)) {
      OverloadRelays relays = relays(tripClass, 20);
      assertThat(trips(relays.fast().apply(0), TWO_HOURS, 105)).isInfinite();
      assertThat(trips(relays.fast().apply(0), TWO_HOURS, 106)).isLessThan(TWO_HOURS);
      assertThat(trips(relays.slow().apply(0), TWO_HOURS, 120.1)).isLessThan(TWO_HOURS);
      assertThat(trips(relays.slow().apply(0), 1e9, 119.9)).isInfinite();
    }
  }

  @Test
  void the_slowest_relay_passes_the_warm_limit_at_one_and_a_half_times() {
    assertThat(trips(relays(Devices.CLASS_10, 20).slow().apply(100), 1e4, 150))
        .isCloseTo(240, within(1e-6));
    assertThat(trips(relays(Devices.CLASS_30, 20).slow().apply(100), 1e4, 150))
        .isCloseTo(720, within(1e-6));
  }

  @Test
  void the_earliest_is_never_later_than_any_of_the_three_relays() {
    double t7 = 6.0;
    Meter fast = relays(Devices.CLASS_20, 20).fast().apply(0);
    double plain = 7.2 * 7.2 * t7 / 4.0;
    assertThat(trips(fast, 1e4, 200)).isLessThan(plain);
    assertThat(trips(relays(Devices.CLASS_20, 20).fast().apply(0), 1e4, 110))
        .isCloseTo(7.2 * 7.2 * t7 / 1.21, within(1e-6));
  }

  @Test
  void fast_middle_and_slow_keep_their_order_on_any_current() {
    Random random = new Random(7);
    for (int n = 0; n < 200; n++) {
      TripClass tripClass =
          List.of(Devices.CLASS_10, Devices.CLASS_20, Devices.CLASS_30).get(n % 3);
      OverloadRelays relays = relays(tripClass, 20);
      double before = n % 2 == 0 ? 0 : 90 * random.nextDouble();
      Meter fast = relays.fast().apply(before);
      Meter middle = relays.middle().apply(before);
      Meter slow = relays.slow().apply(before);
      for (int k = 0; k < 12; k++) {
        Piece piece = Piece.constant(3 * random.nextDouble(), 100 + 500 * random.nextDouble());
        fast.advance(piece);
        middle.advance(piece);
        slow.advance(piece);
        assertThat(fast.level()).isGreaterThanOrEqualTo(middle.level());
        assertThat(middle.level()).isGreaterThanOrEqualTo(slow.level());
      }
    }
  }

  @Test
  void a_warm_panel_lowers_and_a_cold_one_raises_the_ultimate_trip() {
    assertThat(relays(Devices.CLASS_10, 40).leastPickUpAmps()).isEqualTo(100);
    assertThat(relays(Devices.CLASS_10, 20).leastPickUpAmps()).isEqualTo(105);
    // nothing is promised between the points of the table: each edge on its safe side
    assertThat(relays(Devices.CLASS_10, 21).leastPickUpAmps()).isEqualTo(100);
    assertThat(relays(Devices.CLASS_10, 19).greatestPickUpAmps()).isEqualTo(130);
    assertThat(relays(Devices.CLASS_10, 39).greatestPickUpAmps()).isEqualTo(120);
    assertThat(relays(Devices.CLASS_10, -5).greatestPickUpAmps()).isEqualTo(130);
    assertThat(relays(Devices.CLASS_10, 20).greatestPickUpAmps()).isEqualTo(120);
  }

  @Test
  void without_compensation_the_band_widens_with_the_distance_from_forty_degrees() {
    Device.Overload plain =
        new Device.Overload(
            Devices.at("F2", Device.Place.STATOR, "K1"),
            Devices.CLASS_10,
            100,
            Device.DialMeans.FULL_LOAD,
            false,
            false);
    OverloadRelays at40 = new OverloadRelays(plain, 40);
    OverloadRelays at0 = new OverloadRelays(plain, 0);
    OverloadRelays at55 = new OverloadRelays(plain, 55);
    assertThat(at40.leastPickUpAmps()).isCloseTo(100, within(1e-9));
    assertThat(at40.greatestPickUpAmps()).isCloseTo(120, within(1e-9));
    assertThat(at0.greatestPickUpAmps()).isCloseTo(120 * Math.sqrt(100.0 / 60), within(1e-9));
    assertThat(at0.leastPickUpAmps()).isEqualTo(100);
    assertThat(at55.leastPickUpAmps()).isCloseTo(100 * Math.sqrt(45.0 / 60), within(1e-9));
  }

  @Test
  void a_dial_that_means_the_ultimate_trip_is_met_by_the_middle_relay() {
    Device.Overload ultimate =
        new Device.Overload(
            Devices.at("F2", Device.Place.STATOR, "K1"),
            Devices.CLASS_10,
            112.5,
            Device.DialMeans.ULTIMATE_TRIP,
            false,
            true);
    OverloadRelays relays = new OverloadRelays(ultimate, 20);
    assertThat(trips(relays.middle().apply(0), 1e9, 112.4)).isInfinite();
    assertThat(trips(relays.middle().apply(0), 1e9, 112.6)).isFinite();
    assertThat(relays.leastPickUpAmps()).isCloseTo(105, within(1e-9));
    assertThat(relays.greatestPickUpAmps()).isCloseTo(120, within(1e-9));
  }

  @Test
  void a_nema_class_is_judged_at_its_slow_edge_only_and_at_six_times() {
    EdgeModels fast = new EdgeModels(Edge.FAST, Plants.fan500().starter());
    assertThat(fast.overload(Devices.overload("F2", Devices.NEMA_20, 100)).unknown()).isPresent();
    Meter slow = relays(Devices.NEMA_20, 20).slow().apply(0);
    assertThat(trips(slow, 1e4, 600)).isCloseTo(20, within(1e-6));
  }

  @Test
  void classes_without_a_shortest_time_have_no_fast_edge() {
    for (Edge edge : List.of(Edge.FAST, Edge.MIDDLE)) {
      EdgeModel model =
          new EdgeModels(edge, Plants.fan500().starter())
              .overload(Devices.overload("F2", Devices.CLASS_2, 100));
      assertThat(model.unknown().orElseThrow()).contains("class 2");
    }
    assertThat(
            new EdgeModels(Edge.SLOW, Plants.fan500().starter())
                .overload(Devices.overload("F2", Devices.CLASS_2, 100))
                .unknown())
        .isEmpty();
  }
}
