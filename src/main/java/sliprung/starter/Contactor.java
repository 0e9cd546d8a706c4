package sliprung.starter;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;

/**
 * A contactor.
 *
 * @param tag on the drawing
 * @param place in the stator line or in the rotor circuit
 * @param ratings rated operational current in A by utilization category, such as {@code AC-3}
 * @param ratedVoltage V
 * @param poles how the poles are joined; rotor contactors only
 * @param thermalAmps conventional thermal current
 * @param rotorRatingAmps rated rotor operational current
 * @param shortTime what it carries closed for a short time
 * @param closingSeconds order to touch of the main contacts
 * @param openingSeconds order to parting of the main contacts
 * @param coordination declared, tested combination with a short-circuit device
 */
public record Contactor(
    String tag,
    Place place,
    Map<String, Double> ratings,
    OptionalDouble ratedVoltage,
    Optional<Poles> poles,
    OptionalDouble thermalAmps,
    OptionalDouble rotorRatingAmps,
    Optional<ShortTime> shortTime,
    double closingSeconds,
    double openingSeconds,
    Optional<Coordination> coordination) {

  /** Where a contactor sits. */
  public enum Place {
    LINE,
    ROTOR
  }

  /** How the poles of a rotor contactor are joined. */
  public enum Poles {
    STAR,
    DELTA,
    TWO
  }

  /**
   * A declared coordination.
   *
   * @param type 1 or 2
   * @param with tag of the short-circuit device
   */
  public record Coordination(int type, String with) {}

  /** Copies the map. */
  public Contactor {
    ratings = new TreeMap<>(ratings);
  }
}
