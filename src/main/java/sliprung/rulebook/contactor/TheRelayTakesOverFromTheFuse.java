package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Contactor;
import sliprung.starter.Device;

/**
 * {@code contactor/take-over}: where the fuse takes over from the overload relay the contactor is
 * still able to break, and the fuse stays whole where the relay is meant to open.
 *
 * <p>Margin of a clear finding: the lesser of breaking capacity over the crossing of quickest relay
 * and slowest fuse, and of the least current at which the quickest fuse may melt before the slowest
 * relay over the standard's relay point (0.75 I_c). Of a tight finding and a breach, and where a
 * tested coordination is declared: breaking capacity over the crossing I_c of the mean curves.
 */
public final class TheRelayTakesOverFromTheFuse implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/take-over",
          "Does the fuse take over from the overload relay at a current that the contactor breaks,"
              + " and not before?",
          "IEC 60947-4-1 annex B (from memory); IEC 60947-1 annex X",
          List.of("supply.fault-current", "contactors", "protection"));

  private final Function<Facts, OperatingTimes> times;

  /** With the operating times of the devices' bands. */
  public TheRelayTakesOverFromTheFuse() {
    this(BandTimes::new);
  }

  TheRelayTakesOverFromTheFuse(Function<Facts, OperatingTimes> times) {
    this.times = times;
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Fuse fuse && fuse.fitting().place() == Device.Place.STATOR) {
        for (Device other : facts.starter().protection()) {
          if (other instanceof Device.Overload relay
              && relay.fitting().place() == Device.Place.STATOR) {
            relay
                .trips()
                .flatMap(facts.starter()::contactor)
                .filter(c -> c.place() == Contactor.Place.LINE)
                .ifPresent(c -> findings.add(judge(facts, relay, fuse, c)));
          }
        }
      }
    }
    return Answer.of(
        findings, "no fuse in the stator line together with an overload relay on a line contactor");
  }

  private Finding judge(Facts facts, Device.Overload relay, Device.Fuse fuse, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Optional<Contactor.Coordination> declared =
        contactor.coordination().filter(c -> c.with().equals(fuse.tag()));
    OperatingTimes law = times.apply(facts);
    Ratings ratings = Ratings.of(facts, contactor);
    Optional<String> unknown = unknown(law, relay, fuse);
    if (ratings.gap().isPresent() || unknown.isPresent()) {
      if (declared.isPresent() && ratings.gap().isEmpty()) {
        return builder
            .says(
                declaration(contactor, declared.get())
                    + " This rests on the declaration alone: no crossing is computed.")
            .build(Verdict.CLEAR);
      }
      return ratings.gap().isPresent()
          ? builder.notJudged(ratings.gap().get().missing(), ratings.gap().get().why())
          : builder.notJudged(
              List.of("protection." + relay.tag() + ".curve", coordinationPath(contactor)),
              unknown.get() + ".");
    }
    TakeOver takeOver = TakeOver.of(facts.starter(), law, relay, fuse, contactor.openingSeconds());
    return judge(facts, builder, relay, fuse, contactor, declared, takeOver, ratings.breaking());
  }

  private static Optional<String> unknown(
      OperatingTimes law, Device.Overload relay, Device.Fuse fuse) {
    for (Device device : List.of(relay, fuse)) {
      for (Edge edge : Edge.values()) {
        Optional<String> why = law.unknown(device, edge);
        if (why.isPresent()) {
          return Optional.of(device.tag() + ": " + why.get());
        }
      }
    }
    return Optional.empty();
  }

  private static Finding judge(
      Facts facts,
      FindingBuilder builder,
      Device.Overload relay,
      Device.Fuse fuse,
      Contactor contactor,
      Optional<Contactor.Coordination> declared,
      TakeOver takeOver,
      Ratings.Proven proven) {
    String breaks =
        contactor.tag()
            + " is proven to break "
            + Show.amps(proven.amps())
            + " ("
            + proven.words()
            + ").";
    if (takeOver.meanAmps().isEmpty()) {
      return builder
          .margin(0.0)
          .says(
              fuse.tag()
                  + " melts before "
                  + relay.tag()
                  + " trips at every current, on the mean curves: the relay never takes over.")
          .mend("Take a greater fuse, or one made for motor circuits.")
          .byMargin();
    }
    if (takeOver.meansNeverCross() && facts.starter().supply().faultMaxAmps().isEmpty()) {
      return builder.notJudged(
          List.of("supply.fault-current"),
          "The mean curves of "
              + relay.tag()
              + " and "
              + fuse.tag()
              + " never cross, and the greatest fault current is not given. "
              + breaks);
    }
    double mean = takeOver.meanAmps().getAsDouble();
    double meanMargin = proven.amps() / mean;
    String points = points(facts, relay, fuse, mean, takeOver.meansNeverCross());
    if (declared.isPresent()) {
      builder.margin(meanMargin).figures(mean, proven.amps(), "A");
      if (meanMargin < 1.0) {
        return builder
            .says(points + " " + breaks + " " + declaration(contactor, declared.get()))
            .mend(
                "Check that dial, fuse and contactor stand in one line of the declared table: these"
                    + " curves cross above what the contactor breaks.")
            .build(Verdict.TIGHT);
      }
      return builder
          .says(points + " " + breaks + " " + declaration(contactor, declared.get()))
          .byMargin();
    }
    double relayEnd = takeOver.greatestRelayAmps().orElse(0.0);
    double fuseBegin = takeOver.leastFuseAmps().orElse(Double.POSITIVE_INFINITY);
    double relayPoint = facts.practice().figure("take-over.relay-point").value() * mean;
    double bandMargin = Math.min(proven.amps() / relayEnd, fuseBegin / relayPoint);
    String band = band(relay, fuse, relayEnd, fuseBegin);
    if (meanMargin < 1.0) {
      return builder
          .margin(meanMargin)
          .figures(mean, proven.amps(), "A")
          .says(points + " " + breaks + " " + band)
          .mend(
              "Take a smaller or quicker fuse, or a contactor that breaks " + Show.amps(mean) + ".")
          .byMargin();
    }
    if (bandMargin < 1.0) {
      return builder
          .margin(meanMargin)
          .figures(mean, proven.amps(), "A")
          .says(points + " " + breaks + " Over the whole bands that is not sure. " + band)
          .mend(
              "Declare the tested coordination ("
                  + coordinationPath(contactor)
                  + "), or give both devices' own curves.")
          .byMarginAtBestTight();
    }
    return builder
        .margin(bandMargin)
        .figures(relayEnd, proven.amps(), "A")
        .says(points + " " + breaks + " " + band)
        .byMargin();
  }

  private static String points(
      Facts facts, Device.Overload relay, Device.Fuse fuse, double mean, boolean toTheEnd) {
    if (toTheEnd) {
      return relay.tag()
          + " stays quicker than "
          + fuse.tag()
          + " on the mean curves up to the greatest fault current of "
          + Show.amps(mean)
          + ".";
    }
    double relayPoint = facts.practice().figure("take-over.relay-point").value() * mean;
    double scpdPoint = facts.practice().figure("take-over.scpd-point").value() * mean;
    return "The mean curves of "
        + relay.tag()
        + " and "
        + fuse.tag()
        + " cross at "
        + Show.amps(mean)
        + ": the test asks the relay alone to open at "
        + Show.amps(relayPoint)
        + ", the fuse first at "
        + Show.amps(scpdPoint)
        + ".";
  }

  private static String band(
      Device.Overload relay, Device.Fuse fuse, double relayEnd, double fuseBegin) {
    return "The quickest "
        + relay.tag()
        + (relayEnd > 0.0
            ? " may be first up to " + Show.amps(relayEnd)
            : " is never before the slowest " + fuse.tag())
        + (Double.isInfinite(fuseBegin)
            ? ", and the quickest " + fuse.tag() + " never melts before the slowest relay."
            : "; the quickest "
                + fuse.tag()
                + " may melt from "
                + Show.amps(fuseBegin)
                + " on before the slowest relay has opened.");
  }

  private static String declaration(Contactor contactor, Contactor.Coordination declared) {
    return "Type "
        + declared.type()
        + " coordination of "
        + contactor.tag()
        + " with "
        + declared.with()
        + " is declared: the maker's tests cover the take-over.";
  }

  private static String coordinationPath(Contactor contactor) {
    return "contactors." + contactor.tag() + ".coordination";
  }
}
