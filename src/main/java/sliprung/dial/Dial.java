package sliprung.dial;

import java.util.function.BiFunction;
import sliprung.quantity.Dimension;
import sliprung.starter.DialScale;
import sliprung.starter.Starter;

/**
 * One adjustable setting of a starter.
 *
 * @param path of the setting, such as {@code steps.K11.after} or {@code protection.F2.dial}
 * @param device tag of what carries the dial, such as {@code K11} (its timer) or {@code F2}
 * @param setting key of the setting, such as {@code after}
 * @param dimension of the value, which is in its unit
 * @param value set today
 * @param scale of the real dial
 * @param setter the same starter with the dial at another value
 */
public record Dial(
    String path,
    String device,
    String setting,
    Dimension dimension,
    double value,
    DialScale scale,
    BiFunction<Starter, Double, Starter> setter) {

  /** Without a declared range a dial is searched from an eighth to eight times its value. */
  static final double UNDECLARED_SPAN = 8.0;

  /** The same starter with this dial at another value. */
  public Starter turned(Starter starter, double to) {
    return setter.apply(starter, to);
  }

  /** Least value that is looked at. */
  public double low() {
    return scale.low().orElse(value / UNDECLARED_SPAN);
  }

  /** Greatest value that is looked at. */
  public double high() {
    return scale.high().orElse(value * UNDECLARED_SPAN);
  }

  /** The setting of the real dial nearest to a value, within its range. */
  public double onScale(double wish) {
    if (scale.step().isEmpty()) {
      return clamp(threeFigures(wish));
    }
    double step = scale.step().getAsDouble();
    double origin = scale.low().orElse(0.0);
    double least = origin > 0.0 || scale.hasRange() ? 0.0 : 1.0;
    double most = scale.hasRange() ? Math.floor((high() - origin) / step + 1e-9) : 1e12;
    double k = Math.max(least, Math.min(most, Math.rint((wish - origin) / step)));
    return clean(origin + k * step);
  }

  /**
   * The next setting of the real dial above (+1) or below (−1) a setting on it; itself at an end.
   */
  public double neighbour(double setting, int direction) {
    double step =
        scale
            .step()
            .orElseGet(() -> Math.pow(10.0, Math.floor(Math.log10(Math.abs(setting))) - 2.0));
    double next = onScale(setting + direction * step);
    return next < low() || next > high() ? setting : next;
  }

  private double clamp(double x) {
    return Math.max(low(), Math.min(high(), x));
  }

  /** Rounded to three significant figures. */
  static double threeFigures(double x) {
    if (x == 0.0) {
      return 0.0;
    }
    return new java.math.BigDecimal(x)
        .round(new java.math.MathContext(3, java.math.RoundingMode.HALF_EVEN))
        .doubleValue();
  }

  /** Without the dust that adding steps leaves. */
  private static double clean(double x) {
    return new java.math.BigDecimal(x)
        .round(new java.math.MathContext(12, java.math.RoundingMode.HALF_EVEN))
        .doubleValue();
  }
}
