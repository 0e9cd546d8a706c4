package sliprung.rulebook.catalogue;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import sliprung.rulebook.DecidingDefaults;
import sliprung.rulebook.Rule;
import sliprung.rulebook.conductor.ConductorRules;
import sliprung.rulebook.contactor.ContactorRules;
import sliprung.rulebook.data.DataRules;
import sliprung.rulebook.held.EveryHeldStepIsCleared;
import sliprung.rulebook.held.SomethingSeesEveryHeldStep;
import sliprung.rulebook.held.TwoSectionsAtOnceAreStood;
import sliprung.rulebook.held.WhatOpensIsAbleToBreak;
import sliprung.rulebook.locked.JammedWhileRunningIsCleared;
import sliprung.rulebook.locked.LockedOnAStepIsCleared;
import sliprung.rulebook.locked.LockedWithRingsShortedIsCleared;
import sliprung.rulebook.locked.LockedWithSequenceRunningIsCleared;
import sliprung.rulebook.locked.TheRingsStandARotorAtRest;
import sliprung.rulebook.locked.TheRotorBreaksAway;
import sliprung.rulebook.overload.OverloadRules;
import sliprung.rulebook.resistor.EverySectionStandsALostFan;
import sliprung.rulebook.resistor.EverySectionStandsThePermittedStarts;
import sliprung.rulebook.resistor.EverySectionStandsTheStartsOfAnHour;
import sliprung.rulebook.resistor.TheBankHasADutyClass;
import sliprung.rulebook.resistor.TheRestartIsKnown;
import sliprung.rulebook.sequence.EveryStepPullsThrough;
import sliprung.rulebook.sequence.NoLevelIsMetAtRest;
import sliprung.rulebook.sequence.NoStepClosesTooEarly;
import sliprung.rulebook.sequence.NoStepLingers;
import sliprung.rulebook.sequence.NoTorquePeakExceedsTheLimit;
import sliprung.rulebook.sequence.TheClosingsAreEven;
import sliprung.rulebook.sequence.TheSequenceIsSupervised;
import sliprung.rulebook.sequence.TheStepsKeepTheirOrder;
import sliprung.rulebook.shortcircuit.ShortCircuitRules;
import sliprung.rulebook.trip.EveryContactorStandsTheDip;
import sliprung.rulebook.trip.NoClosingPeakPicksUp;
import sliprung.rulebook.trip.NoDeviceOperatesInAPermittedStart;
import sliprung.rulebook.trip.NothingCreepsToATripInService;
import sliprung.rulebook.trip.TheStartSparesTheFuse;

/** The rules, an explicit list. */
public final class Catalogue {

  private static final List<Rule> RULES = sorted();

  /** Rules of the book that this version does not hold, each with its question. */
  private static final Map<String, String> NOT_BUILT = Map.of();

  private Catalogue() {}

  private static List<Rule> sorted() {
    List<Rule> rules =
        new ArrayList<>(
            List.of(
                new NoDeviceOperatesInAPermittedStart(),
                new NothingCreepsToATripInService(),
                new NoClosingPeakPicksUp(),
                new TheStartSparesTheFuse(),
                new EveryContactorStandsTheDip(),
                new EveryHeldStepIsCleared(),
                new SomethingSeesEveryHeldStep(),
                new WhatOpensIsAbleToBreak(),
                new TwoSectionsAtOnceAreStood(),
                new LockedWithSequenceRunningIsCleared(),
                new LockedOnAStepIsCleared(),
                new LockedWithRingsShortedIsCleared(),
                new TheRotorBreaksAway(),
                new JammedWhileRunningIsCleared(),
                new TheRingsStandARotorAtRest(),
                new EveryStepPullsThrough(),
                new NoLevelIsMetAtRest(),
                new NoStepClosesTooEarly(),
                new NoStepLingers(),
                new TheStepsKeepTheirOrder(),
                new TheClosingsAreEven(),
                new TheSequenceIsSupervised(),
                new NoTorquePeakExceedsTheLimit(),
                new EverySectionStandsThePermittedStarts(),
                new EverySectionStandsTheStartsOfAnHour(),
                new EverySectionStandsALostFan(),
                new TheBankHasADutyClass(),
                new TheRestartIsKnown()));
    rules.addAll(ContactorRules.ALL);
    rules.addAll(ConductorRules.ALL);
    rules.addAll(OverloadRules.ALL);
    rules.addAll(ShortCircuitRules.ALL);
    rules.addAll(DataRules.ALL);
    rules.sort(Comparator.comparing(r -> r.info().name()));
    return List.copyOf(rules);
  }

  /** Every rule that is asked of a starter, sorted by name. */
  public static List<Rule> rules() {
    return RULES;
  }

  /** Every rule that is built, with those that the engine answers itself, by name. */
  public static Map<String, Rule.Info> built() {
    Map<String, Rule.Info> built = new TreeMap<>();
    RULES.forEach(r -> built.put(r.info().name(), r.info()));
    built.put(DecidingDefaults.INFO.name(), DecidingDefaults.INFO);
    built.put(sliprung.rulebook.RuleBook.ACCEPTED.name(), sliprung.rulebook.RuleBook.ACCEPTED);
    return built;
  }

  /** Question by name of every rule that is not built. */
  public static Map<String, String> notBuilt() {
    return new TreeMap<>(NOT_BUILT);
  }

  /** Every name that a starter file may use. */
  public static Set<String> names() {
    Set<String> names = new TreeSet<>(built().keySet());
    names.addAll(NOT_BUILT.keySet());
    return names;
  }

  /** The page of a rule that is built, as Markdown. */
  public static Optional<String> page(String name) {
    if (!built().containsKey(name)) {
      return Optional.empty();
    }
    String path = "/sliprung/rules/" + name + ".md";
    try (InputStream stream = Catalogue.class.getResourceAsStream(path)) {
      if (stream == null) {
        return Optional.empty();
      }
      return Optional.of(new String(stream.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
