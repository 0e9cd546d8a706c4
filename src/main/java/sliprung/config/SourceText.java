package sliprung.config;

import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.yaml.snakeyaml.reader.StreamReader;

/**
 * The text of a file, by lines.
 *
 * @param name as the user gave it
 * @param text without a byte order mark
 * @param lines without their ends
 */
record SourceText(String name, String text, List<String> lines) {

  /** The line ends that YAML 1.1 knows, so that our lines are the parser's lines. */
  private static final String LINE_END = "\r\n|[\r\n\u0085\u2028\u2029]";

  static SourceText of(String name, String text) {
    String clean = text.startsWith("\ufeff") ? text.substring(1) : text;
    return new SourceText(name, clean, List.of(clean.split(LINE_END, -1)));
  }

  /** The line of that number from 1; empty beyond the last. */
  String line(int number) {
    return number >= 1 && number <= lines.size() ? lines.get(number - 1) : "";
  }

  /** The place of a position in the text, in chars. */
  Place placeAt(int position) {
    List<String> before = List.of(text.substring(0, position).split(LINE_END, -1));
    String last = before.get(before.size() - 1);
    return new Place(name, before.size(), last.codePointCount(0, last.length()) + 1);
  }

  /** The first character that no YAML text may hold. */
  Optional<Integer> firstUnprintable() {
    int i = 0;
    while (i < text.length()) {
      int codePoint = text.codePointAt(i);
      if (!StreamReader.isPrintable(codePoint)) {
        return Optional.of(i);
      }
      i += Character.charCount(codePoint);
    }
    return Optional.empty();
  }

  /** Decodes UTF-8 strictly: text, or the mistake. */
  static Decoded decode(String name, byte[] bytes) {
    CharsetDecoder decoder =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    CharBuffer out = CharBuffer.allocate(bytes.length + 1);
    CoderResult result = decoder.decode(ByteBuffer.wrap(bytes), out, true);
    SourceText read = of(name, out.flip().toString());
    if (!result.isError()) {
      return new Decoded(read, Optional.empty());
    }
    Place place = read.placeAt(read.text().length());
    return new Decoded(
        read,
        Optional.of(
            new Diagnostic(
                place,
                "",
                "expected text in UTF-8 but found bytes that are none",
                Optional.of("save the file as UTF-8"),
                "")));
  }

  /**
   * Decoded text.
   *
   * @param source the text up to the first mistake
   * @param mistake if any
   */
  record Decoded(SourceText source, Optional<Diagnostic> mistake) {}
}
