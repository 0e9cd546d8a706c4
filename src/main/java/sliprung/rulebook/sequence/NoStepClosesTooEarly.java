package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Stage;
import sliprung.starter.Limits;

/**
 * {@code sequence/early}: no closing current exceeds the plant's limit, and no step closes past the
 * breakdown slip of the circuit it makes, where the current rises and the torque falls.
 */
public final class NoStepClosesTooEarly implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/early",
          "Does any step close so early that its current exceeds the plant's limit or its torque"
              + " falls?",
          "common practice",
          List.of(
              "supply.band",
              "supply.fault-current",
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
              "level-spread",
              "limits.closing-current"));

  /** What one closing comes to. */
  private record Case(
      ComputedStart start, double margin, double value, double limit, String unit, String says) {}

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    lineClosing(facts).ifPresent(findings::add);
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      step(facts, step).ifPresent(findings::add);
    }
    return Answer.of(findings, "no step contactor closes in any permitted start");
  }

  /** The first current is no closing of a step, but the plant's limit holds for it too. */
  private static Optional<Finding> lineClosing(Facts facts) {
    Case worst = null;
    for (ComputedStart start : Closing.starts(facts).toList()) {
      Stage first = start.history().stages().get(0);
      for (Case found : limits(facts, start, first, "On step 1 the line contactor closes onto ")) {
        worst = worst == null || found.margin() < worst.margin() ? found : worst;
      }
    }
    return Optional.ofNullable(worst)
        .map(w -> finding(facts, "line closing", w, "Raise the resistance of step 1."));
  }

  private static Optional<Finding> step(Facts facts, int step) {
    Case worst = null;
    for (Closing closing : Closing.of(facts, step)) {
      List<Case> cases =
          limits(
              facts,
              closing.start(),
              closing.after(),
              "At " + Show.rpm(closing.speed()) + " step contactor " + step + " closes onto ");
      cases.add(breakdown(facts, closing));
      for (Case found : cases) {
        worst = worst == null || found.margin() < worst.margin() ? found : worst;
      }
    }
    return Optional.ofNullable(worst)
        .map(
            w ->
                finding(
                    facts,
                    "step " + step,
                    w,
                    "Let step contactor "
                        + step
                        + " close later, or leave more resistance in after it."));
  }

  private static Finding finding(Facts facts, String subject, Case worst, String mend) {
    return FindingBuilder.of(facts, INFO, subject)
        .at(worst.start())
        .margin(worst.margin())
        .figures(worst.value(), worst.limit(), worst.unit())
        .says(worst.says())
        .mend(worst.margin() < facts.wanted(INFO.name()) ? mend : "")
        .byMargin();
  }

  private static List<Case> limits(Facts facts, ComputedStart start, Stage after, String begins) {
    Limits limits = facts.starter().limits();
    List<Case> cases = new ArrayList<>();
    limit(
        cases,
        start,
        after.entry().statorAmps(),
        limits.closingStatorAmps(),
        begins,
        " in the stator");
    limit(
        cases, start, after.entry().ringAmps(), limits.closingRotorAmps(), begins, " in the rings");
    return cases;
  }

  private static void limit(
      List<Case> cases,
      ComputedStart start,
      double amps,
      OptionalDouble limit,
      String begins,
      String where) {
    if (limit.isPresent()) {
      double most = limit.getAsDouble();
      cases.add(
          new Case(
              start,
              most / amps,
              amps,
              most,
              "A",
              begins + Show.amps(amps) + where + "; the plant allows " + Show.amps(most) + "."));
    }
  }

  private static Case breakdown(Facts facts, Closing closing) {
    double slip = facts.machine().slip(closing.speed());
    double breakdown =
        facts
            .machine()
            .breakdownSlip(
                closing.start().history().conditions().source(), closing.after().externalOhms());
    double margin = slip > 0.0 ? breakdown / slip : Double.POSITIVE_INFINITY;
    String torque = Show.torque(closing.after().entry().torque());
    return new Case(
        closing.start(),
        margin,
        slip,
        breakdown,
        "slip",
        "Step contactor "
            + closing.step()
            + " closes onto "
            + Show.amps(closing.statorAmps())
            + " and "
            + torque
            + " at a slip of "
            + Show.percent(slip)
            + "; the circuit it makes breaks down at "
            + Show.percent(breakdown)
            + (margin < 1.0 ? ", so that current rises while torque falls." : "."));
  }
}
