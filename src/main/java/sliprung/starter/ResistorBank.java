package sliprung.starter;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The rotor bank: sections in the order in which they are cut out.
 *
 * @param connection star, or delta (a section then carries ring current / √3)
 * @param cutOut what a step contactor shorts
 * @param sections first cut out first
 * @param sameLimit both ratings of a section end at one element temperature
 * @param permanentOhms stays in circuit after the last step, Ω per phase (star)
 * @param leadsOhms rotor cable and brushes, Ω per phase; never shorted
 * @param tolerance of the whole bank, per unit
 * @param hotRise resistance rise when hot, per unit
 * @param enclosureSeconds time constant of the air around the bank
 * @param fan forced cooling; empty: none is described
 */
public record ResistorBank(
    Connection connection,
    CutOut cutOut,
    List<Section> sections,
    boolean sameLimit,
    double permanentOhms,
    double leadsOhms,
    double tolerance,
    double hotRise,
    double enclosureSeconds,
    Optional<Fan> fan) {

  /** How the three phases of the bank are joined. */
  public enum Connection {
    STAR,
    DELTA
  }

  /** What a step contactor shorts. */
  public enum CutOut {
    /** Contactor k shorts its tapping to the star point: all sections before it are dead. */
    STAR_POINT,
    /** Contactor k bridges section k alone. */
    BRIDGING
  }

  /**
   * One section, per phase (or per delta branch).
   *
   * @param ohms as built, cold
   * @param continuousAmps what it carries for good, in its own conductor
   * @param shortTime what it carries for a short time from cold, in its own conductor
   * @param continuousRiseKelvin element rise behind the continuous rating
   * @param shortTimeRiseKelvin element rise behind the short-time rating
   */
  public record Section(
      double ohms,
      OptionalDouble continuousAmps,
      Optional<ShortTime> shortTime,
      OptionalDouble continuousRiseKelvin,
      OptionalDouble shortTimeRiseKelvin) {}

  /**
   * A fan on which the ratings of the sections rest.
   *
   * @param continuousWithout what is left of the continuous current without it, per unit; empty:
   *     not given
   * @param timeConstantWithout time constant of a section without it over that with it; empty: that
   *     of the same heat capacity, 1 over the square of the share of the current
   */
  public record Fan(OptionalDouble continuousWithout, OptionalDouble timeConstantWithout) {}

  /** A bank without a fan. */
  public ResistorBank(
      Connection connection,
      CutOut cutOut,
      List<Section> sections,
      boolean sameLimit,
      double permanentOhms,
      double leadsOhms,
      double tolerance,
      double hotRise,
      double enclosureSeconds) {
    this(
        connection,
        cutOut,
        sections,
        sameLimit,
        permanentOhms,
        leadsOhms,
        tolerance,
        hotRise,
        enclosureSeconds,
        Optional.empty());
  }

  /** The same bank with other ratings of its sections, all of one limit. */
  public ResistorBank rated(List<Section> others) {
    return new ResistorBank(
        connection,
        cutOut,
        others,
        true,
        permanentOhms,
        leadsOhms,
        tolerance,
        hotRise,
        enclosureSeconds,
        fan);
  }

  /** Copies the list. */
  public ResistorBank {
    sections = List.copyOf(sections);
    if (connection == Connection.DELTA && cutOut != CutOut.BRIDGING) {
      throw new IllegalArgumentException("a delta bank is always bridging");
    }
  }

  /** Ohms per phase of the star equivalent over ohms of the bank as connected: 1 or 1/3. */
  public double starFactor() {
    return connection == Connection.DELTA ? 1.0 / 3.0 : 1.0;
  }

  /** Current in a section over ring current: 1 or 1/√3. */
  public double sectionShare() {
    return connection == Connection.DELTA ? 1.0 / Math.sqrt(3.0) : 1.0;
  }
}
