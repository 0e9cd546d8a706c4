package sliprung.review;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.IdentityHashMap;
import java.util.Map;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.StarterText;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Motor.CircuitData;

/** What goes into the terminals comes out as heat, load work and motion, in every start. */
class EnergyTest {
  private static final double JOULES_PER_JOULE = 1e-6;

  @ParameterizedTest
  @ValueSource(strings = {"crusher", "trolley-480"})
  void should_balance_in_every_stage_of_every_start_at_every_corner(String name) {
    StarterText described =
        name.equals("crusher")
            ? StarterText.crusher()
            : StarterText.resource("reference-starters/" + name + ".yaml");
    // the electrical transient stores energy in its fields besides
    Review review = described.plus("method: steady").review();
    double inertia = review.starter().motor().inertia() + review.starter().load().inertia();
    Map<StartHistory, String> histories = new IdentityHashMap<>();
    for (ComputedStart start : review.starts()) {
      histories.putIfAbsent(start.history(), start.id());
    }
    assertThat(histories.size()).isGreaterThan(200);
    histories.forEach(
        (history, id) -> {
          for (Stage stage : history.everything()) {
            assertThat(imbalance(stage, review.machine().circuit(), inertia))
                .as(id + " step " + stage.step())
                .isLessThan(JOULES_PER_JOULE);
          }
        });
  }

  /** (input − stator loss − rotor-circuit heat − kinetic − load work) over input. */
  private static double imbalance(Stage stage, CircuitData circuit, double inertia) {
    Trace t = stage.trace();
    double input = t.integral(t.inputWatts());
    double stator = 3 * circuit.r1() * t.integralOfSquare(t.statorAmps());
    double rotorOhms = circuit.r2() / (circuit.ratio() * circuit.ratio()) + stage.externalOhms();
    double rotor = 3 * rotorOhms * t.integralOfSquare(t.ringAmps());
    double[] loadWatts = new double[t.size()];
    for (int i = 0; i < t.size(); i++) {
      loadWatts[i] = t.loadTorque()[i] * t.speed()[i];
    }
    double w0 = t.speed()[0];
    double w1 = t.speed()[t.last()];
    double kinetic = 0.5 * inertia * (w1 * w1 - w0 * w0);
    return Math.abs(input - stator - rotor - kinetic - t.integral(loadWatts)) / input;
  }
}
