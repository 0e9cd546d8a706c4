package sliprung.rulebook.shortcircuit;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.contactor.BandTimes;
import sliprung.rulebook.contactor.Crossing;
import sliprung.rulebook.contactor.OperatingTimes;
import sliprung.rulebook.contactor.ShortCircuitDevices;
import sliprung.starter.Device;

/**
 * {@code short-circuit/minimum}: the least fault current at the starter is cleared within five
 * seconds at the slow edges.
 *
 * <p>Margin: the current of a fault between two phases, √3/2 of the least three-phase fault
 * current, over the least current that is cleared in that time. The fault at the cable's end is not
 * modelled.
 */
public final class TheLeastFaultCurrentIsCleared implements Rule {
  private static final double LEAST_SHARE_OF_RATED = 0.05;

  private static final Info INFO =
      new Info(
          "short-circuit/minimum",
          "Does the least fault current operate the short-circuit device in time?",
          "IEC 60364-4-43, 434.5.2: five seconds (from memory)",
          List.of("supply.fault-current", "protection", "breakers"));

  private final Function<Facts, OperatingTimes> times;

  /** With the operating times of the devices' bands. */
  public TheLeastFaultCurrentIsCleared() {
    this(BandTimes::new);
  }

  TheLeastFaultCurrentIsCleared(Function<Facts, OperatingTimes> times) {
    this.times = times;
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    ShortCircuitDevices devices = ShortCircuitDevices.of(facts.starter());
    return devices.isEmpty()
        ? new Answer.NotApplicable("no short-circuit device is described in the stator line")
        : new Answer.Findings(List.of(judge(facts, devices)));
  }

  private Finding judge(Facts facts, ShortCircuitDevices devices) {
    FindingBuilder builder =
        FindingBuilder.of(facts, INFO, devices.tags()).edge(sliprung.protection.Edge.SLOW);
    OptionalDouble least = facts.starter().supply().faultMinAmps();
    if (least.isEmpty()) {
      return builder.notJudged(
          List.of("supply.fault-current.min"),
          "The least fault current is not given: whether "
              + devices.tags()
              + " would see it is open.");
    }
    List<Device> unknown =
        devices.devices().stream()
            .filter(d -> facts.bands().unknown(d, sliprung.protection.Edge.SLOW).isPresent())
            .toList();
    if (!unknown.isEmpty() && unknown.size() == devices.devices().size()) {
      return builder
          .mend("Give the device's own curve as points.")
          .notJudged(
              unknown.stream().map(d -> "protection." + d.tag() + ".curve").toList(),
              "Whether "
                  + devices.tags()
                  + " sees the least fault current is open: "
                  + facts.bands().unknown(unknown.get(0), sliprung.protection.Edge.SLOW).get()
                  + ".");
    }
    double seconds = facts.practice().figure("short-circuit.seconds").value();
    double amps =
        facts.practice().figure("short-circuit.two-phase-share").value() * least.getAsDouble();
    OperatingTimes law = times.apply(facts);
    OptionalDouble needed =
        Crossing.leastFirst(
            i -> devices.clearedBySeconds(law, i, Double.POSITIVE_INFINITY),
            i -> seconds,
            Math.min(LEAST_SHARE_OF_RATED * facts.starter().motor().current(), 0.5 * amps),
            Math.max(100.0 * amps, 1e5));
    double margin = needed.isPresent() ? amps / needed.getAsDouble() : 0.0;
    double clears = devices.clearedBySeconds(law, amps, Double.POSITIVE_INFINITY);
    return builder
        .margin(margin)
        .figures(amps, needed.orElse(Double.NaN), "A")
        .says(
            "A fault between two phases draws at least "
                + Show.amps(amps)
                + " at the starter; "
                + devices.tags()
                + (Double.isInfinite(clears)
                    ? " is not sure to clear it."
                    : " clears it within " + Show.seconds(clears) + ".")
                + (needed.isPresent()
                    ? " Within "
                        + Show.seconds(seconds)
                        + " it clears from "
                        + Show.amps(needed.getAsDouble())
                        + " on."
                    : "")
                + " At the cable's end there is less, and an earth fault may be less again:"
                + " neither is computed here.")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Take a smaller fuse or a lower pick-up, or fit an earth-fault relay."
                : "")
        .byMargin();
  }
}
