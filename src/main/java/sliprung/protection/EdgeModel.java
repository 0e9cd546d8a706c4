package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;

/** One device at one edge: what it does over starts, and at a constant current from cold. */
interface EdgeModel {

  /** What it does over the last of some starts in a row. */
  EdgeOutcome over(Starts starts, boolean withMargins);

  /**
   * Operating time at a constant current from cold, s, infinite: never; empty where it cannot be
   * told or depends on no current.
   */
  OptionalDouble seconds(double amps);

  /** The same after a preload, where the device has a memory of one. */
  default OptionalDouble seconds(double amps, DevicePreload preload) {
    return seconds(amps);
  }

  /** Empty, or why this edge cannot be computed whatever the start. */
  default Optional<String> unknown() {
    return Optional.empty();
  }

  /** Its use over the last of some starts in a row; empty where it cannot be computed. */
  Optional<LevelOverTime> useOverTime(Starts starts);

  /**
   * When its current last rose to its pick-up before a time and stayed there until it, s; empty
   * where it has none or was not above it.
   */
  default OptionalDouble pickedUpSeconds(Currents currents, double beforeSeconds) {
    return OptionalDouble.empty();
  }

  /**
   * What one edge does.
   *
   * @param passage use and operation
   * @param margins as in {@link DeviceResponse}
   * @param bound as in {@link DeviceResponse}
   * @param notJudged as in {@link DeviceResponse}
   */
  record EdgeOutcome(
      Passage passage,
      Optional<StartMargins> margins,
      Optional<String> bound,
      Optional<String> notJudged) {

    /** An edge that cannot be computed. */
    static EdgeOutcome notJudged(String why) {
      return new EdgeOutcome(
          new Passage(Double.NaN, Double.NaN, Double.POSITIVE_INFINITY),
          Optional.empty(),
          Optional.empty(),
          Optional.of(why));
    }
  }
}
