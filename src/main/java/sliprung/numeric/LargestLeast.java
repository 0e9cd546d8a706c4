package sliprung.numeric;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.PointValuePair;
import org.apache.commons.math3.optim.linear.LinearConstraint;
import org.apache.commons.math3.optim.linear.LinearConstraintSet;
import org.apache.commons.math3.optim.linear.LinearObjectiveFunction;
import org.apache.commons.math3.optim.linear.NonNegativeConstraint;
import org.apache.commons.math3.optim.linear.Relationship;
import org.apache.commons.math3.optim.linear.SimplexSolver;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;

/**
 * The move that lifts the least of several linear functions the most, by the simplex method. Second
 * to that it lifts every function that is below 0 towards 0, and it moves no further than that
 * takes.
 */
public final class LargestLeast {
  private static final double SHORTFALL = 0.05;
  private static final double MOVE = 0.002;
  private static final int MOST_ITERATIONS = 5000;

  private LargestLeast() {}

  /**
   * Finds the move.
   *
   * @param values of the functions where one stands
   * @param slopes of each function along each variable
   * @param least move of each variable, 0 or below
   * @param most move of each variable, 0 or above
   * @param enough above this a function need not be lifted
   * @return the move; empty where the method gives up
   */
  public static Optional<double[]> move(
      double[] values, double[][] slopes, double[] least, double[] most, double enough) {
    int n = least.length;
    int m = values.length;
    // variables: up[n], down[n], lift (above the least value), short[m]
    int size = 2 * n + 1 + m;
    double floor = enough;
    for (double value : values) {
      floor = Math.min(floor, value);
    }
    List<LinearConstraint> constraints = new ArrayList<>();
    for (int k = 0; k < m; k++) {
      double[] row = new double[size];
      double[] below = new double[size];
      for (int i = 0; i < n; i++) {
        row[i] = slopes[k][i];
        row[n + i] = -slopes[k][i];
        below[i] = slopes[k][i];
        below[n + i] = -slopes[k][i];
      }
      row[2 * n] = -1.0;
      below[2 * n + 1 + k] = 1.0;
      // a function may go below where it is by as much as the least allows
      constraints.add(new LinearConstraint(row, Relationship.GEQ, floor - values[k]));
      constraints.add(new LinearConstraint(below, Relationship.GEQ, -values[k]));
    }
    for (int i = 0; i < n; i++) {
      constraints.add(bound(size, i, most[i]));
      constraints.add(bound(size, n + i, -least[i]));
    }
    constraints.add(bound(size, 2 * n, Math.max(0.0, enough - floor)));
    double[] goal = new double[size];
    for (int i = 0; i < 2 * n; i++) {
      goal[i] = -MOVE;
    }
    goal[2 * n] = 1.0;
    for (int k = 0; k < m; k++) {
      goal[2 * n + 1 + k] = -SHORTFALL;
    }
    try {
      PointValuePair found =
          new SimplexSolver()
              .optimize(
                  new MaxIter(MOST_ITERATIONS),
                  new LinearObjectiveFunction(goal, 0.0),
                  new LinearConstraintSet(constraints),
                  GoalType.MAXIMIZE,
                  new NonNegativeConstraint(true));
      double[] move = new double[n];
      for (int i = 0; i < n; i++) {
        move[i] = found.getPoint()[i] - found.getPoint()[n + i];
      }
      return Optional.of(move);
    } catch (MathIllegalStateException gaveUp) {
      // Too many iterations, or unsolvable by rounding: the caller tries a smaller move.
      return Optional.empty();
    }
  }

  private static LinearConstraint bound(int size, int variable, double most) {
    double[] row = new double[size];
    row[variable] = 1.0;
    return new LinearConstraint(row, Relationship.LEQ, most);
  }
}
