package sliprung.tolerance;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;

/**
 * One corner of the spreads.
 *
 * @param supplyPu no-load voltage over rated
 * @param load which load
 * @param bank which bank
 * @param timers which timers and levels
 */
public record Corner(double supplyPu, LoadSide load, Bank bank, Timers timers) {

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
    LATE
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
        percent(),
        load.name().toLowerCase(Locale.ROOT),
        bank.name().toLowerCase(Locale.ROOT),
        timers.name().toLowerCase(Locale.ROOT));
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
    return percent()
        + " % volts, "
        + load.name().toLowerCase(Locale.ROOT)
        + " load, "
        + bankWords
        + ", timers "
        + timers.name().toLowerCase(Locale.ROOT);
  }

  /** Voltage in per cent, as many digits as it takes: two corners never share an id. */
  private String percent() {
    return BigDecimal.valueOf(supplyPu * 100.0)
        .setScale(6, RoundingMode.HALF_UP)
        .stripTrailingZeros()
        .toPlainString();
  }
}
