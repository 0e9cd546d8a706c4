package sliprung.machine;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

/**
 * What textbook shortcuts make of a plate: where the search for a circuit starts, and the weak
 * expectations that hold what the plate leaves open.
 *
 * <p>A point is the logarithms of R1, X1, Xm, R2, X2 and ratio, in this order.
 */
final class Expectation {
  private static final double LEAKAGE_SPLIT_SPREAD = 0.3;
  private static final double R1_FROM_LOSSES_SPREAD = 0.3;
  private static final double R1_GUESSED_SPREAD = 0.5;
  private static final double XM_GUESSED_SPREAD = 0.3;
  private static final double WIDE = 3.0;

  /** Part of the losses outside rotor, friction and stray load that is in the stator winding. */
  private static final double COPPER_PART = 0.6;

  private final double[] centre;
  private final double r1Spread;
  private final double xmSpread;

  private Expectation(double[] centre, double r1Spread, double xmSpread) {
    this.centre = centre;
    this.r1Spread = r1Spread;
    this.xmSpread = xmSpread;
  }

  static Expectation of(Nameplate plate, OptionalDouble breakdown) {
    Motor motor = plate.motor();
    double base = motor.voltage() / (Math.sqrt(3.0) * motor.current());
    double slip = plate.slip();
    double airGapWatts = plate.airGapTorque() * plate.synchronousSpeed();
    double ratio = ratio(motor);
    double r2 = clamped(r2(motor, slip, airGapWatts, ratio), base, 1e-4, 2.0);
    double leakage = clamped(leakage(plate, breakdown), base, 0.02, 2.0);
    double powerFactor = Math.min(0.99, plate.powerFactor().orElse(0.85));
    double reactive = Math.sqrt(1.0 - powerFactor * powerFactor);
    double xm = clamped(base / Math.max(0.1, 0.9 * reactive - leakage / base), base, 0.5, 20.0);
    double r1 = clamped(r1(motor, slip, airGapWatts, r2), base, 1e-3, 0.3);
    boolean blind = plate.powerFactor().isEmpty();
    return new Expectation(
        DoubleStream.of(r1, leakage / 2.0, blind ? base / 0.4 : xm, r2, leakage / 2.0, ratio)
            .map(Math::log)
            .toArray(),
        motor.efficiency().isPresent() ? R1_FROM_LOSSES_SPREAD : R1_GUESSED_SPREAD,
        blind ? XM_GUESSED_SPREAD : WIDE);
  }

  /** Stator volts over rotor volts, a few per cent of it lost in the stator leakage. */
  private static double ratio(Motor motor) {
    if (motor.rotorVoltage().isPresent()) {
      return 0.97 * motor.voltage() / motor.rotorVoltage().getAsDouble();
    }
    return motor.rotorCurrent().isPresent()
        ? motor.rotorCurrent().getAsDouble() / (0.9 * motor.current())
        : 1.0;
  }

  /** Air-gap power × slip is the heat of the rotor winding. */
  private static double r2(Motor motor, double slip, double airGapWatts, double ratio) {
    double referredAmps =
        motor.rotorCurrent().isPresent()
            ? motor.rotorCurrent().getAsDouble() / ratio
            : 0.9 * motor.current();
    return slip * airGapWatts / (3.0 * referredAmps * referredAmps);
  }

  /** X1 + X2: breakdown power is about U²/2X, and the locked-rotor current about U/X. */
  private static double leakage(Nameplate plate, OptionalDouble breakdown) {
    Motor motor = plate.motor();
    double u = motor.voltage();
    if (breakdown.isEmpty() && motor.lockedCurrent().isPresent()) {
      return u / (Math.sqrt(3.0) * motor.lockedCurrent().getAsDouble());
    }
    double watts = breakdown.orElse(2.6) * motor.ratedTorque() * plate.synchronousSpeed();
    return 0.85 * u * u / (2.0 * watts);
  }

  /** From the losses that are neither in the rotor nor friction and stray load; else 0.8 R2. */
  private static double r1(Motor motor, double slip, double airGapWatts, double r2) {
    if (motor.efficiency().isEmpty()) {
      return 0.8 * r2;
    }
    double input = motor.powerWatts() / motor.efficiency().getAsDouble();
    double left = input - airGapWatts;
    double square = 3.0 * motor.current() * motor.current();
    return Math.max(COPPER_PART * left / square, 0.2 * r2);
  }

  private static double clamped(double ohms, double base, double low, double high) {
    return Math.min(high * base, Math.max(low * base, ohms));
  }

  /** Where to start: the centre, and with leakage and magnetizing reactance moved both ways. */
  List<double[]> starts() {
    List<double[]> starts = new ArrayList<>();
    for (double leakage : new double[] {1.0, 0.65, 1.5}) {
      for (double magnetizing : new double[] {1.0, 0.6, 1.7}) {
        double[] start = centre.clone();
        start[1] += Math.log(leakage);
        start[4] += Math.log(leakage);
        start[2] += Math.log(magnetizing);
        starts.add(start);
      }
    }
    return starts;
  }

  /** The weak expectations at a point, each over its spread. */
  List<Double> deviations(double[] point) {
    List<Double> all = new ArrayList<>();
    all.add((point[1] - point[4]) / LEAKAGE_SPLIT_SPREAD);
    all.add((point[0] - centre[0]) / r1Spread);
    all.add((point[2] - centre[2]) / xmSpread);
    for (int i : new int[] {1, 3, 4, 5}) {
      all.add((point[i] - centre[i]) / WIDE);
    }
    return all;
  }

  /** The circuit at a point. */
  static CircuitData circuit(double[] point) {
    double[] p =
        DoubleStream.of(point).map(x -> Math.exp(Math.max(-60, Math.min(60, x)))).toArray();
    return new CircuitData(p[0], p[1], p[2], p[3], p[4], p[5]);
  }
}
