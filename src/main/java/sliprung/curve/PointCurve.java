package sliprung.curve;

import java.util.List;

/**
 * A device's own curve as points, both edges, in RMS amperes and seconds, by rising current.
 *
 * @param name file or title shown to the user
 * @param fast earliest operation; never above the slow edge
 * @param slow latest operation
 * @param reference where the points come from, as the file says
 */
public record PointCurve(String name, List<Point> fast, List<Point> slow, String reference) {

  /**
   * One point of an edge.
   *
   * @param amps RMS amperes, above 0
   * @param seconds above 0
   */
  public record Point(double amps, double seconds) {}

  /** Copies the lists. */
  public PointCurve {
    fast = List.copyOf(fast);
    slow = List.copyOf(slow);
  }
}
