package sliprung.rulebook.data;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Ambient;

/**
 * {@code data/plausible}: inputs that no plant has are typing mistakes, wrong units or swapped
 * lines. Each is a breach, whatever else comes out clear.
 *
 * <p>Margin: the value over the end of its usual range that it passes, or that end over it: below 1
 * outside the range.
 */
public final class TheInputsArePlausible implements Rule {
  private static final Info INFO =
      new Info(
          "data/plausible",
          "Does every input lie where such inputs lie, and do they fit each other?",
          "common practice",
          List.of(
              "supply",
              "motor",
              "load",
              "resistors",
              "steps",
              "contactors",
              "breakers",
              "protection",
              "conductors",
              "duty",
              "ambient"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Tally tally = new Tally(facts, INFO);
    MotorPlausibility.check(tally);
    DrivePlausibility.check(tally);
    BankPlausibility.check(tally);
    GearPlausibility.check(tally);
    DevicePlausibility.check(tally);
    List<Finding> findings = new ArrayList<>(tally.odd());
    if (findings.isEmpty()) {
      findings.add(
          FindingBuilder.of(facts, INFO, "inputs")
              .says(
                  tally.checks()
                      + " checks were made; every input lies where such inputs lie, and they fit each"
                      + " other.")
              .build(Verdict.CLEAR));
    }
    Ambient air = facts.starter().ambient();
    warm(facts, "air at the motor", "ambient.motor", air.motorCelsius(), MOTOR)
        .ifPresent(findings::add);
    warm(facts, "air in the panel", "ambient.panel", air.panelCelsius(), PANEL)
        .ifPresent(findings::add);
    lowered(facts).ifPresent(findings::add);
    return Answer.of(findings, "");
  }

  private static final String MOTOR = "the motor's rated current, stall limit and heating";
  private static final String PANEL = "the currents of contactors and relays";

  /** Ratings hold up to a reference air; what they are in a warmer one nobody has said. */
  private static Optional<Finding> warm(
      Facts facts, String subject, String path, double celsius, String what) {
    double reference = facts.practice().figure("air.reference").value();
    boolean implausible = celsius > facts.practice().figure("plausible.air.most").value();
    return celsius <= reference || implausible
        ? Optional.empty()
        : Optional.of(
            FindingBuilder.of(facts, INFO, subject)
                .reference("IEC 60034-1, IEC 60947-1 (from memory)")
                .notJudged(
                    List.of(path),
                    "The "
                        + subject
                        + " has "
                        + Show.three(celsius)
                        + "\u00a0°C. Up to "
                        + Show.three(reference)
                        + "\u00a0°C "
                        + what
                        + " hold as rated; what they are in warmer air was not given, and nothing"
                        + " here derates them."));
  }

  /** Whoever wants less than a limit hides what is tight. */
  private static Optional<Finding> lowered(Facts facts) {
    List<String> below =
        facts.starter().margins().entrySet().stream()
            .filter(e -> e.getValue() < 1.0)
            .map(e -> e.getKey() + " " + Show.ratio(e.getValue()))
            .toList();
    return below.isEmpty()
        ? Optional.empty()
        : Optional.of(
            FindingBuilder.of(facts, INFO, "margins")
                .says(
                    "The file wants margins below 1 of "
                        + String.join(", ", below)
                        + ": what only just meets its limit is not shown as tight there.")
                .mend("Want 1 or more.")
                .build(Verdict.TIGHT));
  }
}
