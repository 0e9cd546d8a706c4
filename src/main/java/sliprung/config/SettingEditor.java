package sliprung.config;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Changes values in the text of a starter file and nothing else: comments, order, layout and the
 * unit of each value stay as they are.
 */
public final class SettingEditor {
  private static final Pattern LINE_END = Pattern.compile("\r\n|[\r\n\u0085\u2028\u2029]");
  private static final String GAP = "[ \u00a0\u202f\u2009]";
  private static final Pattern QUANTITY =
      Pattern.compile(
          "(\\+?(?:[0-9]+(?:"
              + GAP
              + "[0-9]{3})*(?:\\.[0-9]*)?|\\.[0-9]+)(?:[eE][+\\-]?[0-9]{1,4})?)("
              + GAP
              + "*)([^0-9 ].*)?");
  private static final int FIGURES = 6;

  private final StarterReading.Described file;

  /** An editor of a file that was read. */
  public SettingEditor(StarterReading.Described file) {
    this.file = file;
  }

  /** A text, or why there is none. */
  public sealed interface Edited {}

  /**
   * The text with the new values.
   *
   * @param text whole file, without a byte order mark
   */
  public record Text(String text) implements Edited {}

  /**
   * A value that cannot be changed in place.
   *
   * @param path of the value
   * @param reason end of a sentence
   */
  public record Refusal(String path, String reason) implements Edited {}

  private record Change(int from, int to, String text) {}

  /**
   * Changes values.
   *
   * @param values in SI units, by path as the reader names it, such as {@code steps[1].after}
   */
  public Edited with(Map<String, Double> values) {
    String text = file.inputs().get(0).text();
    List<Change> changes = new ArrayList<>();
    for (Map.Entry<String, Double> value : values.entrySet()) {
      String path = value.getKey();
      Optional<ReadValue> read =
          file.values().stream().filter(v -> v.path().equals(path)).findFirst();
      Optional<Place> place = file.place(path);
      if (read.isEmpty() || place.isEmpty() || read.get().value().isEmpty()) {
        return new Refusal(path, "the file does not give it");
      }
      int at = position(text, place.get());
      String typed = read.get().text();
      // a quoted value begins behind its quote
      int from = at >= 0 && at < text.length() && "'\"".indexOf(text.charAt(at)) >= 0 ? at + 1 : at;
      if (from < 0 || !text.startsWith(typed, from)) {
        return new Refusal(path, "it does not stand on one line as it is read");
      }
      Optional<String> fresh = inItsUnit(typed, read.get().value().getAsDouble(), value.getValue());
      if (fresh.isEmpty()) {
        return new Refusal(path, "its unit cannot be kept for another value");
      }
      changes.add(new Change(from, from + typed.length(), fresh.get()));
    }
    changes.sort(Comparator.comparingInt(Change::from).reversed());
    StringBuilder out = new StringBuilder(text);
    changes.forEach(c -> out.replace(c.from(), c.to(), c.text()));
    return new Text(out.toString());
  }

  /** Index of a place in a text; −1 where the text has no such place. */
  private static int position(String text, Place place) {
    Matcher end = LINE_END.matcher(text);
    int start = 0;
    for (int line = 1; line < place.line(); line++) {
      if (!end.find()) {
        return -1;
      }
      start = end.end();
    }
    int points = text.codePointCount(start, text.length());
    return place.column() - 1 > points ? -1 : text.offsetByCodePoints(start, place.column() - 1);
  }

  /** The new value as the old one was typed: same unit, same space before it. */
  private static Optional<String> inItsUnit(String typed, double was, double is) {
    Matcher matcher = QUANTITY.matcher(typed);
    if (!matcher.matches()) {
      return Optional.empty();
    }
    double number = Double.parseDouble(matcher.group(1).replaceAll(GAP, ""));
    if (!(number > 0.0) || !(was > 0.0)) {
      return Optional.empty();
    }
    BigDecimal fresh =
        new BigDecimal(is / (was / number))
            .round(new MathContext(FIGURES, RoundingMode.HALF_EVEN))
            .stripTrailingZeros();
    String unit = matcher.group(3) == null ? "" : matcher.group(3);
    return Optional.of(fresh.toPlainString() + matcher.group(2) + unit);
  }
}
