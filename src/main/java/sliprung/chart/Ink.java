package sliprung.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Stroke;

/**
 * Colours, strokes and letters of every chart. Hues: the colour-blind safe set of Okabe and Ito
 * (Color Universal Design, 2008; from memory).
 */
final class Ink {
  static final Color STATOR = new Color(0x0072B2);
  static final Color RING = new Color(0x009E73);
  static final Color PART = new Color(0xD55E00);
  static final Color LOAD = new Color(0x56B4E9);
  static final Color TEXT = new Color(0x1A1A1A);
  static final Color DEVICE = new Color(0x333333);
  static final Color MIDDLE = new Color(0x8A8A8A);
  static final Color QUIET = new Color(0x595959);
  static final Color GRID = new Color(0xE4E4E4);
  static final Color DECADE = new Color(0xBDBDBD);
  static final Color COLUMN = new Color(0xF4F4F4);
  static final Color BAND = new Color(0xDDDDDD);
  static final Color PAPER = Color.WHITE;

  /** Of the corner bands: light enough to read a line in the same hue on it. */
  static final Color STATOR_BAND = new Color(0xCFE3F0);

  static final Color RING_BAND = new Color(0xCDEBE1);
  static final Color SPEED_BAND = new Color(0xE3E3E3);

  static final Stroke COMPUTED = new BasicStroke(2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
  static final Stroke EDGE = new BasicStroke(1f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
  static final Stroke DASHED =
      new BasicStroke(
          2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10f, new float[] {7f, 4f}, 0f);
  static final Stroke WALL = new BasicStroke(3f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER);

  static final Font LABEL = Letters.plain(13);
  static final Font STRONG = Letters.bold(13);
  static final Font SMALL_STRONG = Letters.bold(12);
  static final Font FINE = Letters.plain(11);
  static final Font SMALL = Letters.plain(12);

  private static final Color RING_LETTERS = new Color(0x00734F);
  private static final Color PART_LETTERS = new Color(0xA84A00);
  private static final Color LOAD_LETTERS = new Color(0x1F6E9C);

  /** The colour of letters that name a line: darker than a line where its hue is too pale. */
  static Color letters(Color line) {
    if (line.equals(RING)) {
      return RING_LETTERS;
    }
    if (line.equals(PART)) {
      return PART_LETTERS;
    }
    return line.equals(LOAD) ? LOAD_LETTERS : line;
  }

  private Ink() {}
}
