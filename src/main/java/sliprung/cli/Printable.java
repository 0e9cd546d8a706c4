package sliprung.cli;

/** Text of the user's made harmless for a terminal: control characters become spaces. */
final class Printable {
  private Printable() {}

  /** The text without control and format characters. */
  static String of(String text) {
    return text.replaceAll("[\\p{Cc}\\p{Cf}\\p{Co}\\p{Cs}\\u2028\\u2029]", " ");
  }
}
