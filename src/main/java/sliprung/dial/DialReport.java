package sliprung.dial;

import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import sliprung.dial.Judgement.Question;

/**
 * How far a dial may be turned, the others as they are.
 *
 * @param dial what is turned
 * @param windows rising; more than one where there are holes, none where every value breaks
 * @param apart breaches of today that this dial cannot move, which were not counted
 * @param recommended setting of the real dial: its true value stays inside over the dial's error
 * @param noneBecause why nothing is recommended; empty where something is
 * @param best where there is no window: the value that breaks least
 * @param left where there is no window: what is broken at the best value
 * @param noFurther where there is no window: ranges that add no breach to today's
 * @param pair where there is no window: another dial that must move as well, if one was found
 * @param looked values of this dial that were judged
 */
public record DialReport(
    Dial dial,
    List<Window> windows,
    SortedSet<Question> apart,
    Optional<Double> recommended,
    String noneBecause,
    Optional<Double> best,
    SortedSet<Question> left,
    List<Window> noFurther,
    Optional<Pair> pair,
    int looked) {

  /** Copies the collections. */
  public DialReport {
    windows = List.copyOf(windows);
    apart = java.util.Collections.unmodifiableSortedSet(new TreeSet<>(apart));
    left = java.util.Collections.unmodifiableSortedSet(new TreeSet<>(left));
    noFurther = List.copyOf(noFurther);
  }

  /**
   * Two dials that mend together what one alone cannot.
   *
   * @param other the second dial
   * @param value to which it must be set; today's dial alone then has the window
   * @param window of the first dial with the second so set
   */
  public record Pair(Dial other, double value, Window window) {}

  /** Whether today's value lies in a window. */
  public boolean isSetInside() {
    return windows.stream().anyMatch(w -> w.contains(dial.value()));
  }

  DialReport with(Pair found, int lookedInAll) {
    return new DialReport(
        dial,
        windows,
        apart,
        recommended,
        noneBecause,
        best,
        left,
        noFurther,
        Optional.of(found),
        lookedInAll);
  }
}
