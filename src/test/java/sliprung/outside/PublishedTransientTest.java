package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartSimulator;
import sliprung.runup.Trace;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/**
 * The electrical transient of the Modelica Standard Library's slip-ring start, with the resistances
 * of its switches: 1e-5 Ω in the line of a stator in delta is 3e-5 Ω in series with a winding.
 */
@Tag("outside")
class PublishedTransientTest {
  private static final double LINE_CLOSING = 0.1;
  private static final double INERTIA = 0.58;
  private static final double RHEOSTAT = 0.16;
  private static final double ROTOR = 0.04;
  private static final List<Stage> STAGES = stages();

  private static List<Stage> stages() {
    double main = 3.0 * Math.sqrt(1.0 - 0.0667);
    double leakage = 3.0 - main;
    CircuitData circuit = new CircuitData(0.03 + 3e-5, leakage, main, ROTOR + 1e-5, leakage, 1.0);
    double rated = 161.4 * Math.pow(1500.0 / 1440.45, 2);
    double volts = 100.0 * Math.sqrt(3.0);
    Starter starter =
        Starters.bare(
            volts,
            50.0,
            1440.45,
            24346.0,
            circuit,
            INERTIA,
            new TorqueCurve.Square(rated),
            new double[] {RHEOSTAT, 0.0},
            new Step.After(0.9),
            new Step.After(0.5));
    return new StartSimulator(starter, new Machine(circuit, 50.0, 2))
        .runTransient(Scenario.PERMITTED, new Conditions(new Source(volts, 0.0), 1, 1, 1, 1))
        .stages();
  }

  private static Trace trace(int stage) {
    return STAGES.get(stage - 1).trace();
  }

  @TestFactory
  Stream<DynamicTest> should_follow_the_published_slip_ring_start() {
    return OutsideTable.read("ims-start")
        .tests(
            row -> {
              double time = row.number("time_s") - LINE_CLOSING;
              Trace t = trace(time < 0.9 ? 1 : 2);
              assertThat(at(t, t.speed(), time))
                  .isCloseTo(row.number("speed_rad_s"), within(0.001));
              near(at(t, t.statorAmps(), time), row.number("stator_a"), 1e-4);
              near(at(t, t.ringAmps(), time), row.number("rotor_a"), 1e-4);
              near(at(t, t.torque(), time), row.number("torque_nm"), 1e-3);
            });
  }

  private static void near(double actual, double expected, double share) {
    assertThat(actual).isCloseTo(expected, within(share * Math.abs(expected)));
  }

  @TestFactory
  Stream<DynamicTest> should_meet_its_peaks_integrals_and_times() {
    return OutsideTable.read("ims-start-figures")
        .tests(
            row ->
                assertThat(figure(row.name()))
                    .isCloseTo(row.number("expected"), within(row.number("tolerance"))));
  }

  private static double figure(String quantity) {
    ClosingPeak first = STAGES.get(0).peak().orElseThrow();
    ClosingPeak second = STAGES.get(1).peak().orElseThrow();
    return switch (quantity) {
      case "peak of stator current in stage 1" -> first.statorAmps();
      case "instant of that peak" -> first.statorAtSeconds() + LINE_CLOSING;
      case "peak of torque in stage 1" -> first.torque();
      case "instant of that torque" -> first.torqueAtSeconds() + LINE_CLOSING;
      case "peak of stator current in stage 2" -> second.statorAmps();
      case "instant of that peak in stage 2" -> second.statorAtSeconds() + LINE_CLOSING;
      case "peak of torque in stage 2" -> second.torque();
      case "instant of that torque in stage 2" -> second.torqueAtSeconds() + LINE_CLOSING;
      case "rotor I2t of stage 1" -> trace(1).integralOfSquare(trace(1).ringAmps());
      case "rotor I2t of stage 2" -> trace(2).integralOfSquare(trace(2).ringAmps());
      case "stator I2t of stage 1" -> trace(1).integralOfSquare(trace(1).statorAmps());
      case "stator I2t of stage 2" -> trace(2).integralOfSquare(trace(2).statorAmps());
      case "energy in the rheostat" ->
          3.0 * RHEOSTAT * trace(1).integralOfSquare(trace(1).ringAmps());
      case "energy in the rotor winding in stage 1" ->
          3.0 * ROTOR * trace(1).integralOfSquare(trace(1).ringAmps());
      case "energy in the rotor winding in stage 2" ->
          3.0 * ROTOR * trace(2).integralOfSquare(trace(2).ringAmps());
      case "kinetic energy at 1.0 s" -> kinetic(trace(1));
      case "kinetic energy at 1.5 s" -> kinetic(trace(2));
      case "time of 500 rpm" -> timeOf(1, 500.0);
      case "time of 1000 rpm" -> timeOf(1, 1000.0);
      case "time of 1200 rpm" -> timeOf(1, 1200.0);
      case "time of 1300 rpm" -> timeOf(2, 1300.0);
      case "time of 1400 rpm" -> timeOf(2, 1400.0);
      default -> throw new IllegalStateException(quantity);
    };
  }

  private static double kinetic(Trace t) {
    double speed = t.speed()[t.last()];
    return 0.5 * INERTIA * speed * speed;
  }

  private static double timeOf(int stage, double rpm) {
    Trace t = trace(stage);
    double speed = rpm * Math.PI / 30.0;
    int i = 0;
    while (t.speed()[i + 1] < speed) {
      i++;
    }
    return LINE_CLOSING + Samples.cubic(t.speed(), t.seconds(), i, speed);
  }

  private static double at(Trace t, double[] quantity, double time) {
    return Samples.at(t.seconds(), quantity, time);
  }
}
