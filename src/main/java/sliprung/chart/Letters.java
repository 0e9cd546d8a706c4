package sliprung.chart;

import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The letters that charts are laid out with: the program's own, the same on every machine. */
final class Letters {
  private static final Font PLAIN = read("DejaVuSans.ttf");
  private static final Font BOLD = read("DejaVuSans-Bold.ttf");

  private Letters() {}

  static Font plain(float size) {
    return PLAIN.deriveFont(size);
  }

  static Font bold(float size) {
    return BOLD.deriveFont(Font.BOLD, size);
  }

  private static Font read(String name) {
    try (InputStream stream = Letters.class.getResourceAsStream("/sliprung/fonts/" + name)) {
      if (stream == null) {
        throw new IllegalStateException("no font " + name + " in the program");
      }
      return Font.createFont(Font.TRUETYPE_FONT, stream);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (FontFormatException e) {
      throw new IllegalStateException("the program's font " + name + " is broken", e);
    }
  }
}
