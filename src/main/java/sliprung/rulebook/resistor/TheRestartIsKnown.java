package sliprung.rulebook.resistor;

import java.util.ArrayList;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

/**
 * {@code resistor/restart}: when the motor may be started again after a stop, a trip, a held and a
 * locked start, and what limits it. The permitted pause of a hot restart is held against the first;
 * a part that has passed its limit asks for more than a pause.
 */
public final class TheRestartIsKnown implements Rule {
  private static final Info INFO =
      new Info(
          "resistor/restart",
          "When may it be started again, and what limits it?",
          "common practice (device function 66)",
          List.of("supply.band", "motor", "load", "resistors", "steps", "duty", "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<String> missing = Restarts.missing(facts);
    if (!missing.isEmpty()) {
      return new Answer.Findings(
          List.of(
              FindingBuilder.of(facts, INFO, "restart")
                  .notJudged(missing, "What a start leaves behind cannot be told.")));
    }
    List<Finding> findings = new ArrayList<>();
    for (Restart restart : Restarts.of(facts)) {
      findings.add(finding(facts, restart));
    }
    return Answer.of(findings, "no permitted start was computed");
  }

  private static Finding finding(Facts facts, Restart restart) {
    FindingBuilder builder =
        FindingBuilder.of(facts, INFO, restart.after().subject()).at(restart.start());
    String after = "After " + restart.after().words() + " ";
    if (restart.pastLimit()) {
      return builder
          .says(
              after
                  + "("
                  + restart.start().words()
                  + ") "
                  + part(restart.limitedBy())
                  + " is past its limit: no pause makes that good.")
          .mend("Inspect it before the next start; see held/exposure and locked/sequence.")
          .build(Verdict.TIGHT);
    }
    if (Double.isInfinite(restart.seconds())) {
      return builder
          .says(
              after
                  + "no pause is enough: a start from cold alone takes "
                  + part(restart.limitedBy())
                  + " to its limit.")
          .mend("See trip/start and resistor/start.")
          .build(Verdict.TIGHT);
    }
    boolean stop = restart.after() == Restart.After.STOP;
    double permitted = facts.starter().duty().restartAfterSeconds();
    boolean soon = stop && restart.seconds() > permitted;
    return builder
        .figures(restart.seconds(), stop ? permitted : Double.NaN, "s")
        .says(
            restart.seconds() <= 0.0
                ? after + "it may be started again at once."
                : after
                    + "it may be started again after "
                    + Show.seconds(restart.seconds())
                    + (restart.after() == Restart.After.PAST ? " from now" : "")
                    + "; "
                    + part(restart.limitedBy())
                    + " limits it."
                    + (soon ? " The duty permits it after " + Show.seconds(permitted) + "." : ""))
        .mend(soon ? "Give duty.restart-after, and enforce it." : "")
        .build(soon ? Verdict.TIGHT : Verdict.CLEAR);
  }

  private static String part(String name) {
    String words = Exposure.name(name);
    return words.equals(name) ? words : Character.toLowerCase(words.charAt(0)) + words.substring(1);
  }
}
