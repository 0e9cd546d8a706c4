package sliprung.config;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import sliprung.quantity.Dimension;
import sliprung.starter.Device;

/**
 * Reads the settings of devices that measure no current: proofs of steps, undervoltage relays and
 * bank temperature sensors.
 */
final class SupervisionSettings {
  private static final double COLDEST_AIR = -5.0;
  private static final double HOTTEST_AIR = 40.0;
  private static final double LIMIT_ACCURACY = 0.05;
  private static final double LAG_ACCURACY = 0.20;

  private final int sectionCount;

  /** For a bank of that many sections; 0 where they could not be read. */
  SupervisionSettings(int sectionCount) {
    this.sectionCount = sectionCount;
  }

  Device stepProof(Section section, Device.Fitting fitting) {
    return new Device.StepProof(fitting, section.number("time", Dimension.TIME, Range.POSITIVE));
  }

  Device undervoltage(Section section, Device.Fitting fitting) {
    return new Device.Undervoltage(
        fitting,
        section.number("below", Dimension.SHARE, Range.FRACTION_PERCENT),
        section.number("time", Dimension.TIME, Range.NOT_NEGATIVE),
        accuracy(section, LIMIT_ACCURACY, "5 %", 0.0, ""));
  }

  Device temperature(Section section, Device.Fitting fitting) {
    boolean absolute = section.has("limit");
    if (absolute == section.has("rise") && !section.isSilent()) {
      section
          .reading()
          .mistake(
              section.place(),
              section.path(),
              "expected one of limit, rise but found " + (absolute ? "limit and rise" : "none"));
    }
    double limit =
        absolute
            ? section.number("limit", Dimension.TEMPERATURE, Range.ELEMENT)
            : section.has("rise")
                ? section.number("rise", Dimension.TEMPERATURE_RISE, Range.POSITIVE)
                : Double.NaN;
    return new Device.Temperature(
        fitting,
        sections(section),
        limit,
        absolute,
        air(section, absolute),
        section.number("lag", Dimension.TIME, Range.NOT_NEGATIVE),
        accuracy(section, LIMIT_ACCURACY, "5 %", LAG_ACCURACY, "20 %"));
  }

  private static Device.Accuracy accuracy(
      Section section, double pickUp, String pickUpWords, double time, String timeWords) {
    boolean timed = !timeWords.isEmpty();
    Section accuracy =
        timed
            ? section.sectionOrDefaults("accuracy", "pick-up", "time")
            : section.sectionOrDefaults("accuracy", "pick-up");
    return new Device.Accuracy(
        accuracy.numberOr("pick-up", Dimension.SHARE, Range.SPREAD, pickUp, pickUpWords),
        timed ? accuracy.numberOr("time", Dimension.SHARE, Range.SPREAD, time, timeWords) : 0.0);
  }

  /** What a temperature is above; a rise needs none. */
  private static Device.Air air(Section section, boolean absolute) {
    Optional<Field> field = section.optional("air");
    if (field.isEmpty()) {
      if (absolute) {
        section.assume("air", "-5 °C to 40 °C");
      }
      return new Device.Air(COLDEST_AIR, HOTTEST_AIR);
    }
    String expected = "two temperatures such as [-5 °C, 40 °C], the colder first";
    List<Field> entries = field.get().list(expected).orElse(List.of());
    if (entries.size() == 2) {
      double cold = entries.get(0).number(Dimension.TEMPERATURE, Range.TEMPERATURE);
      double hot = entries.get(1).number(Dimension.TEMPERATURE, Range.TEMPERATURE);
      if (!(cold > hot)) {
        return new Device.Air(cold, hot);
      }
    }
    field.get().mistake("expected " + expected + " but found " + field.get().value().found());
    return new Device.Air(COLDEST_AIR, HOTTEST_AIR);
  }

  /** Those named, each once; all of them where none is. */
  private List<Integer> sections(Section section) {
    Optional<Field> field = section.optional("sections");
    List<Integer> all = IntStream.rangeClosed(1, sectionCount).boxed().toList();
    if (field.isEmpty()) {
      return all;
    }
    List<Integer> named = new ArrayList<>();
    for (Field entry :
        field.get().list("a list of section numbers such as [1, 2]").orElse(List.of())) {
      entry.whole(1, Math.max(1, sectionCount)).ifPresent(named::add);
    }
    if (named.isEmpty() || named.stream().distinct().count() < named.size()) {
      field.get().mistake("expected different section numbers such as [1, 2]");
    }
    return named.stream().distinct().sorted().toList();
  }
}
