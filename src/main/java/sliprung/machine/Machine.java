package sliprung.machine;

import java.util.OptionalDouble;
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
  private final int polePairs;

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
    this.polePairs = polePairs;
  }

  /** The equivalent circuit in ohms. */
  public CircuitData circuit() {
    return circuit;
  }

  /** Synchronous speed, rad/s. */
  public double synchronousSpeed() {
    return synchronousSpeed;
  }

  /** Pole pairs. */
  public int polePairs() {
    return polePairs;
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
    double impedance = Math.sqrt(re * re + im * im);
    return new OperatingPoint(
        i1,
        circuit.ratio() * Math.sqrt(i2Squared),
        3.0 * i2Squared * y / synchronousSpeed,
        re / impedance,
        Math.sqrt(3.0) * i1 * impedance,
        3.0 * i1Squared * re);
  }

  /**
   * Air-gap torque alone, N·m; the arguments are those of {@link #at}. An integrator asks for
   * nothing else, and often: no root is drawn.
   */
  public double torque(Source source, double externalOhms, double slip) {
    double s = Math.abs(slip) < 1e-12 ? Math.copySign(1e-12, slip) : slip;
    double y = referredResistance(externalOhms) / s;
    double xm = circuit.xm();
    double x22 = circuit.x2() + xm;
    double d = y * y + x22 * x22;
    double re = circuit.r1() + xm * xm * y / d;
    double im = circuit.x1() + source.reactance() + xm * (y * y + circuit.x2() * x22) / d;
    double volts = source.volts();
    // 3 |I2'|² y / ω with |I1|² = U²/3/(re² + im²)
    return volts * volts / (re * re + im * im) * (xm * xm / d) * y / synchronousSpeed;
  }

  /**
   * Standstill rotor voltage with the rings open, V line to line: {@code U |jXm/(R1 + j(X1 + Xs +
   * Xm))| / a}.
   */
  public double openRingVolts(Source source) {
    double x = circuit.x1() + source.reactance() + circuit.xm();
    return source.volts() * circuit.xm() / Math.hypot(circuit.r1(), x) / circuit.ratio();
  }

  /** Greatest driving air-gap torque, N·m. No rotor resistance changes it, only where it lies. */
  public double breakdownTorque(Source source) {
    return Thevenin.of(circuit, source).greatestTorque(circuit.x2(), synchronousSpeed);
  }

  /** Slip, per unit, of the greatest driving torque: {@code R/|Z_T + jX2|}; above 1 is possible. */
  public double breakdownSlip(Source source, double externalOhms) {
    return referredResistance(externalOhms)
        / Thevenin.of(circuit, source).impedanceWith(circuit.x2());
  }

  /**
   * External resistance, actual ohms per phase (star), with which the standstill torque is
   * greatest: the whole rotor circuit is then {@code |Z_T + jX2|}. 0 where the winding alone has
   * more.
   */
  public double externalOhmsForGreatestStandstillTorque(Source source) {
    double whole = Thevenin.of(circuit, source).impedanceWith(circuit.x2());
    return Math.max(0.0, whole - circuit.r2()) / (circuit.ratio() * circuit.ratio());
  }

  /**
   * The slip on the steady branch (between the breakdown slips of driving and of braking) at which
   * the air-gap torque has a given value. Closed form.
   *
   * @param torque N·m; negative when the load overhauls
   * @return empty when the torque exceeds what the machine can give
   */
  public OptionalDouble slipAt(Source source, double externalOhms, double torque) {
    if (torque == 0.0) {
      return OptionalDouble.of(0.0);
    }
    Thevenin t = Thevenin.of(circuit, source);
    // y² − b y + c = 0 for y = R/s; the root of greater magnitude is the smaller slip
    double b = 3.0 * t.volts() * t.volts() / (synchronousSpeed * torque) - 2.0 * t.resistance();
    double z = t.impedanceWith(circuit.x2());
    double discriminant = b * b - 4.0 * z * z;
    if (discriminant < 0.0 || Math.signum(b) != Math.signum(torque)) {
      return OptionalDouble.empty();
    }
    double y = 0.5 * (b + Math.copySign(Math.sqrt(discriminant), b));
    return OptionalDouble.of(referredResistance(externalOhms) / y);
  }
}
