package sliprung.protection;

import java.util.Optional;
import sliprung.curve.TimeCurrentEdge;

/**
 * A fuse-link at its fast edge: {@code dD/dt = 1/T(I)}, kept for good, and beside it the part of D
 * that does not rest on the mere bound below the first gate.
 */
final class FuseMeter implements Meter {
  private final AccumulatingMeter all;
  private final AccumulatingMeter proven;
  private final double firstGateAmps;

  /**
   * A link.
   *
   * @param edge pre-arcing time
   * @param firstGateAmps least current at which a gate, not the bound left of it, pins the time
   */
  FuseMeter(TimeCurrentEdge edge, double firstGateAmps) {
    this.firstGateAmps = firstGateAmps;
    this.all = new AccumulatingMeter(i -> 1.0 / edge.seconds(i), 0.0, edge.breaks());
    this.proven =
        new AccumulatingMeter(
            i -> i > firstGateAmps ? 1.0 / edge.seconds(i) : 0.0, 0.0, edge.breaks());
  }

  @Override
  public double advance(Piece piece) {
    if (piece.greatest() > firstGateAmps) {
      proven.advance(piece);
    }
    return all.advance(piece);
  }

  @Override
  public double level() {
    return all.level();
  }

  @Override
  public double peak() {
    return all.peak();
  }

  @Override
  public Optional<String> bound() {
    return all.level() >= 1.0 && proven.level() < 1.0
        ? Optional.of(
            "below its first gate the standard pins no curve: the link may melt, it is not proven"
                + " that it does")
        : Optional.empty();
  }
}
