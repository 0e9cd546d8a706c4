package sliprung.runup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.fixture.StarterText;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.review.Reviewer;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/** Starts and failed starts as wired, on a starter of two steps without any spread. */
class FaultStartsTest {
  private static final StarterText SMALL = StarterText.small();
  private static final StarterText CASCADED = SMALL.with("sequence: chained", "sequence: cascaded");
  private static final StarterText BRIDGING =
      CASCADED.with("cut-out: star-point", "cut-out: bridging");

  private static StartHistory run(StarterText text, Scenario scenario) {
    return run(text, scenario, Corners.conditions(text.starter(), Corner.NOMINAL));
  }

  private static StartHistory run(StarterText text, Scenario scenario, Conditions conditions) {
    return simulator(text).run(scenario, conditions);
  }

  private static StartSimulator simulator(StarterText text) {
    return new StartSimulator(text.starter(), machine(text));
  }

  private static Machine machine(StarterText text) {
    Starter starter = text.starter();
    return Reviewer.machine(starter, NameplateIdentification.identify(starter.motor()).get(0));
  }

  private static Scenario fault(Scenario.Kind kind, int step) {
    return new Scenario(kind, step, Scenario.LoadMode.START);
  }

  private static Scenario atRunning(Scenario.Kind kind, int step) {
    return new Scenario(kind, step, Scenario.LoadMode.RUNNING);
  }

  private static StarterText load(String torque, String breakaway) {
    return SMALL
        .line("torque: {0", "torque: " + torque)
        .line("breakaway:", "breakaway: " + breakaway);
  }

  private static Stage last(StartHistory history) {
    return history.stages().get(history.stages().size() - 1);
  }

  private static double lastSpeed(StartHistory history) {
    Trace trace = last(history).trace();
    return trace.speed()[trace.last()];
  }

  private static void begins(StartHistory history, double... seconds) {
    assertThat(history.stages()).hasSize(seconds.length);
    for (int i = 0; i < seconds.length; i++) {
      assertThat(history.stages().get(i).fromSeconds()).isCloseTo(seconds[i], within(1e-9));
    }
  }

  /** Both steps have closing times of 50 ms. */
  @Test
  void closing_times_add_up_in_a_chain_and_not_in_a_cascade() {
    begins(run(SMALL, Scenario.PERMITTED), 0.0, 4.05, 6.10);
    begins(run(CASCADED, Scenario.PERMITTED), 0.0, 4.05, 6.05);
  }

  /** A contactor that is slower than the next step's timer is overtaken. */
  @Test
  void a_slow_contactor_of_a_cascade_may_close_after_the_next() {
    StarterText slow =
        CASCADED.with(
            "K11: {place: rotor, poles: star, thermal: 125 A, rotor-rating: 125 A, rated-voltage: 400 V, closing: 50 ms",
            "K11: {place: rotor, poles: star, thermal: 125 A, rotor-rating: 125 A, rated-voltage: 400 V, closing: 3 s");
    StartHistory history = run(slow, Scenario.PERMITTED);

    assertThat(history.stages().get(1).fromSeconds()).isCloseTo(6.05, within(1e-9));
    assertThat(history.stages().get(1).sectionsIn()).isEmpty();
    assertThat(history.lastClosingSeconds()).isPresent();
  }

  @Test
  void late_timers_and_conditions_stretch_the_sequence() {
    Conditions nominal = Corners.conditions(SMALL.starter(), Corner.NOMINAL);
    Conditions late = new Conditions(nominal.source(), 1.0, 1.0, 1.1, 1.0);

    begins(run(SMALL, Scenario.PERMITTED, late), 0.0, 4.45, 6.70);
  }

  @Test
  void a_skipped_step_of_a_star_point_bank_takes_two_sections_out_at_once() {
    StartHistory history = run(CASCADED, fault(Scenario.Kind.SKIPPED, 1));

    begins(history, 0.0, 6.05);
    assertThat(history.stages().get(0).sectionsIn()).isEqualTo(List.of(1, 2));
    assertThat(last(history).sectionsIn()).isEmpty();
    assertThat(last(history).step()).isEqualTo(3);
    assertThat(history.outcome()).isEqualTo(Outcome.RUNNING);
    assertThat(last(history).trace().statorAmps()[0])
        .isGreaterThan(run(CASCADED, Scenario.PERMITTED).stages().get(1).trace().statorAmps()[0]);
  }

  @Test
  void a_skipped_step_of_a_bridging_bank_leaves_its_section_in_for_good() {
    StartHistory history = run(BRIDGING, fault(Scenario.Kind.SKIPPED, 1));

    begins(history, 0.0, 6.05);
    assertThat(last(history).sectionsIn()).isEqualTo(List.of(1));
    assertThat(last(history).externalOhms()).isCloseTo(0.60, within(1e-12));
    assertThat(history.outcome()).isEqualTo(Outcome.HELD);
    assertThat(history.lastClosingSeconds()).hasValue(history.stages().get(1).fromSeconds());
    assertThat(history.runUpSeconds()).isEmpty();
  }

  @Test
  void held_stops_a_chain_where_its_contactor_fails() {
    StartHistory history = run(SMALL, fault(Scenario.Kind.HELD, 2));

    begins(history, 0.0, 4.05);
    assertThat(last(history).sectionsIn()).isEqualTo(List.of(2));
    assertThat(last(history).settled()).isTrue();
    assertThat(last(history).toSeconds()).isEqualTo(StartHistory.HORIZON_SECONDS);
    assertThat(history.lastClosingSeconds()).isEmpty();
  }

  /** A level already met as the step begins counts after 100 ms, then the closing time. */
  @Test
  void a_level_already_met_closes_once_the_current_has_built_up() {
    StarterText met =
        SMALL.with(
            "{contactor: K12, after: 2 s}", "{contactor: K12, rotor-frequency-below: 45 Hz}");
    begins(run(met, Scenario.PERMITTED), 0.0, 4.05, 4.05 + 0.1 + 0.05);

    StarterText dwelling =
        SMALL.with(
            "{contactor: K12, after: 2 s}",
            "{contactor: K12, rotor-frequency-below: 45 Hz, at-least: 0.7 s}");
    begins(run(dwelling, Scenario.PERMITTED), 0.0, 4.05, 4.05 + 0.7 + 0.05);
  }

  /** The level is met at the very speed at which the circuit draws it. */
  @ParameterizedTest
  @CsvSource({"rotor-below, 100, A", "stator-below, 110, A", "rotor-frequency-below, 25, Hz"})
  void a_level_is_met_where_the_measured_quantity_passes_it(
      String rule, double level, String unit) {
    StarterText text =
        SMALL.with(
            "{contactor: K11, after: 4 s}",
            StarterText.text("{contactor: K11, " + rule + ": %s " + unit + "}", level));
    StartHistory history = run(text, Scenario.PERMITTED);
    double met = history.stages().get(1).fromSeconds() - 0.05;
    Trace t = history.stages().get(0).trace();
    int i = 0;
    while (t.seconds()[i] < met - 1e-9) {
      i++;
    }
    double found =
        switch (rule) {
          case "rotor-below" -> t.ringAmps()[i];
          case "stator-below" -> t.statorAmps()[i];
          default -> 50.0 - t.speed()[i] / Math.PI;
        };

    assertThat(t.seconds()[i]).isCloseTo(met, within(1e-9));
    assertThat(found).isCloseTo(level, within(1e-6 * level));
  }

  @Test
  void a_level_that_is_never_reached_holds_the_start_and_is_named() {
    StarterText text =
        SMALL.with("{contactor: K12, after: 2 s}", "{contactor: K12, rotor-below: 20 A}");
    StartHistory history = run(text, Scenario.PERMITTED);

    assertThat(history.outcome()).isEqualTo(Outcome.HELD);
    assertThat(history.levelNeverReached()).isEqualTo(2);
    assertThat(history.running()).isEmpty();
    assertThat(history.endSeconds()).isEqualTo(StartHistory.HORIZON_SECONDS);
  }

  /** 646 N·m on step 1 and 971 N·m on step 2, at rest. */
  @Test
  void a_rotor_that_step_one_cannot_break_loose_moves_on_step_two() {
    StartHistory history = run(load("{constant: 300 N·m}", "800 N·m"), Scenario.PERMITTED);
    Trace first = history.stages().get(0).trace();

    assertThat(Arrays.stream(first.speed())).containsOnly(0.0);
    assertThat(history.stages().get(1).trace().speed()[2]).isPositive();
    assertThat(history.outcome()).isEqualTo(Outcome.RUNNING);
  }

  /** Once it moves, the load is what counts, not what broke it loose. */
  @Test
  void a_moving_rotor_needs_no_breakaway_torque() {
    double broken = lastSpeed(run(load("{constant: 300 N·m}", "640 N·m"), Scenario.PERMITTED));
    double easy = lastSpeed(run(load("{constant: 300 N·m}", "300 N·m"), Scenario.PERMITTED));

    assertThat(broken).isCloseTo(easy, within(1e-9 * easy));
  }

  @Test
  void a_rotor_that_no_step_breaks_loose_is_locked() {
    StartHistory history = run(load("{constant: 300 N·m}", "1500 N·m"), Scenario.PERMITTED);

    assertThat(history.outcome()).isEqualTo(Outcome.LOCKED);
    assertThat(history.everMoved()).isFalse();
    assertThat(history.runUpSeconds()).isEmpty();
  }

  /**
   * 720 N·m is more than step 1 gives at any speed: the motor turns, is loaded and comes to rest.
   */
  @Test
  void a_load_that_is_too_much_for_a_held_step_stops_the_rotor() {
    StartHistory history =
        run(SMALL.line("running:", "running: 200 %"), atRunning(Scenario.Kind.HELD, 1));

    assertThat(history.stages()).hasSize(2);
    assertThat(lastSpeed(history)).isZero();
    assertThat(last(history).trace().speed()[0]).isGreaterThan(100.0);
    assertThat(last(history).settled()).isTrue();
    assertThat(Arrays.stream(last(history).trace().speed()).min().orElseThrow()).isZero();
  }

  @Test
  void a_skipped_start_that_stalls_under_the_running_load_is_not_running() {
    StartHistory history =
        run(CASCADED.line("running:", "running: 300 %"), atRunning(Scenario.Kind.SKIPPED, 1));

    assertThat(lastSpeed(history)).isZero();
    assertThat(history.outcome()).isEqualTo(Outcome.HELD);
  }

  /** The running load of a fan keeps its shape and is reached at rated speed. */
  @Test
  void a_square_load_stays_square_when_it_is_held_at_running_load() {
    StarterText fan = load("{square: 250 N·m}", "10 N·m");
    Trace t = last(run(fan, atRunning(Scenario.Kind.HELD, 1))).trace();
    double rated = 1460.0 * Math.PI / 30.0;
    double torque = 0.70 * 55e3 / rated;
    double w = t.speed()[t.last()];

    assertThat(t.loadTorque()[t.last()])
        .isCloseTo(torque * w * w / (rated * rated), within(1e-9 * torque));
    assertThat(t.torque()[t.last()]).isCloseTo(t.loadTorque()[t.last()], within(1e-5 * torque));
  }

  /** The same torque on every step: the same currents, whatever the step. */
  @Test
  void a_constant_running_load_draws_the_running_current_on_every_held_step() {
    OperatingPoint running =
        simulator(SMALL)
            .runningPoint(Corners.conditions(SMALL.starter(), Corner.NOMINAL))
            .orElseThrow()
            .point();
    for (int step = 1; step <= 2; step++) {
      Trace t = last(run(SMALL, atRunning(Scenario.Kind.HELD, step))).trace();
      assertThat(t.statorAmps()[t.last()]).isCloseTo(running.statorAmps(), within(1e-5));
      assertThat(t.ringAmps()[t.last()]).isCloseTo(running.ringAmps(), within(1e-5));
    }
  }

  private static StarterText hanging(String torque) {
    return load("{constant: " + torque + "}", torque)
        .under("load:", "  active: true\n  brake: 0.3 s");
  }

  @Test
  void a_hanging_load_runs_back_once_the_brake_is_off() {
    StartHistory history = run(hanging("700 N·m"), Scenario.PERMITTED);
    Trace t = history.stages().get(0).trace();

    for (int i = 0; i < t.size(); i++) {
      if (t.seconds()[i] <= 0.3) {
        assertThat(t.speed()[i]).isZero();
      } else {
        assertThat(t.speed()[i]).isNegative();
      }
    }
    assertThat(history.outcome()).isEqualTo(Outcome.RUN_BACK);
  }

  @Test
  void a_hanging_load_that_step_one_carries_waits_for_the_brake() {
    StartHistory history = run(hanging("400 N·m"), Scenario.PERMITTED);
    Trace t = history.stages().get(0).trace();
    StartHistory free = run(load("{constant: 400 N·m}", "400 N·m"), Scenario.PERMITTED);

    assertThat(t.speed()[2]).isZero();
    assertThat(history.outcome()).isEqualTo(Outcome.RUNNING);
    assertThat(t.speed()[t.last()])
        .isLessThan(free.stages().get(0).trace().speed()[free.stages().get(0).trace().last()]);
  }

  /** A passive load of the same size stands instead. */
  @Test
  void a_passive_load_never_runs_back() {
    StartHistory history = run(load("{constant: 700 N·m}", "700 N·m"), Scenario.PERMITTED);

    assertThat(Arrays.stream(history.stages().get(0).trace().speed())).containsOnly(0.0);
    assertThat(history.outcome()).isNotEqualTo(Outcome.RUN_BACK);
  }

  @Test
  void a_load_too_heavy_to_turn_up_in_time_is_unfinished() {
    StartHistory history =
        run(SMALL.with("inertia: 8 kg·m²", "inertia: 900000 kg·m²"), Scenario.PERMITTED);

    assertThat(history.outcome()).isEqualTo(Outcome.UNFINISHED);
    assertThat(history.runUpSeconds()).isEmpty();
    assertThat(history.running()).isEmpty();
  }

  @Test
  void a_locked_rotor_passes_time_closed_steps_and_waits_for_frequencies() {
    begins(run(SMALL, fault(Scenario.Kind.LOCKED, 0)), 0.0, 4.05, 6.10);
    StarterText frequency =
        SMALL.with(
            "{contactor: K12, after: 2 s}", "{contactor: K12, rotor-frequency-below: 20 Hz}");
    begins(run(frequency, fault(Scenario.Kind.LOCKED, 0)), 0.0, 4.05);
  }

  /** 195 A in the rings at rest on step 1: a level of 200 A is met, one of 190 A is not. */
  @Test
  void a_locked_rotor_passes_a_current_level_that_it_already_meets() {
    StarterText low =
        SMALL.with("{contactor: K11, after: 4 s}", "{contactor: K11, rotor-below: 190 A}");
    StarterText high =
        SMALL.with("{contactor: K11, after: 4 s}", "{contactor: K11, rotor-below: 200 A}");

    begins(run(low, fault(Scenario.Kind.LOCKED, 0)), 0.0);
    begins(run(high, fault(Scenario.Kind.LOCKED, 0)), 0.0, 0.15, 2.20);
  }

  @Test
  void frozen_on_a_step_a_locked_rotor_stays_there() {
    StartHistory history = run(SMALL, fault(Scenario.Kind.LOCKED_STEP, 2));

    begins(history, 0.0, 4.05);
    assertThat(history.outcome()).isEqualTo(Outcome.LOCKED);
    assertThat(last(history).sectionsIn()).isEqualTo(List.of(2));
  }

  /** Leads and permanent resistance are what is left of the circuit. */
  @Test
  void leads_and_permanent_resistance_stay_whatever_closes() {
    StarterText text = SMALL.under("resistors:", "  permanent: 0.010 ohm\n  leads: 0.004 ohm");
    for (Scenario scenario : List.of(Scenario.PERMITTED, fault(Scenario.Kind.RINGS_SHORTED, 0))) {
      assertThat(last(run(text, scenario)).externalOhms()).isCloseTo(0.014, within(1e-12));
    }
    Conditions nominal = Corners.conditions(text.starter(), Corner.NOMINAL);
    Conditions hot = new Conditions(nominal.source(), 1.0, 1.32, 1.0, 1.0);
    // the leads are no part of the bank
    assertThat(simulator(text).externalOhms(List.of(1, 2), hot))
        .isCloseTo((0.85 + 0.010) * 1.32 + 0.004, within(1e-12));
  }

  @Test
  void with_rings_shorted_the_last_step_is_in_from_the_beginning() {
    StartHistory history = run(SMALL, fault(Scenario.Kind.RINGS_SHORTED, 0));

    assertThat(history.lastClosingSeconds()).hasValue(0.0);
    assertThat(last(history).step()).isEqualTo(3);
    assertThat(last(history).sectionsIn()).isEmpty();
  }

  @Test
  void a_delta_bank_is_a_third_per_phase() {
    StarterText delta =
        SMALL
            .with("connection: star", "connection: delta")
            .with("cut-out: star-point", "cut-out: bridging");
    StartHistory history = run(delta, Scenario.PERMITTED);

    assertThat(history.stages().get(0).externalOhms()).isCloseTo(0.85 / 3.0, within(1e-12));
    assertThat(history.stages().get(1).externalOhms()).isCloseTo(0.25 / 3.0, within(1e-12));
  }

  /** U_source² = (U_t + X I sin φ)² + (X I cos φ)², per phase. */
  @Test
  void a_source_reactance_lowers_the_volts_at_the_terminals() {
    StarterText weak = SMALL.under("supply:", "  fault-current: {max: 12 kA, min: 4 kA}");
    Trace t = run(weak, Scenario.PERMITTED).stages().get(0).trace();
    double x = 400.0 / Math.sqrt(3.0) / 4000.0;
    Conditions conditions = Corners.conditions(weak.starter(), Corner.NOMINAL);
    assertThat(conditions.source().reactance()).isCloseTo(x, within(1e-12));

    Machine machine = machine(weak);
    for (int i = 0; i < t.size(); i += 40) {
      OperatingPoint point = machine.at(new Source(400.0, x), 0.85, machine.slip(t.speed()[i]));
      double drop = x * t.statorAmps()[i];
      double volts = t.terminalVolts()[i] / Math.sqrt(3.0);
      double sin = Math.sqrt(1.0 - point.powerFactor() * point.powerFactor());
      assertThat(volts).isLessThan(400.0 / Math.sqrt(3.0));
      assertThat(Math.hypot(volts + drop * sin, drop * point.powerFactor()))
          .isCloseTo(400.0 / Math.sqrt(3.0), within(1e-9));
    }
  }
}
