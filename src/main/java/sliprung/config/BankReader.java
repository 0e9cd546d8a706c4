package sliprung.config;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.ResistorBank;
import sliprung.starter.ResistorBank.Connection;
import sliprung.starter.ResistorBank.CutOut;
import sliprung.starter.ShortTime;

/** Reads {@code resistors}. */
final class BankReader {
  /** No starter has as many; each is simulated with all its faults. */
  private static final int MOST_SECTIONS = 40;

  private final Section bank;

  private BankReader(Section bank) {
    this.bank = bank;
  }

  static ResistorBank read(Section root) {
    Section bank =
        root.requiredSection(
            "resistors",
            "{connection: star, cut-out: star-point, sections: […]}",
            "connection",
            "cut-out",
            "sections",
            "same-limit",
            "permanent",
            "leads",
            "tolerance",
            "hot-rise",
            "enclosure",
            "fan");
    return new BankReader(bank).read();
  }

  private ResistorBank read() {
    Optional<Connection> connection =
        bank.choice(
            "connection", Words.inOrder("star", Connection.STAR, "delta", Connection.DELTA));
    Optional<CutOut> cutOut =
        bank.choice(
            "cut-out", Words.inOrder("star-point", CutOut.STAR_POINT, "bridging", CutOut.BRIDGING));
    if (connection.equals(Optional.of(Connection.DELTA))
        && cutOut.equals(Optional.of(CutOut.STAR_POINT))) {
      bank.optional("cut-out")
          .get()
          .mistake(
              "expected bridging for the delta bank of line "
                  + bank.optional("connection").get().value().place().line()
                  + " but found 'star-point'",
              "a delta bank has no star point: its contactors bridge sections");
      cutOut = Optional.of(CutOut.BRIDGING);
    }
    boolean sameLimit = bank.optional("same-limit").flatMap(Field::yesOrNo).orElse(false);
    List<ResistorBank.Section> sections = sections(sameLimit);
    Connection built = connection.orElse(Connection.STAR);
    return new ResistorBank(
        built,
        built == Connection.DELTA ? CutOut.BRIDGING : cutOut.orElse(CutOut.STAR_POINT),
        sections,
        sameLimit,
        bank.optionalNumber("permanent", Dimension.RESISTANCE, Range.NOT_NEGATIVE).orElse(0.0),
        bank.numberOr("leads", Dimension.RESISTANCE, Range.NOT_NEGATIVE, 0.0, "0 ohm"),
        bank.numberOr("tolerance", Dimension.SHARE, Range.SPREAD, 0.10, "10 %"),
        bank.numberOr("hot-rise", Dimension.SHARE, Range.NOT_NEGATIVE, 0.20, "20 %"),
        bank.numberOr("enclosure", Dimension.TIME, Range.POSITIVE, 1200.0, "20 min"),
        bank.optional("fan").map(BankReader::fan));
  }

  private static ResistorBank.Fan fan(Field field) {
    Section fan = field.section("continuous-without", "time-constant-without");
    return new ResistorBank.Fan(
        fan.optionalNumber("continuous-without", Dimension.SHARE, Range.FRACTION_PERCENT),
        fan.optionalNumber("time-constant-without", Dimension.SHARE, Range.AT_LEAST_ALL));
  }

  private List<ResistorBank.Section> sections(boolean sameLimit) {
    Optional<Field> field =
        bank.required("sections", "a list of sections", "[{resistance: 0.28 ohm}]");
    Optional<List<Field>> entries = field.flatMap(f -> f.list("a list of sections"));
    if (entries.isEmpty()) {
      return List.of();
    }
    if (entries.get().isEmpty()) {
      field.get().mistake("expected at least one section but found an empty list");
    }
    if (entries.get().size() > MOST_SECTIONS) {
      field
          .get()
          .mistake(
              "expected at most " + MOST_SECTIONS + " sections but found " + entries.get().size());
    }
    List<ResistorBank.Section> sections = new ArrayList<>();
    for (Field entry : entries.get()) {
      sections.add(section(entry, sameLimit));
    }
    return sections;
  }

  private ResistorBank.Section section(Field entry, boolean sameLimit) {
    Section section = entry.section("resistance", "continuous", "short-time", "rise");
    double ohms = resistance(section);
    OptionalDouble continuous =
        section.optionalNumber("continuous", Dimension.CURRENT, Range.POSITIVE);
    Optional<ShortTime> shortTime = MotorReader.shortTime(section, "short-time");
    OptionalDouble continuousRise = OptionalDouble.empty();
    OptionalDouble shortTimeRise = OptionalDouble.empty();
    Optional<Field> rises = section.optional("rise");
    if (rises.isPresent()) {
      Section rise = rises.get().section("continuous", "short-time");
      continuousRise =
          OptionalDouble.of(rise.number("continuous", Dimension.TEMPERATURE_RISE, Range.POSITIVE));
      shortTimeRise =
          OptionalDouble.of(rise.number("short-time", Dimension.TEMPERATURE_RISE, Range.POSITIVE));
      oneLimit(rises.get(), sameLimit, continuousRise.getAsDouble(), shortTimeRise.getAsDouble());
    }
    return new ResistorBank.Section(ohms, continuous, shortTime, continuousRise, shortTimeRise);
  }

  private void oneLimit(Field rise, boolean sameLimit, double continuous, double shortTime) {
    if (sameLimit && Math.abs(continuous - shortTime) > 1e-9 * Math.max(continuous, shortTime)) {
      rise.mistake(
          "expected one rise for both ratings, as same-limit on line "
              + bank.optional("same-limit").get().value().place().line()
              + " says, but found two that differ");
    }
  }

  private static double resistance(Section section) {
    Optional<Field> field = section.required("resistance", "a resistance", "0.28 ohm");
    if (field.isPresent() && field.get().value() instanceof YamlNode.Sequence) {
      field
          .get()
          .mistake(OutsideScope.sentence("unbalanced").get().replace("'unbalanced'", "a list"));
      return Double.NaN;
    }
    return field.map(f -> f.number(Dimension.RESISTANCE, Range.POSITIVE)).orElse(Double.NaN);
  }
}
