package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.UnaryOperator;
import sliprung.sensitivity.Narrowed.Span;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.ResistorBank;
import sliprung.starter.ResistorBank.Section;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;
import sliprung.starter.Supply;

/** The inputs of a starter that may be off, and by how much. */
final class UncertainInputs {
  private final Starter starter;
  private final Grades grades;
  private final List<Narrowed> narrowed;
  private final List<UncertainInput> inputs = new ArrayList<>();

  private UncertainInputs(Starter starter, List<Narrowed> narrowed) {
    this.narrowed = narrowed;
    this.starter = starter;
    this.grades = new Grades(starter);
  }

  /** All that a starter has. A value of zero moves nothing and is left out. */
  static List<UncertainInput> of(Starter starter) {
    return of(starter, List.of());
  }

  /** All that a starter has, the load no further than readings leave it open. */
  static List<UncertainInput> of(Starter starter, List<Narrowed> narrowed) {
    UncertainInputs all = new UncertainInputs(starter, narrowed);
    all.load();
    all.bank();
    all.motor();
    all.supply();
    return List.copyOf(all.inputs);
  }

  private void load() {
    for (LoadValue value : LoadValue.values()) {
      if (value.times(starter.load(), 2.0).equals(starter.load())) {
        continue;
      }
      add(
          value.path(),
          value.words(),
          grades.of(value.path()),
          f -> starter.withLoad(value.times(starter.load(), f)));
    }
  }

  private void bank() {
    add(
        "resistors.sections",
        "the bank's resistance",
        grades.of("resistors.sections", "resistance"),
        f -> sections(s -> resistance(s, f)));
    boolean rated =
        starter.resistors().sections().stream()
            .anyMatch(s -> s.continuousAmps().isPresent() || s.shortTime().isPresent());
    if (rated) {
      add(
          "resistors.sections",
          "the sections' current ratings",
          grades.of("resistors.sections", "continuous", "short-time"),
          f -> sections(s -> rating(s, f)));
    }
  }

  private void motor() {
    for (MotorValue value : MotorValue.values()) {
      if (value.isIn(starter.motor())) {
        add(
            value.path(),
            value.words(),
            grades.of(value.path()),
            f -> starter.withMotor(value.times(starter.motor(), f)));
      }
    }
  }

  private void supply() {
    Supply supply = starter.supply();
    if (supply.faultMinAmps().isEmpty() && supply.faultMaxAmps().isEmpty()) {
      return;
    }
    add(
        "supply.fault-current",
        "the supply's fault current",
        grades.of("supply.fault-current"),
        f ->
            starter.withSupply(
                new Supply(
                    supply.voltage(),
                    supply.frequency(),
                    supply.bandLow(),
                    supply.bandHigh(),
                    MotorValue.times(supply.faultMaxAmps(), f),
                    MotorValue.times(supply.faultMinAmps(), f))));
  }

  private void add(String path, String words, EvidenceGrade grade, DoubleFunction<Starter> with) {
    Span graded = new Span(1.0 - grade.spread(), 1.0 + grade.spread());
    Span open =
        narrowed.stream()
            .filter(n -> n.value().path().equals(path))
            .findFirst()
            .flatMap(Narrowed::described)
            .flatMap(d -> d.within(graded))
            .orElse(graded);
    inputs.add(new UncertainInput(path, words, grade, open.low(), open.high(), with));
  }

  private Starter sections(UnaryOperator<Section> change) {
    ResistorBank bank = starter.resistors();
    return starter.withResistors(
        new ResistorBank(
            bank.connection(),
            bank.cutOut(),
            bank.sections().stream().map(change).toList(),
            bank.sameLimit(),
            bank.permanentOhms(),
            bank.leadsOhms(),
            bank.tolerance(),
            bank.hotRise(),
            bank.enclosureSeconds(),
            bank.fan()));
  }

  private static Section resistance(Section section, double factor) {
    return new Section(
        section.ohms() * factor,
        section.continuousAmps(),
        section.shortTime(),
        section.continuousRiseKelvin(),
        section.shortTimeRiseKelvin());
  }

  private static Section rating(Section section, double factor) {
    return new Section(
        section.ohms(),
        MotorValue.times(section.continuousAmps(), factor),
        section.shortTime().map(s -> new ShortTime(s.amps() * factor, s.seconds())),
        section.continuousRiseKelvin(),
        section.shortTimeRiseKelvin());
  }
}
