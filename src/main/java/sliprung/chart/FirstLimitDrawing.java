package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;
import sliprung.quantity.Show;
import sliprung.review.PartText;
import sliprung.runup.StartHistory;

/** Draws a {@link FirstLimitChart}: walls, hatched behind; open circles where a device clears. */
public final class FirstLimitDrawing {
  private static final int WIDTH = 960;
  private static final int LEFT = 240;
  private static final int RIGHT = 230;
  private static final int TOP = 26;
  private static final int BOTTOM = 50;
  private static final int ROW = 36;
  private static final double CIRCLE = 5.0;
  private static final int LABEL_LETTERS = 33;
  private static final double CLOSE = 120.0;

  private FirstLimitDrawing() {}

  /** The picture. */
  public static Picture picture(FirstLimitChart chart) {
    int height = TOP + BOTTOM + ROW * Math.max(1, chart.rows().size());
    return new Picture(
        "first-limit",
        "First-limit chart: for each fault, when a device clears it and when the first part reaches"
            + " its limit",
        chart.says(),
        WIDTH,
        height,
        g -> paint(g, chart, height));
  }

  private static void paint(Graphics2D g, FirstLimitChart chart, int height) {
    Rectangle2D area =
        new Rectangle2D.Double(LEFT, TOP, WIDTH - LEFT - RIGHT, height - TOP - BOTTOM);
    Frame frame =
        new Frame(
            area,
            new DecadeAxis(
                "seconds from line closing", chart.fromSeconds(), StartHistory.HORIZON_SECONDS),
            new NumberAxis());
    frame.draw(g, true, false);
    Words words = new Words(g);
    words.left("fault, at its closest corner", Ink.SMALL, Ink.QUIET, 4, TOP - 10);
    words.right("30 min", Ink.SMALL, Ink.QUIET, area.getMaxX(), TOP - 10);
    double y = TOP;
    for (FaultRow row : chart.rows()) {
      new RowDrawing(g, frame, row, y).draw();
      y += ROW;
    }
  }

  /** One row. */
  private static final class RowDrawing {
    private final Graphics2D g;
    private final Words words;
    private final Frame frame;
    private final FaultRow row;
    private final double top;
    private final double line;

    RowDrawing(Graphics2D g, Frame frame, FaultRow row, double top) {
      this.g = g;
      this.words = new Words(g);
      this.frame = frame;
      this.row = row;
      this.top = top;
      this.line = top + ROW - 11;
    }

    void draw() {
      Rectangle2D area = frame.area();
      g.setColor(Ink.DECADE);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(4, top + ROW, WIDTH - 4, top + ROW));
      boolean loud = row.state().isLost();
      String fault = Lines.cut(row.start().scenario().words(), LABEL_LETTERS);
      words.left(fault, loud ? Ink.STRONG : Ink.LABEL, Ink.TEXT, 4, top + 15);
      words.left(row.circumstances(), Ink.FINE, Ink.QUIET, 4, top + 30);
      row.limit().ifPresent(this::wall);
      devices();
      double end = area.getMaxX() + 12;
      words.left(row.finding(), loud ? Ink.STRONG : Ink.LABEL, Ink.TEXT, end, top + 15);
      words.left(row.times(), Ink.SMALL, Ink.QUIET, end, top + 30);
    }

    private void wall(FaultRow.Limit limit) {
      Rectangle2D area = frame.area();
      double x = Math.max(area.getX(), frame.x(limit.seconds()));
      g.setColor(Ink.PART);
      Hatching.over(g, new Rectangle2D.Double(x, top + 2, area.getMaxX() - x, ROW - 4.0));
      g.setStroke(Ink.WALL);
      g.draw(new Line2D.Double(x, top + 2, x, top + ROW - 2));
      String label = PartText.words(limit.part()) + " " + Show.seconds(limit.seconds());
      double wide = words.width(label, Ink.SMALL);
      // a circle just behind the wall keeps the room on the right for its own label
      boolean circleBehind =
          row.clearings().stream()
              .mapToDouble(this::x)
              .anyMatch(c -> c > x - 2 * CIRCLE && c < x + wide + CLOSE);
      boolean onRight = !circleBehind && x + 8 + wide < area.getMaxX();
      words.plate(label, Ink.SMALL, Ink.TEXT, onRight ? x + 6 : x - wide - 8, top + 14);
    }

    private void devices() {
      List<FaultRow.Clearing> clearings = row.clearings();
      double taken = Double.NEGATIVE_INFINITY;
      for (int i = clearings.size() - 1; i >= 0; i--) {
        line(clearings.get(i), i == 0);
      }
      for (int i = 0; i < clearings.size(); i++) {
        FaultRow.Clearing clearing = clearings.get(i);
        String label =
            i == 0 ? clearing.device() + " " + Show.seconds(clearing.seconds()) : clearing.device();
        taken = label(clearing, label, i == 0, taken);
      }
    }

    private void line(FaultRow.Clearing clearing, boolean first) {
      double x = x(clearing);
      g.setColor(first ? Ink.DEVICE : Ink.QUIET);
      g.setStroke(first ? Ink.COMPUTED : Ink.EDGE);
      g.draw(new Line2D.Double(frame.area().getX(), line, x - CIRCLE, line));
      Ellipse2D circle = new Ellipse2D.Double(x - CIRCLE, line - CIRCLE, 2 * CIRCLE, 2 * CIRCLE);
      g.setColor(Ink.PAPER);
      g.fill(circle);
      g.setColor(first ? Ink.DEVICE : Ink.QUIET);
      g.draw(circle);
    }

    /** Writes a label above its circle where there is room; returns where it ends. */
    private double label(FaultRow.Clearing clearing, String text, boolean first, double taken) {
      double wide = words.width(text, Ink.SMALL);
      boolean behindWall = x(clearing) > frame.x(row.limitSeconds()) - 2 * CIRCLE;
      double place = behindWall ? x(clearing) - CIRCLE : x(clearing) - wide - CIRCLE;
      double x = Math.max(frame.area().getX() + 2, place);
      boolean room = x > taken + 4 && x + wide < frame.area().getMaxX();
      if (!first && !room) {
        return taken;
      }
      Color colour = first ? Ink.TEXT : Ink.QUIET;
      words.plate(text, Ink.SMALL, colour, x, top + 14);
      return x + wide;
    }

    private double x(FaultRow.Clearing clearing) {
      return Math.min(
          frame.area().getMaxX(), Math.max(frame.area().getX(), frame.x(clearing.seconds())));
    }
  }
}
