package sliprung.config;

import java.util.Optional;

/**
 * One mistake in a file of the user's.
 *
 * @param place where
 * @param path of the key, such as {@code resistors.sections[2].resistance}; empty for the file as a
 *     whole
 * @param message one sentence: what was expected and what was found
 * @param hint what to write instead
 * @param sourceLine the line of the file; empty where there is none
 */
public record Diagnostic(
    Place place, String path, String message, Optional<String> hint, String sourceLine) {

  /** Longest piece of a source line that is printed, in code points. */
  private static final int WIDTH = 160;

  /** For people: place and message, the line with a caret under the column, the hint. */
  public String render() {
    StringBuilder out = new StringBuilder();
    out.append(place).append(": error: ");
    if (!path.isEmpty()) {
      out.append(path).append(": ");
    }
    out.append(message).append('\n');
    if (!sourceLine.isBlank() && place.column() <= WIDTH) {
      String number = String.valueOf(place.line());
      out.append("    ").append(number).append(" | ").append(shown()).append('\n');
      out.append("    ").append(" ".repeat(number.length())).append(" | ");
      out.append(" ".repeat(Math.max(0, place.column() - 1))).append("^\n");
    }
    hint.ifPresent(h -> out.append("  hint: ").append(h).append('\n'));
    return out.toString();
  }

  private String shown() {
    int length = sourceLine.codePointCount(0, sourceLine.length());
    String cut =
        length <= WIDTH
            ? sourceLine
            : sourceLine.substring(0, sourceLine.offsetByCodePoints(0, WIDTH)) + "…";
    return cut.replaceAll("\\p{C}", " ");
  }
}
