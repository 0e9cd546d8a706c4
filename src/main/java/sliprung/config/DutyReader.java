package sliprung.config;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.Duty;

/** Reads {@code duty}. */
final class DutyReader {
  /** Starts in one series: more would only be a slip of the pen, and each is computed. */
  private static final int MOST_STARTS = 100;

  private DutyReader() {}

  static Duty read(Section root, int steps) {
    Section duty =
        root.sectionOrDefaults(
            "duty", "starts", "restart-after", "inching", "plugging", "past-starts");
    Section starts = duty.sectionOrDefaults("starts", "cold", "hot", "per-hour");
    return new Duty(
        count(starts, "cold", 1, 2),
        count(starts, "hot", 0, 1),
        starts.optionalNumber("per-hour", Dimension.NUMBER, Range.POSITIVE),
        duty.numberOr("restart-after", Dimension.TIME, Range.NOT_NEGATIVE, 0.0, "0 s"),
        repeated(duty, "inching", steps),
        repeated(duty, "plugging", steps),
        pastStarts(duty));
  }

  private static List<Double> pastStarts(Section duty) {
    return duty
        .optional("past-starts")
        .flatMap(f -> f.list("how long ago each start ended, such as [40 min, 3 min]"))
        .orElse(List.of())
        .stream()
        .map(f -> f.number(Dimension.TIME, Range.NOT_NEGATIVE))
        .toList();
  }

  private static int count(Section starts, String key, int least, int usual) {
    Optional<Field> field = starts.optional(key);
    if (field.isEmpty()) {
      starts.assume(key, String.valueOf(usual));
      return usual;
    }
    return field.get().whole(least, MOST_STARTS).orElse(usual);
  }

  private static Optional<Duty.Repeated> repeated(Section duty, String key, int steps) {
    Optional<Field> field = duty.optional(key);
    if (field.isEmpty()) {
      duty.assume(key, "none");
      return Optional.empty();
    }
    if (field.get().rawText().equals("none")) {
      return Optional.empty();
    }
    if (field.get().isScalar()) {
      field
          .get()
          .mistake(
              "expected none or {per-hour, step} but found " + field.get().value().found(),
              "write for example '" + key + ": {per-hour: 60, step: 1}'");
      return Optional.empty();
    }
    Section repeated = field.get().section("per-hour", "step");
    OptionalDouble perHour =
        OptionalDouble.of(repeated.number("per-hour", Dimension.NUMBER, Range.POSITIVE));
    Optional<Integer> step =
        repeated
            .required("step", "the step on which it is done", "1")
            .flatMap(f -> f.whole(1, steps > 0 ? steps : Integer.MAX_VALUE));
    return step.map(s -> new Duty.Repeated(perHour.getAsDouble(), s));
  }
}
