package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;
import sliprung.starter.Starter;

class BankTemperatureTest {
  private static final double RISE = 375.0;

  /** Section 1: 45 A for good, 200 A for 20 s: τ = −20/ln(1 − (45/200)²) = 385.0 s. */
  private static final double TAU = -20.0 / Math.log(1.0 - Math.pow(45.0 / 200.0, 2.0));

  private static Starter starter(String device) {
    return StarterText.small()
        .with(
            "time: 20 s}}\n    - {resistance: 0.25",
            "time: 20 s}, " + rise() + "}\n    - {resistance: 0.25")
        .with("current: 250 A, time: 20 s}}", "current: 250 A, time: 20 s}, " + rise() + "}")
        .under("F5:", "  T1: {kind: temperature, place: bank, " + device + ", trips: K1}")
        .starter();
  }

  private static String rise() {
    return "rise: {continuous: 375 K, short-time: 375 K}";
  }

  private static EdgeModel model(Starter starter, Edge edge) {
    return Bands.models(starter.device("T1").orElseThrow(), starter).get(edge);
  }

  private static double operates(
      Starter starter, Edge edge, StartHistory history, DevicePreload before) {
    Currents currents = new Currents(history, 157.0, 50.0);
    return model(starter, edge)
        .over(new Starts(currents, 1, before), false)
        .passage()
        .reachedAtSeconds();
  }

  private static StartHistory heldAt(double ringAmps) {
    return Histories.start().stage(1800.0, List.of(1, 2), 60.0, ringAmps, 100.0).held();
  }

  /** Closed form of a first-order sensor on a first-order element, both from cold. */
  private static double sensor(double ringAmps, double lag, double t) {
    double end = Math.pow(ringAmps / 45.0, 2.0);
    return end * (1.0 - (TAU * Math.exp(-t / TAU) - lag * Math.exp(-t / lag)) / (TAU - lag));
  }

  @Test
  void a_sensor_follows_its_element_with_a_lag() {
    Starter exact =
        starter("sections: [1], rise: 300 K, lag: 30 s, accuracy: {pick-up: 0 %, time: 0 %}");
    double t = operates(exact, Edge.SLOW, heldAt(90.0), DevicePreload.COLD);
    assertThat(sensor(90.0, 30.0, t)).isCloseTo(300.0 / RISE, within(1e-6));
    double quick = -TAU * Math.log(1.0 - 0.8 / 4.0);
    assertThat(t).isGreaterThan(quick + 25.0).isLessThan(quick + 31.0);
  }

  @Test
  void accuracy_moves_limit_and_lag_to_the_edges() {
    Starter starter =
        starter("sections: [1], rise: 300 K, lag: 30 s, accuracy: {pick-up: 5 %, time: 20 %}");
    double slow = operates(starter, Edge.SLOW, heldAt(90.0), DevicePreload.COLD);
    double fast = operates(starter, Edge.FAST, heldAt(90.0), DevicePreload.COLD);
    assertThat(sensor(90.0, 36.0, slow)).isCloseTo(315.0 / RISE, within(1e-6));
    assertThat(sensor(90.0, 24.0, fast)).isCloseTo(285.0 / RISE, within(1e-6));
  }

  @Test
  void a_temperature_counts_from_the_hottest_air_when_early_and_the_coldest_when_late() {
    Device.Temperature device =
        (Device.Temperature)
            starter("limit: 400 °C, lag: 20 s, accuracy: {pick-up: 0 %}, air: [-10 °C, 50 °C]")
                .device("T1")
                .orElseThrow();
    assertThat(device.leastRiseKelvin()).isEqualTo(350.0);
    assertThat(device.greatestRiseKelvin()).isEqualTo(410.0);
    assertThat(device.sections()).containsExactly(1, 2);
  }

  @Test
  void what_never_gets_that_hot_never_trips() {
    Starter starter = starter("sections: [1], rise: 300 K, lag: 30 s, accuracy: {pick-up: 0 %}");
    double just = 45.0 * Math.sqrt(300.0 / RISE);
    assertThat(operates(starter, Edge.SLOW, heldAt(0.99 * just), DevicePreload.COLD)).isInfinite();
    assertThat(operates(starter, Edge.SLOW, heldAt(1.02 * just), DevicePreload.COLD)).isFinite();
  }

  @Test
  void a_section_out_of_circuit_is_not_seen() {
    Starter starter = starter("sections: [1], rise: 300 K, lag: 30 s");
    StartHistory second = Histories.start().stage(1800.0, List.of(2), 60.0, 120.0, 100.0).held();
    assertThat(operates(starter, Edge.SLOW, second, DevicePreload.COLD)).isInfinite();
    Starter both = starter("rise: 300 K, lag: 30 s");
    assertThat(operates(both, Edge.SLOW, second, DevicePreload.COLD)).isFinite();
  }

  /** The slow edge never owes its speed to a sensor that was warm before. */
  @Test
  void a_warm_bank_makes_the_fast_edge_quicker_than_the_slow_one() {
    Starter exact =
        starter("sections: [1], rise: 300 K, lag: 30 s, accuracy: {pick-up: 0 %, time: 0 %}");
    DevicePreload warm = DevicePreload.COLD.onWarmBank(List.of(0.6, 0.0));
    double cold = operates(exact, Edge.SLOW, heldAt(90.0), DevicePreload.COLD);
    double slow = operates(exact, Edge.SLOW, heldAt(90.0), warm);
    double fast = operates(exact, Edge.FAST, heldAt(90.0), warm);
    assertThat(fast).isLessThan(slow);
    assertThat(slow).isLessThan(cold);
  }

  @Test
  void without_a_rise_nobody_knows_how_hot_the_element_is() {
    Starter starter =
        StarterText.small()
            .under("F5:", "  T1: {kind: temperature, rise: 300 K, lag: 30 s, trips: K1}")
            .starter();
    assertThat(model(starter, Edge.SLOW).unknown().orElseThrow())
        .contains("resistors.sections[1].rise");
  }

  @Test
  void a_limit_within_the_air_is_no_limit() {
    Starter starter = starter("limit: 40 °C, lag: 20 s");
    assertThat(model(starter, Edge.FAST).unknown()).isPresent();
  }
}
