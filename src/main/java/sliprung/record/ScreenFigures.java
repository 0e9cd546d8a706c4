package sliprung.record;

import java.util.Locale;
import java.util.Map;
import sliprung.chart.Picture;

/** Figures of a page for browsers: SVG within the page. */
final class ScreenFigures implements Figures {
  private final Map<String, String> drawn;

  /**
   * Figures.
   *
   * @param drawn the {@code svg} element of each picture, by the picture's name
   */
  ScreenFigures(Map<String, String> drawn) {
    this.drawn = drawn;
  }

  @Override
  public void chart(Html page, Picture picture) {
    page.open(
        "div", "class", "wide", "tabindex", "0", "role", "group", "aria-label", picture.title());
    page.markup(drawn.get(picture.name())).end();
  }

  @Override
  public void bar(Html page, double share) {
    MarginBar bar = new MarginBar(share);
    page.open(
        "svg",
        "xmlns",
        "http://www.w3.org/2000/svg",
        "class",
        bar.isShort() ? "bar short" : "bar",
        "width",
        Integer.toString(MarginBar.WIDTH),
        "height",
        Integer.toString(MarginBar.HEIGHT),
        "aria-hidden",
        "true");
    rectangle(page, "frame", 0.5, MarginBar.TOP + 0.5, MarginBar.WIDTH - 1.0);
    rectangle(page, "fill", 0.5, MarginBar.TOP + 0.5, bar.filled());
    page.empty(
        "path", "d", "M" + MarginBar.WIDTH / 2 + " 0V" + MarginBar.HEIGHT, "class", "wanted");
    page.close();
  }

  /** A row each, so that a reader's software meets it in order. */
  @Override
  public int rowsAbreast() {
    return 1;
  }

  @Override
  public String fitted(String text) {
    return text;
  }

  private static void rectangle(Html page, String kind, double x, double y, double width) {
    page.empty(
        "rect",
        "class",
        kind,
        "x",
        number(x),
        "y",
        number(y),
        "width",
        number(width),
        "height",
        number(MarginBar.HEIGHT - 2.0 * MarginBar.TOP - 1.0));
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.1f", value);
  }
}
