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
import sliprung.rulebook.held.WhatOpensIsAbleToBreak;
import sliprung.rulebook.locked.LockedOnAStepIsCleared;
import sliprung.rulebook.locked.LockedWithRingsShortedIsCleared;
import sliprung.rulebook.locked.LockedWithSequenceRunningIsCleared;
import sliprung.rulebook.locked.TheRotorBreaksAway;
import sliprung.rulebook.overload.OverloadRules;
import sliprung.rulebook.resistor.EverySectionStandsThePermittedStarts;
import sliprung.rulebook.sequence.EveryStepPullsThrough;
import sliprung.rulebook.sequence.NoLevelIsMetAtRest;
import sliprung.rulebook.sequence.NoTorquePeakExceedsTheLimit;
import sliprung.rulebook.sequence.TheSequenceIsSupervised;
import sliprung.rulebook.shortcircuit.ShortCircuitRules;
import sliprung.rulebook.trip.NoClosingPeakPicksUp;
import sliprung.rulebook.trip.NoDeviceOperatesInAPermittedStart;
import sliprung.rulebook.trip.NothingCreepsToATripInService;

/** The rules, an explicit list. */
public final class Catalogue {

  private static final List<Rule> RULES = sorted();

  /** Rules of the book that this version does not hold, each with its question. */
  private static final Map<String, String> NOT_BUILT =
      new TreeMap<>(
          Map.ofEntries(
              Map.entry(
                  "trip/fuse-wear",
                  "Does the start stay far enough below the fuse's pre-arcing current not to age it?"),
              Map.entry(
                  "trip/voltage-dip", "Do step and line contactors stand the dip at each closing?"),
              Map.entry(
                  "held/skipped", "What peak and making current when two sections go at once?"),
              Map.entry("locked/running", "Is a rotor that jams while running cleared in time?"),
              Map.entry("locked/rings", "Do slip rings and brushes stand a rotor at rest?"),
              Map.entry("sequence/early", "Does any step close too early?"),
              Map.entry("sequence/late", "Does any step close long after the motor has settled?"),
              Map.entry("sequence/spread", "Do the closings keep their order over the spreads?"),
              Map.entry("sequence/grading", "Are the closing currents of the steps even?"),
              Map.entry("resistor/duty", "Does the bank stand the starts of an hour?"),
              Map.entry("resistor/class", "Which duty class does the bank amount to?"),
              Map.entry("resistor/restart", "When may it be started again, and what limits it?")));

  private Catalogue() {}

  private static List<Rule> sorted() {
    List<Rule> rules =
        new ArrayList<>(
            List.of(
                new NoDeviceOperatesInAPermittedStart(),
                new NothingCreepsToATripInService(),
                new NoClosingPeakPicksUp(),
                new EveryHeldStepIsCleared(),
                new SomethingSeesEveryHeldStep(),
                new WhatOpensIsAbleToBreak(),
                new LockedWithSequenceRunningIsCleared(),
                new LockedOnAStepIsCleared(),
                new LockedWithRingsShortedIsCleared(),
                new TheRotorBreaksAway(),
                new EveryStepPullsThrough(),
                new NoLevelIsMetAtRest(),
                new TheSequenceIsSupervised(),
                new NoTorquePeakExceedsTheLimit(),
                new EverySectionStandsThePermittedStarts()));
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
