package sliprung.rulebook.data;

import java.util.ArrayList;
import java.util.List;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

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
    return Answer.of(findings, "");
  }
}
