package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceTrial;
import sliprung.protection.Edge;
import sliprung.protection.PartPreload;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * Tries devices that are not fitted, or fitted with another setting, on every computed start: every
 * good start must pass their fast edge with the wanted margin, every held or skipped step must be
 * cleared by their slow edge before its first limit with the wanted clearing ratio. Before a failed
 * start a device counts as cold, which is late and never early.
 */
final class HeldStepTrials {
  private final Facts facts;
  private final ProtectionEvaluator evaluator;
  private final List<ComputedStart> good;
  private final List<ComputedStart> failed;
  private final Map<ComputedStart, StartProtection> over = new IdentityHashMap<>();
  private final Map<ComputedStart, DevicePreload> preloads = new IdentityHashMap<>();
  private final double clearingRatio;

  HeldStepTrials(Facts facts) {
    this.facts = facts;
    this.evaluator = new ProtectionEvaluator(facts.starter(), facts.machine());
    this.good = facts.permitted().toList();
    this.failed = new ArrayList<>();
    this.clearingRatio = facts.wanted("held/exposure");
    for (ComputedStart start : facts.starts()) {
      Scenario.Kind kind = start.scenario().kind();
      boolean held = kind == Scenario.Kind.HELD || kind == Scenario.Kind.SKIPPED;
      if (held && Double.isFinite(limit(start))) {
        failed.add(start);
      }
    }
  }

  /** When the first part of a start reaches its limit, s. */
  private double limit(ComputedStart start) {
    return Exposure.of(facts, start).limitAtSeconds();
  }

  /** What a device that is added opens: a line contactor proven to break, else a breaker. */
  Optional<String> opens() {
    Starter starter = facts.starter();
    List<String> line = new ArrayList<>();
    starter.lineContactors().stream().map(Contactor::tag).forEach(line::add);
    starter.breakers().forEach(b -> line.add(b.tag()));
    return line.stream().filter(tag -> BreakingCapacity.of(facts, tag).isPresent()).findFirst();
  }

  /**
   * The window of a setting.
   *
   * @param device of a setting; it opens what {@link #opens} names or what it already opens
   * @param margin by which its setting is divided where good starts are tried
   */
  SettingWindow.Search window(
      DoubleFunction<Device> device, double from, double to, double margin) {
    return SettingWindow.between(
        from,
        to,
        setting -> uncleared(device.apply(setting)),
        setting -> tripped(device.apply(setting / margin)));
  }

  private Optional<ComputedStart> uncleared(Device device) {
    DeviceTrial trial = new DeviceTrial(device, facts.starter());
    String opens = device.trips().orElse("");
    double opening = facts.starter().openingSeconds(opens).orElse(Double.POSITIVE_INFINITY);
    double breaks = BreakingCapacity.of(facts, opens).map(BreakingCapacity::amps).orElse(0.0);
    for (ComputedStart start : failed) {
      OptionalDouble operates =
          trial.operatesSeconds(over(start), Edge.SLOW, DevicePreload.COLD, 1);
      double at = operates.orElse(Double.POSITIVE_INFINITY);
      boolean clears =
          at + opening <= limit(start) / clearingRatio
              && Exposure.statorAmpsAt(start.history(), at) <= breaks;
      if (!clears) {
        // the next setting is likely to fail in the same start: it is asked first
        failed.remove(start);
        failed.add(0, start);
        return Optional.of(start);
      }
    }
    return Optional.empty();
  }

  private Optional<ComputedStart> tripped(Device device) {
    DeviceTrial trial = new DeviceTrial(device, facts.starter());
    for (ComputedStart start : good) {
      OptionalDouble operates =
          trial.operatesSeconds(over(start), Edge.FAST, preload(start), start.place());
      if (operates.isEmpty() || operates.getAsDouble() < Double.POSITIVE_INFINITY) {
        return Optional.of(start);
      }
    }
    return Optional.empty();
  }

  private StartProtection over(ComputedStart start) {
    return over.computeIfAbsent(start, s -> evaluator.over(s.history()));
  }

  private DevicePreload preload(ComputedStart start) {
    if (start.from() == ComputedStart.From.COLD) {
      return DevicePreload.COLD;
    }
    return preloads.computeIfAbsent(start, this::warm);
  }

  private DevicePreload warm(ComputedStart start) {
    Optional<RunningPoint> running = facts.running().getOrDefault(start.corner(), Optional.empty());
    double stator =
        running.map(r -> r.point().statorAmps()).orElse(facts.starter().motor().current());
    double ring =
        running
            .map(r -> r.point().ringAmps())
            .orElse(facts.starter().motor().rotorCurrent().orElse(0.0));
    int before = Math.max(1, facts.starter().duty().coldStarts());
    return DevicePreload.running(stator, ring)
        .onWarmBank(over(start).sectionLevelsAfter(PartPreload.COLD, before));
  }
}
