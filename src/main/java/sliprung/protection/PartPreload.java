package sliprung.protection;

import java.util.List;

/**
 * What the parts went through before a start.
 *
 * @param statorAmps steady stator current before, A; 0: cold
 * @param ringAmps steady ring current before, A; 0: cold
 * @param pauseSeconds at rest between that and the start; the windings cool meanwhile
 * @param sectionLevels level of each section, in their order, 1 at its limit; empty: all cold
 */
public record PartPreload(
    double statorAmps, double ringAmps, double pauseSeconds, List<Double> sectionLevels) {

  /** Nothing before. */
  public static final PartPreload COLD = new PartPreload(0.0, 0.0, 0.0, List.of());

  /** Copies the list. */
  public PartPreload {
    sectionLevels = List.copyOf(sectionLevels);
  }

  /** Level of a section, numbered from 1. */
  double sectionLevel(int number) {
    return number <= sectionLevels.size() ? sectionLevels.get(number - 1) : 0.0;
  }
}
