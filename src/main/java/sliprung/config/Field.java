package sliprung.config;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.quantity.Quantity;

/**
 * One value while it is read.
 *
 * @param reading gathers mistakes
 * @param path from the root, such as {@code motor.voltage} or {@code steps[2].after}
 * @param key as typed; of a list entry, empty
 * @param keyPlace where its key stands; of a list entry, the entry
 * @param value as typed
 */
record Field(Reading reading, String path, String key, Place keyPlace, YamlNode value) {
  private static final int LONGEST_TEXT = 400;

  /** A quantity in the dimension's unit; NaN after a mistake, which is then on record. */
  double number(Dimension dimension, Range range) {
    Optional<String> text = scalar(dimension.words(), dimension.examples().get(0));
    if (text.isEmpty()) {
      return Double.NaN;
    }
    Quantity.Parsed parsed = Quantity.parse(text.get(), dimension, reading.supplyHertz());
    if (parsed.mistake().isPresent()) {
      Quantity.Mistake mistake = parsed.mistake().get();
      boolean secondary =
          dimension == Dimension.TIME
              && reading.frequencyUnreadable()
              && text.get().contains("cycle");
      if (!secondary) {
        mistake("expected " + mistake.expected() + " but found " + mistake.found(), mistake.hint());
      }
      return Double.NaN;
    }
    double number = parsed.value().getAsDouble();
    if (!range.contains(number)) {
      mistake(
          "expected " + dimension.words() + " " + range.words() + " but found " + value.found());
      return Double.NaN;
    }
    reading.read(new ReadValue(path, text.get(), OptionalDouble.of(number), dimension.unit()));
    return number;
  }

  /** A whole number; empty after a mistake. */
  Optional<Integer> whole(int low, int high) {
    double number = number(Dimension.NUMBER, Range.ANY);
    if (Double.isNaN(number)) {
      return Optional.empty();
    }
    if (number != Math.rint(number) || number < low || number > high) {
      mistake(
          "expected a whole number from " + low + " to " + high + " but found " + value.found());
      return Optional.empty();
    }
    return Optional.of((int) number);
  }

  /** One of some words; empty after a mistake. */
  <T> Optional<T> choice(Map<String, T> words) {
    String expected = Wording.oneOf(words.keySet());
    Optional<String> text = scalar(expected, words.keySet().iterator().next());
    if (text.isEmpty()) {
      return Optional.empty();
    }
    T chosen = words.get(text.get().strip());
    if (chosen == null) {
      Optional<String> outside = OutsideScope.sentence(text.get().strip());
      if (outside.isPresent()) {
        mistake(outside.get());
      } else {
        reading.mistake(
            value.place(),
            path,
            "expected " + expected + " but found " + value.found(),
            Wording.nearest(text.get().strip(), words.keySet())
                .map(w -> "did you mean '" + w + "'?"));
      }
    }
    return Optional.ofNullable(chosen);
  }

  /** Yes or no. */
  Optional<Boolean> yesOrNo() {
    return choice(Words.inOrder("true", true, "false", false));
  }

  /** Any words on one line; empty after a mistake. */
  Optional<String> text(String expected) {
    Optional<String> text = scalar(expected, "…");
    if (text.isPresent() && text.get().codePoints().anyMatch(Field::isControl)) {
      mistake("expected " + expected + " on one line but found " + value.found());
      return Optional.empty();
    }
    if (text.isPresent() && text.get().length() > LONGEST_TEXT) {
      mistake(
          "expected "
              + expected
              + " of at most "
              + LONGEST_TEXT
              + " letters but found "
              + value.found());
      return Optional.empty();
    }
    return text.map(String::strip);
  }

  private static boolean isControl(int codePoint) {
    return Character.isISOControl(codePoint)
        || Character.getType(codePoint) == Character.FORMAT
        || Character.getType(codePoint) == Character.LINE_SEPARATOR
        || Character.getType(codePoint) == Character.PARAGRAPH_SEPARATOR;
  }

  /** The raw text; empty after a mistake. */
  private Optional<String> scalar(String expected, String example) {
    if (value instanceof YamlNode.Refused) {
      return Optional.empty();
    }
    if (value instanceof YamlNode.Scalar s && !s.text().isBlank()) {
      reading.read(new ReadValue(path, s.text(), OptionalDouble.empty(), ""));
      return Optional.of(s.text());
    }
    reading.mistake(
        value.place(),
        path,
        "expected " + expected + " but found " + value.found(),
        example.equals("…")
            ? Optional.empty()
            : Optional.of("write for example '" + example + "'"));
    return Optional.empty();
  }

  /** Whether the value is one text. */
  boolean isScalar() {
    return value instanceof YamlNode.Scalar;
  }

  /** The value as typed, for a first look; empty unless it is one text. */
  String rawText() {
    return value instanceof YamlNode.Scalar s ? s.text().strip() : "";
  }

  /** The mapping of that field, silent after a mistake. */
  Section section(String... known) {
    if (value instanceof YamlNode.Mapping m) {
      return Section.of(reading, path, keyPlace, m, known);
    }
    if (!(value instanceof YamlNode.Refused)) {
      String expected =
          known.length == 0
              ? "a mapping of tags to their description"
              : "a mapping with " + Wording.oneOf(List.of(known));
      mistake("expected " + expected + " but found " + value.found());
    }
    return Section.silent(reading, path, keyPlace);
  }

  /** The entries of a list, numbered from 1; empty after a mistake. */
  Optional<List<Field>> list(String expected) {
    if (!(value instanceof YamlNode.Sequence s)) {
      if (!(value instanceof YamlNode.Refused)) {
        mistake("expected " + expected + " but found " + value.found());
      }
      return Optional.empty();
    }
    List<Field> entries = new ArrayList<>();
    for (YamlNode item : s.items()) {
      String itemPath = path + "[" + (entries.size() + 1) + "]";
      reading.keep(itemPath, item.place());
      reading.know(itemPath);
      entries.add(new Field(reading, itemPath, "", item.place(), item));
    }
    return Optional.of(entries);
  }

  void mistake(String message) {
    reading.mistake(value.place(), path, message);
  }

  void mistake(String message, String hint) {
    reading.mistake(value.place(), path, message, Optional.of(hint));
  }
}
