package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;

/** Draws a {@link MarginOverview}: a bar from the wanted margin to the one there is. */
public final class MarginDrawing {
  private static final int WIDTH = 960;
  private static final int LEFT = 330;
  private static final int RIGHT = 190;
  private static final int TOP = 24;
  private static final int BOTTOM = 50;
  private static final int ROW = 16;
  private static final int HEAD = 30;
  private static final double LEAST = 0.1;
  private static final double GREATEST = 10.0;
  private static final double DOT = 4.0;
  private static final int SUBJECT_LETTERS = 24;
  private static final int MOST_ROWS = 34;

  private MarginDrawing() {}

  /** The pictures, each of half a sheet of paper: usually three. */
  public static List<Picture> pictures(MarginOverview chart) {
    List<Picture> pictures = new ArrayList<>();
    for (MarginOverview part : chart.parts(MOST_ROWS)) {
      // margins, margins-b, margins-c …
      String name =
          pictures.isEmpty()
              ? "margins"
              : "margins-" + (char) ('a' + Math.min(25, pictures.size()));
      pictures.add(picture(part, name));
    }
    return pictures;
  }

  private static Picture picture(MarginOverview chart, String name) {
    int rows = chart.groups().stream().mapToInt(g -> g.rows().size()).sum();
    int height = TOP + BOTTOM + Math.max(ROW, rows * ROW + chart.groups().size() * HEAD);
    return new Picture(
        name,
        "Margin overview: every margin over the one that is wanted, under the four questions",
        chart.says(),
        WIDTH,
        height,
        g -> paint(g, chart, height));
  }

  private static void paint(Graphics2D g, MarginOverview chart, int height) {
    Rectangle2D area =
        new Rectangle2D.Double(LEFT, TOP, WIDTH - LEFT - RIGHT, height - TOP - BOTTOM);
    Frame frame =
        new Frame(
            area, new DecadeAxis("margin over wanted margin", LEAST, GREATEST), new NumberAxis());
    double one = frame.x(1.0);
    g.setColor(Ink.GRID);
    Hatching.over(g, new Rectangle2D.Double(area.getX(), TOP, one - area.getX(), area.getHeight()));
    frame.draw(g, true, false);
    Words words = new Words(g);
    words.right("too thin", Ink.SMALL, Ink.QUIET, one - 8, TOP - 8);
    words.left("wider than wanted", Ink.SMALL, Ink.QUIET, one + 8, TOP - 8);
    g.setColor(Ink.TEXT);
    g.setStroke(Ink.WALL);
    g.draw(new Line2D.Double(one, TOP - 14, one, area.getMaxY()));
    double y = TOP;
    for (MarginOverview.Group group : chart.groups()) {
      words.plate(
          group.question().number() + "  " + group.question().words(),
          Ink.STRONG,
          Ink.TEXT,
          4,
          y + HEAD - 10);
      y += HEAD;
      for (MarginOverview.Row row : group.rows()) {
        row(g, frame, row, y);
        y += ROW;
      }
    }
  }

  private static void row(Graphics2D g, Frame frame, MarginOverview.Row row, double top) {
    Words words = new Words(g);
    boolean loud = row.isShort();
    double line = top + ROW / 2.0;
    String subject = Lines.cut(row.subject(), SUBJECT_LETTERS);
    words.left(subject, loud ? Ink.SMALL_STRONG : Ink.SMALL, Ink.TEXT, 18, line + 4);
    words.right(row.rule(), Ink.FINE, Ink.QUIET, LEFT - 10, line + 4);
    double one = frame.x(1.0);
    double x = frame.x(Math.min(GREATEST, Math.max(LEAST, row.share())));
    Marks.series(g, row.subject() + " " + row.rule() + ": " + row.text());
    g.setColor(loud ? Ink.PART : Ink.DEVICE);
    g.setStroke(loud ? Ink.WALL : Ink.COMPUTED);
    g.draw(new Line2D.Double(one, line, x, line));
    if (row.share() > GREATEST || row.share() < LEAST) {
      arrow(g, x, line, row.share() > GREATEST ? 1 : -1);
    } else {
      g.fill(new Ellipse2D.Double(x - DOT, line - DOT, 2 * DOT, 2 * DOT));
    }
    Marks.none(g);
    double end = frame.area().getMaxX() + 14;
    words.left(
        row.text() + "  " + row.verdict().word(),
        loud ? Ink.SMALL_STRONG : Ink.SMALL,
        loud ? Ink.TEXT : Ink.QUIET,
        end,
        line + 4);
  }

  /** Beyond the end of the scale. */
  private static void arrow(Graphics2D g, double x, double y, int direction) {
    Path2D head = new Path2D.Double();
    head.moveTo(x + direction * 2, y);
    head.lineTo(x - direction * 8, y - 5);
    head.lineTo(x - direction * 8, y + 5);
    head.closePath();
    g.fill(head);
  }
}
