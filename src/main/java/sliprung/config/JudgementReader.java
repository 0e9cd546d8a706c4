package sliprung.config;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import sliprung.quantity.Dimension;
import sliprung.starter.AcceptedDeviation;
import sliprung.starter.Distribution;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Varying;

/** Reads what bears on the judgement: wanted margins, evidence, accepted deviations. */
final class JudgementReader {
  private final Section root;
  private final Set<String> knownRules;

  JudgementReader(Section root, Set<String> knownRules) {
    this.root = root;
    this.knownRules = knownRules;
  }

  Map<String, Double> margins() {
    Map<String, Double> margins = new TreeMap<>();
    Optional<Field> field = root.optional("margins");
    if (field.isEmpty()) {
      return margins;
    }
    for (Field margin : field.get().section().fields()) {
      double wanted = margin.number(Dimension.NUMBER, Range.POSITIVE);
      if (!knownRules.contains(margin.key())) {
        root.reading()
            .mistake(
                margin.keyPlace(),
                margin.path(),
                "expected the name of a rule but found '" + Wording.clip(margin.key()) + "'",
                Wording.nearest(margin.key(), knownRules)
                    .map(w -> "did you mean '" + w + "'?")
                    .or(() -> Optional.of("a rule is named as its family/slug")));
      }
      margins.put(margin.key(), wanted);
    }
    return margins;
  }

  /** Read last: by then every path of the format has been seen. */
  Map<String, EvidenceGrade> evidence() {
    Map<String, EvidenceGrade> evidence = new TreeMap<>();
    Optional<Field> field = root.optional("evidence");
    if (field.isEmpty()) {
      return evidence;
    }
    Set<String> paths = Set.copyOf(root.reading().knownPaths());
    Map<String, EvidenceGrade> grades = new LinkedHashMap<>();
    for (EvidenceGrade grade : EvidenceGrade.values()) {
      grades.put(grade.word(), grade);
    }
    for (Field input : field.get().section().fields()) {
      if (!paths.contains(input.key())) {
        root.reading()
            .mistake(
                input.keyPlace(),
                input.path(),
                "expected the path of an input but found '" + Wording.clip(input.key()) + "'",
                Wording.nearest(input.key(), paths)
                    .map(w -> "did you mean '" + w + "'?")
                    .or(() -> Optional.of("write for example 'load.inertia'")));
      }
      input.choice(grades).ifPresent(g -> evidence.put(input.key(), g));
    }
    return evidence;
  }

  Map<Varying, Distribution> distributions() {
    Map<Varying, Distribution> distributions = new TreeMap<>();
    Optional<Field> field = root.optional("distributions");
    if (field.isEmpty()) {
      return distributions;
    }
    Map<String, Distribution> kinds = new LinkedHashMap<>();
    for (Distribution kind : Distribution.values()) {
      kinds.put(kind.word(), kind);
    }
    String[] keys = Arrays.stream(Varying.values()).map(Varying::word).toArray(String[]::new);
    Section section = field.get().section(keys);
    for (Varying varying : Varying.values()) {
      section
          .optional(varying.word())
          .flatMap(f -> f.choice(kinds))
          .ifPresent(kind -> distributions.put(varying, kind));
    }
    return distributions;
  }

  List<AcceptedDeviation> accepted() {
    List<AcceptedDeviation> accepted = new ArrayList<>();
    Optional<Field> field = root.optional("accepted");
    for (Field entry : field.flatMap(f -> f.list("a list of deviations")).orElse(List.of())) {
      accepted(entry).ifPresent(accepted::add);
    }
    return accepted;
  }

  private static Optional<AcceptedDeviation> accepted(Field entry) {
    Section section = entry.section("rule", "subject", "not-below", "reason", "by", "until");
    Optional<Field> ruleField =
        section.required("rule", "the name of a rule", "contactor/line-category");
    Optional<String> rule = ruleField.flatMap(f -> f.text("the name of a rule"));
    if (rule.isPresent() && !rule.get().matches("[a-z-]+/[a-z-]+")) {
      ruleField
          .get()
          .mistake(
              "expected the name of a rule as family/slug but found "
                  + ruleField.get().value().found(),
              "write for example 'contactor/line-category'");
    }
    Optional<String> subject = section.text("subject", "the device or part", "K1");
    double notBelow = section.number("not-below", Dimension.NUMBER, Range.NOT_NEGATIVE);
    Optional<String> reason = section.text("reason", "the reason", "tested combination, report 7");
    Optional<String> by = section.text("by", "the role that answers for it", "chief electrician");
    Optional<LocalDate> until =
        section.required("until", "the last day", "2027-06-30").flatMap(JudgementReader::date);
    return rule.isPresent()
            && subject.isPresent()
            && reason.isPresent()
            && by.isPresent()
            && until.isPresent()
        ? Optional.of(
            new AcceptedDeviation(
                rule.get(),
                subject.get(),
                notBelow,
                reason.get(),
                by.get(),
                until.get(),
                Optional.of(entry.keyPlace().fileAndLine())))
        : Optional.empty();
  }

  private static Optional<LocalDate> date(Field field) {
    Optional<String> text = field.text("a date");
    try {
      return text.map(LocalDate::parse);
    } catch (DateTimeParseException e) {
      field.mistake(
          "expected a date but found " + field.value().found(), "write for example '2027-06-30'");
      return Optional.empty();
    }
  }
}
