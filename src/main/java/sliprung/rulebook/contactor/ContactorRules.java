package sliprung.rulebook.contactor;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class ContactorRules {

  /** Every one. */
  public static final List<Rule> ALL =
      List.of(
          new EveryContactorBreaksWhatItOpens(),
          new EveryContactorCarriesItsCurrent(),
          new TheLineContactorFitsItsDuty(),
          new TheLineContactorMakesWhatItClosesOnto(),
          new EveryContactorIsRatedForItsOperations(),
          new TheLineContactorOpensFirst(),
          new EveryStepContactorMakesWhatItClosesOnto(),
          new TheRotorVoltageFitsTheStepContactors(),
          new TheCoordinationIsDeclared(),
          new TheRelayTakesOverFromTheFuse(),
          new NothingClosesOntoShortedRings());

  private ContactorRules() {}
}
