package sliprung.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * A logarithmic axis with plain numbers at the decades and a grid line at every 2 to 9. The
 * library's own axis misses decades by rounding, leaves out the first decade's grid and never draws
 * minor ticks.
 */
final class DecadeAxis extends LogAxis {
  private static final long serialVersionUID = 1L;
  private static final double SLACK = 1e-9;
  private static final double FEW_DECADES = 2.5;
  private final double from;
  private final double to;

  /**
   * An axis.
   *
   * @param label with the unit
   * @param from least value, above 0
   * @param to greatest value
   */
  DecadeAxis(String label, double from, double to) {
    super(label);
    this.from = from;
    this.to = to;
    setSmallestValue(from);
    setRange(from, to);
    setMinorTickMarksVisible(true);
    setNumberFormatOverride(plainNumbers());
  }

  /** Plain notation, thousands apart. */
  static DecimalFormat plainNumbers() {
    DecimalFormatSymbols symbols = DecimalFormatSymbols.getInstance(Locale.ROOT);
    symbols.setGroupingSeparator('\u00a0');
    return new DecimalFormat("#,##0.#####", symbols);
  }

  @Override
  public double calculateLog(double value) {
    return Math.log10(value);
  }

  @Override
  protected List<NumberTick> refreshTicksHorizontal(
      Graphics2D surface, Rectangle2D area, RectangleEdge edge) {
    return ticks(edge == RectangleEdge.TOP ? TextAnchor.BOTTOM_CENTER : TextAnchor.TOP_CENTER);
  }

  @Override
  protected List<NumberTick> refreshTicksVertical(
      Graphics2D surface, Rectangle2D area, RectangleEdge edge) {
    return ticks(edge == RectangleEdge.RIGHT ? TextAnchor.CENTER_LEFT : TextAnchor.CENTER_RIGHT);
  }

  private List<NumberTick> ticks(TextAnchor anchor) {
    boolean few = Math.log10(to / from) < FEW_DECADES;
    List<NumberTick> ticks = new ArrayList<>();
    int first = (int) Math.floor(Math.log10(from));
    int last = (int) Math.ceil(Math.log10(to));
    for (int decade = first; decade <= last; decade++) {
      for (int m = 1; m <= 9; m++) {
        double value = Double.parseDouble(m + "e" + decade);
        if (value < from * (1.0 - SLACK) || value > to * (1.0 + SLACK)) {
          continue;
        }
        boolean labelled = m == 1 || (few && (m == 2 || m == 5));
        ticks.add(
            new NumberTick(
                m == 1 ? TickType.MAJOR : TickType.MINOR,
                value,
                labelled ? getNumberFormatOverride().format(value) : "",
                anchor,
                TextAnchor.CENTER,
                0.0));
      }
    }
    return ticks;
  }
}
