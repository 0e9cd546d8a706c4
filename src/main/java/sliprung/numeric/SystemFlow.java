package sliprung.numeric;

/**
 * Integration of an autonomous system {@code dy/dt = f(y)} until a time or until a function of y
 * crosses zero: Dormand and Prince's method of order 8 with dense output and step control by two
 * error estimates (DOP853, see {@link DormandPrinceTableau}). Written out here because a start has
 * thousands of small steps.
 */
public final class SystemFlow {
  private static final double SAFETY = 0.9;
  private static final double GROWS_MOST = 6.0;
  private static final double SHRINKS_MOST = 0.333;
  private static final double LEAST_STEP = 1e-13;
  private static final double ORDER = 8.0;

  private final Rates rates;
  private final double[] tolerances;
  private final int n;
  private final double[][] k;
  private final double[] y;
  private final double[] next;
  private final double[] work;
  private double time;

  private SystemFlow(Rates rates, double[] tolerances, double fromTime, double[] fromState) {
    this.rates = rates;
    this.tolerances = tolerances;
    this.n = tolerances.length;
    this.k = new double[DormandPrinceTableau.ALL][n];
    this.y = fromState.clone();
    this.next = new double[n];
    this.work = new double[n];
    this.time = fromTime;
  }

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
    /** Writes y at a time of the step. */
    void at(double time, double[] into);

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
   * @param stops the first to change its sign ends the integration; one that begins at zero counts
   *     from the sign it takes
   */
  public static End run(
      Rates rates,
      double[] tolerances,
      double fromTime,
      double[] fromState,
      double toTime,
      Steps steps,
      Stop... stops) {
    return new SystemFlow(rates, tolerances, fromTime, fromState).run(toTime, steps, stops);
  }

  private End run(double toTime, Steps steps, Stop[] stops) {
    rates.at(y, k[0]);
    double[] before = new double[stops.length];
    for (int i = 0; i < stops.length; i++) {
      before[i] = stops[i].at(y);
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
      double from = time;
      double to = last ? toTime : time + h;
      DenseStep dense = dense(from, h);
      Crossing crossing = firstCrossing(stops, before, dense, from, to);
      if (crossing != null) {
        steps.step(from, crossing.time(), dense);
        return new End(crossing.time(), dense.at(crossing.time()), crossing.index());
      }
      steps.step(from, to, dense);
      time = to;
      System.arraycopy(next, 0, y, 0, n);
      System.arraycopy(k[DormandPrinceTableau.STAGES], 0, k[0], 0, n);
      double growth = 1.0 / Math.max(1.0 / GROWS_MOST, Math.min(1.0 / SHRINKS_MOST, change));
      step = h * (rejected ? Math.min(1.0, growth) : growth);
      rejected = false;
    }
    return new End(time, y.clone(), -1);
  }

  /** Hairer, Nørsett, Wanner, section II.4: by the sizes of y, of f and of its change. */
  private double firstStep() {
    double d0 = norm(y);
    double d1 = norm(k[0]);
    double h0 = d0 < 1e-5 || d1 < 1e-5 ? 1e-6 : 0.01 * d0 / d1;
    for (int i = 0; i < n; i++) {
      work[i] = y[i] + h0 * k[0][i];
    }
    rates.at(work, k[1]);
    for (int i = 0; i < n; i++) {
      work[i] = (k[1][i] - k[0][i]) / h0;
    }
    double most = Math.max(d1, norm(work));
    double h1 = most <= 1e-15 ? Math.max(1e-6, h0 * 1e-3) : Math.pow(0.01 / most, 1.0 / ORDER);
    return Math.max(LEAST_STEP, Math.min(100.0 * h0, h1));
  }

  private double norm(double[] vector) {
    double sum = 0.0;
    for (int i = 0; i < n; i++) {
      double scaled = vector[i] / tolerances[i];
      sum += scaled * scaled;
    }
    return Math.sqrt(sum / n);
  }

  /** Takes a step into {@code next}; its error over the tolerance. */
  private double attempt(double h) {
    for (int stage = 1; stage < DormandPrinceTableau.STAGES; stage++) {
      take(DormandPrinceTableau.A[stage], h, work);
      rates.at(work, k[stage]);
    }
    take(DormandPrinceTableau.A[DormandPrinceTableau.STAGES], h, next);
    rates.at(next, k[DormandPrinceTableau.STAGES]);
    double fifth = 0.0;
    double third = 0.0;
    for (int i = 0; i < n; i++) {
      double e5 = DormandPrinceTableau.E5.of(k, i) / tolerances[i];
      double e3 = DormandPrinceTableau.E3.of(k, i) / tolerances[i];
      fifth += e5 * e5;
      third += e3 * e3;
    }
    double both = fifth + 0.01 * third;
    return both <= 0.0 ? 0.0 : h * fifth / Math.sqrt(both * n);
  }

  private void take(DormandPrinceTableau.Row row, double h, double[] into) {
    System.arraycopy(y, 0, into, 0, n);
    row.addTo(into, h, k);
  }

  private DenseStep dense(double from, double h) {
    for (int stage = DormandPrinceTableau.STAGES + 1; stage < DormandPrinceTableau.ALL; stage++) {
      take(DormandPrinceTableau.A[stage], h, work);
      rates.at(work, k[stage]);
    }
    double[][] terms = new double[7][n];
    for (int i = 0; i < n; i++) {
      double change = next[i] - y[i];
      double first = h * k[0][i];
      terms[0][i] = change;
      terms[1][i] = first - change;
      terms[2][i] = 2.0 * change - h * (k[DormandPrinceTableau.STAGES][i] + k[0][i]);
    }
    for (int j = 0; j < DormandPrinceTableau.D.length; j++) {
      DormandPrinceTableau.D[j].addTo(terms[3 + j], h, k);
    }
    return new DenseStep(from, h, y.clone(), terms);
  }

  private record DenseStep(double from, double length, double[] state, double[][] terms)
      implements Dense {
    @Override
    public double[] at(double time) {
      double[] result = new double[state.length];
      at(time, result);
      return result;
    }

    @Override
    public void at(double time, double[] into) {
      double x = (time - from) / length;
      double rest = 1.0 - x;
      for (int i = 0; i < into.length; i++) {
        double sum = terms[6][i] * x;
        sum = (sum + terms[5][i]) * rest;
        sum = (sum + terms[4][i]) * x;
        sum = (sum + terms[3][i]) * rest;
        sum = (sum + terms[2][i]) * x;
        sum = (sum + terms[1][i]) * rest;
        into[i] = state[i] + (sum + terms[0][i]) * x;
      }
    }
  }

  private record Crossing(int index, double time) {}

  /**
   * The first function to change its sign in a step; the values at its end replace those before.
   */
  private Crossing firstCrossing(
      Stop[] stops, double[] before, Dense dense, double from, double to) {
    Crossing first = null;
    for (int i = 0; i < stops.length; i++) {
      double after = stops[i].at(next);
      if (before[i] != 0.0 && after != 0.0 && Math.signum(before[i]) != Math.signum(after)
          || before[i] != 0.0 && after == 0.0) {
        double at = crossing(stops[i], dense, from, to, before[i]);
        if (first == null || at < first.time()) {
          first = new Crossing(i, at);
        }
      }
      before[i] = after;
    }
    return first;
  }

  /** Halves until the doubles run out; the later side, where the function has crossed. */
  private static double crossing(Stop stop, Dense dense, double from, double to, double before) {
    double sign = Math.signum(before);
    double a = from;
    double b = to;
    for (int i = 0; i < 100; i++) {
      double middle = 0.5 * (a + b);
      if (middle <= a || middle >= b) {
        break;
      }
      if (Math.signum(stop.at(dense.at(middle))) == sign) {
        a = middle;
      } else {
        b = middle;
      }
    }
    return b;
  }
}
