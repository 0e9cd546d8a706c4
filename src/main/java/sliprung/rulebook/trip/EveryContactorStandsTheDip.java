package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Stage;
import sliprung.starter.Contactor;
import sliprung.starter.Step;

/**
 * {@code trip/voltage-dip}: with the control circuit on the motor's own supply, the voltage just
 * after each closing still closes the contactor that closes, and never lets one drop that is in; no
 * undervoltage relay is touched; and after a dip from outside nothing closes with steps still in.
 */
public final class EveryContactorStandsTheDip implements Rule {
  private static final Info INFO =
      new Info(
          "trip/voltage-dip",
          "Do contactors and undervoltage relays stand the dip at each closing, and what closes when"
              + " a voltage that was lost returns?",
          "IEC 60947-4-1, 8.2.1.2 limits of operation",
          List.of(
              "supply",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "timer-spread",
              "level-spread",
              "interlocks",
              "protection.{subject}"));

  private record Dip(ComputedStart start, double volts, double amps, double limit) {
    double margin() {
      return volts / limit;
    }
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    double rated = facts.starter().supply().voltage();
    if (facts.starter().supply().faultMinAmps().isEmpty()) {
      List<Finding> open = new ArrayList<>();
      open.add(ideal(facts, "contactors"));
      UndervoltageInStarts.devices(facts).forEach(d -> open.add(ideal(facts, d.tag())));
      return new Answer.Findings(open);
    }
    double closes = facts.practice().figure("coil.closes").value() * rated;
    double holds = facts.practice().figure("coil.holds").value() * rated;
    Map<String, Dip> worst = new LinkedHashMap<>();
    for (Contactor line : facts.starter().lineContactors()) {
      worst.put(line.tag(), null);
    }
    for (Step step : facts.starter().steps()) {
      worst.put(step.contactor(), null);
    }
    for (ComputedStart start : facts.permitted().filter(s -> s.place() == 1).toList()) {
      List<String> in = new ArrayList<>();
      for (Stage stage : start.history().stages()) {
        double volts = stage.entry().terminalVolts();
        double amps = stage.entry().statorAmps();
        put(worst, stage.closedBy(), new Dip(start, volts, amps, closes));
        for (Contactor line : facts.starter().lineContactors()) {
          put(worst, line.tag(), new Dip(start, volts, amps, holds));
        }
        in.forEach(tag -> put(worst, tag, new Dip(start, volts, amps, holds)));
        in.add(stage.closedBy());
      }
    }
    List<Finding> findings = new ArrayList<>();
    worst.forEach(
        (tag, dip) -> {
          if (dip != null) {
            findings.add(finding(facts, tag, dip, closes));
          }
        });
    UndervoltageInStarts.devices(facts)
        .forEach(d -> findings.add(UndervoltageInStarts.finding(facts, INFO, d)));
    findings.add(onReturn(facts));
    return Answer.of(findings, "nothing closes");
  }

  private static Finding ideal(Facts facts, String subject) {
    return FindingBuilder.of(facts, INFO, subject)
        .notJudged(
            List.of("supply.fault-current.min"),
            "The source is taken as ideal, and an ideal source does not dip.");
  }

  /**
   * What closes again when the voltage comes back after a dip from outside: between the voltage
   * that surely drops a coil and the one that surely holds it, anything may have dropped.
   */
  private static Finding onReturn(Facts facts) {
    double drops = facts.practice().figure("coil.drops").value();
    double holds = facts.practice().figure("coil.holds").value();
    String line =
        facts.starter().lineContactors().stream()
            .map(Contactor::tag)
            .reduce((a, b) -> a + " and " + b)
            .orElse("the line contactor");
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "return of the voltage");
    String says =
        "A dip of the supply to between "
            + Show.percent(drops)
            + " and "
            + Show.percent(holds)
            + " may drop "
            + line
            + ", step contactors, or some of them. ";
    if (facts.starter().interlocks().stepsOpenBeforeLine()) {
      return builder
          .says(
              says
                  + "The interlock proves every step contactor open before "
                  + line
                  + " closes again.")
          .build(Verdict.CLEAR);
    }
    return builder
        .says(
            says
                + "When the voltage returns, nothing keeps "
                + line
                + " from closing with steps still in; held/skipped judges that start.")
        .mend(
            "Prove every step contactor open before the line contactor closes, and let a start"
                + " begin by hand after a dip.")
        .build(Verdict.TIGHT);
  }

  private static void put(Map<String, Dip> worst, String tag, Dip dip) {
    if (!worst.containsKey(tag)) {
      return;
    }
    Dip before = worst.get(tag);
    if (before == null || dip.margin() < before.margin()) {
      worst.put(tag, dip);
    }
  }

  private static Finding finding(Facts facts, String tag, Dip dip, double closes) {
    double rated = facts.starter().supply().voltage();
    double margin = dip.margin();
    return FindingBuilder.of(facts, INFO, tag)
        .at(dip.start())
        .margin(margin)
        .figures(dip.volts(), dip.limit(), "V")
        .says(
            "At "
                + Show.amps(dip.amps())
                + " the supply falls to "
                + Show.volts(dip.volts())
                + ", "
                + Show.percent(dip.volts() / rated)
                + " of rated; "
                + tag
                + (dip.limit() == closes
                    ? " is sure to close from " + Show.percent(closes / rated) + " on"
                    : " is sure to stay in down to " + Show.percent(dip.limit() / rated))
                + ". The control circuit is assumed on the same supply.")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Feed the coils from a supply of their own, or raise the voltage before the start."
                : "")
        .byMargin();
  }
}
