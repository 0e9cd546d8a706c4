package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/**
 * Within a stage the right-hand side depends on speed alone, so a stage is a quadrature in speed as
 * well as an equation in time: both, by another library, against the simulator.
 */
class IndependentIntegrationTest {
  private static final CircuitData CIRCUIT =
      new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);
  private static final Machine MACHINE = new Machine(CIRCUIT, 50, 2);
  private static final Source SOURCE = new Source(690, 0.02);
  private static final double INERTIA = 76.0;
  private static final TorqueCurve LOAD = new TorqueCurve.Square(600.0);
  private static final Starter STARTER =
      Starters.bare(
          690,
          50,
          1478,
          200e3,
          CIRCUIT,
          INERTIA,
          LOAD,
          new double[] {0.1845, 0.0930, 0.0469, 0.0237, 0.0119},
          new Step.After(4.2),
          new Step.StatorBelow(330.0),
          new Step.After(1.4),
          new Step.RotorFrequencyBelow(4.0),
          new Step.After(0.7));

  private final List<Stage> stages =
      new StartSimulator(STARTER, MACHINE)
          .run(Scenario.PERMITTED, new Conditions(SOURCE, 1, 1, 1, 1))
          .stages();

  private static double net(double external, double speed) {
    double torque = MACHINE.torque(SOURCE, external, MACHINE.slip(speed));
    return torque - LOAD.at(speed / MACHINE.synchronousSpeed());
  }

  @Test
  void quadrature_in_speed_gives_duration_and_heat_of_every_stage() {
    assertThat(stages).hasSize(6);
    GaussIntegratorFactory gauss = new GaussIntegratorFactory();
    for (Stage stage : stages.subList(0, 5)) {
      Trace t = stage.trace();
      double from = t.speed()[0];
      double to = t.speed()[t.last()];
      double external = stage.externalOhms();
      double seconds = 0.0;
      double squares = 0.0;
      int pieces = 64;
      for (int i = 0; i < pieces; i++) {
        GaussIntegrator piece =
            gauss.legendre(
                16, from + (to - from) * i / pieces, from + (to - from) * (i + 1) / pieces);
        seconds += piece.integrate(w -> INERTIA / net(external, w));
        squares +=
            piece.integrate(
                w ->
                    Math.pow(MACHINE.at(SOURCE, external, MACHINE.slip(w)).ringAmps(), 2)
                        * INERTIA
                        / net(external, w));
      }
      double duration = stage.toSeconds() - stage.fromSeconds();
      assertThat(seconds).isCloseTo(duration, within(1e-8 * duration));
      assertThat(t.integralOfSquare(t.ringAmps())).isCloseTo(squares, within(1e-6 * squares));
    }
  }

  @Test
  void integration_in_time_by_another_library_gives_the_same_speeds() {
    double speed = 0.0;
    for (Stage stage : stages.subList(0, 5)) {
      double external = stage.externalOhms();
      speed =
          new DormandPrince853Integrator(1e-9, 1.0, 1e-12, 1e-12)
              .integrate(
                  new OrdinaryDifferentialEquation() {
                    @Override
                    public int getDimension() {
                      return 1;
                    }

                    @Override
                    public double[] computeDerivatives(double time, double[] state) {
                      return new double[] {net(external, state[0]) / INERTIA};
                    }
                  },
                  new ODEState(stage.fromSeconds(), new double[] {speed}),
                  stage.toSeconds())
              .getPrimaryState()[0];
      Trace t = stage.trace();
      assertThat(t.speed()[t.last()]).isCloseTo(speed, within(1e-8 * speed));
    }
  }

  @Test
  void energy_balances_over_the_whole_start() {
    double input = 0.0;
    double out = 0.0;
    double load = 0.0;
    for (Stage stage : stages) {
      Trace t = stage.trace();
      input += t.integral(t.inputWatts());
      double rotorOhms = CIRCUIT.r2() / (CIRCUIT.ratio() * CIRCUIT.ratio()) + stage.externalOhms();
      out += 3 * CIRCUIT.r1() * t.integralOfSquare(t.statorAmps());
      out += 3 * rotorOhms * t.integralOfSquare(t.ringAmps());
      double[] watts = new double[t.size()];
      for (int i = 0; i < t.size(); i++) {
        watts[i] = t.loadTorque()[i] * t.speed()[i];
      }
      load += t.integral(watts);
    }
    Trace last = stages.get(5).trace();
    double end = last.speed()[last.last()];
    double kinetic = 0.5 * INERTIA * end * end;
    assertThat(out + load + kinetic).isCloseTo(input, within(1e-6 * input));
    assertThat(load).isGreaterThan(0.1 * kinetic);
  }
}
