package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.List;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Device;

/**
 * {@code trip/closing-peak}: no instantaneous element picks up on any closing. The peaks of the
 * electrical transient are not computed yet: a steady current that already picks up is a breach,
 * everything else is not judged.
 */
public final class NoClosingPeakPicksUp implements Rule {
  private static final Info INFO =
      new Info(
          "trip/closing-peak",
          "Does no instantaneous element pick up on any closing, offset and overreach included?",
          "IEEE 3004.8 instantaneous settings; common practice",
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
              "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Instantaneous) {
        findings.add(judge(facts, device));
      }
    }
    return Answer.of(findings, "no instantaneous element is fitted");
  }

  private static Finding judge(Facts facts, Device device) {
    ComputedStart worst = null;
    DeviceResponse response = null;
    for (ComputedStart start : facts.permitted().toList()) {
      DeviceResponse found = start.device(device.tag(), Edge.FAST).orElseThrow();
      if (response == null || found.use() > response.use()) {
        worst = start;
        response = found;
      }
    }
    FindingBuilder builder = FindingBuilder.of(facts, INFO, device.tag()).at(worst).edge(Edge.FAST);
    if (response.use() >= 1.0) {
      return builder
          .margin(1.0 / response.use())
          .figures(response.use(), 1.0, "share of pick-up")
          .says(
              device.tag()
                  + " picks up on the steady current of a "
                  + worst.words()
                  + ", "
                  + Show.seconds(response.operatesAtSeconds())
                  + " after line closing, before any transient peak is counted.")
          .mend("Raise its pick-up.")
          .byMargin();
    }
    return builder.notJudged(
        List.of(),
        "The steady current comes to "
            + Show.percent(response.use())
            + " of "
            + device.tag()
            + "'s pick-up; the transient peak of a closing is not computed by this version.");
  }
}
