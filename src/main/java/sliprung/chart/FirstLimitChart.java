package sliprung.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.DoubleStream;
import sliprung.protection.ProtectionEvaluator;
import sliprung.review.PartText;
import sliprung.review.Review;
import sliprung.review.ReviewFacts;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;

/**
 * For each fault the time at which a device clears it and the time at which the first part reaches
 * its limit, at the corner and from the state where the two lie closest.
 *
 * @param rows the closest first
 * @param says what to see
 * @param withoutData parts that no row holds against a limit, for want of data
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

  /** Of a review: one row for each kind of fault and step that was computed. */
  public static FirstLimitChart of(Review review) {
    Facts facts = ReviewFacts.of(review);
    ProtectionEvaluator evaluator = new ProtectionEvaluator(review.starter(), review.machine());
    Map<String, List<ComputedStart>> faults = new LinkedHashMap<>();
    Set<String> without = new TreeSet<>();
    for (ComputedStart start : review.starts()) {
      if (start.scenario().isFault()) {
        Scenario.Kind kind = start.scenario().kind();
        faults
            .computeIfAbsent(kind + "-" + start.scenario().step(), k -> new ArrayList<>())
            .add(start);
        start.parts().stream()
            .filter(p -> p.missing().isPresent())
            .forEach(p -> without.add(PartText.words(p.part())));
      }
    }
    List<FaultRow> rows =
        faults.values().stream()
            .map(starts -> Exposures.worst(facts, starts.stream()).orElseThrow())
            .map(worst -> FaultRow.of(facts, evaluator, worst))
            .sorted(CLOSEST_FIRST)
            .toList();
    return new FirstLimitChart(rows, says(rows), without);
  }

  private static String says(List<FaultRow> rows) {
    if (rows.isEmpty()) {
      return "No fault was computed.";
    }
    long lost = rows.stream().filter(r -> r.state().isLost()).count();
    long unknown = rows.stream().filter(r -> r.state() == FaultRow.State.UNKNOWN).count();
    String first =
        rows.stream()
            .filter(r -> r.state() != FaultRow.State.UNKNOWN)
            .findFirst()
            .map(FaultRow::sentence)
            .orElse("");
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
      return "No fault could be judged.";
    }
    boolean limits = rows.stream().anyMatch(r -> r.limit().isPresent());
    if (!limits) {
      return "No part with data reaches its limit within 30 min of any fault." + open;
    }
    return "Every fault that could be judged is cleared before a part reaches its limit. Closest: "
        + first
        + open;
  }

  /** The row whose deciding start has that scenario, such as {@code held-2}. */
  public Optional<FaultRow> row(String scenario) {
    return rows.stream().filter(r -> r.start().scenario().id().equals(scenario)).findFirst();
  }

  /** Least time shown, s: a decade below every clearing and limit after 0; 0.01 to 1. */
  public double fromSeconds() {
    double least =
        rows.stream()
            .flatMapToDouble(r -> DoubleStream.of(r.clearingSeconds(), r.limitSeconds()))
            .filter(t -> t > 0.0)
            .min()
            .orElse(1.0);
    double decade = Math.pow(10.0, Math.floor(Math.log10(Math.max(least * 0.8, 0.01))));
    return Math.min(1.0, Math.max(0.01, decade));
  }
}
