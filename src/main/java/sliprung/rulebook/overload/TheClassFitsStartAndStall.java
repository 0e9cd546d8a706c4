package sliprung.rulebook.overload;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import sliprung.curve.TripClass;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.ProtectionEvaluator;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.starter.Device;

/**
 * {@code overload/class}: the trip class of an overload relay rides through the permitted starts,
 * and a rotor at rest with rings shorted is cleared within its limits, by it or by another device.
 *
 * <p>Margin: the factor on the current of a permitted start at which the class's earliest relay
 * would trip. Where nothing clears the stall in time it is at best tight.
 */
public final class TheClassFitsStartAndStall implements Rule {
  private static final String KEY = "trip-class.";

  private static final Info INFO =
      new Info(
          "overload/class",
          "Does the trip class fit the start and the stall limit, and what does a higher one cost?",
          "IEC 60947-4-1 tables 2 and 3",
          List.of(
              "motor.stall-limit",
              "motor.current",
              "supply.band",
              "load",
              "resistors",
              "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Overload overload
          && overload.fitting().place() == Device.Place.STATOR) {
        findings.add(judge(facts, overload));
      }
    }
    return Answer.of(findings, "no overload relay measures the stator current");
  }

  private static Finding judge(Facts facts, Device.Overload relay) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, relay.tag()).edge(Edge.FAST);
    String name = relay.tripClass().name();
    if (relay.tripClass().shortestSeconds().isEmpty()) {
      return builder.notJudged(
          List.of("protection." + relay.tag() + ".curve"),
          relay.tag()
              + " is of class "
              + name
              + ", which has no shortest time: nothing says that it rides through a start. Its own"
              + " curve, as kind points, would.");
    }
    Optional<ComputedStart> nearest = ComputedStart.nearest(facts.permitted(), relay.tag());
    if (nearest.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    if (facts.starter().motor().stallHotSeconds().isEmpty()) {
      return builder.notJudged(
          List.of("motor.stall-limit"), "How long the motor stands at rest is not given.");
    }
    double margin = margin(nearest.get(), relay.tag()).getAsDouble();
    double wanted = facts.wanted(INFO.name());
    Optional<TripClass> least = leastClass(facts, relay, wanted);
    builder
        .at(nearest.get())
        .margin(margin)
        .says(
            rides(facts, relay, nearest.get(), margin)
                + " "
                + least
                    .map(c -> cost(facts, relay, c))
                    .orElse("No class of the standard rides through with the wanted margin.")
                + stall(facts, relay));
    if (margin < wanted) {
      return builder
          .mend(
              least.map(c -> "Take class " + c.name()).orElse("Shorten the start")
                  + " if the motor allows it, give the relay's own curve, or pause before a hot"
                  + " restart.")
          .byMargin();
    }
    if (!clearedInTime(facts)) {
      return builder
          .mend("Fit a rotation sensor or a stall relay: no class does both here.")
          .byMarginAtBestTight();
    }
    return builder.byMargin();
  }

  private static OptionalDouble margin(ComputedStart start, String tag) {
    return start
        .device(tag, Edge.FAST)
        .map(DeviceResponse::currentMargin)
        .orElse(OptionalDouble.empty());
  }

  private static String rides(
      Facts facts, Device.Overload relay, ComputedStart start, double margin) {
    double longest =
        facts
            .permitted()
            .mapToDouble(s -> s.history().runUpSeconds().orElse(0.0))
            .max()
            .orElse(0.0);
    return "Starts last up to "
        + Show.seconds(longest)
        + "; the earliest relay of class "
        + relay.tripClass().name()
        + " rides through at up to "
        + Show.ratio(margin)
        + " times the current ("
        + start.words()
        + ").";
  }

  private static String cost(Facts facts, Device.Overload relay, TripClass least) {
    if (least.name().equals(relay.tripClass().name())) {
      return "It is the least class that does with the wanted margin.";
    }
    double amps = standing(facts);
    return "The least class that does with the wanted margin is "
        + least.name()
        + ": at rest with the rings shorted, "
        + Show.amps(amps)
        + ", it "
        + trips(seconds(facts, relay, least, amps))
        + ", class "
        + relay.tripClass().name()
        + " "
        + trips(seconds(facts, relay, relay.tripClass(), amps))
        + ".";
  }

  private static String trips(double seconds) {
    return Double.isInfinite(seconds)
        ? "need never trip"
        : "takes up to " + Show.seconds(seconds) + " to trip";
  }

  private static String stall(Facts facts, Device.Overload relay) {
    double amps = standing(facts);
    if (amps <= 0.0) {
      return "";
    }
    String alone =
        " At rest with the rings shorted "
            + relay.tag()
            + " "
            + trips(seconds(facts, relay, relay.tripClass(), amps))
            + " at "
            + Show.amps(amps)
            + why(facts, relay, amps)
            + "; the motor stands "
            + Show.seconds(facts.starter().motor().stallHotSeconds().getAsDouble())
            + " from hot at rated voltage.";
    Optional<Exposure> worst = Exposures.worst(facts, facts.faults(Scenario.Kind.RINGS_SHORTED));
    return alone
        + worst
            .flatMap(Exposure::clearing)
            .filter(d -> !d.device().equals(relay.tag()))
            .map(
                d ->
                    " "
                        + d.device()
                        + " clears that after "
                        + Show.seconds(d.clearsAtSeconds())
                        + ".")
            .orElse("");
  }

  /**
   * Why a relay need never trip: the current lies under what the slowest of its class begins at.
   */
  private static String why(Facts facts, Device.Overload relay, double amps) {
    if (Double.isFinite(seconds(facts, relay, relay.tripClass(), amps))) {
      return "";
    }
    OptionalDouble from = facts.bands().pickUpAmps(relay, Edge.SLOW);
    return from.isPresent()
        ? ", since the slowest relay that the standard allows begins at "
            + Show.amps(from.getAsDouble())
        : "";
  }

  private static boolean clearedInTime(Facts facts) {
    return Exposures.worst(facts, facts.faults(Scenario.Kind.RINGS_SHORTED))
        .map(e -> e.clearingRatio() >= 1.0)
        .orElse(false);
  }

  /** The least current of a rotor at rest with rings shorted, A; 0 where none was computed. */
  private static double standing(Facts facts) {
    return facts
        .faults(Scenario.Kind.RINGS_SHORTED)
        .mapToDouble(s -> s.history().stages().get(0).trace().statorAmps()[0])
        .min()
        .orElse(0.0);
  }

  private static double seconds(
      Facts facts, Device.Overload relay, TripClass tripClass, double amps) {
    return facts
        .bands()
        .operatingSeconds(of(relay, tripClass, relay.tag()), Edge.SLOW, amps)
        .orElse(Double.POSITIVE_INFINITY);
  }

  private static Device.Overload of(Device.Overload relay, TripClass tripClass, String tag) {
    Device.Fitting fitting =
        new Device.Fitting(
            tag, relay.fitting().place(), relay.fitting().trips(), relay.fitting().measuresBy());
    return new Device.Overload(
        fitting,
        tripClass,
        relay.dialAmps(),
        relay.dialMeans(),
        relay.memoryKept(),
        relay.compensated());
  }

  /**
   * The class of least shortest time with the wanted margin in the nearest start of each series.
   */
  private static Optional<TripClass> leastClass(Facts facts, Device.Overload relay, double wanted) {
    List<TripClass> classes = classes(facts);
    ProtectionEvaluator evaluator =
        new ProtectionEvaluator(
            facts
                .starter()
                .withProtection(classes.stream().<Device>map(c -> of(relay, c, c.name())).toList()),
            facts.machine());
    Map<String, Boolean> rides = new LinkedHashMap<>();
    for (ComputedStart start : nearestOfEachSeries(facts, relay.tag())) {
      for (DeviceResponse response :
          evaluator.devices(start.history(), preload(facts, start), start.place())) {
        response
            .margins()
            .ifPresent(
                m -> rides.merge(response.device(), !m.currentBelow(wanted), Boolean::logicalAnd));
      }
    }
    return classes.stream().filter(c -> rides.getOrDefault(c.name(), false)).findFirst();
  }

  private static List<ComputedStart> nearestOfEachSeries(Facts facts, String tag) {
    return facts
        .permitted()
        .collect(
            Collectors.groupingBy(
                s -> s.from().word() + s.place(), java.util.TreeMap::new, Collectors.toList()))
        .values()
        .stream()
        .flatMap(series -> ComputedStart.nearest(series.stream(), tag).stream())
        .toList();
  }

  private static DevicePreload preload(Facts facts, ComputedStart start) {
    if (start.from() == ComputedStart.From.COLD) {
      return DevicePreload.COLD;
    }
    return Optional.ofNullable(facts.running().get(start.corner()))
        .flatMap(r -> r)
        .map(r -> DevicePreload.running(r.point().statorAmps(), r.point().ringAmps()))
        .orElseGet(
            () ->
                DevicePreload.running(
                    facts.starter().motor().current(),
                    facts.starter().motor().rotorCurrent().orElse(0.0)));
  }

  /** The classes with a shortest time that the practice has figures for, least first. */
  public static List<TripClass> classes(Facts facts) {
    return facts.practice().figures().keySet().stream()
        .filter(k -> k.startsWith(KEY) && k.endsWith(".shortest"))
        .map(k -> k.substring(KEY.length(), k.length() - ".shortest".length()))
        .map(name -> tripClass(facts, name))
        .sorted(Comparator.comparingDouble(c -> c.shortestSeconds().getAsDouble()))
        .toList();
  }

  private static TripClass tripClass(Facts facts, String name) {
    var shortest = facts.practice().figure(KEY + name + ".shortest");
    return new TripClass(
        name,
        facts.practice().figure("trip-class.multiple").value(),
        OptionalDouble.of(shortest.value()),
        facts.practice().figure(KEY + name + ".longest").value(),
        OptionalDouble.of(facts.practice().figure(KEY + name + ".warm").value()),
        shortest.clause(),
        shortest.mark());
  }
}
