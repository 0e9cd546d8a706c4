package sliprung.review;

import java.util.Set;

/** The four questions in the order in which people worry about them. */
public enum Question {
  /** Families trip and sequence. */
  GOOD_START("Does a good start get through?"),
  /** Families held and locked, and the sequence's supervision. */
  FAILED_START("Is a failed start cleared in time?"),
  /** Families contactor, resistor, conductor, overload and short-circuit. */
  PARTS("Does every contactor and part stand what it sees?"),
  /** Whatever was not judged, and family data. */
  UNKNOWN("What could not be judged?");

  private static final Set<String> FIRST = Set.of("trip", "sequence");
  private static final Set<String> SECOND = Set.of("held", "locked");
  private final String words;

  Question(String words) {
    this.words = words;
  }

  /** The question as asked on pages and terminals. */
  public String words() {
    return words;
  }

  /** 1 to 4. */
  public int number() {
    return ordinal() + 1;
  }

  /** The question that a rule, {@code family/slug}, helps to answer once it is judged. */
  public static Question of(String rule) {
    String family = rule.substring(0, Math.max(0, rule.indexOf('/')));
    if (rule.equals("sequence/supervision") || SECOND.contains(family)) {
      return FAILED_START;
    }
    if (FIRST.contains(family)) {
      return GOOD_START;
    }
    return family.equals("data") ? UNKNOWN : PARTS;
  }
}
