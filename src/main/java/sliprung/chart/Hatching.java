package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** Slanted lines over a rectangle: forbidden ground, told apart without a hue. */
final class Hatching {
  private static final double SPACING = 7.0;

  private Hatching() {}

  /** Draws one path of lines rising to the right, cut at the rectangle's edges. */
  static void over(Graphics2D surface, Rectangle2D r) {
    if (r.getWidth() <= 0 || r.getHeight() <= 0) {
      return;
    }
    Path2D lines = new Path2D.Double();
    double reach = r.getWidth() + r.getHeight();
    for (double offset = SPACING; offset < reach; offset += SPACING) {
      // along a line x + y is constant: offset from the upper left corner
      double x1 = Math.min(offset, r.getWidth());
      double y1 = offset - x1;
      double y2 = Math.min(offset, r.getHeight());
      double x2 = offset - y2;
      lines.moveTo(r.getX() + x1, r.getY() + y1);
      lines.lineTo(r.getX() + x2, r.getY() + y2);
    }
    surface.setStroke(Ink.EDGE);
    surface.draw(lines);
  }
}
