package sliprung.quantity;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads one quantity, a number with its unit in one text: {@code 690 V}, {@code 4/0 AWG}. */
public final class Quantity {
  private static final String GAP = "[ \u00a0\u202f\u2009]";
  private static final Pattern NUMBER =
      Pattern.compile(
          "([+\\-\u2212]?)((?:\\d{1,3}(?:"
              + GAP
              + "\\d{3})+(?!\\d)|\\d+)(?:\\.\\d*)?|\\.\\d+)([eE][+\\-]?\\d{1,4})?"
              + GAP
              + "*(.*)");
  private static final Pattern WIRE_GAUGE =
      Pattern.compile("(?:([1-4])/0|(\\d{1,2}))" + GAP + "*AWG");
  private static final Pattern DECIMAL_COMMA =
      Pattern.compile("[+\\-\u2212]?\\d+(?:[ .']?\\d{3})*,\\d+.*");

  /** No quantity is longer, and no pattern is tried on more letters. */
  private static final int LONGEST = 80;

  private Quantity() {}

  /** A quantity in the unit of its dimension, or what was wrong with the text. */
  public sealed interface Parsed {

    /** The value in the dimension's unit; empty for a mistake. */
    default OptionalDouble value() {
      return this instanceof Value v ? OptionalDouble.of(v.number()) : OptionalDouble.empty();
    }

    /** What was wrong; empty for a value. */
    default Optional<Mistake> mistake() {
      return this instanceof Mistake m ? Optional.of(m) : Optional.empty();
    }
  }

  /**
   * A quantity.
   *
   * @param number finite, in the unit of {@link Dimension}
   */
  public record Value(double number) implements Parsed {}

  /**
   * A text that is not the quantity asked for.
   *
   * @param expected such as {@code a voltage}
   * @param found such as {@code a current, '690 A'}
   * @param hint what to write instead
   */
  public record Mistake(String expected, String found, String hint) implements Parsed {}

  /**
   * Reads a quantity that cannot be given in cycles of the supply.
   *
   * @param text number and unit
   * @param dimension what is asked for
   */
  public static Parsed parse(String text, Dimension dimension) {
    return parse(text, dimension, OptionalDouble.empty());
  }

  /**
   * Reads a quantity.
   *
   * @param text number and unit
   * @param dimension what is asked for
   * @param supplyHertz supply frequency in Hz, above 0: {@code 30 cycles} is a time then
   */
  public static Parsed parse(String text, Dimension dimension, OptionalDouble supplyHertz) {
    String trimmed = text.strip();
    if (trimmed.isEmpty()) {
      return mistake(dimension, "nothing");
    }
    if (trimmed.length() > LONGEST) {
      return mistake(dimension, "'" + clip(trimmed) + "'");
    }
    Matcher gauge = WIRE_GAUGE.matcher(trimmed);
    if (gauge.matches()) {
      return dimension == Dimension.AREA
          ? new Value(wireArea(gauge))
          : mistake(dimension, Dimension.AREA.words() + ", '" + clip(trimmed) + "'");
    }
    if (DECIMAL_COMMA.matcher(trimmed).matches()) {
      return new Mistake(
          dimension.words(),
          "'" + clip(trimmed) + "'",
          "write a decimal point and no thousands comma, for example "
              + quoted(dimension.examples().get(0)));
    }
    Matcher matcher = NUMBER.matcher(trimmed);
    if (!matcher.matches()) {
      return mistake(dimension, "'" + clip(trimmed) + "'");
    }
    double number = number(matcher);
    if (!Double.isFinite(number)) {
      return mistake(dimension, "'" + clip(trimmed) + "', which is beyond any number");
    }
    return withUnit(trimmed, number, matcher.group(4).strip(), dimension, supplyHertz);
  }

  private static Parsed withUnit(
      String text, double number, String unit, Dimension dimension, OptionalDouble supplyHertz) {
    if (unit.isEmpty()) {
      return dimension == Dimension.NUMBER
          ? new Value(number)
          : mistake(dimension, "a number without a unit, '" + clip(text) + "'");
    }
    if (unit.equals("cycles") || unit.equals("cycle")) {
      return cycles(text, number, dimension, supplyHertz);
    }
    Optional<Unit> known = Unit.find(unit, dimension);
    if (known.isPresent()) {
      double value = known.get().convert(number);
      return Double.isFinite(value)
          ? new Value(value)
          : mistake(dimension, "'" + clip(text) + "', which is beyond any number");
    }
    Optional<Unit> other = Unit.find(unit);
    Optional<Unit> otherCase = Unit.findIgnoringCase(unit, dimension);
    if (otherCase.isPresent()) {
      return new Mistake(
          dimension.words(),
          "'" + clip(text) + "'",
          "capitals count in units: write '" + otherCase.get().symbol() + "'");
    }
    return other
        .map(u -> mistake(dimension, u.dimension().words() + ", '" + clip(text) + "'"))
        .orElseGet(
            () ->
                mistake(
                    dimension, "the unknown unit '" + clip(unit) + "' in '" + clip(text) + "'"));
  }

  private static Parsed cycles(
      String text, double number, Dimension dimension, OptionalDouble supplyHertz) {
    if (dimension != Dimension.TIME) {
      return mistake(dimension, "a time, '" + clip(text) + "'");
    }
    if (supplyHertz.isEmpty()) {
      return new Mistake(
          "a time", "'" + clip(text) + "', and no supply frequency", "write for example '0.5 s'");
    }
    double value = number / supplyHertz.getAsDouble();
    return Double.isFinite(value)
        ? new Value(value)
        : mistake(dimension, "'" + clip(text) + "', which is beyond any number");
  }

  private static double number(Matcher matcher) {
    String digits = matcher.group(2).replaceAll(GAP, "");
    String exponent = matcher.group(3) == null ? "" : matcher.group(3);
    double magnitude = Double.parseDouble(digits + exponent);
    boolean negative = matcher.group(1).equals("-") || matcher.group(1).equals("\u2212");
    return negative ? -magnitude : magnitude;
  }

  /** American wire gauge: the diameter falls by 92^(1/39) a number from 0.127 mm at 36. */
  private static double wireArea(Matcher gauge) {
    int number =
        gauge.group(1) != null
            ? 1 - Integer.parseInt(gauge.group(1))
            : Integer.parseInt(gauge.group(2));
    double millimetres = 0.127 * Math.pow(92.0, (36.0 - number) / 39.0);
    return Math.PI / 4.0 * millimetres * millimetres;
  }

  private static Mistake mistake(Dimension dimension, String found) {
    String hint =
        "write for example "
            + quoted(dimension.examples().get(0))
            + " or "
            + quoted(dimension.examples().get(1));
    return new Mistake(dimension.words(), found, hint);
  }

  private static String quoted(String text) {
    return "'" + text + "'";
  }

  /** Long texts are cut and line ends taken out: a message is one line. */
  private static String clip(String text) {
    String flat = text.replaceAll("[\\s\\p{C}]+", " ");
    return flat.codePointCount(0, flat.length()) <= 40
        ? flat
        : flat.substring(0, flat.offsetByCodePoints(0, 40)) + "…";
  }
}
