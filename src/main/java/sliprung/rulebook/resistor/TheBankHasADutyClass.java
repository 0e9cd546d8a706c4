package sliprung.rulebook.resistor;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Stage;

/**
 * {@code resistor/class}: the NEMA duty class that the use of the bank amounts to, in the words in
 * which a bank is ordered. The last digit is the current on the first point from rest, the leading
 * ones how long the bank is in, and how often. Informative: nothing in the starter file says which
 * class the bank was built for.
 */
public final class TheBankHasADutyClass implements Rule {
  private static final Info INFO =
      new Info(
          "resistor/class",
          "Which duty class does the use of the bank amount to?",
          "NEMA ICS 9 resistor classes (former ICS 2-213)",
          List.of("motor", "load", "resistors", "steps", "timer-spread", "duty"));

  /**
   * A row of the table.
   *
   * @param digits leading digits of the class
   * @param on s
   * @param off s
   */
  private record Row(String digits, double on, double off) {
    double share() {
      return on / (on + off);
    }
  }

  /** Rows from the lightest; on and off times NEMA ICS 9, seen as NFPA 70 table 430.29. */
  private static final List<Row> ROWS =
      List.of(
          new Row("11", 5, 75),
          new Row("13", 10, 70),
          new Row("14", 15, 75),
          new Row("15", 15, 45),
          new Row("16", 15, 30),
          new Row("17", 15, 15));

  private static final Row CONTINUOUS = new Row("9", Double.POSITIVE_INFINITY, 0);

  /** Per cent of full-load current on the first point, by last digit from 1. */
  private static final double[] FIRST_POINT = {25, 50, 70, 100, 150, 200};

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "bank");
    if (facts.starter().sectionCount() == 0) {
      return new Answer.NotApplicable("the bank has no sections");
    }
    if (facts.starter().duty().startsPerHour().isEmpty()) {
      return one(
          builder.notJudged(
              List.of("duty.starts.per-hour"),
              "How many starts an hour are permitted is not given."));
    }
    if (facts.starter().motor().rotorCurrent().isEmpty()) {
      return one(
          builder.notJudged(
              List.of("motor.rotor-current"), "The class counts in rated rotor current."));
    }
    ComputedStart slowest = null;
    double on = -1.0;
    double first = 0.0;
    for (ComputedStart start : facts.permitted().filter(s -> s.place() == 1).toList()) {
      double in = secondsIn(start);
      if (in > on) {
        on = in;
        slowest = start;
      }
      if (start.corner().isNominal()) {
        first =
            start.history().stages().get(0).entry().ringAmps()
                / facts.starter().motor().rotorCurrent().getAsDouble();
      }
    }
    if (slowest == null) {
      return one(builder.notJudged(List.of(), "No permitted start was computed."));
    }
    double perHour = facts.starter().duty().startsPerHour().getAsDouble();
    Row row = row(on, on * perHour / 3600.0);
    boolean intermittent = row != CONTINUOUS;
    int column = column(100.0 * first);
    String name = row.digits() + column;
    return one(
        builder
            .at(slowest)
            .figures(on, intermittent ? row.on() : Double.NaN, "s")
            .says(
                "A start begins at "
                    + Show.percent(first)
                    + " of rated rotor current and keeps the bank in for up to "
                    + Show.seconds(on)
                    + ", "
                    + Show.three(perHour)
                    + " times an hour: class "
                    + name
                    + (intermittent
                        ? " ("
                            + Show.seconds(row.on())
                            + " on, "
                            + Show.seconds(row.off())
                            + " off, "
                            + Show.three(FIRST_POINT[column - 1])
                            + " % on the first point)."
                        : " (continuous): it stays in longer than the 15 s of any intermittent"
                            + " class, or more than half of the time."))
            .mend(
                intermittent
                    ? ""
                    : "Order the bank by its own current and time, not by an intermittent class.")
            .build(intermittent ? Verdict.CLEAR : Verdict.TIGHT));
  }

  private static Answer one(sliprung.rulebook.Finding finding) {
    return new Answer.Findings(List.of(finding));
  }

  /** How long anything of the bank is in circuit, s. */
  private static double secondsIn(ComputedStart start) {
    return start.history().stages().stream()
        .filter(Stage::bankIn)
        .mapToDouble(Stage::toSeconds)
        .max()
        .orElse(0.0);
  }

  /** The lightest row that allows that time in, and that share of the time. */
  private static Row row(double on, double share) {
    return ROWS.stream()
        .filter(r -> on <= r.on() && share <= r.share())
        .findFirst()
        .orElse(CONTINUOUS);
  }

  /** The nearest column, by ratio. */
  private static int column(double percent) {
    int best = 1;
    for (int k = 1; k <= FIRST_POINT.length; k++) {
      if (Math.abs(Math.log(percent / FIRST_POINT[k - 1]))
          < Math.abs(Math.log(percent / FIRST_POINT[best - 1]))) {
        best = k;
      }
    }
    return best;
  }
}
