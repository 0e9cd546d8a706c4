package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import sliprung.quantity.Show;

/** Draws a {@link TimeCurrentSheet}. */
public final class TimeCurrentDrawing {
  /** Foot of the sheet, s. */
  static final double LEAST_SECONDS = 0.1;

  /** How far a stall limit's line reaches on either side of its current, a factor. */
  static final double STALL_SPAN = 1.25;

  private static final int WIDTH = 960;
  private static final int SHEET = 540;
  private static final int LEFT = 72;
  private static final int RIGHT = 24;
  private static final int SCALE = 40;
  private static final int BOTTOM = 50;
  private static final double GREATEST_SECONDS = 3000.0;
  private static final double FAR = 1e7;

  /** Thin enough for two bands over each other to be told from one. */
  private static final Color VEIL = new Color(0, 0, 0, 22);

  private static final double HATCH_STEP = 16.0;

  private TimeCurrentDrawing() {}

  /** The picture. */
  public static Picture picture(TimeCurrentSheet sheet) {
    return new Picture(
        "time-current",
        "Time-current sheet: stator current across, time up, devices as bands, starts as duration"
            + " curves, with ring amperes beside",
        sheet.says(),
        WIDTH,
        top(sheet) + SHEET + BOTTOM,
        g -> paint(g, sheet));
  }

  private static int top(TimeCurrentSheet sheet) {
    return SCALE * (1 + sheet.scales().transformers().size()) + 6;
  }

  private static void paint(Graphics2D g, TimeCurrentSheet sheet) {
    Rectangle2D area =
        new Rectangle2D.Double(LEFT, top(sheet), WIDTH - LEFT - RIGHT, (double) SHEET);
    double from = sheet.leastAmps() * 0.6;
    double to = sheet.greatestAmps() * 4.0;
    Frame frame =
        new Frame(
            area,
            new DecadeAxis("stator current, A RMS", from, to),
            new DecadeAxis("seconds", LEAST_SECONDS, GREATEST_SECONDS));
    Shape clip = g.getClip();
    g.clip(area);
    sheet.corners().ifPresent(c -> corners(g, frame, c));
    sheet.bands().forEach(band -> fill(g, frame, band));
    g.setClip(clip);
    frame.draw(g, true, true);
    scales(g, frame, sheet.scales());
    Marks.frame(g, frame, "at", "A", "s");
    g.clip(area);
    FreeSpace space = new FreeSpace(area);
    sheet.bands().forEach(band -> edges(g, frame, space, band));
    sheet.withstand().forEach(line -> withstand(g, frame, space, line));
    sheet.stall().forEach(limit -> stall(g, frame, space, limit));
    held(g, frame, space, sheet.held());
    starts(g, frame, space, sheet.starts());
    sheet.takeOvers().forEach(mark -> takeOver(g, frame, space, mark));
    Marks.none(g);
    g.setClip(clip);
    rated(g, frame, space, sheet.ratedAmps());
    new SheetLabels(g, frame, space).draw(sheet);
  }

  private static void scales(Graphics2D g, Frame frame, SheetScales scales) {
    double y = frame.area().getY();
    ScaleAbove.draw(g, frame, y, "ring current, A RMS, as at rest", scales.ringPerStator());
    for (SheetScales.Transformer ct : scales.transformers()) {
      y -= SCALE;
      ScaleAbove.draw(
          g,
          frame,
          y,
          "secondary current, A RMS, of " + Lines.cut(ct.devices(), 40) + " (" + ct.ratio() + ")",
          ct.secondaryPerPrimary());
    }
  }

  private static void corners(Graphics2D g, Frame frame, CornerBand band) {
    g.setColor(Ink.STATOR_BAND);
    g.fill(
        Shapes.between(
            frame, band.amps(), least(band.leastSeconds()), least(band.greatestSeconds())));
  }

  /** Times no lower than a decade under the foot of the sheet. */
  private static double[] least(double[] seconds) {
    double[] shown = seconds.clone();
    for (int i = 0; i < shown.length; i++) {
      shown[i] = Math.max(shown[i], LEAST_SECONDS / 10.0);
    }
    return shown;
  }

  private static void fill(Graphics2D g, Frame frame, Band band) {
    Marks.series(g, band.label());
    g.setColor(VEIL);
    g.fill(
        Shapes.between(frame, band.amps(), shown(band.fastSeconds()), shown(band.slowSeconds())));
    Marks.none(g);
  }

  private static void edges(Graphics2D g, Frame frame, FreeSpace space, Band band) {
    g.setStroke(Ink.EDGE);
    g.setColor(Ink.DEVICE);
    edge(g, frame, space, band, band.fastSeconds(), "fast");
    edge(g, frame, space, band, band.slowSeconds(), "slow");
    g.setColor(Ink.MIDDLE);
    edge(g, frame, space, band, band.middleSeconds(), "middle");
  }

  private static void edge(
      Graphics2D g, Frame frame, FreeSpace space, Band band, double[] seconds, String name) {
    Marks.series(g, band.label(), band.label() + ", " + name);
    Path2D path = Shapes.line(frame, band.amps(), shown(seconds));
    g.draw(path);
    space.avoid(path);
  }

  /** Times as far up as never needs to be, so that an edge leaves the sheet at its top. */
  static double[] shown(double[] seconds) {
    double[] shown = new double[seconds.length];
    for (int i = 0; i < seconds.length; i++) {
      shown[i] = seconds[i] < FAR ? Math.max(seconds[i], LEAST_SECONDS / 10.0) : FAR;
    }
    return shown;
  }

  /** A line with its forbidden side hatched, as every wall is. */
  private static void withstand(Graphics2D g, Frame frame, FreeSpace space, Withstand line) {
    Marks.series(g, line.label());
    g.setColor(Ink.PART);
    g.setStroke(line.isSwitchgear() ? Ink.DASHED : Ink.COMPUTED);
    Path2D path = Shapes.line(frame, line.amps(), shown(line.seconds()));
    g.draw(path);
    space.avoid(path);
    Marks.none(g);
    Path2D ticks = new Path2D.Double();
    double[] amps = line.amps();
    double[] seconds = shown(line.seconds());
    double since = 0.0;
    for (int i = 1; i < amps.length; i++) {
      double x = frame.x(amps[i]);
      double y = frame.y(seconds[i]);
      double bx = frame.x(amps[i - 1]);
      double by = Math.max(frame.y(seconds[i - 1]), frame.area().getY() - HATCH_STEP);
      double length = Math.hypot(x - bx, y - by);
      for (double d = HATCH_STEP - since; d < length; d += HATCH_STEP) {
        double w = d / length;
        ticks.moveTo(bx + w * (x - bx), by + w * (y - by));
        ticks.lineTo(bx + w * (x - bx) + 6, by + w * (y - by) - 6);
      }
      since = (since + length) % HATCH_STEP;
    }
    g.setStroke(Ink.EDGE);
    g.draw(ticks);
  }

  /** A line of constant I²t through the limit, hatched on its right. */
  private static void stall(
      Graphics2D g, Frame frame, FreeSpace space, TimeCurrentSheet.Stall limit) {
    double low = limit.amps() / STALL_SPAN;
    double high = limit.amps() * STALL_SPAN;
    double joule = limit.amps() * limit.amps() * limit.seconds();
    double[] amps = {low, limit.amps(), high};
    double[] seconds = {joule / low / low, limit.seconds(), joule / high / high};
    Path2D line = Shapes.line(frame, amps, seconds);
    Marks.series(g, limit.label());
    g.setColor(Ink.PART);
    g.setStroke(Ink.WALL);
    g.draw(line);
    space.avoid(line);
    Marks.none(g);
    Path2D ticks = new Path2D.Double();
    double dx = frame.x(high) - frame.x(low);
    double dy = frame.y(seconds[2]) - frame.y(seconds[0]);
    for (double w = 0.0; w <= 1.0; w += 0.1) {
      double x = frame.x(low) + w * dx;
      double y = frame.y(seconds[0]) + w * dy;
      ticks.moveTo(x, y);
      ticks.lineTo(x + 8, y - 8);
    }
    g.setStroke(Ink.EDGE);
    g.draw(ticks);
  }

  private static void held(
      Graphics2D g, Frame frame, FreeSpace space, List<TimeCurrentSheet.HeldCurrent> currents) {
    for (TimeCurrentSheet.HeldCurrent held : currents) {
      double x = frame.x(held.amps());
      g.setColor(Ink.STATOR);
      g.setStroke(held.label().isEmpty() ? Ink.EDGE : Ink.DASHED);
      Line2D line = new Line2D.Double(x, frame.area().getY(), x, frame.area().getMaxY());
      g.draw(line);
      space.avoid(line);
    }
  }

  private static void starts(
      Graphics2D g, Frame frame, FreeSpace space, List<DurationCurve> starts) {
    for (int i = 0; i < starts.size(); i++) {
      DurationCurve curve = starts.get(i);
      Marks.series(g, curve.label());
      g.setColor(Ink.STATOR);
      g.setStroke(i == 0 ? Ink.COMPUTED : Ink.DASHED);
      Path2D path = Shapes.line(frame, curve.amps(), curve.seconds());
      // no current above the greatest: the curve falls to the foot of the sheet
      double x = frame.x(curve.amps()[0]);
      path.moveTo(x, frame.y(Math.max(LEAST_SECONDS, curve.seconds()[0])));
      path.lineTo(x, frame.area().getMaxY());
      g.draw(path);
      space.avoid(path);
    }
  }

  private static void takeOver(Graphics2D g, Frame frame, FreeSpace space, TakeOverMark mark) {
    double x = frame.x(mark.amps());
    double y = frame.y(mark.seconds());
    Path2D diamond = new Path2D.Double();
    diamond.moveTo(x - 6, y);
    diamond.lineTo(x, y - 6);
    diamond.lineTo(x + 6, y);
    diamond.lineTo(x, y + 6);
    diamond.closePath();
    g.setColor(Ink.DEVICE);
    g.fill(diamond);
    space.take(new Rectangle2D.Double(x - 7, y - 7, 14, 14));
  }

  private static void rated(Graphics2D g, Frame frame, FreeSpace space, double amps) {
    double x = frame.x(amps);
    double foot = frame.area().getMaxY();
    Words words = new Words(g);
    String text = "rated " + Show.amps(amps);
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(x, foot - 18, x, foot));
    words.plate(text, Ink.SMALL, Ink.QUIET, x + 5, foot - 6);
    space.take(new Rectangle2D.Double(x, foot - 20, words.width(text, Ink.SMALL) + 8, 20));
  }
}
