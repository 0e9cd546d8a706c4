package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.List;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;

/** {@code held/exposure}: a held step is cleared before the first part reaches its limit. */
public final class EveryHeldStepIsCleared implements Rule {
  private static final Info INFO =
      new Info(
          "held/exposure",
          "When a step contactor fails to close, does something that really opens the circuit clear"
              + " it before the first part reaches its limit?",
          "common practice",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "sequence",
              "timer-spread",
              "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      List<ComputedStart> starts =
          facts
              .faultsOnStep(step, k -> k == Scenario.Kind.HELD || k == Scenario.Kind.SKIPPED)
              .toList();
      findings.add(Exposures.finding(facts, INFO, "step " + step, starts));
    }
    return Answer.of(findings, "the bank has no sections");
  }
}
