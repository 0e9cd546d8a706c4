package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Device;

/** {@code trip/start}: no device operates in any permitted start, each series to its end. */
public final class NoDeviceOperatesInAPermittedStart implements Rule {
  private static final Info INFO =
      new Info(
          "trip/start",
          "Does every device ride through every permitted start, cold and hot, to the end of its"
              + " series?",
          "IEC 60947-4-1 trip classes; common practice",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "timer-spread",
              "level-spread",
              "duty",
              "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      // An instantaneous element is asked by trip/closing-peak.
      if (!(device instanceof Device.Instantaneous)) {
        findings.add(judge(facts, device));
      }
    }
    return Answer.of(findings, "no device is fitted");
  }

  private static Finding judge(Facts facts, Device device) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, device.tag()).edge(Edge.FAST);
    Nearest nearest = null;
    Nearest certain = null;
    ComputedStart unknown = null;
    for (ComputedStart start : facts.permitted().toList()) {
      DeviceResponse found = start.device(device.tag(), Edge.FAST).orElseThrow();
      if (found.notJudged().isPresent()) {
        unknown = unknown == null ? start : unknown;
        continue;
      }
      boolean thinner = nearest == null || isBelow(device, found, nearest.margin());
      boolean sure = found.bound().isEmpty();
      boolean surelyThinner = sure && (certain == null || isBelow(device, found, certain.margin()));
      if (thinner || surelyThinner) {
        Nearest here = new Nearest(start, found, margin(device, found));
        nearest = thinner ? here : nearest;
        certain = surelyThinner ? here : certain;
      }
    }
    if (certain != null && certain.margin() < 1.0) {
      return byMargin(facts, builder, device, certain);
    }
    if (unknown != null) {
      boolean current = device.measuresCurrent();
      return builder
          .at(unknown)
          .mend(current ? "Give the device's own curve as points." : "Give what it needs.")
          .notJudged(
              List.of(current ? "protection." + device.tag() + ".curve" : "resistors.sections"),
              unknown.device(device.tag(), Edge.FAST).orElseThrow().notJudged().orElseThrow());
    }
    if (nearest.margin() < 1.0) {
      return builder
          .at(nearest.start())
          .figures(nearest.response().use(), 1.0, "share of operation")
          .notJudged(
              List.of("protection." + device.tag() + ".curve"),
              says(device, nearest.start(), nearest.response(), nearest.margin())
                  + " "
                  + nearest.response().bound().orElseThrow());
    }
    return byMargin(facts, builder, device, nearest);
  }

  /** The start that comes nearest to operating the device, of those looked at. */
  private record Nearest(ComputedStart start, DeviceResponse response, double margin) {}

  private static Finding byMargin(
      Facts facts, FindingBuilder builder, Device device, Nearest nearest) {
    builder
        .at(nearest.start())
        .figures(nearest.response().use(), 1.0, "share of operation")
        .margin(nearest.margin())
        .says(says(device, nearest.start(), nearest.response(), nearest.margin()))
        .mend(mend(device, nearest.margin()));
    Optional<Double> classAlone = classAlone(facts, device);
    if (classAlone.isPresent() && classAlone.get() > facts.wanted(INFO.name())) {
      builder.wanted(classAlone.get());
    }
    return builder.byMargin();
  }

  /** Timers have no current margin: how much longer the start may take. */
  private static double margin(Device device, DeviceResponse response) {
    return isTimer(device)
        ? response.stretchMargin().orElseThrow()
        : response.currentMargin().orElseThrow();
  }

  private static boolean isTimer(Device device) {
    return device instanceof Device.SequenceTimer
        || device instanceof Device.Standstill
        || device instanceof Device.StepProof;
  }

  /** Whether the margin is below another: asked first, since it costs less than the margin. */
  private static boolean isBelow(Device device, DeviceResponse response, double least) {
    return isTimer(device)
        ? response.stretchMargin().orElseThrow() < least
        : response.margins().orElseThrow().currentBelow(least);
  }

  /** The margin under which a trip class alone proves nothing more than tight. */
  private static Optional<Double> classAlone(Facts facts, Device device) {
    if (!(device instanceof Device.Overload overload)) {
      return Optional.empty();
    }
    String digits = overload.tripClass().name().replaceAll("[^0-9]", "");
    int number = Integer.parseInt(digits);
    String key = number <= 10 ? "10" : number <= 20 ? "20" : "30";
    return Optional.of(facts.practice().figure("class-alone." + key).value());
  }

  private static String says(
      Device device, ComputedStart start, DeviceResponse response, double margin) {
    if (response.operates()) {
      return device.tag()
          + " trips after "
          + Show.seconds(response.operatesAtSeconds())
          + " of a "
          + start.words()
          + (start.history().runUpSeconds().isPresent()
              ? " that takes "
                  + Show.seconds(start.history().runUpSeconds().getAsDouble())
                  + " to run up"
              : "")
          + ", drawing "
          + Show.amps(
              sliprung.rulebook.Exposure.statorAmpsAt(
                  start.history(), response.operatesAtSeconds()))
          + " then.";
    }
    String room =
        Double.isInfinite(margin)
            ? ": nothing near it"
            : isTimer(device)
                ? "; the start may take " + Show.ratio(margin) + " times as long"
                : (device instanceof Device.Undervoltage
                        ? "; the voltage may be " + Show.ratio(margin) + " times lower"
                        : "; the current may be " + Show.ratio(margin) + " times as high")
                    + response.stretchMargin().stream()
                        .filter(Double::isFinite)
                        .mapToObj(s -> ", or the start " + Show.ratio(s) + " times as long")
                        .findFirst()
                        .orElse("");
    return device.tag()
        + " comes to "
        + Show.percent(response.use())
        + " of operating in a "
        + start.words()
        + room
        + ".";
  }

  private static String mend(Device device, double margin) {
    if (Double.isInfinite(margin) || margin >= 1.4) {
      return "";
    }
    Map<Class<?>, String> cures =
        Map.of(
            Device.Overload.class,
            "Give the relay's own curve, take a higher class if the motor allows it, or pause before"
                + " a hot restart.",
            Device.SequenceTimer.class,
            "Set it longer.",
            Device.StepProof.class,
            "Set it longer.",
            Device.Undervoltage.class,
            "Lower its voltage, lengthen its delay, or stiffen the supply.",
            Device.Temperature.class,
            "Raise its limit as far as the sections allow, or shorten the series of starts.",
            Device.Fuse.class,
            "Take a higher rating under the declared coordination.");
    return cures.getOrDefault(device.getClass(), "Raise its pick-up or its time.");
  }
}
