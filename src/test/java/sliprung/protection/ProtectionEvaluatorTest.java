package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;
import sliprung.starter.Device.Measurement;
import sliprung.starter.Device.Place;

class ProtectionEvaluatorTest {
  /** Two thirds of synchronous speed of the fan: slip 1/3, 16.7 Hz in the rotor. */
  private static final double TURNING = 70.0;

  /** Near synchronous speed: 1 Hz in the rotor. */
  private static final double FAST = 102.6;

  private static DeviceResponse over(
      Device device, Edge edge, StartHistory history, DevicePreload preload, int starts) {
    return Plants.fan500()
        .protectedBy(device)
        .evaluator()
        .devices(history, preload, starts)
        .stream()
        .filter(d -> d.edge() == edge)
        .findFirst()
        .orElseThrow();
  }

  private static DeviceResponse over(Device device, Edge edge, StartHistory history) {
    return over(device, edge, history, DevicePreload.COLD, 1);
  }

  private static Device.DefiniteTime definite(Place place, Measurement by, String trips) {
    return new Device.DefiniteTime(
        new Device.Fitting("D1", place, Optional.ofNullable(trips), by),
        100,
        10,
        Devices.CUSTOMARY,
        OptionalDouble.empty());
  }

  @Test
  void every_device_answers_at_every_edge_in_the_files_order() {
    List<DeviceResponse> all =
        Plants.fan500()
            .evaluator()
            .devices(
                Histories.start().stage(5, List.of(1), 300, 400, 10).permitted(),
                DevicePreload.COLD);
    assertThat(all).extracting(DeviceResponse::device).startsWith("OL1", "OL1", "OL1", "OL2");
    assertThat(all).hasSize(12);
  }

  @Test
  void a_definite_time_relay_operates_just_above_its_edge_pick_up_and_not_just_below() {
    Device relay = definite(Place.STATOR, Measurement.DIRECT, "K1");
    for (Edge edge : Edge.values()) {
      double sign = edge == Edge.FAST ? -1 : edge == Edge.SLOW ? 1 : 0;
      double pickUp = 100 * (1 + 0.05 * sign);
      assertThat(over(relay, edge, held(pickUp - 0.1, 0, TURNING)).operates()).isFalse();
      DeviceResponse above = over(relay, edge, held(pickUp + 0.1, 0, TURNING));
      assertThat(above.operatesAtSeconds()).isCloseTo(10 * (1 + 0.05 * sign), within(1e-9));
      assertThat(above.clearsAtSeconds() - above.operatesAtSeconds())
          .as("opening time of K1")
          .isCloseTo(0.06, within(1e-9));
    }
  }

  private static StartHistory held(double statorAmps, double ringAmps, double speed) {
    return Histories.start().stage(1800, List.of(1), statorAmps, ringAmps, speed).held();
  }

  @Test
  void a_device_that_trips_nothing_clears_nothing() {
    DeviceResponse alarm =
        over(definite(Place.STATOR, Measurement.DIRECT, null), Edge.SLOW, held(200, 0, TURNING));
    assertThat(alarm.operates()).isTrue();
    assertThat(alarm.clearsAtSeconds()).isInfinite();
    DeviceResponse unknown =
        over(definite(Place.STATOR, Measurement.DIRECT, "K99"), Edge.SLOW, held(200, 0, TURNING));
    assertThat(unknown.clearsAtSeconds()).isInfinite();
  }

  @Test
  void a_device_sees_the_current_where_it_sits() {
    StartHistory history =
        Histories.start()
            .stage(8, List.of(1), 50, 300, TURNING)
            .stage(1800, List.of(), 50, 300, TURNING)
            .held();
    assertThat(over(definite(Place.STATOR, Measurement.DIRECT, "K1"), Edge.MIDDLE, history).use())
        .isZero();
    assertThat(
            over(definite(Place.ROTOR, Measurement.DIRECT, "K1"), Edge.MIDDLE, history).operates())
        .isTrue();
    DeviceResponse bank =
        over(definite(Place.BANK, Measurement.DIRECT, "K1"), Edge.MIDDLE, history);
    assertThat(bank.operates()).isFalse();
    assertThat(bank.use()).isCloseTo(0.8, within(1e-9));
  }

  @Test
  void a_transformer_on_the_rotor_is_blind_below_five_hertz_but_for_the_fast_edge() {
    StartHistory slow = held(50, 300, FAST);
    Device byTransformer = definite(Place.ROTOR, Measurement.CT, "K1");
    assertThat(over(byTransformer, Edge.SLOW, slow).operates()).isFalse();
    assertThat(over(byTransformer, Edge.MIDDLE, slow).operates()).isFalse();
    assertThat(over(byTransformer, Edge.FAST, slow).operates()).isTrue();
    assertThat(over(byTransformer, Edge.SLOW, held(50, 300, TURNING)).operates()).isTrue();
    assertThat(
            over(definite(Place.ROTOR, Measurement.DC_CAPABLE, "K1"), Edge.SLOW, slow).operates())
        .isTrue();
    assertThat(
            over(definite(Place.STATOR, Measurement.CT, "K1"), Edge.SLOW, held(300, 0, FAST))
                .operates())
        .as("the stator has its 50 Hz")
        .isTrue();
  }

  @Test
  void an_instantaneous_element_overreaches_at_its_fast_edge() {
    Device.Instantaneous element =
        new Device.Instantaneous(
            Devices.at("I", Place.STATOR, "Q1"),
            1000,
            Device.Measures.PEAK,
            0.1,
            Devices.CUSTOMARY,
            OptionalDouble.empty());
    double least = 1000 * 0.95 / 1.1;
    assertThat(over(element, Edge.FAST, held(least - 0.1, 0, 0)).operates()).isFalse();
    assertThat(over(element, Edge.FAST, held(least + 0.1, 0, 0)).operatesAtSeconds()).isZero();
    assertThat(over(element, Edge.SLOW, held(1049, 0, 0)).operates()).isFalse();
    assertThat(over(element, Edge.SLOW, held(1051, 0, 0)).operates()).isTrue();
    assertThat(over(element, Edge.MIDDLE, held(500, 0, 0)).use()).isCloseTo(0.5, within(1e-12));
  }

  @Test
  void an_inverse_time_relay_moves_its_pick_up_by_accuracy_and_transformer() {
    Device relay = Devices.inverse(Devices.VERY_INVERSE, 100, 0.5);
    double fast = 100 * 0.95 * 0.97;
    double slow = 100 * 1.05 * 1.03;
    assertThat(over(relay, Edge.FAST, held(fast - 0.1, 0, 0)).use()).isZero();
    assertThat(over(relay, Edge.FAST, held(fast * 2, 0, 0)).operatesAtSeconds())
        .isCloseTo(13.5 * 0.5 * 0.925, within(1e-9));
    assertThat(over(relay, Edge.SLOW, held(slow - 0.1, 0, 0)).use()).isZero();
    assertThat(over(relay, Edge.SLOW, held(slow * 2, 0, 0)).operatesAtSeconds())
        .isCloseTo(13.5 * 0.5 * 1.075, within(1e-9));
  }

  @Test
  void unknown_reset_holds_at_the_fast_edge_and_forgets_at_the_slow_one() {
    Device relay = Devices.inverse(Devices.EXTREMELY_INVERSE, 100, 1);
    StartHistory pulses =
        Histories.start()
            .stage(4, List.of(1), 300, 0, TURNING)
            .stage(4, List.of(1), 50, 0, TURNING)
            .stage(4, List.of(1), 300, 0, TURNING)
            .held();
    Device.InverseTime exact =
        new Device.InverseTime(
            relay.fitting(),
            Devices.EXTREMELY_INVERSE,
            100,
            1,
            Optional.empty(),
            Devices.EXACT,
            Device.Reset.HELD,
            OptionalDouble.empty());
    assertThat(over(exact, Edge.MIDDLE, pulses).use()).isCloseTo(0.8, within(1e-9));
    double atFast = over(relay, Edge.FAST, pulses).use();
    double atSlow = over(relay, Edge.SLOW, pulses).use();
    assertThat(atFast).isGreaterThan(0.8);
    assertThat(atSlow).isLessThan(0.4);
  }

  @Test
  void no_relay_trips_while_its_block_is_exceeded() {
    Device.DefiniteTime blocked =
        new Device.DefiniteTime(
            Devices.at("D1", Place.STATOR, "K1"), 100, 10, Devices.EXACT, OptionalDouble.of(800));
    assertThat(over(blocked, Edge.FAST, held(900, 0, 0)).operates()).isFalse();
    assertThat(over(blocked, Edge.FAST, held(900, 0, 0)).use()).isLessThan(1.0);
    assertThat(over(blocked, Edge.SLOW, held(700, 0, 0)).operates()).isTrue();
  }

  @Test
  void a_sequence_timer_waits_for_its_stop_event_and_no_longer() {
    Device timer = Devices.sequence(10);
    StartHistory held = held(100, 100, TURNING);
    assertThat(over(timer, Edge.FAST, held).operatesAtSeconds()).isCloseTo(9.5, within(1e-12));
    assertThat(over(timer, Edge.SLOW, held).operatesAtSeconds()).isCloseTo(10.5, within(1e-12));
    assertThat(over(timer, Edge.SLOW, held).clearsAtSeconds()).isCloseTo(10.56, within(1e-12));

    StartHistory start =
        Histories.start()
            .stage(6, List.of(1), 300, 400, 30)
            .stage(3, List.of(), 300, 400, 90)
            .running(160, 200, FAST)
            .permitted();
    DeviceResponse fast = over(timer, Edge.FAST, start);
    assertThat(fast.operates()).isFalse();
    assertThat(fast.use()).isCloseTo(6 / 9.5, within(1e-12));
    assertThat(fast.currentMargin()).hasValue(Double.POSITIVE_INFINITY);
    assertThat(fast.stretchMargin().getAsDouble()).isCloseTo(9.5 / 6, within(1e-12));
  }

  @Test
  void a_sequence_timer_may_stop_at_a_speed() {
    Device.SequenceTimer timer =
        new Device.SequenceTimer(Devices.at("SEQ", Place.STATOR, "K1"), 10, OptionalDouble.of(0.8));
    StartHistory start =
        Histories.start()
            .stage(4, List.of(1), 300, 400, 30)
            .stage(3, List.of(), 300, 400, 90)
            .running(160, 200, FAST)
            .permitted();
    assertThat(over(timer, Edge.MIDDLE, start).use()).isCloseTo(0.4, within(1e-9));
    StartHistory never = held(100, 100, 83.7);
    assertThat(over(timer, Edge.MIDDLE, never).operatesAtSeconds()).isEqualTo(10);
  }

  @Test
  void a_rotation_sensor_times_the_standing_rotor_only() {
    Device.Standstill sensor = new Device.Standstill(Devices.at("N0", Place.STATOR, "K1"), 4);
    StartHistory locked = Histories.start().stage(60, List.of(1), 300, 400, 0).locked();
    assertThat(over(sensor, Edge.SLOW, locked).operatesAtSeconds()).isCloseTo(4.2, within(1e-9));
    StartHistory start =
        Histories.start()
            .stage(3, List.of(1), 300, 400, 0)
            .stage(30, List.of(), 300, 400, 60)
            .permitted();
    DeviceResponse fast = over(sensor, Edge.FAST, start);
    assertThat(fast.operates()).isFalse();
    assertThat(fast.use()).isCloseTo(3 / 3.8, within(1e-9));
    StartHistory creeping = Histories.start().stage(60, List.of(1), 300, 400, 0.5).held();
    assertThat(over(sensor, Edge.SLOW, creeping).operates()).isFalse();
    assertThat(over(sensor, Edge.FAST, creeping).operates()).isTrue();
  }

  @Test
  void a_relay_forgets_its_preload_unless_its_memory_is_kept() {
    Device.Overload lost = Devices.overload("F2", Devices.CLASS_10, 185);
    Device.Overload kept =
        new Device.Overload(
            lost.fitting(), Devices.CLASS_10, 185, Device.DialMeans.FULL_LOAD, true, true);
    StartHistory history = held(1000, 1200, 0);
    DevicePreload remembered = DevicePreload.remembered(160, 200);
    double cold = over(lost, Edge.SLOW, history).operatesAtSeconds();
    assertThat(over(lost, Edge.SLOW, history, remembered, 1).operatesAtSeconds()).isEqualTo(cold);
    double warm = over(kept, Edge.SLOW, history, remembered, 1).operatesAtSeconds();
    assertThat(warm).isLessThan(cold);
    assertThat(over(lost, Edge.SLOW, history, DevicePreload.running(160, 200), 1))
        .extracting(DeviceResponse::operatesAtSeconds)
        .isEqualTo(warm);
  }

  @Test
  void each_start_of_a_series_begins_where_the_one_before_ended() {
    Device relay = Devices.overload("F2", Devices.CLASS_10, 185);
    StartHistory start =
        Histories.start().stage(10, List.of(1), 400, 500, 30).running(100, 120, FAST).permitted();
    StartHistory twice =
        Histories.start()
            .stage(10, List.of(1), 400, 500, 30)
            .stage(10, List.of(1), 400, 500, 30)
            .running(100, 120, FAST)
            .permitted();
    assertThat(over(relay, Edge.FAST, start, DevicePreload.COLD, 2).use())
        .isCloseTo(over(relay, Edge.FAST, twice).use(), within(1e-9));
  }

  @Test
  void use_at_run_up_leaves_out_what_running_adds() {
    Device relay = Devices.overload("F2", Devices.CLASS_10, 185);
    StartHistory start =
        Histories.start().stage(5, List.of(1), 300, 400, 30).running(180, 220, FAST).permitted();
    DeviceResponse fast = over(relay, Edge.FAST, start);
    assertThat(fast.use()).isGreaterThan(0.8);
    assertThat(fast.useAtRunUp()).isLessThan(0.2);
    StartHistory fault = held(150, 220, FAST);
    assertThat(over(relay, Edge.FAST, fault).useAtRunUp())
        .isEqualTo(over(relay, Edge.FAST, fault).use());
  }
}
