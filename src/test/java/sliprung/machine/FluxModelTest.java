package sliprung.machine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import sliprung.starter.Motor.CircuitData;

class FluxModelTest {

  @Test
  void the_settled_state_is_the_steady_circuit_at_every_slip() {
    Random random = new Random(11);
    for (int i = 0; i < 300; i++) {
      Machine machine = new Machine(Circuits.random(random), 50.0, 1 + random.nextInt(6));
      Source source = new Source(690.0, random.nextInt(2) * Circuits.between(random, 0.0, 0.05));
      double external = random.nextInt(2) * Circuits.between(random, 0.0, 2.0);
      double slip = Circuits.between(random, -1.0, 2.0);
      FluxModel model = new FluxModel(machine, source, external);

      double[] state = model.settledAt(machine.synchronousSpeed() * (1.0 - slip));

      OperatingPoint steady = machine.at(source, external, slip);
      same(model.statorAmps(state), steady.statorAmps());
      same(model.ringAmps(state), steady.ringAmps());
      same(model.torque(state), steady.torque());
      same(model.terminals(state).volts(), steady.terminalVolts());
      same(model.terminals(state).inputWatts(), steady.inputWatts());
      double[] rate = new double[FluxModel.STATES];
      model.fluxRates(state, rate);
      for (int k = 0; k < FluxModel.SPEED; k++) {
        assertThat(rate[k]).isCloseTo(0.0, within(1e-9 * source.volts()));
      }
    }
  }

  private static void same(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(1e-9 * Math.abs(expected)));
  }

  @Test
  void a_source_reactance_is_leakage_of_the_stator_to_everything_but_the_terminals() {
    CircuitData c = new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);
    CircuitData more = new CircuitData(0.030, 0.203, 4.795, 0.0298, 0.183, 1.568);
    FluxModel behind = new FluxModel(new Machine(c, 50, 2), new Source(690, 0.020), 0.1);
    FluxModel inside = new FluxModel(new Machine(more, 50, 2), new Source(690, 0.0), 0.1);
    double[] state = {0.9, -1.1, 0.4, -1.3, 70.0};
    double[] one = new double[FluxModel.STATES];
    double[] other = new double[FluxModel.STATES];

    behind.fluxRates(state, one);
    inside.fluxRates(state, other);

    assertThat(one).containsExactly(other, within(1e-9));
    assertThat(behind.torque(state)).isCloseTo(inside.torque(state), within(1e-9));
    assertThat(inside.terminals(state).volts()).isCloseTo(690.0, within(1e-9));
    assertThat(behind.terminals(state).volts()).isNotCloseTo(690.0, within(1.0));
  }

  @Test
  void power_in_is_heat_and_shaft_power_and_what_the_field_takes() {
    CircuitData c = new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);
    Machine machine = new Machine(c, 50, 2);
    FluxModel model = new FluxModel(machine, new Source(690, 0.0), 0.1);
    double[] state = {0.9, -1.1, 0.4, -1.3, 70.0};
    double[] rate = new double[FluxModel.STATES];
    model.fluxRates(state, rate);
    double step = 1e-7;
    double[] later = state.clone();
    double[] before = state.clone();
    for (int k = 0; k < FluxModel.SPEED; k++) {
      later[k] += step * rate[k];
      before[k] -= step * rate[k];
    }

    double stator = model.statorAmps(state);
    double ring = model.ringAmps(state);
    double heat =
        3.0 * c.r1() * stator * stator
            + 3.0 * machine.referredResistance(0.1) / (1.568 * 1.568) * ring * ring;
    double field = (model.fieldJoules(later) - model.fieldJoules(before)) / (2.0 * step);
    double in = model.terminals(state).inputWatts();

    assertThat(heat + model.torque(state) * 70.0 + field)
        .isCloseTo(in, within(1e-6 * Math.abs(in)));
  }
}
