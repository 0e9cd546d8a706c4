package sliprung.rulebook.data;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import sliprung.machine.Identification;
import sliprung.machine.Identification.Residual;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Motor;

/**
 * {@code data/nameplate}: what the computed circuit gives back of each figure on the plate.
 *
 * <p>Margin: three plate tolerances over the difference found, wanted 3: beyond one tolerance it is
 * tight, beyond three a breach.
 */
public final class ThePlateAgreesWithTheCircuit implements Rule {
  /** Differences smaller than this share are none. */
  private static final double NOTHING = 1e-12;

  private static final Info INFO =
      new Info(
          "data/nameplate",
          "Does one equivalent circuit explain every figure on the plate?",
          "IEC 60034-1 schedule of tolerances",
          List.of("motor"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Identification identification = facts.identification();
    List<Finding> findings = new ArrayList<>();
    for (Residual residual : identification.residuals()) {
      if (margin(residual) < facts.wanted(INFO.name())) {
        findings.add(beyond(facts, residual, findings.isEmpty()));
      }
    }
    if (findings.isEmpty()) {
      findings.add(explained(facts));
    }
    findings.addAll(missing(facts));
    return Answer.of(findings, "");
  }

  private static double margin(Residual residual) {
    double difference = Math.abs(residual.relative());
    return difference < NOTHING
        ? Double.POSITIVE_INFINITY
        : 3.0 * residual.tolerance() / difference;
  }

  private static Finding beyond(Facts facts, Residual residual, boolean isFirst) {
    boolean given = facts.identification().given();
    return FindingBuilder.of(facts, INFO, residual.quantity())
        .margin(margin(residual))
        .figures(residual.computed(), residual.plate(), residual.unit())
        .says(
            "The plate says "
                + quantity(residual.plate(), residual.unit())
                + " "
                + residual.quantity()
                + "; the circuit "
                + (given ? "given" : "that fits the plate best")
                + " has "
                + quantity(residual.computed(), residual.unit())
                + ", "
                + Show.percent(Math.abs(residual.relative()))
                + (residual.relative() > 0 ? " more" : " less")
                + ". The plate's own tolerance explains "
                + Show.percent(residual.tolerance())
                + "."
                + (isFirst ? notes(facts) : ""))
        .mend(
            given
                ? "Check the circuit's values against the plate: referred to the stator, star, per"
                    + " phase?"
                : "Read the plate again, first the figures that follow from each other; then ask for"
                    + " a test report.")
        .byMargin();
  }

  private static Finding explained(Facts facts) {
    List<Residual> residuals = facts.identification().residuals();
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "motor");
    if (residuals.isEmpty()) {
      return builder.notJudged(
          List.of("motor"), "Nothing of the plate could be held against the circuit.");
    }
    Residual worst =
        residuals.stream()
            .min(Comparator.comparingDouble(ThePlateAgreesWithTheCircuit::margin))
            .orElseThrow();
    double margin = margin(worst);
    String says =
        "All "
            + residuals.size()
            + " figures of the plate agree with the circuit. The widest difference: "
            + worst.quantity()
            + " "
            + quantity(worst.computed(), worst.unit())
            + " against "
            + quantity(worst.plate(), worst.unit())
            + " on the plate, "
            + Show.percent(Math.abs(worst.relative()))
            + " where its tolerance is "
            + Show.percent(worst.tolerance())
            + "."
            + notes(facts);
    builder.says(says);
    return Double.isInfinite(margin)
        ? builder.build(Verdict.CLEAR)
        : builder.margin(margin).figures(worst.computed(), worst.plate(), worst.unit()).byMargin();
  }

  private static String quantity(double value, String unit) {
    return unit.isEmpty() ? Show.three(value) : Show.three(value) + "\u00a0" + unit;
  }

  private static String notes(Facts facts) {
    List<String> notes = facts.identification().notes();
    return notes.isEmpty() ? "" : " " + String.join(" ", notes);
  }

  /** Plate figures that are not there, of a circuit that had to be found from the plate. */
  private static List<Finding> missing(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    if (facts.identification().given()) {
      return findings;
    }
    Motor motor = facts.starter().motor();
    if (motor.breakdownTorque().isEmpty()) {
      findings.add(
          absent(
              facts,
              "breakdown-torque",
              "The breakdown torque is not given. The reactances rest on it, and with them every"
                  + " current at rest and every peak."));
    }
    if (motor.rotorVoltage().isEmpty()) {
      findings.add(
          absent(
              facts,
              "rotor-voltage",
              "The standstill rotor voltage is not given. The ratio of stator to rotor rests on it,"
                  + " and with it every ohm of the bank."));
    }
    if (motor.rotorCurrent().isEmpty()) {
      findings.add(
          absent(
              facts,
              "rotor-current",
              "The rated rotor current is not given. The rotor's resistance rests on speed alone."));
    }
    if (motor.powerFactor().isEmpty() && motor.efficiency().isEmpty()) {
      findings.add(
          absent(
              facts,
              "power-factor",
              "Neither power factor nor efficiency is given. The magnetizing current rests on"
                  + " custom."));
    }
    return findings;
  }

  private static Finding absent(Facts facts, String key, String why) {
    String path = "motor." + key;
    return FindingBuilder.of(facts, INFO, path).notJudged(List.of(path), why);
  }
}
