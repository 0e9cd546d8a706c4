package sliprung.dial;

import java.util.Optional;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;

/**
 * A range of a dial in which no rule is broken that the dial can move.
 *
 * @param low least value found unbroken
 * @param high greatest value found unbroken
 * @param below what bounds it below
 * @param above what bounds it above
 */
public record Window(double low, double high, Bound below, Bound above) {

  /**
   * What bounds a window.
   *
   * @param outside value just beyond it that was found broken; the end of the range where nothing
   *     is
   * @param breaks the question that breaks there; empty at the end of the range that was looked at
   * @param answer to it there; empty where it is not answered any more
   */
  public record Bound(double outside, Optional<Question> breaks, Optional<Answer> answer) {

    /** The end of the range that was looked at. */
    static Bound ofRange(double end) {
      return new Bound(end, Optional.empty(), Optional.empty());
    }
  }

  /** Whether a value lies inside, ends included. */
  public boolean contains(double value) {
    return value >= low && value <= high;
  }
}
