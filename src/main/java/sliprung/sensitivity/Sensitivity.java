package sliprung.sensitivity;

import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.starter.EvidenceGrade;

/**
 * How far one uncertain input moves one margin.
 *
 * @param rule {@code family/slug}
 * @param subject of the finding
 * @param margin as judged
 * @param wanted margin, above 0
 * @param input path in the file
 * @param words the input in words, with its article
 * @param grade how well it is known
 * @param lowFactor least factor on the input
 * @param highFactor greatest factor on the input
 * @param low margin with the input at its least; empty: the rule gives none there
 * @param high margin with the input at its greatest; empty: the rule gives none there
 */
public record Sensitivity(
    String rule,
    String subject,
    double margin,
    double wanted,
    String input,
    String words,
    EvidenceGrade grade,
    double lowFactor,
    double highFactor,
    OptionalDouble low,
    OptionalDouble high) {
  /** A margin beyond so many times the wanted one is as good as any. */
  private static final double PLENTY = 3.0;

  /** Least margin over the spread; empty where the rule gives none at one end. */
  public OptionalDouble least() {
    return low.isEmpty() || high.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.min(margin, Math.min(low.getAsDouble(), high.getAsDouble())));
  }

  /** Greatest margin over the spread; empty where the rule gives none at one end. */
  public OptionalDouble greatest() {
    return low.isEmpty() || high.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.max(margin, Math.max(low.getAsDouble(), high.getAsDouble())));
  }

  /**
   * How far the margin moves over the spread, over the wanted margin; what lies beyond three times
   * the wanted one does not count. Infinite where the rule gives no margin at one end.
   */
  public double reach() {
    if (least().isEmpty()) {
      return Double.POSITIVE_INFINITY;
    }
    return Math.min(PLENTY, greatest().getAsDouble() / wanted)
        - Math.min(PLENTY, least().getAsDouble() / wanted);
  }

  /** The grade and what it leaves open, such as {@code estimated, ±25 %}. */
  public String evidence() {
    double up = highFactor - 1.0;
    double down = 1.0 - lowFactor;
    String spread =
        Math.abs(up - down) < 1e-9
            ? "±" + Show.percent(up)
            : signed(-down) + " to " + signed(up) + " by the readings";
    return grade.word() + ", " + spread;
  }

  private static String signed(double share) {
    return (share < 0.0 ? "−" : "+") + Show.percent(Math.abs(share));
  }

  /** What measuring it first would settle, in a sentence. */
  public String says() {
    String first =
        grade == EvidenceGrade.MEASURED
            ? capital(words) + " (" + evidence() + ") still counts most: it "
            : "Measure " + words + " first (" + evidence() + "): it ";
    if (least().isEmpty()) {
      return first
          + "could leave no margin to give, against "
          + Show.ratio(margin)
          + " as judged, "
          + (low.isEmpty() ? "at its least." : "at its greatest.");
    }
    return first
        + "would move this margin from "
        + Show.ratio(margin)
        + " to between "
        + Show.ratio(least().getAsDouble())
        + " and "
        + Show.ratio(greatest().getAsDouble())
        + ".";
  }

  private static String capital(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}
