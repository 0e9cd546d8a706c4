package sliprung.machine;

import sliprung.starter.Motor.CircuitData;

/**
 * What the rotor branch sees: source, stator and magnetizing branch as one voltage behind one
 * impedance. Per phase, referred to the stator.
 *
 * <pre>
 *   U_T = (U/√3) · jXm/(R1 + j(X1 + Xs + Xm))      Z_T = jXm ∥ (R1 + j(X1 + Xs))
 *   Te  = (3 U_T²/ω_s) · y/((R_T + y)² + X²)        y = R/s,  X = X_T + X2
 * </pre>
 *
 * <p>Source: Fitzgerald, Kingsley, Umans, Electric Machinery, chapter 6 (from memory).
 *
 * @param volts magnitude of the open-circuit voltage, phase, V
 * @param resistance R_T, Ω
 * @param reactance X_T, Ω
 */
record Thevenin(double volts, double resistance, double reactance) {

  static Thevenin of(CircuitData circuit, Source source) {
    double x1 = circuit.x1() + source.reactance();
    double xm = circuit.xm();
    double xs = x1 + xm;
    double r1 = circuit.r1();
    double d = r1 * r1 + xs * xs;
    return new Thevenin(
        source.volts() / Math.sqrt(3.0) * xm / Math.sqrt(d),
        xm * xm * r1 / d,
        xm * (r1 * r1 + x1 * xs) / d);
  }

  /** |Z_T + jX2|: the R/s at which the torque is greatest. */
  double impedanceWith(double x2) {
    return Math.hypot(resistance, reactance + x2);
  }

  /** Greatest torque, N·m, driving. */
  double greatestTorque(double x2, double synchronousSpeed) {
    return 1.5 * volts * volts / (synchronousSpeed * (resistance + impedanceWith(x2)));
  }
}
