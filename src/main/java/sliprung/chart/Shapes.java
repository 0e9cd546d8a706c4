package sliprung.chart;

import java.awt.geom.Path2D;

/** Lines and areas from series on a frame. */
final class Shapes {
  private Shapes() {}

  /** Points nearer than this to the last one drawn are left out: nobody sees them, px. */
  private static final double UNSEEN = 0.4;

  /** A line through the points; points that are not finite break it. */
  static Path2D line(Frame frame, double[] across, double[] up) {
    Path2D path = new Path2D.Double();
    boolean open = false;
    double lastX = 0.0;
    double lastY = 0.0;
    for (int i = 0; i < across.length; i++) {
      double x = frame.x(across[i]);
      double y = frame.y(up[i]);
      if (!Double.isFinite(x) || !Double.isFinite(y)) {
        open = false;
      } else if (!open) {
        path.moveTo(x, y);
        open = true;
        lastX = x;
        lastY = y;
      } else if (i == across.length - 1 || Math.hypot(x - lastX, y - lastY) >= UNSEEN) {
        path.lineTo(x, y);
        lastX = x;
        lastY = y;
      }
    }
    return path;
  }

  /** The area between two lines over the same abscissae. */
  static Path2D between(Frame frame, double[] across, double[] low, double[] high) {
    Path2D path = new Path2D.Double();
    for (int i = 0; i < across.length; i++) {
      double x = frame.x(across[i]);
      if (i == 0) {
        path.moveTo(x, frame.y(low[i]));
      } else {
        path.lineTo(x, frame.y(low[i]));
      }
    }
    for (int i = across.length - 1; i >= 0; i--) {
      path.lineTo(frame.x(across[i]), frame.y(high[i]));
    }
    path.closePath();
    return path;
  }
}
