package sliprung.sampling;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.random.RandomGenerator;
import sliprung.runup.Conditions;
import sliprung.starter.Distribution;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Starter;
import sliprung.starter.Varying;
import sliprung.tolerance.Corners;

/** Draws the circumstances of one start from a starter's spreads. */
final class Draw {
  /** The ends of a spread lie two deviations from its middle. */
  private static final NormalDistribution NORMAL = new NormalDistribution(0.0, 0.5);

  private static final double BELOW = NORMAL.cumulativeProbability(-1.0);

  private final Starter starter;
  private final RandomGenerator random;

  Draw(Starter starter, RandomGenerator random) {
    this.starter = starter;
    this.random = random;
  }

  /** The next start's; always the same number of draws, so that one spread leaves others alone. */
  Conditions next() {
    double supplyPu =
        1.0 + within(Varying.VOLTAGE, starter.supply().bandLow(), starter.supply().bandHigh());
    double load =
        1.0 + within(Varying.LOAD, starter.load().spreadLow(), starter.load().spreadHigh());
    double tolerance = starter.resistors().tolerance();
    double bank =
        (1.0 + within(Varying.BANK, -tolerance, tolerance))
            * (1.0 + within(Varying.HEAT, 0.0, starter.resistors().hotRise()));
    double open = starter.evidence().getOrDefault("load.inertia", EvidenceGrade.DRAWING).spread();
    double driven = starter.load().inertia() * (1.0 + within(Varying.INERTIA, -open, open));
    double inertia =
        (starter.motor().inertia() + driven)
            / (starter.motor().inertia() + starter.load().inertia());
    List<Conditions.StepFactors> steps = new ArrayList<>();
    for (int k = 0; k < starter.steps().size(); k++) {
      steps.add(
          new Conditions.StepFactors(
              1.0 + within(Varying.TIMERS, -starter.timerSpread(), starter.timerSpread()),
              1.0 + within(Varying.LEVELS, -starter.levelSpread(), starter.levelSpread())));
    }
    return new Conditions(
        Corners.source(starter.supply(), supplyPu), load, bank, 1.0, 1.0, inertia, steps);
  }

  private double within(Varying varying, double low, double high) {
    Distribution distribution = starter.distributions().getOrDefault(varying, Distribution.UNIFORM);
    double position = position(distribution, random);
    return low + 0.5 * (1.0 + position) * (high - low);
  }

  /** From −1 to 1. */
  static double position(Distribution distribution, RandomGenerator random) {
    double one = random.nextDouble();
    return switch (distribution) {
      case UNIFORM -> 2.0 * one - 1.0;
      case TRIANGULAR ->
          one < 0.5 ? Math.sqrt(2.0 * one) - 1.0 : 1.0 - Math.sqrt(2.0 * (1.0 - one));
      case NORMAL -> NORMAL.inverseCumulativeProbability(BELOW + one * (1.0 - 2.0 * BELOW));
    };
  }
}
