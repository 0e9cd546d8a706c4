package sliprung.config;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.quantity.Dimension;
import sliprung.starter.Contactor;
import sliprung.starter.Step;

/** Reads {@code steps}, against the contactors and sections that were read. */
final class StepsReader {
  private static final List<String> RULES =
      List.of("after", "stator-below", "rotor-below", "rotor-frequency-below");

  private static final List<DialReader.Dial> DIALS =
      List.of(
          new DialReader.Dial("after", Dimension.TIME),
          new DialReader.Dial("stator-below", Dimension.CURRENT),
          new DialReader.Dial("rotor-below", Dimension.CURRENT),
          new DialReader.Dial("rotor-frequency-below", Dimension.FREQUENCY),
          new DialReader.Dial("at-least", Dimension.TIME));

  private final Switchgear switchgear;
  private final Map<String, Field> used = new HashMap<>();

  private StepsReader(Switchgear switchgear) {
    this.switchgear = switchgear;
  }

  static List<Step> read(Section root, Switchgear switchgear, int sections) {
    return new StepsReader(switchgear).steps(root, sections);
  }

  private List<Step> steps(Section root, int sections) {
    Optional<Field> field =
        root.required("steps", "a list of steps", "[{contactor: K11, after: 4.2 s}]");
    Optional<List<Field>> entries = field.flatMap(f -> f.list("a list of steps"));
    if (entries.isEmpty()) {
      return List.of();
    }
    if (sections > 0 && entries.get().size() != sections) {
      field
          .get()
          .mistake(
              "expected one step for each of the "
                  + sections
                  + " sections but found "
                  + entries.get().size());
    }
    List<Step> steps = new ArrayList<>();
    for (Field entry : entries.get()) {
      steps.add(step(entry));
    }
    return steps;
  }

  private Step step(Field entry) {
    Section step =
        entry.section(
            "contactor",
            "after",
            "stator-below",
            "rotor-below",
            "rotor-frequency-below",
            "at-least",
            "dial-range",
            "dial-step",
            "dial-error",
            "dials");
    String contactor = contactor(step);
    List<String> given = RULES.stream().filter(step::has).toList();
    if (given.size() != 1 && !step.isSilent()) {
      entry.mistake(
          "expected one of "
              + String.join(", ", RULES)
              + " but found "
              + (given.isEmpty() ? "none" : String.join(" and ", given)));
    }
    double atLeast =
        step.optionalNumber("at-least", Dimension.TIME, Range.NOT_NEGATIVE).orElse(0.0);
    if (step.has("at-least") && given.equals(List.of("after"))) {
      step.optional("at-least")
          .get()
          .mistake(
              "expected at-least beside a level only but found it beside after",
              "the time of after is the dwell itself: leave at-least out");
    }
    Step.ClosingRule rule = new Step.After(Double.NaN);
    for (String key : given) {
      rule = rule(step.optional(key).get(), key);
    }
    DialReader.read(step, "steps." + contactor, DIALS);
    return new Step(contactor, rule, atLeast);
  }

  private static Step.ClosingRule rule(Field field, String key) {
    return switch (key) {
      case "after" -> new Step.After(field.number(Dimension.TIME, Range.NOT_NEGATIVE));
      case "stator-below" -> new Step.StatorBelow(field.number(Dimension.CURRENT, Range.POSITIVE));
      case "rotor-below" -> new Step.RotorBelow(field.number(Dimension.CURRENT, Range.POSITIVE));
      default -> new Step.RotorFrequencyBelow(field.number(Dimension.FREQUENCY, Range.POSITIVE));
    };
  }

  private String contactor(Section step) {
    Optional<Field> field = step.required("contactor", "the tag of a step contactor", "K11");
    Optional<String> tag = field.flatMap(f -> f.text("the tag of a step contactor"));
    if (tag.isEmpty()) {
      return "";
    }
    if (!switchgear.readable()) {
      return tag.get();
    }
    Optional<Contactor> contactor = switchgear.contactor(tag.get());
    if (contactor.isEmpty()) {
      field
          .get()
          .mistake(
              "expected a contactor described under contactors but found '"
                  + Wording.clip(tag.get())
                  + "'",
              "described are " + switchgear.contactorTags());
    } else if (switchgear.placeKnown(tag.get())
        && contactor.get().place() != Contactor.Place.ROTOR) {
      field
          .get()
          .mistake(
              "expected a contactor with place rotor but found '"
                  + Wording.clip(tag.get())
                  + "' with place line");
    }
    Field before = used.putIfAbsent(tag.get(), field.get());
    if (before != null) {
      field
          .get()
          .mistake(
              "expected a contactor of its own for each step but found '"
                  + Wording.clip(tag.get())
                  + "' again; the first is on line "
                  + before.value().place().line());
    }
    return tag.get();
  }
}
