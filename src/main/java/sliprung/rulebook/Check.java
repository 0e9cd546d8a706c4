package sliprung.rulebook;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * One of several things that a rule asks of one subject; the thinnest of them is the finding.
 *
 * @param margin larger is better, 1 at the limit
 * @param value found
 * @param limit it is held against
 * @param unit of both
 * @param says one sentence, in amperes and seconds first
 * @param start that decided, if a start did
 */
public record Check(
    double margin,
    double value,
    double limit,
    String unit,
    String says,
    Optional<ComputedStart> start) {

  /** Currents: the margin is limit over value. */
  public static Check ofAmps(double amps, double limit, String says) {
    return new Check(limit / amps, amps, limit, "A", says, Optional.empty());
  }

  /** The same, decided by a start. */
  public Check at(ComputedStart decided) {
    return new Check(margin, value, limit, unit, says, Optional.of(decided));
  }

  /** The check with the thinnest margin; at least one must be given. */
  public static Check thinnest(List<Check> checks) {
    return checks.stream().min(Comparator.comparingDouble(Check::margin)).orElseThrow();
  }

  /** Puts the thinnest of them into a finding, with the sentences of all, its own first. */
  public static FindingBuilder into(FindingBuilder builder, List<Check> checks) {
    Check thinnest = thinnest(checks);
    StringBuilder says = new StringBuilder(thinnest.says());
    checks.stream().filter(c -> c != thinnest).forEach(c -> says.append(' ').append(c.says()));
    thinnest.start().ifPresent(builder::at);
    return builder
        .margin(thinnest.margin())
        .figures(thinnest.value(), thinnest.limit(), thinnest.unit())
        .says(says.toString());
  }
}
