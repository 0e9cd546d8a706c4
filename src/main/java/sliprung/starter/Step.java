package sliprung.starter;

/**
 * What cuts out one section, and when.
 *
 * @param contactor tag of the step contactor
 * @param rule when it closes
 * @param atLeastSeconds least dwell on the step before, for level rules, s
 */
public record Step(String contactor, ClosingRule rule, double atLeastSeconds) {

  /** When a step contactor is told to close. */
  public sealed interface ClosingRule {

    /** Whether the rule is a level (true) or a timer (false). */
    boolean isLevel();
  }

  /**
   * After a time.
   *
   * @param seconds from the main contacts of the line contactor, then of the step before
   */
  public record After(double seconds) implements ClosingRule {
    @Override
    public boolean isLevel() {
      return false;
    }
  }

  /**
   * Once the stator current is below a level.
   *
   * @param amps RMS
   */
  public record StatorBelow(double amps) implements ClosingRule {
    @Override
    public boolean isLevel() {
      return true;
    }
  }

  /**
   * Once the ring current is below a level.
   *
   * @param amps RMS
   */
  public record RotorBelow(double amps) implements ClosingRule {
    @Override
    public boolean isLevel() {
      return true;
    }
  }

  /**
   * Once the rotor frequency is below a level.
   *
   * @param hertz Hz
   */
  public record RotorFrequencyBelow(double hertz) implements ClosingRule {
    @Override
    public boolean isLevel() {
      return true;
    }
  }
}
