package sliprung.machine;

import sliprung.starter.Motor.CircuitData;

/**
 * A slip-ring machine on a stiff or reactive source, in the steady state.
 *
 * <p>Per phase, star equivalent, referred to the stator; {@code R} is the whole rotor-circuit
 * resistance referred to the stator, {@code s} the slip:
 *
 * <pre>
 *   Z2 = R/s + jX2        Z = R1 + jX1 + jXs + (jXm ∥ Z2)
 *   I1 = (U/√3)/Z         I2' = I1 · jXm/(jXm + Z2)        ring current = a·|I2'|
 *   Te = 3 |I2'|² (R/s) / ω_s
 * </pre>
 *
 * <p>Valid for a balanced sinusoidal supply and constant reactances; not within a few supply
 * periods of a switching. Slip 2 (plugging) and negative slip (overhauling) are valid.
 *
 * <p>Source: any machines textbook, such as Fitzgerald, Kingsley, Umans, Electric Machinery,
 * chapter 6 (from memory).
 */
public final class Machine {
  private final CircuitData circuit;
  private final double synchronousSpeed;

  /**
   * A machine.
   *
   * @param circuit ohms at the supply's frequency
   * @param frequency supply frequency, Hz
   * @param polePairs 1 or more
   */
  public Machine(CircuitData circuit, double frequency, int polePairs) {
    this.circuit = circuit;
    this.synchronousSpeed = 2.0 * Math.PI * frequency / polePairs;
  }

  /** The equivalent circuit in ohms. */
  public CircuitData circuit() {
    return circuit;
  }

  /** Synchronous speed, rad/s. */
  public double synchronousSpeed() {
    return synchronousSpeed;
  }

  /** Slip, per unit, of a speed in rad/s. */
  public double slip(double speed) {
    return (synchronousSpeed - speed) / synchronousSpeed;
  }

  /** Rotor-circuit resistance referred to the stator, Ω per phase, for external actual ohms. */
  public double referredResistance(double externalOhms) {
    return circuit.r2() + circuit.ratio() * circuit.ratio() * externalOhms;
  }

  /**
   * The steady state.
   *
   * @param source no-load voltage of the source, V line to line, and its reactance
   * @param externalOhms outside the rotor winding, actual ohms per phase (star), 0 or more
   * @param slip per unit, not 0 ± 1e-12 (there R/s is taken as very large)
   */
  public OperatingPoint at(Source source, double externalOhms, double slip) {
    double r = referredResistance(externalOhms);
    double s = Math.abs(slip) < 1e-12 ? Math.copySign(1e-12, slip) : slip;
    double y = r / s;
    double xm = circuit.xm();
    double x2 = circuit.x2();
    // jXm ∥ (y + jX2) = jXm (y + jX2) / (y + j(X2 + Xm))
    double x22 = x2 + xm;
    double d = y * y + x22 * x22;
    double zr = xm * xm * y / d;
    double zx = xm * (y * y + x2 * x22) / d;
    double re = circuit.r1() + zr;
    double im = circuit.x1() + zx;
    double imSource = im + source.reactance();
    double phaseVolts = source.volts() / Math.sqrt(3.0);
    double i1Squared = phaseVolts * phaseVolts / (re * re + imSource * imSource);
    double i2Squared = i1Squared * xm * xm / d;
    double i1 = Math.sqrt(i1Squared);
    double impedance = Math.hypot(re, im);
    return new OperatingPoint(
        i1,
        circuit.ratio() * Math.sqrt(i2Squared),
        3.0 * i2Squared * y / synchronousSpeed,
        re / impedance,
        Math.sqrt(3.0) * i1 * impedance,
        3.0 * i1Squared * re);
  }

  /** Air-gap torque alone, N·m; the arguments are those of {@link #at}. */
  public double torque(Source source, double externalOhms, double slip) {
    return at(source, externalOhms, slip).torque();
  }

  /**
   * Standstill rotor voltage with the rings open, V line to line: {@code U |jXm/(R1 + j(X1 + Xs +
   * Xm))| / a}.
   */
  public double openRingVolts(Source source) {
    double x = circuit.x1() + source.reactance() + circuit.xm();
    return source.volts() * circuit.xm() / Math.hypot(circuit.r1(), x) / circuit.ratio();
  }

  /**
   * Slip of the breakdown torque, {@code R/√(Rt² + (Xt + X2)²)} with the Thevenin impedance of
   * stator, source and magnetizing branch.
   */
  public double breakdownSlip(Source source, double externalOhms) {
    double xm = circuit.xm();
    double r1 = circuit.r1();
    double x1 = circuit.x1() + source.reactance();
    // (R1 + jX1) ∥ jXm
    double d = r1 * r1 + (x1 + xm) * (x1 + xm);
    double rt = xm * xm * r1 / d;
    double xt = xm * (r1 * r1 + x1 * (x1 + xm)) / d;
    return referredResistance(externalOhms) / Math.hypot(rt, xt + circuit.x2());
  }
}
