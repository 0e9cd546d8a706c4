package sliprung.chart;

import java.awt.Shape;
import java.awt.geom.PathIterator;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Finds places for labels: never on another label, and on as few lines as can be. */
final class FreeSpace {
  private static final double SAMPLE = 4.0;
  private static final double COLUMN = 16.0;
  private static final double PAD = 3.0;
  private static final int RINGS = 14;
  private static final double RING_STEP = 14.0;
  private static final double FAR_COST = 0.4;
  private final Rectangle2D area;
  private final List<Rectangle2D> taken = new ArrayList<>();

  /** Ink by columns of the area, so that a box looks only at what can lie in it. */
  private final Map<Integer, List<Point2D>> inked = new HashMap<>();

  /** Free space inside an area. */
  FreeSpace(Rectangle2D area) {
    this.area = area;
  }

  /** A line that labels should rather not cover. */
  void avoid(Shape line) {
    double[] at = new double[6];
    double x = 0.0;
    double y = 0.0;
    for (PathIterator i = line.getPathIterator(null, 1.0); !i.isDone(); i.next()) {
      if (i.currentSegment(at) == PathIterator.SEG_LINETO) {
        double length = Math.min(5000.0, Math.hypot(at[0] - x, at[1] - y));
        for (double d = 0.0; d < length; d += SAMPLE) {
          double w = d / length;
          Point2D point = new Point2D.Double(x + w * (at[0] - x), y + w * (at[1] - y));
          if (area.contains(point)) {
            inked.computeIfAbsent(column(point.getX()), k -> new ArrayList<>()).add(point);
          }
        }
      }
      x = at[0];
      y = at[1];
    }
  }

  /** A place that nothing else may cover. */
  void take(Rectangle2D place) {
    taken.add(place);
  }

  /**
   * Takes the best of some places for a box.
   *
   * @param width of the box, px
   * @param height likewise
   * @param wanted upper left corners, the most wanted first; if none of them is free, places around
   *     the first
   * @return the upper left corner; empty where every place would cover another label
   */
  Optional<Point2D> place(double width, double height, List<Point2D> wanted) {
    Optional<Rectangle2D> best = best(width, height, wanted);
    if (best.isEmpty() && !wanted.isEmpty()) {
      best = best(width, height, around(wanted.get(0)));
    }
    best.ifPresent(taken::add);
    return best.map(box -> new Point2D.Double(box.getX(), box.getY()));
  }

  private static List<Point2D> around(Point2D middle) {
    List<Point2D> places = new ArrayList<>();
    for (int ring = 1; ring <= RINGS; ring++) {
      for (int k = 0; k < 8; k++) {
        double angle = k * Math.PI / 4.0;
        places.add(
            new Point2D.Double(
                middle.getX() + ring * RING_STEP * Math.cos(angle),
                middle.getY() + ring * RING_STEP * Math.sin(angle)));
      }
    }
    return places;
  }

  private Optional<Rectangle2D> best(double width, double height, List<Point2D> places) {
    Rectangle2D best = null;
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < places.size(); i++) {
      Rectangle2D box =
          new Rectangle2D.Double(places.get(i).getX(), places.get(i).getY(), width, height);
      if (FAR_COST * i >= least) {
        break;
      }
      double cost = cost(box) + FAR_COST * i;
      if (cost < least) {
        least = cost;
        best = box;
      }
    }
    return Optional.ofNullable(best);
  }

  private double cost(Rectangle2D box) {
    Rectangle2D padded =
        new Rectangle2D.Double(
            box.getX() - PAD, box.getY() - 1, box.getWidth() + 2 * PAD, box.getHeight() + 2);
    if (!area.contains(box)) {
      return Double.POSITIVE_INFINITY;
    }
    for (Rectangle2D other : taken) {
      if (padded.intersects(other)) {
        return Double.POSITIVE_INFINITY;
      }
    }
    int covered = 0;
    for (int c = column(padded.getX()); c <= column(padded.getMaxX()); c++) {
      for (Point2D point : inked.getOrDefault(c, List.of())) {
        covered += padded.contains(point) ? 1 : 0;
      }
    }
    return covered;
  }

  private static int column(double x) {
    return (int) Math.floor(x / COLUMN);
  }
}
