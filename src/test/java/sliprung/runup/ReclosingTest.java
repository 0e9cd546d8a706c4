package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.hipparchus.ode.sampling.ODEStateInterpolator;
import org.hipparchus.ode.sampling.ODEStepHandler;
import org.junit.jupiter.api.Test;
import sliprung.machine.FluxModel;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.starter.Motor.CircuitData;

/** Closing onto the residual voltage of a rotor that still turns. */
class ReclosingTest {
  private static final double VOLTS = 690.0;
  private static final double PHASE = VOLTS / Math.sqrt(3.0);
  private static final double OMEGA = 100.0 * Math.PI;
  private static final double SYNCHRONOUS = 50.0 * Math.PI;
  private static final double INERTIA = 12.0;

  /** R1, X1, Xm, R2, X2 in ohms; X' = 0.09 + 0.11·4/4.11 = 0.19706. */
  private static final CircuitData CIRCUIT = new CircuitData(0.02, 0.09, 4.0, 0.022, 0.11, 1.5);

  /** Share of the voltage that a motor at no load leaves. */
  private static final double LEFT = 4.0 / 4.09 * 4.0 / 4.11;

  private static final double TRANSIENT_REACTANCE = 0.09 + 0.11 * 4.0 / 4.11;

  private static Circumstance circumstance(CircuitData circuit) {
    return new Circumstance(
        new Machine(circuit, 50.0, 2), new Source(VOLTS, 0.0), 0.0, w -> 0.0, 0.0, false, INERTIA);
  }

  private static CircuitData lossless() {
    return new CircuitData(1e-7, 0.09, 4.0, 1e-7, 0.11, 1.5);
  }

  private static FluxModel model(CircuitData circuit, double external) {
    return new FluxModel(new Machine(circuit, 50.0, 2), new Source(VOLTS, 0.0), external);
  }

  private static double[] opened(FluxModel model, double seconds, double angle) {
    return model.openedFrom(model.settledAt(SYNCHRONOUS), seconds, SYNCHRONOUS, angle);
  }

  /**
   * Tdo = (0.11 + 4)/(314.16 · 0.022) = 0.5947 s; 0.2 Ω actual outside, 0.45 referred: 0.0277 s.
   */
  @Test
  void the_flux_dies_with_the_open_circuit_time_constant() {
    FluxModel shorted = model(CIRCUIT, 0.0);
    assertThat(shorted.openCircuitSeconds()).isCloseTo(0.5947, within(5e-5));
    assertThat(model(CIRCUIT, 0.2).openCircuitSeconds()).isCloseTo(0.02772, within(5e-6));
    double begins = shorted.residualVolts(opened(shorted, 0.0, 0.0));
    double later = shorted.residualVolts(opened(shorted, 0.5947, 1.0));
    assertThat(later / begins).isCloseTo(Math.exp(-1.0), within(1e-4));
  }

  /**
   * At no load the rotor is linked with Xm/(X1 + Xm) of the supply's flux; once it carries that
   * flux itself, Xm/(X2 + Xm) of it crosses the gap: 690 · 4/4.09 · 4/4.11 = 656.76 V.
   */
  @Test
  void a_motor_at_no_load_leaves_what_its_rotor_can_send_across_the_gap() {
    FluxModel shorted = model(CIRCUIT, 0.0);
    assertThat(shorted.residualVolts(opened(shorted, 0.0, 0.0))).isCloseTo(656.76, within(0.01));
  }

  /** While open there is no stator current and no torque. */
  @Test
  void an_open_stator_carries_nothing() {
    FluxModel shorted = model(CIRCUIT, 0.0);
    double[] open = opened(shorted, 0.1, 0.7);
    assertThat(shorted.statorAmps(open)).isCloseTo(0.0, within(1e-9));
    assertThat(shorted.torque(open)).isCloseTo(0.0, within(1e-6));
  }

  /** Without resistance: 2·√2·(398.4 + 379.2)/0.19706 = 11 161 A in opposition. */
  @Test
  void without_resistance_the_current_in_opposition_is_that_of_both_voltages_doubled() {
    double residual = PHASE * LEFT;
    double expected = 2.0 * Math.sqrt(2.0) * (PHASE + residual) / TRANSIENT_REACTANCE;
    ClosingPeak peak =
        new Reclosing(circumstance(lossless()), 0.0)
            .after(opened(model(lossless(), 0.0), 0.0, Math.PI));
    assertThat(expected).isCloseTo(11160.5, within(1.0));
    assertThat(peak.statorAmps()).isCloseTo(expected, within(1e-4 * expected));
    assertThat(peak.statorAtSeconds()).isCloseTo(0.01, within(1e-5));
  }

  /**
   * Without resistance, ε = E/U: {@code 3U²/(X'Ω)·ε·max(sin δ + ε sin θ − sin(θ + δ))}; with ε = 1
   * that is 3√3/2 at 120°.
   */
  @Test
  void without_resistance_the_greatest_torque_is_that_of_constant_flux_linkages() {
    double e = LEFT;
    double most = 0.0;
    for (int i = 0; i < 24; i++) {
      double d = i * Math.PI / 12.0;
      for (double t = 0.0; t < 2.0 * Math.PI; t += 1e-3) {
        most = Math.max(most, e * (Math.sin(d) + e * Math.sin(t) - Math.sin(t + d)));
      }
    }
    assertThat(most).isBetween(0.9 * 1.5 * Math.sqrt(3.0), 1.5 * Math.sqrt(3.0));
    double expected = most * 3.0 * PHASE * PHASE / (TRANSIENT_REACTANCE * SYNCHRONOUS);
    ClosingPeak peak = new Reclosing(circumstance(lossless()), 0.0).greatest();
    // the 24 angles meet 120 degrees: here the raise for what lies between them is all margin
    double raised = expected / Math.cos(Math.PI / 24.0);
    assertThat(peak.torque()).isCloseTo(raised, within(1e-3 * raised));
    assertThat(-peak.leastTorque()).isCloseTo(raised, within(1e-3 * raised));
  }

  @Test
  void with_resistance_it_lies_between_the_closing_at_rest_and_that_bound() {
    Reclosing reclosing = new Reclosing(circumstance(CIRCUIT), 900.0);
    ClosingPeak rest = reclosing.after(new double[FluxModel.STATES]);
    ClosingPeak worst = reclosing.greatest();
    double bound = 2.0 * Math.sqrt(2.0) * PHASE * (1.0 + LEFT) / TRANSIENT_REACTANCE;
    assertThat(worst.statorAmps()).isBetween(1.3 * rest.statorAmps(), bound);
    assertThat(-worst.leastTorque()).isGreaterThan(2.0 * rest.torque());
  }

  /** The same closing in the frame at rest, where the supply turns, by another library. */
  @Test
  void another_library_in_another_frame_gives_the_same_peaks() {
    FluxModel model = model(CIRCUIT, 0.0);
    double[] start = opened(model, 0.15, 2.2);
    ClosingPeak ours = new Reclosing(circumstance(CIRCUIT), 0.0).after(start);
    double ls = 4.09 / OMEGA;
    double lr = 4.11 / OMEGA;
    double lm = 4.0 / OMEGA;
    double det = ls * lr - lm * lm;
    double[] greatest = {0.0, 0.0, 0.0};
    OrdinaryDifferentialEquation equations =
        new OrdinaryDifferentialEquation() {
          @Override
          public int getDimension() {
            return 4;
          }

          @Override
          public double[] computeDerivatives(double t, double[] s) {
            double u = PHASE * Math.sqrt(2.0);
            return new double[] {
              u * Math.cos(OMEGA * t) - 0.02 * (lr * s[0] - lm * s[2]) / det,
              u * Math.sin(OMEGA * t) - 0.02 * (lr * s[1] - lm * s[3]) / det,
              -0.022 * (ls * s[2] - lm * s[0]) / det - OMEGA * s[3],
              -0.022 * (ls * s[3] - lm * s[1]) / det + OMEGA * s[2]
            };
          }
        };
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(1e-9, 1e-4, 1e-11, 1e-11);
    integrator.addStepHandler(
        new ODEStepHandler() {
          @Override
          public void handleStep(ODEStateInterpolator step) {
            double[] s = step.getCurrentState().getPrimaryState();
            double a = (lr * s[0] - lm * s[2]) / det;
            double b = (lr * s[1] - lm * s[3]) / det;
            double torque = 3.0 * (s[0] * b - s[1] * a);
            greatest[0] = Math.max(greatest[0], Math.hypot(a, b));
            greatest[1] = Math.max(greatest[1], torque);
            greatest[2] = Math.min(greatest[2], torque);
          }
        });
    integrator.integrate(equations, new ODEState(0.0, java.util.Arrays.copyOf(start, 4)), 0.06);
    assertThat(ours.statorAmps()).isCloseTo(greatest[0], within(1e-3 * greatest[0]));
    assertThat(ours.torque()).isCloseTo(greatest[1], within(1e-3 * greatest[1]));
    assertThat(ours.leastTorque()).isCloseTo(greatest[2], within(-1e-3 * greatest[2]));
  }
}
