package sliprung.rulebook.trip;

import java.util.List;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Stage;
import sliprung.starter.Device;

/** An undervoltage relay in the dips of permitted starts, at its highest setting. */
final class UndervoltageInStarts {
  private UndervoltageInStarts() {}

  static List<Device.Undervoltage> devices(Facts facts) {
    return facts.starter().protection().stream()
        .filter(Device.Undervoltage.class::isInstance)
        .map(Device.Undervoltage.class::cast)
        .toList();
  }

  private static double leastVolts(ComputedStart start) {
    double least = Double.POSITIVE_INFINITY;
    for (Stage stage : start.history().everything()) {
      least = Math.min(least, stage.entry().terminalVolts());
      for (double volts : stage.trace().terminalVolts()) {
        least = Math.min(least, volts);
      }
    }
    return least;
  }

  /**
   * Margin: least voltage over the highest at which it may pick up. A relay that picks up and rides
   * through on its delay alone is tight.
   */
  static Finding finding(Facts facts, Rule.Info info, Device.Undervoltage device) {
    double rated = facts.starter().supply().voltage();
    double setting = device.share() * (1.0 + device.accuracy().pickUp()) * rated;
    ComputedStart worst = null;
    double least = Double.POSITIVE_INFINITY;
    boolean operates = false;
    for (ComputedStart start : facts.permitted().toList()) {
      boolean here =
          start.device(device.tag(), Edge.FAST).map(DeviceResponse::operates).orElse(false);
      double volts = leastVolts(start);
      if (worst == null || here && !operates || here == operates && volts < least) {
        worst = start;
        least = volts;
        operates |= here;
      }
    }
    FindingBuilder builder = FindingBuilder.of(facts, info, device.tag()).edge(Edge.FAST);
    if (worst == null) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    double margin = least / setting;
    String opens = device.trips().map(t -> " and opens " + t).orElse("");
    String says =
        "In a "
            + worst.words()
            + " the supply falls to "
            + Show.volts(least)
            + ", "
            + Show.percent(least / rated)
            + " of rated; "
            + device.tag()
            + " may pick up below "
            + Show.volts(setting)
            + " ("
            + Show.percent(device.share())
            + " with its accuracy)";
    builder.at(worst).figures(least, setting, "V");
    String mend = "Lower its voltage, lengthen its delay, or stiffen the supply.";
    if (margin >= 1.0) {
      return builder.margin(margin).says(says + ".").byMargin();
    }
    if (operates) {
      return builder
          .margin(margin)
          .says(says + opens + " after " + Show.seconds(device.seconds()) + ": the start ends.")
          .mend(mend)
          .byMargin();
    }
    return builder
        .says(
            says
                + " and rides through on its delay of "
                + Show.seconds(device.seconds())
                + " alone.")
        .mend(mend)
        .build(Verdict.TIGHT);
  }
}
