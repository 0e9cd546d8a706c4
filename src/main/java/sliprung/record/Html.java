package sliprung.record;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;

/**
 * Builds a page that is well-formed as HTML and as XML. Every text and attribute is escaped here,
 * so nothing a user typed can become markup.
 */
final class Html {
  private static final char REPLACEMENT = '\uFFFD';
  private final StringBuilder out = new StringBuilder();
  private final Deque<String> open = new ArrayDeque<>();
  private final List<Heading> headings = new ArrayList<>();
  private final Figures figures;

  /** A page whose figures are made that way. */
  Html(Figures figures) {
    this.figures = figures;
  }

  /**
   * A section of the page.
   *
   * @param id within the page
   * @param title its heading
   */
  record Heading(String id, String title) {}

  /** How charts and bars are put here. */
  Figures figures() {
    return figures;
  }

  /** The sections opened so far. */
  List<Heading> headings() {
    return List.copyOf(headings);
  }

  /** Opens a section with its heading; the caller ends it. */
  Html section(String id, String title, String... attributes) {
    headings.add(new Heading(id, title));
    List<String> all = new ArrayList<>(List.of("id", id));
    all.addAll(List.of(attributes));
    open("section", all.toArray(String[]::new)).markup("\n");
    return element("h2", title);
  }

  /** Opens an element; attributes come as name, value, name, value. */
  Html open(String tag, String... attributes) {
    begin(tag, attributes).append('>');
    open.push(tag);
    return this;
  }

  /** Closes the element that was opened last. */
  Html close() {
    out.append("</").append(open.pop()).append('>');
    return this;
  }

  /** Closes the element that was opened last and ends the line. */
  Html end() {
    close();
    out.append('\n');
    return this;
  }

  /** An element without content. */
  Html empty(String tag, String... attributes) {
    begin(tag, attributes).append("/>");
    return this;
  }

  /** An element with a text. */
  Html element(String tag, String text, String... attributes) {
    return open(tag, attributes).text(text).end();
  }

  /** A text. */
  Html text(String text) {
    out.append(escaped(figures.fitted(text)));
    return this;
  }

  /** Markup that this program itself has made, such as a drawn chart. */
  Html markup(String ours) {
    out.append(ours);
    return this;
  }

  /** Whether a character changes the direction of what follows, so that a line reads falsely. */
  private static boolean turnsText(int c) {
    return c == 0x061C
        || c == 0x200E
        || c == 0x200F
        || (c >= 0x202A && c <= 0x202E)
        || (c >= 0x2066 && c <= 0x2069);
  }

  private StringBuilder begin(String tag, String... attributes) {
    out.append('<').append(tag);
    for (int i = 0; i + 1 < attributes.length; i += 2) {
      out.append(' ').append(attributes[i]).append("=\"");
      out.append(escaped(attributes[i + 1])).append('"');
    }
    return out;
  }

  private static final Map<Integer, String> NAMED =
      Map.of(
          (int) '<', "&lt;",
          (int) '>', "&gt;",
          (int) '&', "&amp;",
          (int) '"', "&quot;",
          (int) '\'', "&#39;");

  /**
   * A text without markup. Characters that XML 1.0 cannot hold (clause 2.2, production Char), the
   * controls of Latin 1 and those that turn the direction of a line are replaced.
   */
  static String escaped(String text) {
    StringBuilder escaped = new StringBuilder(text.length() + 16);
    text.codePoints()
        .forEach(
            c -> {
              String name = NAMED.get(c);
              boolean whitespace = c == '\t' || c == '\n' || c == '\r';
              boolean control = (c < 0x20 && !whitespace) || (c >= 0x7F && c <= 0x9F);
              boolean surrogate = c >= 0xD800 && c <= 0xDFFF;
              if (name != null) {
                escaped.append(name);
              } else if (c == '\r') {
                // XML would turn it into a line end by itself
                escaped.append("&#13;");
              } else if (control || surrogate || turnsText(c) || c == 0xFFFE || c == 0xFFFF) {
                escaped.append(REPLACEMENT);
              } else {
                escaped.appendCodePoint(c);
              }
            });
    return escaped.toString();
  }

  /** The page so far; every element must be closed. */
  @Override
  public String toString() {
    if (!open.isEmpty()) {
      throw new IllegalStateException("still open: " + open);
    }
    return out.toString();
  }
}
