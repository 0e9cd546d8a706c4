package sliprung.rulebook.overload;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeSet;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * {@code overload/rotor}: the resistor bank is protected without any overload relay of the motor.
 *
 * <p>Margin: least clearing ratio of a held or skipped step without those relays; none below 1.
 * Below the wanted one it is tight, never a breach: whether anything clears in time is {@code
 * held/exposure}.
 */
public final class NoOverloadIsCreditedWithTheBank implements Rule {
  private static final Info INFO =
      new Info(
          "overload/rotor",
          "Is the bank protected without crediting an overload relay of the motor?",
          "common practice; NFPA 70 430.32(E) where the practice is nec",
          List.of("motor", "load", "resistors", "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    List<ComputedStart> held = held(facts);
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Overload) {
        findings.add(judge(facts, device, held));
      }
    }
    return Answer.of(findings, "no overload relay is described");
  }

  private static List<ComputedStart> held(Facts facts) {
    return facts.starts().stream()
        .filter(
            s ->
                s.scenario().kind() == Scenario.Kind.HELD
                    || s.scenario().kind() == Scenario.Kind.SKIPPED)
        .toList();
  }

  private static Finding judge(Facts facts, Device overload, List<ComputedStart> held) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, overload.tag()).edge(Edge.SLOW);
    if (overload.fitting().place() == Device.Place.BANK) {
      return builder
          .says(
              overload.tag()
                  + " measures in the resistor leads: it is a relay of the bank itself, and the"
                  + " held steps judge it.")
          .build(Verdict.CLEAR);
    }
    if (held.isEmpty()) {
      return builder.notJudged(List.of(), "No held step was computed.");
    }
    List<String> relays =
        facts.starter().protection().stream()
            .filter(d -> d instanceof Device.Overload && d.fitting().place() != Device.Place.BANK)
            .map(Device::tag)
            .toList();
    Exposure worst =
        held.stream()
            .map(s -> Exposure.of(facts, s, relays))
            .min(
                Comparator.comparingDouble(Exposure::clearingRatio)
                    .thenComparingDouble(Exposure::limitAtSeconds))
            .orElseThrow();
    String sees = sees(overload, held) + code(facts);
    if (!worst.missing().isEmpty()) {
      return builder.notJudged(worst.missing(), sees + " What a held step heats is not known.");
    }
    double ratio = worst.clearingRatio();
    builder.at(worst.start()).figures(worst.clearedAtSeconds(), worst.limitAtSeconds(), "s");
    if (ratio >= 1.0) {
      builder.margin(ratio); // a margin below 1 is a breach, and that is held/exposure's
    }
    if (ratio >= Math.max(1.0, facts.wanted(INFO.name()))) {
      return builder
          .says(
              sees
                  + " It is not needed: without it, "
                  + worst.clause()
                  + " ("
                  + worst.start().words()
                  + ").")
          .byMargin();
    }
    return builder
        .says(
            sees
                + " "
                + Exposures.where(worst.start())
                + ": without it, "
                + worst.clause()
                + ". The motor's overload is no protection of the bank: it follows the heat of"
                + " another body, at a dial set for another current.")
        .mend("Fit a sequence timer, or measure the current or temperature of the bank itself.")
        .build(Verdict.TIGHT);
  }

  private static String sees(Device overload, List<ComputedStart> held) {
    TreeSet<Integer> blind = new TreeSet<>();
    double soonest = Double.POSITIVE_INFINITY;
    for (ComputedStart start : held) {
      DeviceResponse response = start.device(overload.tag(), Edge.SLOW).orElse(null);
      if (response == null || !response.operates()) {
        blind.add(start.scenario().step());
      } else {
        soonest = Math.min(soonest, response.operatesAtSeconds());
      }
    }
    if (blind.isEmpty()) {
      return overload.tag()
          + " trips on every held step, after "
          + Show.seconds(soonest)
          + " at the earliest of its latest.";
    }
    return overload.tag()
        + " sees nothing of the bank held on step "
        + String.join(", ", blind.stream().map(String::valueOf).toList())
        + ".";
  }

  private static String code(Facts facts) {
    return facts.starter().practice() == Starter.Practice.NEC
        ? " NFPA 70 counts the secondary circuit as protected by it (430.32(E)); the physics does"
            + " not."
        : "";
  }
}
