package sliprung.tolerance;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.Starter;

/**
 * Points of the spreads at which a permitted start is worse than at every corner: where some timers
 * are early and some late, or where the worst lies inside the spreads, since neither a closing
 * current nor the heat of a start need rise or fall with a voltage or a resistance throughout.
 *
 * <p>What is worst is told by {@link Severity}. Patterns of early and late are tried out, all of
 * them up to {@value #ALL_PATTERNS_UP_TO} steps, beyond that one side up to each step and the other
 * after it, and each step alone. From the worst point of each measure, voltage, load and bank are
 * then searched in turn, through {@value #PROBES} probes and by the golden section about the best
 * of them.
 */
public final class WorstPoints {
  /** Worse by less is the same: no wanted margin is given so closely. */
  static final double WORSE_BY = 2e-3;

  private static final int ALL_PATTERNS_UP_TO = 5;
  private static final int PROBES = 5;
  private static final int GOLDEN_STEPS = 12;
  private static final double GOLDEN = 0.5 * (Math.sqrt(5.0) - 1.0);

  private final Starter starter;
  private final StartSimulator simulator;

  private WorstPoints(Starter starter, StartSimulator simulator) {
    this.starter = starter;
    this.simulator = simulator;
  }

  /** A point and the severity of a permitted start there. */
  record Point(Corner corner, double[] severity) {}

  /**
   * The points that are worse than every corner by {@value #WORSE_BY} in something.
   *
   * @param simulator of the same starter
   */
  public static Map<Corner, Conditions> of(Starter starter, StartSimulator simulator) {
    return new WorstPoints(starter, simulator).search();
  }

  private Map<Corner, Conditions> search() {
    List<Point> corners = severities(List.copyOf(Corners.of(starter).keySet()));
    List<Point> worst = worstOfEach(corners);
    List<Point> found = worstOfEach(join(worst, severities(patterns())));
    List<Point> best =
        IntStream.range(0, found.size())
            .parallel()
            .mapToObj(measure -> insideFrom(found.get(measure), measure))
            .toList();
    Map<Corner, Conditions> points = new LinkedHashMap<>();
    for (int measure = 0; measure < best.size(); measure++) {
      double atCorners = worst.get(measure).severity()[measure];
      Corner point = best.get(measure).corner();
      if (best.get(measure).severity()[measure] > (1.0 + WORSE_BY) * atCorners) {
        points.putIfAbsent(point, Corners.conditions(starter, point));
      }
    }
    return points;
  }

  private static List<Point> join(List<Point> one, List<Point> other) {
    List<Point> all = new ArrayList<>(one);
    all.addAll(other);
    return all;
  }

  private List<Point> severities(List<Corner> corners) {
    return corners.parallelStream().map(this::at).toList();
  }

  private Point at(Corner corner) {
    StartHistory start = simulator.run(Scenario.PERMITTED, Corners.conditions(starter, corner));
    return new Point(corner, Severity.of(starter, start));
  }

  /** The worst point of each measure. */
  private static List<Point> worstOfEach(List<Point> points) {
    List<Point> worst = new ArrayList<>();
    for (int measure = 0; measure < points.get(0).severity().length; measure++) {
      Point greatest = points.get(0);
      for (Point point : points) {
        if (point.severity()[measure] > greatest.severity()[measure]) {
          greatest = point;
        }
      }
      worst.add(greatest);
    }
    return worst;
  }

  /** Every corner of voltage, load and bank with every pattern that is not all one side. */
  private List<Corner> patterns() {
    List<Corner> corners = new ArrayList<>();
    List<List<Corner.Timers>> patterns = patterns(starter.steps().size());
    for (Corner corner : Corners.of(starter).keySet()) {
      if (corner.timers() == Corner.Timers.LATE) {
        patterns.forEach(pattern -> corners.add(corner.withSteps(pattern)));
      }
    }
    return corners;
  }

  /** Sides of some steps: early and late, mixed. */
  static List<List<Corner.Timers>> patterns(int steps) {
    List<List<Corner.Timers>> patterns = new ArrayList<>();
    if (steps <= ALL_PATTERNS_UP_TO) {
      for (int bits = 1; bits < (1 << steps) - 1; bits++) {
        int pattern = bits;
        patterns.add(sides(steps, k -> (pattern >> k & 1) == 1));
      }
      return patterns;
    }
    for (int cut = 1; cut < steps; cut++) {
      int upTo = cut;
      patterns.add(sides(steps, k -> k < upTo));
      patterns.add(sides(steps, k -> k >= upTo));
    }
    for (int one = 1; one < steps - 1; one++) {
      int alone = one;
      patterns.add(sides(steps, k -> k == alone));
      patterns.add(sides(steps, k -> k != alone));
    }
    return patterns;
  }

  private static List<Corner.Timers> sides(int steps, java.util.function.IntPredicate late) {
    return IntStream.range(0, steps)
        .mapToObj(k -> late.test(k) ? Corner.Timers.LATE : Corner.Timers.EARLY)
        .toList();
  }

  /** Voltage, load and bank in turn, from a point, for one measure. */
  private Point insideFrom(Point from, int measure) {
    double[] volts = range(1.0 + starter.supply().bandLow(), 1.0 + starter.supply().bandHigh());
    double[] load =
        range(
            Corners.load(starter, Corner.LoadSide.LIGHT),
            Corners.load(starter, Corner.LoadSide.HEAVY));
    double[] bank =
        range(Corners.bank(starter, Corner.Bank.LOW), Corners.bank(starter, Corner.Bank.HOT));
    Point best = from;
    best = along(best, measure, volts, v -> withVolts(v));
    best = along(best, measure, load, f -> c -> with(c, Optional.of(f), Optional.empty()));
    best = along(best, measure, bank, f -> c -> with(c, Optional.empty(), Optional.of(f)));
    return along(best, measure, volts, v -> withVolts(v));
  }

  private static double[] range(double low, double high) {
    return new double[] {low, high};
  }

  private interface Change {
    Corner of(Corner corner);
  }

  private static Change withVolts(double supplyPu) {
    return c -> new Corner(supplyPu, c.load(), c.bank(), c.timers(), c.steps(), c.inside());
  }

  private Corner with(Corner c, Optional<Double> load, Optional<Double> bank) {
    Conditions now = Corners.conditions(starter, c);
    Corner.Inside inside =
        new Corner.Inside(load.orElse(now.loadFactor()), bank.orElse(now.bankFactor()));
    return new Corner(c.supplyPu(), c.load(), c.bank(), c.timers(), c.steps(), Optional.of(inside));
  }

  private Point along(Point from, int measure, double[] range, DoubleFunction<Change> change) {
    double low = range[0];
    double high = range[1];
    if (!(high > low)) {
      return from;
    }
    double step = (high - low) / (PROBES + 1);
    Point best = from;
    double at = Double.NaN;
    for (int i = 1; i <= PROBES; i++) {
      double x = low + i * step;
      Point probe = at(change.apply(x).of(from.corner()));
      if (probe.severity()[measure] > (1.0 + WORSE_BY) * best.severity()[measure]) {
        best = probe;
        at = x;
      }
    }
    return Double.isNaN(at) ? from : golden(best, from, measure, at - step, at + step, change);
  }

  private Point golden(
      Point best0,
      Point from,
      int measure,
      double from0,
      double to0,
      DoubleFunction<Change> change) {
    double a = from0;
    double b = to0;
    Point best = best0;
    for (int i = 0; i < GOLDEN_STEPS; i++) {
      double x1 = b - GOLDEN * (b - a);
      double x2 = a + GOLDEN * (b - a);
      Point one = at(change.apply(x1).of(from.corner()));
      Point two = at(change.apply(x2).of(from.corner()));
      boolean left = one.severity()[measure] > two.severity()[measure];
      Point better = left ? one : two;
      best = better.severity()[measure] > best.severity()[measure] ? better : best;
      a = left ? a : x1;
      b = left ? x2 : b;
    }
    return best;
  }
}
