package sliprung.sampling;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;
import org.apache.commons.math3.stat.descriptive.rank.Percentile;
import sliprung.machine.Machine;
import sliprung.starter.Starter;

/**
 * Samples permitted starts over a starter's spreads: how often a device would trip, and the
 * distribution of run-up time, closing currents and uses.
 *
 * <p>A share says nothing about the corner: what may happen once a year still happens. No verdict
 * rests on it.
 */
public final class StartSampling {
  /** Starts that share a generator: the unit of work of a core. */
  private static final int BLOCK = 125;

  private StartSampling() {}

  /**
   * Samples.
   *
   * @param machines the circuits that the plate allows; taken in turn
   * @param starts 1 or more
   * @param seed the same seed gives the same starts, on any number of cores
   */
  public static Sampled of(Starter starter, List<Machine> machines, int starts, long seed) {
    List<OneStart> each = machines.stream().map(m -> new OneStart(starter, m)).toList();
    List<OneStart.Name> names = each.get(0).names();
    double[][] figures =
        IntStream.range(0, (starts + BLOCK - 1) / BLOCK)
            .parallel()
            .mapToObj(block -> block(starter, each, starts, seed, block))
            .flatMap(Arrays::stream)
            .toArray(double[][]::new);
    int notRunUp = (int) Arrays.stream(figures).filter(f -> Double.isNaN(f[0])).count();
    List<Sampled.Trips> trips = new ArrayList<>();
    List<Sampled.Quantity> quantities = new ArrayList<>();
    for (int i = 0; i < names.size(); i++) {
      OneStart.Name name = names.get(i);
      int figure = i;
      if (!name.device().isEmpty()) {
        trips.add(trips(name, Arrays.stream(figures).mapToDouble(f -> f[figure]).toArray()));
      }
      double[] known =
          Arrays.stream(figures)
              .filter(f -> !Double.isNaN(f[0]) && !Double.isNaN(f[figure]))
              .mapToDouble(f -> f[figure])
              .toArray();
      if (known.length > 0) {
        quantities.add(quantity(name, known));
      }
    }
    return new Sampled(starts, seed, notRunUp, trips, quantities);
  }

  private static double[][] block(
      Starter starter, List<OneStart> each, int starts, long seed, int block) {
    RandomGenerator random = new Well19937c(new int[] {(int) (seed >>> 32), (int) seed, block});
    Draw draw = new Draw(starter, random);
    int from = block * BLOCK;
    double[][] figures = new double[Math.min(BLOCK, starts - from)][];
    for (int n = 0; n < figures.length; n++) {
      figures[n] = each.get((from + n) % each.size()).at(draw.next());
    }
    return figures;
  }

  private static Sampled.Trips trips(OneStart.Name name, double[] uses) {
    int count = 0;
    int judged = 0;
    for (double use : uses) {
      judged += Double.isNaN(use) ? 0 : 1;
      count += use >= 1.0 ? 1 : 0;
    }
    return new Sampled.Trips(
        name.device(),
        OneStart.words(name.relay()),
        name.series(),
        count,
        uses.length,
        BinomialBounds.of(count, uses.length),
        judged < uses.length);
  }

  private static Sampled.Quantity quantity(OneStart.Name name, double[] known) {
    Percentile percentile = new Percentile();
    percentile.setData(known);
    return new Sampled.Quantity(
        name.words(),
        name.unit(),
        Sampled.PERCENTS.stream().map(p -> percentile.evaluate(p)).toList());
  }
}
