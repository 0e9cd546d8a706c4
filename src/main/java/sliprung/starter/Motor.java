package sliprung.starter;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A slip-ring motor: plate, limits, and its circuit where the user has one.
 *
 * @param voltage rated line-to-line stator voltage, V
 * @param frequency rated, Hz
 * @param powerWatts rated shaft power, W
 * @param current rated stator current, A
 * @param speedRpm rated speed, 1/min
 * @param powerFactor rated, 0 to 1
 * @param efficiency rated, 0 to 1
 * @param serviceFactor as on the plate
 * @param rotorVoltage standstill rotor voltage, rings open, line to line, V
 * @param rotorCurrent rated ring current, A
 * @param breakdownTorque over rated torque
 * @param lockedCurrent stator current at rest with rings shorted, A
 * @param inertia of the rotor, kg·m²
 * @param stallColdSeconds permitted time at rest, rings shorted, rated voltage, from cold
 * @param stallHotSeconds likewise from running temperature
 * @param heatingSeconds stator time constant, turning
 * @param coolingSeconds stator time constant, at rest
 * @param ringsAtRest what slip rings and brushes stand with the rotor at rest
 * @param circuit equivalent circuit given instead of identification
 */
public record Motor(
    double voltage,
    double frequency,
    double powerWatts,
    double current,
    double speedRpm,
    OptionalDouble powerFactor,
    OptionalDouble efficiency,
    OptionalDouble serviceFactor,
    OptionalDouble rotorVoltage,
    OptionalDouble rotorCurrent,
    OptionalDouble breakdownTorque,
    OptionalDouble lockedCurrent,
    double inertia,
    OptionalDouble stallColdSeconds,
    OptionalDouble stallHotSeconds,
    OptionalDouble heatingSeconds,
    OptionalDouble coolingSeconds,
    Optional<ShortTime> ringsAtRest,
    Optional<CircuitData> circuit) {

  /**
   * Equivalent circuit, per phase, star equivalent, referred to the stator, at rated frequency.
   *
   * @param r1 stator resistance, Ω
   * @param x1 stator leakage reactance, Ω
   * @param xm magnetizing reactance, Ω
   * @param r2 rotor resistance referred to the stator, Ω
   * @param x2 rotor leakage reactance referred to the stator, Ω
   * @param ratio effective stator to rotor ratio
   */
  public record CircuitData(double r1, double x1, double xm, double r2, double x2, double ratio) {}

  /** Rated shaft torque in N·m: power over rated speed. */
  public double ratedTorque() {
    return powerWatts / (speedRpm * Math.PI / 30.0);
  }

  /**
   * Pole pairs: the most whose synchronous speed still reaches the rated speed; 1 for a rated speed
   * above that of two poles, which no plate can mean.
   */
  public int polePairs() {
    return (int) Math.max(1.0, Math.floor(60.0 * frequency / speedRpm));
  }

  /** Synchronous speed in rad/s at a supply frequency in Hz. */
  public double synchronousSpeed(double supplyFrequency) {
    return 2.0 * Math.PI * supplyFrequency / polePairs();
  }
}
