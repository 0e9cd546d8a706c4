package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;

/** {@code resistor/start}: every section stands every permitted start of its series. */
public final class EverySectionStandsThePermittedStarts implements Rule {
  private static final Info INFO =
      new Info(
          "resistor/start",
          "Does every section stand every permitted start, to the end of its series?",
          "common practice; ratings as declared for the bank",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "timer-spread",
              "duty"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (int section = 1; section <= facts.starter().sectionCount(); section++) {
      findings.add(judge(facts, section));
    }
    return Answer.of(findings, "the bank has no sections");
  }

  private static Finding judge(Facts facts, int section) {
    String part = "section-" + section;
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "section " + section);
    ComputedStart worst = null;
    PartResponse response = null;
    for (ComputedStart start : facts.permitted().toList()) {
      PartResponse found = start.part(part).orElseThrow();
      if (found.missing().isPresent()) {
        return builder.notJudged(
            List.of(found.missing().get()),
            Exposure.name(part) + " has no usable pair of ratings.");
      }
      if (response == null || found.use() > response.use()) {
        worst = start;
        response = found;
      }
    }
    double margin = response.use() > 0.0 ? 1.0 / response.use() : Double.POSITIVE_INFINITY;
    return builder
        .at(worst)
        .margin(margin)
        .figures(response.use(), 1.0, "share of limit")
        .says(
            Exposure.name(part)
                + " comes to "
                + Show.percent(response.use())
                + " of its limit in a "
                + worst.words()
                + (response.energyJoules().isPresent()
                    ? ", taking " + Show.three(response.energyJoules().getAsDouble() / 1e3) + " kJ"
                    : "")
                + ".")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Shorten the step, permit fewer starts in a row, or take a stronger section."
                : "")
        .byMargin();
  }
}
