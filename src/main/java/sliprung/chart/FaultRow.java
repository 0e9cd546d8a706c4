package sliprung.chart;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.review.PartText;
import sliprung.rulebook.ComputedStart;
import sliprung.tolerance.Corner;

/**
 * One fault: who clears it and which part reaches its limit first.
 *
 * @param start the computed fault
 * @param clearings slow edges that are proven to operate and open the circuit, first first
 * @param limit first part to reach its limit within the history
 * @param judged whether any part of it has a limit
 * @param wanted clearing ratio
 */
public record FaultRow(
    ComputedStart start,
    List<Clearing> clearings,
    Optional<Limit> limit,
    boolean judged,
    double wanted) {

  /** Wanted clearing ratio unless the rule book was told otherwise. */
  public static final double WANTED_RATIO = 1.25;

  /**
   * A device that clears.
   *
   * @param device tag
   * @param seconds from line closing to the open circuit
   */
  public record Clearing(String device, double seconds) {}

  /**
   * A part at its limit.
   *
   * @param part as in {@code PartResponse}
   * @param seconds from line closing
   */
  public record Limit(String part, double seconds) {}

  /** What a row shows, worst first. */
  public enum State {
    /** A part reaches its limit and nothing clears. */
    NOT_CLEARED,
    /** Cleared after the first limit. */
    LATE,
    /** Cleared in time with less than the wanted ratio. */
    THIN,
    /** No part has a limit. */
    UNKNOWN,
    /** Cleared in time. */
    IN_TIME,
    /** No part reaches its limit while the history lasts. */
    NO_LIMIT;

    /** Whether a part is lost. */
    public boolean isLost() {
      return this == NOT_CLEARED || this == LATE;
    }
  }

  /** Copies the list. */
  public FaultRow {
    clearings = List.copyOf(clearings);
  }

  /** The row of a computed fault. */
  public static FaultRow of(ComputedStart start, double wanted) {
    List<Clearing> clearings =
        start.devices().stream()
            .filter(d -> d.edge() == Edge.SLOW && d.operates() && d.bound().isEmpty())
            .filter(d -> d.clearsAtSeconds() < Double.POSITIVE_INFINITY)
            .map(d -> new Clearing(d.device(), d.clearsAtSeconds()))
            .sorted(Comparator.comparingDouble(Clearing::seconds).thenComparing(Clearing::device))
            .toList();
    Optional<Limit> limit =
        start.parts().stream()
            .filter(p -> p.missing().isEmpty() && p.limitAtSeconds() < Double.POSITIVE_INFINITY)
            .map(p -> new Limit(p.part(), p.limitAtSeconds()))
            .min(Comparator.comparingDouble(Limit::seconds).thenComparing(Limit::part));
    boolean judged = start.parts().stream().anyMatch(p -> p.missing().isEmpty());
    return new FaultRow(start, clearings, limit, judged, wanted);
  }

  /** Time of the first clearing, s; infinite: never. */
  public double clearingSeconds() {
    return clearings.isEmpty() ? Double.POSITIVE_INFINITY : clearings.get(0).seconds();
  }

  /** Time of the first limit, s; infinite: never. */
  public double limitSeconds() {
    return limit.map(Limit::seconds).orElse(Double.POSITIVE_INFINITY);
  }

  /**
   * Clearing ratio: first limit over clearing; 0 where nothing clears, infinite without a limit.
   */
  public double ratio() {
    if (limit.isEmpty()) {
      return Double.POSITIVE_INFINITY;
    }
    return clearings.isEmpty() ? 0.0 : limitSeconds() / clearingSeconds();
  }

  /** What it comes to. */
  public State state() {
    if (!judged) {
      return State.UNKNOWN;
    }
    if (limit.isEmpty()) {
      return State.NO_LIMIT;
    }
    if (clearings.isEmpty()) {
      return State.NOT_CLEARED;
    }
    if (ratio() < 1.0) {
      return State.LATE;
    }
    return ratio() < wanted ? State.THIN : State.IN_TIME;
  }

  /** The finding in a few words. */
  public String finding() {
    String first = clearings.isEmpty() ? "" : clearings.get(0).device();
    return switch (state()) {
      case NOT_CLEARED -> "nothing clears it";
      case LATE -> first + " clears too late";
      case THIN -> first + " clears barely: " + Show.ratio(ratio());
      case IN_TIME -> first + " clears in time: " + Show.ratio(ratio());
      case NO_LIMIT -> "no limit within 30 min";
      case UNKNOWN -> "not judged";
    };
  }

  /** The two times behind the finding, in a few words. */
  public String times() {
    if (state() == State.UNKNOWN) {
      return "no part has a limit";
    }
    String clears =
        clearings.isEmpty() ? "no device opens" : "open at " + Show.seconds(clearingSeconds());
    return limit
        .map(l -> clears + ", " + PartText.words(l.part()) + " " + Show.seconds(l.seconds()))
        .orElse(clears);
  }

  /** The finding as a sentence. */
  public String sentence() {
    String fault = start.words() + " (" + start.corner().words() + ")";
    String part =
        limit
            .map(
                l ->
                    PartText.words(l.part()) + " reaches its limit at " + Show.seconds(l.seconds()))
            .orElse("no part with data reaches its limit within 30 min");
    String clears =
        clearings.isEmpty()
            ? "nothing clears it"
            : clearings.get(0).device() + " clears at " + Show.seconds(clearingSeconds());
    return fault + ": " + clears + ", " + part + ".";
  }

  /** State and corner in the fewest words: {@code hot, 90 % V, heavy, low bank, late}. */
  public String circumstances() {
    Corner corner = start.corner();
    String from = "from " + start.from().word();
    if (corner.isNominal()) {
      return from + ", nominal";
    }
    String load = corner.load() == Corner.LoadSide.NOMINAL ? "" : ", " + word(corner.load());
    String bank = corner.bank() == Corner.Bank.NOMINAL ? "" : ", " + word(corner.bank()) + " bank";
    String timers = corner.timers() == Corner.Timers.NOMINAL ? "" : ", " + word(corner.timers());
    return from + ", " + Math.round(corner.supplyPu() * 100.0) + " % V" + load + bank + timers;
  }

  private static String word(Enum<?> side) {
    return side.name().toLowerCase(Locale.ROOT);
  }
}
