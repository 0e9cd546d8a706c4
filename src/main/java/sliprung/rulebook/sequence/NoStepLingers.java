package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Trace;

/**
 * {@code sequence/late}: no step lasts long after the motor has settled on it. Judged by the start
 * that settles latest: where even that one waits, the step can be shortened at every corner. Tight
 * at most, since waiting only heats the bank, which other rules hold against its limits.
 */
public final class NoStepLingers implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/late",
          "Does any step last long after the motor has settled on it, even in the start that settles"
              + " latest?",
          "common practice",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "sequence",
              "timer-spread",
              "level-spread"));

  private record Wait(Closing closing, double seconds, double share) {}

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      judge(facts, step).ifPresent(findings::add);
    }
    return Answer.of(findings, "no step contactor closes in any permitted start");
  }

  private static Optional<Finding> judge(Facts facts, int step) {
    double gain = facts.practice().figure("late.gain").value() * facts.machine().synchronousSpeed();
    double allowed = facts.practice().figure("late.share").value();
    Wait least = null;
    for (Closing closing : Closing.of(facts, step)) {
      Wait wait = wait(closing, gain);
      least = least == null || wait.share() < least.share() ? wait : least;
    }
    if (least == null) {
      return Optional.empty();
    }
    double margin = least.share() > 0.0 ? allowed / least.share() : Double.POSITIVE_INFINITY;
    boolean late = margin < facts.wanted(INFO.name());
    Trace trace = least.closing().before().trace();
    double length = trace.seconds()[trace.last()] - trace.seconds()[0];
    FindingBuilder builder =
        FindingBuilder.of(facts, INFO, "step " + step)
            .at(least.closing().start())
            .figures(least.share(), allowed, "share of the step's time")
            .says(
                "Of the "
                    + Show.seconds(length)
                    + " on step "
                    + step
                    + " the last "
                    + Show.seconds(least.seconds())
                    + " gain less than "
                    + Show.percent(facts.practice().figure("late.gain").value())
                    + " of synchronous speed, at "
                    + Show.amps(trace.statorAmps()[trace.last()])
                    + ", in the start that settles latest.");
    // no margin where it is late: under 1 it would read as a limit that is not met
    return Optional.of(
        late
            ? builder
                .mend("Close step contactor " + step + " sooner: waiting only heats the bank.")
                .build(Verdict.TIGHT)
            : builder.margin(margin).byMargin());
  }

  /** When, between two samples, the speed comes within the gain; to a millionth of the piece. */
  private static double crossing(Trace trace, int later, double speed, double gain) {
    double beyond = trace.seconds()[later - 1];
    double within = trace.seconds()[later];
    for (int halving = 0; halving < 20; halving++) {
      double middle = 0.5 * (beyond + within);
      if (Math.abs(speed - trace.at(trace.speed(), middle)) < gain) {
        within = middle;
      } else {
        beyond = middle;
      }
    }
    return within;
  }

  /** How long before the closing the speed came within that gain of the speed at the closing. */
  private static Wait wait(Closing closing, double gain) {
    Trace trace = closing.before().trace();
    double end = trace.seconds()[trace.last()];
    double speed = trace.speed()[trace.last()];
    int i = trace.last();
    while (i > 0 && Math.abs(speed - trace.speed()[i - 1]) < gain) {
      i--;
    }
    double length = end - trace.seconds()[0];
    double seconds = end - (i == 0 ? trace.seconds()[0] : crossing(trace, i, speed, gain));
    return new Wait(closing, seconds, length > 0.0 ? seconds / length : 0.0);
  }
}
