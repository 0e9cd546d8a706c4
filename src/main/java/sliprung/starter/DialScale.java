package sliprung.starter;

import java.util.OptionalDouble;

/**
 * The scale of a dial on the real device. Values are in the unit of what the dial sets (A, s, Hz,
 * or none).
 *
 * @param low least setting; empty together with {@code high}
 * @param high greatest setting, above {@code low}
 * @param step between two settings, above 0; empty: it turns freely
 * @param errorShare of the greatest setting by which the true value may lie beside the dial, per
 *     unit; 0 where none is declared
 */
public record DialScale(
    OptionalDouble low, OptionalDouble high, OptionalDouble step, double errorShare) {

  /** A dial of which nothing is declared. */
  public static final DialScale NONE =
      new DialScale(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), 0.0);

  /** Refuses a range that ends before it begins, or an error of no range. */
  public DialScale {
    if (low.isPresent() != high.isPresent()
        || (low.isPresent() && !(low.getAsDouble() < high.getAsDouble()))) {
      throw new IllegalArgumentException("a range from low to high");
    }
    if (errorShare < 0.0 || (errorShare > 0.0 && high.isEmpty())) {
      throw new IllegalArgumentException("the error is a share of the end of the range");
    }
  }

  /** Whether the range is declared. */
  public boolean hasRange() {
    return low.isPresent();
  }

  /** How far the true value may lie beside the dial, in the unit of the setting. */
  public double error() {
    return errorShare == 0.0 ? 0.0 : errorShare * high.getAsDouble();
  }
}
