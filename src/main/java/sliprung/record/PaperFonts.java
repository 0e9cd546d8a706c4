package sliprung.record;

import java.io.IOException;
import java.io.InputStream;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/**
 * The program's own fonts in a document, embedded as far as they are used.
 *
 * @param plain text
 * @param bold headings
 * @param mono files and hashes
 */
record PaperFonts(PDFont plain, PDFont bold, PDFont mono) {

  static PaperFonts in(PDDocument document) throws IOException {
    return new PaperFonts(
        load(document, "DejaVuSans.ttf"),
        load(document, "DejaVuSans-Bold.ttf"),
        load(document, "DejaVuSansMono.ttf"));
  }

  private static PDFont load(PDDocument document, String name) throws IOException {
    try (InputStream stream = PaperFonts.class.getResourceAsStream("/sliprung/fonts/" + name)) {
      if (stream == null) {
        throw new IllegalStateException("no font " + name + " in the program");
      }
      return PDType0Font.load(document, stream, true);
    }
  }
}
