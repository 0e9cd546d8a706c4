package sliprung.rulebook.locked;

import java.util.ArrayList;
import java.util.List;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;

/** {@code locked/step}: a rotor that does not turn, the sequence frozen on a step. */
public final class LockedOnAStepIsCleared implements Rule {
  private static final Info INFO =
      new Info(
          "locked/step",
          "When the rotor does not turn and the sequence is frozen on a step, is it cleared before the"
              + " first part reaches its limit?",
          "common practice",
          List.of(
              "supply.band",
              "motor",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      findings.add(
          Exposures.finding(
              facts,
              INFO,
              "step " + step,
              facts.faultsOnStep(step, k -> k == Scenario.Kind.LOCKED_STEP).toList()));
    }
    return Answer.of(findings, "the bank has no sections");
  }
}
