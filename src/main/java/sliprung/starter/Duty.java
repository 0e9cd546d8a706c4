package sliprung.starter;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What the starter is used for.
 *
 * @param coldStarts permitted in a row from cold
 * @param hotStarts permitted in a row from running hot
 * @param startsPerHour permitted
 * @param restartAfterSeconds pause before a hot restart
 * @param inching if any
 * @param plugging if any
 */
public record Duty(
    int coldStarts,
    int hotStarts,
    OptionalDouble startsPerHour,
    double restartAfterSeconds,
    Optional<Repeated> inching,
    Optional<Repeated> plugging) {

  /**
   * An operation that repeats.
   *
   * @param perHour how often
   * @param step on which it is done, from 1
   */
  public record Repeated(double perHour, int step) {}
}
