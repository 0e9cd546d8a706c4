package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Device;
import sliprung.tolerance.Corner;

/** {@code trip/running}: at running load nothing creeps to a trip. */
public final class NothingCreepsToATripInService implements Rule {
  private static final Info INFO =
      new Info(
          "trip/running",
          "At running load, over the supply band and the load's spread, does nothing creep to a trip?",
          "IEC 60947-4-1 non-trip limits; common practice",
          List.of("supply.band", "motor", "load.running", "load.spread", "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Map.Entry<Corner, Optional<RunningPoint>> corner : facts.running().entrySet()) {
      if (corner.getValue().isEmpty()) {
        FindingBuilder builder = FindingBuilder.of(facts, INFO, "motor");
        cold(facts, corner.getKey()).ifPresent(builder::at);
        return new Answer.Findings(
            List.of(
                builder
                    .margin(0.0)
                    .says(
                        "At "
                            + corner.getKey().words()
                            + " the motor cannot carry the running torque: its breakdown torque is"
                            + " less.")
                    .mend("Lower load.running, or correct the motor's data.")
                    .byMargin()));
      }
    }
    for (Device device : facts.starter().protection()) {
      if (!device.measuresCurrent() || device.fitting().place() == Device.Place.BANK) {
        continue;
      }
      Double pickUp = facts.fastPickUps().get(device.tag());
      if (pickUp != null) {
        findings.add(judge(facts, device, pickUp));
      } else {
        // Unknown is not the same as none: a class without a shortest time has a pick-up that
        // nobody
        // pins.
        facts
            .bands()
            .unknown(device, Edge.FAST)
            .map(why -> unknown(facts, device, why))
            .ifPresent(findings::add);
      }
    }
    return Answer.of(findings, "no device measures current in service");
  }

  private static Finding unknown(Facts facts, Device device, String why) {
    return FindingBuilder.of(facts, INFO, device.tag())
        .edge(Edge.FAST)
        .mend("Give the device's own curve as points.")
        .notJudged(List.of("protection." + device.tag() + ".curve"), why);
  }

  private static Finding judge(Facts facts, Device device, double pickUp) {
    Corner worst = null;
    double greatest = 0.0;
    for (Map.Entry<Corner, Optional<RunningPoint>> corner : facts.running().entrySet()) {
      RunningPoint running = corner.getValue().orElseThrow();
      double amps =
          device.fitting().place() == Device.Place.ROTOR
              ? running.point().ringAmps()
              : running.point().statorAmps();
      if (worst == null || amps > greatest) {
        greatest = amps;
        worst = corner.getKey();
      }
    }
    FindingBuilder builder = FindingBuilder.of(facts, INFO, device.tag()).edge(Edge.FAST);
    cold(facts, worst).ifPresent(builder::at);
    double margin = pickUp / greatest;
    return builder
        .margin(margin)
        .figures(greatest, pickUp, "A")
        .says(
            "Running draws up to "
                + Show.amps(greatest)
                + " at "
                + worst.words()
                + "; "
                + device.tag()
                + " may begin to operate at "
                + Show.amps(pickUp)
                + ".")
        .mend(margin < 1.1 ? "Raise its dial, or lower the running load." : "")
        .byMargin();
  }

  private static Optional<ComputedStart> cold(Facts facts, Corner corner) {
    return facts.find(Scenario.PERMITTED, ComputedStart.From.COLD, corner);
  }
}
