package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

class StartSimulatorTest {
  private static final CircuitData CIRCUIT = new CircuitData(0.55, 4.9, 150, 0.62, 5.1, 6.6);
  private static final Starter STARTER =
      Starters.bare(
          6600,
          50,
          592,
          710e3,
          CIRCUIT,
          880,
          new TorqueCurve.Table(
              new double[] {0, 0.1, 0.5, 1}, new double[] {5200, 2600, 3100, 5400}),
          new double[] {0.62, 0.31, 0.155, 0.078, 0.039},
          new Step.After(3.5),
          new Step.After(2.4),
          new Step.RotorFrequencyBelow(18),
          new Step.After(1.2),
          new Step.After(0.8));
  private static final Machine MACHINE = new Machine(CIRCUIT, 50, 5);
  private static final Conditions NOMINAL = new Conditions(new Source(6600, 0), 1, 1, 1, 1);
  private final StartSimulator simulator = new StartSimulator(STARTER, MACHINE);

  @Test
  void a_permitted_start_passes_every_step_and_settles() {
    StartHistory history = simulator.run(Scenario.PERMITTED, NOMINAL);

    assertThat(history.outcome()).isEqualTo(Outcome.RUNNING);
    assertThat(history.stages()).hasSize(6);
    assertThat(history.stages().stream().map(Stage::fromSeconds))
        .usingElementComparator((a, b) -> Math.abs(a - b) < 1e-9 ? 0 : 1)
        .containsExactly(0.0, 3.5, 5.9, 6.0, 7.2, 8.0);
    assertThat(history.runUpSeconds().getAsDouble()).isCloseTo(8.068, within(0.08));
    assertThat(history.running()).isPresent();
  }

  @Test
  void a_start_held_on_a_step_stays_there_with_its_sections() {
    StartHistory history =
        simulator.run(new Scenario(Scenario.Kind.HELD, 3, Scenario.LoadMode.START), NOMINAL);

    assertThat(history.outcome()).isEqualTo(Outcome.HELD);
    Stage last = history.stages().get(history.stages().size() - 1);
    assertThat(last.step()).isEqualTo(3);
    assertThat(last.sectionsIn()).isEqualTo(List.of(3, 4, 5));
    assertThat(last.toSeconds()).isEqualTo(StartHistory.HORIZON_SECONDS);
  }

  @Test
  void energy_balances_in_every_stage() {
    for (Scenario scenario :
        List.of(
            Scenario.PERMITTED,
            new Scenario(Scenario.Kind.HELD, 2, Scenario.LoadMode.RUNNING),
            new Scenario(Scenario.Kind.LOCKED, 0, Scenario.LoadMode.START))) {
      for (Stage stage : simulator.run(scenario, NOMINAL).everything()) {
        assertThat(imbalance(stage)).as(scenario.id() + stage.step()).isLessThan(1e-6);
      }
    }
  }

  /** (input − stator loss − rotor-circuit heat − kinetic − load work) over input. */
  private static double imbalance(Stage stage) {
    Trace t = stage.trace();
    double input = t.integral(t.inputWatts());
    double stator = 3 * CIRCUIT.r1() * t.integralOfSquare(t.statorAmps());
    double rotorOhms = CIRCUIT.r2() / (CIRCUIT.ratio() * CIRCUIT.ratio()) + stage.externalOhms();
    double rotor = 3 * rotorOhms * t.integralOfSquare(t.ringAmps());
    double[] loadWatts = new double[t.size()];
    for (int i = 0; i < t.size(); i++) {
      loadWatts[i] = t.speed()[i] == 0.0 ? 0.0 : t.loadTorque()[i] * t.speed()[i];
    }
    double w0 = t.speed()[0];
    double w1 = t.speed()[t.last()];
    double kinetic = 0.5 * 880 * (w1 * w1 - w0 * w0);
    return Math.abs(input - stator - rotor - kinetic - t.integral(loadWatts)) / input;
  }
}
