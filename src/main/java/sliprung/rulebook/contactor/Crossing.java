package sliprung.rulebook.contactor;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/** Where two time-current laws cross. */
public final class Crossing {
  private static final int STEPS_A_DECADE = 400;
  private static final double PRECISION = 1e-9;

  private Crossing() {}

  /**
   * The greatest current at which one law is no later than another.
   *
   * @param one seconds by amperes, infinite: never
   * @param other likewise
   * @param fromAmps above 0
   * @param toAmps above {@code fromAmps}
   * @return amperes, the upper end where it still holds there; empty where it never holds
   */
  public static OptionalDouble greatestFirst(
      DoubleUnaryOperator one, DoubleUnaryOperator other, double fromAmps, double toAmps) {
    double above = toAmps;
    double[] grid = grid(fromAmps, toAmps);
    for (int k = grid.length - 1; k >= 0; k--) {
      if (isFirst(one, other, grid[k])) {
        return OptionalDouble.of(k == grid.length - 1 ? toAmps : limit(one, other, grid[k], above));
      }
      above = grid[k];
    }
    return OptionalDouble.empty();
  }

  /**
   * The least current at which one law is no later than another; the arguments are those of {@link
   * #greatestFirst}.
   */
  public static OptionalDouble leastFirst(
      DoubleUnaryOperator one, DoubleUnaryOperator other, double fromAmps, double toAmps) {
    double below = fromAmps;
    for (double amps : grid(fromAmps, toAmps)) {
      if (isFirst(one, other, amps)) {
        return OptionalDouble.of(amps == fromAmps ? fromAmps : limit(one, other, amps, below));
      }
      below = amps;
    }
    return OptionalDouble.empty();
  }

  private static boolean isFirst(DoubleUnaryOperator one, DoubleUnaryOperator other, double amps) {
    double seconds = one.applyAsDouble(amps);
    return seconds < Double.POSITIVE_INFINITY && seconds <= other.applyAsDouble(amps);
  }

  /** The end of what holds, between a current where it does and one where it does not. */
  private static double limit(
      DoubleUnaryOperator one, DoubleUnaryOperator other, double holds, double doesNot) {
    double on = holds;
    double off = doesNot;
    while (Math.abs(off - on) > PRECISION * Math.max(on, off)) {
      double middle = 0.5 * (on + off);
      if (isFirst(one, other, middle)) {
        on = middle;
      } else {
        off = middle;
      }
    }
    return on;
  }

  private static double[] grid(double from, double to) {
    int count = Math.max(2, (int) Math.ceil(STEPS_A_DECADE * Math.log10(to / from)) + 1);
    double[] grid = new double[count];
    for (int k = 0; k < count; k++) {
      grid[k] = from * Math.pow(to / from, k / (count - 1.0));
    }
    grid[0] = from;
    grid[count - 1] = to;
    return grid;
  }
}
