package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.tolerance.Corner;

/**
 * {@code contactor/order}: at a stop the line contactor has opened, and its arc is out, before a
 * step contactor parts; and no device opens a step contactor with the stator on.
 *
 * <p>Margin, with t_s and t_l the opening times and h half a period, the arc's longest life: (t_s +
 * h)/(t_l + h): 1 where they part together. Wanted: the same where the step contactor parts h
 * later; in between it is tight.
 */
public final class TheLineContactorOpensFirst implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/order",
          "Does the line contactor always open before the step contactors?",
          "common practice",
          List.of("contactors", "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    Optional<Contactor> slowest =
        facts.starter().lineContactors().stream()
            .max(Comparator.comparingDouble(Contactor::openingSeconds));
    for (Contactor step : StepContactors.of(facts.starter())) {
      slowest.ifPresent(line -> findings.add(judge(facts, line, step)));
    }
    for (Device device : facts.starter().protection()) {
      device
          .trips()
          .flatMap(facts.starter()::contactor)
          .filter(c -> c.place() == Contactor.Place.ROTOR)
          .ifPresent(c -> findings.add(tripped(facts, device, c)));
    }
    return Answer.of(findings, "no step contactor is described beside a line contactor");
  }

  private static Finding judge(Facts facts, Contactor line, Contactor step) {
    double half = 0.5 / facts.starter().supply().frequency();
    double margin = (step.openingSeconds() + half) / (line.openingSeconds() + half);
    double wanted =
        facts.wanted(INFO.name())
            * (line.openingSeconds() + 2.0 * half)
            / (line.openingSeconds() + half);
    String says =
        step.tag()
            + " parts "
            + Show.seconds(step.openingSeconds())
            + " after the order, "
            + line.tag()
            + " "
            + Show.seconds(line.openingSeconds())
            + "; its arc lasts up to "
            + Show.seconds(half)
            + " more.";
    boolean tooEarly = margin < wanted * (1.0 - 1e-9);
    return FindingBuilder.of(facts, INFO, step.tag())
        .margin(tooEarly ? margin : Math.max(margin, wanted))
        .wanted(wanted)
        .figures(step.openingSeconds(), line.openingSeconds(), "s")
        .says(tooEarly ? says + breaks(facts, step) : says)
        .mend(
            tooEarly
                ? "Let an auxiliary contact of "
                    + line.tag()
                    + " drop the step contactors, or delay them by "
                    + Show.seconds(line.openingSeconds() + half - step.openingSeconds())
                    + " or more."
                : "")
        .byMargin();
  }

  private static String breaks(Facts facts, Contactor step) {
    Optional<RunningPoint> running =
        Optional.ofNullable(facts.running().get(Corner.NOMINAL)).flatMap(r -> r);
    return running
        .map(
            r ->
                " A stop while running would have "
                    + step.tag()
                    + " break "
                    + Show.amps(
                        PoleCurrent.forVerdict(step, r.point().ringAmps(), facts.practice()))
                    + " a pole at "
                    + hertz(facts, r)
                    + ", nearly direct current.")
        .orElse(" It would break ring current near direct current.");
  }

  private static String hertz(Facts facts, RunningPoint running) {
    double slip = facts.machine().slip(running.speed());
    return Show.three(Math.abs(slip) * facts.starter().supply().frequency()) + "\u00a0Hz";
  }

  private static Finding tripped(Facts facts, Device device, Contactor contactor) {
    return FindingBuilder.of(facts, INFO, device.tag())
        .says(
            device.tag()
                + " opens step contactor "
                + contactor.tag()
                + " with the stator on."
                + breaks(facts, contactor)
                + " The section comes back into circuit and the motor stays connected.")
        .mend("Let " + device.tag() + " open the line contactor.")
        .build(Verdict.BREACH);
  }
}
