package sliprung.rulebook.locked;

import java.util.List;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;

/**
 * {@code locked/running}: a rotor that jams while it runs stands with its rings shorted. The motor
 * is as hot as its load left it, the relay only as warm as the least load of the spread leaves it,
 * and no sequence timer is running any more.
 */
public final class JammedWhileRunningIsCleared implements Rule {
  private static final Info INFO =
      new Info(
          "locked/running",
          "When the rotor jams while running, is it cleared before the first part reaches its limit?",
          "common practice (stall protection, IEEE C37.96)",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "load.running",
              "load.spread",
              "resistors.permanent",
              "resistors.leads",
              "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    return new Answer.Findings(
        List.of(
            Exposures.finding(
                facts,
                INFO,
                "running rotor",
                facts.faults(Scenario.Kind.RUNNING_LOCKED).toList())));
  }
}
