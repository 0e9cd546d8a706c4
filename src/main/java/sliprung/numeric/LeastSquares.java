package sliprung.numeric;

import java.util.Arrays;
import java.util.function.Function;
import org.apache.commons.math3.exception.ConvergenceException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.exception.TooManyIterationsException;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresBuilder;
import org.apache.commons.math3.fitting.leastsquares.LeastSquaresProblem;
import org.apache.commons.math3.fitting.leastsquares.LevenbergMarquardtOptimizer;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.util.Pair;

/**
 * Least squares by Levenberg and Marquardt, with derivatives by central differences. Deterministic:
 * the same start gives the same answer.
 */
public final class LeastSquares {
  private static final double STEP = 1e-6;
  private static final int MOST = 400;

  private LeastSquares() {}

  /**
   * Where a minimization ended.
   *
   * @param point the best point met
   * @param cost half the sum of the squared residuals there
   */
  public record Solution(double[] point, double cost) {}

  /**
   * Minimizes the sum of squared residuals.
   *
   * @param residuals as many for every point, finite; parameters near 1 in size (logarithms, say)
   * @param start where to begin
   * @return the best point met, also where the method gave up before it converged
   */
  public static Solution minimize(Function<double[], double[]> residuals, double[] start) {
    Best best = new Best(residuals);
    double[] first = best.at(start);
    LeastSquaresProblem problem =
        new LeastSquaresBuilder()
            .start(start)
            .target(new double[first.length])
            .model(
                point -> {
                  double[] p = point.toArray();
                  return new Pair<>(
                      new ArrayRealVector(best.at(p), false),
                      new Array2DRowRealMatrix(jacobian(residuals, p, first.length), false));
                })
            .maxEvaluations(MOST)
            .maxIterations(MOST)
            .build();
    try {
      new LevenbergMarquardtOptimizer().optimize(problem);
    } catch (TooManyEvaluationsException
        | TooManyIterationsException
        | ConvergenceException gaveUp) {
      // The best point met is the answer; how good it is, its residuals tell.
      return best.solution();
    }
    return best.solution();
  }

  private static double[][] jacobian(
      Function<double[], double[]> residuals, double[] point, int rows) {
    double[][] jacobian = new double[rows][point.length];
    for (int j = 0; j < point.length; j++) {
      double[] moved = point.clone();
      moved[j] = point[j] + STEP;
      double[] up = residuals.apply(moved);
      moved[j] = point[j] - STEP;
      double[] down = residuals.apply(moved);
      for (int i = 0; i < rows; i++) {
        jacobian[i][j] = (up[i] - down[i]) / (2.0 * STEP);
      }
    }
    return jacobian;
  }

  private static final class Best {
    private final Function<double[], double[]> residuals;
    private double[] point;
    private double cost = Double.POSITIVE_INFINITY;

    Best(Function<double[], double[]> residuals) {
      this.residuals = residuals;
    }

    double[] at(double[] p) {
      double[] r = residuals.apply(p);
      double c = 0.5 * Arrays.stream(r).map(x -> x * x).sum();
      if (point == null || c < cost) {
        point = p.clone();
        cost = c;
      }
      return r;
    }

    Solution solution() {
      return new Solution(point, cost);
    }
  }
}
