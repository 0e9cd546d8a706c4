package sliprung.dial;

import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;
import sliprung.dial.Judgement.Question;
import sliprung.starter.Starter;

/**
 * Settings of all dials together.
 *
 * @param changes dials that are to be turned, in the order of the file; none: today's settings
 *     stand
 * @param proposed the starter so set
 * @param before judgement of today's settings
 * @param after judgement of the proposed settings, every rule at every corner
 * @param moved questions whose verdict or margin moves
 * @param inexact what breaks at an end of a dial's error, one dial at a time, though not broken
 *     today
 * @param evaluations how many settings were judged in full
 */
public record Proposal(
    List<Change> changes,
    Starter proposed,
    Judgement before,
    Judgement after,
    SortedSet<Question> moved,
    SortedSet<Question> inexact,
    int evaluations) {

  /**
   * A dial that is to be turned.
   *
   * @param dial as it is
   * @param to its proposed setting
   */
  public record Change(Dial dial, double to) {}

  /** Copies the collections. */
  public Proposal {
    changes = List.copyOf(changes);
    moved = java.util.Collections.unmodifiableSortedSet(new TreeSet<>(moved));
    inexact = java.util.Collections.unmodifiableSortedSet(new TreeSet<>(inexact));
  }
}
