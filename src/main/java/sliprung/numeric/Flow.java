package sliprung.numeric;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * Integration of one autonomous equation {@code dy/dt = f(y)} until a time or until a function of y
 * crosses zero: the method of {@link SystemFlow} for a single number, without its arrays. A review
 * takes thousands of these, a sampling tens of thousands.
 */
public final class Flow {
  /** Simpson pieces to each step of the integrator. */
  private static final int PIECES = 2;

  private static final double RELATIVE = 3e-13;
  private static final double LEAST_STEP = 1e-13;
  private static final double SAFETY = 0.9;
  private static final double GROWS_MOST = 6.0;
  private static final double SHRINKS_MOST = 0.333;
  private static final double ORDER = 8.0;
  private static final int LAST = DormandPrinceTableau.STAGES;

  private final DoubleUnaryOperator derivative;
  private final double scale;
  private final double[] k = new double[DormandPrinceTableau.ALL];
  private final double[] terms = new double[7];
  private double[] times = new double[128];
  private double[] values = new double[128];
  private int count;
  private double time;
  private double y;
  private double next;

  private Flow(DoubleUnaryOperator derivative, double scale, double fromTime, double fromValue) {
    this.derivative = derivative;
    this.scale = scale;
    this.time = fromTime;
    this.y = fromValue;
    add(fromTime, fromValue);
  }

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
   * @param stops functions of y; the first to change its sign ends the integration; one that begins
   *     at zero counts from the sign it takes
   */
  public static Samples run(
      DoubleUnaryOperator derivative,
      double scale,
      double fromTime,
      double fromValue,
      double toTime,
      DoubleUnaryOperator... stops) {
    return new Flow(derivative, scale, fromTime, fromValue).run(toTime, stops);
  }

  private Samples run(double toTime, DoubleUnaryOperator[] stops) {
    k[0] = derivative.applyAsDouble(y);
    double[] before = new double[stops.length];
    for (int i = 0; i < stops.length; i++) {
      before[i] = stops[i].applyAsDouble(y);
    }
    double step = Math.min(firstStep(), toTime - time);
    boolean rejected = false;
    while (time < toTime) {
      boolean last = time + 1.01 * step >= toTime;
      double h = last ? toTime - time : step;
      double error = attempt(h);
      double change = Math.pow(error, 1.0 / ORDER) / SAFETY;
      if (error > 1.0 && h > LEAST_STEP) {
        step = h / Math.min(1.0 / SHRINKS_MOST, change);
        rejected = true;
        continue;
      }
      double to = last ? toTime : time + h;
      prepareDense(h);
      double end = Double.POSITIVE_INFINITY;
      int crossed = -1;
      for (int i = 0; i < stops.length; i++) {
        double after = stops[i].applyAsDouble(next);
        if (before[i] != 0.0 && Math.signum(before[i]) != Math.signum(after)) {
          double at = crossing(stops[i], h, to, before[i]);
          if (at < end) {
            end = at;
            crossed = i;
          }
        }
        before[i] = after;
      }
      sample(h, crossed < 0 ? to : end, crossed < 0);
      if (crossed >= 0) {
        return samples(crossed);
      }
      time = to;
      y = next;
      k[0] = k[LAST];
      double growth = 1.0 / Math.max(1.0 / GROWS_MOST, Math.min(1.0 / SHRINKS_MOST, change));
      step = h * (rejected ? Math.min(1.0, growth) : growth);
      rejected = false;
    }
    return samples(-1);
  }

  private double tolerance() {
    return RELATIVE * Math.max(scale, Math.abs(y));
  }

  /** Hairer, Nørsett, Wanner, section II.4: by the sizes of y, of f and of its change. */
  private double firstStep() {
    double tolerance = tolerance();
    double d0 = Math.abs(y) / tolerance;
    double d1 = Math.abs(k[0]) / tolerance;
    double h0 = d0 < 1e-5 || d1 < 1e-5 ? 1e-6 : 0.01 * d0 / d1;
    double d2 = Math.abs(derivative.applyAsDouble(y + h0 * k[0]) - k[0]) / tolerance / h0;
    double most = Math.max(d1, d2);
    double h1 = most <= 1e-15 ? Math.max(1e-6, h0 * 1e-3) : Math.pow(0.01 / most, 1.0 / ORDER);
    return Math.max(LEAST_STEP, Math.min(100.0 * h0, h1));
  }

  private double sum(DormandPrinceTableau.Row row) {
    int[] stages = row.stages();
    double[] weights = row.weights();
    double sum = 0.0;
    for (int j = 0; j < stages.length; j++) {
      sum += weights[j] * k[stages[j]];
    }
    return sum;
  }

  /** Takes a step into {@code next}; its error over the tolerance. */
  private double attempt(double h) {
    for (int stage = 1; stage < LAST; stage++) {
      k[stage] = derivative.applyAsDouble(y + h * sum(DormandPrinceTableau.A[stage]));
    }
    next = y + h * sum(DormandPrinceTableau.A[LAST]);
    k[LAST] = derivative.applyAsDouble(next);
    double tolerance = tolerance();
    double e5 = sum(DormandPrinceTableau.E5) / tolerance;
    double e3 = sum(DormandPrinceTableau.E3) / tolerance;
    double both = e5 * e5 + 0.01 * e3 * e3;
    return both <= 0.0 ? 0.0 : h * e5 * e5 / Math.sqrt(both);
  }

  private void prepareDense(double h) {
    for (int stage = LAST + 1; stage < DormandPrinceTableau.ALL; stage++) {
      k[stage] = derivative.applyAsDouble(y + h * sum(DormandPrinceTableau.A[stage]));
    }
    double change = next - y;
    double first = h * k[0];
    terms[0] = change;
    terms[1] = first - change;
    terms[2] = 2.0 * change - h * (k[LAST] + k[0]);
    for (int j = 0; j < DormandPrinceTableau.D.length; j++) {
      terms[3 + j] = h * sum(DormandPrinceTableau.D[j]);
    }
  }

  /** The solution at a share of the step. */
  private double dense(double x) {
    double sum = 0.0;
    for (int j = terms.length - 1; j >= 0; j--) {
      sum = (sum + terms[j]) * (j % 2 == 0 ? x : 1.0 - x);
    }
    return y + sum;
  }

  /** Halves until the doubles run out; the later side, where the function has crossed. */
  private double crossing(DoubleUnaryOperator stop, double h, double to, double before) {
    double sign = Math.signum(before);
    double a = time;
    double b = to;
    for (int i = 0; i < 100; i++) {
      double middle = 0.5 * (a + b);
      if (middle <= a || middle >= b) {
        break;
      }
      if (Math.signum(stop.applyAsDouble(dense((middle - time) / h))) == sign) {
        a = middle;
      } else {
        b = middle;
      }
    }
    return b;
  }

  private void sample(double h, double end, boolean whole) {
    int parts = 2 * PIECES;
    for (int i = 1; i <= parts; i++) {
      boolean atEnd = i == parts;
      double t = atEnd ? end : time + (end - time) * i / parts;
      add(t, atEnd && whole ? next : dense((t - time) / h));
    }
  }

  private void add(double at, double value) {
    if (count == times.length) {
      times = Arrays.copyOf(times, 2 * count);
      values = Arrays.copyOf(values, 2 * count);
    }
    times[count] = at;
    values[count++] = value;
  }

  private Samples samples(int crossed) {
    return new Samples(Arrays.copyOf(times, count), Arrays.copyOf(values, count), crossed);
  }
}
