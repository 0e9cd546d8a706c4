package sliprung.machine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import sliprung.starter.Motor.CircuitData;

class MachineTest {
  private static final CircuitData CRUSHER =
      new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);
  private static final Source SOURCE = new Source(690.0, 0.02);

  private final Machine machine = new Machine(CRUSHER, 50.0, 2);

  @RepeatedTest(50)
  void should_depend_on_resistance_and_slip_only_through_their_quotient(RepetitionInfo info) {
    Random random = new Random(info.getCurrentRepetition());
    CircuitData c = Circuits.random(random);
    Machine m = new Machine(c, 50.0, 1 + random.nextInt(6));
    Source source = new Source(400.0, random.nextDouble() * 0.1 * c.xm());
    double slip = Circuits.between(random, -2.0, 2.0);
    double external = random.nextDouble() * c.xm() / (c.ratio() * c.ratio());
    OperatingPoint shorted = m.at(source, 0.0, slip * c.r2() / m.referredResistance(external));
    OperatingPoint held = m.at(source, external, slip);
    assertThat(held.statorAmps()).isCloseTo(shorted.statorAmps(), relative(held.statorAmps()));
    assertThat(held.ringAmps()).isCloseTo(shorted.ringAmps(), relative(held.ringAmps()));
    assertThat(held.torque()).isCloseTo(shorted.torque(), relative(held.torque()));
    assertThat(held.powerFactor()).isCloseTo(shorted.powerFactor(), within(1e-11));
  }

  @RepeatedTest(50)
  void should_balance_power_and_find_its_greatest_torque(RepetitionInfo info) {
    Random random = new Random(1000 + info.getCurrentRepetition());
    CircuitData c = Circuits.random(random);
    Machine m = new Machine(c, 60.0, 2);
    Source source = new Source(480.0, random.nextDouble() * c.x1());
    double external = random.nextDouble() * c.x1() / (c.ratio() * c.ratio());
    OperatingPoint p = m.at(source, external, Circuits.between(random, 0.01, 2.0));
    double copper = 3.0 * p.statorAmps() * p.statorAmps() * c.r1();
    double airGap = p.torque() * m.synchronousSpeed();
    assertThat(p.inputWatts()).isCloseTo(copper + airGap, relative(p.inputWatts()));

    double best = m.breakdownSlip(source, external);
    double torque = m.breakdownTorque(source);
    assertThat(m.torque(source, external, best)).isCloseTo(torque, relative(torque));
    assertThat(m.torque(source, external, best * 1.01)).isLessThan(torque);
    assertThat(m.torque(source, external, best * 0.99)).isLessThan(torque);

    double ohms = m.externalOhmsForGreatestStandstillTorque(source);
    assertThat(m.torque(source, ohms, 1.0)).isCloseTo(torque, relative(torque));
  }

  @RepeatedTest(50)
  void should_find_the_slip_of_a_torque_driving_and_overhauling(RepetitionInfo info) {
    Random random = new Random(2000 + info.getCurrentRepetition());
    CircuitData c = Circuits.random(random);
    Machine m = new Machine(c, 50.0, 3);
    Source source = new Source(690.0, random.nextDouble() * c.x1());
    double external = random.nextDouble() * c.x1() / (c.ratio() * c.ratio());
    double torque = Circuits.between(random, -0.99, 0.99) * m.breakdownTorque(source);
    double slip = m.slipAt(source, external, torque).orElseThrow();
    assertThat(m.torque(source, external, slip)).isCloseTo(torque, relative(torque));
    assertThat(Math.abs(slip)).isLessThan(m.breakdownSlip(source, external));
    assertThat(Math.signum(slip)).isEqualTo(Math.signum(torque));
  }

  @Test
  void should_have_no_slip_for_a_torque_beyond_breakdown() {
    double most = machine.breakdownTorque(SOURCE);
    assertThat(machine.slipAt(SOURCE, 0.1, 1.0001 * most)).isEmpty();
    assertThat(machine.slipAt(SOURCE, 0.1, 0.9999 * most)).isPresent();
    assertThat(machine.slipAt(SOURCE, 0.1, 0.0)).hasValue(0.0);
    // braking, the machine gives more than driving, yet not without end
    assertThat(machine.slipAt(SOURCE, 0.1, -1.05 * most)).isPresent();
    assertThat(machine.slipAt(SOURCE, 0.1, -10.0 * most)).isEmpty();
  }

  @Test
  void should_need_no_external_resistance_where_the_winding_has_more_than_enough() {
    CircuitData resistive = new CircuitData(0.03, 0.183, 4.8, 5.0, 0.183, 1.568);
    assertThat(new Machine(resistive, 50.0, 2).externalOhmsForGreatestStandstillTorque(SOURCE))
        .isZero();
  }

  @Test
  void should_cope_without_stator_impedance_and_magnetizing_current() {
    Machine m = new Machine(new CircuitData(0.0, 0.0, 1e9, 0.03, 0.2, 1.5), 50.0, 2);
    Source ideal = new Source(690.0, 0.0);
    double phase = 690.0 / Math.sqrt(3.0);
    OperatingPoint p = m.at(ideal, 0.0, 0.5);
    assertThat(p.statorAmps()).isCloseTo(phase / Math.hypot(0.06, 0.2), relative(2000));
    assertThat(p.ringAmps()).isCloseTo(1.5 * p.statorAmps(), relative(3000));
    assertThat(m.breakdownSlip(ideal, 0.0)).isCloseTo(0.15, within(1e-9));
    assertThat(m.openRingVolts(ideal)).isCloseTo(460.0, within(1e-6));
  }

  @Test
  void should_be_finite_at_synchronous_speed_and_draw_magnetizing_current_only() {
    OperatingPoint p = machine.at(SOURCE, 0.0, 0.0);
    double phase = 690.0 / Math.sqrt(3.0);
    assertThat(p.statorAmps())
        .isCloseTo(phase / Math.hypot(0.03, 0.183 + 0.02 + 4.795), within(1e-6));
    assertThat(p.torque()).isCloseTo(0.0, within(1e-3));
    assertThat(p.ringAmps()).isCloseTo(0.0, within(1e-3));
  }

  private static org.assertj.core.data.Offset<Double> relative(double value) {
    return within(1e-9 * Math.abs(value));
  }
}
