package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import sliprung.fixture.Starters;
import sliprung.machine.FluxModel;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.starter.Load;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

class TransientStartTest {
  private static final CircuitData CIRCUIT =
      new CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568);
  private static final Machine MACHINE = new Machine(CIRCUIT, 50, 2);
  private static final double INERTIA = 12.0;
  private static final double VOLTS = 690.0;
  private static final double[] BANK = {0.1845, 0.0930, 0.0469, 0.0237, 0.0119};
  private static final double[] EXTERNAL = {0.36, 0.1755, 0.0825, 0.0356, 0.0119, 0.0};
  private static final TorqueCurve LOAD = new TorqueCurve.Square(600.0);
  private static final Conditions NOMINAL = conditions(0.0);

  private static Conditions conditions(double reactance) {
    return new Conditions(new Source(VOLTS, reactance), 1, 1, 1, 1);
  }

  private static Starter starter(TorqueCurve load, Step.ClosingRule... rules) {
    return Starters.bare(VOLTS, 50, 1478, 200e3, CIRCUIT, INERTIA, load, BANK, rules);
  }

  private static final Starter TIMED =
      starter(
          LOAD,
          new Step.After(0.8),
          new Step.After(0.5),
          new Step.After(0.3),
          new Step.After(0.2),
          new Step.After(0.2));

  private static Starter with(Starter s, Load load) {
    return new Starter(
        s.name(),
        s.practice(),
        s.supply(),
        s.motor(),
        load,
        s.resistors(),
        s.steps(),
        s.sequence(),
        s.timerSpread(),
        s.levelSpread(),
        s.contactors(),
        s.breakers(),
        s.protection(),
        s.statorConductor(),
        s.rotorConductor(),
        s.duty(),
        s.limits(),
        s.margins(),
        s.fuseWear(),
        s.interlocks(),
        s.ambient(),
        s.evidence(),
        s.accepted(),
        s.assumptions(),
        s.notYetJudged());
  }

  private static Load load(TorqueCurve torque, double breakaway, boolean active, double brake) {
    return new Load(
        INERTIA / 2.0, OptionalDouble.of(breakaway), torque, 0.85, -0.2, 0.2, active, brake);
  }

  private static StartHistory full(Starter starter, Scenario scenario) {
    return new StartSimulator(starter, MACHINE).runTransient(scenario, NOMINAL);
  }

  private final StartHistory history = full(TIMED, Scenario.PERMITTED);

  @Test
  void the_circuit_is_dead_before_and_fluxes_and_speed_go_on_through_every_closing() {
    assertThat(history.outcome()).isEqualTo(Outcome.RUNNING);
    assertThat(history.stages()).hasSize(6);
    Trace first = history.stages().get(0).trace();
    assertThat(first.statorAmps()[0]).isZero();
    assertThat(first.torque()[0]).isZero();
    for (int i = 1; i < 6; i++) {
      Trace before = history.stages().get(i - 1).trace();
      Trace after = history.stages().get(i).trace();
      assertThat(after.statorAmps()[0]).isCloseTo(before.statorAmps()[before.last()], within(1e-9));
      assertThat(after.speed()[0]).isEqualTo(before.speed()[before.last()]);
      assertThat(after.seconds()[0]).isEqualTo(before.seconds()[before.last()]);
    }
  }

  @Test
  void a_stage_begins_with_the_steady_figures_of_its_closing_beside_the_samples() {
    for (Stage stage : history.stages()) {
      OperatingPoint steady =
          MACHINE.at(
              NOMINAL.source(), stage.externalOhms(), MACHINE.slip(stage.trace().speed()[0]));
      assertThat(stage.entry()).isEqualTo(steady);
    }
    for (Stage stage : history.stages().subList(1, 4)) {
      ClosingPeak peak = stage.peak().orElseThrow();
      double steady = stage.entry().statorAmps();
      assertThat(peak.statorAmps()).isBetween(1.1 * steady, 2.0 * steady);
      assertThat(peak.statorRms()).isBetween(0.8 * steady, 1.05 * steady);
      assertThat(peak.torque())
          .isBetween(0.8 * stage.entry().torque(), 1.2 * stage.entry().torque());
    }
  }

  /** From rest the offset makes the first peak of the current and the swing of the torque. */
  @Test
  void the_first_peaks_are_those_of_an_offset_current() {
    Stage first = history.stages().get(0);
    ClosingPeak peak = first.peak().orElseThrow();
    double steady = Math.sqrt(2.0) * first.entry().statorAmps();
    assertThat(peak.statorAmps()).isBetween(1.1 * steady, 2.0 * steady);
    assertThat(peak.statorAtSeconds()).isBetween(0.004, 0.012);
    assertThat(peak.torque()).isBetween(1.5 * first.entry().torque(), 2.5 * first.entry().torque());
  }

  @Test
  void what_settles_settles_on_the_steady_circuit_within_a_hundredth_of_a_per_cent() {
    for (int step = 1; step <= 5; step++) {
      StartHistory held =
          full(TIMED, new Scenario(Scenario.Kind.HELD, step, Scenario.LoadMode.RUNNING));
      StartHistory steady = new StartSimulator(TIMED, MACHINE).run(held.scenario(), NOMINAL);
      assertThat(held.outcome()).isEqualTo(steady.outcome());
      int last = held.stages().size() - 1;
      for (int k : List.of(last - 1, last)) {
        Trace ours = held.stages().get(k).trace();
        Trace theirs = steady.stages().get(k).trace();
        assertThat(held.stages().get(k).settled()).isTrue();
        same(ours.speed()[ours.last()], theirs.speed()[theirs.last()]);
        same(ours.statorAmps()[ours.last()], theirs.statorAmps()[theirs.last()]);
        same(ours.ringAmps()[ours.last()], theirs.ringAmps()[theirs.last()]);
        same(ours.torque()[ours.last()], theirs.torque()[theirs.last()]);
      }
    }
  }

  private static void same(double actual, double expected) {
    assertThat(actual).isCloseTo(expected, within(1e-4 * Math.abs(expected)));
  }

  @Test
  void before_it_is_taken_for_settled_it_has_come_within_a_hundredth_of_a_per_cent() {
    Stage last = history.stages().get(5);
    Trace t = last.trace();
    OperatingPoint steady = MACHINE.at(NOMINAL.source(), 0.0, MACHINE.slip(t.speed()[t.last()]));
    int i = t.last() - 2;
    same(t.statorAmps()[i], steady.statorAmps());
    same(t.torque()[i], steady.torque());
    same(t.terminalVolts()[i], steady.terminalVolts());
  }

  @Test
  void input_is_heat_motion_load_and_field_to_a_millionth() {
    double in = 0.0;
    double out = 0.0;
    for (Stage stage : history.stages()) {
      Trace t = stage.trace();
      double rotor = MACHINE.referredResistance(stage.externalOhms()) / Math.pow(1.568, 2);
      double[] shaft = new double[t.size()];
      for (int i = 0; i < shaft.length; i++) {
        shaft[i] = t.loadTorque()[i] * t.speed()[i];
      }
      in += t.integral(t.inputWatts());
      out += 3.0 * CIRCUIT.r1() * t.integralOfSquare(t.statorAmps());
      out += 3.0 * rotor * t.integralOfSquare(t.ringAmps());
      out += t.integral(shaft);
    }
    Trace last = history.stages().get(5).trace();
    double speed = last.speed()[last.last()];
    FluxModel model = new FluxModel(MACHINE, NOMINAL.source(), 0.0);
    out += 0.5 * INERTIA * speed * speed + model.fieldJoules(model.settledAt(speed));

    assertThat(out).isCloseTo(in, within(1e-6 * in));
  }

  /** The same machine in the frame at rest, where the supply turns, by another library. */
  @Test
  void another_library_in_another_frame_gives_the_same_start() {
    double omega = 100.0 * Math.PI;
    double ls = (CIRCUIT.x1() + CIRCUIT.xm()) / omega;
    double lr = (CIRCUIT.x2() + CIRCUIT.xm()) / omega;
    double lm = CIRCUIT.xm() / omega;
    double d = ls * lr - lm * lm;
    double peak = VOLTS * Math.sqrt(2.0 / 3.0);
    double[] y = new double[5];
    for (int k = 0; k < 6; k++) {
      Stage stage = history.stages().get(k);
      double r = CIRCUIT.r2() + 1.568 * 1.568 * EXTERNAL[k];
      assertThat(stage.externalOhms()).isCloseTo(EXTERNAL[k], within(1e-12));
      OrdinaryDifferentialEquation equations =
          new OrdinaryDifferentialEquation() {
            @Override
            public int getDimension() {
              return 5;
            }

            @Override
            public double[] computeDerivatives(double t, double[] s) {
              double ia = (lr * s[0] - lm * s[2]) / d;
              double ib = (lr * s[1] - lm * s[3]) / d;
              double ja = (ls * s[2] - lm * s[0]) / d;
              double jb = (ls * s[3] - lm * s[1]) / d;
              double torque = 3.0 * (s[0] * ib - s[1] * ia);
              double load = 600.0 * Math.pow(s[4] / MACHINE.synchronousSpeed(), 2);
              return new double[] {
                peak * Math.cos(omega * t) - CIRCUIT.r1() * ia,
                peak * Math.sin(omega * t) - CIRCUIT.r1() * ib,
                -r * ja - 2.0 * s[4] * s[3],
                -r * jb + 2.0 * s[4] * s[2],
                (torque - load) / INERTIA
              };
            }
          };
      double to = k == 5 ? stage.fromSeconds() + 0.3 : stage.toSeconds();
      y =
          new DormandPrince853Integrator(1e-9, 1e-3, 1e-10, 1e-10)
              .integrate(equations, new ODEState(stage.fromSeconds(), y), to)
              .getPrimaryState();
      if (k < 5) {
        Trace t = stage.trace();
        double stator = Math.hypot(lr * y[0] - lm * y[2], lr * y[1] - lm * y[3]) / d / Math.sqrt(2);
        assertThat(t.speed()[t.last()]).isCloseTo(y[4], within(1e-5));
        assertThat(t.statorAmps()[t.last()]).isCloseTo(stator, within(1e-5 * stator));
      }
    }
  }

  @Test
  void only_the_steady_torque_breaks_the_rotor_away() {
    double steady = MACHINE.torque(NOMINAL.source(), EXTERNAL[0], 1.0);
    TorqueCurve light = new TorqueCurve.Constant(300.0);
    StartHistory stands = full(with(TIMED, load(light, 1.02 * steady, false, 0.0)), held(1));
    StartHistory moves = full(with(TIMED, load(light, 0.98 * steady, false, 0.0)), held(1));

    ClosingPeak peak = stands.stages().get(0).peak().orElseThrow();
    assertThat(peak.torque()).isGreaterThan(1.5 * steady);
    assertThat(stands.outcome()).isEqualTo(Outcome.LOCKED);
    assertThat(moves.outcome()).isEqualTo(Outcome.HELD);
  }

  private static double least(StartHistory start) {
    return Arrays.stream(start.stages().get(0).trace().speed()).min().orElseThrow();
  }

  private static Scenario held(int step) {
    return new Scenario(Scenario.Kind.HELD, step, Scenario.LoadMode.START);
  }

  @Test
  void a_passive_load_never_drives_backwards_and_a_hanging_one_does() {
    TorqueCurve heavy = new TorqueCurve.Constant(1500.0);
    StartHistory passive = full(with(TIMED, load(heavy, 0.0, false, 0.0)), Scenario.PERMITTED);
    StartHistory hanging = full(with(TIMED, load(heavy, 0.0, true, 0.0)), Scenario.PERMITTED);

    assertThat(least(passive)).isZero();
    assertThat(least(hanging)).isNegative();
  }

  @Test
  void a_brake_holds_the_rotor_while_the_currents_build_up() {
    TorqueCurve light = new TorqueCurve.Constant(300.0);
    StartHistory braked = full(with(TIMED, load(light, 0.0, true, 0.3)), Scenario.PERMITTED);
    Trace t = braked.stages().get(0).trace();
    double moves = 0.0;
    for (int i = 0; i < t.size() && t.speed()[i] == 0.0; i++) {
      moves = t.seconds()[i];
    }
    assertThat(moves).isCloseTo(0.3, within(1e-9));
    ClosingPeak peak = braked.stages().get(0).peak().orElseThrow();
    assertThat(peak.statorAtSeconds()).isLessThan(0.02);
  }

  @Test
  void a_rotor_that_stands_settles_within_a_second_or_so_and_keeps_its_current() {
    StartHistory locked =
        full(TIMED, new Scenario(Scenario.Kind.LOCKED_STEP, 1, Scenario.LoadMode.START));
    Trace t = locked.stages().get(0).trace();
    double steady = MACHINE.at(NOMINAL.source(), EXTERNAL[0], 1.0).statorAmps();
    assertThat(t.speed()).containsOnly(0.0);
    assertThat(t.seconds()[t.last()]).isEqualTo(StartHistory.HORIZON_SECONDS);
    assertThat(t.statorAmps()[t.last()]).isCloseTo(steady, within(1e-9 * steady));
    StartHistory shorted =
        full(TIMED, new Scenario(Scenario.Kind.RINGS_SHORTED, 0, Scenario.LoadMode.START));
    double greatest = MACHINE.at(NOMINAL.source(), 0.0, 1.0).statorAmps();
    assertThat(shorted.stages().get(0).peak().orElseThrow().statorAmps())
        .isBetween(1.3 * Math.sqrt(2.0) * greatest, 2.0 * Math.sqrt(2.0) * greatest);
  }

  @Test
  void a_level_sees_the_envelope_of_the_transient() {
    Starter levels =
        starter(
            LOAD,
            new Step.StatorBelow(230.0),
            new Step.RotorBelow(330.0),
            new Step.RotorFrequencyBelow(6.0),
            new Step.After(0.2),
            new Step.After(0.2));
    StartHistory start = full(levels, Scenario.PERMITTED);

    assertThat(start.outcome()).isEqualTo(Outcome.RUNNING);
    Trace first = start.stages().get(0).trace();
    Trace second = start.stages().get(1).trace();
    Trace third = start.stages().get(2).trace();
    assertThat(first.seconds()[first.last()]).isGreaterThanOrEqualTo(0.1);
    assertThat(first.statorAmps()[first.last()]).isCloseTo(230.0, within(1e-6));
    assertThat(second.ringAmps()[second.last()]).isCloseTo(330.0, within(1e-6));
    assertThat(MACHINE.slip(third.speed()[third.last()]) * 50.0).isCloseTo(6.0, within(1e-9));
  }

  @Test
  void a_run_up_longer_than_the_transient_is_followed_goes_on_steady() {
    Starter slow =
        Starters.bare(
            VOLTS, 50, 1478, 200e3, CIRCUIT, 600.0, LOAD, new double[] {0.2}, new Step.After(60.0));
    StartSimulator simulator = new StartSimulator(slow, MACHINE);
    StartHistory full = simulator.runTransient(Scenario.PERMITTED, NOMINAL);
    ModelError error = ModelError.between(simulator.run(Scenario.PERMITTED, NOMINAL), full);

    assertThat(full.outcome()).isEqualTo(Outcome.RUNNING);
    assertThat(error.greatest()).isLessThan(0.001);
    Trace t = full.stages().get(0).trace();
    for (int i = 0; i + 2 < t.size(); i += 2) {
      assertThat(t.seconds()[i + 1])
          .isCloseTo(0.5 * (t.seconds()[i] + t.seconds()[i + 2]), within(1e-9));
    }
  }

  @Test
  void peaks_are_handed_to_the_same_closings_of_another_computation() {
    StartHistory steady = new StartSimulator(TIMED, MACHINE).run(Scenario.PERMITTED, NOMINAL);
    StartHistory with = steady.withPeaksOf(history);

    assertThat(steady.stages()).allMatch(s -> s.peak().isEmpty());
    assertThat(with.stages().stream().map(Stage::peak).toList())
        .isEqualTo(history.stages().stream().map(Stage::peak).toList());
    assertThat(with.stages().get(2).trace()).isSameAs(steady.stages().get(2).trace());
  }
}
