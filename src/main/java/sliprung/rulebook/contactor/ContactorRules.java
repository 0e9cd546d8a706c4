package sliprung.rulebook.contactor;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class ContactorRules {

  /** Every one. */
  public static final List<Rule> ALL =
      List.of(
          new EveryContactorBreaksWhatItOpens(),
          new TheLineContactorFitsItsDuty(),
          new TheLineContactorMakesWhatItClosesOnto(),
          new TheRelayTakesOverFromTheFuse());

  private ContactorRules() {}
}
