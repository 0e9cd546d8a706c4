package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;

/**
 * {@code sequence/torque}: no closing of a permitted start brings a torque beyond what gear or belt
 * stand, forwards or backwards. The air-gap torque of the electrical transient is held against the
 * limit. Where nothing proves the steps open before the line contactor closes, a reclosing onto the
 * residual voltage is a subject of its own.
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
              "interlocks",
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
    List<Finding> findings = new ArrayList<>();
    findings.add(permitted(facts, limit));
    reclosed(facts, limit).ifPresent(findings::add);
    return new Answer.Findings(findings);
  }

  /** The line is lost and returns, every step contactor closed, while the rotor turns. */
  private static Optional<Finding> reclosed(Facts facts, double limit) {
    double greatest = -1.0;
    ComputedStart worst = null;
    for (ComputedStart start : facts.faults(Scenario.Kind.RECLOSED).toList()) {
      Optional<ClosingPeak> peak = start.history().stages().get(0).peak();
      if (peak.isPresent() && peak.get().greatestTorque() > greatest) {
        greatest = peak.get().greatestTorque();
        worst = start;
      }
    }
    if (worst == null) {
      return Optional.empty();
    }
    double margin = limit / greatest;
    return Optional.of(
        FindingBuilder.of(facts, INFO, "gear or belt, reclosed")
            .at(worst)
            .margin(margin)
            .figures(greatest, limit, "N·m")
            .says(
                Show.torque(greatest)
                    + " at the peak where the line returns at the worst angle onto the residual"
                    + " voltage of a rotor that turns, every step contactor still closed, against "
                    + Show.torque(limit)
                    + " allowed. How long the line is off is not an input: the worst of any dead"
                    + " time counts. Nothing proves the steps open before the line contactor"
                    + " closes.")
            .mend(
                margin < facts.wanted(INFO.name())
                    ? "Prove every step contactor open before the line contactor closes"
                        + " (interlocks.steps-open-before-line)."
                    : "")
            .byMargin());
  }

  private static Finding permitted(Facts facts, double limit) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "gear or belt");
    double greatest = -1.0;
    ComputedStart worst = null;
    Stage at = null;
    for (ComputedStart start : facts.permitted().toList()) {
      for (Stage stage : start.history().stages()) {
        if (stage.peak().isEmpty()) {
          return builder
              .at(start)
              .notJudged(
                  List.of(),
                  "The transient of step "
                      + stage.step()
                      + " was not computed: with it the start takes another course than"
                      + " with the steady circuit.");
        }
        double torque = stage.peak().get().greatestTorque();
        if (torque > greatest) {
          greatest = torque;
          worst = start;
          at = stage;
        }
      }
    }
    if (worst == null) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    double margin = limit / greatest;
    return builder
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
        .byMargin();
  }
}
