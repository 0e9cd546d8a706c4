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
}
