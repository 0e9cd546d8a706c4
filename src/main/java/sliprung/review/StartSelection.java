package sliprung.review;

import java.util.List;
import java.util.Set;
import sliprung.runup.Scenario;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/**
 * Some starts out of a review, for questions that need not compute them all. Permitted starts are
 * always among them: what comes after rests on their heat.
 *
 * @param corners the nominal one among them
 * @param faults which failed starts
 * @param method how they are computed
 * @param withTransient whether the transient's peaks are computed too; without them those of the
 *     steady circuit stand for them
 */
public record StartSelection(
    List<Corner> corners, Set<Scenario> faults, Starter.Method method, boolean withTransient) {

  /** Copies the collections and checks that there is a nominal corner. */
  public StartSelection {
    corners = List.copyOf(corners);
    faults = Set.copyOf(faults);
    if (!corners.contains(Corner.NOMINAL)) {
      throw new IllegalArgumentException("no nominal corner");
    }
    if (!withTransient && method != Starter.Method.STEADY) {
      throw new IllegalArgumentException("without the transient only the steady method is left");
    }
  }
}
