package sliprung.chart;

import java.awt.RenderingHints;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2DIOException;
import org.apache.batik.svggen.SVGIDGenerator;
import org.apache.batik.svggen.SVGSyntax;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;

/**
 * Writes pictures as SVG 1.1: the same bytes every time, text as text, every id led by the
 * picture's name so that several pictures can stand in one page.
 */
public final class Svg {
  private static final String NAMESPACE = "http://www.w3.org/2000/svg";
  private static final String LETTERS =
      "system-ui, 'Segoe UI', Roboto, 'Helvetica Neue', Arial, 'DejaVu Sans', sans-serif";
  private static final int DECIMALS = 2;
  private static final int CAPTION_LINE = 20;
  private static final int CAPTION_SIZE = 15;
  private static final int CAPTION_LETTERS = 105;

  private Svg() {}

  /** An {@code svg} element to stand in a page that says its sentence itself. */
  public static String inline(Picture picture) {
    return write(picture);
  }

  /** A file of its own, with the sentence above the chart. */
  public static String file(Picture picture) {
    return file(picture, inline(picture));
  }

  /**
   * The same around an element that is already drawn.
   *
   * @param inline what {@link #inline} gave for the picture
   */
  public static String file(Picture picture, String inline) {
    List<String> lines = Lines.broken(picture.says(), CAPTION_LETTERS);
    int above = lines.size() * CAPTION_LINE + CAPTION_LINE / 2;
    int height = picture.height() + above;
    StringBuilder out = new StringBuilder(inline.length() + 1024);
    out.append("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"" + NAMESPACE + "\"");
    out.append(" viewBox=\"0 0 " + picture.width() + " " + height + "\"");
    out.append(" width=\"" + picture.width() + "\" height=\"" + height + "\">\n");
    out.append("<g aria-hidden=\"true\" fill=\"#1a1a1a\" font-weight=\"bold\" font-size=\"");
    out.append(CAPTION_SIZE + "\" font-family=\"" + LETTERS + "\">\n");
    for (int i = 0; i < lines.size(); i++) {
      out.append("<text x=\"4\" y=\"" + (CAPTION_LINE * (i + 1) - 4) + "\">");
      out.append(escaped(lines.get(i))).append("</text>\n");
    }
    out.append("</g>\n");
    return out + inline.replaceFirst("<svg ", "<svg y=\"" + above + "\" ") + "</svg>\n";
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }

  private static String write(Picture picture) {
    Document document =
        GenericDOMImplementation.getDOMImplementation().createDocument(NAMESPACE, "svg", null);
    SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
    context.setComment(null);
    context.setPrecision(DECIMALS);
    context.setIDGenerator(
        new SVGIDGenerator() {
          @Override
          public String generateID(String prefix) {
            return super.generateID(picture.name() + "-" + prefix);
          }
        });
    MarkedSurface surface = new MarkedSurface(context);
    // the axes put this hint back as they found it, and Batik refuses to be given none
    surface.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    picture.painter().paint(surface);
    Element root = surface.getRoot();
    describe(root, picture);
    root.setAttribute("data-frames", surface.frames());
    StringWriter out = new StringWriter();
    try {
      surface.stream(root, out, false, false);
    } catch (SVGGraphics2DIOException impossible) {
      // a StringWriter does not fail
      throw new UncheckedIOException(new java.io.IOException(impossible));
    }
    String text = out.toString().replace("\r\n", "\n");
    // the element alone: the document type that Batik writes names a DTD on the network
    return text.substring(text.indexOf("<svg")).strip() + "\n";
  }

  private static void describe(Element root, Picture picture) {
    root.setAttribute("viewBox", "0 0 " + picture.width() + " " + picture.height());
    root.setAttribute("width", Integer.toString(picture.width()));
    root.setAttribute("height", Integer.toString(picture.height()));
    root.setAttribute("role", "img");
    String title = picture.name() + "-title";
    String says = picture.name() + "-says";
    root.setAttribute("aria-labelledby", title + " " + says);
    letters(root);
    Node first = root.getFirstChild();
    root.insertBefore(element(root, "title", title, picture.title()), first);
    root.insertBefore(element(root, "desc", says, picture.says()), first);
  }

  private static Element element(Element root, String name, String id, String text) {
    Document document = root.getOwnerDocument();
    Element element = document.createElementNS(NAMESPACE, name);
    element.setAttribute("id", id);
    element.appendChild(document.createTextNode(Lines.printable(text)));
    return element;
  }

  /**
   * Puts the page's letters in the place of the logical fonts of Java, and takes away the one id,
   * never referred to, that every picture would share.
   */
  private static void letters(Element element) {
    if (element.getAttribute("id").equals(SVGSyntax.ID_PREFIX_GENERIC_DEFS)) {
      element.removeAttribute("id");
    }
    if (!element.getAttribute("font-family").isEmpty()) {
      element.setAttribute("font-family", LETTERS);
    }
    for (Node child = element.getFirstChild(); child != null; child = child.getNextSibling()) {
      if (child instanceof Element inner) {
        letters(inner);
      }
    }
  }
}
