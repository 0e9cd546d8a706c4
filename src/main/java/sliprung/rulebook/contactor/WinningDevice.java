package sliprung.rulebook.contactor;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import sliprung.protection.Edge;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * A device that opens a contactor, against the short-circuit devices in series: the greatest
 * current at which it may still be first. The contactor's own delay is not counted.
 */
final class WinningDevice {
  /** No three-phase fault current of a low-voltage plant is greater, A. */
  private static final double BEYOND_EVERY_FAULT = 1e6;

  private static final double LEAST_SHARE_OF_RATED = 0.05;

  private final Starter starter;
  private final OperatingTimes times;
  private final ShortCircuitDevices shortCircuit;

  WinningDevice(Starter starter, OperatingTimes times) {
    this.starter = starter;
    this.times = times;
    this.shortCircuit = ShortCircuitDevices.of(starter);
  }

  /** The short-circuit devices in series. */
  ShortCircuitDevices shortCircuit() {
    return shortCircuit;
  }

  /**
   * Bounds on a current.
   *
   * @param surelyUpTo the device is first at this current; 0: nowhere for sure
   * @param neverBeyond it is never first above this current; infinite: nothing bounds it
   */
  record Bounds(double surelyUpTo, double neverBeyond) {}

  /** The greatest current at which the device may be first: fast edge against slow, from cold. */
  Bounds fromCold(Device device) {
    double sure = greatest(i -> seconds(device, i, Double.POSITIVE_INFINITY), 0.0).orElse(0.0);
    double possible = greatest(i -> seconds(device, i, 0.0), Double.POSITIVE_INFINITY).orElse(0.0);
    boolean unbounded = possible >= top() && starter.supply().faultMaxAmps().isEmpty();
    boolean surelyUnbounded = sure >= top() && starter.supply().faultMaxAmps().isEmpty();
    return new Bounds(
        surelyUnbounded ? Double.POSITIVE_INFINITY : sure,
        unbounded ? Double.POSITIVE_INFINITY : possible);
  }

  /**
   * The same after a running current, for printing.
   *
   * @return empty where the device is not first anywhere, or up to the greatest fault current
   */
  OptionalDouble fromHot(Device device, double runningAmps) {
    OptionalDouble found =
        greatest(
            i ->
                blocked(device, i)
                    ? Double.POSITIVE_INFINITY
                    : times
                        .secondsFromHot(device, Edge.FAST, i, runningAmps)
                        .orElse(Double.POSITIVE_INFINITY),
            0.0);
    return found.isPresent() && found.getAsDouble() >= top() ? OptionalDouble.empty() : found;
  }

  /** The greatest fault current, or more than any where it is not given. */
  private double top() {
    return starter.supply().faultMaxAmps().orElse(BEYOND_EVERY_FAULT);
  }

  private OptionalDouble greatest(DoubleUnaryOperator device, double unknownShortCircuit) {
    double from = Math.min(LEAST_SHARE_OF_RATED * starter.motor().current(), 0.5 * top());
    return Crossing.greatestFirst(
        device, i -> shortCircuit.clearedBySeconds(times, i, unknownShortCircuit), from, top());
  }

  private double seconds(Device device, double amps, double unknown) {
    if (blocked(device, amps)) {
      return Double.POSITIVE_INFINITY;
    }
    OptionalDouble timer = timerSeconds(device);
    if (timer.isPresent()) {
      return timer.getAsDouble() * (1.0 - starter.timerSpread());
    }
    return times.seconds(device, Edge.FAST, amps).orElse(unknown);
  }

  private static OptionalDouble timerSeconds(Device device) {
    if (device instanceof Device.SequenceTimer timer) {
      return OptionalDouble.of(timer.seconds());
    }
    if (device instanceof Device.Standstill standstill) {
      return OptionalDouble.of(standstill.seconds());
    }
    if (device instanceof Device.StepProof proof) {
      return OptionalDouble.of(proof.seconds());
    }
    // a short circuit takes the voltage away: the delay alone stands between
    return device instanceof Device.Undervoltage undervoltage
        ? OptionalDouble.of(undervoltage.seconds())
        : OptionalDouble.empty();
  }

  /** Whether the device is surely blocked: above its level at the late side of its accuracy. */
  private static boolean blocked(Device device, double amps) {
    return blockedAbove(device).map(level -> amps > level).orElse(false);
  }

  /** The level above which a device surely does not trip, A; empty where it is not blocked. */
  static Optional<Double> blockedAbove(Device device) {
    OptionalDouble level = OptionalDouble.empty();
    double accuracy = 0.0;
    if (device instanceof Device.InverseTime d) {
      level = d.blockedAboveAmps();
      accuracy = d.accuracy().pickUp();
    } else if (device instanceof Device.DefiniteTime d) {
      level = d.blockedAboveAmps();
      accuracy = d.accuracy().pickUp();
    } else if (device instanceof Device.Instantaneous d) {
      level = d.blockedAboveAmps();
      accuracy = d.accuracy().pickUp();
    }
    return level.isPresent()
        ? Optional.of(level.getAsDouble() * (1.0 + accuracy))
        : Optional.empty();
  }
}
