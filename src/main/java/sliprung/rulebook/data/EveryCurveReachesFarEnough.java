package sliprung.rulebook.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Device;

/**
 * {@code data/extrapolated}: a current or time that lies outside a curve's points, or between a
 * fuse's pinned gates, is never read as zero or as never.
 *
 * <p>The middle of a band decides nothing and is not asked. A fuse that may melt by a bound alone
 * counts in permitted starts; in failed starts only its slow edge is ever credited, which is no
 * bound.
 */
public final class EveryCurveReachesFarEnough implements Rule {
  /** How a response begins that has no answer for want of points. */
  static final String OUTSIDE = "outside the curve's points";

  private static final Info INFO =
      new Info(
          "data/extrapolated",
          "Does any start ask a curve for more than it holds?",
          "common practice",
          List.of("protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      List<Case> cases = cases(facts, device.tag());
      if (!cases.isEmpty()) {
        findings.add(beyond(facts, device, cases));
      } else if (isGivenByPoints(device)) {
        findings.add(
            FindingBuilder.of(facts, INFO, device.tag())
                .says(
                    "Every current and time that the computed starts ask of "
                        + device.tag()
                        + " lies on its curve.")
                .build(Verdict.CLEAR));
      }
    }
    return Answer.of(findings, "no device is given by points or gates");
  }

  private record Case(ComputedStart start, DeviceResponse response, String why, boolean outside) {}

  private static boolean isGivenByPoints(Device device) {
    return device instanceof Device.Points || device instanceof Device.Fuse;
  }

  private static List<Case> cases(Facts facts, String tag) {
    List<Case> cases = new ArrayList<>();
    for (ComputedStart start : facts.starts()) {
      for (DeviceResponse response : start.devices()) {
        if (!response.device().equals(tag) || response.edge() == Edge.MIDDLE) {
          continue;
        }
        Optional<String> outside = response.notJudged().filter(w -> w.startsWith(OUTSIDE));
        if (outside.isPresent()) {
          cases.add(new Case(start, response, outside.get(), true));
        } else if (response.bound().isPresent() && !start.scenario().isFault()) {
          cases.add(new Case(start, response, response.bound().get(), false));
        }
      }
    }
    return cases;
  }

  private static Finding beyond(Facts facts, Device device, List<Case> cases) {
    Case first = cases.stream().filter(Case::outside).findFirst().orElseGet(() -> cases.get(0));
    long starts = cases.stream().map(c -> c.start().id()).distinct().count();
    String path =
        device instanceof Device.Points
            ? "protection." + device.tag() + ".curve"
            : "protection." + device.tag();
    String what =
        first.outside()
            ? " has no answer: "
            : " operates only by a bound, which proves neither that it does nor that it does not: ";
    FindingBuilder builder =
        FindingBuilder.of(facts, INFO, device.tag())
            .at(first.start())
            .edge(first.response().edge())
            .mend(
                first.outside()
                    ? "Give points of that edge that reach further."
                    : "Give the device's own curve (kind: points).");
    return builder.notJudged(
        List.of(path),
        "In "
            + starts
            + (starts == 1 ? " start " : " starts ")
            + device.tag()
            + what
            + first.why()
            + ". The first: "
            + first.start().words()
            + ", "
            + first.start().corner().words()
            + ", "
            + first.response().edge().word()
            + " edge.");
  }
}
