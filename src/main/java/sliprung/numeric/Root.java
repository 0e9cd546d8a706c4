package sliprung.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/** Where a continuous function passes through zero, by Brent's method. */
public final class Root {
  private static final int MOST_EVALUATIONS = 500;

  private Root() {}

  /**
   * The root in an interval at whose ends the function has opposite signs (or is zero).
   *
   * @param f continuous
   * @param lo one end
   * @param hi the other end, greater than {@code lo}
   * @param relativeAccuracy of the root, such as 1e-12
   * @throws IllegalArgumentException when the ends do not bracket a root
   */
  public static double find(DoubleUnaryOperator f, double lo, double hi, double relativeAccuracy) {
    double atLo = f.applyAsDouble(lo);
    if (atLo == 0.0) {
      return lo;
    }
    double atHi = f.applyAsDouble(hi);
    if (atHi == 0.0) {
      return hi;
    }
    if (!brackets(atLo, atHi)) {
      throw new IllegalArgumentException(
          "no change of sign between " + lo + " (" + atLo + ") and " + hi + " (" + atHi + ")");
    }
    double tiny = Double.MIN_NORMAL;
    return new BrentSolver(relativeAccuracy, tiny, tiny)
        .solve(MOST_EVALUATIONS, f::applyAsDouble, lo, hi);
  }

  /** Whether two values of a function lie on different sides of zero. */
  public static boolean brackets(double atLo, double atHi) {
    return (atLo < 0.0 && atHi > 0.0) || (atLo > 0.0 && atHi < 0.0);
  }
}
