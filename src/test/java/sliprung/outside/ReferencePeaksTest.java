package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Conditions;
import sliprung.runup.ModelError;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.Starter;

/**
 * Peaks and I²t of the three reference starters against a second, independent implementation,
 * within what their description grants: 3 % and 1 %.
 */
@Tag("outside")
class ReferencePeaksTest {
  private static final Path FOLDER = Path.of("src/test/resources/reference-starters");

  private static StartSimulator simulator(Starter starter) {
    return new StartSimulator(
        starter,
        new Machine(
            starter.motor().circuit().orElseThrow(),
            starter.supply().frequency(),
            starter.motor().polePairs()));
  }

  @TestFactory
  Stream<DynamicTest> peaks_and_squares_of_the_independent_implementation() throws IOException {
    List<DynamicTest> tests = new ArrayList<>();
    for (String name : List.of("fan-500", "trolley-480", "crusher-6600")) {
      Starter starter =
          new StarterReader(CurveLibraryReader.builtIn(), Set.of())
              .read(FOLDER.resolve(name + ".yaml"))
              .described()
              .orElseThrow()
              .starter();
      double volts = starter.supply().voltage();
      double reactance =
          starter.supply().faultMinAmps().stream()
              .map(amps -> Source.reactanceOf(volts, amps))
              .sum();
      Conditions nominal = new Conditions(new Source(volts, reactance), 1, 1, 1, 1);
      StartHistory steady = simulator(starter).run(Scenario.PERMITTED, nominal);
      StartHistory full = simulator(starter).runTransient(Scenario.PERMITTED, nominal);
      JsonNode figures = new ObjectMapper().readTree(FOLDER.resolve(name + ".json").toFile());
      for (JsonNode peak : figures.get("peaks")) {
        int step = peak.get("step").asInt();
        Stage stage =
            full.stages().stream().filter(s -> s.step() == step).findFirst().orElseThrow();
        ClosingPeak found = stage.peak().orElseThrow();
        String where = name + " step " + step;
        tests.add(near(where + " stator", found.statorAmps(), peak.get("stator").asDouble(), 0.03));
        tests.add(near(where + " torque", found.torque(), peak.get("torque").asDouble(), 0.03));
      }
      ModelError error = ModelError.between(steady, full);
      tests.add(
          near(
              name + " transient I²t",
              error.withTransient().statorSquare(),
              figures.get("transient_i2t").asDouble(),
              0.01));
      tests.add(
          near(
              name + " steady I²t",
              error.steady().statorSquare(),
              figures.get("steady_i2t").asDouble(),
              0.01));
    }
    assertThat(tests).hasSize(36);
    return tests.stream();
  }

  private static DynamicTest near(String name, double actual, double expected, double share) {
    return DynamicTest.dynamicTest(
        name, () -> assertThat(actual).isCloseTo(expected, within(share * expected)));
  }
}
