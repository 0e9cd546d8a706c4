package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/**
 * {@code sequence/spread}: the contactors close in their order whatever timers and levels are early
 * or late.
 *
 * <p>Chained, a rule counts from the main contacts of the closing before, so that no spread can
 * swap two. Cascaded, contactor k is told at F(k) and closes c(k) later, and the next is told no
 * sooner than its own shortest time after F(k): the order holds where that time and c(k+1) exceed
 * c(k). A level has no shortest time but its least dwell, since with the contactor before still
 * open it may be met at once.
 */
public final class TheStepsKeepTheirOrder implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/spread",
          "Do the step contactors close in their order, whatever timers and levels are early or late?",
          "common practice",
          List.of("steps", "sequence", "timer-spread", "contactors"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Starter starter = facts.starter();
    if (starter.sectionCount() < 2) {
      return new Answer.NotApplicable("one step contactor has no order");
    }
    if (starter.sequence() == Starter.Sequence.CHAINED) {
      return new Answer.Findings(
          List.of(
              FindingBuilder.of(facts, INFO, "sequence")
                  .says(
                      "The "
                          + starter.sectionCount()
                          + " step contactors are chained: each waits for the main contacts of the"
                          + " one before, so that no spread swaps two.")
                  .build(Verdict.CLEAR)));
    }
    List<Finding> findings = new ArrayList<>();
    for (int step = 2; step <= starter.sectionCount(); step++) {
      findings.add(judge(facts, step));
    }
    return new Answer.Findings(findings);
  }

  private static Finding judge(Facts facts, int step) {
    Starter starter = facts.starter();
    Step rule = starter.steps().get(step - 1);
    double told = soonest(rule) * (1.0 - starter.timerSpread());
    double own = closingSeconds(starter, step);
    double before = closingSeconds(starter, step - 1);
    double closes = told + own;
    double margin = before > 0.0 ? closes / before : Double.POSITIVE_INFINITY;
    String tag = rule.contactor();
    String tagBefore = starter.steps().get(step - 2).contactor();
    return FindingBuilder.of(facts, INFO, "step " + step)
        .margin(margin)
        .figures(before, closes, "s")
        .says(
            "Once "
                + tagBefore
                + " is told to close it takes "
                + Show.seconds(before)
                + "; "
                + tag
                + " may be closed "
                + Show.seconds(closes)
                + " after that order ("
                + Show.seconds(told)
                + (rule.rule().isLevel() ? " of least dwell, " : " of its timer at its shortest, ")
                + Show.seconds(own)
                + " to close)."
                + (margin < 1.0 ? " It may come first: two sections go at once." : ""))
        .mend(
            margin < facts.wanted(INFO.name())
                ? rule.rule().isLevel()
                    ? "Give the level a least dwell, or chain the steps."
                    : "Set its timer longer, or chain the steps."
                : "")
        .byMargin();
  }

  /** The shortest time, nominal, between the order before and this one. */
  private static double soonest(Step step) {
    return step.rule() instanceof Step.After after ? after.seconds() : step.atLeastSeconds();
  }

  private static double closingSeconds(Starter starter, int step) {
    return starter
        .contactor(starter.steps().get(step - 1).contactor())
        .orElseThrow()
        .closingSeconds();
  }
}
