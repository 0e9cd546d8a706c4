package sliprung.numeric;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.apache.commons.math3.ode.sampling.StepHandler;
import org.apache.commons.math3.ode.sampling.StepInterpolator;

/**
 * Integration of one autonomous equation {@code dy/dt = f(y)} until a time or until a function of y
 * crosses zero: Dormand and Prince's method of order 8 with dense output (Hairer, Nørsett, Wanner,
 * Solving Ordinary Differential Equations I, section II.5, from memory), from Commons Math.
 */
public final class Flow {
  /** Simpson pieces to each step of the integrator. */
  private static final int PIECES = 8;

  private static final double RELATIVE = 1e-12;
  private static final double LEAST_STEP = 1e-13;

  private Flow() {}

  /**
   * Samples of a solution: an odd number, each even-numbered pair of neighbours with its midpoint
   * in between.
   *
   * @param times rising
   * @param values at these
   * @param crossed index of the function that ended the integration; −1: the end time did
   */
  public record Samples(double[] times, double[] values, int crossed) {

    /** Last time. */
    public double endTime() {
      return times[times.length - 1];
    }

    /** Last value. */
    public double endValue() {
      return values[values.length - 1];
    }
  }

  /**
   * Integrates.
   *
   * @param derivative f
   * @param scale size of y for the absolute tolerance, above 0
   * @param fromTime start
   * @param fromValue y there
   * @param toTime latest end, after the start
   * @param stops functions of y; the first to change its sign ends the integration
   */
  public static Samples run(
      DoubleUnaryOperator derivative,
      double scale,
      double fromTime,
      double fromValue,
      double toTime,
      DoubleUnaryOperator... stops) {
    double span = toTime - fromTime;
    DormandPrince853Integrator integrator =
        new DormandPrince853Integrator(
            Math.min(LEAST_STEP, span / 2.0), span, RELATIVE * scale, RELATIVE);
    Recorder recorder = new Recorder(fromTime, fromValue);
    integrator.addStepHandler(recorder);
    int[] crossed = {-1};
    for (int i = 0; i < stops.length; i++) {
      integrator.addEventHandler(
          new Crossing(stops[i], i, crossed), span, Math.max(1e-12, 1e-12 * span), 200);
    }
    double[] y = {fromValue};
    integrator.integrate(
        new FirstOrderDifferentialEquations() {
          @Override
          public int getDimension() {
            return 1;
          }

          @Override
          public void computeDerivatives(double t, double[] state, double[] rate) {
            rate[0] = derivative.applyAsDouble(state[0]);
          }
        },
        fromTime,
        y,
        toTime,
        y);
    return new Samples(recorder.times(), recorder.values(), crossed[0]);
  }

  private static final class Crossing implements EventHandler {
    private final DoubleUnaryOperator function;
    private final int index;
    private final int[] crossed;

    Crossing(DoubleUnaryOperator function, int index, int[] crossed) {
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
      return function.applyAsDouble(y[0]);
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

  private static final class Recorder implements StepHandler {
    private double[] times = new double[256];
    private double[] values = new double[256];
    private int count;

    Recorder(double time, double value) {
      add(time, value);
    }

    private void add(double time, double value) {
      if (count == times.length) {
        times = java.util.Arrays.copyOf(times, 2 * count);
        values = java.util.Arrays.copyOf(values, 2 * count);
      }
      times[count] = time;
      values[count++] = value;
    }

    @Override
    public void init(double t0, double[] y0, double t) {
      // the first sample is already there
    }

    @Override
    public void handleStep(StepInterpolator interpolator, boolean isLast) {
      double from = interpolator.getPreviousTime();
      double to = interpolator.getCurrentTime();
      int parts = 2 * PIECES;
      for (int i = 1; i <= parts; i++) {
        double t = i == parts ? to : from + (to - from) * i / parts;
        interpolator.setInterpolatedTime(t);
        add(t, interpolator.getInterpolatedState()[0]);
      }
    }

    double[] times() {
      return java.util.Arrays.copyOf(times, count);
    }

    double[] values() {
      return java.util.Arrays.copyOf(values, count);
    }
  }
}
