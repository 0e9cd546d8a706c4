package sliprung.rulebook.sequence;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Stage;

/**
 * {@code sequence/torque}: no closing of a permitted start brings a torque beyond what gear or belt
 * stand, forwards or backwards. The air-gap torque of the electrical transient is held against the
 * limit.
 */
public final class NoTorquePeakExceedsTheLimit implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/torque",
          "Does any torque peak exceed the plant's limit?",
          "the plant's own limit; electrical transient of the machine",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors",
              "steps",
              "timer-spread",
              "level-spread",
              "limits.torque-peak"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    if (facts.starter().limits().torquePeak().isEmpty()) {
      return new Answer.NotApplicable("no limits.torque-peak is given");
    }
    double limit = facts.starter().limits().torquePeak().getAsDouble();
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "gear or belt");
    double greatest = -1.0;
    ComputedStart worst = null;
    Stage at = null;
    for (ComputedStart start : facts.permitted().toList()) {
      for (Stage stage : start.history().stages()) {
        if (stage.peak().isEmpty()) {
          return new Answer.Findings(
              List.of(
                  builder
                      .at(start)
                      .notJudged(
                          List.of(),
                          "The transient of step "
                              + stage.step()
                              + " was not computed: with it the start takes another course than"
                              + " with the steady circuit.")));
        }
        double torque = torque(stage.peak().get());
        if (torque > greatest) {
          greatest = torque;
          worst = start;
          at = stage;
        }
      }
    }
    if (worst == null) {
      return new Answer.Findings(
          List.of(builder.notJudged(List.of(), "No permitted start was computed.")));
    }
    double margin = limit / greatest;
    return new Answer.Findings(
        List.of(
            builder
                .at(worst)
                .margin(margin)
                .figures(greatest, limit, "N·m")
                .says(
                    Show.torque(greatest)
                        + " at the peak after "
                        + at.closedBy()
                        + " has closed (step "
                        + at.step()
                        + "), against "
                        + Show.torque(limit)
                        + " allowed. A shaft that swings may see more: this is the torque in the"
                        + " air gap.")
                .mend(
                    margin < facts.wanted(INFO.name())
                        ? "Raise the resistance of that step, or close it later."
                        : "")
                .byMargin()));
  }

  private static double torque(ClosingPeak peak) {
    return Math.max(peak.torque(), -peak.leastTorque());
  }
}
