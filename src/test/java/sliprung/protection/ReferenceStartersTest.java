package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.Starter;

/**
 * Uses and operating times of the three reference starters against a second, independent
 * implementation, within the 2 % that their description grants.
 */
class ReferenceStartersTest {
  private static final Path FOLDER = Path.of("src/test/resources/reference-starters");
  private static final double SHARE = 0.02;

  private static Plants plant(String name) {
    Starter starter =
        new StarterReader(CurveLibraryReader.builtIn(), Set.of())
            .read(FOLDER.resolve(name + ".yaml"))
            .described()
            .orElseThrow()
            .starter();
    double reactance =
        starter.supply().faultMinAmps().isPresent()
            ? Source.reactanceOf(
                starter.supply().voltage(), starter.supply().faultMinAmps().getAsDouble())
            : 0.0;
    return new Plants(
        starter,
        new Machine(
            starter.motor().circuit().orElseThrow(),
            starter.supply().frequency(),
            starter.motor().polePairs()),
        new Conditions(new Source(starter.supply().voltage(), reactance), 1, 1, 1, 1));
  }

  private static JsonNode figures(String name) throws IOException {
    return new ObjectMapper().readTree(FOLDER.resolve(name + ".json").toFile());
  }

  @TestFactory
  Stream<DynamicTest> figures_of_the_independent_implementation() throws IOException {
    List<DynamicTest> tests = new ArrayList<>();
    for (String name : List.of("fan-500", "trolley-480", "crusher-6600")) {
      Plants plant = plant(name);
      JsonNode figures = figures(name);
      StartSimulator simulator = plant.simulator();
      StartHistory start = simulator.run(Scenario.PERMITTED, plant.nominal());
      StartSimulator.RunningPoint running = simulator.runningPoint(plant.nominal()).orElseThrow();
      Map<String, List<DeviceResponse>> starts =
          Map.of(
              "cold", plant.evaluator().devices(start, DevicePreload.COLD),
              "hot",
                  plant
                      .evaluator()
                      .devices(
                          start,
                          DevicePreload.running(
                              running.point().statorAmps(), running.point().ringAmps())));
      figures
          .get("use")
          .properties()
          .forEach(
              use -> {
                String[] key = use.getKey().split(" ");
                Edge edge =
                    key.length > 2 ? Edge.valueOf(key[2].toUpperCase(Locale.ROOT)) : Edge.MIDDLE;
                double actual = response(starts.get(key[0]), key[1], edge).useAtRunUp();
                tests.add(close(name + " " + use.getKey(), actual, use.getValue().asDouble()));
              });

      List<DeviceResponse> locked =
          plant
              .evaluator()
              .devices(
                  simulator.run(
                      new Scenario(Scenario.Kind.LOCKED_STEP, 1, Scenario.LoadMode.START),
                      plant.nominal()),
                  DevicePreload.COLD);
      JsonNode slow = figures.get("locked-1").get("ol_slow");
      for (int k = 0; k < slow.size(); k++) {
        double actual = response(locked, "OL" + (k + 1), Edge.SLOW).operatesAtSeconds();
        double expected = slow.get(k).isNull() ? Double.POSITIVE_INFINITY : slow.get(k).asDouble();
        tests.add(close(name + " locked-1 OL" + (k + 1), actual, expected));
      }
    }
    assertThat(tests).hasSize(33);
    return tests.stream();
  }

  private static DeviceResponse response(List<DeviceResponse> all, String tag, Edge edge) {
    return all.stream()
        .filter(d -> d.device().equals(tag) && d.edge() == edge)
        .findFirst()
        .orElseThrow();
  }

  private static DynamicTest close(String name, double actual, double expected) {
    return DynamicTest.dynamicTest(
        name,
        () -> {
          if (Double.isInfinite(expected)) {
            assertThat(actual).isInfinite();
          } else {
            assertThat(actual).isCloseTo(expected, within(SHARE * expected));
          }
        });
  }
}
