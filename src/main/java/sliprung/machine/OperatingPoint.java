package sliprung.machine;

/**
 * The steady state at one slip.
 *
 * @param statorAmps line current of the star equivalent, RMS
 * @param ringAmps rotor line current, RMS
 * @param torque air-gap torque, N·m, positive when it drives forwards
 * @param powerFactor at the motor's terminals
 * @param terminalVolts line to line, behind the source reactance
 * @param inputWatts active power into the terminals
 */
public record OperatingPoint(
    double statorAmps,
    double ringAmps,
    double torque,
    double powerFactor,
    double terminalVolts,
    double inputWatts) {}
