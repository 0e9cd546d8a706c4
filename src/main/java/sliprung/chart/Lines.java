package sliprung.chart;

import java.util.ArrayList;
import java.util.List;

/** Text made fit for a chart. */
final class Lines {
  private static final char REPLACEMENT = '\uFFFD';

  private Lines() {}

  /** The text broken at spaces into lines of at most so many letters; a longer word stays whole. */
  static List<String> broken(String text, int letters) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : printable(text).split(" ")) {
      if (line.length() > 0 && line.length() + 1 + word.length() > letters) {
        lines.add(line.toString());
        line.setLength(0);
      }
      line.append(line.length() == 0 ? "" : " ").append(word);
    }
    lines.add(line.toString());
    return lines;
  }

  /** The text cut to so many letters, with an ellipsis where something is missing. */
  static String cut(String text, int letters) {
    String whole = printable(text);
    return whole.length() <= letters ? whole : whole.substring(0, letters - 1).strip() + "…";
  }

  /**
   * The text with every character that XML 1.0 cannot hold replaced (clause 2.2, production Char:
   * control characters, unpaired surrogates, U+FFFE and U+FFFF); line ends become spaces.
   */
  static String printable(String text) {
    StringBuilder out = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            c -> {
              boolean surrogate = c >= 0xD800 && c <= 0xDFFF;
              if (c == '\n' || c == '\r' || c == '\t') {
                out.append(' ');
              } else if (c < 0x20
                  || (c >= 0x7F && c <= 0x9F)
                  || surrogate
                  || c == 0xFFFE
                  || c == 0xFFFF) {
                out.append(REPLACEMENT);
              } else {
                out.appendCodePoint(c);
              }
            });
    return out.toString();
  }
}
