package sliprung.runup;

import java.util.List;
import java.util.Optional;
import sliprung.machine.OperatingPoint;

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
 * @param entry the steady state just after the closing, at the speed it met: RMS figures with their
 *     power factor, also where the samples follow the transient
 * @param peak of the closing that began it; empty where the transient was not computed
 */
public record Stage(
    int step,
    List<Integer> sectionsIn,
    double externalOhms,
    double fromSeconds,
    double toSeconds,
    boolean settled,
    String closedBy,
    Trace trace,
    OperatingPoint entry,
    Optional<ClosingPeak> peak) {

  /** A stage of a steady computation: its first sample is its entry. */
  public Stage(
      int step,
      List<Integer> sectionsIn,
      double externalOhms,
      double fromSeconds,
      double toSeconds,
      boolean settled,
      String closedBy,
      Trace trace) {
    this(
        step,
        sectionsIn,
        externalOhms,
        fromSeconds,
        toSeconds,
        settled,
        closedBy,
        trace,
        firstSample(trace),
        Optional.empty());
  }

  private static OperatingPoint firstSample(Trace t) {
    double apparent = Math.sqrt(3.0) * t.terminalVolts()[0] * t.statorAmps()[0];
    return new OperatingPoint(
        t.statorAmps()[0],
        t.ringAmps()[0],
        t.torque()[0],
        apparent == 0.0 ? 0.0 : t.inputWatts()[0] / apparent,
        t.terminalVolts()[0],
        t.inputWatts()[0]);
  }

  /** This stage with the peak of its closing. */
  Stage with(Optional<ClosingPeak> found) {
    return new Stage(
        step,
        sectionsIn,
        externalOhms,
        fromSeconds,
        toSeconds,
        settled,
        closedBy,
        trace,
        entry,
        found);
  }

  /** Copies the list. */
  public Stage {
    sectionsIn = List.copyOf(sectionsIn);
  }

  /** Whether anything of the bank is in circuit. */
  public boolean bankIn() {
    return !sectionsIn.isEmpty();
  }
}
