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
 * @param intermittentClass operating cycles an hour it is declared for (IEC 60947-1, intermittent
 *     duty: class 12 is 12 an hour)
 * @param breakingAmps its own tested breaking current at its rated voltage, RMS
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
    Optional<Coordination> coordination,
    OptionalDouble intermittentClass,
    OptionalDouble breakingAmps) {

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
   * @param upToAmps declared rated conditional short-circuit current I_q, RMS
   */
  public record Coordination(int type, String with, OptionalDouble upToAmps) {

    /** A coordination without a declared current. */
    public Coordination(int type, String with) {
      this(type, with, OptionalDouble.empty());
    }
  }

  /** A contactor without a tested breaking current of its own. */
  public Contactor(
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
      Optional<Coordination> coordination,
      OptionalDouble intermittentClass) {
    this(
        tag,
        place,
        ratings,
        ratedVoltage,
        poles,
        thermalAmps,
        rotorRatingAmps,
        shortTime,
        closingSeconds,
        openingSeconds,
        coordination,
        intermittentClass,
        OptionalDouble.empty());
  }

  /** A contactor without a declared class of intermittent duty. */
  public Contactor(
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
    this(
        tag,
        place,
        ratings,
        ratedVoltage,
        poles,
        thermalAmps,
        rotorRatingAmps,
        shortTime,
        closingSeconds,
        openingSeconds,
        coordination,
        OptionalDouble.empty());
  }

  /** Copies the map. */
  public Contactor {
    ratings = new TreeMap<>(ratings);
  }
}
