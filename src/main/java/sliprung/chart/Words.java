package sliprung.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/** Puts words on a chart; whatever a user typed passes here and is made printable. */
final class Words {
  private final Graphics2D surface;

  Words(Graphics2D surface) {
    this.surface = surface;
  }

  /** Width of a text, px. */
  double width(String text, Font font) {
    return surface.getFontMetrics(font).stringWidth(Lines.printable(text));
  }

  /** Starts at x, on the base line y. */
  void left(String text, Font font, Color colour, double x, double y) {
    surface.setFont(font);
    surface.setColor(Ink.letters(colour));
    surface.drawString(Lines.printable(text), (float) x, (float) y);
  }

  /** Ends at x. */
  void right(String text, Font font, Color colour, double x, double y) {
    left(text, font, colour, x - width(text, font), y);
  }

  /** Centred on x. */
  void centre(String text, Font font, Color colour, double x, double y) {
    left(text, font, colour, x - width(text, font) / 2.0, y);
  }

  /** As {@link #left}, on a plate of paper that hides what lies below. */
  void plate(String text, Font font, Color colour, double x, double y) {
    FontMetrics metrics = surface.getFontMetrics(font);
    surface.setColor(Ink.PAPER);
    surface.fill(
        new Rectangle2D.Double(
            x - 2,
            y - metrics.getAscent() + 1,
            width(text, font) + 4,
            metrics.getAscent() + metrics.getDescent() - 1.0));
    left(text, font, colour, x, y);
  }
}
