package sliprung.tolerance;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * One corner of the spreads, or a worse point among them that a search has found.
 *
 * @param supplyPu no-load voltage over rated
 * @param load which load
 * @param bank which bank
 * @param timers which timers and levels
 * @param steps where the steps' timers and levels do not go together: the side of each in turn;
 *     else empty
 * @param inside the load and the bank of a point that is not a corner in them
 */
public record Corner(
    double supplyPu,
    LoadSide load,
    Bank bank,
    Timers timers,
    List<Timers> steps,
    Optional<Inside> inside) {

  /**
   * A point within the spreads.
   *
   * @param loadFactor on the load's torques
   * @param bankFactor on the bank's resistances
   */
  public record Inside(double loadFactor, double bankFactor) {}

  /** A corner whose timers and levels all go together. */
  public Corner(double supplyPu, LoadSide load, Bank bank, Timers timers) {
    this(supplyPu, load, bank, timers, List.of(), Optional.empty());
  }

  /** Copies the list. */
  public Corner {
    steps = List.copyOf(steps);
  }

  /** This corner with a side for each step. */
  Corner withSteps(List<Timers> sides) {
    return new Corner(supplyPu, load, bank, Timers.MIXED, sides, inside);
  }

  /** Side of the load's spread. */
  public enum LoadSide {
    LIGHT,
    NOMINAL,
    HEAVY
  }

  /** State of the bank. */
  public enum Bank {
    /** Cold, as on the drawing. */
    NOMINAL,
    /** Cold, low tolerance. */
    LOW,
    /** Cold, high tolerance. */
    HIGH,
    /** High tolerance and hot. */
    HOT
  }

  /** Side of the timers' and levels' spread; early levels are high. */
  public enum Timers {
    EARLY,
    NOMINAL,
    LATE,
    /** Some early, some late. */
    MIXED
  }

  /** Rated voltage and everything nominal. */
  public static final Corner NOMINAL =
      new Corner(1.0, LoadSide.NOMINAL, Bank.NOMINAL, Timers.NOMINAL);

  /** Whether this is the nominal corner. */
  public boolean isNominal() {
    return equals(NOMINAL);
  }

  /** Short stable name for ids, such as {@code 90v-heavy-low-late}. */
  public String id() {
    if (isNominal()) {
      return "nominal";
    }
    return String.format(
            Locale.ROOT,
            "%sv-%s-%s-%s",
            percent(supplyPu),
            load.name().toLowerCase(Locale.ROOT),
            bank.name().toLowerCase(Locale.ROOT),
            pattern())
        + inside
            .map(
                i ->
                    String.format(
                        Locale.ROOT,
                        "-load%s-bank%s",
                        percent(i.loadFactor()),
                        percent(i.bankFactor())))
            .orElse("");
  }

  /** {@code late}, or a letter for each step, such as {@code lele}. */
  private String pattern() {
    if (steps.isEmpty()) {
      return timers.name().toLowerCase(Locale.ROOT);
    }
    StringBuilder letters = new StringBuilder();
    steps.forEach(side -> letters.append(side == Timers.LATE ? 'l' : 'e'));
    return letters.toString();
  }

  /** In words, such as {@code 90 % volts, heavy load, cold bank low, timers late}. */
  public String words() {
    if (isNominal()) {
      return "rated volts, nominal values";
    }
    String bankWords =
        switch (bank) {
          case NOMINAL -> "nominal bank";
          case LOW -> "cold bank, low tolerance";
          case HIGH -> "cold bank, high tolerance";
          case HOT -> "hot bank, high tolerance";
        };
    String loadWords =
        inside
            .map(i -> "load at " + percent(i.loadFactor()) + " %")
            .orElse(load.name().toLowerCase(Locale.ROOT) + " load");
    return percent(supplyPu)
        + " % volts, "
        + loadWords
        + ", "
        + inside.map(i -> "bank at " + percent(i.bankFactor()) + " %").orElse(bankWords)
        + ", "
        + timerWords();
  }

  private String timerWords() {
    if (steps.isEmpty()) {
      return "timers " + timers.name().toLowerCase(Locale.ROOT);
    }
    List<String> late = new ArrayList<>();
    List<String> early = new ArrayList<>();
    for (int k = 1; k <= steps.size(); k++) {
      (steps.get(k - 1) == Timers.LATE ? late : early).add(Integer.toString(k));
    }
    return (late.size() == 1 ? "timer of step " : "timers of steps ")
        + String.join(", ", late)
        + " late, of "
        + String.join(", ", early)
        + " early";
  }

  /** In per cent, as many digits as it takes: two corners never share an id. */
  private static String percent(double perUnit) {
    return BigDecimal.valueOf(perUnit * 100.0)
        .setScale(6, RoundingMode.HALF_UP)
        .stripTrailingZeros()
        .toPlainString();
  }
}
