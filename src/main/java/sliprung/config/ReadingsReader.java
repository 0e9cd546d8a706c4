package sliprung.config;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import sliprung.quantity.Dimension;
import sliprung.starter.Readings;
import sliprung.starter.Step;
import sliprung.starter.Supply;

/** Reads {@code readings}: stopwatch and clamp meter in one real start. */
final class ReadingsReader {
  private ReadingsReader() {}

  static Optional<Readings> read(Section root, Supply supply, List<Step> steps) {
    Optional<Field> field = root.optional("readings");
    if (field.isEmpty()) {
      return Optional.empty();
    }
    Section section =
        field
            .get()
            .section("run-up", "running-current", "current-before", "voltage", "clock", "clamp");
    OptionalDouble runUp = section.optionalNumber("run-up", Dimension.TIME, Range.POSITIVE);
    OptionalDouble running =
        section.optionalNumber("running-current", Dimension.CURRENT, Range.POSITIVE);
    Map<String, Double> before = before(section, steps);
    boolean none = runUp.isEmpty() && running.isEmpty() && !section.has("current-before");
    if (none && !section.isSilent()) {
      field
          .get()
          .mistake(
              "expected run-up, running-current or current-before but found none of them",
              "write for example 'readings: {run-up: 9.8 s}'");
    }
    return Optional.of(
        new Readings(
            runUp,
            running,
            before,
            section
                .optionalNumber("voltage", Dimension.VOLTAGE, Range.POSITIVE)
                .orElse(supply.voltage()),
            section
                .optionalNumber("clock", Dimension.SHARE, Range.FRACTION_PERCENT)
                .orElse(Readings.USUAL_CLOCK),
            section
                .optionalNumber("clamp", Dimension.SHARE, Range.FRACTION_PERCENT)
                .orElse(Readings.USUAL_CLAMP)));
  }

  private static Map<String, Double> before(Section section, List<Step> steps) {
    Map<String, Double> before = new LinkedHashMap<>();
    Optional<Field> field = section.optional("current-before");
    if (field.isEmpty()) {
      return before;
    }
    Set<String> contactors = new LinkedHashSet<>();
    steps.forEach(s -> contactors.add(s.contactor()));
    Section currents = field.get().section();
    if (!currents.isSilent() && currents.isEmpty()) {
      field
          .get()
          .mistake(
              "expected the current before a step contactor closes but found nothing",
              "write for example 'current-before: {K11: 210 A}'");
    }
    for (Field current : currents.fields()) {
      double amps = current.number(Dimension.CURRENT, Range.POSITIVE);
      if (!contactors.isEmpty() && !contactors.contains(current.key())) {
        section
            .reading()
            .mistake(
                current.keyPlace(),
                current.path(),
                "expected the tag of a step contactor but found '"
                    + Wording.clip(current.key())
                    + "'",
                Wording.nearest(current.key(), contactors).map(w -> "did you mean '" + w + "'?"));
      }
      before.put(current.key(), amps);
    }
    return before;
  }
}
