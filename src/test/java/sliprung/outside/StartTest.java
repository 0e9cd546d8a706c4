package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.outside.OutsideTable.Row;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartSimulator;
import sliprung.runup.Trace;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/** Computed starts against closed forms, textbooks and published simulations. */
@Tag("outside")
class StartTest {
  private static final TorqueCurve NO_LOAD = new TorqueCurve.Constant(0.0);

  /** Leakage coefficient 0.0667, 3 Ω in all: the Modelica Standard Library's default machine. */
  private static final double MAIN = 3.0 * Math.sqrt(1.0 - 0.0667);

  /** From rest to a slip without load; a section of no ohms marks the end. */
  @TestFactory
  Stream<DynamicTest> should_meet_closed_forms_without_load() {
    return OutsideTable.read("run-up-no-load")
        .tests(
            row ->
                assertThat(quantity(row))
                    .as(row.text("source"))
                    .isCloseTo(row.number("expected"), within(tolerance(row))));
  }

  private static double quantity(Row row) {
    CircuitData c =
        new CircuitData(
            row.number("r1"),
            row.number("x1"),
            row.number("xm"),
            row.number("r2"),
            row.number("x2"),
            1.0);
    double hertz = row.number("hertz");
    double slip = row.number("to_slip");
    Stage stage =
        stages(
                Math.sqrt(3.0) * row.number("phase_volts"),
                new Machine(c, hertz, (int) row.number("poles") / 2),
                hertz,
                row.number("inertia"),
                NO_LOAD,
                new double[] {0.0},
                new Step.RotorFrequencyBelow(hertz * slip))
            .get(0);
    Trace t = stage.trace();
    double rotor = t.integralOfSquare(t.ringAmps());
    double stator = t.integralOfSquare(t.statorAmps());
    double rotorJoules = 3.0 * c.r2() * rotor;
    double statorJoules = 3.0 * c.r1() * stator;
    // books give the heat down to synchronous speed; without load it goes with slip squared
    double part = 1.0 - slip * slip;
    return switch (row.text("quantity")) {
      case "seconds" -> stage.toSeconds();
      case "rotorJoules" -> rotorJoules;
      case "rotorJoulesOverPart" -> rotorJoules / part;
      case "windingJoulesOverPart" -> (rotorJoules + statorJoules) / part;
      case "rotorSquare" -> rotor;
      case "statorSquare" -> stator;
      case "statorJoules" -> statorJoules;
      default -> throw new IllegalStateException(row.toString());
    };
  }

  private static double tolerance(Row row) {
    String text = row.text("tolerance");
    if (text.equals("digits")) {
      return row.halfLastDigit("expected");
    }
    return Double.parseDouble(text.replace(" %", "")) / 100.0 * Math.abs(row.number("expected"));
  }

  /**
   * A published quasi-static direct-on-line start; a cage machine has a shorted rotor's equations.
   */
  @TestFactory
  Stream<DynamicTest> should_follow_the_published_direct_on_line_start() {
    double leakage = 3.0 - MAIN;
    CircuitData c = new CircuitData(0.03001, leakage, MAIN, 0.04, leakage, 1.0);
    Machine machine = new Machine(c, 50.0, 2);
    Trace trace =
        stages(100.0 * Math.sqrt(3.0), machine, 50.0, 0.79, mslLoad(), new double[] {})
            .get(0)
            .trace();
    Source source = new Source(100.0 * Math.sqrt(3.0), 0.0);
    return OutsideTable.read("imc-dol")
        .tests(
            row -> {
              double speed = speedAt(trace, row.number("time_s") - 0.1);
              OperatingPoint point = machine.at(source, 0.0, machine.slip(speed));
              assertThat(point.statorAmps()).isCloseTo(row.number("stator_a"), within(1e-3));
            });
  }

  /** The same trace's ∫I² dt from 0.1 s to 1.0 s: 101 315.747 A²s (recomputed from the file). */
  @Test
  void should_give_the_i_squared_t_of_the_published_direct_on_line_start() {
    double leakage = 3.0 - MAIN;
    CircuitData c = new CircuitData(0.03001, leakage, MAIN, 0.04, leakage, 1.0);
    Trace trace =
        stages(
                100.0 * Math.sqrt(3.0),
                new Machine(c, 50.0, 2),
                50.0,
                0.79,
                mslLoad(),
                new double[] {0.0},
                new Step.After(0.9))
            .get(0)
            .trace();
    assertThat(trace.integralOfSquare(trace.statorAmps())).isCloseTo(101315.747, within(1.0));
  }

  /**
   * Modelica Standard Library, example IMS_Start, quasi-static with the same inputs (independent
   * computation, SciPy); and how far the published transient start (MAP-LIB_ReferenceResults
   * v3.2.3) lies from it: 16 % more I²t in the rotor in the first stage of this very fast start.
   */
  @TestFactory
  Stream<DynamicTest> should_agree_with_the_slip_ring_start_of_the_modelica_library() {
    double leakage = 3.0 - MAIN;
    CircuitData c = new CircuitData(0.03, leakage, MAIN, 0.04, leakage, 1.0);
    List<Stage> stages =
        stages(
            100.0 * Math.sqrt(3.0),
            new Machine(c, 50.0, 2),
            50.0,
            0.58,
            mslLoad(),
            new double[] {0.16, 0.0},
            new Step.After(0.9),
            new Step.After(0.5));
    Trace first = stages.get(0).trace();
    Trace second = stages.get(1).trace();
    return Stream.of(
        near("rotor I²t on the rheostat", rotorSquare(first), 16180.33, 2e-5),
        near("rotor I²t shorted", rotorSquare(second), 6036.62, 2e-5),
        near("stator I²t on the rheostat", statorSquare(first), 18199.30, 2e-5),
        near("stator I²t shorted", statorSquare(second), 6962.80, 2e-5),
        near("1000 rpm", timeAt(first, 1000.0) + 0.1, 0.299052, 1e-5),
        near("1200 rpm", timeAt(first, 1200.0) + 0.1, 0.420334, 1e-5),
        near("speed at 1.0 s", first.speed()[first.last()], 133.3696, 1e-6),
        near("published transient over steady I²t", 19278.74 / rotorSquare(first), 1.19, 0.01),
        near("published transient settled, stator I²t", statorSquare(second), 6933.89, 0.01),
        near("published transient, 1000 rpm later", 0.3365 - timeAt(first, 1000.0), 0.1374, 0.01));
  }

  /**
   * Geometric grading on Chapman's machine, J 0.5 kg·m², no load, first total 1.648366 Ω (greatest
   * torque at rest), three sections; independent computation (SciPy). Every stage starts and ends
   * at the same currents and torques, since all depends on R/s alone.
   */
  @TestFactory
  Stream<DynamicTest> should_meet_the_geometrically_graded_start() {
    CircuitData c = new CircuitData(0.641, 1.106, 26.3, 0.332, 0.464, 1.0);
    double[] totals = {1.648366, 0.9662330, 0.5663827, 0.332};
    List<Stage> stages =
        stages(
            460.0,
            new Machine(c, 60.0, 2),
            60.0,
            0.5,
            NO_LOAD,
            new double[] {totals[0] - totals[1], totals[1] - totals[2], totals[2] - totals[3], 0.0},
            new Step.After(0.1742001),
            new Step.After(0.1021120),
            new Step.After(0.0598556),
            new Step.After(0.1044628));
    double[] rotorSquare = {1179.055, 691.1341, 405.1263, 358.2185};
    double[] heat = {5830.546, 2003.390, 688.3696, 356.7857};
    List<DynamicTest> checks = new java.util.ArrayList<>();
    for (int k = 0; k < 4; k++) {
      Trace t = stages.get(k).trace();
      String stage = "stage " + (k + 1) + " ";
      checks.add(near(stage + "I1 in", t.statorAmps()[0], 95.63128, 2e-6));
      checks.add(near(stage + "torque in", t.torque()[0], 230.8017, 2e-6));
      if (k < 3) {
        checks.add(near(stage + "I1 out", t.statorAmps()[t.last()], 69.82163, 2e-6));
        checks.add(near(stage + "torque out", t.torque()[t.last()], 208.3853, 2e-6));
      } else {
        double slip = 1.0 - t.speed()[t.last()] / (2.0 * Math.PI * 30.0);
        checks.add(near(stage + "slip out", slip, 0.02, 1e-4));
      }
      checks.add(near(stage + "rotor I²t", rotorSquare(t), rotorSquare[k], 2e-6));
      checks.add(near(stage + "heat", 3.0 * totals[k] * rotorSquare(t), heat[k], 2e-6));
    }
    return checks.stream();
  }

  /**
   * Linear-law staged start with load (own derivation, recomputed): 1000 rpm, 500 N·m at slip 0.05,
   * first torque twice rated, R1/R2 = 10, four sections, load 300 N·m, J 50 kg·m². A machine
   * without leakage and stator impedance has the linear law.
   */
  @TestFactory
  Stream<DynamicTest> should_meet_the_staged_start_under_the_linear_law() {
    double r2 = 0.02;
    double synchronous = 2.0 * Math.PI * 50.0 / 3.0;
    // T = U² s/(R ω_s) with U line to line
    double volts = Math.sqrt(10000.0 * r2 * synchronous);
    CircuitData c = new CircuitData(0.0, 0.0, 1e9, r2, 1e-9, 1.0);
    double gamma = Math.pow(0.1, 0.25);
    double[] ohms = new double[5];
    Step.ClosingRule[] rules = new Step.ClosingRule[5];
    for (int k = 0; k < 4; k++) {
      ohms[k] = 10.0 * r2 * Math.pow(gamma, k) * (1.0 - gamma);
      rules[k] = new Step.RotorFrequencyBelow(50.0 * Math.pow(gamma, k + 1));
    }
    rules[4] = new Step.RotorFrequencyBelow(50.0 * 0.0315);
    List<Stage> stages =
        stages(
            volts,
            new Machine(c, 50.0, 3),
            50.0,
            50.0,
            new TorqueCurve.Constant(300.0),
            ohms,
            rules);
    double[] seconds = {5.138776, 2.889746, 1.625024, 0.913818, 2.012206};
    List<DynamicTest> checks = new java.util.ArrayList<>();
    for (int k = 0; k < 5; k++) {
      Stage s = stages.get(k);
      checks.add(
          near("stage " + (k + 1) + " time", s.toSeconds() - s.fromSeconds(), seconds[k], 1e-6));
      checks.add(near("stage " + (k + 1) + " torque in", s.trace().torque()[0], 1000.0, 1e-6));
      double out = s.trace().torque()[s.trace().last()];
      checks.add(near("stage " + (k + 1) + " torque out", out, k < 4 ? 562.3413 : 315.0, 1e-6));
    }
    checks.add(near("all four", stages.get(3).toSeconds(), 10.567364, 1e-6));
    return checks.stream();
  }

  private static DynamicTest near(String name, double actual, double expected, double relative) {
    return DynamicTest.dynamicTest(
        name, () -> assertThat(actual).isCloseTo(expected, within(relative * Math.abs(expected))));
  }

  private static TorqueCurve mslLoad() {
    double share = 1500.0 / 1440.45;
    return new TorqueCurve.Square(161.4 * share * share);
  }

  private static double rotorSquare(Trace t) {
    return t.integralOfSquare(t.ringAmps());
  }

  private static double statorSquare(Trace t) {
    return t.integralOfSquare(t.statorAmps());
  }

  private static List<Stage> stages(
      double volts,
      Machine machine,
      double hertz,
      double inertia,
      TorqueCurve load,
      double[] ohms,
      Step.ClosingRule... rules) {
    double rpm = 0.97 * machine.synchronousSpeed() * 30.0 / Math.PI;
    Starter starter =
        Starters.bare(volts, hertz, rpm, 1.0, machine.circuit(), inertia, load, ohms, rules);
    return new StartSimulator(starter, machine)
        .run(Scenario.PERMITTED, new Conditions(new Source(volts, 0.0), 1, 1, 1, 1))
        .stages();
  }

  /** Speed between samples: the cubic through four of them. */
  private static double speedAt(Trace trace, double seconds) {
    int i = 0;
    while (i < trace.last() - 1 && trace.seconds()[i + 1] < seconds) {
      i++;
    }
    int first = Math.max(0, Math.min(i - 1, trace.last() - 3));
    return cubic(trace.seconds(), trace.speed(), first, seconds);
  }

  private static double timeAt(Trace trace, double rpm) {
    double speed = rpm * Math.PI / 30.0;
    int i = 0;
    while (trace.speed()[i + 1] < speed) {
      i++;
    }
    int first = Math.max(0, Math.min(i - 1, trace.last() - 3));
    return cubic(trace.speed(), trace.seconds(), first, speed);
  }

  private static double cubic(double[] x, double[] y, int first, double at) {
    double sum = 0.0;
    for (int i = first; i < first + 4; i++) {
      double term = y[i];
      for (int j = first; j < first + 4; j++) {
        if (j != i) {
          term *= (at - x[j]) / (x[i] - x[j]);
        }
      }
      sum += term;
    }
    return sum;
  }
}
