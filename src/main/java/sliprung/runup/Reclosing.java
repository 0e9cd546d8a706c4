package sliprung.runup;

import sliprung.machine.FluxModel;
import sliprung.numeric.SystemFlow;

/**
 * The line contactor drops and returns while the rotor turns with every step contactor closed: the
 * greatest values of the first periods after it, over every dead time and every angle.
 *
 * <p>How long the line is off is not an input, so it may be anything: the residual voltage is that
 * of a motor at no load, which leaves most, and it is met at whatever angle is worst. While the
 * stator is open the rotor's flux dies with its open-circuit time constant and the speed falls with
 * the running torque. The last of the dead times is the one after which the rotor stands without
 * flux.
 *
 * <p>Without resistance and at synchronous speed, with E left of the voltage U per phase: current
 * {@code 2·√2·(U + E)/X'} in opposition, torque {@code 3√3/2·3U²/(X'·Ω)} at 120° with E = U; {@code
 * X' = X1 + X2·Xm/(X2 + Xm)}, the source's reactance in X1. Source: theorem of constant flux
 * linkages (from memory).
 */
final class Reclosing {
  /** Dead times over the open-circuit time constant; later than the last the flux is gone. */
  private static final double[] DEAD_TIMES = {0.0, 0.3, 1.0, 3.0};

  /**
   * Angles of the residual voltage. At every instant each value goes with the cosine of it, so that
   * between two of them no more is missed than {@code 1 − cos(π/24)}: the greatest is raised by it.
   */
  private static final int ANGLES = 24;

  private static final double PERIODS = 3.0;
  private static final double ERROR = 1e-6;

  private final Circumstance circumstance;
  private final double runningTorque;
  private final FluxModel model;

  /**
   * A reclosing.
   *
   * @param circumstance with the last step's circuit
   * @param runningTorque N·m, what brakes the rotor while the line is off
   */
  Reclosing(Circumstance circumstance, double runningTorque) {
    this.circumstance = circumstance;
    this.runningTorque = runningTorque;
    this.model =
        new FluxModel(circumstance.machine(), circumstance.source(), circumstance.externalOhms());
  }

  /** The greatest over dead times and angles. */
  ClosingPeak greatest() {
    double synchronous = circumstance.machine().synchronousSpeed();
    double[] running = model.settledAt(synchronous);
    ClosingPeak greatest = after(new double[FluxModel.STATES]);
    for (double share : DEAD_TIMES) {
      double seconds = share * model.openCircuitSeconds();
      double speed = Math.max(0.0, synchronous - runningTorque * seconds / circumstance.inertia());
      for (int i = 0; i < ANGLES; i++) {
        double angle = 2.0 * Math.PI * i / ANGLES;
        greatest = greatest.or(after(model.openedFrom(running, seconds, speed, angle)));
      }
    }
    return greatest.raised(1.0 / Math.cos(Math.PI / ANGLES));
  }

  /** The first periods after closing onto a state, at the speed it has. */
  ClosingPeak after(double[] state) {
    double period = 2.0 * Math.PI / model.electricalSpeed();
    TransientSamples samples = new TransientSamples(circumstance, model, new CycleMean(period));
    samples.begin(0.0, state);
    double flux = ERROR * model.ratedFlux();
    double speed = ERROR * circumstance.machine().synchronousSpeed();
    SystemFlow.run(
        (y, rate) -> {
          model.fluxRates(y, rate);
          rate[FluxModel.SPEED] = 0.0;
        },
        new double[] {flux, flux, flux, flux, speed},
        0.0,
        state,
        PERIODS * period,
        samples);
    return samples.peak().orElseThrow();
  }
}
