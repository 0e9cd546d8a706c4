package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.SectionElement;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Duty;
import sliprung.starter.ResistorBank;

/**
 * {@code resistor/duty}: every section stands the starts of an hour for ever, evenly apart and
 * bunched in the longest permitted series, with what the enclosure's air keeps between them.
 */
public final class EverySectionStandsTheStartsOfAnHour implements Rule {
  private static final Info INFO =
      new Info(
          "resistor/duty",
          "Does every section stand the starts of an hour, day after day?",
          "common practice; ratings as declared for the bank",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors",
              "steps",
              "timer-spread",
              "level-spread",
              "duty"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    ResistorBank bank = facts.starter().resistors();
    Optional<String> missing = Optional.empty();
    List<SectionElement> elements = new ArrayList<>();
    for (int number = 1; number <= bank.sections().size(); number++) {
      Optional<SectionElement> element = SectionElement.of(bank, number);
      if (element.isEmpty() && missing.isEmpty()) {
        missing = SectionElement.missing(bank, number);
      }
      element.ifPresent(elements::add);
    }
    for (int number = 1; number <= bank.sections().size(); number++) {
      findings.add(judge(facts, elements, missing, number));
    }
    return Answer.of(findings, "the bank has no sections");
  }

  private static Finding judge(
      Facts facts, List<SectionElement> elements, Optional<String> missing, int number) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "section " + number);
    Duty duty = facts.starter().duty();
    if (duty.startsPerHour().isEmpty()) {
      return builder.notJudged(
          List.of("duty.starts.per-hour"), "How many starts an hour are permitted is not given.");
    }
    if (missing.isPresent()) {
      // the air is warmed by every section: one without ratings leaves all of them open
      return builder.notJudged(
          List.of(missing.get()), "A section of the bank has no usable pair of ratings.");
    }
    double perHour = startsPerHour(facts);
    int inARow = Math.max(1, Math.max(duty.coldStarts(), duty.hotStarts()));
    double share = facts.practice().figure("duty.air-share").value();
    ComputedStart worst = null;
    double greatest = -1.0;
    boolean bunched = false;
    for (ComputedStart start :
        facts
            .permitted()
            .filter(s -> s.place() == 1 && s.from() == ComputedStart.From.COLD)
            .toList()) {
      RepeatedStarts repeated =
          RepeatedStarts.of(facts.starter().resistors(), elements, number, start.history());
      double even = repeated.peak(1, 3600.0 / perHour, share);
      double group = inARow > 1 ? repeated.peak(inARow, inARow * 3600.0 / perHour, share) : even;
      if (Math.max(even, group) > greatest) {
        greatest = Math.max(even, group);
        worst = start;
        bunched = group > even;
      }
    }
    if (worst == null) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    double margin = greatest > 0.0 ? 1.0 / greatest : Double.POSITIVE_INFINITY;
    return builder
        .at(worst)
        .margin(margin)
        .figures(greatest, 1.0, "share of limit")
        .says(
            Exposure.name("section-" + number)
                + " comes to "
                + Show.percent(greatest)
                + " of its limit with "
                + Show.three(perHour)
                + " starts an hour"
                + counted(facts)
                + (bunched
                    ? ", " + inARow + " in a row every " + Show.seconds(inARow * 3600.0 / perHour)
                    : ", evenly apart")
                + "; the enclosure's air keeps the heat "
                + Show.seconds(facts.starter().resistors().enclosureSeconds())
                + ".")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Permit fewer starts an hour, ventilate the bank, or take a stronger section."
                : "")
        .byMargin();
  }

  /** Inching and plugging count as the starts that their heat in the rotor circuit amounts to. */
  private static double startsPerHour(Facts facts) {
    Duty duty = facts.starter().duty();
    double inch = facts.practice().figure("duty.inch-in-starts").value();
    double plug = facts.practice().figure("duty.plug-in-starts").value();
    return duty.startsPerHour().orElseThrow()
        + inch * duty.inching().map(Duty.Repeated::perHour).orElse(0.0)
        + plug * duty.plugging().map(Duty.Repeated::perHour).orElse(0.0);
  }

  private static String counted(Facts facts) {
    Duty duty = facts.starter().duty();
    List<String> counted = new ArrayList<>();
    counted.add(Show.three(duty.startsPerHour().orElseThrow()) + " as such");
    duty.inching().ifPresent(i -> counted.add(each(facts, i, "inching", "duty.inch-in-starts")));
    duty.plugging().ifPresent(p -> counted.add(each(facts, p, "plugging", "duty.plug-in-starts")));
    return counted.size() == 1 ? "" : " (" + String.join(", ", counted) + ")";
  }

  /** {@code 20 from 5 pluggings counted as 4 starts each}. */
  private static String each(Facts facts, Duty.Repeated repeated, String what, String key) {
    double starts = facts.practice().figure(key).value();
    return Show.three(starts * repeated.perHour())
        + " from "
        + Show.three(repeated.perHour())
        + " times "
        + what
        + ", which counts as "
        + Show.three(starts)
        + (starts == 1.0 ? " start" : " starts")
        + " each";
  }
}
