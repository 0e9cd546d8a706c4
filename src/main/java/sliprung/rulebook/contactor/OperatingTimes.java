package sliprung.rulebook.contactor;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Edge;
import sliprung.starter.Device;

/** How long devices take at a constant current. */
public interface OperatingTimes {

  /**
   * Operating time from cold.
   *
   * @param amps RMS, where the device measures
   * @return seconds; infinite: never; empty: it cannot be told at that current
   */
  OptionalDouble seconds(Device device, Edge edge, double amps);

  /**
   * Operating time after a steady running current.
   *
   * @param runningAmps RMS, where the device measures
   * @return as {@link #seconds}
   */
  OptionalDouble secondsFromHot(Device device, Edge edge, double amps, double runningAmps);

  /** Empty, or why that edge cannot be computed at any current. */
  Optional<String> unknown(Device device, Edge edge);
}
