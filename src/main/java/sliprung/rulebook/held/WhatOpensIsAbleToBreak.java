package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Device;

/** {@code held/opens-what}: a device that clears opens something able to break that current. */
public final class WhatOpensIsAbleToBreak implements Rule {
  private static final Info INFO =
      new Info(
          "held/opens-what",
          "Does every device that clears a failed start open something able to break that current?",
          "IEC 60947-4-1 table 7",
          List.of("contactors", "breakers", "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device.trips().isPresent()) {
        judge(facts, device, device.trips().get()).ifPresent(findings::add);
      }
    }
    return Answer.of(findings, "no device clears a failed start by opening something");
  }

  private static Optional<Finding> judge(Facts facts, Device device, String opens) {
    ComputedStart worst = null;
    DeviceResponse response = null;
    double greatest = 0.0;
    for (ComputedStart start : facts.starts()) {
      if (!start.scenario().isFault()) {
        continue;
      }
      for (Edge edge : List.of(Edge.FAST, Edge.SLOW)) {
        Optional<DeviceResponse> found = start.device(device.tag(), edge);
        if (found.isEmpty() || !found.get().operates() || cleared(facts, start, found.get())) {
          continue;
        }
        double amps = Exposure.statorAmpsAt(start.history(), found.get().operatesAtSeconds());
        if (amps > greatest) {
          greatest = amps;
          worst = start;
          response = found.get();
        }
      }
    }
    if (worst == null) {
      return Optional.empty();
    }
    FindingBuilder builder =
        FindingBuilder.of(facts, INFO, device.tag()).at(worst).edge(response.edge());
    String sentence =
        device.tag()
            + " opens "
            + opens
            + " at "
            + Show.amps(greatest)
            + " after "
            + Show.seconds(response.operatesAtSeconds())
            + ": "
            + worst.scenario().words()
            + ".";
    boolean rotorSide =
        facts.starter().breaker(opens).isEmpty()
            && facts.starter().lineContactors().stream().noneMatch(c -> c.tag().equals(opens));
    if (rotorSide) {
      return Optional.of(
          builder
              .margin(0.0)
              .says(sentence + " " + opens + " is in the rotor circuit and clears nothing.")
              .mend("Let it open the line contactor.")
              .byMargin());
    }
    Optional<BreakingCapacity> capacity = BreakingCapacity.of(facts, opens);
    if (capacity.isEmpty()) {
      return Optional.of(
          builder.notJudged(
              List.of(BreakingCapacity.missingPath(facts, opens)),
              sentence + " Nothing proves what " + opens + " can break."));
    }
    double limit = capacity.get().amps();
    return Optional.of(
        builder
            .margin(limit / greatest)
            .figures(greatest, limit, "A")
            .says(
                sentence
                    + " It is proven to break "
                    + Show.amps(limit)
                    + " ("
                    + capacity.get().basis()
                    + ").")
            .mend(limit < greatest ? "Let it open a breaker, or block it above that current." : "")
            .byMargin());
  }

  /** Whether another device has, at its slow edge, already cleared this start. */
  private static boolean cleared(Facts facts, ComputedStart start, DeviceResponse response) {
    Exposure others = Exposure.of(facts, start, List.of(response.device()));
    return others.clearedAtSeconds() < response.operatesAtSeconds();
  }
}
