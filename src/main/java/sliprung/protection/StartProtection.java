package sliprung.protection;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
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

  Currents currents() {
    return currents;
  }

  /** The history asked about. */
  public StartHistory history() {
    return currents.history();
  }

  /**
   * Every device at one edge, in the file's order, over the last of some starts in a row. Margins
   * come with the fast edge of a permitted start: their factor applies to every start of the row,
   * never to the preload nor to the running after the last.
   *
   * @param edge which relay of each set
   * @param preload before the first
   * @param starts 1 or more
   */
  public List<DeviceResponse> devices(Edge edge, DevicePreload preload, int starts) {
    return evaluator.devices(edge, new Starts(currents, starts, preload));
  }

  /** Every device at every edge; otherwise as with one. */
  public List<DeviceResponse> devices(DevicePreload preload, int starts) {
    return evaluator.devices(new Starts(currents, starts, preload));
  }

  /**
   * Use of one device over the last of some starts in a row and the running after it.
   *
   * @param device tag
   * @param edge which relay of its set
   * @param preload before the first
   * @param starts 1 or more
   * @return empty where that edge cannot be computed
   */
  public Optional<LevelOverTime> useOverTime(
      String device, Edge edge, DevicePreload preload, int starts) {
    return evaluator.model(device, edge).useOverTime(new Starts(currents, starts, preload));
  }

  /**
   * When the quantity that a device measures last rose to its pick-up and stayed there until a
   * time, s from line closing.
   *
   * @param device tag
   * @param edge which relay of its set
   * @param beforeSeconds such as when it operates
   * @return empty for a device without a pick-up, or one that was below it
   */
  public OptionalDouble pickedUpSeconds(String device, Edge edge, double beforeSeconds) {
    return evaluator.model(device, edge).pickedUpSeconds(currents, beforeSeconds);
  }

  /**
   * Level of one part, 1 at its limit, over all of some starts in a row and the running after the
   * last; seconds count from the first line closing.
   *
   * @param part as in {@link PartResponse}
   * @param preload before the first
   * @param starts 1 or more
   * @return empty where its data are missing
   */
  public Optional<LevelOverTime> levelOverTime(String part, PartPreload preload, int starts) {
    return evaluator.part(part).levelOverTime(currents, preload, starts);
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

  /** Some of the parts, by name; otherwise as all of them. */
  public List<PartResponse> parts(PartPreload preload, int starts, Predicate<String> which) {
    return evaluator.parts(currents, preload, starts, which);
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
