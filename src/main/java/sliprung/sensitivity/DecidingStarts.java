package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.review.StartSelection;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.runup.Scenario;
import sliprung.sensitivity.MeasureFirst.Question;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/**
 * The starts that some margins rest on: asked of these alone, the rules give the margins of the
 * whole review.
 *
 * @param selection the starts
 * @param findings whose margins they give
 */
record DecidingStarts(StartSelection selection, List<Finding> findings) {
  private static final double SAME = 1e-9;

  /**
   * For each finding the fewest starts that give its margin: those at the corners that decide, by
   * the steady circuit where that feeds devices and parts, then with the transient's peaks, then
   * every start of the review. A finding whose margin not even these give is left out.
   */
  static List<DecidingStarts> of(Review review, List<Finding> findings) {
    Starter.Method method = review.method().map(m -> m.used()).orElse(review.starter().method());
    Set<Scenario> every = new HashSet<>();
    Set<Corner> everywhere = new LinkedHashSet<>(List.of(Corner.NOMINAL));
    for (ComputedStart start : review.starts()) {
      everywhere.add(start.corner());
      every.add(start.scenario());
    }
    Set<Corner> here = new LinkedHashSet<>(List.of(Corner.NOMINAL));
    findings.forEach(f -> here.add(f.start().orElseThrow().corner()));
    List<StartSelection> wider = new ArrayList<>();
    if (method == Starter.Method.STEADY) {
      wider.add(new StartSelection(List.copyOf(here), every, method, false));
    }
    wider.add(new StartSelection(List.copyOf(here), every, method, true));
    wider.add(new StartSelection(List.copyOf(everywhere), every, method, true));
    List<DecidingStarts> all = new ArrayList<>();
    List<Finding> left = findings;
    for (StartSelection selection : wider) {
      if (left.isEmpty()) {
        break;
      }
      Map<Question, OptionalDouble> margins =
          new DecidingStarts(selection, left).margins(review.starter());
      Map<Boolean, List<Finding>> given =
          left.stream().collect(Collectors.partitioningBy(f -> gives(margins, f)));
      if (!given.get(true).isEmpty()) {
        all.add(new DecidingStarts(selection, given.get(true)));
      }
      left = given.get(false);
    }
    return List.copyOf(all);
  }

  private static boolean gives(Map<Question, OptionalDouble> margins, Finding finding) {
    OptionalDouble margin = margins.getOrDefault(Question.of(finding), OptionalDouble.empty());
    double judged = finding.margin().orElseThrow();
    return margin.isPresent()
        && Math.abs(margin.getAsDouble() - judged) <= SAME * Math.max(1.0, Math.abs(judged));
  }

  /**
   * The margins of that starter by question, the least over its circuits; empty where one of them
   * leaves the question without.
   */
  Map<Question, OptionalDouble> margins(Starter starter) {
    Set<String> rules = findings.stream().map(Finding::rule).collect(Collectors.toSet());
    Map<Question, OptionalDouble> margins = new HashMap<>();
    for (Facts facts : Reviewer.facts(starter, selection)) {
      for (Rule rule : Catalogue.rules()) {
        if (rules.contains(rule.info().name())
            && rule.judge(facts) instanceof Rule.Answer.Findings some) {
          some.findings()
              .forEach(f -> margins.merge(Question.of(f), margin(f), (a, b) -> least(a, b)));
        }
      }
    }
    return margins;
  }

  private static OptionalDouble margin(Finding finding) {
    return finding.verdict() == Verdict.NOT_JUDGED ? OptionalDouble.empty() : finding.margin();
  }

  private static OptionalDouble least(OptionalDouble a, OptionalDouble b) {
    return a.isEmpty() || b.isEmpty()
        ? OptionalDouble.empty()
        : OptionalDouble.of(Math.min(a.getAsDouble(), b.getAsDouble()));
  }
}
