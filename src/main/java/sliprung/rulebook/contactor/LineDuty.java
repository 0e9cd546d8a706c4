package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Verdict;
import sliprung.starter.Contactor;
import sliprung.starter.Duty;

/** The operations that the duty asks of one line contactor, each against its categories. */
final class LineDuty {
  private final Facts facts;
  private final Contactor contactor;
  private final Ratings ratings;
  private final double wanted;

  LineDuty(Facts facts, Contactor contactor, Ratings ratings, double wanted) {
    this.facts = facts;
    this.contactor = contactor;
    this.ratings = ratings;
    this.wanted = wanted;
  }

  /** One demand or more. */
  List<Demand> demands() {
    List<Demand> demands = new ArrayList<>();
    demands.add(startAndStop());
    Duty duty = facts.starter().duty();
    duty.inching()
        .flatMap(o -> repeated("Inching", o, StandstillCurrent.AT_REST))
        .ifPresent(demands::add);
    duty.plugging()
        .flatMap(o -> repeated("Plugging", o, StandstillCurrent.PLUGGED))
        .ifPresent(demands::add);
    ringsShorted().ifPresent(demands::add);
    return demands;
  }

  private Verdict byMargin(double margin) {
    return margin < 1.0 ? Verdict.BREACH : margin < wanted ? Verdict.TIGHT : Verdict.CLEAR;
  }

  private String tag() {
    return contactor.tag();
  }

  private Demand startAndStop() {
    double rated = facts.starter().motor().current();
    Optional<Category> best =
        ratings.forMotors().stream().max(Comparator.comparingDouble(Category::ratedAmps));
    if (best.isEmpty()) {
      return resistiveOnly(rated);
    }
    Category category = best.get();
    double margin = category.ratedAmps() / rated;
    String covers =
        category.isSlipRing()
            ? " AC-2 is the category of slip-ring motors."
            : " "
                + category.name()
                + " covers AC-2 there: it makes "
                + Show.three(category.making())
                + " and breaks "
                + Show.three(category.breaking())
                + " times its rated current, where AC-2 asks "
                + Show.three(slipRing("making"))
                + " and "
                + Show.three(slipRing("breaking"))
                + ".";
    return new Demand(
        byMargin(margin),
        margin,
        rated,
        category.ratedAmps(),
        "Starting and switching off, "
            + tag()
            + " serves a motor of "
            + Show.amps(rated)
            + " and is rated "
            + Show.amps(category.ratedAmps())
            + " in "
            + category.name()
            + "."
            + covers,
        margin < wanted
            ? "Take a line contactor rated " + Show.amps(rated) + " or more in AC-2 or AC-3."
            : "",
        Optional.empty());
  }

  private Demand resistiveOnly(double rated) {
    Category category = ratings.categories().get(0);
    double proven = category.breaking() * category.ratedAmps();
    double asked = slipRing("breaking") * rated;
    double margin = proven / asked;
    return new Demand(
        margin < 1.0 ? Verdict.BREACH : Verdict.TIGHT,
        margin,
        asked,
        proven,
        "AC-2 asks "
            + tag()
            + " to make and break "
            + Show.amps(asked)
            + ", 4 times the motor's "
            + Show.amps(rated)
            + "; it is rated for resistive load alone and proves "
            + Show.amps(proven)
            + " ("
            + category.words(category.breaking())
            + ").",
        "Give its rated current in AC-2 or AC-3, or take a contactor that has one.",
        Optional.empty());
  }

  /** Inching or plugging: regular above the occasional number an hour, else occasional. */
  private Optional<Demand> repeated(String word, Duty.Repeated operation, double slip) {
    if (!(operation.perHour() > 0.0)) {
      return Optional.empty();
    }
    return StandstillCurrent.on(facts, operation.step(), slip)
        .map(current -> repeated(word, operation, current));
  }

  private Demand repeated(String word, Duty.Repeated operation, StandstillCurrent current) {
    double amps = current.amps();
    String does =
        word
            + " on step "
            + operation.step()
            + ", "
            + Show.three(operation.perHour())
            + " times an hour, "
            + tag()
            + " breaks "
            + Show.amps(amps)
            + " at full voltage.";
    double slipRingNeeded =
        Math.max(facts.starter().motor().current(), amps / slipRing("durability-breaking"));
    String mend =
        "Take a line contactor rated "
            + Show.amps(slipRingNeeded)
            + " or more in AC-2, or "
            + Show.amps(amps / facts.practice().figure("AC-4.durability-breaking").value())
            + " or more in AC-4; or give up "
            + word.toLowerCase(java.util.Locale.ROOT)
            + ".";
    Optional<Category> best =
        ratings.forMotors().stream().max(Comparator.comparingDouble(c -> durability(c, amps)));
    if (best.isEmpty()) {
      return new Demand(
          Verdict.BREACH,
          Double.NaN,
          amps,
          0.0,
          does + " It is rated for resistive load alone: nothing proves that it does this.",
          mend,
          Optional.of(current.start()));
    }
    Category category = best.get();
    double share = durability(category, amps);
    double proven = category.durabilityBreaking() * category.ratedAmps();
    if (share >= 1.0) {
      return new Demand(
          byMargin(share),
          share,
          amps,
          proven,
          does
              + " It is proven to break "
              + Show.amps(proven)
              + " there all its life ("
              + category.words(category.durabilityBreaking())
              + ").",
          share < wanted ? mend : "",
          Optional.of(current.start()));
    }
    String tooLittle = does + " " + shortOf(category, amps, proven);
    double occasional = facts.practice().figure("contactor.occasional-per-hour").value();
    if (operation.perHour() > occasional) {
      return new Demand(
          Verdict.BREACH, share, amps, proven, tooLittle, mend, Optional.of(current.start()));
    }
    Ratings.Proven once = ratings.breaking();
    double margin = once.amps() / amps;
    return new Demand(
        margin < 1.0 ? Verdict.BREACH : Verdict.TIGHT,
        margin,
        amps,
        once.amps(),
        tooLittle
            + " Up to "
            + Show.three(occasional)
            + " times an hour its occasional breaking capacity of "
            + Show.amps(once.amps())
            + " ("
            + once.words()
            + ") is counted; that is proven for some fifty operations, not for years.",
        mend,
        Optional.of(current.start()));
  }

  private static String shortOf(Category category, double amps, double proven) {
    String figure =
        "For years "
            + category.name()
            + " proves no more than "
            + Show.amps(proven)
            + " ("
            + category.words(category.durabilityBreaking())
            + ")";
    String voltage =
        category.durabilityVoltage() < 1.0
            ? " at " + Show.three(category.durabilityVoltage()) + " of the voltage"
            : "";
    return figure
        + voltage
        + (amps > proven ? ": " + Show.amps(amps - proven) + " short" : ": the current would do")
        + (category.durabilityVoltage() < 1.0
            ? ", and the voltage is "
                + Show.ratio(1.0 / category.durabilityVoltage())
                + " times what is proven."
            : ".");
  }

  /** The least covered of current and voltage, proven over asked. */
  private static double durability(Category category, double amps) {
    double current = category.durabilityBreaking() * category.ratedAmps() / amps;
    return Math.min(
        current, category.durabilityVoltage() < 1.0 ? category.durabilityVoltage() : current);
  }

  /** Rings shorted at closing, of a contactor rated in AC-2 alone that may meet it. */
  private Optional<Demand> ringsShorted() {
    if (facts.starter().interlocks().stepsOpenBeforeLine()
        || ratings.forMotors().isEmpty()
        || !ratings.forMotors().stream().allMatch(Category::isSlipRing)) {
      return Optional.empty();
    }
    Category category = ratings.forMotors().get(0);
    double proven = category.making() * category.ratedAmps();
    return StandstillCurrent.ringsShorted(facts)
        .map(
            current -> {
              double margin = proven / current.amps();
              return new Demand(
                  byMargin(margin),
                  margin,
                  current.amps(),
                  proven,
                  "With the step contactors closed, which nothing rules out, "
                      + tag()
                      + " would close on "
                      + Show.amps(current.amps())
                      + "; it is rated in AC-2 alone and proves "
                      + Show.amps(proven)
                      + " ("
                      + category.words(category.making())
                      + ").",
                  margin < wanted
                      ? "Interlock the line contactor with every step contactor proven open, or take"
                          + " one rated in AC-3."
                      : "",
                  Optional.of(current.start()));
            });
  }

  private double slipRing(String what) {
    return facts.practice().figure("AC-2." + what).value();
  }
}
