package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.numeric.Root;
import sliprung.starter.Motor.CircuitData;

/**
 * What everybody who works with slip-ring motors knows of them. Mark: common practice.
 *
 * <p>The machines are those of two textbooks: the 3 hp motor of Krause, Analysis of Electric
 * Machinery (220 V, 60 Hz, 1710 rpm; V), and the 25 hp wound-rotor motor of Chapman, Electric
 * Machinery Fundamentals (460 V, 60 Hz; V). The three rules on how many times full-load current is
 * drawn hold for the former (7.4, 8.7, 0.26) and not for the latter, whose leakage and stator
 * resistance are large: shorted it draws 4.9 times its stator and 5.2 times its rotor current, and
 * at twice full-load stator current the rotor draws 0.40 of what it drew shorted. Hence these rules
 * are tested on the former alone.
 */
@Tag("outside")
class CommonPracticeTest {

  private enum Known {
    KRAUSE_3_HP(new CircuitData(0.435, 0.754, 26.13, 0.816, 0.754, 1.0), 220.0, 90.0 / 1800.0),
    CHAPMAN_25_HP(new CircuitData(0.641, 1.106, 26.3, 0.332, 0.464, 1.0), 460.0, 0.022);

    final CircuitData circuit;
    final Machine machine;
    final Source source;
    final double ratedSlip;

    Known(CircuitData circuit, double volts, double ratedSlip) {
      this.circuit = circuit;
      this.machine = new Machine(circuit, 60.0, 2);
      this.source = new Source(volts, 0.0);
      this.ratedSlip = ratedSlip;
    }

    OperatingPoint at(double external, double slip) {
      return machine.at(source, external, slip);
    }

    double fullTorque() {
      return at(0.0, ratedSlip).torque();
    }
  }

  private static final Known KRAUSE = Known.KRAUSE_3_HP;

  private static Stream<DynamicTest> onBoth(java.util.function.Consumer<Known> check) {
    return Stream.of(Known.values())
        .map(known -> DynamicTest.dynamicTest(known.name(), () -> check.accept(known)));
  }

  @TestFactory
  Stream<DynamicTest> rings_open_at_rest_show_a_voltage_proportional_to_the_stators() {
    return onBoth(
        known -> {
          double volts = known.source.volts();
          double full = known.machine.openRingVolts(known.source);
          double half = known.machine.openRingVolts(new Source(0.5 * volts, 0.0));
          assertThat(half).isCloseTo(0.5 * full, within(1e-9 * full));
          // little less than stator voltage over ratio
          assertThat(full / volts).isBetween(0.94, 1.0);
          // what a huge resistance across the rings sees is the same voltage
          OperatingPoint open = known.at(1e6, 1.0);
          assertThat(Math.sqrt(3.0) * open.ringAmps() * 1e6).isCloseTo(full, within(1e-4 * full));
        });
  }

  @TestFactory
  Stream<DynamicTest> rotor_frequency_is_slip_times_supply_frequency() {
    return onBoth(
        known -> {
          double synchronous = known.machine.synchronousSpeed();
          assertThat(60.0 * known.machine.slip(0.0)).isCloseTo(60.0, within(1e-9));
          assertThat(60.0 * known.machine.slip(synchronous)).isCloseTo(0.0, within(1e-9));
          assertThat(60.0 * known.machine.slip(0.75 * synchronous)).isCloseTo(15.0, within(1e-9));
          assertThat(60.0 * known.machine.slip(-synchronous)).isCloseTo(120.0, within(1e-9));
        });
  }

  @TestFactory
  Stream<DynamicTest> ring_voltage_of_a_held_step_falls_with_speed() {
    return onBoth(
        known -> {
          double ohms = known.machine.externalOhmsForGreatestStandstillTorque(known.source);
          double[] volts =
              DoubleStream.of(1.0, 0.8, 0.6, 0.4, 0.2, 0.1)
                  .map(slip -> Math.sqrt(3.0) * known.at(ohms, slip).ringAmps() * ohms)
                  .toArray();
          for (int i = 1; i < volts.length; i++) {
            assertThat(volts[i]).isLessThan(volts[i - 1]);
          }
        });
  }

  @Test
  void started_with_rings_shorted_it_draws_six_to_eight_times_its_stator_current() {
    assertThat(KRAUSE.at(0, 1).statorAmps() / KRAUSE.at(0, KRAUSE.ratedSlip).statorAmps())
        .isBetween(6.0, 8.0);
  }

  @Test
  void started_with_rings_shorted_it_draws_about_nine_times_its_rotor_current() {
    assertThat(KRAUSE.at(0, 1).ringAmps() / KRAUSE.at(0, KRAUSE.ratedSlip).ringAmps())
        .isBetween(8.1, 9.9);
  }

  @Test
  void at_twice_full_load_stator_current_the_rotor_draws_about_a_quarter_of_shorted() {
    double twice = 2.0 * KRAUSE.at(0, KRAUSE.ratedSlip).statorAmps();
    double ohms = Root.find(r -> KRAUSE.at(r, 1).statorAmps() - twice, 0.0, 100.0, 1e-10);
    assertThat(KRAUSE.at(ohms, 1).ringAmps() / KRAUSE.at(0, 1).ringAmps()).isBetween(0.22, 0.28);
  }

  @TestFactory
  Stream<DynamicTest> rotor_resistance_lowers_starting_current_and_raises_starting_torque() {
    return onBoth(
        known -> {
          OperatingPoint shorted = known.at(0, 1);
          double ohms = known.machine.externalOhmsForGreatestStandstillTorque(known.source);
          OperatingPoint started = known.at(ohms, 1);
          assertThat(started.statorAmps()).isLessThan(shorted.statorAmps());
          assertThat(started.torque()).isGreaterThan(shorted.torque());
          assertThat(started.powerFactor()).isGreaterThan(shorted.powerFactor());
        });
  }

  @TestFactory
  Stream<DynamicTest> resistance_left_in_settles_below_full_speed_and_each_section_out_raises_it() {
    return onBoth(
        known -> {
          double own = known.circuit.r2();
          double before = Double.POSITIVE_INFINITY;
          for (double external : new double[] {4 * own, 2 * own, own, 0.5 * own, 0.0}) {
            double slip =
                known.machine.slipAt(known.source, external, known.fullTorque()).orElseThrow();
            assertThat(slip).isLessThan(before);
            before = slip;
          }
          assertThat(before).isCloseTo(known.ratedSlip, within(1e-9));
        });
  }

  @TestFactory
  Stream<DynamicTest> settled_currents_of_a_held_step_are_those_of_running() {
    return onBoth(
        known -> {
          OperatingPoint running = known.at(0.0, known.ratedSlip);
          double external = 3.0 * known.circuit.r2();
          double slip =
              known.machine.slipAt(known.source, external, known.fullTorque()).orElseThrow();
          OperatingPoint held = known.at(external, slip);
          assertThat(held.statorAmps()).isCloseTo(running.statorAmps(), within(1e-9));
          assertThat(held.ringAmps()).isCloseTo(running.ringAmps(), within(1e-9));
        });
  }

  @TestFactory
  Stream<DynamicTest> breakdown_torque_does_not_change_with_rotor_resistance_its_slip_does() {
    return onBoth(
        known -> {
          double torque = known.machine.breakdownTorque(known.source);
          for (double factor : new double[] {1.0, 2.0, 5.0}) {
            double external = (factor - 1.0) * known.circuit.r2();
            double slip = known.machine.breakdownSlip(known.source, external);
            assertThat(slip / known.machine.breakdownSlip(known.source, 0.0))
                .isCloseTo(factor, within(1e-9));
            assertThat(known.at(external, slip).torque()).isCloseTo(torque, within(1e-9 * torque));
          }
        });
  }

  @TestFactory
  Stream<DynamicTest> torque_falls_with_the_square_of_voltage() {
    return onBoth(
        known -> {
          Source low = new Source(0.8 * known.source.volts(), 0.0);
          for (double slip : new double[] {0.02, 0.2, 1.0}) {
            double full = known.at(0.0, slip).torque();
            assertThat(known.machine.torque(low, 0.0, slip))
                .isCloseTo(0.64 * full, within(1e-9 * full));
          }
        });
  }

  @TestFactory
  Stream<DynamicTest> without_stator_impedance_greatest_standstill_torque_is_at_r_equal_x2() {
    return onBoth(
        known -> {
          double x2 = known.circuit.x2();
          double r2 = 0.1 * x2;
          Machine bare = new Machine(new CircuitData(0.0, 0.0, 1e9, r2, x2, 1.0), 60.0, 2);
          double ohms = bare.externalOhmsForGreatestStandstillTorque(known.source);
          assertThat(r2 + ohms).isCloseTo(x2, within(1e-6 * x2));
          assertThat(bare.at(known.source, ohms, 1.0).powerFactor())
              .isCloseTo(0.707, within(0.0005));
        });
  }

  @TestFactory
  Stream<DynamicTest> with_stator_impedance_it_needs_more_and_rotor_power_factor_is_higher() {
    return onBoth(
        known -> {
          double whole =
              known.circuit.r2()
                  + known.machine.externalOhmsForGreatestStandstillTorque(known.source);
          double x2 = known.circuit.x2();
          assertThat(whole).isGreaterThan(1.5 * x2);
          assertThat(whole / Math.hypot(whole, x2)).isGreaterThan(0.85);
        });
  }
}
