package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.Stage;
import sliprung.starter.Contactor;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;

/**
 * {@code contactor/rotor-voltage}: the step contactors stand the voltage of the open rings at rest,
 * twice it where plugging is allowed.
 *
 * <p>Margin: twice the rated voltage over the ring voltage, since the rotor operational voltage,
 * present only briefly, may exceed the rated insulation voltage by 100 % (from memory). Wanted: 2,
 * so that a ring voltage above the rated voltage is tight and one above twice it a breach.
 */
public final class TheRotorVoltageFitsTheStepContactors implements Rule {
  private static final double PLUGGED = 2.0;

  private static final Info INFO =
      new Info(
          "contactor/rotor-voltage",
          "Does the rotor voltage fit the step contactors?",
          "IEC 60947-4-1, rheostatic rotor starters: Uer up to twice Uir (from memory)",
          List.of("supply.band", "motor", "duty", "contactors.{subject}"));

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

  private static Finding judge(Facts facts, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    if (contactor.ratedVoltage().isEmpty()) {
      return builder.notJudged(
          List.of("contactors." + contactor.tag() + ".rated-voltage"),
          contactor.tag() + " has no rated voltage.");
    }
    Optional<ComputedStart> start = StepContactors.atGreatestRingVolts(facts);
    if (start.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    boolean plugs = facts.starter().duty().plugging().filter(o -> o.perHour() > 0.0).isPresent();
    double atRest = StepContactors.greatestRingVolts(facts);
    double volts = plugs ? PLUGGED * atRest : atRest;
    double rated = contactor.ratedVoltage().getAsDouble();
    double beyond = facts.practice().figure("rotor.voltage-over-insulation").value();
    double margin = beyond * rated / volts;
    double wanted = beyond * facts.wanted(INFO.name());
    String says =
        "With the rings open at rest the rotor has "
            + Show.volts(atRest)
            + (plugs ? ", and up to " + Show.volts(volts) + " when it is plugged" : "")
            + ". "
            + contactor.tag()
            + " is rated "
            + Show.volts(rated)
            + (margin < wanted
                ? "; a rotor voltage that is there only briefly may reach "
                    + Show.volts(beyond * rated)
                    + ", which nobody here looked up."
                : ".")
            + closing(facts, contactor);
    return builder
        .at(start.get())
        .margin(margin)
        .wanted(wanted)
        .figures(volts, margin < 1.0 ? beyond * rated : rated, "V")
        .says(says)
        .mend(
            margin < wanted
                ? "Take step contactors rated "
                    + Show.volts(volts)
                    + " or more, or show the maker's rotor insulation voltage."
                : "")
        .byMargin();
  }

  /** The voltage of the section across its poles just before it closes in a permitted start. */
  private static String closing(Facts facts, Contactor contactor) {
    double greatest =
        facts
            .permitted()
            .filter(s -> s.place() == 1)
            .mapToDouble(s -> greatest(facts.starter(), s, contactor))
            .max()
            .orElse(0.0);
    return greatest > 0.0
        ? " In a permitted start it closes on "
            + Show.volts(greatest)
            + " across a pole: its section's voltage."
        : "";
  }

  private static double greatest(Starter starter, ComputedStart start, Contactor contactor) {
    double greatest = 0.0;
    List<Stage> stages = start.history().stages();
    for (int i = 1; i < stages.size(); i++) {
      Stage after = stages.get(i);
      Stage before = stages.get(i - 1);
      if (after.closedBy().equals(contactor.tag())) {
        double ohms =
            before.sectionsIn().stream()
                .filter(k -> !after.sectionsIn().contains(k))
                .mapToDouble(k -> starter.resistors().sections().get(k - 1).ohms())
                .sum();
        double ring = before.trace().ringAmps()[before.trace().last()];
        greatest =
            Math.max(
                greatest,
                poleVolts(starter, contactor, ring, ohms)
                    * start.history().conditions().bankFactor());
      }
    }
    return greatest;
  }

  /**
   * Volts across one open pole: a pole in star sees the phase voltage of the section, poles in
   * delta and two poles its line voltage, a pole across a branch of a delta bank the branch.
   *
   * @param ringAmps RMS
   * @param ohms of the section, per phase or branch
   */
  static double poleVolts(Starter starter, Contactor contactor, double ringAmps, double ohms) {
    if (starter.resistors().connection() == ResistorBank.Connection.DELTA) {
      return starter.resistors().sectionShare() * ringAmps * ohms;
    }
    boolean star = contactor.poles().orElse(Contactor.Poles.DELTA) == Contactor.Poles.STAR;
    return (star ? 1.0 : Math.sqrt(3.0)) * ringAmps * ohms;
  }
}
