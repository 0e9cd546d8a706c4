package sliprung.protection;

/** An element without delay and without memory: its level is the current over the pick-up. */
final class ThresholdMeter implements Meter {
  private final double pickUpAmps;
  private double peak;

  /** An element; the pick-up in A, above 0. */
  ThresholdMeter(double pickUpAmps) {
    this.pickUpAmps = pickUpAmps;
  }

  @Override
  public double advance(Piece piece) {
    double passed = 0.0;
    double reached = Double.POSITIVE_INFINITY;
    peak = 0.0;
    for (Piece part : piece.cutAt(pickUpAmps)) {
      peak = Math.max(peak, part.greatest() / pickUpAmps);
      if (part.middle() >= pickUpAmps && Double.isInfinite(reached)) {
        reached = passed;
      }
      passed += part.seconds();
    }
    // touched in one sample only: it operates all the same
    return Double.isInfinite(reached) && peak >= 1.0 ? 0.5 * piece.seconds() : reached;
  }

  @Override
  public double level() {
    return 0.0;
  }

  @Override
  public double peak() {
    return peak;
  }
}
