package sliprung.numeric;

import java.util.Arrays;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;

/**
 * Integration of an autonomous system {@code dy/dt = f(y)} until a time or until a function of y
 * crosses zero: Dormand and Prince's method of order 8 with dense output, from Commons Math (see
 * {@link Flow}).
 */
public final class SystemFlow {
  private static final double LEAST_STEP = 1e-13;

  private SystemFlow() {}

  /** The right-hand side. */
  public interface Rates {
    /** Writes dy/dt at y. */
    void at(double[] state, double[] rate);
  }

  /** A function of y whose change of sign ends the integration. */
  public interface Stop {
    /** Its value. */
    double at(double[] state);
  }

  /** Takes one step of the solution. */
  public interface Steps {
    /** A step from one time to a later one. */
    void step(double from, double to, Dense solution);
  }

  /** The solution within a step. */
  public interface Dense {
    /** y at a time of the step, in an array of the caller's own. */
    double[] at(double time);
  }

  /**
   * Where an integration ended.
   *
   * @param time at the end
   * @param state y there
   * @param crossed index of the function that ended it; −1: the end time did
   */
  public record End(double time, double[] state, int crossed) {}

  /**
   * Integrates.
   *
   * @param rates f
   * @param tolerances by component, absolute
   * @param fromTime start
   * @param fromState y there
   * @param toTime latest end, after the start
   * @param steps takes every step
   * @param stops the first to change its sign ends the integration
   */
  public static End run(
      Rates rates,
      double[] tolerances,
      double fromTime,
      double[] fromState,
      double toTime,
      Steps steps,
      Stop... stops) {
    double span = toTime - fromTime;
    double[] none = new double[tolerances.length];
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(Math.min(LEAST_STEP, span / 2.0), span, tolerances, none);
    integrator.addStepHandler(new Handler(steps));
    int[] crossed = {-1};
    for (int i = 0; i < stops.length; i++) {
      integrator.addEventHandler(
          new Crossing(stops[i], i, crossed), span, Math.max(1e-12, 1e-12 * span), 200);
    }
    double[] y = fromState.clone();
    double time =
        integrator.integrate(
            new FirstOrderDifferentialEquations() {
              @Override
              public int getDimension() {
                return tolerances.length;
              }

              @Override
              public void computeDerivatives(double t, double[] state, double[] rate) {
                rates.at(state, rate);
              }
            },
            fromTime,
            y,
            toTime,
            y);
    return new End(time, y, crossed[0]);
  }

  private static final class Crossing implements EventHandler {
    private final Stop function;
    private final int index;
    private final int[] crossed;

    Crossing(Stop function, int index, int[] crossed) {
      this.function = function;
      this.index = index;
      this.crossed = crossed;
    }

    @Override
    public void init(double t0, double[] y0, double t) {
      // nothing to prepare: the function has no memory
    }

    @Override
    public double g(double t, double[] y) {
      return function.at(y);
    }

    @Override
    public Action eventOccurred(double t, double[] y, boolean increasing) {
      crossed[0] = index;
      return Action.STOP;
    }

    @Override
    public void resetState(double t, double[] y) {
      // the state goes on unchanged
    }
  }

  private static final class Handler implements StepHandler {
    private final Steps steps;

    Handler(Steps steps) {
      this.steps = steps;
    }

    @Override
    public void init(double t0, double[] y0, double t) {
      // the first state is the caller's
    }

    @Override
    public void handleStep(StepInterpolator interpolator, boolean isLast) {
      steps.step(
          interpolator.getPreviousTime(),
          interpolator.getCurrentTime(),
          time -> {
            interpolator.setInterpolatedTime(time);
            double[] state = interpolator.getInterpolatedState();
            return Arrays.copyOf(state, state.length);
          });
    }
  }
}
