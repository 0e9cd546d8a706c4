package sliprung.rulebook;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import sliprung.quantity.Show;
import sliprung.starter.AcceptedDeviation;

/**
 * Accepted deviations: a breach or tight margin that a named role answers for until a date and down
 * to a margin. What it does not cover stays what it is; an acceptance that covers nothing is a
 * finding.
 */
final class Acceptance {
  static final Rule.Info INFO =
      new Rule.Info(
          "data/accepted",
          "Does every accepted deviation still meet a finding?",
          "common practice",
          List.of("accepted"));

  private final Facts facts;
  private final LocalDate date;
  private final Set<AcceptedDeviation> used = new HashSet<>();

  Acceptance(Facts facts, LocalDate date) {
    this.facts = facts;
    this.date = date;
  }

  /** The finding, accepted where a deviation covers it. */
  Finding apply(Finding finding) {
    boolean open = finding.verdict() == Verdict.BREACH || finding.verdict() == Verdict.TIGHT;
    Optional<AcceptedDeviation> match =
        open ? RuleBook.matching(finding, facts.starter().accepted()) : Optional.empty();
    if (match.isEmpty()) {
      return finding;
    }
    AcceptedDeviation deviation = match.get();
    used.add(deviation);
    if (date.isAfter(deviation.until())) {
      return said(finding, " Was accepted until " + deviation.until() + "; that day has passed.");
    }
    if (finding.margin().isEmpty() || finding.margin().getAsDouble() < deviation.notBelow()) {
      return said(
          finding,
          " The acceptance holds down to "
              + Show.ratio(deviation.notBelow())
              + " and does not cover this.");
    }
    return new Finding(
        finding.rule(),
        Verdict.ACCEPTED,
        finding.subject(),
        finding.start(),
        finding.edge(),
        finding.margin(),
        finding.wanted(),
        finding.limit(),
        finding.value(),
        finding.unit(),
        finding.says() + " Accepted: " + deviation.reason(),
        finding.mend(),
        finding.reference(),
        finding.missing(),
        finding.weakestInput(),
        Optional.of(deviation.by()),
        Optional.of(deviation.until()));
  }

  private static Finding said(Finding finding, String more) {
    return new Finding(
        finding.rule(),
        finding.verdict(),
        finding.subject(),
        finding.start(),
        finding.edge(),
        finding.margin(),
        finding.wanted(),
        finding.limit(),
        finding.value(),
        finding.unit(),
        finding.says() + more,
        finding.mend(),
        finding.reference(),
        finding.missing(),
        finding.weakestInput(),
        Optional.empty(),
        Optional.empty());
  }

  /** Acceptances that covered nothing. */
  List<Finding> findings() {
    List<Finding> out = new ArrayList<>();
    for (AcceptedDeviation deviation : facts.starter().accepted()) {
      if (!used.contains(deviation)) {
        out.add(
            FindingBuilder.of(facts, INFO, deviation.rule() + " " + deviation.subject())
                .says(
                    "The acceptance of "
                        + deviation.rule()
                        + " for "
                        + deviation.subject()
                        + " meets no breach and no tight margin.")
                .mend("Remove it, or correct its rule and subject.")
                .build(Verdict.TIGHT));
      }
    }
    return out;
  }
}
