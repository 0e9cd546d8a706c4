package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;

/**
 * Tells a surface that can carry it what is being painted: axes, so that a place can be read back
 * as a value, and series, so that one can be lifted out. Other surfaces are painted just the same.
 */
final class Marks {
  private Marks() {}

  /** A surface that carries marks. */
  interface Marked {
    /** Axes that the lines from here on belong to, as JSON. */
    void frame(String json);

    /**
     * What is painted from here on.
     *
     * @param series empty: nothing of a series
     * @param line name of a line of it
     */
    void series(String series, String line);
  }

  /**
   * Lines from here on belong to these axes.
   *
   * @param across what goes across, in a word
   * @param acrossUnit its unit
   * @param upUnit unit of what goes up; empty for a share
   */
  static void frame(
      Graphics2D surface, Frame frame, String across, String acrossUnit, String upUnit) {
    if (surface instanceof Marked marked) {
      Rectangle2D area = frame.area();
      marked.frame(
          "{\"x\":"
              + axis(frame.across(), area.getX(), area.getMaxX())
              + ",\"y\":"
              + axis(frame.up(), area.getMaxY(), area.getY())
              + ",\"xn\":\""
              + across
              + "\",\"xu\":\""
              + acrossUnit
              + "\",\"yu\":\""
              + upUnit
              + "\"}");
    }
  }

  private static String axis(ValueAxis axis, double from, double to) {
    boolean straight = axis instanceof NumberAxis;
    return "["
        + from
        + ","
        + to
        + ","
        + axis.getLowerBound()
        + ","
        + axis.getUpperBound()
        + ","
        + (straight ? 0 : 1)
        + "]";
  }

  /** What is painted from here on is a series of one line. */
  static void series(Graphics2D surface, String name) {
    series(surface, name, name);
  }

  /** What is painted from here on is a line of a series. */
  static void series(Graphics2D surface, String series, String line) {
    if (surface instanceof Marked marked) {
      marked.series(Lines.printable(series), Lines.printable(line));
    }
  }

  /** What is painted from here on is no series. */
  static void none(Graphics2D surface) {
    series(surface, "", "");
  }
}
