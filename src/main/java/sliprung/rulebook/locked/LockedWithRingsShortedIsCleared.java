package sliprung.rulebook.locked;

import java.util.List;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;

/** {@code locked/shorted}: at rest with rings shorted, against the hot stall limit. */
public final class LockedWithRingsShortedIsCleared implements Rule {
  private static final Info INFO =
      new Info(
          "locked/shorted",
          "At rest with the rings shorted, is it cleared within the hot stall limit?",
          "common practice",
          List.of(
              "supply.band", "supply.fault-current", "motor.stall-limit", "motor", "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    return new Answer.Findings(
        List.of(
            Exposures.finding(
                facts, INFO, "rings shorted", facts.faults(Scenario.Kind.RINGS_SHORTED).toList())));
  }
}
