package sliprung.rulebook.data;

import java.util.List;
import java.util.OptionalDouble;
import sliprung.machine.Source;
import sliprung.quantity.Show;
import sliprung.starter.ResistorBank;
import sliprung.starter.ResistorBank.Section;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/** The rotor bank, its ratings and its steps. */
final class BankPlausibility {
  private BankPlausibility() {}

  static void check(Tally tally) {
    grading(tally);
    firstStep(tally);
    for (int k = 1; k <= tally.facts().starter().sectionCount(); k++) {
      ratings(tally, k);
    }
    levels(tally);
  }

  private static String path(int section) {
    return "resistors.sections[" + section + "]";
  }

  /** Tapped to the star point, each section is smaller than the one cut out before it. */
  private static void grading(Tally tally) {
    ResistorBank bank = tally.facts().starter().resistors();
    if (bank.cutOut() != ResistorBank.CutOut.STAR_POINT) {
      return;
    }
    List<Section> sections = bank.sections();
    for (int k = 2; k <= sections.size(); k++) {
      tally.ratio(
          "grading",
          path(k),
          Tally.over(sections.get(k - 1).ohms(), sections.get(k - 2).ohms()),
          "Section " + k + " over section " + (k - 1) + " in ohms",
          "Sections stand in the order in which they are cut out, the greatest first; ohms of the"
              + " section, not up to the tapping.");
    }
  }

  private static void firstStep(Tally tally) {
    Starter starter = tally.facts().starter();
    ResistorBank bank = starter.resistors();
    if (starter.motor().rotorCurrent().isEmpty()) {
      return;
    }
    double sections = bank.sections().stream().mapToDouble(Section::ohms).sum();
    double ohms = sections * bank.starFactor() + bank.permanentOhms() + bank.leadsOhms();
    double ring =
        tally
            .facts()
            .machine()
            .at(new Source(starter.supply().voltage(), 0.0), ohms, 1.0)
            .ringAmps();
    tally.ratio(
        "first-step",
        "resistors.sections",
        Tally.over(ring, starter.motor().rotorCurrent().getAsDouble()),
        "The ring current at rest on step 1 over rated rotor current",
        "Ohms are per phase: half of what is read between two rings. A delta bank is given by its"
            + " branches.");
  }

  private static void ratings(Tally tally, int k) {
    ResistorBank bank = tally.facts().starter().resistors();
    Section section = bank.sections().get(k - 1);
    if (section.continuousAmps().isEmpty() || section.shortTime().isEmpty()) {
      return;
    }
    double share =
        section.continuousAmps().getAsDouble() / section.shortTime().orElseThrow().amps();
    tally.ratio(
        "short-time",
        path(k) + ".short-time",
        OptionalDouble.of(1.0 / share),
        "Section " + k + "'s short-time current over its continuous current",
        "The short-time current is the greater one: the two may be swapped.");
    double rises = rises(bank, section);
    double left = 1.0 - share * share * rises;
    if (Double.isNaN(rises) || left <= 0.0) {
      return;
    }
    tally.check(
        "section-time-constant",
        path(k) + ".short-time",
        OptionalDouble.of(-section.shortTime().orElseThrow().seconds() / Math.log(left)),
        "The time constant that section " + k + "'s two ratings give",
        Show::seconds,
        "Check current and time of the short-time rating; it counts from cold.");
  }

  /** Short-time rise over continuous rise; not a number where nothing is said of it. */
  private static double rises(ResistorBank bank, Section section) {
    if (section.continuousRiseKelvin().isPresent() && section.shortTimeRiseKelvin().isPresent()) {
      return section.shortTimeRiseKelvin().getAsDouble()
          / section.continuousRiseKelvin().getAsDouble();
    }
    return bank.sameLimit() ? 1.0 : Double.NaN;
  }

  private static void levels(Tally tally) {
    Starter starter = tally.facts().starter();
    for (int k = 1; k <= starter.steps().size(); k++) {
      Step.ClosingRule rule = starter.steps().get(k - 1).rule();
      String path = "steps[" + k + "]";
      if (rule instanceof Step.StatorBelow below) {
        tally.ratio(
            "current-level",
            path,
            Tally.over(below.amps(), starter.motor().current()),
            "The level of step " + k + " over rated stator current",
            "Amperes in the stator, primary.");
      } else if (rule instanceof Step.RotorBelow below) {
        tally.ratio(
            "current-level",
            path,
            Tally.over(OptionalDouble.of(below.amps()), starter.motor().rotorCurrent()),
            "The level of step " + k + " over rated rotor current",
            "Amperes of one ring, primary.");
      } else if (rule instanceof Step.RotorFrequencyBelow below) {
        tally.check(
            "frequency-level",
            path,
            Tally.over(below.hertz(), starter.supply().frequency()),
            "The frequency level of step " + k,
            share -> Show.percent(share) + " of supply frequency",
            "Rotor frequency is slip times supply frequency.");
      } else if (rule instanceof Step.After after) {
        tally.check(
            "step-timer",
            path,
            OptionalDouble.of(after.seconds()),
            "The timer of step " + k,
            Show::seconds,
            "Seconds, from the closing before.");
      }
    }
  }
}
