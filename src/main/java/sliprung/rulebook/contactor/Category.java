package sliprung.rulebook.contactor;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.Practice;
import sliprung.starter.Contactor;

/**
 * One utilization category of one contactor with its figures of IEC 60947-4-1, all as multiples of
 * the rated operational current.
 *
 * @param name such as {@code AC-3}
 * @param ratedAmps rated operational current in that category, A, above 0
 * @param practice holds the figures
 */
record Category(String name, double ratedAmps, Practice practice) {
  private static final String RESISTIVE = "AC-1";
  private static final String SLIP_RING = "AC-2";

  /** The categories of a contactor that the practice has figures for. */
  static List<Category> of(Contactor contactor, Practice practice) {
    return contactor.ratings().entrySet().stream()
        .filter(e -> e.getValue() > 0.0)
        .filter(e -> practice.find(e.getKey() + ".making").isPresent())
        .map(e -> new Category(e.getKey(), e.getValue(), practice))
        .toList();
  }

  /** Whether the category is meant for motors at all. */
  boolean isForMotors() {
    return !name.equals(RESISTIVE);
  }

  /** Whether it is the category of slip-ring motors. */
  boolean isSlipRing() {
    return name.equals(SLIP_RING);
  }

  /** Occasional making capacity (table 7), multiple of the rated current. */
  double making() {
    return figure("making");
  }

  /** Occasional breaking capacity (table 7), multiple of the rated current. */
  double breaking() {
    return figure("breaking");
  }

  /** Made and broken as a routine (table 10), multiple of the rated current. */
  double routine() {
    return figure("routine");
  }

  /** Broken all its life (electrical durability test), multiple of the rated current. */
  double durabilityBreaking() {
    return figure("durability-breaking");
  }

  /** Share of the rated voltage at which {@link #durabilityBreaking()} is broken. */
  double durabilityVoltage() {
    return figure("durability-voltage");
  }

  /** Power factor of the making and breaking test (table 7). */
  double powerFactor() {
    return practice
        .find(name + ".cos-phi")
        .orElseGet(
            () ->
                practice.figure(
                    name
                        + (ratedAmps <= practice.figure("contactor.cos-phi-changes-above").value()
                            ? ".cos-phi.small"
                            : ".cos-phi.large")))
        .value();
  }

  /** In words with one of its multiples: {@code AC-3: 8 × 315 A}. */
  String words(double multiple) {
    return name + ": " + Show.three(multiple) + " × " + Show.amps(ratedAmps);
  }

  private double figure(String what) {
    return practice.figure(name + "." + what).value();
  }
}
