package sliprung.record;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/**
 * The one script of a page: charts answer pointer and keyboard. The page allows it by its hash and
 * says everything without it.
 */
final class PageScript {
  private static final String TEXT = read();

  private PageScript() {}

  /** The script, free of what is markup in XML. */
  static String text() {
    return TEXT;
  }

  private static String read() {
    try (InputStream stream = PageScript.class.getResourceAsStream("/sliprung/record/charts.js")) {
      if (stream == null) {
        throw new IllegalStateException("no script in the program");
      }
      String text = new String(stream.readAllBytes(), StandardCharsets.UTF_8).replace("\r\n", "\n");
      if (text.indexOf('<') >= 0 || text.indexOf('&') >= 0) {
        throw new IllegalStateException("the script would break the page's markup");
      }
      return text;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
