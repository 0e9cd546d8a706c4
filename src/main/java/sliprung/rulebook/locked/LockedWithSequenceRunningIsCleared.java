package sliprung.rulebook.locked;

import java.util.List;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.starter.Device;

/**
 * {@code locked/sequence}: a rotor that does not turn while the sequence runs as wired is cleared
 * before the first limit. A sequence timer counts only where its stop condition is truly unmet:
 * time-closed steps meet {@code last-step} on a standing rotor.
 */
public final class LockedWithSequenceRunningIsCleared implements Rule {
  private static final Info INFO =
      new Info(
          "locked/sequence",
          "When the rotor does not turn and the sequence runs as wired, is it cleared before the first"
              + " part reaches its limit?",
          "common practice",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<ComputedStart> starts = facts.faults(Scenario.Kind.LOCKED).toList();
    Finding finding = Exposures.finding(facts, INFO, "sequence", starts);
    boolean allClose =
        starts.stream()
            .anyMatch(
                s ->
                    s.history()
                        .stages()
                        .get(s.history().stages().size() - 1)
                        .sectionsIn()
                        .isEmpty());
    boolean timer =
        facts.starter().protection().stream()
            .anyMatch(d -> d instanceof Device.SequenceTimer t && t.untilSpeedShare().isEmpty());
    if (allClose && timer) {
      return new Answer.Findings(
          List.of(
              Findings.saying(
                  finding,
                  " The steps close on a standing rotor too, so a sequence timer that waits for the"
                      + " last step is satisfied and sees nothing.")));
    }
    return new Answer.Findings(List.of(finding));
  }
}
