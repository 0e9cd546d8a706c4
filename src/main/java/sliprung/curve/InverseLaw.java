package sliprung.curve;

import java.util.OptionalDouble;

/**
 * An inverse-time law {@code t = TM · (k/(M^α − 1) + c)} with M the current over the pick-up.
 *
 * @param name the name used in a starter file, such as {@code iec-very-inverse}
 * @param title the law's name in words
 * @param k seconds
 * @param alpha exponent, above 0
 * @param c seconds, 0 or more
 * @param resetSeconds time of a full reset at no current and TM = 1 where the standard gives one
 * @param reference standard and table
 * @param mark {@code verified} or {@code from memory}
 */
public record InverseLaw(
    String name,
    String title,
    double k,
    double alpha,
    double c,
    OptionalDouble resetSeconds,
    String reference,
    String mark) {

  /** Multiple of the pick-up above which the time no longer falls (customary end of the curves). */
  public static final double LAST_MULTIPLE = 20.0;

  /**
   * Operating time in seconds at a constant current.
   *
   * @param multiple current over pick-up, 0 or more
   * @param timeMultiplier TMS or time dial, above 0
   * @return seconds, infinite at or below the pick-up
   */
  public double seconds(double multiple, double timeMultiplier) {
    if (multiple <= 1.0) {
      return Double.POSITIVE_INFINITY;
    }
    double m = Math.min(multiple, LAST_MULTIPLE);
    return timeMultiplier * (k / (Math.pow(m, alpha) - 1.0) + c);
  }

  /**
   * Time in seconds of a full reset at a constant current below the pick-up, {@code TM · tr/(1 −
   * M²)} (IEEE C37.112, reset form from memory).
   *
   * @param multiple current over pick-up, from 0 to below 1
   * @param timeMultiplier TMS or time dial, above 0
   * @return seconds, or empty where the law has no standard reset
   */
  public OptionalDouble fullResetSeconds(double multiple, double timeMultiplier) {
    if (resetSeconds.isEmpty() || multiple >= 1.0) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(
        timeMultiplier * resetSeconds.getAsDouble() / (1.0 - multiple * multiple));
  }
}
