package sliprung.config;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.DialScale;

/**
 * Reads the scales of real dials beside their settings: {@code dial-range}, {@code dial-step} and
 * {@code dial-error} where there is one dial, {@code dials} with one entry a dial where there are
 * several.
 */
final class DialReader {
  static final String[] KEYS = {"dial-range", "dial-step", "dial-error", "dials"};

  private static final double ROUNDING = 1e-9;
  private static final List<String> SHORT = List.of("dial-range", "dial-step", "dial-error");

  private DialReader() {}

  /**
   * A setting that may be a dial.
   *
   * @param key of its value
   * @param dimension of its value
   */
  record Dial(String key, Dimension dimension) {}

  /**
   * Reads the scales of the dials that a step or device has; puts them on record.
   *
   * @param owner whose settings were read already
   * @param name that the dials' names begin with, such as {@code steps.K11}
   * @param all settings that may be dials
   */
  static void read(Section owner, String name, List<Dial> all) {
    List<Dial> dials = all.stream().filter(d -> owner.has(d.key())).toList();
    Optional<Field> first = SHORT.stream().filter(owner::has).findFirst().flatMap(owner::optional);
    Optional<Field> each = owner.optional("dials");
    if (dials.isEmpty()) {
      return; // the setting itself is missing, which was told
    }
    if (first.isPresent() && each.isPresent()) {
      each.get().mistake("expected " + first.get().key() + " or dials but found both");
      return;
    }
    if (first.isPresent() && dials.size() > 1) {
      List<String> keys = dials.stream().map(Dial::key).toList();
      first
          .get()
          .mistake(
              "expected to be told which of "
                  + String.join(" and ", keys)
                  + " is meant but found "
                  + first.get().key()
                  + " alone",
              "write for example 'dials: {"
                  + keys.get(0)
                  + ": {"
                  + first.get().key().substring("dial-".length())
                  + ": …}}'");
      return;
    }
    if (first.isPresent()) {
      one(owner, "dial-", owner, name, dials.get(0));
    }
    if (each.isPresent()) {
      Section section = each.get().section(dials.stream().map(Dial::key).toArray(String[]::new));
      for (Dial dial : dials) {
        section
            .optional(dial.key())
            .ifPresent(f -> one(f.section("range", "step", "error"), "", owner, name, dial));
      }
    }
  }

  private static void one(Section scale, String prefix, Section owner, String name, Dial dial) {
    Optional<Field> range = scale.optional(prefix + "range");
    OptionalDouble low = OptionalDouble.empty();
    OptionalDouble high = OptionalDouble.empty();
    if (range.isPresent()) {
      double[] ends = ends(range.get(), dial, owner);
      if (ends.length < 2) {
        return;
      }
      low = OptionalDouble.of(ends[0]);
      high = OptionalDouble.of(ends[1]);
    }
    OptionalDouble step = scale.optionalNumber(prefix + "step", dial.dimension(), Range.POSITIVE);
    if (low.isPresent()
        && step.isPresent()
        && step.getAsDouble() > high.getAsDouble() - low.getAsDouble()) {
      scale
          .optional(prefix + "step")
          .get()
          .mistake("expected a step within the range of the dial but found a greater one");
    }
    OptionalDouble error = scale.optionalNumber(prefix + "error", Dimension.SHARE, Range.SPREAD);
    if (error.isPresent() && range.isEmpty()) {
      scale
          .optional(prefix + "error")
          .get()
          .mistake(
              "expected "
                  + prefix
                  + "range beside "
                  + prefix
                  + "error but found none: the error is a share of the end of the scale");
      return;
    }
    if (!Double.isNaN(step.orElse(0.0)) && !Double.isNaN(error.orElse(0.0))) {
      owner
          .reading()
          .dialScale(name + "." + dial.key(), new DialScale(low, high, step, error.orElse(0.0)));
    }
  }

  /** Least and greatest setting; nothing after a mistake. */
  private static double[] ends(Field range, Dial dial, Section owner) {
    double[] none = {};
    String expected = "a list of the least and the greatest setting";
    Optional<List<Field>> list = range.list(expected);
    if (list.isEmpty()) {
      return none;
    }
    if (list.get().size() != 2) {
      range.mistake("expected " + expected + " but found a list of " + list.get().size());
      return none;
    }
    double low = list.get().get(0).number(dial.dimension(), Range.NOT_NEGATIVE);
    double high = list.get().get(1).number(dial.dimension(), Range.POSITIVE);
    if (Double.isNaN(low) || Double.isNaN(high)) {
      return none;
    }
    if (!(low < high)) {
      range.mistake("expected a greatest setting above the least but found one that is not");
      return none;
    }
    Field setting = owner.optional(dial.key()).orElseThrow();
    OptionalDouble set = owner.reading().number(setting.path());
    if (set.isPresent()
        && (set.getAsDouble() < low * (1.0 - ROUNDING)
            || set.getAsDouble() > high * (1.0 + ROUNDING))) {
      range.mistake(
          "expected a range that holds the setting of line "
              + setting.value().place().line()
              + ", "
              + setting.value().found()
              + ", but found one that does not");
      return none;
    }
    return new double[] {low, high};
  }
}
