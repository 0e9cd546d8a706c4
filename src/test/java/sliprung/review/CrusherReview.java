package sliprung.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.machine.Identification;
import sliprung.machine.Machine;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.ComputedStart.From;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario.Kind;
import sliprung.runup.Scenario.LoadMode;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/** A hand-made review of {@link Crusher}: every verdict occurs, figures are invented. */
public final class CrusherReview {
  /** The corner of the tight findings. */
  public static final Corner HARD =
      new Corner(0.9, Corner.LoadSide.HEAVY, Corner.Bank.LOW, Corner.Timers.LATE);

  private CrusherReview() {}

  /** The review with an ordinary name and no breach but one. */
  public static Review plain() {
    return of("JC-1 primary jaw crusher", "Held on step 2 the motor draws 152 A.", true);
  }

  /** The review with user text of one's own in it. */
  public static Review of(String name, String says, boolean breach) {
    Starter starter = Crusher.named(name);
    Machine machine = new Machine(starter.motor().circuit().orElseThrow(), 50, 2);
    List<ComputedStart> starts = starts(starter, machine);
    List<Finding> findings = new ArrayList<>();
    if (breach) {
      findings.add(
          finding(
              "held/blind",
              Verdict.BREACH,
              "step 2",
              find(starts, "held-2"),
              Edge.SLOW,
              none(),
              none(),
              250,
              152,
              says + " Less than F2's dial: nothing measuring stator current sees it.",
              "Fit an incomplete-sequence timer."));
    }
    findings.add(
        finding(
            "trip/start",
            Verdict.TIGHT,
            "F3",
            find(starts, "hot@" + HARD.id()),
            Edge.FAST,
            of(1.07),
            of(1.10),
            265,
            248,
            "F3 comes within 7 % of tripping a hot start.",
            "Raise F3's time multiplier to 0.30."));
    findings.add(
        new Finding(
            "locked/rings",
            Verdict.NOT_JUDGED,
            "motor",
            Optional.empty(),
            Optional.empty(),
            none(),
            none(),
            none(),
            none(),
            "",
            "Slip rings at rest are not described.",
            "Ask the maker of the motor.",
            "IEC 60034-1",
            List.of("motor.rings-at-rest"),
            "motor.rings-at-rest: missing",
            Optional.empty(),
            Optional.empty()));
    findings.add(
        new Finding(
            "contactor/line-category",
            Verdict.ACCEPTED,
            "K1",
            Optional.empty(),
            Optional.empty(),
            of(0.97),
            of(1.0),
            of(1260),
            of(1299),
            "A",
            "K1 makes 1 299 A.",
            "Fit a larger one.",
            "IEC 60947-4-1, table 7",
            List.of(),
            "load.inertia: estimated",
            Optional.of("plant engineer"),
            Optional.of(LocalDate.of(2027, 6, 30))));
    findings.add(
        finding(
            "locked/sequence",
            Verdict.CLEAR,
            "section-3",
            find(starts, "locked-hot"),
            Edge.SLOW,
            of(1.33),
            of(1.25),
            7.9,
            5.9,
            "F3 clears at 5.9 s, section 3 reaches its limit at 7.9 s.",
            ""));
    findings.add(
        finding(
            "trip/start",
            Verdict.CLEAR,
            "F2",
            find(starts, "hot@" + HARD.id()),
            Edge.FAST,
            of(1.43),
            of(1.40),
            none(),
            none(),
            "F2 rides through.",
            ""));
    return new Review(
        starter,
        LocalDate.of(2026, 12, 1),
        machine,
        new Identification(
            starter.motor().circuit().orElseThrow(),
            false,
            List.of(
                new Identification.Residual("stator current", 208, 206.4, "A", 0.02),
                new Identification.Residual("rotor voltage", 420, 423.1, "V", 0.01)),
            List.of("Friction and stray loss were taken as 1.5 % of the air-gap torque.")),
        starts,
        findings,
        List.of(new Review.NotApplicable("overload/rotor", "no overload relay in the rotor")),
        List.of("contactor/welded"),
        List.of());
  }

  private static List<ComputedStart> starts(Starter starter, Machine machine) {
    CrusherStarts of = new CrusherStarts(starter, machine);
    List<ComputedStart> starts = new ArrayList<>();
    for (Corner corner : List.of(Corner.NOMINAL, HARD, light())) {
      for (From from : From.values()) {
        starts.add(of.permitted(from, 1, corner));
        for (int k = 1; k <= starter.sectionCount(); k++) {
          starts.add(of.fault(Kind.HELD, k, LoadMode.START, from, corner));
          starts.add(of.fault(Kind.HELD, k, LoadMode.RUNNING, from, corner));
        }
        starts.add(of.fault(Kind.LOCKED, 0, LoadMode.START, from, corner));
        starts.add(of.fault(Kind.LOCKED_STEP, 1, LoadMode.START, from, corner));
        starts.add(of.fault(Kind.RINGS_SHORTED, 0, LoadMode.START, from, corner));
      }
    }
    return starts;
  }

  private static Corner light() {
    return new Corner(1.1, Corner.LoadSide.LIGHT, Corner.Bank.HIGH, Corner.Timers.EARLY);
  }

  private static ComputedStart find(List<ComputedStart> starts, String id) {
    return starts.stream().filter(s -> s.id().equals(id)).findFirst().orElseThrow();
  }

  private static Finding finding(
      String rule,
      Verdict verdict,
      String subject,
      ComputedStart start,
      Edge edge,
      OptionalDouble margin,
      OptionalDouble wanted,
      Object limit,
      Object value,
      String says,
      String mend) {
    return new Finding(
        rule,
        verdict,
        subject,
        Optional.of(start),
        Optional.of(edge),
        margin,
        wanted,
        opt(limit),
        opt(value),
        rule.startsWith("locked") ? "s" : "A",
        says,
        mend,
        "IEC 60947-4-1, 5.7.3",
        List.of(),
        "load.inertia: estimated",
        Optional.empty(),
        Optional.empty());
  }

  private static OptionalDouble opt(Object value) {
    return value instanceof Number n ? OptionalDouble.of(n.doubleValue()) : none();
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }

  private static OptionalDouble none() {
    return OptionalDouble.empty();
  }
}
