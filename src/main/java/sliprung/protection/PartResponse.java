package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What one part goes through in one start.
 *
 * @param part {@code section-1} …, {@code stator}, {@code rotor}, {@code rings}, {@code
 *     stator-conductor}, {@code rotor-conductor}, or a contactor's tag
 * @param use greatest share of its limit; 1 or more: past it
 * @param limitAtSeconds when it reaches its limit, from line closing; infinite: never
 * @param energyJoules heat put into it (three phases of a section, of the windings), where known
 * @param missing empty, or the path of the input that is missing; then the figures mean nothing
 */
public record PartResponse(
    String part,
    double use,
    double limitAtSeconds,
    OptionalDouble energyJoules,
    Optional<String> missing) {

  /** A part without data. */
  public static PartResponse missing(String part, String path) {
    return new PartResponse(
        part, Double.NaN, Double.POSITIVE_INFINITY, OptionalDouble.empty(), Optional.of(path));
  }
}
