package sliprung.rulebook.conductor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.contactor.BandTimes;
import sliprung.rulebook.contactor.OperatingTimes;
import sliprung.rulebook.contactor.ShortCircuitDevices;
import sliprung.runup.Scenario;
import sliprung.starter.Device;
import sliprung.starter.Supply;

/**
 * {@code conductor/withstand}: the stator cable stands the I²t that flows until a short circuit at
 * the starter is cleared, at every fault current between the least and the greatest; the rotor
 * cable stands a short circuit of its own, which is a rotor at rest with the rings shorted.
 *
 * <p>Margin: k²S² over that I²t; rotor cable: its limit over the clearing time. A fuse's pre-arcing
 * I²t leaves out the arc: where a fuse decides below 0.1 s the wanted margin is the allowance for
 * it.
 */
public final class TheCablesStandAShortCircuit implements Rule {
  private static final int STEPS = 60;

  private static final Info INFO =
      new Info(
          "conductor/withstand",
          "Do the cables stand the I²t until a short circuit is cleared?",
          "IEC 60364-4-43, 434.5.2, up to 5 s",
          List.of("supply.fault-current", "motor", "protection", "breakers", "conductors"));

  private final Function<Facts, OperatingTimes> times;

  /** With the operating times of the devices' bands. */
  public TheCablesStandAShortCircuit() {
    this(BandTimes::new);
  }

  TheCablesStandAShortCircuit(Function<Facts, OperatingTimes> times) {
    this.times = times;
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    return new Answer.Findings(List.of(stator(facts), rotor(facts)));
  }

  private record Worst(
      double jouleIntegral, double amps, double seconds, String tag, boolean fuse) {}

  private Finding stator(Facts facts) {
    Cable cable = Cable.stator(facts.starter());
    FindingBuilder builder = FindingBuilder.of(facts, INFO, cable.subject()).edge(Edge.SLOW);
    if (cable.conductor().isEmpty()) {
      return builder.notJudged(List.of(cable.path()), "The stator cable is not described.");
    }
    Optional<Withstand> withstand = Withstand.of(facts.practice(), cable.conductor().get());
    List<String> missing = new ArrayList<>();
    if (withstand.isEmpty()) {
      missing.add(cable.path() + ".insulation");
    }
    Supply supply = facts.starter().supply();
    if (supply.faultMaxAmps().isEmpty()) {
      missing.add("supply.fault-current");
    }
    if (supply.faultMinAmps().isEmpty()) {
      missing.add("supply.fault-current.min");
    }
    ShortCircuitDevices devices = ShortCircuitDevices.of(facts.starter());
    if (devices.isEmpty()) {
      missing.add("protection");
    }
    if (!devices.isEmpty()
        && devices.devices().stream()
            .allMatch(d -> facts.bands().unknown(d, Edge.SLOW).isPresent())) {
      devices.devices().forEach(d -> missing.add("protection." + d.tag() + ".curve"));
    }
    if (!missing.isEmpty()) {
      return builder.notJudged(
          missing, "What flows in the stator cable until a short circuit is cleared is not known.");
    }
    double least =
        facts.practice().figure("short-circuit.two-phase-share").value()
            * supply.faultMinAmps().getAsDouble();
    Worst worst = worst(facts, devices, least, supply.faultMaxAmps().getAsDouble());
    double limit = withstand.get().jouleIntegral();
    if (Double.isInfinite(worst.jouleIntegral())) {
      return builder
          .margin(0.0)
          .says(
              "Nothing is sure to clear a short circuit of "
                  + Show.amps(worst.amps())
                  + " in the stator cable.")
          .mend("Take a smaller fuse or a lower pick-up.")
          .byMargin();
    }
    double arcless = facts.practice().figure("conductor.arc-counts-below").value();
    boolean arcLeftOut = worst.fuse() && worst.seconds() < arcless;
    double wanted =
        facts.wanted(INFO.name())
            * (arcLeftOut ? facts.practice().figure("conductor.arc-allowance").value() : 1.0);
    double margin = limit / worst.jouleIntegral();
    double five = facts.practice().figure("short-circuit.seconds").value();
    return builder
        .margin(margin)
        .wanted(wanted)
        .figures(worst.jouleIntegral(), limit, "A²s")
        .says(
            "A short circuit of "
                + Show.amps(worst.amps())
                + " lasts up to "
                + Show.seconds(worst.seconds())
                + " until "
                + worst.tag()
                + " clears it: "
                + Show.three(worst.jouleIntegral())
                + " A²s, and the stator cable stands "
                + Show.three(limit)
                + " A²s ("
                + Show.three(withstand.get().k())
                + " × "
                + Show.three(withstand.get().squareMillimetres())
                + " mm²)."
                + (arcLeftOut
                    ? " The fuse's figure ends where its arc begins; the arc is allowed for with "
                        + Show.ratio(wanted)
                        + " times."
                    : "")
                + (worst.seconds() > five
                    ? " Longer than "
                        + Show.seconds(five)
                        + " the form is too strict, and such a short circuit lasts too long."
                    : ""))
        .mend(
            margin < wanted
                ? "Take a cable of "
                    + Show.three(
                        Withstand.leastSquareMillimetres(
                            withstand.get().k(), wanted * worst.jouleIntegral()))
                    + " mm² or more, a quicker device, or give the fuse's own let-through as"
                    + " points."
                : "")
        .byMargin();
  }

  private Worst worst(Facts facts, ShortCircuitDevices devices, double from, double to) {
    OperatingTimes law = times.apply(facts);
    Worst worst = null;
    for (int i = 0; i <= STEPS; i++) {
      double amps = from * Math.pow(to / from, i / (double) STEPS);
      double seconds = Double.POSITIVE_INFINITY;
      String tag = devices.tags();
      boolean fuse = false;
      for (Device device : devices.devices()) {
        OptionalDouble operates = law.seconds(device, Edge.SLOW, amps);
        double clears = operates.orElse(Double.POSITIVE_INFINITY) + devices.openingSeconds(device);
        if (clears < seconds) {
          seconds = clears;
          tag = device.tag();
          fuse = device instanceof Device.Fuse;
        }
      }
      double joule = amps * amps * seconds;
      if (worst == null || joule > worst.jouleIntegral()) {
        worst = new Worst(joule, amps, seconds, tag, fuse);
      }
    }
    return worst;
  }

  private static Finding rotor(Facts facts) {
    Cable cable = Cable.rotor(facts.starter());
    FindingBuilder builder = FindingBuilder.of(facts, INFO, cable.subject()).edge(Edge.SLOW);
    if (cable.conductor().isEmpty()) {
      return builder.notJudged(List.of(cable.path()), "The rotor cable is not described.");
    }
    ComputedStart deciding = null;
    double ratio = Double.POSITIVE_INFINITY;
    double cleared = 0.0;
    double limit = 0.0;
    for (ComputedStart start : facts.faults(Scenario.Kind.RINGS_SHORTED).toList()) {
      PartResponse part = start.part("rotor-conductor").orElseThrow();
      if (part.missing().isPresent()) {
        return builder.notJudged(
            List.of(part.missing().get()), "What the rotor cable stands is not known.");
      }
      double clears = Exposure.of(facts, start).clearedAtSeconds();
      double there =
          Double.isInfinite(part.limitAtSeconds())
              ? Double.POSITIVE_INFINITY
              : part.limitAtSeconds() / clears;
      if (deciding == null || there < ratio) {
        deciding = start;
        ratio = there;
        cleared = clears;
        limit = part.limitAtSeconds();
      }
    }
    if (deciding == null) {
      return builder.notJudged(List.of(), "No rotor at rest with rings shorted was computed.");
    }
    double ring = deciding.history().stages().get(0).trace().ringAmps()[0];
    return builder
        .at(deciding)
        .margin(ratio)
        .figures(cleared, limit, "s")
        .says(
            "A short circuit of the rotor cable at rest draws "
                + Show.amps(ring)
                + " through the motor; the cable stands it for "
                + (Double.isInfinite(limit) ? "good" : Show.seconds(limit))
                + (Double.isInfinite(cleared)
                    ? ", and nothing is proven to clear it."
                    : ", and it is cleared after " + Show.seconds(cleared) + "."))
        .mend(
            ratio < facts.wanted(INFO.name())
                ? "Fit a stall relay that clears within " + Show.seconds(limit) + "."
                : "")
        .byMargin();
  }
}
