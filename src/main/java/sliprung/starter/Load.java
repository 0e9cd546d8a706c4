package sliprung.starter;

import java.util.OptionalDouble;

/**
 * The driven machine, already at the motor shaft.
 *
 * @param inertia kg·m²
 * @param breakawayTorque N·m at rest; empty: the torque curve's value at rest
 * @param torque while starting
 * @param runningShare running torque over rated shaft torque, per unit
 * @param spreadLow least of starting, running and breakaway torque, per unit minus one (such as
 *     −0.20)
 * @param spreadHigh greatest, likewise
 * @param active a hanging load: drives backwards when the motor's torque is too small
 * @param brakeSeconds brake release after line closing, s; 0 without a brake
 */
public record Load(
    double inertia,
    OptionalDouble breakawayTorque,
    TorqueCurve torque,
    double runningShare,
    double spreadLow,
    double spreadHigh,
    boolean active,
    double brakeSeconds) {}
