package sliprung.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Prints quantities for people: three significant figures, SI spacing, units always. A no-break
 * space keeps a figure and its unit together.
 */
public final class Show {
  private static final String NO_BREAK = "\u00a0";

  private Show() {}

  /** {@code 208 A}, {@code 14.3 kA}, {@code ∞} never comes. */
  public static String amps(double amps) {
    return Math.abs(amps) >= 9999.5 ? three(amps / 1000.0) + "\u00a0kA" : three(amps) + "\u00a0A";
  }

  /** {@code 0.92 s}, {@code 13.7 s}, {@code 5.2 min} from ten minutes on; {@code never}. */
  public static String seconds(double seconds) {
    if (Double.isInfinite(seconds)) {
      return "never";
    }
    return Math.abs(seconds) >= 599.5
        ? three(seconds / 60.0) + "\u00a0min"
        : three(seconds) + "\u00a0s";
  }

  /** {@code 1 233 rpm} from rad/s. */
  public static String rpm(double radiansPerSecond) {
    return grouped(Math.round(radiansPerSecond * 30.0 / Math.PI)) + "\u00a0rpm";
  }

  /** {@code 1 290 N·m}. */
  public static String torque(double newtonMetres) {
    return three(newtonMetres) + "\u00a0N·m";
  }

  /** {@code 690 V}. */
  public static String volts(double volts) {
    return three(volts) + "\u00a0V";
  }

  /** {@code 7 %} of a share. */
  public static String percent(double share) {
    return three(share * 100.0) + "\u00a0%";
  }

  /** A margin or ratio with two decimals below ten: {@code 1.07}, {@code 7.93}, {@code 12.4}. */
  public static String ratio(double ratio) {
    if (Double.isInfinite(ratio)) {
      return "no limit";
    }
    return Math.abs(ratio) < 9.995
        ? BigDecimal.valueOf(ratio).setScale(2, RoundingMode.HALF_EVEN).toPlainString()
        : three(ratio);
  }

  /** Three significant figures, plain notation, thousands apart. */
  public static String three(double value) {
    if (value == 0.0) {
      return "0";
    }
    if (Double.isNaN(value)) {
      return "–";
    }
    if (Double.isInfinite(value)) {
      return value > 0 ? "∞" : "−∞";
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(3, RoundingMode.HALF_EVEN));
    String plain = rounded.stripTrailingZeros().toPlainString();
    String sign = plain.startsWith("-") ? "−" : "";
    String digits = plain.startsWith("-") ? plain.substring(1) : plain;
    int point = digits.indexOf('.');
    String whole = point < 0 ? digits : digits.substring(0, point);
    String rest = point < 0 ? "" : digits.substring(point);
    return sign + groupDigits(whole) + rest;
  }

  private static String grouped(long value) {
    return (value < 0 ? "−" : "") + groupDigits(Long.toString(Math.abs(value)));
  }

  private static String groupDigits(String whole) {
    StringBuilder out = new StringBuilder();
    for (int i = 0; i < whole.length(); i++) {
      if (i > 0 && (whole.length() - i) % 3 == 0) {
        out.append(NO_BREAK);
      }
      out.append(whole.charAt(i));
    }
    return out.toString();
  }
}
