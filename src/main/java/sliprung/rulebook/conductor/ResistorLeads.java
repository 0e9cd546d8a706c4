package sliprung.rulebook.conductor;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Practice;

/**
 * A row of NFPA 70 table 430.23(C): resistor duty and the share of full-load secondary current that
 * the conductors between controller and a separate bank must carry.
 *
 * @param duty in words
 * @param share of full-load secondary current
 * @param onSeconds of the cycle; infinite for continuous
 * @param offSeconds of the cycle
 */
record ResistorLeads(String duty, double share, double onSeconds, double offSeconds) {
  private static final String KEY = "430.23.";
  private static final double HOUR = 3600.0;

  /** Every row, least share first. */
  static List<ResistorLeads> rows(Practice practice) {
    return practice.figures().keySet().stream()
        .filter(k -> k.startsWith(KEY) && !k.endsWith(".on") && !k.endsWith(".off"))
        .map(
            k ->
                new ResistorLeads(
                    k.substring(KEY.length()).replace('-', ' '),
                    practice.figure(k).value(),
                    practice.find(k + ".on").map(Practice.Figure::value).orElse(HOUR),
                    practice.find(k + ".off").map(Practice.Figure::value).orElse(0.0)))
        .sorted(Comparator.comparingDouble(ResistorLeads::share))
        .toList();
  }

  /**
   * The least row whose cycle has at least as long an on-time and as great a share of it as the
   * longest start; empty where the starts an hour are not given.
   */
  static Optional<ResistorLeads> nearest(Facts facts) {
    if (facts.starter().duty().startsPerHour().isEmpty()) {
      return Optional.empty();
    }
    double on =
        facts
            .permitted()
            .mapToDouble(ResistorLeads::onSeconds)
            .max()
            .orElse(Double.POSITIVE_INFINITY);
    double share = on * facts.starter().duty().startsPerHour().getAsDouble() / HOUR;
    return rows(facts.practice()).stream()
        .filter(
            r -> r.onSeconds() >= on && r.onSeconds() / (r.onSeconds() + r.offSeconds()) >= share)
        .findFirst();
  }

  private static double onSeconds(ComputedStart start) {
    return start.history().lastClosingSeconds().orElse(Double.POSITIVE_INFINITY);
  }
}
