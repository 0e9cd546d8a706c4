package sliprung.protection;

/**
 * An element that must not trip while the current exceeds a level. At the fast edge it goes on
 * measuring behind the block and acts once the block is gone; at the slow edge it sees no current
 * meanwhile. Its peak counts only what it could have acted on.
 */
final class BlockedMeter implements Meter {
  private final Meter inner;
  private final double blockedAboveAmps;
  private final boolean measuresOn;
  private double peak;

  /**
   * An element behind a block.
   *
   * @param inner element
   * @param blockedAboveAmps no trip above it
   * @param measuresOn goes on measuring while blocked
   */
  BlockedMeter(Meter inner, double blockedAboveAmps, boolean measuresOn) {
    this.inner = inner;
    this.blockedAboveAmps = blockedAboveAmps;
    this.measuresOn = measuresOn;
  }

  @Override
  public double advance(Piece piece) {
    double reached = Double.POSITIVE_INFINITY;
    double passed = 0.0;
    peak = 0.0;
    for (Piece part : piece.cutAt(blockedAboveAmps)) {
      if (part.middle() > blockedAboveAmps) {
        inner.advance(measuresOn ? part : part.scaled(0.0, 1.0));
      } else {
        reached = Math.min(reached, passed + inner.advance(part));
        peak = Math.max(peak, inner.peak());
      }
      passed += part.seconds();
    }
    return reached;
  }

  @Override
  public double level() {
    return inner.level();
  }

  @Override
  public double peak() {
    return peak;
  }
}
