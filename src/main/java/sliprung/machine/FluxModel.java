package sliprung.machine;

import sliprung.starter.Motor.CircuitData;

/**
 * The machine with its electrical transient: flux linkages of stator and rotor as space vectors in
 * the frame that turns with the supply, for one rotor circuit.
 *
 * <pre>
 *   dψs/dt = us − R1·is − jωe·ψs            dψr/dt = −R·ir − j(ωe − pω)·ψr
 *   ψs = Ls·is + Lm·ir                      ψr = Lm·is + Lr·ir
 *   Te = 3/2 · p · Im(conj(ψs)·is)
 * </pre>
 *
 * <p>A vector's magnitude is the peak of a phase (so RMS over √2), the supply lies on the real
 * axis. The source's reactance is in series with the stator's leakage. Everything is per phase,
 * star equivalent, referred to the stator; together with the speed it is the fifth-order model.
 *
 * <p>Valid for a balanced supply and constant reactances. The magnitude of the stator vector is the
 * greatest value that a phase can reach, whatever the instant of closing.
 *
 * <p>Source: Krause, Wasynczuk, Sudhoff, Analysis of Electric Machinery, chapters 4 and 6 (from
 * memory).
 */
public final class FluxModel {
  /** Number of components of a state: ψs and ψr by real and imaginary part, V·s, and the speed. */
  public static final int STATES = 5;

  /** Index of the speed, rad/s, in a state. */
  public static final int SPEED = 4;

  private static final double ROOT_TWO = Math.sqrt(2.0);

  private final double ratio;
  private final double volts;
  private final double electricalSpeed;
  private final int polePairs;
  private final double r1;
  private final double r;
  private final double ls;
  private final double lr;
  private final double lm;
  private final double sourceInductance;
  private final double determinant;

  /**
   * A model.
   *
   * @param machine the motor
   * @param source voltage and reactance
   * @param externalOhms outside the rotor winding, actual ohms per phase (star), 0 or more
   */
  public FluxModel(Machine machine, Source source, double externalOhms) {
    CircuitData c = machine.circuit();
    this.ratio = c.ratio();
    this.polePairs = machine.polePairs();
    this.electricalSpeed = machine.synchronousSpeed() * polePairs;
    this.volts = source.volts() * Math.sqrt(2.0 / 3.0);
    this.r1 = c.r1();
    this.r = machine.referredResistance(externalOhms);
    this.lm = c.xm() / electricalSpeed;
    this.sourceInductance = source.reactance() / electricalSpeed;
    this.ls = c.x1() / electricalSpeed + sourceInductance + lm;
    this.lr = c.x2() / electricalSpeed + lm;
    this.determinant = ls * lr - lm * lm;
  }

  /** A flux linkage to measure others by, V·s: the stator's at no load. */
  public double ratedFlux() {
    return volts / electricalSpeed;
  }

  /** Angular frequency of the supply, rad/s. */
  public double electricalSpeed() {
    return electricalSpeed;
  }

  /** Writes the rates of the four flux linkages, V; the speed's is left to the drive. */
  public void fluxRates(double[] state, double[] rate) {
    double isd = (lr * state[0] - lm * state[2]) / determinant;
    double isq = (lr * state[1] - lm * state[3]) / determinant;
    double ird = (ls * state[2] - lm * state[0]) / determinant;
    double irq = (ls * state[3] - lm * state[1]) / determinant;
    double slipSpeed = electricalSpeed - polePairs * state[SPEED];
    rate[0] = volts - r1 * isd + electricalSpeed * state[1];
    rate[1] = -r1 * isq - electricalSpeed * state[0];
    rate[2] = -r * ird + slipSpeed * state[3];
    rate[3] = -r * irq - slipSpeed * state[2];
  }

  /** Air-gap torque, N·m. */
  public double torque(double[] state) {
    return 1.5 * polePairs * lm / determinant * (state[1] * state[2] - state[0] * state[3]);
  }

  /** Real part of the stator current, peak A. */
  public double statorReal(double[] state) {
    return (lr * state[0] - lm * state[2]) / determinant;
  }

  /** Imaginary part of the stator current, peak A. */
  public double statorImaginary(double[] state) {
    return (lr * state[1] - lm * state[3]) / determinant;
  }

  /** Real part of the ring current, actual peak A, in the frame of the supply. */
  public double ringReal(double[] state) {
    return ratio * (ls * state[2] - lm * state[0]) / determinant;
  }

  /** Imaginary part of the ring current, actual peak A, in the frame of the supply. */
  public double ringImaginary(double[] state) {
    return ratio * (ls * state[3] - lm * state[1]) / determinant;
  }

  /** Without the care for extremes that costs more than everything around it. */
  private static double magnitude(double real, double imaginary) {
    return Math.sqrt(real * real + imaginary * imaginary);
  }

  /** Magnitude of the stator current over √2, A. */
  public double statorAmps(double[] state) {
    return magnitude(statorReal(state), statorImaginary(state)) / ROOT_TWO;
  }

  /** Magnitude of the ring current over √2, A. */
  public double ringAmps(double[] state) {
    return magnitude(ringReal(state), ringImaginary(state)) / ROOT_TWO;
  }

  /**
   * Voltage at the terminals, behind the source's reactance: magnitude, RMS line to line, V, and
   * the active power into the motor, W.
   */
  public Terminals terminals(double[] state) {
    double[] rate = new double[STATES];
    fluxRates(state, rate);
    double isd = statorReal(state);
    double isq = statorImaginary(state);
    double didt = (lr * rate[0] - lm * rate[2]) / determinant;
    double dqdt = (lr * rate[1] - lm * rate[3]) / determinant;
    double ud = volts - sourceInductance * (didt - electricalSpeed * isq);
    double uq = -sourceInductance * (dqdt + electricalSpeed * isd);
    return new Terminals(Math.sqrt(1.5) * magnitude(ud, uq), 1.5 * (ud * isd + uq * isq));
  }

  /**
   * At the motor's terminals.
   *
   * @param volts line to line, magnitude over √2
   * @param inputWatts active power into the motor
   */
  public record Terminals(double volts, double inputWatts) {}

  /** Energy in the magnetic field of motor and source, J. */
  public double fieldJoules(double[] state) {
    double stator = statorReal(state) * state[0] + statorImaginary(state) * state[1];
    double rotor = (ringReal(state) * state[2] + ringImaginary(state) * state[3]) / ratio;
    return 0.75 * (stator + rotor);
  }

  /**
   * Time constant in s with which the rotor's flux dies while the stator is open: {@code Tdo = (X2
   * + Xm)/(ω·R)}, R of the whole rotor circuit.
   */
  public double openCircuitSeconds() {
    return lr / r;
  }

  /**
   * The stator, cut off from a state and left open for a while, the angle to the supply counted
   * anew from the beginning: the rotor keeps its flux at the cut and lets it die with {@link
   * #openCircuitSeconds()}; the stator is linked with what of it crosses the gap.
   *
   * @param state at the cut
   * @param seconds open, 0 or more
   * @param speed at the end of it, rad/s
   * @param angle by which the flux has turned against the supply, rad
   */
  public double[] openedFrom(double[] state, double seconds, double speed, double angle) {
    double left = Math.exp(-seconds / openCircuitSeconds());
    double d = left * (state[2] * Math.cos(angle) - state[3] * Math.sin(angle));
    double q = left * (state[2] * Math.sin(angle) + state[3] * Math.cos(angle));
    double crosses = lm / lr;
    return new double[] {crosses * d, crosses * q, d, q, speed};
  }

  /**
   * Residual voltage at the open stator, RMS line to line, V: {@code √(3/2)·(Lm/Lr)·|−R/Lr +
   * jpω|·|ψr|}.
   */
  public double residualVolts(double[] opened) {
    double rate = magnitude(r / lr, polePairs * opened[SPEED]);
    return Math.sqrt(1.5) * lm / lr * rate * magnitude(opened[2], opened[3]);
  }

  /** The settled state at a constant speed, rad/s. */
  public double[] settledAt(double speed) {
    // currents from the steady circuit with complex numbers: rotor branch y + jx22, main jxm
    double slip = 1.0 - polePairs * speed / electricalSpeed;
    double xm = electricalSpeed * lm;
    double x22 = slip * electricalSpeed * lr;
    double d = r * r + x22 * x22;
    // ir = −j s Xm is / (R + j s X22)
    double wd = -slip * xm * x22 / d;
    double wq = -slip * xm * r / d;
    // us = (R1 + j Xs + j Xm w) is
    double zd = r1 - xm * wq;
    double zq = electricalSpeed * ls + xm * wd;
    double z = zd * zd + zq * zq;
    double isd = volts * zd / z;
    double isq = -volts * zq / z;
    double ird = wd * isd - wq * isq;
    double irq = wd * isq + wq * isd;
    return new double[] {
      ls * isd + lm * ird, ls * isq + lm * irq, lm * isd + lr * ird, lm * isq + lr * irq, speed
    };
  }
}
