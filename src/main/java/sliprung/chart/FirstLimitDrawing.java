package sliprung.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
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
    private final List<Rectangle2D> taken = new ArrayList<>();

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
      Marks.series(g, row.sentence());
      g.setColor(Ink.DECADE);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(4, top + ROW, WIDTH - 4, top + ROW));
      boolean loud = row.state().isLost();
      String fault = Lines.cut(shortened(row.start().scenario().words()), LABEL_LETTERS);
      words.left(fault, loud ? Ink.STRONG : Ink.LABEL, Ink.TEXT, 4, top + 15);
      words.left(row.circumstances(), Ink.FINE, Ink.QUIET, 4, top + 30);
      row.limit().ifPresent(this::wall);
      devices();
      double end = area.getMaxX() + 12;
      words.left(row.finding(), loud ? Ink.STRONG : Ink.LABEL, Ink.TEXT, end, top + 15);
      words.left(row.times(), Ink.FINE, Ink.QUIET, end, top + 30);
      Marks.none(g);
    }

    private void wall(FaultRow.Limit limit) {
      Rectangle2D area = frame.area();
      double x = Math.max(area.getX(), frame.x(limit.seconds()));
      g.setColor(Ink.PART);
      Hatching.over(g, new Rectangle2D.Double(x, top + 2, area.getMaxX() - x, ROW - 4.0));
      g.setStroke(Ink.WALL);
      g.draw(new Line2D.Double(x, top + 2, x, top + ROW - 2));
    }

    private void devices() {
      List<FaultRow.Clearing> clearings = row.clearings();
      for (int i = clearings.size() - 1; i >= 0; i--) {
        line(clearings.get(i), i == 0);
      }
      for (int i = 0; i < clearings.size(); i++) {
        FaultRow.Clearing clearing = clearings.get(i);
        boolean first = i == 0;
        String text = clearing.device() + (first ? " " + Show.seconds(clearing.seconds()) : "");
        label(text, first ? Ink.TEXT : Ink.QUIET, x(clearing), CIRCLE);
      }
      row.limit()
          .filter(l -> l.seconds() > 0.0)
          .ifPresent(
              l ->
                  label(
                      PartText.words(l.part()) + " " + Show.seconds(l.seconds()),
                      Ink.TEXT,
                      frame.x(l.seconds()),
                      -6.0));
    }

    /**
     * Writes a label beside a place where it covers no other: on the preferred side (left for a
     * positive gap), else on the other, else not at all: the text at the end of the row says it
     * too.
     */
    private void label(String text, Color colour, double at, double gap) {
      double wide = words.width(text, Ink.SMALL);
      double before = at - wide - Math.abs(gap);
      double behind = at + Math.abs(gap);
      double[] sides = gap > 0 ? new double[] {before, behind} : new double[] {behind, before};
      for (double from : sides) {
        Rectangle2D place = new Rectangle2D.Double(from - 3, top, wide + 6, 1);
        boolean inside = from >= frame.area().getX() && from + wide <= frame.area().getMaxX();
        if (inside && taken.stream().noneMatch(place::intersects)) {
          taken.add(place);
          words.plate(text, Ink.SMALL, colour, from, top + 14);
          return;
        }
      }
    }

    private void line(FaultRow.Clearing clearing, boolean first) {
      double x = x(clearing);
      g.setColor(first ? Ink.DEVICE : Ink.QUIET);
      g.setStroke(first ? Ink.COMPUTED : Ink.EDGE);
      double from = from(clearing);
      g.draw(new Line2D.Double(from, line, x - CIRCLE, line));
      if (from > frame.area().getX()) {
        g.draw(new Line2D.Double(from, line - 4, from, line + 4));
      }
      Ellipse2D circle = new Ellipse2D.Double(x - CIRCLE, line - CIRCLE, 2 * CIRCLE, 2 * CIRCLE);
      g.setColor(Ink.PAPER);
      g.fill(circle);
      g.setColor(first ? Ink.DEVICE : Ink.QUIET);
      g.draw(circle);
    }

    /** Where a line starts: at the left edge for line closing, which a log axis never reaches. */
    private double from(FaultRow.Clearing clearing) {
      double picked = clearing.pickedUpSeconds();
      double x = picked > 0.0 ? frame.x(picked) : frame.area().getX();
      return Math.min(x(clearing) - CIRCLE, Math.max(frame.area().getX(), x));
    }

    private double x(FaultRow.Clearing clearing) {
      return Math.min(
          frame.area().getMaxX(), Math.max(frame.area().getX(), frame.x(clearing.seconds())));
    }
  }

  /** Words that would be cut lose what the row says anyway. */
  private static String shortened(String words) {
    return words.length() <= LABEL_LETTERS
        ? words
        : words.replace("step contactor", "contactor").replace(" at running load", ", running");
  }
}
