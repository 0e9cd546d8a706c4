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
    double ringRms) {

  /** Greatest torque either way, N·m. */
  public double greatestTorque() {
    return Math.max(torque, -leastTorque);
  }

  /** The greater of each value, with its own instant. */
  ClosingPeak or(ClosingPeak other) {
    boolean current = other.statorAmps > statorAmps;
    boolean twist = other.torque > torque;
    return new ClosingPeak(
        current ? other.statorAmps : statorAmps,
        current ? other.statorAtSeconds : statorAtSeconds,
        Math.max(ringAmps, other.ringAmps),
        twist ? other.torque : torque,
        twist ? other.torqueAtSeconds : torqueAtSeconds,
        Math.min(leastTorque, other.leastTorque),
        Math.max(statorRms, other.statorRms),
        Math.max(ringRms, other.ringRms));
  }

  /** Every value times a factor: what a search among samples may have missed. */
  ClosingPeak raised(double factor) {
    return new ClosingPeak(
        factor * statorAmps,
        statorAtSeconds,
        factor * ringAmps,
        factor * torque,
        torqueAtSeconds,
        factor * leastTorque,
        factor * statorRms,
        factor * ringRms);
  }

  /** With a torque of the steady circuit in it. */
  ClosingPeak orTorque(double newtonMetres, double atSeconds) {
    boolean twist = newtonMetres > torque;
    return new ClosingPeak(
        statorAmps,
        statorAtSeconds,
        ringAmps,
        twist ? newtonMetres : torque,
        twist ? atSeconds : torqueAtSeconds,
        leastTorque,
        statorRms,
        ringRms);
  }
}
