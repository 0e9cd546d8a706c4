package sliprung.starter;

/**
 * Declared interlocks.
 *
 * @param stepsOpenBeforeLine the line contactor closes only with every step contactor proven open
 * @param everyStepProven a step contactor that fails to close stops the start
 */
public record Interlocks(boolean stepsOpenBeforeLine, boolean everyStepProven) {

  /** None declared. */
  public static final Interlocks NONE = new Interlocks(false, false);
}
