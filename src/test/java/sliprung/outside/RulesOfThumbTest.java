package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.curve.ThermalLaw;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.numeric.Root;
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
 * Rules of thumb about starts, each with the figure that closed forms give for it (recomputed by
 * hand from the inputs named; common practice).
 */
@Tag("outside")
class RulesOfThumbTest {
  private static final double VOLTS = 400.0;
  private static final CircuitData CIRCUIT = new CircuitData(0.055, 0.22, 6.2, 0.0574, 0.22, 1.165);
  private static final Machine MACHINE = new Machine(CIRCUIT, 50.0, 2);
  private static final double RATED_TORQUE = 360.0;

  private static Stage firstStage(
      double volts, double ohms, double inertia, double load, double untilHertz) {
    Starter starter =
        Starters.bare(
            VOLTS,
            50.0,
            1460.0,
            55e3,
            CIRCUIT,
            inertia,
            new TorqueCurve.Constant(load),
            new double[] {ohms},
            new Step.RotorFrequencyBelow(untilHertz));
    return new StartSimulator(starter, MACHINE)
        .run(Scenario.PERMITTED, new Conditions(new Source(volts, 0.0), 1, 1, 1, 1))
        .stages()
        .get(0);
  }

  /**
   * A start at 90 % volts takes (M − L)/(0.81 M − L) times as long, for mean torque M against load
   * L. The mean torque is that of a short piece of the start, where it hardly changes.
   */
  @ParameterizedTest
  @CsvSource({"1.6, 0.5, 1.38", "1.6, 0.9, 1.77", "1.3, 0.8, 1.98"})
  void should_take_that_much_longer_at_ninety_per_cent_volts(
      double mean, double load, double growth) {
    double untilHertz = 49.98;
    double ohms =
        Root.find(
            r -> MACHINE.torque(new Source(VOLTS, 0.0), r, untilHertz / 50.0) - mean * RATED_TORQUE,
            0.6,
            20.0,
            1e-12);
    double full = seconds(VOLTS, ohms, load, untilHertz);
    double low = seconds(0.9 * VOLTS, ohms, load, untilHertz);

    assertThat(full).isGreaterThan(0.1);
    assertThat(low / full).isCloseTo(growth, within(0.005));
  }

  private static double seconds(double volts, double ohms, double load, double untilHertz) {
    return firstStage(volts, ohms, 8000.0, load * RATED_TORQUE, untilHertz).toSeconds();
  }

  /** Heat of the whole rotor circuit over the energy of the mass at synchronous speed: 1 − s². */
  @ParameterizedTest
  @CsvSource({"0.75, 0.44, 0.005", "0.5, 0.75, 0.0005", "0.02, 1.00, 0.005"})
  void should_heat_the_rotor_circuit_by_the_slip_squared_that_a_start_passes(
      double toSlip, double expected, double digits) {
    double inertia = 40.0;
    Stage stage = firstStage(VOLTS, 0.5, inertia, 0.0, 50.0 * toSlip);
    Trace t = stage.trace();
    double ohms = CIRCUIT.r2() / (CIRCUIT.ratio() * CIRCUIT.ratio()) + stage.externalOhms();
    double heat = 3.0 * ohms * t.integralOfSquare(t.ringAmps());
    double synchronous = MACHINE.synchronousSpeed();

    assertThat(heat / (0.5 * inertia * synchronous * synchronous))
        .isCloseTo(expected, within(digits));
  }

  /** Plugging to a third of speed, to rest, and over to full speed the other way. */
  @ParameterizedTest
  @CsvSource({"1.3333333333, 2.22", "1.0, 3.00", "0.0001, 4.00"})
  void should_heat_the_rotor_circuit_by_the_slip_squared_that_plugging_passes(
      double toSlip, double expected) {
    Source source = new Source(VOLTS, 0.0);
    double ohms = CIRCUIT.r2() / (CIRCUIT.ratio() * CIRCUIT.ratio()) + 0.5;
    double synchronous = MACHINE.synchronousSpeed();
    int pieces = 20000;
    double heat = 0.0;
    for (int i = 0; i < pieces; i++) {
      double slip = 2.0 - (2.0 - toSlip) * (i + 0.5) / pieces;
      OperatingPoint point = MACHINE.at(source, 0.5, slip);
      double watts = 3.0 * ohms * point.ringAmps() * point.ringAmps();
      // J dω = Te dt, with the inertia of 1 kg·m²
      heat += watts / point.torque() * synchronous * (2.0 - toSlip) / pieces;
    }

    assertThat(heat / (0.5 * synchronous * synchronous)).isCloseTo(expected, within(0.005));
  }

  /** What one body with one time constant makes of a class; a class itself pins less than that. */
  @TestFactory
  Stream<DynamicTest> should_trip_when_one_body_within_the_class_does() {
    return OutsideTable.read("trip-class-one-body")
        .tests(
            row -> {
              double pickUp = row.number("pick_up");
              double tau =
                  ThermalLaw.timeConstant(
                      row.number("limit_s"), row.number("limit_multiple"), pickUp);
              assertThat(
                      ThermalLaw.seconds(
                          tau, row.number("multiple"), pickUp, row.number("earlier")))
                  .isCloseTo(row.number("expected"), within(row.halfLastDigit("expected")));
            });
  }
}
