package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.quantity.Show;
import sliprung.review.PartText;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.tolerance.Corner;

/**
 * One fault: who clears it and which part reaches its limit first.
 *
 * @param start the computed fault
 * @param clearings slow edges that are proven to operate and open the circuit, first first
 * @param limit first part to reach its limit within the history
 * @param open why it cannot be judged; empty where it can
 * @param wanted clearing ratio
 */
public record FaultRow(
    ComputedStart start,
    List<Clearing> clearings,
    Optional<Limit> limit,
    Optional<String> open,
    double wanted) {

  /**
   * A device that clears.
   *
   * @param device tag
   * @param pickedUpSeconds when what it measures last rose to its slow pick-up; 0, line closing,
   *     for a device that has none
   * @param seconds from line closing to the open circuit
   */
  public record Clearing(String device, double pickedUpSeconds, double seconds) {}

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
    /** Data missing, or what clears is not proven able to. */
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

  /** The row of an exposure, with every later device that is proven to clear it as well. */
  public static FaultRow of(Facts facts, ProtectionEvaluator evaluator, Exposure worst) {
    StartProtection fault = evaluator.over(worst.start().history());
    double wanted = facts.wanted(rule(worst.start().scenario().kind()));
    List<Clearing> clearings = new ArrayList<>();
    List<String> seen = new ArrayList<>();
    Optional<DeviceResponse> next = worst.clearing();
    while (next.isPresent()) {
      DeviceResponse response = next.get();
      clearings.add(
          new Clearing(
              response.device(), pickedUp(facts, fault, response), response.clearsAtSeconds()));
      seen.add(response.device());
      next = Exposure.of(facts, worst.start(), seen).clearing();
    }
    Optional<Limit> limit = worst.first().map(p -> new Limit(p.part(), p.limitAtSeconds()));
    Optional<String> open = Optional.empty();
    if (!worst.missing().isEmpty()) {
      open = Optional.of("give " + String.join(", ", worst.missing()));
    } else if (worst.clearingRatio() < wanted && worst.unproven().isPresent()) {
      open = Optional.of(worst.unproven().get().device() + ": breaking not proven");
    }
    return new FaultRow(worst.start(), clearings, limit, open, wanted);
  }

  private static double pickedUp(Facts facts, StartProtection fault, DeviceResponse response) {
    return facts.starter().device(response.device()).isEmpty()
        ? 0.0
        : fault
            .pickedUpSeconds(response.device(), response.edge(), response.operatesAtSeconds())
            .orElse(0.0);
  }

  private static String rule(Scenario.Kind kind) {
    return switch (kind) {
      case LOCKED -> "locked/sequence";
      case LOCKED_STEP -> "locked/step";
      case RINGS_SHORTED -> "locked/shorted";
      case RUNNING_LOCKED -> "locked/running";
      default -> "held/exposure";
    };
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
    if (open.isPresent()) {
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
      return open.orElse("");
    }
    String clears =
        clearings.isEmpty() ? "no device opens" : "open " + Show.seconds(clearingSeconds());
    return limit
        .map(l -> clears + ", " + PartText.words(l.part()) + " " + when(l.seconds()))
        .orElse(clears);
  }

  /** A part may be past its limit before the fault begins, by the load it ran under. */
  private static String when(double seconds) {
    return seconds > 0.0 ? Show.seconds(seconds) : "before it";
  }

  /** The finding as a sentence. */
  public String sentence() {
    String fault = start.words() + " (" + start.corner().words() + ")";
    String part =
        limit.map(FaultRow::reaches).orElse("no part with data reaches its limit within 30 min");
    String clears =
        clearings.isEmpty()
            ? "nothing clears it"
            : clearings.get(0).device() + " clears at " + Show.seconds(clearingSeconds());
    return fault + ": " + clears + ", " + part + ".";
  }

  private static String reaches(Limit limit) {
    boolean many = limit.part().equals("rings");
    String part = PartText.words(limit.part());
    if (limit.seconds() > 0.0) {
      return part
          + (many ? " reach their limit at " : " reaches its limit at ")
          + Show.seconds(limit.seconds());
    }
    return part + (many ? " are past their" : " is past its") + " limit before the fault begins";
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
