package sliprung.curve;

/** One edge of a device's time-current band: how long a constant current from cold takes. */
public interface TimeCurrentEdge {

  /**
   * Operating time.
   *
   * @param amps constant RMS current, 0 or more
   * @return seconds; infinite: never
   */
  double seconds(double amps);

  /** Currents in A at which the time jumps or bends, rising: integration must not step over one. */
  double[] breaks();
}
