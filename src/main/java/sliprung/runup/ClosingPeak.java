package sliprung.runup;

/**
 * The greatest instantaneous values after a closing, up to the next: of the space vectors of the
 * currents (so of a phase, at the worst instant of closing) and of the torque.
 *
 * @param statorAmps peak, line current
 * @param statorAtSeconds when, from line closing
 * @param ringAmps peak, ring current
 * @param torque greatest air-gap torque, N·m
 * @param torqueAtSeconds when
 * @param leastTorque least air-gap torque, N·m; negative where it swings back
 * @param statorRms greatest RMS of the fundamental over one supply period, A: what an element sees
 *     that filters the offset
 * @param ringRms likewise of the ring current, A
 */
public record ClosingPeak(
    double statorAmps,
    double statorAtSeconds,
    double ringAmps,
    double torque,
    double torqueAtSeconds,
    double leastTorque,
    double statorRms,
    double ringRms) {}
