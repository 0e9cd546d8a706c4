package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import sliprung.quantity.Show;

/** Draws a {@link TimeCurrentSheet}. */
public final class TimeCurrentDrawing {
  private static final int WIDTH = 960;
  private static final int HEIGHT = 660;
  private static final int LEFT = 72;
  private static final int RIGHT = 24;
  private static final int TOP = 76;
  private static final int BOTTOM = 50;
  private static final double LEAST_SECONDS = 0.1;
  private static final double GREATEST_SECONDS = 3000.0;
  private static final double FAR = 1e7;

  /** Thin enough for two bands over each other to be told from one. */
  private static final Color VEIL = new Color(0, 0, 0, 22);

  private static final double[] FAST_SECONDS = {6.0, 200.0, 50.0, 2.0, 1.0, 0.6, 0.4};
  private static final double HELD_LINE = 17.0;
  private static final int HELD_LETTERS = 48;
  private static final int TAG_LETTERS = 8;
  private static final int LABEL_LETTERS = 40;
  private static final double STALL_SPAN = 1.25;
  private static final double[] LABEL_SECONDS = {400.0, 120.0, 40.0, 15.0, 5.0, 1.5, 0.5};

  private TimeCurrentDrawing() {}

  /** The picture. */
  public static Picture picture(TimeCurrentSheet sheet) {
    return new Picture(
        "time-current",
        "Time-current sheet: stator current across, time up, devices as bands, starts as duration"
            + " curves",
        sheet.says(),
        WIDTH,
        HEIGHT,
        g -> paint(g, sheet));
  }

  private static void paint(Graphics2D g, TimeCurrentSheet sheet) {
    Rectangle2D area =
        new Rectangle2D.Double(LEFT, TOP, WIDTH - LEFT - RIGHT, HEIGHT - TOP - BOTTOM);
    double from = sheet.leastAmps() * 0.6;
    double to = sheet.greatestAmps() * 4.0;
    Frame frame =
        new Frame(
            area,
            new DecadeAxis("stator current, A RMS", from, to),
            new DecadeAxis("seconds", LEAST_SECONDS, GREATEST_SECONDS));
    Shape clip = g.getClip();
    g.clip(area);
    sheet.bands().forEach(band -> fill(g, frame, band));
    g.setClip(clip);
    frame.draw(g, true, true);
    g.clip(area);
    sheet.bands().forEach(band -> edges(g, frame, band));
    rated(g, frame, sheet.ratedAmps());
    sheet.stall().forEach(limit -> stall(g, frame, limit));
    for (int i = 0; i < sheet.starts().size(); i++) {
      DurationCurve curve = sheet.starts().get(i);
      g.setColor(Ink.STATOR);
      g.setStroke(i == 0 ? Ink.COMPUTED : Ink.DASHED);
      g.draw(Shapes.line(frame, curve.amps(), curve.seconds()));
      drop(g, frame, curve);
    }
    g.setClip(clip);
    verticals(g, frame, sheet);
    labels(g, frame, sheet);
  }

  private static void fill(Graphics2D g, Frame frame, Band band) {
    g.setColor(VEIL);
    g.fill(
        Shapes.between(frame, band.amps(), shown(band.fastSeconds()), shown(band.slowSeconds())));
  }

  private static void edges(Graphics2D g, Frame frame, Band band) {
    g.setColor(Ink.DEVICE);
    g.setStroke(Ink.EDGE);
    g.draw(Shapes.line(frame, band.amps(), shown(band.fastSeconds())));
    g.draw(Shapes.line(frame, band.amps(), shown(band.slowSeconds())));
  }

  /** Times as far up as never needs to be, so that an edge leaves the sheet at its top. */
  private static double[] shown(double[] seconds) {
    double[] shown = new double[seconds.length];
    for (int i = 0; i < seconds.length; i++) {
      shown[i] = seconds[i] < FAR ? Math.max(seconds[i], LEAST_SECONDS / 10.0) : FAR;
    }
    return shown;
  }

  /** A line of constant I²t through the limit, hatched on its right. */
  private static void stall(Graphics2D g, Frame frame, TimeCurrentSheet.Stall limit) {
    double low = limit.amps() / STALL_SPAN;
    double high = limit.amps() * STALL_SPAN;
    double joule = limit.amps() * limit.amps() * limit.seconds();
    double[] amps = {low, limit.amps(), high};
    double[] seconds = {joule / low / low, limit.seconds(), joule / high / high};
    Path2D line = Shapes.line(frame, amps, seconds);
    g.setColor(Ink.PART);
    g.setStroke(Ink.WALL);
    g.draw(line);
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
    new Words(g)
        .plate(
            limit.label(),
            Ink.SMALL,
            Ink.TEXT,
            frame.x(limit.amps()) + 14,
            frame.y(limit.seconds()) - 2);
  }

  /** No current above the greatest: the curve falls to the foot of the sheet. */
  private static void drop(Graphics2D g, Frame frame, DurationCurve curve) {
    double x = frame.x(curve.amps()[0]);
    double y = frame.y(Math.max(LEAST_SECONDS, curve.seconds()[0]));
    g.draw(new Line2D.Double(x, y, x, frame.area().getMaxY()));
  }

  private static void rated(Graphics2D g, Frame frame, double amps) {
    double x = frame.x(amps);
    double foot = frame.area().getMaxY();
    g.setColor(Ink.QUIET);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(x, foot - 18, x, foot));
    new Words(g).plate("rated " + Show.amps(amps), Ink.SMALL, Ink.QUIET, x + 5, foot - 6);
  }

  private static void verticals(Graphics2D g, Frame frame, TimeCurrentSheet sheet) {
    Words words = new Words(g);
    Rectangle2D area = frame.area();
    int above = (int) sheet.held().stream().filter(h -> !h.label().isEmpty()).count();
    for (TimeCurrentSheet.HeldCurrent line : sheet.held()) {
      double x = frame.x(line.amps());
      g.setColor(Ink.STATOR);
      if (line.label().isEmpty()) {
        g.setStroke(Ink.EDGE);
        g.draw(new Line2D.Double(x, area.getY(), x, area.getMaxY()));
        continue;
      }
      above--;
      double y = area.getY() - 10 - HELD_LINE * above;
      g.setStroke(Ink.DASHED);
      g.draw(new Line2D.Double(x, y + 4, x, area.getMaxY()));
      words.left(Lines.cut(line.label(), HELD_LETTERS), Ink.SMALL, Ink.STATOR, x + 5, y);
    }
  }

  private static void labels(Graphics2D g, Frame frame, TimeCurrentSheet sheet) {
    Words words = new Words(g);
    for (int i = 0; i < sheet.bands().size(); i++) {
      Band band = sheet.bands().get(i);
      double at = LABEL_SECONDS[i % LABEL_SECONDS.length];
      double amps = firstAmps(band.amps(), band.slowSeconds(), at);
      if (amps > 0.0) {
        String label = Lines.cut(band.label(), LABEL_LETTERS);
        double latest = frame.area().getMaxX() - words.width(label, Ink.LABEL) - 4;
        words.plate(label, Ink.LABEL, Ink.DEVICE, Math.min(latest, frame.x(amps) + 6), frame.y(at));
      }
    }
    for (int i = 0; i < sheet.bands().size(); i++) {
      fastLabel(words, frame, sheet.bands().get(i), FAST_SECONDS[i % FAST_SECONDS.length]);
    }
    for (DurationCurve curve : sheet.starts()) {
      double[] amps = curve.amps();
      double[] seconds = curve.seconds();
      int last = amps.length - 1;
      int shown = last;
      while (shown > 0 && seconds[shown] > GREATEST_SECONDS) {
        shown--;
      }
      words.plate(
          curve.label(),
          Ink.STRONG,
          Ink.STATOR,
          frame.x(amps[shown]) + 6,
          Math.max(frame.area().getY() + 14, frame.y(seconds[shown]) - 6));
    }
  }

  /** Names the fast edge on its left, so that a wide band is known from both sides. */
  private static void fastLabel(Words words, Frame frame, Band band, double seconds) {
    double amps = firstAmps(band.amps(), band.fastSeconds(), seconds);
    String tag = band.label().split(" ", 2)[0];
    String text = Lines.cut(tag, TAG_LETTERS) + " fast";
    double x = frame.x(amps) - words.width(text, Ink.FINE) - 5;
    if (amps > 0.0 && x > frame.area().getX() && frame.x(amps) < frame.area().getMaxX()) {
      words.plate(text, Ink.FINE, Ink.QUIET, x, frame.y(seconds));
    }
  }

  /** Least current at which an edge is at or below a time; 0: nowhere in the band. */
  private static double firstAmps(double[] amps, double[] edge, double seconds) {
    for (int i = 0; i < amps.length; i++) {
      if (edge[i] <= seconds) {
        return amps[i];
      }
    }
    return 0.0;
  }
}
