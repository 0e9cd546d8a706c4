package sliprung.machine;

/**
 * The source as the motor sees it.
 *
 * @param volts no-load voltage, line to line, V
 * @param reactance per phase, Ω; 0 for an ideal source
 */
public record Source(double volts, double reactance) {

  /** Reactance per phase behind a three-phase fault current in A at a rated voltage in V. */
  public static double reactanceOf(double ratedVolts, double faultAmps) {
    return ratedVolts / (Math.sqrt(3.0) * faultAmps);
  }
}
