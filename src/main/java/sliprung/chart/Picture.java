package sliprung.chart;

import java.awt.Graphics2D;

/**
 * A chart ready to be written.
 *
 * @param name short, of letters and hyphens: file name and prefix of ids
 * @param title what kind of chart this is
 * @param says the sentence above it: what to see
 * @param width of its own co-ordinates, px
 * @param height likewise
 * @param painter paints it
 */
public record Picture(
    String name, String title, String says, int width, int height, Painter painter) {

  /** Paints on a surface of the picture's size. */
  @FunctionalInterface
  public interface Painter {
    /** Paints. */
    void paint(Graphics2D surface);
  }

  /** Checks the name. */
  public Picture {
    if (!name.matches("[a-z][a-z-]*")) {
      throw new IllegalArgumentException(name);
    }
  }
}
