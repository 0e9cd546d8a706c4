package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;

class MarginsTest {

  private static StartHistory start(double onCurrent, double onTime) {
    return Histories.start()
        .stage(6 * onTime, List.of(1), 380 * onCurrent, 500 * onCurrent, 30)
        .stage(4 * onTime, List.of(), 300 * onCurrent, 390 * onCurrent, 80)
        .running(160, 200, 102.6)
        .permitted();
  }

  private static DeviceResponse fast(
      Device device, StartHistory history, DevicePreload preload, int starts) {
    return Plants.fan500().protectedBy(device).evaluator().devices(history, preload, starts).get(0);
  }

  private static final List<Device> DEVICES =
      List.of(
          Devices.overload("F2", Devices.CLASS_10, 185),
          Devices.overload("F2", Devices.CLASS_30, 185),
          Devices.inverse(Devices.VERY_INVERSE, 240, 0.8),
          Devices.inverse(Devices.STANDARD_INVERSE, 240, 1.5),
          Devices.gg(Devices.GG_250));

  @Test
  void a_start_of_that_factor_is_just_at_the_point_of_operation() {
    for (Device device : DEVICES) {
      for (DevicePreload preload : List.of(DevicePreload.COLD, DevicePreload.running(160, 200))) {
        for (int starts = 1; starts <= 2; starts++) {
          DeviceResponse as = fast(device, start(1, 1), preload, starts);
          double current = as.currentMargin().getAsDouble();
          assertThat(current).as(device.toString()).isBetween(0.5, 20.0);
          assertThat(fast(device, start(0.999 * current, 1), preload, starts).operates()).isFalse();
          assertThat(fast(device, start(1.001 * current, 1), preload, starts).operates()).isTrue();
          double stretch = as.stretchMargin().getAsDouble();
          if (stretch < 100) {
            assertThat(fast(device, start(1, 0.998 * stretch), preload, starts).operates())
                .isFalse();
            assertThat(fast(device, start(1, 1.002 * stretch), preload, starts).operates())
                .isTrue();
          }
        }
      }
    }
  }

  @Test
  void a_start_that_operates_a_device_has_a_margin_below_one() {
    Device device = Devices.inverse(Devices.VERY_INVERSE, 240, 0.1);
    DeviceResponse as = fast(device, start(1, 1), DevicePreload.COLD, 1);
    assertThat(as.operates()).isTrue();
    double margin = as.currentMargin().getAsDouble();
    assertThat(margin).isLessThan(1.0).isGreaterThan(0.5);
    assertThat(fast(device, start(0.999 * margin, 1), DevicePreload.COLD, 1).operates()).isFalse();
  }

  @Test
  void one_body_alone_has_its_margin_in_closed_form() {
    Device.Thermal relay =
        new Device.Thermal(
            Devices.at("49", Device.Place.STATOR, "K1"), 200, 1.0, 600, Devices.EXACT, false);
    StartHistory constant = Histories.start().stage(20, List.of(1), 400, 500, 30).permitted();
    double share = 1 - Math.exp(-20.0 / 600);
    assertThat(fast(relay, constant, DevicePreload.COLD, 1).currentMargin().getAsDouble())
        .isCloseTo(Math.sqrt(1 / (4 * share)), within(2e-5));
    assertThat(fast(relay, constant, DevicePreload.COLD, 1).stretchMargin().getAsDouble())
        .isCloseTo(600 * Math.log(4.0 / 3.0) / 20, within(2e-4));
    double preload = 0.81 * Math.exp(-20.0 / 600);
    assertThat(
            fast(relay, constant, DevicePreload.running(180, 200), 1).currentMargin().getAsDouble())
        .as("the preload is not multiplied")
        .isCloseTo(Math.sqrt((1 - preload) / (4 * share)), within(2e-5));
  }

  @Test
  void a_device_far_above_the_start_has_no_finite_margin() {
    Device device = Devices.inverse(Devices.VERY_INVERSE, 90000, 1);
    DeviceResponse as = fast(device, start(1, 1), DevicePreload.COLD, 1);
    assertThat(as.currentMargin()).hasValue(Double.POSITIVE_INFINITY);
    assertThat(as.stretchMargin()).hasValue(Double.POSITIVE_INFINITY);
  }

  @Test
  void a_preload_that_operates_leaves_no_margin() {
    Device device = Devices.overload("F2", Devices.CLASS_10, 100);
    DeviceResponse as = fast(device, start(1, 1), DevicePreload.running(160, 200), 1);
    assertThat(as.operatesAtSeconds()).isZero();
    assertThat(as.currentMargin()).hasValue(0.0);
  }

  @Test
  void only_the_fast_edge_of_a_permitted_start_has_margins() {
    List<DeviceResponse> permitted =
        Plants.fan500().evaluator().devices(start(1, 1), DevicePreload.COLD);
    assertThat(permitted)
        .allSatisfy(
            d ->
                assertThat(d.currentMargin().isPresent() && d.stretchMargin().isPresent())
                    .isEqualTo(d.edge() == Edge.FAST));
    StartHistory held = Histories.start().stage(1800, List.of(1), 90, 90, 70).held();
    assertThat(Plants.fan500().evaluator().devices(held, DevicePreload.COLD))
        .allSatisfy(d -> assertThat(d.currentMargin()).isEmpty());
  }

  @Test
  void a_margin_finds_the_narrow_range_below_a_block() {
    Device.Instantaneous element =
        new Device.Instantaneous(
            Devices.at("I", Device.Place.STATOR, "K1"),
            2000,
            Device.Measures.RMS,
            0,
            Devices.EXACT,
            java.util.OptionalDouble.of(2200));
    DeviceResponse as = fast(element, start(1, 1), DevicePreload.COLD, 1);
    assertThat(as.currentMargin().getAsDouble()).isCloseTo(2000.0 / 380, within(1e-3));
  }
}
