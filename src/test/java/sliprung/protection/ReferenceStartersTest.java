package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import org.junit.jupiter.api.Test;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;

/** Uses and operating times against a second, independent implementation. */
class ReferenceStartersTest {

  private static List<String> rows() throws IOException {
    try (InputStream in =
        Objects.requireNonNull(
            ReferenceStartersTest.class.getResourceAsStream("/reference/device-use.csv"))) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(line -> !line.startsWith("#") && !line.startsWith("starter"))
          .toList();
    }
  }

  private static Plants plant(String name) {
    return switch (name) {
      case "fan-500" -> Plants.fan500();
      case "trolley-480" -> Plants.trolley480();
      default -> Plants.crusher6600();
    };
  }

  @Test
  void use_at_run_up_agrees_for_every_device_and_edge() throws IOException {
    int checked = 0;
    for (String row : rows()) {
      String[] cell = row.split(",");
      Plants plant = plant(cell[0]);
      StartSimulator simulator = plant.simulator();
      StartHistory history = simulator.run(Scenario.PERMITTED, plant.nominal());
      StartSimulator.RunningPoint running = simulator.runningPoint(plant.nominal()).orElseThrow();
      DevicePreload preload =
          cell[1].equals("hot")
              ? DevicePreload.running(running.point().statorAmps(), running.point().ringAmps())
              : DevicePreload.COLD;
      DeviceResponse response =
          plant.evaluator().devices(history, preload).stream()
              .filter(
                  d ->
                      d.device().equals(cell[2])
                          && d.edge() == Edge.valueOf(cell[3].toUpperCase(Locale.ROOT)))
              .findFirst()
              .orElseThrow();

      double expected = Double.parseDouble(cell[4]);
      assertThat(response.useAtRunUp()).as(row).isCloseTo(expected, within(0.02 * expected));
      checked++;
    }
    assertThat(checked).isEqualTo(27);
  }

  /** Figures of the same independent implementation, within 2 %; none: never. */
  @Test
  void the_slow_edge_of_each_overload_on_a_rotor_locked_on_step_one() {
    Scenario locked = new Scenario(Scenario.Kind.LOCKED_STEP, 1, Scenario.LoadMode.START);
    Plants trolley = Plants.trolley480();
    List<DeviceResponse> responses =
        trolley
            .evaluator()
            .devices(trolley.simulator().run(locked, trolley.nominal()), DevicePreload.COLD);
    assertThat(slow(responses, "OL1")).isCloseTo(300.8954967855897, within(6.0));
    assertThat(slow(responses, "OL2")).isCloseTo(902.6864903567692, within(18.0));
    for (Plants blind : List.of(Plants.fan500(), Plants.crusher6600())) {
      List<DeviceResponse> none =
          blind
              .evaluator()
              .devices(blind.simulator().run(locked, blind.nominal()), DevicePreload.COLD);
      assertThat(slow(none, "OL1")).isInfinite();
      assertThat(slow(none, "OL2")).isInfinite();
    }
  }

  private static double slow(List<DeviceResponse> responses, String tag) {
    return responses.stream()
        .filter(d -> d.device().equals(tag) && d.edge() == Edge.SLOW)
        .findFirst()
        .orElseThrow()
        .operatesAtSeconds();
  }
}
