package sliprung.curve;

/**
 * The time constants with which relays at the limits of a trip class pass what the standard pins of
 * it. IEC 60947-4-1 pins the ultimate trip current, one warm and one cold trip time and nothing in
 * between, so that a class is a set of relays; these are its quickest and slowest members.
 */
public final class TripClassBounds {
  /** Multiple of the warm trip limit (IEC 60947-4-1, table 3, from memory). */
  public static final double WARM_MULTIPLE = 1.5;

  /** Up to this multiple the warm limit says how slow a relay may be. */
  private static final double WARM_UP_TO = 3.0;

  private TripClassBounds() {}

  /** Lag in s of a heater ahead of its strip: 3 s, or half the cold trip time if that is less. */
  public static double heaterLag(double coldTripSeconds) {
    return Math.min(3.0, coldTripSeconds / 2.0);
  }

  /**
   * Time constant of a strip behind a lagging heater that together trip in a given time from cold.
   *
   * @param coldTripSeconds at {@code multiple}, above 0
   * @param multiple of the setting
   * @param pickUp ultimate trip current as multiple of the setting
   * @param heaterLag s, at most half of {@code coldTripSeconds}
   * @return seconds
   */
  public static double stripTimeConstant(
      double coldTripSeconds, double multiple, double pickUp, double heaterLag) {
    double end = (multiple / pickUp) * (multiple / pickUp);
    // A slower strip is less warm at the trip time: one crossing. The one-body constant is an upper
    // bound, since the heater only delays.
    double high = ThermalLaw.timeConstant(coldTripSeconds, multiple, pickUp);
    double low = high * 1e-6;
    for (int i = 0; i < 100; i++) {
      double tau = 0.5 * (low + high);
      if (end * stripShare(coldTripSeconds, tau, heaterLag) > 1.0) {
        low = tau;
      } else {
        high = tau;
      }
    }
    return 0.5 * (low + high);
  }

  /** Share of its end temperature that a strip has reached t seconds after a step of current. */
  private static double stripShare(double t, double strip, double heater) {
    double s = Math.abs(strip - heater) < 1e-9 * heater ? strip * (1.0 + 1e-6) : strip;
    return 1.0 - (s * Math.exp(-t / s) - heater * Math.exp(-t / heater)) / (s - heater);
  }

  /**
   * Time constant in s of the slowest compliant relay at a multiple of its setting: the warm limit
   * decides up to 3 times the setting, the longest cold trip time from the class's multiple on, in
   * between the logarithm of the time constant is linear in the logarithm of the multiple. Where
   * the class has no warm limit (NEMA) the cold trip time decides throughout.
   *
   * @param tripClass set of relays
   * @param pickUp greatest ultimate trip current, as multiple of the setting
   * @param multiple current as multiple of the setting
   */
  public static double slowTimeConstant(TripClass tripClass, double pickUp, double multiple) {
    double cold = ThermalLaw.timeConstant(tripClass.longestSeconds(), tripClass.multiple(), pickUp);
    if (tripClass.warmLimitSeconds().isEmpty() || multiple >= tripClass.multiple()) {
      return cold;
    }
    double warm =
        ThermalLaw.timeConstant(
            tripClass.warmLimitSeconds().getAsDouble(), WARM_MULTIPLE, pickUp, 1.0);
    return multiple <= WARM_UP_TO
        ? warm
        : LogLog.at(WARM_UP_TO, warm, tripClass.multiple(), cold, multiple);
  }
}
