package sliprung.starter;

import java.util.List;
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
 * @param pastStartsSeconds how long ago the line was opened after each of some starts, the motor
 *     hot from running before the first and at rest ever since; empty: no such list
 */
public record Duty(
    int coldStarts,
    int hotStarts,
    OptionalDouble startsPerHour,
    double restartAfterSeconds,
    Optional<Repeated> inching,
    Optional<Repeated> plugging,
    List<Double> pastStartsSeconds) {

  /** Copies the list. */
  public Duty {
    pastStartsSeconds = List.copyOf(pastStartsSeconds);
  }

  /** A duty without a list of past starts. */
  public Duty(
      int coldStarts,
      int hotStarts,
      OptionalDouble startsPerHour,
      double restartAfterSeconds,
      Optional<Repeated> inching,
      Optional<Repeated> plugging) {
    this(coldStarts, hotStarts, startsPerHour, restartAfterSeconds, inching, plugging, List.of());
  }

  /**
   * An operation that repeats.
   *
   * @param perHour how often
   * @param step on which it is done, from 1
   */
  public record Repeated(double perHour, int step) {}
}
