package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.starter.Contactor;

/**
 * {@code contactor/rotor-making}: every step contactor makes the current onto which it closes, in
 * permitted starts, when a step is skipped and on a rotor that does not turn, until that is
 * cleared.
 *
 * <p>Margin: four times the rotor rating over the greatest pole current just after a closing.
 */
public final class EveryStepContactorMakesWhatItClosesOnto implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/rotor-making",
          "Do step contactors make what they close onto?",
          "IEC 60947-4-1, rheostatic rotor starters: 4 times the rotor rating (from memory)",
          List.of(
              "supply.band",
              "motor",
              "load",
              "resistors",
              "steps",
              "sequence",
              "timer-spread",
              "contactors.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Contactor contactor : StepContactors.of(facts.starter())) {
      findings.add(judge(facts, contactor));
    }
    return Answer.of(findings, "no step contactor is described");
  }

  private record Closing(double ringAmps, ComputedStart start) {}

  private static Finding judge(Facts facts, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Optional<Finding> beyond = StepContactors.beyondTheStandard(facts, contactor, builder);
    if (beyond.isPresent()) {
      return beyond.get();
    }
    OptionalDouble rated = StepContactors.rotorRating(facts, contactor);
    if (rated.isEmpty()) {
      return builder.notJudged(
          List.of("contactors." + contactor.tag() + ".rotor-rating"),
          contactor.tag() + " has no rated current for a rotor circuit.");
    }
    Closing permitted = null;
    Closing greatest = null;
    for (ComputedStart start : facts.starts()) {
      if (!counts(start.scenario().kind())) {
        continue;
      }
      Closing found = greatest(facts, start, contactor.tag());
      if (found != null && (greatest == null || found.ringAmps() > greatest.ringAmps())) {
        greatest = found;
      }
      if (found != null
          && !start.scenario().isFault()
          && (permitted == null || found.ringAmps() > permitted.ringAmps())) {
        permitted = found;
      }
    }
    if (greatest == null) {
      return builder.notJudged(
          List.of(), contactor.tag() + " closes in no start that was computed.");
    }
    double multiple = facts.practice().figure("rotor.making").value();
    double limit = multiple * rated.getAsDouble();
    double amps = PoleCurrent.forVerdict(contactor, greatest.ringAmps(), facts.practice());
    String ordinarily =
        permitted != null && permitted != greatest
            ? " In a permitted start it is "
                + Show.amps(
                    PoleCurrent.forVerdict(contactor, permitted.ringAmps(), facts.practice()))
                + "."
            : "";
    double margin = limit / amps;
    return builder
        .at(greatest.start())
        .margin(margin)
        .figures(amps, limit, "A")
        .says(
            contactor.tag()
                + " closes onto "
                + Show.amps(amps)
                + " ("
                + greatest.start().words()
                + "; "
                + PoleCurrent.words(contactor)
                + "). It is proven to make "
                + Show.amps(limit)
                + " ("
                + Show.three(multiple)
                + " × "
                + Show.amps(rated.getAsDouble())
                + ")."
                + ordinarily)
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Take a step contactor with a rotor rating of "
                    + Show.amps(amps / multiple)
                    + " or more, or clear a rotor at rest before the sequence reaches it."
                : "")
        .byMargin();
  }

  private static boolean counts(Scenario.Kind kind) {
    return kind == Scenario.Kind.PERMITTED
        || kind == Scenario.Kind.SKIPPED
        || kind == Scenario.Kind.LOCKED;
  }

  private static Closing greatest(Facts facts, ComputedStart start, String tag) {
    double cleared = Double.NaN;
    Closing greatest = null;
    for (Stage stage : start.history().stages()) {
      if (!stage.closedBy().equals(tag)) {
        continue;
      }
      if (start.scenario().isFault()) {
        cleared = Double.isNaN(cleared) ? Exposure.of(facts, start).clearedAtSeconds() : cleared;
        if (stage.fromSeconds() > cleared) {
          continue;
        }
      }
      double amps = stage.trace().ringAmps()[0];
      if (greatest == null || amps > greatest.ringAmps()) {
        greatest = new Closing(amps, start);
      }
    }
    return greatest;
  }
}
