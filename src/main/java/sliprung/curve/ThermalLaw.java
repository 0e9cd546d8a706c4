package sliprung.curve;

/**
 * Closed forms of one body with one time constant, {@code τ dθ/dt + θ = (I/I_ref)²}, which operates
 * at θ = 1 (IEC 60255-149: cold and hot characteristic).
 */
public final class ThermalLaw {
  private ThermalLaw() {}

  /**
   * Operating time at a constant current, {@code τ ln[(I² − I_p²)/(I² − I_ref²)]}.
   *
   * @param tau time constant, s, above 0
   * @param amps the constant current
   * @param reference current that just operates it, in the same unit, above 0
   * @param earlier steady load before, in the same unit; 0: from cold
   * @return seconds; 0 where the earlier load had operated it, infinite where the current never
   *     will
   */
  public static double seconds(double tau, double amps, double reference, double earlier) {
    if (earlier >= reference) {
      return 0.0;
    }
    if (amps <= reference) {
      return Double.POSITIVE_INFINITY;
    }
    double i = amps * amps;
    return tau * Math.log((i - earlier * earlier) / (i - reference * reference));
  }

  /**
   * The time constant of a body that operates in a given time from cold, {@code t/ln[m²/(m² −
   * p²)]}.
   *
   * @param seconds operating time, above 0
   * @param multiple current, above {@code pickUp}
   * @param pickUp current that just operates it, in the same unit
   */
  public static double timeConstant(double seconds, double multiple, double pickUp) {
    return timeConstant(seconds, multiple, pickUp, 0.0);
  }

  /**
   * Likewise after a steady earlier load.
   *
   * @param earlier load before, in the same unit, below {@code pickUp}
   */
  public static double timeConstant(
      double seconds, double multiple, double pickUp, double earlier) {
    double m = multiple * multiple;
    return seconds / Math.log((m - earlier * earlier) / (m - pickUp * pickUp));
  }
}
