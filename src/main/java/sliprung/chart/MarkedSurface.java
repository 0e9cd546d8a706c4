package sliprung.chart;

import java.awt.Shape;
import java.util.ArrayList;
import java.util.List;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGShape;
import org.w3c.dom.Element;

/** An SVG surface that writes marks beside what is painted, as attributes of the page's own. */
final class MarkedSurface extends SVGGraphics2D implements Marks.Marked {
  private final List<String> frames = new ArrayList<>();
  private String series = "";
  private String line = "";
  private boolean drawing;

  MarkedSurface(SVGGeneratorContext context) {
    super(context, false);
    shapeConverter =
        new SVGShape(context) {
          @Override
          public Element toSVG(Shape shape) {
            return marked(super.toSVG(shape));
          }
        };
  }

  private Element marked(Element element) {
    if (element != null && !series.isEmpty()) {
      element.setAttribute("class", "series");
      element.setAttribute("data-series", series);
      if (drawing && !frames.isEmpty()) {
        element.setAttribute("data-line", line);
        element.setAttribute("data-frame", Integer.toString(frames.size() - 1));
      }
    }
    return element;
  }

  /** Every frame so far as a JSON array. */
  String frames() {
    return "[" + String.join(",", frames) + "]";
  }

  @Override
  public void frame(String json) {
    frames.add(json);
  }

  @Override
  public void series(String name, String lineName) {
    this.series = name;
    this.line = lineName;
  }

  @Override
  public void draw(Shape shape) {
    drawing = true;
    super.draw(shape);
    drawing = false;
  }
}
