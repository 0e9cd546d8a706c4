package sliprung.review;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.tolerance.Corner;

/** A finding in words and figures, the same on the terminal and on the page. */
public final class FindingText {
  private static final Pattern SENTENCE_END = Pattern.compile("(?<=[.!?])\\s+(?=\\p{Lu}|\\p{N})");
  private static final String SHARE = "share of ";
  private static final int MOST_DECIMALS = 4;

  private FindingText() {}

  /**
   * Margin over wanted margin (over 1 where none is wanted): below 1 it is less than wanted.
   * Without a margin infinite.
   */
  public static double share(Finding finding) {
    if (finding.margin().isEmpty()) {
      return Double.POSITIVE_INFINITY;
    }
    double share = finding.margin().getAsDouble() / finding.wanted().orElse(1.0);
    return Double.isNaN(share) ? Double.POSITIVE_INFINITY : share;
  }

  /**
   * {@code 1.07 of 1.10}; without a wanted margin {@code 1.07}; without a margin empty. A margin
   * under the wanted one never rounds up to it.
   */
  public static String marginOfWanted(Finding finding) {
    if (finding.margin().isEmpty()) {
      return "";
    }
    double margin = finding.margin().getAsDouble();
    if (finding.wanted().isEmpty()) {
      return Show.ratio(margin);
    }
    double wanted = finding.wanted().getAsDouble();
    return shown(margin, wanted) + " of " + Show.ratio(wanted);
  }

  private static String shown(double margin, double wanted) {
    String plain = Show.ratio(margin);
    if (!(margin < wanted) || !plain.equals(Show.ratio(wanted))) {
      return plain;
    }
    return BigDecimal.valueOf(margin).setScale(MOST_DECIMALS, RoundingMode.DOWN).toPlainString();
  }

  /** {@code 152 A against 250 A}: the value and the limit it is held against, or empty. */
  public static String valueAgainstLimit(Finding finding) {
    if (finding.value().isEmpty()) {
      return "";
    }
    if (finding.unit().startsWith(SHARE)) {
      String of = finding.unit().substring(SHARE.length());
      return Show.percent(finding.value().getAsDouble()) + " of " + of;
    }
    String value = quantity(finding.value().getAsDouble(), finding.unit());
    return finding.limit().isEmpty()
        ? value
        : value + " against " + quantity(finding.limit().getAsDouble(), finding.unit());
  }

  /** A quantity in a finding's unit, as people read it. */
  public static String quantity(double value, String unit) {
    if (unit.equals("A")) {
      return Show.amps(value);
    }
    if (unit.equals("s")) {
      return Show.seconds(value);
    }
    return unit.isEmpty() ? Show.three(value) : Show.three(value) + "\u00a0" + unit;
  }

  /** The start, corner and edge that decided, in words; empty where none did. */
  public static String decidedBy(Finding finding) {
    List<String> words = new ArrayList<>();
    finding.start().ifPresent(s -> words.add(circumstances(s)));
    finding.edge().ifPresent(e -> words.add(e.word() + " edge"));
    return String.join(", ", words);
  }

  /** A start and its corner in words, such as {@code hot start, 90 % volts, heavy load …}. */
  public static String circumstances(ComputedStart start) {
    Corner corner = start.corner();
    return start.words() + ", " + corner.words();
  }

  /** One line that says why, for a row of a table. */
  public static String because(Finding finding) {
    if (finding.verdict() == Verdict.NOT_JUDGED) {
      String give =
          finding.missing().isEmpty() ? "" : ": give " + String.join(", ", finding.missing());
      return withoutStop(firstSentence(finding.says())) + give;
    }
    boolean passes = finding.verdict() != Verdict.BREACH;
    if (passes && finding.rule().equals("trip/start") && finding.start().isPresent()) {
      return circumstances(finding.start().get());
    }
    return withoutStop(firstSentence(finding.says()));
  }

  /** The first sentence of a text; a decimal point ends none. */
  public static String firstSentence(String text) {
    return SENTENCE_END.split(text.strip(), 2)[0];
  }

  /** The rest of a text after its first sentence; empty where there is none. */
  public static String furtherSentences(String text) {
    String[] parts = SENTENCE_END.split(text.strip(), 2);
    return parts.length < 2 ? "" : parts[1];
  }

  private static String withoutStop(String sentence) {
    return sentence.endsWith(".") ? sentence.substring(0, sentence.length() - 1) : sentence;
  }
}
