package sliprung.config;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import sliprung.quantity.Dimension;

/**
 * A mapping while it is read: every key known, none twice. A section that is missing or broken is
 * <em>silent</em>: it yields nothing and, since its own mistake is on record, no second one.
 */
final class Section {
  /** Above so many known keys a message names the nearest one only. */
  private static final int MOST_LISTED = 10;

  private final Reading reading;
  private final String path;
  private final Place place;
  private final boolean silent;
  private final Map<String, Field> fields = new LinkedHashMap<>();

  private Section(Reading reading, String path, Place place, boolean silent) {
    this.reading = reading;
    this.path = path;
    this.place = place;
    this.silent = silent;
  }

  /** Stands for a section whose absence or form is a mistake already told. */
  static Section silent(Reading reading, String path, Place place) {
    return new Section(reading, path, place, true);
  }

  /** Stands for a section that may be left out: its defaults are filled in. */
  static Section absent(Reading reading, String path, Place place, String... known) {
    Section section = new Section(reading, path, place, false);
    for (String key : known) {
      reading.know(section.child(key));
    }
    return section;
  }

  /**
   * Reads the keys of a mapping.
   *
   * @param place where a missing key is told
   * @param known the keys; empty: any
   */
  static Section of(
      Reading reading, String path, Place place, YamlNode.Mapping mapping, String... known) {
    Section section = absent(reading, path, place, known);
    Set<String> words = new TreeSet<>(List.of(known));
    Map<String, YamlNode.Entry> misspelt = new LinkedHashMap<>();
    for (YamlNode.Entry entry : mapping.entries()) {
      section.take(entry, words, List.of(known)).ifPresent(w -> misspelt.putIfAbsent(w, entry));
    }
    // A misspelt key is read as the word it was meant for: its content may hold mistakes as well,
    // and the word itself is not missing.
    misspelt.forEach(section::takeMisspelt);
    return section;
  }

  /** Takes one entry; the known word it was meant for where its key is misspelt. */
  private Optional<String> take(YamlNode.Entry entry, Set<String> words, List<String> known) {
    if (entry.key() instanceof YamlNode.Refused) {
      return Optional.empty();
    }
    if (!(entry.key() instanceof YamlNode.Scalar key)) {
      reading.mistake(
          entry.key().place(), path, "expected a word as key but found " + entry.key().found());
      return Optional.empty();
    }
    String name = key.text();
    if (name.equals("<<")) {
      reading.mistake(
          key.place(),
          path,
          "expected a key but found a merge key, '<<'",
          Optional.of("write the values out"));
      return Optional.empty();
    }
    if (!words.isEmpty() && !words.contains(name)) {
      return refuse(key, known);
    }
    Field before = fields.get(name);
    if (before != null) {
      reading.mistake(
          key.place(),
          child(name),
          "expected one '"
              + Wording.clip(name)
              + "' but found a second; the first is on line "
              + before.keyPlace().line()
              + ", column "
              + before.keyPlace().column());
      return Optional.empty();
    }
    put(name, key.place(), entry.value());
    return Optional.empty();
  }

  private void takeMisspelt(String word, YamlNode.Entry entry) {
    if (!fields.containsKey(word)) {
      put(word, entry.key().place(), entry.value());
    }
  }

  private void put(String name, Place keyPlace, YamlNode value) {
    Field field = new Field(reading, child(name), name, keyPlace, value);
    reading.know(field.path());
    reading.keep(field.path(), value.place());
    fields.put(name, field);
  }

  /** Tells of an unknown key; the known word nearest to it. */
  private Optional<String> refuse(YamlNode.Scalar key, List<String> known) {
    Optional<String> outside = OutsideScope.sentence(key.text());
    if (outside.isPresent()) {
      reading.mistake(key.place(), child(key.text()), outside.get());
      return Optional.empty();
    }
    Optional<String> nearest = Wording.nearest(key.text(), known);
    String expected =
        nearest.isPresent() && known.size() > MOST_LISTED
            ? "a key of this format"
            : Wording.oneOf(known);
    reading.mistake(
        key.place(),
        path,
        "expected " + expected + " but found " + key.found(),
        nearest.map(w -> "did you mean '" + w + "'?"));
    return nearest;
  }

  private String child(String key) {
    String word = Wording.clip(key);
    return path.isEmpty() ? word : path + "." + word;
  }

  Reading reading() {
    return reading;
  }

  String path() {
    return path;
  }

  Place place() {
    return place;
  }

  /** Whether this section's absence was told already. */
  boolean isSilent() {
    return silent;
  }

  boolean isEmpty() {
    return fields.isEmpty();
  }

  /** All fields in the order of the file. */
  List<Field> fields() {
    return new ArrayList<>(fields.values());
  }

  boolean has(String key) {
    return fields.containsKey(key);
  }

  Optional<Field> optional(String key) {
    return Optional.ofNullable(fields.get(key));
  }

  /**
   * A field that must be there.
   *
   * @param expected with its article, for the message
   * @param example what might be written
   */
  Optional<Field> required(String key, String expected, String example) {
    Field field = fields.get(key);
    if (field == null && !silent) {
      reading.mistake(
          place,
          child(key),
          "expected " + expected + " but found nothing",
          Optional.of("add for example '" + key + ": " + example + "'"));
    }
    return Optional.ofNullable(field);
  }

  /** A required quantity in the dimension's unit; NaN after a mistake. */
  double number(String key, Dimension dimension, Range range) {
    return required(key, dimension.words(), dimension.examples().get(0))
        .map(f -> f.number(dimension, range))
        .orElse(Double.NaN);
  }

  /** A quantity that may be left out; NaN inside after a mistake. */
  OptionalDouble optionalNumber(String key, Dimension dimension, Range range) {
    Field field = fields.get(key);
    return field == null
        ? OptionalDouble.empty()
        : OptionalDouble.of(field.number(dimension, range));
  }

  /** A quantity whose default is on record when it was left out. */
  double numberOr(String key, Dimension dimension, Range range, double value, String words) {
    Field field = fields.get(key);
    if (field != null) {
      return field.number(dimension, range);
    }
    assume(key, words);
    return value;
  }

  /** Required words; empty after a mistake. */
  Optional<String> text(String key, String expected, String example) {
    return required(key, expected, example).flatMap(f -> f.text(expected));
  }

  /** Required choice; empty after a mistake. */
  <T> Optional<T> choice(String key, Map<String, T> words) {
    return required(key, Wording.oneOf(words.keySet()), words.keySet().iterator().next())
        .flatMap(f -> f.choice(words));
  }

  /** A choice whose default is on record when it was left out. */
  <T> T choiceOr(String key, Map<String, T> words, T value, String said) {
    Field field = fields.get(key);
    if (field != null) {
      return field.choice(words).orElse(value);
    }
    assume(key, said);
    return value;
  }

  /** Puts a default on record. */
  void assume(String key, String words) {
    if (!silent) {
      reading.assume(child(key), words);
    }
  }

  /** A part that must be there. */
  Section requiredSection(String key, String example, String... known) {
    return required(key, "a mapping of keys to values", example)
        .map(f -> f.section(known))
        .orElseGet(() -> silent(reading, child(key), place));
  }

  /** A part that may be left out. */
  Section sectionOrDefaults(String key, String... known) {
    Field field = fields.get(key);
    if (field != null) {
      return field.section(known);
    }
    return silent ? silent(reading, child(key), place) : absent(reading, child(key), place, known);
  }
}
