package sliprung.rulebook.contactor;

import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import sliprung.protection.Edge;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * Where a fuse takes over from an overload relay.
 *
 * @param meanAmps crossing of the mean curves (the standard's {@code I_c}); empty: the fuse is
 *     first at every current
 * @param greatestRelayAmps the quickest relay may still be first here, against the slowest fuse;
 *     empty: nowhere
 * @param leastFuseAmps the quickest fuse may melt from here on before the slowest relay has opened
 *     the contactor; empty: nowhere
 * @param endAmps greatest current looked at: the greatest fault current, or more than any
 */
record TakeOver(
    OptionalDouble meanAmps,
    OptionalDouble greatestRelayAmps,
    OptionalDouble leastFuseAmps,
    double endAmps) {
  private static final double BEYOND_EVERY_FAULT = 1e6;
  private static final double LEAST_SHARE_OF_RATED = 0.05;

  /** Works it out; every edge of both devices must be known. */
  static TakeOver of(
      Starter starter,
      OperatingTimes times,
      Device.Overload relay,
      Device.Fuse fuse,
      double openingSeconds) {
    double end = starter.supply().faultMaxAmps().orElse(BEYOND_EVERY_FAULT);
    double from = Math.min(LEAST_SHARE_OF_RATED * starter.motor().current(), 0.5 * end);
    return new TakeOver(
        Crossing.greatestFirst(
            law(times, relay, Edge.MIDDLE, 0.0), law(times, fuse, Edge.MIDDLE, 0.0), from, end),
        Crossing.greatestFirst(
            law(times, relay, Edge.FAST, 0.0), law(times, fuse, Edge.SLOW, 0.0), from, end),
        Crossing.leastFirst(
            law(times, fuse, Edge.FAST, 0.0),
            law(times, relay, Edge.SLOW, openingSeconds),
            from,
            end),
        end);
  }

  /** A time that cannot be told counts as never. */
  private static DoubleUnaryOperator law(
      OperatingTimes times, Device device, Edge edge, double openingSeconds) {
    return i -> times.seconds(device, edge, i).orElse(Double.POSITIVE_INFINITY) + openingSeconds;
  }

  /** Whether the mean relay is still first at the end of what was looked at. */
  boolean meansNeverCross() {
    return meanAmps.isPresent() && meanAmps.getAsDouble() >= endAmps;
  }
}
