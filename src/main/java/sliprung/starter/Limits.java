package sliprung.starter;

import java.util.OptionalDouble;

/**
 * What the plant asks for.
 *
 * @param closingStatorAmps greatest RMS stator current just after a closing
 * @param closingRotorAmps greatest RMS ring current just after a closing
 * @param torquePeak greatest shaft torque, N·m
 */
public record Limits(
    OptionalDouble closingStatorAmps, OptionalDouble closingRotorAmps, OptionalDouble torquePeak) {

  /** No limits. */
  public static final Limits NONE =
      new Limits(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
}
