package sliprung.curve;

import java.util.List;

/**
 * One edge of a curve given as points: log-log between them, nothing outside them.
 *
 * <p>Below the first point two things are still known. If the first two points stand at one current
 * the edge begins vertically there and a smaller current never operates the device. Otherwise a
 * smaller current takes at least as long as the first point's.
 */
public final class PointEdge {
  private final List<PointCurve.Point> points;

  /**
   * An edge.
   *
   * @param points two or more, by rising current and falling time
   */
  public PointEdge(List<PointCurve.Point> points) {
    if (points.size() < 2) {
      throw new IllegalArgumentException("a curve has two points or more");
    }
    this.points = List.copyOf(points);
  }

  /** Least current of the points, A. */
  public double firstAmps() {
    return points.get(0).amps();
  }

  /** Longest time of the points, s. */
  public double firstSeconds() {
    return points.get(0).seconds();
  }

  /** Greatest current of the points, A. */
  public double lastAmps() {
    return points.get(points.size() - 1).amps();
  }

  /** Whether it begins with a vertical line: no operation below it. */
  public boolean beginsVertically() {
    return points.get(1).amps() <= firstAmps();
  }

  /** Every current of the points, A. */
  public double[] breaks() {
    return points.stream().mapToDouble(PointCurve.Point::amps).toArray();
  }

  /**
   * Operating time in s at a constant current from cold.
   *
   * @param amps from {@link #firstAmps()} to {@link #lastAmps()}
   * @return seconds; NaN outside the points
   */
  public double seconds(double amps) {
    if (amps < firstAmps() || amps > lastAmps()) {
      return Double.NaN;
    }
    for (int k = 1; k < points.size(); k++) {
      PointCurve.Point from = points.get(k - 1);
      PointCurve.Point to = points.get(k);
      if (amps < to.amps()) {
        return LogLog.at(from.amps(), from.seconds(), to.amps(), to.seconds(), amps);
      }
    }
    return points.get(points.size() - 1).seconds();
  }
}
