package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.numeric.Flow;
import sliprung.starter.Motor.CircuitData;

/** The integrator on motions that do not begin at rest, or whose torque no machine gives. */
@Tag("outside")
class MotionTest {
  private static final double NEVER = 1e4;

  /**
   * J.B. Gupta, example 22 (companion p 80; V): 37.5 kW, 500 rpm, mean starting torque 1.25 times
   * rated against rated load, 20 kg·m²: 5.8487 s.
   */
  @Test
  void constant_torque_reaches_speed_in_the_printed_time() {
    double rated = 716.197;
    assertThat(secondsTo(500.0, 1.25 * rated - rated, 20.0)).isCloseTo(5.8487, within(0.0005));
  }

  /**
   * J.B. Gupta, example 23 (V): torque 2·T_N against T_N, stored energy 37.5·660·9.81 J: 12.95 s.
   */
  @Test
  void constant_torque_stores_the_printed_energy_in_the_printed_time() {
    double speed = 500.0 * Math.PI / 30.0;
    double inertia = 2.0 * 37.5 * 660.0 * 9.81 / (speed * speed);
    assertThat(secondsTo(500.0, 716.197, inertia)).isCloseTo(12.95, within(0.005));
  }

  /** J.B. Gupta, example 21 (V): 100 against 30 N·m, 20π rad/s in a second: 1.114 kg·m². */
  @Test
  void constant_torque_accelerates_the_printed_inertia() {
    assertThat(secondsTo(600.0, 70.0, 1.114)).isCloseTo(1.0, within(0.0005));
  }

  private static double secondsTo(double rpm, double net, double inertia) {
    double target = rpm * Math.PI / 30.0;
    return Flow.run(w -> net / inertia, target, 0.0, 0.0, NEVER, w -> w - target).endTime();
  }

  /**
   * Theraja III, example 45.22 (companion pp 1817-1818; V; recomputed): 6 poles, 50 Hz, slip 0.05
   * at 500 N·m, 1000 kg·m², 1000 N·m for 10 s from no load: 615.161 N·m at 938.484 rpm.
   */
  @Test
  void flywheel_takes_part_of_a_load_peak() {
    Linear motor = new Linear(0.05, 500.0);
    double end = motor.speedAfter(10.0, motor.speedAt(0.0), 1000.0, 1000.0);
    assertThat(motor.torque(end)).isCloseTo(615.161, within(0.001));
    assertThat(end * 30.0 / Math.PI).isCloseTo(938.484, within(0.0005));
  }

  /**
   * Theraja III, example 45.20 (V; recomputed): 50 kW at 960 rpm, load 300 N·m and 1500 N·m more
   * for 10 s, 1908.9 kg·m²: twice rated torque at the end of the peak, 700 N·m 8.88 s later.
   */
  @Test
  void flywheel_limits_the_peak_and_recovers_in_the_printed_time() {
    double rated = 50e3 / (960.0 * Math.PI / 30.0);
    Linear motor = new Linear(0.04, rated);
    double end = motor.speedAfter(10.0, motor.speedAt(300.0), 1800.0, 1908.9);
    assertThat(motor.torque(end)).isCloseTo(2.0 * rated, within(0.1));
    double target = motor.speedAt(700.0);
    double seconds =
        Flow.run(w -> (motor.torque(w) - 300.0) / 1908.9, target, 0.0, end, NEVER, w -> w - target)
            .endTime();
    // the companion rounds on the way
    assertThat(seconds).isCloseTo(8.88, within(0.01));
  }

  /** Torque proportional to slip, 1000 rpm synchronous: a machine without any reactance. */
  private static final class Linear {
    private final Machine machine =
        new Machine(new CircuitData(0.0, 0.0, 1e9, 0.02, 1e-9, 1.0), 50.0, 3);
    private final Source source;

    Linear(double slip, double torque) {
      double volts = Math.sqrt(torque * 0.02 * machine.synchronousSpeed() / slip);
      source = new Source(volts, 0.0);
    }

    double torque(double speed) {
      return machine.torque(source, 0.0, machine.slip(speed));
    }

    double speedAt(double torque) {
      double slip = machine.slipAt(source, 0.0, torque).orElseThrow();
      return machine.synchronousSpeed() * (1.0 - slip);
    }

    double speedAfter(double seconds, double from, double load, double inertia) {
      return Flow.run(
              w -> (torque(w) - load) / inertia, machine.synchronousSpeed(), 0.0, from, seconds)
          .endValue();
    }
  }

  /**
   * Dubey, example 6.7 (companion p 176; V): 2200 V, 6 poles, 50 Hz, 100 kg·m². Plugging from
   * backward synchronous speed to rest takes 3.0813 s under the law without stator resistance.
   */
  @Test
  void plugging_takes_the_printed_time() {
    double breakdownSlip = 0.12 / Math.hypot(0.075, 1.0);
    assertThat(pluggingSeconds(breakdownSlip, 21441.0)).isCloseTo(3.0813, within(0.0005));
  }

  /**
   * The shortest plugging has breakdown slip √(3/(2 ln 2)): 1.019667·Jω_s/T_m, there 0.50 s (V).
   */
  @Test
  void shortest_plugging_takes_the_printed_time() {
    double breakdownSlip = Math.sqrt(1.5 / Math.log(2.0));
    double unit = 100.0 * 2.0 * Math.PI * 50.0 / 3.0 / 21441.0;
    double seconds = pluggingSeconds(breakdownSlip, 21441.0);
    assertThat(seconds / unit).isCloseTo(1.019667, within(1e-6));
    assertThat(seconds).isCloseTo(0.50, within(0.005));
    assertThat(pluggingSeconds(1.1 * breakdownSlip, 21441.0)).isGreaterThan(seconds);
    assertThat(pluggingSeconds(0.9 * breakdownSlip, 21441.0)).isGreaterThan(seconds);
  }

  /** Same example (V): plugging heats both windings with 2673.018 kJ, three times a start. */
  @Test
  void plugging_heats_with_three_times_the_energy_of_a_start() {
    Machine machine = new Machine(new CircuitData(0.075, 0.5, 1e9, 0.12, 0.5, 1.0), 50.0, 3);
    Source source = new Source(2200.0, 0.0);
    double joules = 0.0;
    Flow.Samples s =
        Flow.run(
            w -> machine.torque(source, 0.0, machine.slip(w)) / 100.0,
            machine.synchronousSpeed(),
            0.0,
            -machine.synchronousSpeed(),
            NEVER,
            w -> w);
    for (int i = 0; i + 2 < s.times().length; i += 2) {
      double sum = heat(machine, source, s.values()[i]);
      sum += 4.0 * heat(machine, source, s.values()[i + 1]);
      sum += heat(machine, source, s.values()[i + 2]);
      joules += sum * (s.times()[i + 2] - s.times()[i]) / 6.0;
    }
    assertThat(joules / 1000.0).isCloseTo(2673.018, within(0.0005));
  }

  private static double heat(Machine machine, Source source, double speed) {
    double amps = machine.at(source, 0.0, machine.slip(speed)).ringAmps();
    return 3.0 * amps * amps * (0.075 + 0.12);
  }

  /** Reactance 1 Ω and no stator impedance: the law T = 2·T_m/(s/s_m + s_m/s). */
  private static double pluggingSeconds(double breakdownSlip, double breakdownTorque) {
    Machine machine = new Machine(new CircuitData(0.0, 0.0, 1e9, breakdownSlip, 1.0, 1.0), 50.0, 3);
    double synchronous = machine.synchronousSpeed();
    Source source = new Source(Math.sqrt(2.0 * synchronous * breakdownTorque), 0.0);
    return Flow.run(
            w -> machine.torque(source, 0.0, machine.slip(w)) / 100.0,
            synchronous,
            0.0,
            -synchronous,
            NEVER,
            w -> w)
        .endTime();
  }
}
