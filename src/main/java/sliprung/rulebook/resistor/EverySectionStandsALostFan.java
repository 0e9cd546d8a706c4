package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceTrial;
import sliprung.protection.Edge;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.SectionElement;
import sliprung.protection.StartProtection;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Device;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;

/**
 * {@code resistor/fan}: with the fan of the bank lost every section still stands the permitted
 * series and the starts of an hour, or a sensor on its elements ends the start before the limit.
 */
public final class EverySectionStandsALostFan implements Rule {
  private static final Info INFO =
      new Info(
          "resistor/fan",
          "With the fan of the bank lost, does every section stand the permitted starts, or does"
              + " something see it in time?",
          "common practice; ratings as declared for the bank",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors",
              "steps",
              "timer-spread",
              "level-spread",
              "duty",
              "protection"));

  private record Worst(ComputedStart start, PartResponse response) {
    /** Whether the limit is passed within this start, and was not before it. */
    boolean crosses() {
      return response.limitAtSeconds() > 0.0 && Double.isFinite(response.limitAtSeconds());
    }
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Optional<ResistorBank.Fan> fan = facts.starter().resistors().fan();
    if (fan.isEmpty()) {
      return new Answer.NotApplicable("no fan of the bank is described (resistors.fan)");
    }
    FindingBuilder bank = FindingBuilder.of(facts, INFO, "bank");
    if (fan.get().continuousWithout().isEmpty()) {
      return one(
          bank.notJudged(
              List.of("resistors.fan.continuous-without"),
              "The bank has a fan; what its sections carry without it is not given."));
    }
    Optional<Starter> without = WithoutFan.of(facts.starter());
    if (without.isEmpty()) {
      return one(
          bank.notJudged(
              List.of(missing(facts.starter().resistors())),
              "A section of the bank has no usable pair of ratings."));
    }
    if (facts.permitted().findAny().isEmpty()) {
      return one(bank.notJudged(List.of(), "No permitted start was computed."));
    }
    return new Answer.Findings(judge(facts, without.get()));
  }

  private static Answer one(Finding finding) {
    return new Answer.Findings(List.of(finding));
  }

  private static String missing(ResistorBank bank) {
    for (int number = 1; number <= bank.sections().size(); number++) {
      Optional<String> missing = SectionElement.missing(bank, number);
      if (missing.isPresent()) {
        return missing.get();
      }
    }
    return "resistors.sections";
  }

  private static List<Finding> judge(Facts facts, Starter without) {
    Facts derated = WithoutFan.facts(facts, without);
    ProtectionEvaluator evaluator = new ProtectionEvaluator(without, facts.machine());
    List<Worst> worst = new ArrayList<>();
    List<Worst> crossings = new ArrayList<>();
    for (ComputedStart start : facts.permitted().toList()) {
      StartProtection over = evaluator.over(start.history());
      List<PartResponse> parts = over.parts(preload(facts, start, over), start.place());
      for (int k = 0; k < without.sectionCount(); k++) {
        PartResponse part = parts.get(k);
        Worst here = new Worst(start, part);
        if (here.crosses()) {
          crossings.add(here);
        }
        if (worst.size() <= k) {
          worst.add(here);
        } else if (part.missing().isPresent() || part.use() > worst.get(k).response().use()) {
          worst.set(k, here);
        }
      }
    }
    Rule.Answer hour = new EverySectionStandsTheStartsOfAnHour().judge(derated);
    List<Finding> hours =
        hour instanceof Answer.Findings some ? some.findings() : List.<Finding>of();
    List<Finding> findings = new ArrayList<>();
    for (int k = 0; k < worst.size(); k++) {
      String name = worst.get(k).response().part();
      List<Worst> own = crossings.stream().filter(w -> w.response().part().equals(name)).toList();
      findings.add(section(facts, without, evaluator, k + 1, worst.get(k), own, hours.get(k)));
    }
    findings.add(restart(facts, derated));
    return findings;
  }

  /** The pause after a trip, with the slower sections. */
  private static Finding restart(Facts facts, Facts derated) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "restart");
    List<String> missing = Restarts.missing(derated);
    Optional<Restart> trip =
        missing.isEmpty()
            ? Restarts.of(derated).stream().filter(r -> r.after() == Restart.After.TRIP).findFirst()
            : Optional.empty();
    if (trip.isEmpty()) {
      return builder.notJudged(missing, "What a start leaves behind cannot be told.");
    }
    boolean never = Double.isInfinite(trip.get().seconds()) || trip.get().pastLimit();
    return builder
        .at(trip.get().start())
        .figures(trip.get().seconds(), Double.NaN, "s")
        .says(
            never
                ? "Without the fan no pause after a trip is enough: see the sections."
                : "Without the fan it may be started again "
                    + Show.seconds(trip.get().seconds())
                    + " after a trip.")
        .build(never ? Verdict.TIGHT : Verdict.CLEAR);
  }

  /** Sections before a hot start are as the longest series has left them. */
  private static PartPreload preload(Facts facts, ComputedStart start, StartProtection over) {
    int before = Math.max(1, facts.starter().duty().coldStarts());
    return start.from() == ComputedStart.From.COLD
        ? PartPreload.COLD
        : new PartPreload(0.0, 0.0, 0.0, over.sectionLevelsAfter(PartPreload.COLD, before));
  }

  private static Finding section(
      Facts facts,
      Starter without,
      ProtectionEvaluator evaluator,
      int number,
      Worst worst,
      List<Worst> crossings,
      Finding hour) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "section " + number);
    if (worst.response().missing().isPresent()) {
      return builder.notJudged(
          List.of("resistors.fan.time-constant-without"),
          "Without the fan the section's time constant is beyond what is believed of one.");
    }
    double series = worst.response().use();
    String says =
        "Without the fan "
            + Exposure.name("section-" + number).toLowerCase(java.util.Locale.ROOT)
            + " comes to "
            + Show.percent(series)
            + " of its limit in a "
            + worst.start().words();
    if (series >= 1.0) {
      return past(facts, without, evaluator, builder, worst, crossings, says);
    }
    if (hour.value().isEmpty()) {
      return builder.notJudged(
          hour.missing(), says + "; what the starts of an hour make of it cannot be told.");
    }
    double greatest = Math.max(series, hour.value().getAsDouble());
    return builder
        .at(worst.start())
        .margin(1.0 / greatest)
        .figures(greatest, 1.0, "share of limit")
        .says(
            says
                + " and to "
                + Show.percent(hour.value().getAsDouble())
                + " with the permitted starts of an hour.")
        .mend(
            greatest >= 1.0
                ? "Prove the fan before each start, or permit fewer starts an hour without it."
                : "")
        .byMargin();
  }

  /**
   * A permitted start takes it past its limit: does a sensor end each start in which it would pass
   * it before? Starts that find it past already come after one of those.
   */
  private static Finding past(
      Facts facts,
      Starter without,
      ProtectionEvaluator evaluator,
      FindingBuilder builder,
      Worst worst,
      List<Worst> crossings,
      String says) {
    builder
        .at(worst.start())
        .edge(Edge.SLOW)
        .figures(worst.response().use(), 1.0, "share of limit");
    String mend = "Prove the fan before each start (a flow switch, the fan's own contactor).";
    for (Device device : without.protection()) {
      boolean always =
          !crossings.isEmpty()
              && crossings.stream()
                  .allMatch(
                      w ->
                          clears(facts, without, evaluator, device, w.start())
                                  .orElse(Double.POSITIVE_INFINITY)
                              < w.response().limitAtSeconds());
      if (always) {
        return builder
            .says(
                says
                    + "; "
                    + device.tag()
                    + " sees it and ends the start in which it would pass it, before it does.")
            .mend(mend)
            .build(Verdict.TIGHT);
      }
    }
    return builder
        .margin(1.0 / worst.response().use())
        .says(says + ", and no fitted device sees it before.")
        .mend(mend + " Or fit a temperature sensor on its elements.")
        .byMargin();
  }

  /** When a bank temperature sensor has cleared that start at the latest; empty: it does not. */
  private static OptionalDouble clears(
      Facts facts,
      Starter without,
      ProtectionEvaluator evaluator,
      Device device,
      ComputedStart start) {
    if (!(device instanceof Device.Temperature)) {
      return OptionalDouble.empty();
    }
    String opens = device.trips().orElse("");
    OptionalDouble opening = without.openingSeconds(opens);
    Optional<BreakingCapacity> breaks = BreakingCapacity.of(facts, opens);
    StartProtection over = evaluator.over(start.history());
    DevicePreload before =
        DevicePreload.COLD.onWarmBank(preload(facts, start, over).sectionLevels());
    OptionalDouble operates =
        new DeviceTrial(device, without).operatesSeconds(over, Edge.SLOW, before, start.place());
    boolean able =
        operates.isPresent()
            && Double.isFinite(operates.getAsDouble())
            && opening.isPresent()
            && breaks.isPresent()
            && breaks.get().amps()
                >= Exposure.statorAmpsAt(start.history(), operates.getAsDouble());
    return able
        ? OptionalDouble.of(operates.getAsDouble() + opening.getAsDouble())
        : OptionalDouble.empty();
  }
}
