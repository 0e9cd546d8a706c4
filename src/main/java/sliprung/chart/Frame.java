package sliprung.chart;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.AxisLocation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;

/**
 * Axes and grid around an area of fixed place, and the way from quantities to places on it.
 *
 * @param area inside the axes
 * @param across axis below
 * @param up axis on the left
 */
record Frame(Rectangle2D area, ValueAxis across, ValueAxis up) {
  private static final int MAJOR_TICK = 5;
  private static final int MINOR_TICK = 3;

  /** Place of a value on the axis below. */
  double x(double value) {
    return across.valueToJava2D(value, area, RectangleEdge.BOTTOM);
  }

  /** Place of a value on the axis on the left. */
  double y(double value) {
    return up.valueToJava2D(value, area, RectangleEdge.LEFT);
  }

  /** Draws grid and axes. The axis on the left is left out where it carries no quantity. */
  void draw(Graphics2D surface, boolean acrossShown, boolean upShown) {
    boolean decades = across instanceof DecadeAxis;
    XYPlot plot = new XYPlot(null, across, up, new XYLineAndShapeRenderer());
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    plot.setBackgroundPaint(null);
    plot.setOutlineVisible(false);
    plot.setDomainGridlinePaint(decades ? Ink.DECADE : Ink.GRID);
    plot.setDomainGridlineStroke(Ink.EDGE);
    plot.setDomainMinorGridlinePaint(Ink.GRID);
    plot.setDomainMinorGridlineStroke(Ink.EDGE);
    plot.setDomainMinorGridlinesVisible(decades);
    plot.setRangeGridlinesVisible(upShown);
    plot.setRangeMinorGridlinesVisible(upShown && up instanceof DecadeAxis);
    plot.setRangeGridlinePaint(up instanceof DecadeAxis ? Ink.DECADE : Ink.GRID);
    plot.setRangeGridlineStroke(Ink.EDGE);
    plot.setRangeMinorGridlinePaint(Ink.GRID);
    plot.setRangeMinorGridlineStroke(Ink.EDGE);
    plot.setDomainAxisLocation(AxisLocation.BOTTOM_OR_LEFT);
    style(across);
    style(up);
    across.setTickLabelsVisible(acrossShown);
    if (!acrossShown) {
      across.setLabel(null);
    }
    up.setVisible(upShown);
    // the plot is given just so much room that its inside comes to lie on the area
    plot.setInsets(RectangleInsets.ZERO_INSETS);
    plot.setFixedDomainAxisSpace(space());
    plot.setFixedRangeAxisSpace(space());
    Rectangle2D whole =
        new Rectangle2D.Double(
            area.getX() - LEFT,
            area.getY() - TOP,
            area.getWidth() + LEFT + RIGHT,
            area.getHeight() + TOP + BOTTOM);
    java.awt.Shape clip = surface.getClip();
    plot.draw(surface, whole, null, null, null);
    surface.setClip(clip);
  }

  private static final int LEFT = 64;
  private static final int RIGHT = 8;
  private static final int TOP = 8;
  private static final int BOTTOM = 48;

  private static org.jfree.chart.axis.AxisSpace space() {
    org.jfree.chart.axis.AxisSpace space = new org.jfree.chart.axis.AxisSpace();
    space.setLeft(LEFT);
    space.setRight(RIGHT);
    space.setTop(TOP);
    space.setBottom(BOTTOM);
    return space;
  }

  private static void style(ValueAxis axis) {
    axis.setTickLabelFont(Ink.SMALL);
    axis.setTickLabelPaint(Ink.TEXT);
    axis.setLabelFont(Ink.LABEL);
    axis.setLabelPaint(Ink.TEXT);
    axis.setAxisLinePaint(Ink.QUIET);
    axis.setTickMarkPaint(Ink.QUIET);
    axis.setAxisLineStroke(new BasicStroke(1f));
    axis.setTickMarkOutsideLength(MAJOR_TICK);
    axis.setMinorTickMarkOutsideLength(MINOR_TICK);
  }
}
