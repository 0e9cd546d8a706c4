package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.tolerance.Corner;

/** What a line contactor must break when one device opens it. */
final class DeviceOpens {
  private final Facts facts;
  private final FindingBuilder builder;
  private final Device device;
  private final Contactor contactor;
  private final OperatingTimes times;
  private final Ratings.Proven proven;

  DeviceOpens(
      Facts facts,
      FindingBuilder builder,
      Device device,
      Contactor contactor,
      OperatingTimes times,
      Ratings.Proven proven) {
    this.facts = facts;
    this.builder = builder.edge(Edge.FAST);
    this.device = device;
    this.contactor = contactor;
    this.times = times;
    this.proven = proven;
  }

  Finding finding() {
    if (device.fitting().place() != Device.Place.STATOR) {
      return seesRotorOnly();
    }
    WinningDevice winning = new WinningDevice(facts.starter(), times);
    WinningDevice.Bounds bounds = winning.fromCold(device);
    if (bounds.neverBeyond() <= 0.0) {
      return builder
          .says(
              winning.shortCircuit().tags()
                  + " clears every current before "
                  + device.tag()
                  + " opens "
                  + contactor.tag()
                  + ".")
          .build(sliprung.rulebook.Verdict.CLEAR);
    }
    boolean able = bounds.neverBeyond() <= proven.amps();
    boolean unable = bounds.surelyUpTo() > proven.amps();
    if (!able && !unable) {
      return notJudged(winning);
    }
    double amps = able ? bounds.neverBeyond() : bounds.surelyUpTo();
    if (Double.isInfinite(amps)) {
      return notJudged(winning);
    }
    double margin = proven.amps() / amps;
    return builder
        .margin(margin)
        .figures(amps, proven.amps(), "A")
        .says(sentence(winning, amps))
        .mend(
            margin < facts.wanted(EveryContactorBreaksWhatItOpens.NAME) ? mend(winning, amps) : "")
        .byMargin();
  }

  private String sentence(WinningDevice winning, double amps) {
    boolean upToFault = amps >= facts.starter().supply().faultMaxAmps().orElse(Double.MAX_VALUE);
    String first =
        winning.shortCircuit().isEmpty()
            ? "Nothing clears a short circuit before "
                + device.tag()
                + ": it opens "
                + contactor.tag()
                + " at up to "
                + Show.amps(amps)
            : device.tag()
                + " may open "
                + contactor.tag()
                + " before "
                + winning.shortCircuit().tags()
                + " at up to "
                + Show.amps(amps);
    String end = upToFault ? ", the greatest fault current" : "";
    String blocked =
        WinningDevice.blockedAbove(device)
            .map(level -> " " + device.tag() + " is surely blocked above " + Show.amps(level) + ".")
            .orElse("");
    return first
        + end
        + ". "
        + contactor.tag()
        + " is proven to break "
        + Show.amps(proven.amps())
        + " ("
        + proven.words()
        + ")."
        + blocked
        + hot(winning);
  }

  private String hot(WinningDevice winning) {
    if (winning.shortCircuit().isEmpty()) {
      return "";
    }
    Optional<Double> running =
        Optional.ofNullable(facts.running().get(Corner.NOMINAL))
            .flatMap(r -> r)
            .map(r -> r.point().statorAmps());
    OptionalDouble hot =
        running.isPresent() ? winning.fromHot(device, running.get()) : OptionalDouble.empty();
    return hot.isPresent()
        ? " After running at "
            + Show.amps(running.get())
            + " the crossing lies at "
            + Show.amps(hot.getAsDouble())
            + "; that is shown, not judged."
        : "";
  }

  private String mend(WinningDevice winning, double amps) {
    List<String> ways = new ArrayList<>();
    ways.add(
        winning.shortCircuit().isEmpty()
            ? "put a fuse in series that is quicker above " + Show.amps(proven.amps())
            : "take a short-circuit device that is quicker above " + Show.amps(proven.amps()));
    ways.add("a contactor that breaks " + Show.amps(amps));
    if (!facts.starter().breakers().isEmpty()) {
      ways.add("let " + device.tag() + " open a breaker");
    }
    if (canBeBlocked()) {
      ways.add("block " + device.tag() + " above " + Show.amps(proven.amps()));
    }
    String text = String.join(", or ", ways) + ".";
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }

  private boolean canBeBlocked() {
    return device instanceof Device.InverseTime
        || device instanceof Device.DefiniteTime
        || device instanceof Device.Instantaneous;
  }

  private Finding notJudged(WinningDevice winning) {
    List<String> missing = new ArrayList<>();
    StringBuilder why = new StringBuilder();
    Optional<String> unknown =
        device.measuresCurrent() ? times.unknown(device, Edge.FAST) : Optional.empty();
    if (unknown.isPresent()) {
      missing.add("protection." + device.tag() + ".curve");
      why.append(device.tag()).append(": ").append(unknown.get()).append(". ");
    }
    if (facts.starter().supply().faultMaxAmps().isEmpty()) {
      missing.add("supply.fault-current");
    }
    if (winning.shortCircuit().isEmpty()) {
      why.append("No short-circuit device is described in series, so that ")
          .append(device.tag())
          .append(" opens ")
          .append(contactor.tag())
          .append(" at any fault current");
    } else {
      why.append("How great a current ")
          .append(device.tag())
          .append(" may open before ")
          .append(winning.shortCircuit().tags())
          .append(" cannot be told");
      if (unknown.isEmpty()) {
        why.append(": the curves given end too early or never cross");
      }
    }
    why.append("; ")
        .append(contactor.tag())
        .append(" is proven to break ")
        .append(Show.amps(proven.amps()))
        .append(" (")
        .append(proven.words())
        .append(").");
    if (missing.isEmpty()) {
      missing.add("protection");
    }
    return builder.notJudged(missing, why.toString());
  }

  /** A device in the rotor circuit sees no stator short circuit: the currents of starts count. */
  private Finding seesRotorOnly() {
    Optional<GreatestStatorCurrent> greatest = GreatestStatorCurrent.of(facts);
    if (greatest.isEmpty()) {
      return builder.notJudged(List.of(), "No start was computed.");
    }
    double amps = greatest.get().amps();
    double margin = proven.amps() / amps;
    return builder
        .at(greatest.get().start())
        .margin(margin)
        .figures(amps, proven.amps(), "A")
        .says(
            device.tag()
                + (device.measuresCurrent() ? " measures" : " sits")
                + " in the rotor circuit and sees no short circuit of the stator. It opens "
                + contactor.tag()
                + " at up to "
                + Show.amps(amps)
                + " ("
                + greatest.get().when()
                + "), which is proven to break "
                + Show.amps(proven.amps())
                + " ("
                + proven.words()
                + ").")
        .mend(margin < 1.0 ? "Take a line contactor that breaks " + Show.amps(amps) + "." : "")
        .byMargin();
  }
}
