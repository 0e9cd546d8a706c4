package sliprung.rulebook;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
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
    Map<String, List<String>> inputs = new HashMap<>();
    rules.forEach(rule -> inputs.put(rule.info().name(), rule.info().inputs()));
    Map<Finding, List<String>> restsOn = new IdentityHashMap<>();
    for (Finding finding : findings) {
      if (finding.verdict() != Verdict.NOT_JUDGED) {
        restsOn.put(
            finding,
            inputs.getOrDefault(finding.rule(), List.of()).stream()
                .map(path -> path.replace("{subject}", finding.subject()))
                .toList());
      }
    }
    TreeMap<String, Group> groups = new TreeMap<>();
    for (Assumption assumption : facts.starter().assumptions()) {
      restsOn.forEach(
          (finding, roots) -> {
            if (Facts.underAny(assumption.path(), roots)) {
              groups
                  .computeIfAbsent(subject(assumption.path()), s -> new Group())
                  .add(assumption, finding);
            }
          });
    }
    List<Finding> out = new ArrayList<>();
    groups.forEach(
        (subject, group) ->
            out.add(
                FindingBuilder.of(facts, INFO, subject)
                    .says(
                        "Not given and taken: "
                            + String.join(", ", group.defaults)
                            + ". Decided "
                            + String.join(", ", group.rules)
                            + ".")
                    .mend("Give them where they differ.")
                    .build(group.thin ? Verdict.TIGHT : Verdict.CLEAR)));
    return out;
  }

  /** The defaults of one device, or of one top key, that decided something. */
  private static final class Group {
    private final LinkedHashSet<String> defaults = new LinkedHashSet<>();
    private final TreeSet<String> rules = new TreeSet<>();
    private boolean thin;

    void add(Assumption assumption, Finding finding) {
      defaults.add(key(assumption.path()) + " " + assumption.value());
      rules.add(finding.rule());
      thin |= finding.verdict() == Verdict.BREACH || finding.verdict() == Verdict.TIGHT;
    }
  }

  /** {@code protection.F2} or {@code resistors}. */
  private static String subject(String path) {
    String[] parts = path.split("\\.");
    boolean tagged = parts.length > 2 && TAGGED.contains(parts[0]);
    return tagged ? parts[0] + "." + parts[1] : parts[0];
  }

  private static String key(String path) {
    String subject = subject(path);
    return path.length() > subject.length() ? path.substring(subject.length() + 1) : path;
  }

  private static final Set<String> TAGGED = Set.of("protection", "contactors", "breakers");
}
