package sliprung.record;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import sliprung.chart.Picture;

/** Figures of a page for paper: objects of a given size that the PDF fills with drawings. */
final class PaperFigures implements Figures {
  static final String CHART = "sliprung/chart";
  static final String BAR = "sliprung/bar";

  /** Of the text's width, so that two charts with their sentences find room on a sheet. */
  private static final double CHART_SHARE = 0.92;

  /** So many letters without a place to break. */
  private static final Pattern OVERLONG = Pattern.compile("[^\\s\u200B]{32}(?=[^\\s])");

  private final Map<String, Picture> pictures = new LinkedHashMap<>();
  private final double widthMillimetres;

  PaperFigures(Paper paper) {
    this.widthMillimetres = paper.textMillimetres();
  }

  /** The charts put so far, by name. */
  Map<String, Picture> pictures() {
    return pictures;
  }

  @Override
  public void chart(Html page, Picture picture) {
    pictures.put(picture.name(), picture);
    double width = CHART_SHARE * widthMillimetres;
    object(page, CHART, picture.name(), "block", width, width * picture.height() / picture.width());
  }

  @Override
  public void bar(Html page, double share) {
    object(page, BAR, Double.toString(share), "inline-block", 20.0, 20.0 * 16.0 / 120.0);
  }

  @Override
  public int rowsAbreast() {
    return 2;
  }

  /** A word too long for a column may be broken at every so many letters. */
  @Override
  public String fitted(String text) {
    return OVERLONG.matcher(text).replaceAll("$0\u200B");
  }

  private static void object(
      Html page, String type, String data, String display, double width, double height) {
    page.open(
            "object",
            "type",
            type,
            "data-of",
            data,
            "style",
            String.format(
                Locale.ROOT, "display:%s;width:%.2fmm;height:%.2fmm", display, width, height))
        .close();
  }
}
