package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.curve.TripClassBounds;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.SectionElement;
import sliprung.protection.StartProtection;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Device;
import sliprung.starter.Motor;
import sliprung.starter.Starter;

/**
 * The earliest restart after a stop, a trip, a held and a locked start, over every corner.
 *
 * <p>Every element here is linear and forgets exponentially, so that a start on what is left of
 * level L comes at most to L·exp(−t/τ) plus what the same start makes from cold. The pause is
 * therefore {@code t = τ ln(L/(1 − u))}, with u the use of a start from cold: late rather than
 * early. Sections forget with their own time constant or the enclosure's, whichever is longer,
 * windings with the motor's at rest, overload relays with the longest that their class allows.
 */
public final class Restarts {
  private static final double INSTANT = 1e-3;
  private static final double GREATEST_PICK_UP = 1.20;

  private final Facts facts;
  private final Starter starter;
  private final ProtectionEvaluator evaluator;

  private Restarts(Facts facts) {
    this.facts = facts;
    this.starter = facts.starter();
    this.evaluator = new ProtectionEvaluator(starter, facts.machine());
  }

  /** Paths of inputs without which no restart can be told. */
  static List<String> missing(Facts facts) {
    List<String> missing = new ArrayList<>();
    facts.permitted().findFirst().stream()
        .flatMap(s -> s.parts().stream())
        .filter(p -> isHeated(p.part()))
        .forEach(p -> p.missing().ifPresent(missing::add));
    // the starts may have been computed with other sections than these
    for (int k = 1; k <= facts.starter().sectionCount(); k++) {
      SectionElement.missing(facts.starter().resistors(), k).ifPresent(missing::add);
    }
    Motor motor = facts.starter().motor();
    if (motor.coolingSeconds().isEmpty() && !missing.contains("motor.cooling")) {
      missing.add("motor.cooling");
    }
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Overload
          && facts.bands().unknown(device, Edge.FAST).isPresent()) {
        missing.add("protection." + device.tag() + ".curve");
      }
    }
    return missing.stream().distinct().toList();
  }

  /**
   * The latest of the earliest restarts over the corners, by what came before; empty where inputs
   * are missing or nothing was computed. For a table in a record.
   */
  public static List<Restart> of(Facts facts) {
    if (!missing(facts).isEmpty()) {
      return List.of();
    }
    Restarts restarts = new Restarts(facts);
    return latest(
        facts
            .permitted()
            .filter(s -> s.place() == 1 && s.from() == ComputedStart.From.COLD)
            .flatMap(s -> restarts.at(s).stream())
            .toList());
  }

  /** Of several restarts after the same the latest, in the order of what came before. */
  public static List<Restart> latest(List<Restart> of) {
    Map<Restart.After, Restart> worst = new EnumMap<>(Restart.After.class);
    of.forEach(r -> worst.merge(r.after(), r, Restarts::later));
    return List.copyOf(worst.values());
  }

  private static Restart later(Restart a, Restart b) {
    if (a.pastLimit() != b.pastLimit()) {
      return a.pastLimit() ? a : b;
    }
    return b.seconds() > a.seconds() ? b : a;
  }

  private static boolean isHeated(String part) {
    return part.startsWith("section-") || part.equals("stator") || part.equals("rotor");
  }

  /** Every case at the corner of one permitted start from cold. */
  private List<Restart> at(ComputedStart permitted) {
    Optional<RunningPoint> running =
        facts.running().getOrDefault(permitted.corner(), Optional.empty());
    double stator = running.map(r -> r.point().statorAmps()).orElse(starter.motor().current());
    double ring =
        running.map(r -> r.point().ringAmps()).orElse(starter.motor().rotorCurrent().orElse(0.0));
    StartProtection start = evaluator.over(CutHistory.startOnly(permitted.history()));
    Map<String, Double> fromCold = levels(start, PartPreload.COLD, DevicePreload.COLD);
    int inARow = Math.max(1, Math.max(starter.duty().coldStarts(), starter.duty().hotStarts()));
    List<Double> series = start.sectionLevelsAfter(PartPreload.COLD, inARow);
    PartPreload hot = new PartPreload(stator, ring, 0.0, series);
    DevicePreload warm = DevicePreload.running(stator, ring);

    List<Restart> found = new ArrayList<>();
    // stopped from running: the first instant of a start on that state shows the state itself
    StartProtection instant = evaluator.over(CutHistory.until(permitted.history(), INSTANT));
    Map<String, Double> stopped =
        levels(instant, new PartPreload(stator, ring, 0.0, List.of()), warm);
    found.add(restart(Restart.After.STOP, permitted, stopped, fromCold));
    Map<String, Double> tripped = levels(start, hot, warm);
    for (int k = 1; k <= series.size(); k++) {
      tripped.put("section-" + k, series.get(k - 1));
    }
    relays().forEach(r -> tripped.put(r.tag(), 1.0));
    found.add(restart(Restart.After.TRIP, permitted, tripped, fromCold));
    if (!starter.duty().pastStartsSeconds().isEmpty()) {
      found.add(restart(Restart.After.PAST, permitted, left(stopped, fromCold), fromCold));
    }
    for (ComputedStart fault : facts.starts()) {
      Optional<Restart.After> after = after(fault);
      if (after.isPresent() && fault.corner().equals(permitted.corner())) {
        found.add(failed(after.get(), fault, hot, warm, fromCold));
      }
    }
    return found;
  }

  /** What the running before the first of the past starts and each of them have left by now. */
  private Map<String, Double> left(Map<String, Double> running, Map<String, Double> fromCold) {
    List<Double> ago = starter.duty().pastStartsSeconds();
    double oldest = ago.stream().mapToDouble(a -> a).max().orElseThrow();
    Map<String, Double> left = new LinkedHashMap<>();
    fromCold.forEach(
        (name, ofOneStart) -> {
          double tau = forgets(name);
          double level = running.get(name) * Math.exp(-oldest / tau);
          for (double seconds : ago) {
            level += ofOneStart * Math.exp(-seconds / tau);
          }
          left.put(name, level);
        });
    return left;
  }

  private static Optional<Restart.After> after(ComputedStart fault) {
    if (fault.from() != ComputedStart.From.HOT) {
      return Optional.empty();
    }
    Scenario.Kind kind = fault.scenario().kind();
    if (kind == Scenario.Kind.HELD) {
      return Optional.of(Restart.After.HELD);
    }
    return kind == Scenario.Kind.LOCKED || kind == Scenario.Kind.LOCKED_STEP
        ? Optional.of(Restart.After.LOCKED)
        : Optional.empty();
  }

  private Restart failed(
      Restart.After after,
      ComputedStart fault,
      PartPreload hot,
      DevicePreload warm,
      Map<String, Double> fromCold) {
    Exposure exposure = Exposure.of(facts, fault);
    StartProtection cut =
        evaluator.over(CutHistory.until(fault.history(), exposure.clearedAtSeconds()));
    Map<String, Double> levels = levels(cut, hot, warm);
    exposure.clearing().ifPresent(c -> levels.computeIfPresent(c.device(), (tag, level) -> 1.0));
    return restart(after, fault, levels, fromCold);
  }

  /** Greatest level of every heated part and thermal relay over a history. */
  private Map<String, Double> levels(
      StartProtection over, PartPreload parts, DevicePreload devices) {
    Map<String, Double> levels = new LinkedHashMap<>();
    for (PartResponse part : over.parts(parts, 1, Restarts::isHeated)) {
      levels.put(part.part(), part.use());
    }
    Map<String, Double> uses = new HashMap<>();
    for (DeviceResponse response : over.devices(Edge.FAST, devices, 1)) {
      uses.put(response.device(), response.use());
    }
    for (Device relay : relays()) {
      double use = Math.min(1.0, uses.get(relay.tag()));
      levels.put(
          relay.tag(),
          relay instanceof Device.Temperature sensor
              ? Math.max(use, hottestElement(sensor, levels))
              : use);
    }
    return levels;
  }

  /** The hottest element that a sensor follows, over its own limit: it still rises towards that. */
  private double hottestElement(Device.Temperature sensor, Map<String, Double> levels) {
    double hottest = 0.0;
    for (int number : sensor.sections()) {
      double limit =
          SectionElement.limitRiseKelvin(starter.resistors().sections().get(number - 1))
              .orElse(Double.POSITIVE_INFINITY);
      double level = levels.get("section-" + number) * limit / sensor.leastRiseKelvin();
      hottest = Math.max(hottest, level);
    }
    return hottest;
  }

  private List<Device> relays() {
    return starter.protection().stream()
        .filter(
            d ->
                d instanceof Device.Overload
                    || d instanceof Device.Thermal
                    || d instanceof Device.Temperature)
        .toList();
  }

  private Restart restart(
      Restart.After after,
      ComputedStart start,
      Map<String, Double> levels,
      Map<String, Double> fromCold) {
    double latest = 0.0;
    String by = "";
    boolean past = false;
    for (Map.Entry<String, Double> level : levels.entrySet()) {
      boolean part = isHeated(level.getKey());
      boolean over = part && level.getValue() >= 1.0;
      double room = 1.0 - fromCold.get(level.getKey());
      double pause =
          room <= 0.0
              ? Double.POSITIVE_INFINITY
              : level.getValue() > room ? pause(level.getKey(), level.getValue() / room) : 0.0;
      if (over && !past || over == past && pause > latest) {
        latest = pause;
        by = level.getKey();
        past |= over;
      }
    }
    return new Restart(after, latest, by, past, start);
  }

  /**
   * How long a level takes to fall by a factor, s. A sensor follows an element that cools: with τ
   * the longer of both time constants it falls no later than {@code (1 + t/τ) exp(−t/τ)}, which two
   * equal ones give.
   */
  private double pause(String name, double factor) {
    double tau = forgets(name);
    boolean follows = starter.device(name).filter(d -> d instanceof Device.Temperature).isPresent();
    if (!follows) {
      return tau * Math.log(factor);
    }
    double low = 0.0;
    double high = 100.0;
    for (int halving = 0; halving < 60; halving++) {
      double x = 0.5 * (low + high);
      if ((1.0 + x) * Math.exp(-x) * factor > 1.0) {
        low = x;
      } else {
        high = x;
      }
    }
    return tau * high;
  }

  /** Time constant in s at rest. */
  private double forgets(String name) {
    if (name.startsWith("section-")) {
      int number = Integer.parseInt(name.substring("section-".length()));
      return Math.max(
          SectionElement.of(starter.resistors(), number).orElseThrow().timeConstantSeconds(),
          starter.resistors().enclosureSeconds());
    }
    if (isHeated(name)) {
      return starter.motor().coolingSeconds().orElseThrow();
    }
    Device device = starter.device(name).orElseThrow();
    if (device instanceof Device.Temperature sensor) {
      double longest = sensor.lagSeconds() * (1.0 + sensor.accuracy().time());
      for (int number : sensor.sections()) {
        longest = Math.max(longest, forgets("section-" + number));
      }
      return longest;
    }
    if (device instanceof Device.Thermal thermal) {
      return thermal.timeConstantSeconds() * (1.0 + thermal.accuracy().time());
    }
    return TripClassBounds.slowTimeConstant(
        ((Device.Overload) device).tripClass(), GREATEST_PICK_UP, 1.0);
  }
}
