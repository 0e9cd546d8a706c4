package sliprung.rulebook.contactor;

/**
 * How much higher the first peak of a closing current stands over its RMS value, by power factor.
 */
final class Asymmetry {
  private Asymmetry() {}

  /**
   * Peak over the crest of the steady current, {@code κ = 1.02 + 0.98 e^(−3R/X)} (IEC 60909-0, from
   * memory): 1.02 for a resistance, 2 for a reactance.
   *
   * @param powerFactor 0 to 1
   */
  static double factor(double powerFactor) {
    if (powerFactor >= 1.0) {
      return 1.02;
    }
    double ratio = powerFactor / Math.sqrt(1.0 - powerFactor * powerFactor);
    return 1.02 + 0.98 * Math.exp(-3.0 * ratio);
  }

  /**
   * Factor on a current made at a power factor below the tested one, so that its peak compares with
   * the test's; 1 where the circuit is no harder than the test.
   */
  static double against(double powerFactor, double tested) {
    return Math.max(1.0, factor(powerFactor) / factor(tested));
  }
}
