package sliprung.protection;

import java.util.Optional;
import sliprung.curve.PointEdge;

/**
 * A device whose own curve is given as points. What happens outside the points is not made up: the
 * meter keeps how much is certain and how much is possible, and doubts the run where that decides.
 */
final class PointsMeter implements Meter {
  private final PointEdge edge;
  private final boolean earliest;
  private final AccumulatingMeter certain;
  private final AccumulatingMeter possible;
  private final double quietAmps;
  private boolean beyondLast;

  /**
   * A device.
   *
   * @param edge its curve
   * @param ratingAmps what it carries for good
   * @param earliest true: the fast edge, of which the possible counts; false: the slow edge, of
   *     which only the certain counts
   */
  PointsMeter(PointEdge edge, double ratingAmps, boolean earliest) {
    this.edge = edge;
    this.earliest = earliest;
    this.quietAmps =
        edge.beginsVertically() ? edge.firstAmps() : Math.min(ratingAmps, edge.firstAmps());
    double[] breaks = new double[edge.breaks().length + 1];
    System.arraycopy(edge.breaks(), 0, breaks, 1, breaks.length - 1);
    breaks[0] = quietAmps;
    this.certain = new AccumulatingMeter(this::certainRate, 0.0, breaks);
    this.possible = new AccumulatingMeter(this::possibleRate, 0.0, breaks);
  }

  private double certainRate(double amps) {
    return amps < edge.firstAmps() || amps > edge.lastAmps() ? 0.0 : 1.0 / edge.seconds(amps);
  }

  private double possibleRate(double amps) {
    if (amps >= edge.firstAmps()) {
      return certainRate(amps);
    }
    // a smaller current takes no less time than the first point's
    return amps <= quietAmps ? 0.0 : 1.0 / edge.firstSeconds();
  }

  @Override
  public double advance(Piece piece) {
    boolean settled = certain.level() >= 1.0;
    double surely = certain.advance(piece);
    double perhaps = possible.advance(piece);
    if (piece.greatest() > edge.lastAmps() && !settled && Double.isInfinite(surely)) {
      beyondLast = true;
    }
    return earliest ? perhaps : surely;
  }

  @Override
  public double level() {
    return earliest ? possible.level() : certain.level();
  }

  @Override
  public double peak() {
    return earliest ? possible.peak() : certain.peak();
  }

  @Override
  public Optional<String> doubt() {
    if (beyondLast) {
      return Optional.of("outside the curve's points: current above the last point");
    }
    return possible.level() >= 1.0 && certain.level() < 1.0
        ? Optional.of(
            "outside the curve's points: current between the rating and the first point for longer"
                + " than the first point's time")
        : Optional.empty();
  }
}
