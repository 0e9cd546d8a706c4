package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Stroke;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Optional;
import org.jfree.chart.axis.NumberAxis;
import sliprung.protection.LevelOverTime;
import sliprung.quantity.Show;
import sliprung.runup.StartHistory;

/** Draws a {@link UseOverTime}: a strip for each device, one time axis, operation at the top. */
public final class UseDrawing {
  private static final int WIDTH = 960;
  private static final int LEFT = 200;
  private static final int RIGHT = 170;
  private static final int TOP = 40;
  private static final int BOTTOM = 50;
  private static final int STRIP = 78;
  private static final int GAP = 10;
  private static final double FROM_SECONDS = 0.1;
  private static final double TOP_USE = 1.3;
  private static final int LABEL_LETTERS = 26;
  private static final double LINE = 16.0;

  private UseDrawing() {}

  /** The picture. */
  public static Picture picture(UseOverTime chart) {
    int height = TOP + BOTTOM + chart.rows().size() * (STRIP + GAP);
    return new Picture(
        "use-over-time",
        "Use over time: how far each device comes towards operating, cold and hot, its fast edge",
        chart.says(),
        WIDTH,
        height,
        g -> paint(g, chart));
  }

  private static void paint(Graphics2D g, UseOverTime chart) {
    Words words = new Words(g);
    int count = chart.rows().size();
    double width = WIDTH - LEFT - RIGHT;
    for (int i = 0; i < count; i++) {
      Rectangle2D area =
          new Rectangle2D.Double(LEFT, TOP + i * (double) (STRIP + GAP), width, STRIP);
      NumberAxis up = new NumberAxis();
      up.setRange(0.0, TOP_USE);
      up.setTickUnit(new org.jfree.chart.axis.NumberTickUnit(0.5));
      up.setNumberFormatOverride(DecadeAxis.plainNumbers());
      Frame frame =
          new Frame(
              area,
              new DecadeAxis(
                  "seconds from line closing", FROM_SECONDS, StartHistory.HORIZON_SECONDS),
              up);
      strip(g, frame, chart, chart.rows().get(i), i == count - 1);
    }
    chart
        .lastClosingSeconds()
        .ifPresent(
            t -> {
              double x = LEFT + width * share(t);
              g.setColor(Ink.QUIET);
              g.setStroke(Ink.EDGE);
              g.draw(new Line2D.Double(x, TOP - 6, x, TOP + count * (double) (STRIP + GAP) - GAP));
              words.centre("last closing", Ink.SMALL, Ink.QUIET, x, TOP - 10);
            });
    words.left("1: operates", Ink.SMALL, Ink.QUIET, LEFT, TOP - 10);
    words.right("30 min", Ink.SMALL, Ink.QUIET, LEFT + width, TOP - 10);
    double foot = TOP + count * (double) (STRIP + GAP) + 12;
    words.left(row("thin", chart.coldStarts(), "cold"), Ink.SMALL, Ink.QUIET, 4, foot);
    if (chart.hotStarts() > 0) {
      words.left(row("thick", chart.hotStarts(), "hot"), Ink.SMALL, Ink.QUIET, 4, foot + LINE);
    }
    words.left("greatest use", Ink.SMALL, Ink.QUIET, LEFT + width + 14, TOP - 10);
  }

  /** Which start of a row is shown. */
  private static String row(String line, int starts, String from) {
    return starts == 1
        ? line + ": a " + from + " start"
        : line + ": the last of " + starts + " " + from + " starts";
  }

  private static double share(double seconds) {
    return Math.log(seconds / FROM_SECONDS) / Math.log(StartHistory.HORIZON_SECONDS / FROM_SECONDS);
  }

  private static void strip(
      Graphics2D g, Frame frame, UseOverTime chart, UseOverTime.Row row, boolean last) {
    Rectangle2D area = frame.area();
    double one = frame.y(1.0);
    frame.draw(g, last, true);
    g.setColor(Ink.DECADE);
    Hatching.over(
        g, new Rectangle2D.Double(area.getX(), area.getY(), area.getWidth(), one - area.getY()));
    g.setColor(Ink.DEVICE);
    g.setStroke(Ink.EDGE);
    g.draw(new Line2D.Double(area.getX(), one, area.getMaxX(), one));
    Words words = new Words(g);
    String label = row.label();
    int cut = label.indexOf(' ');
    words.left(row.device(), Ink.STRONG, Ink.TEXT, 4, area.getY() + 22);
    if (cut > 0 && label.startsWith(row.device() + " ")) {
      words.left(
          Lines.cut(label.substring(row.device().length() + 1), LABEL_LETTERS),
          Ink.SMALL,
          Ink.QUIET,
          4,
          area.getY() + 38);
    }
    java.awt.Shape clip = g.getClip();
    g.clip(area);
    Marks.frame(g, frame, "at", "s", "");
    line(g, frame, row.cold(), row.device() + " cold", Ink.DEVICE, Ink.EDGE);
    line(g, frame, row.hot(), row.device() + " hot", Ink.DEVICE, Ink.COMPUTED);
    Marks.none(g);
    row.worst().ifPresent(w -> worst(g, frame, w.use()));
    g.setClip(clip);
    if (row.cold().isEmpty() && row.hot().isEmpty()) {
      words.plate("not judged", Ink.STRONG, Ink.TEXT, area.getX() + 10, area.getCenterY() + 8);
    }
    ends(words, area, chart, row);
  }

  private static void ends(Words words, Rectangle2D area, UseOverTime chart, UseOverTime.Row row) {
    double x = area.getMaxX() + 14;
    double y = area.getY() + 18;
    row.cold()
        .ifPresent(c -> words.left("thin: cold " + use(c.greatest()), Ink.SMALL, Ink.TEXT, x, y));
    row.hot()
        .ifPresent(
            h -> words.left("thick: hot " + use(h.greatest()), Ink.SMALL, Ink.TEXT, x, y + LINE));
    row.worst()
        .ifPresent(
            w ->
                words.left(
                    "worst corner " + use(w.use()),
                    w.use() >= 1.0 ? Ink.STRONG : Ink.LABEL,
                    Ink.TEXT,
                    x,
                    y + 2 * LINE + 2));
  }

  /** A use never rounds to 1. */
  private static String use(double use) {
    String shown = Show.ratio(use);
    return shown.equals("1.00") && use != 1.0 ? (use < 1.0 ? "0.999" : "1.001") : shown;
  }

  private static void line(
      Graphics2D g,
      Frame frame,
      Optional<LevelOverTime> use,
      String name,
      Color colour,
      Stroke stroke) {
    if (use.isEmpty()) {
      return;
    }
    double[] seconds = use.get().seconds();
    double[] levels = use.get().levels();
    for (int i = 0; i < seconds.length; i++) {
      seconds[i] = Math.max(seconds[i], FROM_SECONDS / 10.0);
      levels[i] = Math.min(levels[i], TOP_USE * 2.0);
    }
    Marks.series(g, name);
    g.setColor(colour);
    g.setStroke(stroke);
    Path2D path = Shapes.line(frame, seconds, levels);
    g.draw(path);
  }

  /** A tick at the right end: the greatest of all corners. */
  private static void worst(Graphics2D g, Frame frame, double use) {
    double y = frame.y(Math.min(TOP_USE * 0.98, use));
    double x = frame.area().getMaxX();
    Path2D head = new Path2D.Double();
    head.moveTo(x - 14, y);
    head.lineTo(x, y - 5);
    head.lineTo(x, y + 5);
    head.closePath();
    g.setColor(use >= 1.0 ? Ink.PART : Ink.DEVICE);
    g.fill(head);
  }
}
