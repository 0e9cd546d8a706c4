package sliprung.cli;

import java.util.Map;
import sliprung.rulebook.Verdict;

/**
 * What the output goes to.
 *
 * @param colour whether verdicts are set off
 * @param columns width in characters
 */
record Terminal(boolean colour, int columns) {
  private static final int LEAST = 80;
  private static final int MOST = 100;

  /** A pipe: no colour, the widest lines. */
  static final Terminal PLAIN = new Terminal(false, MOST);

  /** What this process prints to; colour only on a terminal, never with NO_COLOR. */
  static Terminal ofProcess() {
    return of(System.console() != null, System.getenv());
  }

  static Terminal of(boolean interactive, Map<String, String> environment) {
    boolean wanted =
        environment.getOrDefault("NO_COLOR", "").isEmpty()
            && !environment.getOrDefault("TERM", "dumb").equals("dumb");
    int columns = MOST;
    try {
      columns = Integer.parseInt(environment.getOrDefault("COLUMNS", ""));
    } catch (NumberFormatException e) {
      // No usable width is told: the widest line that the layout allows is kept.
      columns = MOST;
    }
    return new Terminal(interactive && wanted, Math.max(LEAST, Math.min(MOST, columns)));
  }

  /** A verdict's word, padded; weight and colour only repeat it. */
  String verdict(Verdict verdict, int width) {
    String padded = String.format("%-" + width + "s", verdict.word());
    if (!colour) {
      return padded;
    }
    String code =
        switch (verdict) {
          case BREACH -> "1;31";
          case TIGHT -> "1;33";
          case NOT_JUDGED -> "1;35";
          case ACCEPTED, CLEAR -> "0";
        };
    return "\u001b[" + code + "m" + padded + "\u001b[0m";
  }

  /** Text in weight. */
  String strong(String text) {
    return colour ? "\u001b[1m" + text + "\u001b[0m" : text;
  }
}
