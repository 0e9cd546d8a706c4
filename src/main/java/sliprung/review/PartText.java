package sliprung.review;

import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Parts as people call them. */
public final class PartText {
  private static final Pattern SECTION = Pattern.compile("section-(\\d+)");
  private static final Map<String, String> WORDS =
      Map.of(
          "stator", "stator winding",
          "rotor", "rotor winding",
          "rings", "slip rings",
          "stator-conductor", "stator cable",
          "rotor-conductor", "rotor cable");

  private PartText() {}

  /** {@code section 2} for {@code section-2}; a contactor's tag stays as it is. */
  public static String words(String part) {
    Matcher section = SECTION.matcher(part);
    return section.matches() ? "section " + section.group(1) : WORDS.getOrDefault(part, part);
  }
}
