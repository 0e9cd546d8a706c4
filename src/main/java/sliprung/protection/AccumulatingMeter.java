package sliprung.protection;

/**
 * Accumulating element {@code dD/dt = rate(I)}, never below 0, which operates at D = 1. A rate
 * below 0 forgets, a rate of minus infinity at once. Exact for a constant current over any length.
 */
final class AccumulatingMeter implements Meter {
  private final Piece.OfCurrent rate;
  private final double[] breaks;
  private double level;
  private double peak;

  /**
   * An element.
   *
   * @param rate 1/s of a current
   * @param level to begin with
   * @param breaks currents in A at which the rate jumps or bends
   */
  AccumulatingMeter(Piece.OfCurrent rate, double level, double... breaks) {
    this.rate = rate;
    this.breaks = breaks.clone();
    this.level = level;
    this.peak = level;
  }

  @Override
  public double advance(Piece piece) {
    peak = level;
    if (piece.clearOf(breaks)) {
      return advanceWithin(piece);
    }
    double reached = Double.POSITIVE_INFINITY;
    double passed = 0.0;
    for (Piece part : piece.cutAt(breaks)) {
      reached = Math.min(reached, passed + advanceWithin(part));
      passed += part.seconds();
    }
    return reached;
  }

  private double advanceWithin(Piece part) {
    double before = level;
    level = Math.max(0.0, before + part.integral(rate, 1.0));
    peak = Math.max(peak, level);
    if (before >= 1.0) {
      return 0.0;
    }
    return level >= 1.0
        ? Math.min(part.seconds(), reachedIn(part, 1.0 - before))
        : Double.POSITIVE_INFINITY;
  }

  private double reachedIn(Piece part, double need) {
    if (part.first() == part.middle() && part.middle() == part.last()) {
      return need / rate.at(part.middle());
    }
    double low = 0.0;
    double high = 1.0;
    for (int i = 0; i < 50; i++) {
      double share = 0.5 * (low + high);
      if (part.integral(rate, share) >= need) {
        high = share;
      } else {
        low = share;
      }
    }
    return high * part.seconds();
  }

  @Override
  public double level() {
    return level;
  }

  @Override
  public double peak() {
    return peak;
  }
}
