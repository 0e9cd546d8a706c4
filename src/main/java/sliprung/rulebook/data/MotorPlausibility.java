package sliprung.rulebook.data;

import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.starter.Motor;

/** The plate and limits of the motor, by themselves. */
final class MotorPlausibility {
  private MotorPlausibility() {}

  static void check(Tally tally) {
    Motor motor = tally.facts().starter().motor();
    slip(tally, motor);
    power(tally, motor);
    rotor(tally, motor);
    shares(tally, motor);
    torqueAndCurrent(tally, motor);
    times(tally, motor);
  }

  private static void slip(Tally tally, Motor motor) {
    int pairs = Math.max(1, motor.polePairs());
    double synchronous = 60.0 * motor.frequency() / pairs;
    tally.check(
        "slip",
        "motor.speed",
        OptionalDouble.of(1.0 - motor.speedRpm() / synchronous),
        "The rated slip against " + Show.three(synchronous) + " rpm",
        Show::percent,
        "Read rated speed and frequency again: the speed stands just below 60 times frequency over"
            + " pole pairs, and is not the synchronous speed itself.");
  }

  private static void power(Tally tally, Motor motor) {
    if (motor.powerFactor().isEmpty() || motor.efficiency().isEmpty()) {
      return;
    }
    double shaft =
        Math.sqrt(3.0)
            * motor.voltage()
            * motor.current()
            * motor.powerFactor().getAsDouble()
            * motor.efficiency().getAsDouble();
    tally.ratio(
        "power",
        "motor.power",
        Tally.over(shaft, motor.powerWatts()),
        "√3 · voltage · current · power factor · efficiency over rated power",
        "Voltage and current may belong to another connection, or kW and hp are mixed.");
  }

  private static void rotor(Tally tally, Motor motor) {
    if (motor.rotorVoltage().isEmpty() || motor.rotorCurrent().isEmpty()) {
      return;
    }
    double rotorPower =
        Math.sqrt(3.0) * motor.rotorVoltage().getAsDouble() * motor.rotorCurrent().getAsDouble();
    tally.ratio(
        "rotor-power",
        "motor.rotor-current",
        Tally.over(rotorPower, motor.powerWatts()),
        "√3 · standstill rotor voltage · rotor current over rated power",
        "Rotor voltage is line to line with the rings open and the rotor at rest; rotor current is"
            + " that of one ring at rated load.");
  }

  private static void shares(Tally tally, Motor motor) {
    tally.check(
        "efficiency",
        "motor.efficiency",
        motor.efficiency(),
        "The efficiency",
        Show::percent,
        "Give it as a percentage of the input.");
    tally.check(
        "power-factor",
        "motor.power-factor",
        motor.powerFactor(),
        "The power factor",
        Show::three,
        "It is a number below 1.");
    tally.check(
        "service-factor",
        "motor.service-factor",
        motor.serviceFactor(),
        "The service factor",
        Show::ratio,
        "It is 1.0, or 1.15, or what the plate says as SF.");
  }

  private static void torqueAndCurrent(Tally tally, Motor motor) {
    tally.ratio(
        "breakdown-torque",
        "motor.breakdown-torque",
        motor.breakdownTorque(),
        "The breakdown torque over rated torque",
        "Give it as a multiple of rated torque, not in N·m.");
    tally.ratio(
        "locked-current",
        "motor.locked-current",
        Tally.over(motor.lockedCurrent(), motor.current()),
        "The current at rest with rings shorted over rated current",
        "It is the stator current at rated voltage without any resistor.");
  }

  private static void times(Tally tally, Motor motor) {
    tally.ratio(
        "stall-hot",
        "motor.stall-limit",
        Tally.over(motor.stallHotSeconds(), motor.stallColdSeconds()),
        "The stall limit from hot over that from cold",
        "A hot motor stands less: the two are swapped.");
    tally.check(
        "stall-cold",
        "motor.stall-limit",
        motor.stallColdSeconds(),
        "The stall limit from cold",
        Show::seconds,
        "Seconds at rest with rings shorted at rated voltage.");
    tally.check(
        "heating",
        "motor.heating",
        motor.heatingSeconds(),
        "The stator's time constant when turning",
        Show::seconds,
        "It is minutes to an hour or two.");
    tally.ratio(
        "cooling",
        "motor.cooling",
        Tally.over(motor.coolingSeconds(), motor.heatingSeconds()),
        "The time constant at rest over that when turning",
        "A motor cools more slowly at rest than turning: the two are swapped.");
  }
}
