package sliprung.protection;

import java.util.List;
import sliprung.runup.StartHistory;

/**
 * What devices and parts make of one history, whatever was before it. Ask the same one for every
 * preload: its currents are taken out of the history once. Not for several threads at a time.
 */
public final class StartProtection {
  private final ProtectionEvaluator evaluator;
  private final Currents currents;

  StartProtection(ProtectionEvaluator evaluator, Currents currents) {
    this.evaluator = evaluator;
    this.currents = currents;
  }

  /** The history asked about. */
  public StartHistory history() {
    return currents.history();
  }

  /**
   * Every device at every edge, in the file's order, over the last of some starts in a row. Margins
   * come with the fast edge of a permitted start: their factor applies to every start of the row,
   * never to the preload nor to the running after the last.
   *
   * @param preload before the first
   * @param starts 1 or more
   */
  public List<DeviceResponse> devices(DevicePreload preload, int starts) {
    return evaluator.devices(new Starts(currents, starts, preload));
  }

  /**
   * Every part over the last of some starts in a row: sections, windings, rings, conductors, then
   * contactors in the file's order.
   *
   * @param preload before the first
   * @param starts 1 or more
   */
  public List<PartResponse> parts(PartPreload preload, int starts) {
    return evaluator.parts(currents, preload, starts);
  }

  /**
   * Level of every section at the end of some starts in a row, to be carried into a {@link
   * PartPreload}; 0 for a section whose data are missing.
   *
   * @param preload before the first
   * @param starts 1 or more
   */
  public List<Double> sectionLevelsAfter(PartPreload preload, int starts) {
    return evaluator.sectionLevelsAfter(currents, preload, starts);
  }
}
