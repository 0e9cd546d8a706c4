package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.axis.NumberAxis;
import sliprung.quantity.Show;

/** Draws {@link SectionLevels}: a panel for each row of starts, the limit as a hatched wall. */
public final class SectionDrawing {
  private static final int WIDTH = 960;
  private static final int LEFT = 72;
  private static final int RIGHT = 150;
  private static final int TOP = 30;
  private static final int PANEL = 190;
  private static final int GAP = 84;
  private static final double LINE = 16.0;
  private static final double LEAST_TOP = 1.15;

  private SectionDrawing() {}

  /** The picture. */
  public static Picture picture(SectionLevels chart) {
    int height = TOP + chart.rows().size() * (PANEL + GAP) - GAP + 56;
    return new Picture(
        "section-levels",
        "Section temperatures over the permitted starts, as a share of each section's limit",
        chart.says(),
        WIDTH,
        height,
        g -> paint(g, chart));
  }

  private static void paint(Graphics2D g, SectionLevels chart) {
    double greatest = LEAST_TOP;
    for (SectionLevels.Row row : chart.rows()) {
      for (SectionLevels.Section section : row.sections()) {
        greatest = Math.max(greatest, section.level().greatest() * 1.1);
      }
    }
    for (int i = 0; i < chart.rows().size(); i++) {
      Rectangle2D area =
          new Rectangle2D.Double(
              LEFT, TOP + i * (double) (PANEL + GAP), WIDTH - LEFT - RIGHT, PANEL);
      panel(g, area, chart.rows().get(i), greatest);
    }
  }

  private static void panel(
      Graphics2D g, Rectangle2D area, SectionLevels.Row row, double greatest) {
    NumberAxis across = new NumberAxis("seconds from the first line closing");
    across.setNumberFormatOverride(DecadeAxis.plainNumbers());
    across.setRange(0.0, row.endSeconds());
    NumberAxis up = new NumberAxis("share of limit, %");
    up.setNumberFormatOverride(DecadeAxis.plainNumbers());
    up.setRange(0.0, greatest * 100.0);
    Frame frame = new Frame(area, across, up);
    frame.draw(g, true, true);
    double wall = frame.y(100.0);
    g.setColor(Ink.PART);
    Hatching.over(
        g, new Rectangle2D.Double(area.getX(), area.getY(), area.getWidth(), wall - area.getY()));
    g.setStroke(Ink.WALL);
    g.draw(new Line2D.Double(area.getX(), wall, area.getMaxX(), wall));
    Words words = new Words(g);
    words.left(row.title(), Ink.STRONG, Ink.TEXT, area.getX(), area.getY() - 9);
    words.left("limit", Ink.SMALL, Ink.PART, area.getMaxX() + 8, wall + 4);
    closings(g, frame, row);
    Shape clip = g.getClip();
    g.clip(area);
    Marks.frame(g, frame, "at", "s", "%");
    for (SectionLevels.Section section : row.sections()) {
      double[] shares = section.level().levels();
      for (int k = 0; k < shares.length; k++) {
        shares[k] *= 100.0;
      }
      Marks.series(g, "section " + section.number());
      g.setColor(Ink.PART);
      g.setStroke(Ink.COMPUTED);
      Path2D path = Shapes.line(frame, section.level().seconds(), shares);
      g.draw(path);
    }
    Marks.none(g);
    g.setClip(clip);
    ends(g, frame, row);
  }

  private static void closings(Graphics2D g, Frame frame, SectionLevels.Row row) {
    Words words = new Words(g);
    List<Double> closings = row.closings();
    for (int n = 0; n < closings.size(); n++) {
      double x = frame.x(closings.get(n));
      g.setColor(Ink.QUIET);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(x, frame.area().getY(), x, frame.area().getMaxY()));
      if (n > 0) {
        words.plate("start " + (n + 1), Ink.SMALL, Ink.QUIET, x + 4, frame.y(100.0) + 18);
      }
    }
  }

  private static void ends(Graphics2D g, Frame frame, SectionLevels.Row row) {
    Words words = new Words(g);
    List<SectionLevels.Section> sections = row.sections();
    double[] wanted = new double[sections.size()];
    for (int i = 0; i < wanted.length; i++) {
      wanted[i] = frame.y(100.0 * at(sections.get(i), row.endSeconds())) + 5;
    }
    double[] y =
        EndLabels.spread(wanted, LINE, frame.area().getY() + 34, frame.area().getMaxY() + 4);
    for (int i = 0; i < wanted.length; i++) {
      double greatest = sections.get(i).level().greatest();
      double edge = frame.area().getMaxX();
      g.setColor(Ink.PART);
      g.setStroke(Ink.EDGE);
      g.draw(new Line2D.Double(edge, wanted[i] - 5, edge + 14, y[i] - 5));
      words.left(
          "section " + sections.get(i).number() + ": " + Show.percent(greatest),
          greatest >= 1.0 ? Ink.STRONG : Ink.SMALL,
          Ink.DEVICE,
          edge + 17,
          y[i]);
    }
  }

  /** Level at the end of the picture. */
  private static double at(SectionLevels.Section section, double end) {
    double[] seconds = section.level().seconds();
    double[] levels = section.level().levels();
    double level = levels[0];
    for (int i = 0; i < seconds.length && seconds[i] <= end; i++) {
      level = levels[i];
    }
    return level;
  }
}
