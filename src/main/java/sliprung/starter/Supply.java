package sliprung.starter;

import java.util.OptionalDouble;

/**
 * The source.
 *
 * @param voltage rated line-to-line voltage, V
 * @param frequency Hz
 * @param bandLow lowest voltage before the motor starts, per unit of rated minus one (such as
 *     −0.10)
 * @param bandHigh highest, likewise (such as +0.10)
 * @param faultMaxAmps greatest three-phase fault current at the starter, A
 * @param faultMinAmps least three-phase fault current at the starter, A; gives the source impedance
 */
public record Supply(
    double voltage,
    double frequency,
    double bandLow,
    double bandHigh,
    OptionalDouble faultMaxAmps,
    OptionalDouble faultMinAmps) {}
