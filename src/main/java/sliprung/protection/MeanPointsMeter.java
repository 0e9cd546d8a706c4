package sliprung.protection;

import java.util.Optional;
import sliprung.curve.PointEdge;

/** A curve of points in its middle, for printing: the geometric mean of both edges' times. */
final class MeanPointsMeter implements Meter {
  private final AccumulatingMeter mean;
  private final double quietAmps;
  private final double lastAmps;
  private final double firstAmps;
  private boolean outside;

  MeanPointsMeter(PointEdge fast, PointEdge slow, double ratingAmps) {
    this.firstAmps = Math.max(fast.firstAmps(), slow.firstAmps());
    this.lastAmps = Math.min(fast.lastAmps(), slow.lastAmps());
    this.quietAmps = fast.beginsVertically() ? fast.firstAmps() : ratingAmps;
    this.mean =
        new AccumulatingMeter(
            i ->
                i < firstAmps || i > lastAmps
                    ? 0.0
                    : 1.0 / Math.sqrt(fast.seconds(i) * slow.seconds(i)),
            0.0,
            firstAmps,
            lastAmps);
  }

  @Override
  public double advance(Piece piece) {
    double reached = mean.advance(piece);
    boolean between = piece.greatest() > quietAmps && piece.greatest() < firstAmps;
    if (mean.level() < 1.0 && (between || piece.greatest() > lastAmps)) {
      outside = true;
    }
    return reached;
  }

  @Override
  public double level() {
    return mean.level();
  }

  @Override
  public double peak() {
    return mean.peak();
  }

  @Override
  public Optional<String> doubt() {
    return outside && mean.level() < 1.0
        ? Optional.of("outside the curve's points")
        : Optional.empty();
  }
}
