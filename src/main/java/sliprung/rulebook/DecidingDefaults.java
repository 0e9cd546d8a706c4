package sliprung.rulebook;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import sliprung.starter.Assumption;

/** Rule {@code data/assumed}: every default that decided a verdict. */
public final class DecidingDefaults {

  /** What the catalogue says of it. */
  public static final Rule.Info INFO =
      new Rule.Info(
          "data/assumed",
          "Which defaults, filled in because the file is silent, decided a verdict?",
          "common practice",
          List.of());

  private DecidingDefaults() {}

  static List<Finding> findings(Facts facts, List<Rule> rules, List<Finding> findings) {
    List<Finding> out = new ArrayList<>();
    for (Assumption assumption : facts.starter().assumptions()) {
      TreeSet<String> decided = new TreeSet<>();
      boolean thin = false;
      for (Finding finding : findings) {
        if (finding.verdict() == Verdict.NOT_JUDGED) {
          continue;
        }
        Rule.Info info =
            rules.stream()
                .map(Rule::info)
                .filter(i -> i.name().equals(finding.rule()))
                .findFirst()
                .orElseThrow();
        List<String> roots =
            info.inputs().stream()
                .map(path -> path.replace("{subject}", finding.subject()))
                .toList();
        if (Facts.underAny(assumption.path(), roots)) {
          decided.add(finding.rule());
          thin |= finding.verdict() == Verdict.BREACH || finding.verdict() == Verdict.TIGHT;
        }
      }
      if (!decided.isEmpty()) {
        out.add(
            FindingBuilder.of(facts, INFO, assumption.path())
                .says(
                    assumption.path()
                        + " is not given: "
                        + assumption.value()
                        + " was taken, and decided "
                        + String.join(", ", decided)
                        + ".")
                .mend("Give " + assumption.path() + ".")
                .build(thin ? Verdict.TIGHT : Verdict.CLEAR));
      }
    }
    return out;
  }
}
