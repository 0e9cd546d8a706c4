package sliprung.rulebook;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.starter.Contactor;

/**
 * The greatest current that a contactor is proven to make, now and then.
 *
 * @param tag of the contactor
 * @param amps RMS, pole current
 * @param basis such as {@code AC-3, 10 × 315 A} or {@code 4 × its rotor rating of 315 A}
 */
public record MakingCapacity(String tag, double amps, String basis) {

  /**
   * The capacity; of a line contactor rated in several categories the greatest proven figure
   * counts.
   *
   * @return empty where nothing proves one: no rating, a line contactor above 1000 V or above its
   *     rated voltage, a rotor contactor without a rotor rating
   */
  public static Optional<MakingCapacity> of(Facts facts, Contactor contactor) {
    if (contactor.place() == Contactor.Place.ROTOR) {
      OptionalDouble rating = contactor.rotorRatingAmps();
      if (rating.isEmpty()) {
        return Optional.empty();
      }
      double multiple = facts.practice().figure("rotor.making").value();
      return Optional.of(
          new MakingCapacity(
              contactor.tag(),
              multiple * rating.getAsDouble(),
              Show.three(multiple) + " × its rotor rating of " + Show.amps(rating.getAsDouble())));
    }
    double volts = facts.starter().supply().voltage();
    if (volts > facts.practice().figure("contactor.greatest-voltage").value()
        || contactor.ratedVoltage().isEmpty()
        || contactor.ratedVoltage().getAsDouble() < volts) {
      return Optional.empty();
    }
    MakingCapacity best = null;
    for (Map.Entry<String, Double> rating : contactor.ratings().entrySet()) {
      Optional<Practice.Figure> multiple = facts.practice().find(rating.getKey() + ".making");
      if (multiple.isPresent()
          && (best == null || multiple.get().value() * rating.getValue() > best.amps())) {
        best =
            new MakingCapacity(
                contactor.tag(),
                multiple.get().value() * rating.getValue(),
                rating.getKey()
                    + ", "
                    + Show.three(multiple.get().value())
                    + " × "
                    + Show.amps(rating.getValue()));
      }
    }
    return Optional.ofNullable(best);
  }

  /** What to give so that it can be judged. */
  public static List<String> missing(Facts facts, Contactor contactor) {
    String path = "contactors." + contactor.tag() + ".";
    if (contactor.place() == Contactor.Place.ROTOR) {
      return List.of(path + "rotor-rating");
    }
    boolean aboveCategories =
        facts.starter().supply().voltage()
            > facts.practice().figure("contactor.greatest-voltage").value();
    if (aboveCategories) {
      return List.of(); // the figures of IEC 62271-106 are not held: nothing given would tell
    }
    return contactor.ratedVoltage().isEmpty()
        ? List.of(path + "rated-voltage")
        : List.of(path + "ratings");
  }
}
