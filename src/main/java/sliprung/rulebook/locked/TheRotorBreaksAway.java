package sliprung.rulebook.locked;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.starter.Load;

/**
 * {@code locked/breakaway}: torque on step 1 at least voltage, dip included, with the bank hot and
 * at high tolerance, against the heavy breakaway torque.
 */
public final class TheRotorBreaksAway implements Rule {
  private static final Info INFO =
      new Info(
          "locked/breakaway",
          "Does the torque on step 1 exceed the breakaway torque at every corner?",
          "common practice",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "load.breakaway",
              "load.spread",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Load load = facts.starter().load();
    // a load that is easy to break loose must still be moved on
    double atRest = load.torque().at(0.0);
    double breakaway = Math.max(atRest, load.breakawayTorque().orElse(atRest));
    if (breakaway <= 0.0) {
      return new Answer.NotApplicable("the load has no torque at rest");
    }
    ComputedStart worst = null;
    double least = Double.POSITIVE_INFINITY;
    double torqueThere = 0.0;
    double needed = 0.0;
    for (ComputedStart start :
        facts.faultsOnStep(1, k -> k == Scenario.Kind.LOCKED_STEP).toList()) {
      double torque = start.history().stages().get(0).entry().torque();
      double need = breakaway * start.history().conditions().loadFactor();
      if (torque / need < least) {
        least = torque / need;
        worst = start;
        torqueThere = torque;
        needed = need;
      }
    }
    double amps = worst.history().stages().get(0).entry().statorAmps();
    return new Answer.Findings(
        List.of(
            FindingBuilder.of(facts, INFO, "step 1")
                .at(worst)
                .margin(least)
                .figures(torqueThere, needed, "N·m")
                .says(
                    "Step 1 gives "
                        + Show.torque(torqueThere)
                        + " at "
                        + Show.amps(amps)
                        + " against "
                        + Show.torque(needed)
                        + " to break away.")
                .mend(
                    least < facts.wanted(INFO.name())
                        ? "Lower the resistance of step 1, or free the load before starting."
                        : "")
                .byMargin()));
  }
}
