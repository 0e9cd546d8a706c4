package sliprung.machine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import sliprung.machine.Identification.Residual;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

class NameplateIdentificationTest {
  private static final CircuitData CRUSHER =
      new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);

  @Test
  void should_find_the_crusher_motor_from_its_plate() {
    Identification found = only(Circuits.crusher(2.8));
    CircuitData c = found.circuit();
    assertThat(found.given()).isFalse();
    assertThat(c.r2()).isCloseTo(CRUSHER.r2(), within(0.02 * CRUSHER.r2()));
    assertThat(c.x1() + c.x2()).isCloseTo(0.366, within(0.02 * 0.366));
    assertThat(c.xm()).isCloseTo(CRUSHER.xm(), within(0.03 * CRUSHER.xm()));
    assertThat(c.ratio()).isCloseTo(CRUSHER.ratio(), within(0.02 * CRUSHER.ratio()));
    assertThat(c.r1()).isCloseTo(CRUSHER.r1(), within(0.15 * CRUSHER.r1()));
    // R2 actual ≈ s·U20/(√3·I2)
    double rule = 22.0 / 1500.0 * 420.0 / (Math.sqrt(3.0) * 285.0);
    assertThat(c.r2() / (c.ratio() * c.ratio())).isCloseTo(rule, within(0.06 * rule));
    assertThat(found.residuals()).allMatch(r -> Math.abs(r.relative()) <= r.tolerance());
    assertThat(found.notes()).noneMatch(n -> n.endsWith("check the plate."));
    assertThat(found.residuals())
        .extracting(Residual::quantity)
        .containsExactly(
            "stator current",
            "power factor",
            "efficiency",
            "torque at rated speed",
            "rotor voltage",
            "rotor current",
            "breakdown torque");
  }

  @Test
  void should_compare_a_given_circuit_and_keep_it() {
    Identification found = only(Circuits.with(Circuits.crusher(2.8), CRUSHER));
    assertThat(found.given()).isTrue();
    assertThat(found.circuit()).isEqualTo(CRUSHER);
    assertThat(found.residuals()).hasSize(7);
    assertThat(residual(found, "torque at rated speed").relative()).isCloseTo(0.0, within(0.002));
    assertThat(residual(found, "breakdown torque").relative()).isCloseTo(0.0, within(0.002));
  }

  @Test
  void should_run_both_ends_where_nothing_tells_the_leakage() {
    List<Identification> ends = NameplateIdentification.identify(Circuits.crusher(0));
    assertThat(ends).hasSize(2);
    double rated = Circuits.crusher(0).ratedTorque();
    double[] expected = {2.25, 3.0};
    for (int i = 0; i < 2; i++) {
      Identification end = ends.get(i);
      assertThat(breakdownTorque(end) / rated).isCloseTo(expected[i], within(0.02 * expected[i]));
      assertThat(end.notes()).anyMatch(n -> n.startsWith("Breakdown torque is not given: both"));
    }
  }

  @Test
  void should_take_the_leakage_from_the_locked_rotor_current() {
    double locked = new Machine(CRUSHER, 50.0, 2).at(new Source(690, 0), 0.0, 1.0).statorAmps();
    Identification found =
        only(Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 420, 285, 0, locked));
    assertThat(found.circuit().x1() + found.circuit().x2()).isCloseTo(0.366, within(0.01));
    assertThat(found.notes()).anyMatch(n -> n.contains("locked-rotor current"));
  }

  @Test
  void should_say_what_it_assumed_for_a_bare_plate() {
    Identification found = only(Circuits.plate(690, 50, 200e3, 208, 1478, 0, 0, 420, 285, 2.8, 0));
    assertThat(String.join(" ", found.notes()))
        .contains("Neither power factor nor efficiency is given")
        .contains("Efficiency is not given");
    assertThat(found.circuit().xm()).isCloseTo(CRUSHER.xm(), within(0.3 * CRUSHER.xm()));
    assertThat(found.circuit().r2()).isCloseTo(CRUSHER.r2(), within(0.03 * CRUSHER.r2()));
  }

  @Test
  void should_take_power_factor_from_efficiency_where_only_that_is_given() {
    CircuitData both = only(Circuits.crusher(2.8)).circuit();
    CircuitData one =
        only(Circuits.plate(690, 50, 200e3, 208, 1478, 0, 0.945, 420, 285, 2.8, 0)).circuit();
    assertThat(one.xm()).isCloseTo(both.xm(), within(0.10 * both.xm()));
  }

  @Test
  void should_find_the_ratio_from_one_rotor_figure_alone() {
    double both = only(Circuits.crusher(2.8)).circuit().ratio();
    double volts =
        only(Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 420, 0, 2.8, 0))
            .circuit()
            .ratio();
    double amps =
        only(Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 0, 285, 2.8, 0))
            .circuit()
            .ratio();
    assertThat(volts).isCloseTo(both, within(0.02 * both));
    assertThat(amps).isCloseTo(both, within(0.04 * both));
  }

  @Test
  void should_show_a_figure_the_others_contradict() {
    // one figure each is wrong by a slip of the pen
    Motor rotorAmps = Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 420, 185, 2.8, 0);
    Motor rotorVolts = Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.945, 240, 285, 2.8, 0);
    Motor amps = Circuits.plate(690, 50, 200e3, 280, 1478, 0.86, 0.945, 420, 285, 2.8, 0);
    Motor efficiency = Circuits.plate(690, 50, 200e3, 208, 1478, 0.86, 0.845, 420, 285, 2.8, 0);
    Motor power = Circuits.plate(690, 50, 132e3, 208, 1478, 0.86, 0.945, 420, 285, 2.8, 0);
    for (Motor wrong : List.of(rotorAmps, rotorVolts, amps, efficiency, power)) {
      assertThat(only(wrong).residuals()).anyMatch(r -> Math.abs(r.relative()) > r.tolerance());
    }
  }

  @RepeatedTest(60)
  void should_return_to_the_curves_of_the_machine_whose_plate_it_reads(RepetitionInfo info) {
    Random random = new Random(info.getCurrentRepetition());
    CircuitData truth = Circuits.random(random);
    int pairs = 1 + random.nextInt(6);
    Source source = new Source(400.0, 0.0);
    Machine machine = new Machine(truth, 50.0, pairs);
    Motor plate = plateOf(machine, source, pairs, Circuits.between(random, 1.9, 2.9));
    assertThat(plate.polePairs()).isEqualTo(pairs);
    Machine found = new Machine(only(plate).circuit(), 50.0, pairs);
    double unit = truth.x1() / (truth.ratio() * truth.ratio());
    for (double external : new double[] {0.0, 0.3 * unit, unit, 3.0 * unit}) {
      for (double slip : new double[] {0.02, 0.1, 0.3, 0.6, 1.0, 1.9}) {
        OperatingPoint want = machine.at(source, external, slip);
        OperatingPoint have = found.at(source, external, slip);
        String where = truth + " external " + external + " slip " + slip;
        assertThat(have.torque() / want.torque()).as(where).isCloseTo(1.0, within(0.04));
        assertThat(have.statorAmps() / want.statorAmps()).as(where).isCloseTo(1.0, within(0.04));
        assertThat(have.ringAmps() / want.ringAmps()).as(where).isCloseTo(1.0, within(0.04));
      }
    }
  }

  @RepeatedTest(60)
  void should_answer_any_plate_with_finite_figures(RepetitionInfo info) {
    Random random = new Random(500 + info.getCurrentRepetition());
    double decades = info.getCurrentRepetition() <= 40 ? 2.0 : 6.0;
    double[] f = new double[11];
    double[] middle = {690, 50, 200e3, 208, 1478, 0.5, 0.5, 420, 285, 2.5, 1400};
    for (int i = 0; i < f.length; i++) {
      boolean absent = i >= 5 && random.nextInt(4) == 0;
      f[i] = absent ? 0.0 : middle[i] * Math.pow(10.0, Circuits.between(random, -decades, decades));
    }
    Motor motor = Circuits.plate(f[0], f[1], f[2], f[3], f[4], f[5], f[6], f[7], f[8], f[9], f[10]);
    for (Identification found : NameplateIdentification.identify(motor)) {
      CircuitData c = found.circuit();
      for (double ohms : new double[] {c.r1(), c.x1(), c.xm(), c.r2(), c.x2(), c.ratio()}) {
        assertThat(ohms).isFinite().isPositive();
      }
      assertThat(found.residuals()).allMatch(r -> Double.isFinite(r.relative()));
      boolean contradicted =
          found.residuals().stream().anyMatch(r -> Math.abs(r.relative()) > r.tolerance());
      boolean unusual = found.notes().stream().anyMatch(n -> n.endsWith("check the plate."));
      assertThat(contradicted || unusual).as(found.toString()).isTrue();
    }
  }

  /** The plate of a machine loaded so that breakdown torque is a given multiple of its shaft's. */
  private static Motor plateOf(Machine machine, Source source, int pairs, double breakdown) {
    double shaft = machine.breakdownTorque(source) / breakdown;
    double slip = machine.slipAt(source, 0.0, 1.012 * shaft).orElseThrow();
    double speed = machine.synchronousSpeed() * (1.0 - slip);
    OperatingPoint rated = machine.at(source, 0.0, slip);
    double power = shaft * speed;
    double coreWatts = 0.2 * (rated.inputWatts() - power);
    return Circuits.plate(
        source.volts(),
        50.0,
        power,
        rated.statorAmps(),
        speed * 30.0 / Math.PI,
        rated.powerFactor(),
        power / (rated.inputWatts() + coreWatts),
        machine.openRingVolts(source),
        rated.ringAmps(),
        breakdown,
        0.0);
  }

  private static Identification only(Motor motor) {
    List<Identification> all = NameplateIdentification.identify(motor);
    assertThat(all).hasSize(1);
    return all.get(0);
  }

  private static Residual residual(Identification found, String quantity) {
    return found.residuals().stream()
        .filter(r -> r.quantity().equals(quantity))
        .findFirst()
        .orElseThrow();
  }

  private static double breakdownTorque(Identification found) {
    return residual(found, "breakdown torque").computed();
  }
}
