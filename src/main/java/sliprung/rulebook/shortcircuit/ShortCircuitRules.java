package sliprung.rulebook.shortcircuit;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class ShortCircuitRules {

  /** Every one. */
  public static final List<Rule> ALL =
      List.of(
          new TheGreatestFaultCurrentIsBroken(),
          new TheLeastFaultCurrentIsCleared(),
          new TheShortCircuitDeviceIsRatedAsAllowed(),
          new TheUpstreamFuseStaysWhole());

  private ShortCircuitRules() {}
}
