package sliprung.starter;

/**
 * A short-time rating: that current for that time from cold.
 *
 * @param amps RMS amperes, above 0
 * @param seconds above 0
 */
public record ShortTime(double amps, double seconds) {

  /** Its Joule integral, A²s. */
  public double jouleIntegral() {
    return amps * amps * seconds;
  }
}
