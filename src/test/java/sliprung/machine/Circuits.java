package sliprung.machine;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

/** Machines for tests: invented ones, random but always the same. */
final class Circuits {
  private Circuits() {}

  /** Plausible circuit per unit of the base impedance: 10 kW to several MW. */
  static CircuitData random(Random random) {
    double base = Math.exp(between(random, Math.log(0.2), Math.log(60.0)));
    double x = between(random, 0.07, 0.13) * base;
    double split = Math.exp(between(random, -0.3, 0.3));
    return new CircuitData(
        between(random, 0.008, 0.03) * base,
        x * Math.sqrt(split),
        between(random, 2.0, 4.5) * base,
        between(random, 0.01, 0.035) * base,
        x / Math.sqrt(split),
        Math.exp(between(random, Math.log(0.6), Math.log(8.0))));
  }

  static double between(Random random, double lo, double hi) {
    return lo + (hi - lo) * random.nextDouble();
  }

  /** A figure of a plate: empty for 0. */
  static OptionalDouble figure(double value) {
    return value > 0.0 ? OptionalDouble.of(value) : OptionalDouble.empty();
  }

  /** A motor from figures of its plate in the order of the record; 0: not on the plate. */
  static Motor plate(
      double volts,
      double frequency,
      double watts,
      double amps,
      double rpm,
      double powerFactor,
      double efficiency,
      double rotorVolts,
      double rotorAmps,
      double breakdown,
      double lockedAmps) {
    return new Motor(
        volts,
        frequency,
        watts,
        amps,
        rpm,
        figure(powerFactor),
        figure(efficiency),
        OptionalDouble.empty(),
        figure(rotorVolts),
        figure(rotorAmps),
        figure(breakdown),
        figure(lockedAmps),
        1.0,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.empty());
  }

  /** The invented 200 kW crusher motor; breakdown torque 0: not on the plate. */
  static Motor crusher(double breakdown) {
    return plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 420, 285, breakdown, 0);
  }

  static Motor with(Motor m, CircuitData circuit) {
    return new Motor(
        m.voltage(),
        m.frequency(),
        m.powerWatts(),
        m.current(),
        m.speedRpm(),
        m.powerFactor(),
        m.efficiency(),
        m.serviceFactor(),
        m.rotorVoltage(),
        m.rotorCurrent(),
        m.breakdownTorque(),
        m.lockedCurrent(),
        m.inertia(),
        m.stallColdSeconds(),
        m.stallHotSeconds(),
        m.heatingSeconds(),
        m.coolingSeconds(),
        m.ringsAtRest(),
        Optional.of(circuit));
  }
}
