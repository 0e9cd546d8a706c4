package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Contactor;
import sliprung.starter.Device;

/**
 * {@code contactor/breaking}: what opens is proven to break the current: of every line contactor
 * the greatest current of a stop, a held or a locked start; of every device that opens a contactor
 * the greatest current at which it may be first, before the short-circuit devices.
 *
 * <p>Margin: proven breaking capacity over that current.
 */
public final class EveryContactorBreaksWhatItOpens implements Rule {
  static final String NAME = "contactor/breaking";

  private static final Info INFO =
      new Info(
          NAME,
          "Is every contactor proven to break the greatest current at which it may be opened?",
          "IEC 60947-4-1 table 7",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "load",
              "resistors",
              "duty",
              "timer-spread",
              "contactors",
              "protection"));

  private final Function<Facts, OperatingTimes> times;

  /** With the operating times of the devices' bands. */
  public EveryContactorBreaksWhatItOpens() {
    this(BandTimes::new);
  }

  EveryContactorBreaksWhatItOpens(Function<Facts, OperatingTimes> times) {
    this.times = times;
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Contactor contactor : facts.starter().lineContactors()) {
      findings.add(stops(facts, contactor));
    }
    for (Device device : facts.starter().protection()) {
      device
          .trips()
          .flatMap(facts.starter()::contactor)
          .filter(c -> !(device instanceof Device.Fuse))
          .ifPresent(c -> findings.add(opens(facts, device, c)));
    }
    if (findings.isEmpty()) {
      findings.add(
          FindingBuilder.of(facts, INFO, "line contactor")
              .notJudged(
                  List.of("contactors"),
                  "No line contactor is described and no device opens a contactor."));
    }
    return Answer.of(findings, "");
  }

  /** A hand stop at any time of any start. */
  private static Finding stops(Facts facts, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Optional<Ratings.Proven> breaks = Ratings.breaking(facts, contactor);
    if (breaks.isEmpty()) {
      return withoutCapacity(facts, builder, contactor, "");
    }
    Optional<GreatestStatorCurrent> greatest = GreatestStatorCurrent.of(facts);
    if (greatest.isEmpty()) {
      return builder.notJudged(List.of(), "No start was computed.");
    }
    Ratings.Proven proven = breaks.get();
    double amps = greatest.get().amps();
    double margin = proven.amps() / amps;
    return builder
        .at(greatest.get().start())
        .margin(margin)
        .figures(amps, proven.amps(), "A")
        .says(
            "A stop may find "
                + Show.amps(amps)
                + " ("
                + greatest.get().when()
                + ") at a power factor of "
                + Show.ratio(greatest.get().powerFactor())
                + ". "
                + contactor.tag()
                + " is proven to break "
                + Show.amps(proven.amps())
                + " ("
                + proven.words()
                + ")"
                + proven
                    .category()
                    .map(c -> " at " + Show.ratio(c.powerFactor()))
                    .orElse(", at a power factor that is not given")
                + ".")
        .mend(
            margin < facts.wanted(NAME)
                ? "Take a line contactor that breaks " + Show.amps(amps) + "."
                : "")
        .byMargin();
  }

  private static Finding withoutCapacity(
      Facts facts, FindingBuilder builder, Contactor contactor, String before) {
    Ratings.Gap gap = Ratings.of(facts, contactor).gap().orElseThrow();
    return gap.missing().isEmpty()
        ? builder.notJudged(
            List.of(BreakingCapacity.missingPath(facts, contactor.tag())),
            before + gap.why() + " Its own tested breaking current would tell what it breaks.")
        : builder.notJudged(gap.missing(), before + gap.why());
  }

  private Finding opens(Facts facts, Device device, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, device.tag());
    if (contactor.place() == Contactor.Place.ROTOR) {
      return RotorContactorOpened.finding(facts, builder, device, contactor);
    }
    Optional<Ratings.Proven> breaks = Ratings.breaking(facts, contactor);
    if (breaks.isEmpty()) {
      return withoutCapacity(
          facts, builder, contactor, device.tag() + " opens " + contactor.tag() + ". ");
    }
    return new DeviceOpens(facts, builder, device, contactor, times.apply(facts), breaks.get())
        .finding();
  }
}
