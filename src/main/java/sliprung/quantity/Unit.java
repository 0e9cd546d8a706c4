package sliprung.quantity;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/**
 * A unit that may stand behind a number.
 *
 * @param symbol as preferred in print
 * @param dimension what it measures
 * @param factor value in the dimension's own unit of one of this unit
 * @param offset added after the factor; temperatures only
 */
record Unit(String symbol, Dimension dimension, double factor, double offset) {

  /** Mechanical horsepower, W, as the contract of the file format fixes it. */
  private static final double HORSEPOWER = 745.7;

  private static final double POUND_FOOT = 1.3558179483;
  private static final double POUND_INCH = POUND_FOOT / 12.0;
  private static final double POUND_SQUARE_FOOT = 0.0421401101;

  /** mm² of a circle of 1000 circular mils. */
  private static final double KCMIL = 0.506707479;

  private static final Map<String, List<Unit>> BY_SPELLING = table();

  /** A number of this unit in the dimension's own unit. */
  double convert(double number) {
    double inverse = 1.0 / factor;
    // 94.5 / 100 is 0.945, 94.5 × 0.01 is not: thousandths and hundredths are divided.
    double scaled =
        factor < 1.0 && inverse == Math.rint(inverse) ? number / inverse : number * factor;
    return scaled + offset;
  }

  /** The unit of that spelling in that dimension. */
  static Optional<Unit> find(String spelling, Dimension dimension) {
    return BY_SPELLING.getOrDefault(normal(spelling), List.of()).stream()
        .filter(u -> u.dimension() == dimension)
        .findFirst();
  }

  /** Any unit of that spelling, whatever it measures. */
  static Optional<Unit> find(String spelling) {
    return BY_SPELLING.getOrDefault(normal(spelling), List.of()).stream().findFirst();
  }

  /** The unit of that dimension that differs from the spelling in the case of letters only. */
  static Optional<Unit> findIgnoringCase(String spelling, Dimension dimension) {
    String wanted = normal(spelling).toLowerCase(Locale.ROOT);
    return BY_SPELLING.entrySet().stream()
        .filter(e -> e.getKey().toLowerCase(Locale.ROOT).equals(wanted))
        .flatMap(e -> e.getValue().stream())
        .filter(u -> u.dimension() == dimension)
        .findFirst();
  }

  /** One spelling for what keyboards write differently: dots, micro-ohm signs, exponents. */
  private static String normal(String spelling) {
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < spelling.length(); i++) {
      char c = spelling.charAt(i);
      switch (c) {
        case '\u00b7', '\u22c5', '\u2219', '\u2022', '*', '.' -> out.append('\u00b7');
        case '\u2126' -> out.append('\u03a9');
        case '\u00ba' -> out.append('\u00b0');
        case '\u00b2' -> out.append('2');
        case ' ', '\u00a0', '^' -> {
          // "N m" and "kg m^2" are the same as "Nm" and "kgm2"
        }
        default -> out.append(c);
      }
    }
    return out.toString();
  }

  private static Map<String, List<Unit>> table() {
    Map<String, List<Unit>> all = new LinkedHashMap<>();
    add(all, Dimension.VOLTAGE, 1.0, "V");
    add(all, Dimension.VOLTAGE, 1e3, "kV");
    add(all, Dimension.CURRENT, 1.0, "A");
    add(all, Dimension.CURRENT, 1e3, "kA");
    add(all, Dimension.CURRENT, 1e-3, "mA");
    add(all, Dimension.POWER, 1.0, "W");
    add(all, Dimension.POWER, 1e3, "kW");
    add(all, Dimension.POWER, 1e6, "MW");
    add(all, Dimension.POWER, HORSEPOWER, "hp", "HP");
    add(all, Dimension.TIME, 1.0, "s");
    add(all, Dimension.TIME, 1e-3, "ms");
    add(all, Dimension.TIME, 60.0, "min");
    add(all, Dimension.TIME, 3600.0, "h");
    add(all, Dimension.FREQUENCY, 1.0, "Hz");
    add(all, Dimension.SPEED, 1.0, "rpm", "1/min", "r/min", "min-1");
    add(all, Dimension.RESISTANCE, 1.0, "ohm", "ohms", "Ω");
    add(all, Dimension.RESISTANCE, 1e-3, "mohm", "mΩ");
    add(all, Dimension.TORQUE, 1.0, "N·m", "Nm");
    add(all, Dimension.TORQUE, 1e3, "kN·m", "kNm");
    add(all, Dimension.TORQUE, POUND_FOOT, "lb·ft", "lb-ft", "lbf·ft", "ft·lb", "ft-lb", "ft·lbf");
    add(all, Dimension.TORQUE, POUND_INCH, "lb·in", "lb-in", "lbf·in", "in·lb", "in-lb");
    add(all, Dimension.INERTIA, 1.0, "kg·m²", "kgm²");
    add(all, Dimension.INERTIA, POUND_SQUARE_FOOT, "lb·ft²", "lb-ft²", "lbft²");
    addTemperature(all, 1.0, 0.0, "°C", "C", "degC");
    addTemperature(all, 5.0 / 9.0, -160.0 / 9.0, "°F", "F", "degF");
    add(all, Dimension.TEMPERATURE_RISE, 1.0, "K", "°C", "C");
    add(all, Dimension.TEMPERATURE_RISE, 5.0 / 9.0, "°F", "F");
    add(all, Dimension.AREA, 1.0, "mm²");
    add(all, Dimension.AREA, KCMIL, "kcmil", "MCM");
    add(all, Dimension.SHARE, 0.01, "%");
    return all;
  }

  private static void add(
      Map<String, List<Unit>> all, Dimension dimension, double factor, String... spellings) {
    put(all, new Unit(spellings[0], dimension, factor, 0.0), spellings);
  }

  private static void addTemperature(
      Map<String, List<Unit>> all, double factor, double offset, String... spellings) {
    put(all, new Unit(spellings[0], Dimension.TEMPERATURE, factor, offset), spellings);
  }

  private static void put(Map<String, List<Unit>> all, Unit unit, String... spellings) {
    for (String spelling : spellings) {
      all.computeIfAbsent(normal(spelling), k -> new ArrayList<>()).add(unit);
    }
  }
}
