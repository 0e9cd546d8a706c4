package sliprung.curve;

import java.util.List;

/**
 * Gates of aM fuse-links, one set for all ratings (IEC 60269-1 table 4).
 *
 * @param notBefore no melting before that time at that multiple of the rating
 * @param cleared melted and cleared by that time at that multiple of the rating
 * @param leastBreakingMultiple multiple below which the fuse must not be relied on to break
 * @param reference standard and table
 * @param mark {@code verified} or {@code from memory}
 */
public record AmGates(
    List<Gate> notBefore,
    List<Gate> cleared,
    double leastBreakingMultiple,
    String reference,
    String mark) {

  /**
   * One gate.
   *
   * @param multiple of the rated current
   * @param seconds time
   */
  public record Gate(double multiple, double seconds) {}

  /** Copies the lists. */
  public AmGates {
    notBefore = List.copyOf(notBefore);
    cleared = List.copyOf(cleared);
  }
}
