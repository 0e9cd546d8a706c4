package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.NumberAxis;
import sliprung.quantity.Show;

/** Draws a {@link StartOverTime}: speed on top, currents below, one time axis. */
public final class StartDrawing {
  private static final int WIDTH = 960;
  private static final int LEFT = 72;
  private static final int RIGHT = 150;
  private static final int TOP = 34;
  private static final int SPEED_HEIGHT = 150;
  private static final int GAP = 22;
  private static final int CURRENT_HEIGHT = 240;
  private static final int BOTTOM = 56;
  private static final int VOLTS_HEIGHT = 76;
  private static final int CURRENT_TOP = TOP + SPEED_HEIGHT + GAP;
  private static final int VOLTS_TOP = CURRENT_TOP + CURRENT_HEIGHT + GAP;
  private static final int HEIGHT = VOLTS_TOP + VOLTS_HEIGHT + BOTTOM;
  private static final double HEADROOM = 1.08;
  private static final double LABEL_GAP = 17.0;
  private static final double TAG_GAP = 6.0;

  private StartDrawing() {}

  /** The picture. */
  public static Picture picture(StartOverTime chart) {
    return new Picture(
        "start-over-time",
        "Start over time: speed, stator and ring current and terminal voltage of the nominal cold"
            + " start, with the band of all corners",
        chart.says(),
        WIDTH,
        HEIGHT,
        g -> paint(g, chart));
  }

  private static void paint(Graphics2D g, StartOverTime chart) {
    double width = WIDTH - LEFT - RIGHT;
    Frame speed =
        frame(
            chart,
            new Rectangle2D.Double(LEFT, TOP, width, SPEED_HEIGHT),
            "speed, rpm",
            chart.speedRpm().greatest());
    double amps = Math.max(chart.statorAmps().greatest(), chart.ringAmps().greatest());
    Frame current =
        frame(
            chart,
            new Rectangle2D.Double(LEFT, CURRENT_TOP, width, CURRENT_HEIGHT),
            "current, A RMS",
            amps);
    Frame volts = volts(chart, new Rectangle2D.Double(LEFT, VOLTS_TOP, width, VOLTS_HEIGHT));
    columns(g, chart, speed, volts);
    speed.draw(g, false, true);
    current.draw(g, false, true);
    volts.draw(g, true, true);
    band(g, speed, chart.speedRpm(), Ink.SPEED_BAND);
    band(g, current, chart.ringAmps(), Ink.RING_BAND);
    band(g, current, chart.statorAmps(), Ink.STATOR_BAND);
    band(g, volts, chart.terminalVolts(), Ink.SPEED_BAND);
    Marks.frame(g, speed, "at", "s", "rpm");
    line(g, speed, chart.speedRpm(), "speed", Ink.DEVICE);
    Marks.frame(g, current, "at", "s", "A");
    line(g, current, chart.ringAmps(), "ring current", Ink.RING);
    line(g, current, chart.statorAmps(), "stator current", Ink.STATOR);
    Marks.frame(g, volts, "at", "s", "V");
    line(g, volts, chart.terminalVolts(), "terminal voltage", Ink.DEVICE);
    rated(g, volts, chart.ratedVolts());
    ends(g, chart, speed, current, volts);
    timers(g, chart, current);
    chart.runningFrom().ifPresent(t -> running(g, speed, volts, current, t));
  }

  private static Frame frame(StartOverTime chart, Rectangle2D area, String label, double greatest) {
    NumberAxis across = plain("seconds from line closing");
    across.setRange(0.0, chart.endSeconds());
    NumberAxis up = plain(label);
    up.setRange(0.0, Math.max(1e-3, greatest * HEADROOM));
    return new Frame(area, across, up);
  }

  /** Not from zero: what matters is the dip, and the axis is numbered. */
  private static Frame volts(StartOverTime chart, Rectangle2D area) {
    double least = chart.ratedVolts();
    for (double volts : chart.terminalVolts().low().values()) {
      least = Math.min(least, volts);
    }
    NumberAxis across = plain("seconds from line closing");
    across.setRange(0.0, chart.endSeconds());
    NumberAxis up = plain("volts");
    double greatest = Math.max(chart.ratedVolts(), chart.terminalVolts().greatest());
    double room = 0.08 * (greatest - least) + 1e-3 * greatest;
    up.setRange(least - room, greatest + room);
    return new Frame(area, across, up);
  }

  private static void rated(Graphics2D g, Frame volts, double rated) {
    double y = volts.y(rated);
    double x = volts.area().getX();
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(x, y, x + 14, y));
    new Words(g).plate("rated " + Show.volts(rated), Ink.FINE, Ink.QUIET, x + 17, y + 4);
  }

  private static NumberAxis plain(String label) {
    NumberAxis axis = new NumberAxis(label);
    axis.setNumberFormatOverride(DecadeAxis.plainNumbers());
    return axis;
  }

  private static void columns(Graphics2D g, StartOverTime chart, Frame speed, Frame lowest) {
    Words words = new Words(g);
    double top = speed.area().getY();
    double bottom = lowest.area().getMaxY();
    double taken = Double.NEGATIVE_INFINITY;
    for (StartOverTime.Column column : chart.stages()) {
      double from = speed.x(column.fromSeconds());
      double to = speed.x(column.toSeconds());
      if (column.step() % 2 == 1) {
        g.setColor(Ink.COLUMN);
        g.fill(new Rectangle2D.Double(from, top, to - from, bottom - top));
      }
      g.setColor(Ink.QUIET);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(from, top - 5, from, top));
      double wide = words.width(column.closedBy(), Ink.SMALL);
      // a tag that would run into the one before it stands a line higher
      boolean high = from < taken;
      words.left(column.closedBy(), Ink.SMALL, Ink.TEXT, from - 2, top - (high ? 21 : 8));
      taken = high ? taken : from + wide + TAG_GAP;
    }
  }

  private static void band(Graphics2D g, Frame frame, StartOverTime.Banded quantity, Color colour) {
    Path2D area =
        Shapes.between(
            frame, quantity.low().seconds(), quantity.low().values(), quantity.high().values());
    g.setColor(new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), 200));
    g.fill(area);
  }

  private static void line(
      Graphics2D g, Frame frame, StartOverTime.Banded quantity, String name, Color colour) {
    Marks.series(g, name);
    g.setColor(colour);
    // ring and stator currents cross: told apart in grey as well
    g.setStroke(colour.equals(Ink.RING) ? Ink.DASHED : Ink.COMPUTED);
    g.draw(Shapes.line(frame, quantity.nominal().seconds(), quantity.nominal().values()));
    Marks.none(g);
  }

  private static void ends(
      Graphics2D g, StartOverTime chart, Frame speed, Frame current, Frame volts) {
    Words words = new Words(g);
    double terminal = chart.terminalVolts().nominal().last();
    words.left(
        "terminals " + Show.volts(terminal),
        Ink.STRONG,
        Ink.DEVICE,
        volts.area().getMaxX() + 8,
        volts.y(terminal) + 5);
    double x = speed.area().getMaxX() + 8;
    double rpm = chart.speedRpm().nominal().last();
    words.left(Show.rpm(rpm * Math.PI / 30.0), Ink.STRONG, Ink.DEVICE, x, speed.y(rpm) + 5);
    double stator = chart.statorAmps().nominal().last();
    double ring = chart.ringAmps().nominal().last();
    double[] y =
        EndLabels.spread(
            new double[] {current.y(ring) + 5, current.y(stator) + 5},
            LABEL_GAP,
            current.area().getY() + 10,
            current.area().getMaxY());
    words.left("ring " + Show.amps(ring), Ink.STRONG, Ink.RING, x, y[0]);
    words.left("stator " + Show.amps(stator), Ink.STRONG, Ink.STATOR, x, y[1]);
    if (chart.corners() > 1) {
      words.left("shaded: all", Ink.SMALL, Ink.QUIET, x, current.area().getY() + 12);
      words.left(chart.corners() + " corners", Ink.SMALL, Ink.QUIET, x, current.area().getY() + 27);
    }
  }

  /** Where the running load comes on. */
  private static void running(
      Graphics2D g, Frame speed, Frame lowest, Frame current, double seconds) {
    double x = current.x(seconds);
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(x, speed.area().getY(), x, lowest.area().getMaxY()));
    new Words(g).plate("running load", Ink.SMALL, Ink.QUIET, x + 5, current.area().getY() + 14);
  }

  private static void timers(Graphics2D g, StartOverTime chart, Frame current) {
    Words words = new Words(g);
    double y = current.area().getMaxY();
    for (StartOverTime.TimerTick timer : chart.timers()) {
      double x = current.x(timer.seconds());
      g.setColor(Ink.DEVICE);
      g.setStroke(Ink.WALL);
      g.draw(new Line2D.Double(x, y - 12, x, y + 3));
      g.setStroke(Ink.EDGE);
      double from = current.x(timer.earliest());
      double to = Math.min(current.area().getMaxX(), current.x(timer.latest()));
      g.draw(new Line2D.Double(from, y - 6, to, y - 6));
      String label = timer.device() + " " + Show.seconds(timer.seconds());
      words.plate(label, Ink.SMALL, Ink.TEXT, x - words.width(label, Ink.SMALL) / 2.0, y - 16);
    }
  }
}
