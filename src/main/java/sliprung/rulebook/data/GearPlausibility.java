package sliprung.rulebook.data;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.starter.Breaker;
import sliprung.starter.Conductor;
import sliprung.starter.Contactor;
import sliprung.starter.Starter;

/** Contactors, breakers and cables against the motor. */
final class GearPlausibility {
  private GearPlausibility() {}

  static void check(Tally tally) {
    Starter starter = tally.facts().starter();
    for (Contactor contactor : starter.contactors()) {
      if (contactor.place() == Contactor.Place.LINE) {
        line(tally, contactor);
      } else {
        rotor(tally, contactor);
      }
      operating(tally, "contactors." + contactor.tag() + ".closing", contactor.closingSeconds());
      operating(tally, "contactors." + contactor.tag() + ".opening", contactor.openingSeconds());
    }
    for (Breaker breaker : starter.breakers()) {
      operating(tally, "breakers." + breaker.tag() + ".opening", breaker.openingSeconds());
    }
    conductor(tally, "conductors.stator", starter.statorConductor());
    conductor(tally, "conductors.rotor", starter.rotorConductor());
  }

  private static void line(Tally tally, Contactor contactor) {
    Starter starter = tally.facts().starter();
    String path = "contactors." + contactor.tag();
    tally.ratio(
        "line-rating",
        path + ".ratings",
        Tally.over(
            contactor.ratings().values().stream().mapToDouble(v -> v).max(),
            starter.motor().current()),
        contactor.tag() + "'s greatest rated current over the motor's",
        "Rated operational current at this voltage, not kW, and not the coil's current.");
    tally.ratio(
        "line-voltage",
        path + ".rated-voltage",
        Tally.over(contactor.ratedVoltage(), starter.supply().voltage()),
        contactor.tag() + "'s rated voltage over the supply's",
        "The voltage of the main contacts, not of the coil.");
  }

  private static void rotor(Tally tally, Contactor contactor) {
    tally.ratio(
        "rotor-rating",
        "contactors." + contactor.tag() + ".rotor-rating",
        Tally.over(contactor.rotorRatingAmps(), tally.facts().starter().motor().rotorCurrent()),
        contactor.tag() + "'s rotor rating over rated rotor current",
        "Rated rotor operational current of one pole.");
    contactor
        .shortTime()
        .ifPresent(
            shortTime ->
                tally.ratio(
                    "contactor-short-time",
                    "contactors." + contactor.tag() + ".short-time",
                    Tally.over(OptionalDouble.of(shortTime.amps()), contactor.thermalAmps()),
                    contactor.tag() + "'s short-time current over its thermal current",
                    "The short-time current is the greater one."));
  }

  private static void operating(Tally tally, String path, double seconds) {
    tally.check(
        "operating-time",
        path,
        OptionalDouble.of(seconds),
        "The operating time",
        Show::seconds,
        "Contactors and breakers take hundredths of a second: ms and s may be mixed.");
  }

  private static void conductor(Tally tally, String path, Optional<Conductor> conductor) {
    conductor.ifPresent(
        cable ->
            tally.check(
                "current-density",
                path,
                Tally.over(cable.ampacity(), cable.squareMillimetres()),
                "Ampacity over area of the cable",
                density -> Show.three(density) + "\u00a0A/mm²",
                "Area in mm² of one phase, and what that area carries."));
  }
}
