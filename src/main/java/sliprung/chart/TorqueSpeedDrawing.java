package sliprung.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;
import sliprung.quantity.Show;

/** Draws a {@link TorqueSpeed}. */
public final class TorqueSpeedDrawing {
  private static final int WIDTH = 960;
  private static final int HEIGHT = 520;
  private static final int LEFT = 78;
  private static final int RIGHT = 120;
  private static final int TOP = 22;
  private static final int BOTTOM = 54;
  private static final double HEADROOM = 1.1;
  private static final double CIRCLE = 5.0;
  private static final double DIAMOND = 6.5;
  private static final double LINE = 17.0;
  private static final Stroke HEAVY =
      new BasicStroke(3.5f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  private static final Color LOAD_BAND = new Color(0xD6ECF9);

  private TorqueSpeedDrawing() {}

  /** The picture. */
  public static Picture picture(TorqueSpeed chart) {
    return new Picture(
        "torque-speed",
        "Torque against speed: the motor on each step, the load as a band, the path of the nominal"
            + " cold start",
        chart.says(),
        WIDTH,
        HEIGHT,
        g -> paint(g, chart));
  }

  private static void paint(Graphics2D g, TorqueSpeed chart) {
    Rectangle2D area =
        new Rectangle2D.Double(LEFT, TOP, WIDTH - LEFT - RIGHT, HEIGHT - TOP - BOTTOM);
    Frame frame = frame(area, chart);
    Shape clip = g.getClip();
    g.clip(area);
    g.setColor(LOAD_BAND);
    g.fill(
        Shapes.between(
            frame, chart.loadLow().across(), chart.loadLow().up(), chart.loadHigh().up()));
    g.setClip(clip);
    frame.draw(g, true, true);
    Marks.frame(g, frame, "at", "rpm", "N·m");
    g.clip(area);
    FreeSpace space = new FreeSpace(area);
    lines(g, frame, space, chart);
    g.setClip(clip);
    for (TorqueSpeed.Hang hang : chart.hangs()) {
      circle(g, frame.x(hang.rpm()), frame.y(hang.torque()));
    }
    for (TorqueSpeed.Hang hang : chart.runningHangs()) {
      diamond(g, frame.x(hang.rpm()), frame.y(hang.torque()));
    }
    labels(g, frame, space, chart);
    rated(g, frame, chart);
  }

  private static Frame frame(Rectangle2D area, TorqueSpeed chart) {
    double greatest = Math.max(chart.ratedTorque(), chart.breakawayTorque());
    greatest = Math.max(greatest, chart.runningTorque());
    double least = 0.0;
    for (Curve curve : curves(chart)) {
      for (double torque : curve.up()) {
        greatest = Math.max(greatest, torque);
        least = Math.min(least, torque);
      }
    }
    double[] rpm = chart.load().across();
    NumberAxis across = plain("speed, rpm");
    across.setRange(rpm[0], rpm[rpm.length - 1]);
    NumberAxis up = plain("torque, N·m");
    up.setRange(least * HEADROOM, greatest * HEADROOM);
    return new Frame(area, across, up);
  }

  /** Curves that must be in sight: the path and the load; the steps once they are driving. */
  private static List<Curve> curves(TorqueSpeed chart) {
    List<Curve> curves = new ArrayList<>(List.of(chart.path(), chart.loadHigh()));
    chart.steps().forEach(s -> curves.add(s.curve()));
    return curves;
  }

  private static NumberAxis plain(String label) {
    NumberAxis axis = new NumberAxis(label);
    axis.setNumberFormatOverride(DecadeAxis.plainNumbers());
    return axis;
  }

  private static void lines(Graphics2D g, Frame frame, FreeSpace space, TorqueSpeed chart) {
    for (TorqueSpeed.StepCurve step : chart.steps()) {
      Marks.series(g, step.label());
      g.setColor(Ink.RING);
      g.setStroke(Ink.EDGE);
      Path2D line = Shapes.line(frame, step.curve().across(), step.curve().up());
      g.draw(line);
      space.avoid(line);
    }
    Marks.series(g, "load");
    g.setColor(Ink.LOAD);
    g.setStroke(Ink.COMPUTED);
    Path2D load = Shapes.line(frame, chart.load().across(), chart.load().up());
    g.draw(load);
    space.avoid(load);
    space.avoid(Shapes.line(frame, chart.loadLow().across(), chart.loadLow().up()));
    space.avoid(Shapes.line(frame, chart.loadHigh().across(), chart.loadHigh().up()));
    if (!chart.runningHangs().isEmpty()) {
      Marks.series(g, "running load");
      g.setStroke(Ink.DASHED);
      double y = frame.y(chart.runningTorque());
      Line2D running = new Line2D.Double(frame.x(0.0), y, frame.area().getMaxX(), y);
      g.draw(running);
      space.avoid(running);
    }
    Marks.series(g, "start");
    g.setColor(Ink.DEVICE);
    g.setStroke(HEAVY);
    Path2D path = Shapes.line(frame, chart.path().across(), chart.path().up());
    g.draw(path);
    space.avoid(path);
    Marks.none(g);
  }

  private static void circle(Graphics2D g, double x, double y) {
    Ellipse2D circle = new Ellipse2D.Double(x - CIRCLE, y - CIRCLE, 2 * CIRCLE, 2 * CIRCLE);
    g.setColor(Ink.PAPER);
    g.fill(circle);
    g.setColor(Ink.DEVICE);
    g.setStroke(Ink.COMPUTED);
    g.draw(circle);
  }

  private static void diamond(Graphics2D g, double x, double y) {
    Path2D diamond = new Path2D.Double();
    diamond.moveTo(x - DIAMOND, y);
    diamond.lineTo(x, y - DIAMOND);
    diamond.lineTo(x + DIAMOND, y);
    diamond.lineTo(x, y + DIAMOND);
    diamond.closePath();
    g.setColor(Ink.PAPER);
    g.fill(diamond);
    g.setColor(Ink.DEVICE);
    g.setStroke(Ink.COMPUTED);
    g.draw(diamond);
  }

  /** The line that the diamonds lie on, named. */
  private static void running(Frame frame, FreeSpace space, Words words, TorqueSpeed chart) {
    if (chart.runningHangs().isEmpty()) {
      return;
    }
    double y = frame.y(chart.runningTorque());
    List<Point2D> places = new ArrayList<>();
    for (double x = frame.x(0.0) + 150; x < frame.area().getMaxX(); x += 24) {
      places.add(new Point2D.Double(x, y - LINE - 2));
      places.add(new Point2D.Double(x, y + 3));
    }
    at(words, space, "running load " + Show.torque(chart.runningTorque()), Ink.TEXT, places);
  }

  private static void labels(Graphics2D g, Frame frame, FreeSpace space, TorqueSpeed chart) {
    Words words = new Words(g);
    for (TorqueSpeed.Hang hang : chart.hangs()) {
      double x = frame.x(hang.rpm());
      double y = frame.y(hang.torque());
      space.take(new Rectangle2D.Double(x - 6, y - 6, 12, 12));
    }
    for (TorqueSpeed.Hang hang : chart.runningHangs()) {
      double x = frame.x(hang.rpm());
      double y = frame.y(hang.torque());
      space.take(new Rectangle2D.Double(x - 7, y - 7, 14, 14));
    }
    HangLabels.draw(g, frame, chart);
    double breakaway = frame.y(chart.breakawayTorque());
    double zero = frame.x(0.0);
    g.setColor(Ink.LOAD);
    g.setStroke(Ink.WALL);
    g.draw(new Line2D.Double(zero, breakaway, zero + 12, breakaway));
    at(
        words,
        space,
        "breaks away above " + Show.torque(chart.breakawayTorque()),
        Ink.TEXT,
        List.of(new Point2D.Double(zero + 16, breakaway - 8)));
    for (TorqueSpeed.StepCurve step : chart.steps()) {
      at(words, space, step.label(), Ink.RING, along(frame, step.curve(), words, step.label()));
    }
    running(frame, space, words, chart);
    Curve load = chart.load();
    List<Point2D> places = along(frame, load, words, "load, with its spread");
    at(words, space, "load, with its spread", Ink.TEXT, places);
  }

  /** Beside a curve, from its low-speed end on. */
  private static List<Point2D> along(Frame frame, Curve curve, Words words, String text) {
    List<Point2D> places = new ArrayList<>();
    double[] across = curve.across();
    double[] up = curve.up();
    for (int i = 2; i < across.length; i += 3) {
      places.add(new Point2D.Double(frame.x(across[i]) + 4, frame.y(up[i]) - LINE - 1));
      places.add(
          new Point2D.Double(
              frame.x(across[i]) - words.width(text, Ink.SMALL) - 4, frame.y(up[i]) + 2));
    }
    return places;
  }

  private static void at(
      Words words, FreeSpace space, String text, Color colour, List<Point2D> places) {
    space
        .place(words.width(text, Ink.SMALL), LINE, places)
        .ifPresent(p -> words.plate(text, Ink.SMALL, colour, p.getX(), p.getY() + 13));
  }

  private static void rated(Graphics2D g, Frame frame, TorqueSpeed chart) {
    double y = frame.y(chart.ratedTorque());
    double x = frame.area().getX();
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(x, y, x + 14, y));
    new Words(g)
        .plate("rated " + Show.torque(chart.ratedTorque()), Ink.FINE, Ink.QUIET, x + 17, y + 4);
  }
}
