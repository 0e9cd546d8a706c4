package sliprung.config;

import java.util.List;

/** A piece of a YAML document as it was typed: no type is guessed from the text. */
sealed interface YamlNode {

  /** Where it begins. */
  Place place();

  /** As messages call it: {@code '690 A'}, {@code a list}, {@code nothing}. */
  String found();

  /**
   * A single text.
   *
   * @param text raw, without quotes
   * @param quoted whether it stood in quotes or was a block text
   */
  record Scalar(Place place, String text, boolean quoted) implements YamlNode {
    @Override
    public String found() {
      return text.isBlank() ? "nothing" : "'" + Wording.clip(text) + "'";
    }
  }

  /** Keys with values, in the order of the file, duplicates included. */
  record Mapping(Place place, List<Entry> entries) implements YamlNode {
    @Override
    public String found() {
      return entries.isEmpty() ? "an empty mapping" : "a mapping of keys to values";
    }
  }

  /**
   * One key with its value.
   *
   * @param key any node: a key that is not a text is a mistake found later
   * @param value of that key
   */
  record Entry(YamlNode key, YamlNode value) {}

  /** A list. */
  record Sequence(Place place, List<YamlNode> items) implements YamlNode {
    @Override
    public String found() {
      return "a list";
    }
  }

  /** Something refused already, such as an alias: no second mistake is made of it. */
  record Refused(Place place) implements YamlNode {
    @Override
    public String found() {
      return "something that was refused";
    }
  }
}
