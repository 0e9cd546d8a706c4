package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.starter.Step;

/**
 * {@code sequence/false-close}: at least voltage and hottest bank no current level is already met
 * on a standing rotor.
 */
public final class NoLevelIsMetAtRest implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/false-close",
          "Is no current level already met while the rotor stands?",
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
              "steps",
              "level-spread"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      Step.ClosingRule rule = facts.starter().steps().get(step - 1).rule();
      if (rule instanceof Step.StatorBelow || rule instanceof Step.RotorBelow) {
        findings.add(judge(facts, step, rule));
      }
    }
    return Answer.of(findings, "no step is closed by a current level");
  }

  private static Finding judge(Facts facts, int step, Step.ClosingRule rule) {
    boolean stator = rule instanceof Step.StatorBelow;
    ComputedStart worst = null;
    double least = Double.POSITIVE_INFINITY;
    double ampsThere = 0.0;
    double levelThere = 0.0;
    for (ComputedStart start :
        facts.faultsOnStep(step, k -> k == Scenario.Kind.LOCKED_STEP).toList()) {
      // Frozen on this step: earlier current levels hold the sequence back, so what matters is the
      // standing current on the step itself, taken from the circuit it would have.
      Stage stage = stageOf(start, step);
      double amps =
          stage == null
              ? standing(facts, start, step, stator)
              : stator ? stage.entry().statorAmps() : stage.entry().ringAmps();
      double level =
          EveryStepPullsThrough.levelOf(rule) * start.history().conditions().levelFactor(step);
      if (amps / level < least) {
        least = amps / level;
        worst = start;
        ampsThere = amps;
        levelThere = level;
      }
    }
    return FindingBuilder.of(facts, INFO, "step " + step)
        .at(worst)
        .margin(least)
        .figures(ampsThere, levelThere, "A")
        .says(
            "On step "
                + step
                + " a standing rotor draws "
                + Show.amps(ampsThere)
                + (stator ? "" : " in the rings")
                + "; the contactor closes below "
                + Show.amps(levelThere)
                + ".")
        .mend(
            least < facts.wanted(INFO.name())
                ? "Lower the level, or close by rotor frequency, which a standing rotor never meets."
                : "")
        .byMargin();
  }

  private static Stage stageOf(ComputedStart start, int step) {
    return start.history().stages().stream().filter(s -> s.step() == step).findFirst().orElse(null);
  }

  /** Standing current on a step that the locked sequence does not come to. */
  private static double standing(Facts facts, ComputedStart start, int step, boolean stator) {
    List<Integer> in = new ArrayList<>();
    for (int s = step; s <= facts.starter().sectionCount(); s++) {
      in.add(s);
    }
    double ohms = 0.0;
    for (int s : in) {
      ohms += facts.starter().resistors().sections().get(s - 1).ohms();
    }
    var bank = facts.starter().resistors();
    var conditions = start.history().conditions();
    double external =
        (ohms * bank.starFactor() + bank.permanentOhms()) * conditions.bankFactor()
            + bank.leadsOhms();
    var point = facts.machine().at(conditions.source(), external, 1.0);
    return stator ? point.statorAmps() : point.ringAmps();
  }
}
