package sliprung.rulebook.conductor;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class ConductorRules {

  /** Every one. */
  public static final List<Rule> ALL =
      List.of(new TheCablesCarryTheirCurrent(), new TheCablesStandAShortCircuit());

  private ConductorRules() {}
}
