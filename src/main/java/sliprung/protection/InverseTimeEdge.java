package sliprung.protection;

import java.util.OptionalDouble;
import sliprung.curve.InverseLaw;
import sliprung.starter.Device;

/**
 * One edge of an inverse-time relay. Pick-up and time move by the declared accuracy, the pick-up by
 * {@value #TRANSFORMER_ERROR} of the current transformer besides, whether or not the file names it:
 * such a relay never measures without one.
 */
final class InverseTimeEdge {
  static final double TRANSFORMER_ERROR = 0.03;

  private final InverseLaw law;
  private final double pickUpAmps;
  private final double timeMultiplier;
  private final double timeFactor;
  private final Device.Reset reset;

  InverseTimeEdge(Device.InverseTime device, Edge edge) {
    double sign =
        switch (edge) {
          case FAST -> -1.0;
          case MIDDLE -> 0.0;
          case SLOW -> 1.0;
        };
    this.law = device.law();
    this.pickUpAmps =
        device.pickUpAmps()
            * (1.0 + sign * device.accuracy().pickUp())
            * (1.0 + sign * TRANSFORMER_ERROR);
    this.timeMultiplier = device.timeMultiplier();
    this.timeFactor = 1.0 + sign * device.accuracy().time();
    this.reset = resetAt(device, edge);
  }

  /** Unknown reset: the slow edge forgets at once, the others hold; likewise a law without one. */
  private static Device.Reset resetAt(Device.InverseTime device, Edge edge) {
    boolean unknown =
        device.reset() == Device.Reset.BY_EDGE
            || device.reset() == Device.Reset.STANDARD && device.law().resetSeconds().isEmpty();
    if (!unknown) {
      return device.reset();
    }
    return edge == Edge.SLOW ? Device.Reset.INSTANT : Device.Reset.HELD;
  }

  /** Currents at which the rate bends: pick-up and the end of the curve. */
  double[] breaks() {
    return new double[] {pickUpAmps, InverseLaw.LAST_MULTIPLE * pickUpAmps};
  }

  /** Share of its way in 1/s; negative while it resets, minus infinity where it forgets at once. */
  double rate(double amps) {
    double multiple = amps / pickUpAmps;
    if (multiple > 1.0) {
      return 1.0 / (timeFactor * law.seconds(multiple, timeMultiplier));
    }
    return switch (reset) {
      case INSTANT -> multiple < 1.0 ? Double.NEGATIVE_INFINITY : 0.0;
      case STANDARD -> {
        OptionalDouble full = law.fullResetSeconds(multiple, timeMultiplier);
        yield full.isPresent() ? -1.0 / (full.getAsDouble() * timeFactor) : 0.0;
      }
      default -> 0.0;
    };
  }
}
