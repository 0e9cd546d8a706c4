package sliprung.rulebook.held;

import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import sliprung.rulebook.ComputedStart;

/**
 * Settings of one dial between which good starts pass and failed ones are cleared in time: a
 * greater setting operates later.
 *
 * @param low least setting; the good start that is nearest to it
 * @param lowBy that start; empty: nothing bounds it within the range
 * @param high greatest setting
 * @param highBy the failed start that is nearest to it; empty: nothing bounds it within the range
 */
record SettingWindow(
    double low, Optional<ComputedStart> lowBy, double high, Optional<ComputedStart> highBy) {
  private static final double PRECISION = 1e-3;

  /** A setting that fails somewhere. */
  interface Fails extends DoubleFunction<Optional<ComputedStart>> {}

  /**
   * What came of looking for a window.
   *
   * @param window empty where there is none
   * @param uncleared without a window: a failed start that no setting clears in time
   * @param tripped without a window: a good start that the greatest usable setting trips
   * @param greatest that setting
   */
  record Search(
      Optional<SettingWindow> window,
      Optional<ComputedStart> uncleared,
      Optional<ComputedStart> tripped,
      double greatest) {

    /** The same about something else. */
    <T> Optional<T> map(Function<SettingWindow, T> of) {
      return window.map(of);
    }
  }

  /**
   * Looks for the window.
   *
   * @param from least setting to try, above 0
   * @param to greatest setting to try
   * @param tooLate a failed start not cleared in time at a setting; empty: none
   * @param tooEarly a good start without the wanted margin at a setting; empty: none
   */
  static Search between(double from, double to, Fails tooLate, Fails tooEarly) {
    Optional<ComputedStart> never = tooLate.apply(from);
    if (never.isPresent()) {
      return new Search(Optional.empty(), never, Optional.empty(), from);
    }
    double high = to;
    Optional<ComputedStart> highBy = tooLate.apply(to);
    double good = from;
    while (highBy.isPresent() && high / good > 1.0 + PRECISION) {
      double middle = Math.sqrt(good * high);
      Optional<ComputedStart> fails = tooLate.apply(middle);
      if (fails.isPresent()) {
        high = middle;
        highBy = fails;
      } else {
        good = middle;
      }
    }
    double greatest = highBy.isPresent() ? good : to;
    Optional<ComputedStart> early = tooEarly.apply(greatest);
    if (early.isPresent()) {
      return new Search(Optional.empty(), Optional.empty(), early, greatest);
    }
    Optional<ComputedStart> lowBy = tooEarly.apply(from);
    double least = greatest;
    double bad = from;
    while (lowBy.isPresent() && least / bad > 1.0 + PRECISION) {
      double middle = Math.sqrt(bad * least);
      Optional<ComputedStart> fails = tooEarly.apply(middle);
      if (fails.isPresent()) {
        bad = middle;
        lowBy = fails;
      } else {
        least = middle;
      }
    }
    return new Search(
        Optional.of(new SettingWindow(lowBy.isPresent() ? least : from, lowBy, greatest, highBy)),
        Optional.empty(),
        Optional.empty(),
        greatest);
  }
}
