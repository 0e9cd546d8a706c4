package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.SectionElement;
import sliprung.rulebook.Facts;
import sliprung.starter.ResistorBank;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;

/**
 * A bank whose fan is lost: each section's continuous current falls to the share that is declared,
 * its time constant grows. Without a declared one the heat capacity stays: the heat that a kelvin
 * carries away falls with the square of the continuous current, and the time constant rises by as
 * much.
 */
final class WithoutFan {
  private WithoutFan() {}

  /** Time constant without the fan over that with it. */
  static double stretch(ResistorBank.Fan fan) {
    double share = fan.continuousWithout().orElseThrow();
    return fan.timeConstantWithout().orElse(1.0 / (share * share));
  }

  /**
   * The starter with the ratings that are left.
   *
   * @return empty where a section has no usable pair of ratings
   */
  static Optional<Starter> of(Starter starter) {
    ResistorBank bank = starter.resistors();
    ResistorBank.Fan fan = bank.fan().orElseThrow();
    double share = fan.continuousWithout().orElseThrow();
    List<ResistorBank.Section> left = new ArrayList<>();
    for (int number = 1; number <= bank.sections().size(); number++) {
      Optional<SectionElement> element = SectionElement.of(bank, number);
      if (element.isEmpty()) {
        return Optional.empty();
      }
      left.add(
          section(
              bank.sections().get(number - 1),
              share * element.get().referenceAmps(),
              stretch(fan) * element.get().timeConstantSeconds()));
    }
    return Optional.of(starter.withResistors(bank.rated(left)));
  }

  private static ResistorBank.Section section(
      ResistorBank.Section section, double continuous, double timeConstant) {
    double seconds = section.shortTime().orElseThrow().seconds();
    double amps = continuous / Math.sqrt(-Math.expm1(-seconds / timeConstant));
    OptionalDouble rise = SectionElement.limitRiseKelvin(section);
    return new ResistorBank.Section(
        section.ohms(),
        OptionalDouble.of(continuous),
        Optional.of(new ShortTime(amps, seconds)),
        rise,
        rise);
  }

  /** Facts about the same starts with the ratings that are left. */
  static Facts facts(Facts facts, Starter without) {
    return new Facts(
        without,
        facts.practice(),
        facts.machine(),
        facts.identification(),
        facts.starts(),
        facts.running(),
        facts.fastPickUps(),
        facts.bands());
  }
}
