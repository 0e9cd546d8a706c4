package sliprung.chart;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;

/**
 * For each fault the time at which a device clears it and the time at which the first part reaches
 * its limit, at the corner and from the state where the two lie closest.
 *
 * @param rows the closest first
 * @param says what to see
 * @param withoutData parts that no row judges, each with the missing input
 */
public record FirstLimitChart(List<FaultRow> rows, String says, Set<String> withoutData) {
  private static final Comparator<FaultRow> CLOSEST_FIRST =
      Comparator.comparing(FaultRow::state)
          .thenComparingDouble(FaultRow::ratio)
          .thenComparingDouble(FaultRow::limitSeconds)
          .thenComparing(r -> r.start().id());

  /** Copies the rows. */
  public FirstLimitChart {
    rows = List.copyOf(rows);
    withoutData = java.util.Collections.unmodifiableSet(new TreeSet<>(withoutData));
  }

  /** Of a review: one row for each kind of fault that was computed. */
  public static FirstLimitChart of(Review review) {
    Set<String> ids = new java.util.LinkedHashSet<>();
    review.starts().stream()
        .filter(s -> s.scenario().isFault())
        .forEach(s -> ids.add(s.scenario().id()));
    List<FaultRow> rows =
        ids.stream().map(id -> closest(review, id)).sorted(CLOSEST_FIRST).toList();
    Set<String> without = new TreeSet<>();
    for (ComputedStart start : review.starts()) {
      if (start.scenario().isFault()) {
        start
            .parts()
            .forEach(
                p ->
                    p.missing()
                        .ifPresent(m -> without.add(sliprung.review.PartText.words(p.part()))));
      }
    }
    return new FirstLimitChart(rows, says(rows), without);
  }

  private static FaultRow closest(Review review, String scenario) {
    return review.starts().stream()
        .filter(s -> s.scenario().id().equals(scenario))
        .map(s -> FaultRow.of(s, wanted(review, s)))
        .min(CLOSEST_FIRST)
        .orElseThrow();
  }

  /** The clearing ratio that the rule book wants of this kind of fault. */
  private static double wanted(Review review, ComputedStart start) {
    String family = start.scenario().id().startsWith("held") ? "held/exposure" : "locked/";
    return review.findings().stream()
        .filter(f -> f.rule().startsWith(family) && !f.rule().equals("locked/breakaway"))
        .filter(f -> f.wanted().isPresent())
        .mapToDouble(f -> f.wanted().getAsDouble())
        .max()
        .orElse(FaultRow.WANTED_RATIO);
  }

  private static String says(List<FaultRow> rows) {
    if (rows.isEmpty()) {
      return "No fault was computed.";
    }
    long lost = rows.stream().filter(r -> r.state().isLost()).count();
    long unknown = rows.stream().filter(r -> r.state() == FaultRow.State.UNKNOWN).count();
    String first = rows.get(0).sentence();
    String open = unknown == 0 ? "" : " Not judged: " + unknown + " of " + rows.size() + ".";
    if (lost > 0) {
      return lost
          + " of "
          + rows.size()
          + (lost == 1 ? " faults takes" : " faults take")
          + " a part past its limit before anything clears. Worst: "
          + first
          + open;
    }
    if (unknown == rows.size()) {
      return "No fault could be judged: no part has a limit.";
    }
    return "Every fault that could be judged is cleared before a part reaches its limit. Closest: "
        + first
        + open;
  }

  /** The row of a scenario, such as {@code held-2}. */
  public Optional<FaultRow> row(String scenario) {
    return rows.stream().filter(r -> r.start().scenario().id().equals(scenario)).findFirst();
  }

  /** Least time shown, s: a whole decade below every clearing and limit, 0.01 at least. */
  public double fromSeconds() {
    double least =
        rows.stream()
            .mapToDouble(r -> Math.min(r.clearingSeconds(), r.limitSeconds()))
            .min()
            .orElse(1.0);
    double decade = Math.pow(10.0, Math.floor(Math.log10(Math.max(least * 0.8, 0.01))));
    return Math.min(1.0, Math.max(0.01, decade));
  }
}
