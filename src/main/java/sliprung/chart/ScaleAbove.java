package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.text.DecimalFormat;

/** A second logarithmic scale above an area, of a quantity proportional to the one below. */
final class ScaleAbove {
  private static final double SLACK = 1e-9;
  private static final int LONG_TICK = 5;
  private static final int SHORT_TICK = 3;
  private static final double LABEL_ROOM = 30.0;

  private ScaleAbove() {}

  /**
   * Draws it.
   *
   * @param frame whose axis across it accompanies
   * @param y of its line
   * @param label with its unit
   * @param perUnit of this quantity for one of the axis below
   */
  static void draw(Graphics2D g, Frame frame, double y, String label, double perUnit) {
    Words words = new Words(g);
    double left = frame.area().getX();
    double right = frame.area().getMaxX();
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(left, y, right, y));
    double from = frame.across().getLowerBound() * perUnit;
    double to = frame.across().getUpperBound() * perUnit;
    DecimalFormat numbers = DecadeAxis.plainNumbers();
    words.plate(label, Ink.SMALL, Ink.TEXT, left, y - 19);
    for (int decade = (int) Math.floor(Math.log10(from)); Math.pow(10, decade) <= to; decade++) {
      for (int m = 1; m <= 9; m++) {
        double value = Double.parseDouble(m + "e" + decade);
        if (value < from * (1.0 - SLACK) || value > to * (1.0 + SLACK)) {
          continue;
        }
        double x = frame.x(value / perUnit);
        g.setColor(Ink.QUIET);
        g.draw(new Line2D.Double(x, y, x, y - (m == 1 ? LONG_TICK : SHORT_TICK)));
        boolean labelled = m == 1 || m == 2 || m == 5;
        if (labelled && x < right - LABEL_ROOM / 2.0) {
          words.centre(numbers.format(value), Ink.FINE, Ink.TEXT, x, y - 7);
        }
      }
    }
  }
}
