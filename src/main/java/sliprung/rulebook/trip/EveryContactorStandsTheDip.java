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
import sliprung.runup.Stage;
import sliprung.starter.Contactor;
import sliprung.starter.Step;

/**
 * {@code trip/voltage-dip}: with the control circuit on the motor's own supply, the voltage just
 * after each closing still closes the contactor that closes, and never lets one drop that is in.
 */
public final class EveryContactorStandsTheDip implements Rule {
  private static final Info INFO =
      new Info(
          "trip/voltage-dip",
          "Do step and line contactors stand the dip at each closing?",
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
              "level-spread"));

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
      return new Answer.Findings(
          List.of(
              FindingBuilder.of(facts, INFO, "contactors")
                  .notJudged(
                      List.of("supply.fault-current.min"),
                      "The source is taken as ideal, and an ideal source does not dip.")));
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
      for (Stage stage : start.history().stages()) {
        double volts = stage.entry().terminalVolts();
        double amps = stage.entry().statorAmps();
        put(worst, stage.closedBy(), new Dip(start, volts, amps, closes));
        for (Contactor line : facts.starter().lineContactors()) {
          put(worst, line.tag(), new Dip(start, volts, amps, holds));
        }
      }
    }
    List<Finding> findings = new ArrayList<>();
    worst.forEach(
        (tag, dip) -> {
          if (dip != null) {
            findings.add(finding(facts, tag, dip, closes));
          }
        });
    return Answer.of(findings, "nothing closes");
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
