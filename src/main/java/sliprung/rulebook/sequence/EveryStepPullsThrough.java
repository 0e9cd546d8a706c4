package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Outcome;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.Trace;
import sliprung.starter.Step;

/**
 * {@code sequence/pull-through}: on every step the torque exceeds the load up to the speed at which
 * the next contactor closes, and a level that must be reached is reached. A hang is a breach that
 * names the speed; a level that the settled motor meets by less than the wanted margin is tight.
 */
public final class EveryStepPullsThrough implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/pull-through",
          "Does every permitted start pull through every step to running speed?",
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
              "level-spread"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    findings.add(wholeStart(facts));
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      level(facts, step).ifPresent(findings::add);
    }
    return new Answer.Findings(findings);
  }

  private static Finding wholeStart(Facts facts) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "start");
    ComputedStart slowest = null;
    for (ComputedStart start : facts.permitted().toList()) {
      if (start.history().outcome() != Outcome.RUNNING) {
        return hang(builder, start);
      }
      if (slowest == null
          || start.history().runUpSeconds().orElse(0.0)
              > slowest.history().runUpSeconds().orElse(0.0)) {
        slowest = start;
      }
    }
    double runUp = slowest.history().runUpSeconds().orElseThrow();
    return builder
        .at(slowest)
        .figures(runUp, Double.NaN, "s")
        .says("The slowest permitted start runs up in " + Show.seconds(runUp) + ".")
        .build(Verdict.CLEAR);
  }

  private static Finding hang(FindingBuilder builder, ComputedStart start) {
    Stage last = start.history().stages().get(start.history().stages().size() - 1);
    Trace trace = last.trace();
    double speed = trace.speed()[trace.last()];
    return builder
        .at(start)
        .says(
            "The start hangs on step "
                + last.step()
                + " at "
                + Show.rpm(speed)
                + ", drawing "
                + Show.amps(trace.statorAmps()[trace.last()])
                + ", and ends "
                + start.history().outcome().word()
                + (start.history().levelNeverReached() > 0
                    ? ": the level that closes step contactor "
                        + start.history().levelNeverReached()
                        + " is never reached."
                    : "."))
        .mend("Lower the resistance of that step, change its level, or unload the start.")
        .build(Verdict.BREACH);
  }

  private static Optional<Finding> level(Facts facts, int step) {
    Step.ClosingRule rule = facts.starter().steps().get(step - 1).rule();
    if (!rule.isLevel()) {
      return Optional.empty();
    }
    Scenario held = new Scenario(Scenario.Kind.HELD, step, Scenario.LoadMode.START);
    ComputedStart worst = null;
    double least = Double.POSITIVE_INFINITY;
    double settledThere = 0.0;
    double levelThere = 0.0;
    for (ComputedStart start :
        facts.faults(Scenario.Kind.HELD).filter(s -> s.scenario().equals(held)).toList()) {
      Stage last = start.history().stages().get(start.history().stages().size() - 1);
      if (last.step() != step) {
        continue;
      }
      double settled = measured(facts, rule, last.trace());
      double level = levelOf(rule) * start.history().conditions().levelFactor(step);
      double margin = settled <= 0.0 ? Double.POSITIVE_INFINITY : level / settled;
      if (worst == null || margin < least) {
        least = margin;
        worst = start;
        settledThere = settled;
        levelThere = level;
      }
    }
    if (worst == null) {
      return Optional.empty();
    }
    String unit = rule instanceof Step.RotorFrequencyBelow ? "Hz" : "A";
    return Optional.of(
        FindingBuilder.of(facts, INFO, "step " + step)
            .at(worst)
            .margin(least)
            .figures(settledThere, levelThere, unit)
            .says(
                "On step "
                    + step
                    + " the motor would settle at "
                    + Show.three(settledThere)
                    + " "
                    + unit
                    + "; its contactor closes below "
                    + Show.three(levelThere)
                    + " "
                    + unit
                    + ".")
            .mend(least < facts.wanted(INFO.name()) ? "Raise the level." : "")
            .byMargin());
  }

  static double levelOf(Step.ClosingRule rule) {
    if (rule instanceof Step.RotorFrequencyBelow below) {
      return below.hertz();
    }
    return rule instanceof Step.StatorBelow below ? below.amps() : ((Step.RotorBelow) rule).amps();
  }

  private static double measured(Facts facts, Step.ClosingRule rule, Trace trace) {
    int last = trace.last();
    if (rule instanceof Step.RotorFrequencyBelow) {
      return Math.abs(facts.machine().slip(trace.speed()[last]))
          * facts.starter().supply().frequency();
    }
    return rule instanceof Step.StatorBelow ? trace.statorAmps()[last] : trace.ringAmps()[last];
  }
}
