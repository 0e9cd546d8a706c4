package sliprung.rulebook.resistor;

import java.util.Locale;
import sliprung.rulebook.ComputedStart;

/**
 * When the motor may be started again after something.
 *
 * @param after what ended the run or start before
 * @param seconds from the opening of the line, after past starts from now; infinite where no pause
 *     is enough
 * @param limitedBy device tag or part that decides; empty where nothing asks for a pause
 * @param pastLimit it had passed its limit: inspect it first, whatever the pause
 * @param start the start that was ended, at the corner that decides
 */
public record Restart(
    After after, double seconds, String limitedBy, boolean pastLimit, ComputedStart start) {

  /** What ended the run or start before. */
  public enum After {
    /** A stop from running at load. */
    STOP("a stop"),
    /** A trip at the end of the longest permitted series, from hot. */
    TRIP("a trip"),
    /** A held step, when it is cleared. */
    HELD("a held start"),
    /** A rotor that does not turn, when it is cleared. */
    LOCKED("a locked start"),
    /** The starts listed as past, hot from running before the first; counted from now. */
    PAST("the past starts listed");

    private final String words;

    After(String words) {
      this.words = words;
    }

    /** In words. */
    public String words() {
      return words;
    }

    /** As subject of a finding, such as {@code after a stop}. */
    public String subject() {
      return "after " + words;
    }

    /** As written in records. */
    public String word() {
      return name().toLowerCase(Locale.ROOT);
    }
  }
}
