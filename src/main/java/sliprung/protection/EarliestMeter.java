package sliprung.protection;

import java.util.List;

/** A set of relays that carry the same name: the first to operate, the highest level of them. */
final class EarliestMeter implements Meter {
  private final List<Meter> relays;

  EarliestMeter(List<Meter> relays) {
    this.relays = List.copyOf(relays);
  }

  @Override
  public double advance(Piece piece) {
    double reached = Double.POSITIVE_INFINITY;
    for (Meter relay : relays) {
      reached = Math.min(reached, relay.advance(piece));
    }
    return reached;
  }

  @Override
  public double level() {
    double level = 0.0;
    for (Meter relay : relays) {
      level = Math.max(level, relay.level());
    }
    return level;
  }

  @Override
  public double peak() {
    double peak = 0.0;
    for (Meter relay : relays) {
      peak = Math.max(peak, relay.peak());
    }
    return peak;
  }
}
