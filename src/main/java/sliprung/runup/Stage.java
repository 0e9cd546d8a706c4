package sliprung.runup;

import java.util.List;

/**
 * The time a start spends on one step.
 *
 * @param step from 1; number of sections and one more: rings shorted
 * @param sectionsIn numbers, from 1, of the sections still in circuit
 * @param externalOhms outside the rotor winding, actual ohms per phase (star)
 * @param fromSeconds from line closing
 * @param toSeconds next closing, or the end of the history
 * @param settled the speed settled before the stage ended
 * @param closedBy tag of the contactor whose closing began it; the line contactor's for the first
 * @param trace samples from first to last; a settled speed is held to the end
 */
public record Stage(
    int step,
    List<Integer> sectionsIn,
    double externalOhms,
    double fromSeconds,
    double toSeconds,
    boolean settled,
    String closedBy,
    Trace trace) {

  /** Copies the list. */
  public Stage {
    sectionsIn = List.copyOf(sectionsIn);
  }

  /** Whether anything of the bank is in circuit. */
  public boolean bankIn() {
    return !sectionsIn.isEmpty();
  }
}
