package sliprung.config;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** Small dictionaries that keep their order, so that messages list words as the format does. */
final class Words {
  private Words() {}

  static <T> Map<String, T> inOrder(String a, T first, String b, T second) {
    Map<String, T> words = new LinkedHashMap<>();
    words.put(a, first);
    words.put(b, second);
    return Collections.unmodifiableMap(words);
  }

  static <T> Map<String, T> inOrder(String a, T first, String b, T second, String c, T third) {
    Map<String, T> words = new LinkedHashMap<>(inOrder(a, first, b, second));
    words.put(c, third);
    return Collections.unmodifiableMap(words);
  }
}
