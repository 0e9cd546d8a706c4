package sliprung.config;

import static org.assertj.core.api.Assertions.assertThat;
import static sliprung.config.StarterFiles.starter;
import static sliprung.config.StarterFiles.winchWith;

import java.time.LocalDate;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import sliprung.starter.AcceptedDeviation;
import sliprung.starter.Assumption;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Duty;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Limits;
import sliprung.starter.Motor;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/** What a file may say instead, and what it may leave out. */
class AlternativesTest {
  private static final String F2 = "  F2: {kind: overload, class: 10, dial: 105 A, trips: K1}\n";

  private static Device device(String description) {
    Starter starter = starter(winchWith(F2, F2 + "  F3: " + description + "\n"));
    return starter.device("F3").orElseThrow();
  }

  @Test
  void a_circuit_stands_instead_of_the_plate() {
    Starter starter =
        starter(
            winchWith(
                "  power-factor: 0.82\n  efficiency: 92 %\n  rotor-voltage: 250 V\n"
                    + "  rotor-current: 140 A\n  breakdown-torque: 2.7\n",
                "  circuit: {r1: 0.030 ohm, x1: 0.183 ohm, xm: 4.795 ohm, r2: 29.8 mohm,"
                    + " x2: 0.183 ohm, ratio: 1.568}\n"));

    assertThat(starter.motor().circuit())
        .contains(new Motor.CircuitData(0.03, 0.183, 4.795, 0.0298, 0.183, 1.568));
    assertThat(starter.motor().powerFactor()).isEmpty();
    assertThat(starter.motor().rotorVoltage()).isEmpty();
    assertThat(starter.motor().breakdownTorque()).isEmpty();
  }

  @Test
  void breakdown_torque_may_be_missing_without_a_circuit() {
    assertThat(starter(winchWith("  breakdown-torque: 2.7\n", "")).motor().breakdownTorque())
        .isEmpty();
  }

  @Test
  void locked_current_is_read() {
    Starter starter =
        starter(winchWith("  current: 105 A\n", "  current: 105 A\n  locked-current: 600 A\n"));

    assertThat(starter.motor().lockedCurrent()).hasValue(600);
  }

  @ParameterizedTest
  @CsvSource({"constant, 0.5, 900", "linear, 0.5, 450", "square, 0.5, 225"})
  void a_torque_law_reaches_its_value_at_synchronous_speed(
      String law, double share, double torque) {
    TorqueCurve curve =
        starter(winchWith("{0 %: 250 N·m, 100 %: 400 N·m}", "{" + law + ": 900 N·m}"))
            .load()
            .torque();

    assertThat(curve.at(share)).isEqualTo(torque);
    assertThat(curve.at(1.0)).isEqualTo(900);
    assertThat(curve.isSquare()).isEqualTo(law.equals("square"));
  }

  @Test
  void a_geared_load_is_brought_to_the_motor_shaft() {
    Starter starter =
        starter(winchWith("  breakaway: 300 N·m\n", "  breakaway: 300 N·m\n  gear: {ratio: 10}\n"));

    assertThat(starter.load().inertia()).isEqualTo(0.12);
    assertThat(starter.load().breakawayTorque()).hasValue(30);
    assertThat(starter.load().torque())
        .isEqualTo(new TorqueCurve.Table(new double[] {0, 1}, new double[] {25, 40}));
  }

  @Test
  void a_hanging_load_has_a_brake() {
    Starter starter =
        starter(winchWith("  breakaway: 300 N·m\n", "  active: true\n  brake: 0.3 s\n"));

    assertThat(starter.load().active()).isTrue();
    assertThat(starter.load().brakeSeconds()).isEqualTo(0.3);
    assertThat(starter.load().breakawayTorque()).isEmpty();
    assertThat(starter.assumptions())
        .contains(new Assumption("load.breakaway", "the torque at 0 %"));
  }

  @Test
  void a_delta_bank_bridges_its_sections() {
    ResistorBank bank =
        starter(
                winchWith(
                    "connection: star\n  cut-out: star-point\n",
                    "connection: delta\n  cut-out: bridging\n  permanent: 10 mohm\n"
                        + "  leads: 4 mohm\n  enclosure: 15 min\n"))
            .resistors();

    assertThat(bank.connection()).isEqualTo(ResistorBank.Connection.DELTA);
    assertThat(bank.cutOut()).isEqualTo(ResistorBank.CutOut.BRIDGING);
    assertThat(bank.permanentOhms()).isEqualTo(0.010);
    assertThat(bank.leadsOhms()).isEqualTo(0.004);
    assertThat(bank.enclosureSeconds()).isEqualTo(900);
    assertThat(bank.sameLimit()).isFalse();
  }

  @Test
  void two_temperature_rises_stand_beside_their_ratings() {
    ResistorBank.Section section =
        starter(
                winchWith(
                    "{resistance: 0.5 ohm,",
                    "{resistance: 0.5 ohm, rise: {continuous: 385 K, short-time: 760 °C},"))
            .resistors()
            .sections()
            .get(0);

    assertThat(section.continuousRiseKelvin()).hasValue(385);
    assertThat(section.shortTimeRiseKelvin()).hasValue(760);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "stator-below: 130 A | StatorBelow[amps=130.0]",
        "rotor-below: 180 A | RotorBelow[amps=180.0]",
        "rotor-frequency-below: 18 Hz | RotorFrequencyBelow[hertz=18.0]"
      })
  void a_step_may_wait_for_a_level(String rule, String expected) {
    Step step =
        starter(
                winchWith(
                    "{contactor: K11, after: 2 s}",
                    "{contactor: K11, " + rule + ", at-least: 300 ms}"))
            .steps()
            .get(0);

    assertThat(step.rule()).hasToString(expected);
    assertThat(step.rule().isLevel()).isTrue();
    assertThat(step.atLeastSeconds()).isEqualTo(0.3);
  }

  @Test
  void times_may_be_given_in_cycles_of_the_supply_even_before_it() {
    String text = winchWith("after: 2 s", "after: 100 cycles");

    assertThat(starter(text).steps().get(0).rule()).isEqualTo(new Step.After(2.0));
  }

  @Test
  void every_kind_of_device_is_read() {
    Device.Accuracy usual = new Device.Accuracy(0.05, 0.075);
    assertThat(
            device(
                "{kind: thermal, base: 105 A, factor: 1.05, time-constant: 10 min,"
                    + " accuracy: {pick-up: 3 %, time: 5 %}, memory: kept, trips: K1}"))
        .isEqualTo(
            new Device.Thermal(
                fitting(Device.Place.STATOR, Device.Measurement.CT, "K1"),
                105,
                1.05,
                600,
                new Device.Accuracy(0.03, 0.05),
                true));
    assertThat(
            device(
                "{kind: definite-time, pick-up: 300 A, time: 0 ms, blocked-above: 5 kA,"
                    + " place: bank, measures-by: dc-capable, trips: Q1}"))
        .isEqualTo(
            new Device.DefiniteTime(
                fitting(Device.Place.BANK, Device.Measurement.DC_CAPABLE, "Q1"),
                300,
                0,
                usual,
                OptionalDouble.of(5000)));
    assertThat(device("{kind: standstill, time: 3 s, trips: K1}"))
        .isEqualTo(
            new Device.Standstill(
                fitting(Device.Place.STATOR, Device.Measurement.DIRECT, "K1"), 3));
    assertThat(device("{kind: sequence-timer, time: 13 s, until: {speed: 90 %}, trips: K1}"))
        .isEqualTo(
            new Device.SequenceTimer(
                fitting(Device.Place.STATOR, Device.Measurement.DIRECT, "K1"),
                13,
                OptionalDouble.of(0.9)));
    assertThat(device("{kind: instantaneous, pick-up: 900 A, measures: rms, trips: Q1}"))
        .isEqualTo(
            new Device.Instantaneous(
                fitting(Device.Place.STATOR, Device.Measurement.CT, "Q1"),
                900,
                Device.Measures.RMS,
                0.1,
                usual,
                OptionalDouble.empty()));
    Device.InverseTime inverse =
        (Device.InverseTime)
            device(
                "{kind: inverse-time, curve: ieee-very-inverse, pick-up: 130 A,"
                    + " time-multiplier: 2, reset: standard, place: rotor, trips: Q1}");
    assertThat(inverse.reset()).isEqualTo(Device.Reset.STANDARD);
    assertThat(inverse.fitting())
        .isEqualTo(fitting(Device.Place.ROTOR, Device.Measurement.CT, "Q1"));
    Device.Overload overload =
        (Device.Overload)
            device(
                "{kind: overload, class: 10A, dial: 110 A, dial-means: ultimate-trip,"
                    + " memory: kept, ambient: none, place: bank, trips: K1}");
    assertThat(overload.tripClass().name()).isEqualTo("10A");
    assertThat(overload.dialMeans()).isEqualTo(Device.DialMeans.ULTIMATE_TRIP);
    assertThat(overload.memoryKept()).isTrue();
    assertThat(overload.compensated()).isFalse();
    assertThat(overload.fitting())
        .isEqualTo(fitting(Device.Place.BANK, Device.Measurement.CT, "K1"));
  }

  private static Device.Fitting fitting(
      Device.Place place, Device.Measurement measuresBy, String trips) {
    return new Device.Fitting("F3", place, Optional.of(trips), measuresBy);
  }

  @Test
  void an_overload_in_the_rotor_circuit_is_taken_to_measure_by_transformer() {
    assertThat(
            device("{kind: overload, class: 10, dial: 140 A, place: rotor, trips: K1}").fitting())
        .isEqualTo(fitting(Device.Place.ROTOR, Device.Measurement.CT, "K1"));
  }

  @Test
  void neighbouring_keys_are_not_mixed_up() {
    Starter starter =
        starter(
            winchWith(
                "cut-out: star-point\n",
                "cut-out: star-point\n  tolerance: 7 %\n  hot-rise: 25 %\n",
                "closing: 50 ms, opening: 50 ms",
                "closing: 40 ms, opening: 30 ms",
                "duty:\n",
                "timer-spread: 3 %\nlevel-spread: 8 %\nsequence: cascaded\n"
                    + "ambient: {motor: 45 °C, panel: 35 °C}\n"
                    + "interlocks: {steps-open-before-line: true}\nduty:\n"));

    assertThat(starter.resistors().tolerance()).isEqualTo(0.07);
    assertThat(starter.resistors().hotRise()).isEqualTo(0.25);
    assertThat(starter.contactor("K1").orElseThrow().closingSeconds()).isEqualTo(0.04);
    assertThat(starter.contactor("K1").orElseThrow().openingSeconds()).isEqualTo(0.03);
    assertThat(starter.timerSpread()).isEqualTo(0.03);
    assertThat(starter.levelSpread()).isEqualTo(0.08);
    assertThat(starter.sequence()).isEqualTo(Starter.Sequence.CASCADED);
    assertThat(starter.ambient().motorCelsius()).isEqualTo(45);
    assertThat(starter.ambient().panelCelsius()).isEqualTo(35);
    assertThat(starter.interlocks().stepsOpenBeforeLine()).isTrue();
    assertThat(starter.interlocks().everyStepProven()).isFalse();
  }

  @Test
  void a_fuse_without_gates_in_the_standard_is_no_mistake() {
    Device.Fuse odd = (Device.Fuse) device("{kind: fuse, class: gG, rating: 224 A}");
    Device.Fuse motorFuse = (Device.Fuse) device("{kind: fuse, class: aM, rating: 160 A}");

    assertThat(odd.gates()).isEmpty();
    assertThat(odd.amGates()).isEmpty();
    assertThat(motorFuse.gates()).isEmpty();
    assertThat(motorFuse.amGates()).contains(CurveLibraryReader.builtIn().am());
  }

  @Test
  void duty_limits_and_judgement_are_read() {
    Starter starter =
        starter(
            winchWith(
                    "  starts: {cold: 2, hot: 1}\n",
                    "  starts: {cold: 3, hot: 0, per-hour: 6}\n"
                        + "  restart-after: 2 min\n"
                        + "  inching: {per-hour: 60, step: 1}\n"
                        + "  plugging: {per-hour: 10, step: 2}\n"
                        + "limits: {closing-current: {stator: 300 A, rotor: 400 A},"
                        + " torque-peak: 4000 N·m}\n"
                        + "margins: {trip/start: 1.15}\n"
                        + "fuse-wear: 0.6\n"
                        + "interlocks: {every-step-proven: true}\n"
                        + "ambient: {motor: 104 °F}\n"
                        + "evidence: {load.inertia: measured, \"resistors.sections[2].resistance\":"
                        + " report, protection.F2.dial: told, motor: plate}\n"
                        + "accepted:\n"
                        + "  - {rule: contactor/line-category, subject: K1, not-below: 0.95,"
                        + " reason: tested by the maker, by: chief electrician,"
                        + " until: 2027-06-30}\n")
                .replace(
                    "  K12: {place: rotor,",
                    "  K12: {place: rotor, coordination: {type: 2, with: F1},"));

    assertThat(starter.duty())
        .isEqualTo(
            new Duty(
                3,
                0,
                OptionalDouble.of(6),
                120,
                Optional.of(new Duty.Repeated(60, 1)),
                Optional.of(new Duty.Repeated(10, 2))));
    assertThat(starter.limits())
        .isEqualTo(
            new Limits(OptionalDouble.of(300), OptionalDouble.of(400), OptionalDouble.of(4000)));
    assertThat(starter.margins()).containsExactly(Map.entry("trip/start", 1.15));
    assertThat(starter.fuseWear()).isEqualTo(0.6);
    assertThat(starter.interlocks().everyStepProven()).isTrue();
    assertThat(starter.interlocks().stepsOpenBeforeLine()).isFalse();
    assertThat(starter.ambient().motorCelsius()).isEqualTo(40);
    assertThat(starter.ambient().panelCelsius()).isEqualTo(40);
    assertThat(starter.evidence())
        .containsEntry("load.inertia", EvidenceGrade.MEASURED)
        .containsEntry("resistors.sections[2].resistance", EvidenceGrade.REPORT)
        .containsEntry("protection.F2.dial", EvidenceGrade.TOLD)
        .containsEntry("motor", EvidenceGrade.PLATE);
    assertThat(starter.accepted())
        .containsExactly(
            new AcceptedDeviation(
                "contactor/line-category",
                "K1",
                0.95,
                "tested by the maker",
                "chief electrician",
                LocalDate.of(2027, 6, 30),
                Optional.of("winch.yaml:57")));
    assertThat(starter.contactor("K12").orElseThrow().coordination())
        .contains(new Contactor.Coordination(2, "F1"));
    assertThat(starter.notYetJudged()).isEmpty();
  }

  @Test
  void the_method_of_the_run_up_is_read_and_left_to_the_review_where_absent() {
    assertThat(starter(winchWith("practice: iec\n", "practice: iec\nmethod: transient\n")).method())
        .isEqualTo(Starter.Method.TRANSIENT);
    Starter silent = starter(winchWith("practice: iec\n", "practice: iec\n"));
    assertThat(silent.method()).isEqualTo(Starter.Method.AUTO);
    assertThat(silent.assumptions()).noneMatch(a -> a.path().equals("method"));
  }

  @Test
  void what_is_left_out_is_assumed_and_on_record() {
    Starter starter =
        starter(
            winchWith(
                "  band: [-10 %, +10 %]\n  fault-current: {max: 10 kA, min: 5 kA}\n",
                "",
                "  Q1: {breaking: 25 kA, opening: 50 ms}\n",
                "  Q1: {}\n",
                "  K12: {place: rotor, poles: star, closing: 50 ms, opening: 50 ms}\n",
                "  K12: {place: rotor}\n",
                "duty:\n  starts: {cold: 2, hot: 1}\n",
                ""));

    assertThat(starter.supply().bandLow()).isEqualTo(-0.1);
    assertThat(starter.supply().bandHigh()).isEqualTo(0.1);
    assertThat(starter.supply().faultMinAmps()).isEmpty();
    assertThat(starter.load().spreadLow()).isEqualTo(-0.2);
    assertThat(starter.load().runningShare()).isEqualTo(1.0);
    assertThat(starter.resistors().tolerance()).isEqualTo(0.1);
    assertThat(starter.resistors().hotRise()).isEqualTo(0.2);
    assertThat(starter.timerSpread()).isEqualTo(0.05);
    assertThat(starter.levelSpread()).isEqualTo(0.1);
    assertThat(starter.contactor("K12").orElseThrow().closingSeconds()).isEqualTo(0.06);
    assertThat(starter.breaker("Q1").orElseThrow().openingSeconds()).isEqualTo(0.1);
    assertThat(starter.duty().coldStarts()).isEqualTo(2);
    assertThat(starter.duty().hotStarts()).isEqualTo(1);
    assertThat(starter.duty().startsPerHour()).isEmpty();
    assertThat(starter.ambient().motorCelsius()).isEqualTo(40);
    assertThat(starter.fuseWear()).isEqualTo(0.65);
    assertThat(starter.assumptions())
        .contains(
            new Assumption("supply.band", "±10 %"),
            new Assumption("supply.fault-current.min", "an ideal source"),
            new Assumption("load.spread", "±20 %"),
            new Assumption("load.running", "100 %"),
            new Assumption("resistors.leads", "0 ohm"),
            new Assumption("resistors.tolerance", "10 %"),
            new Assumption("resistors.hot-rise", "20 %"),
            new Assumption("resistors.enclosure", "20 min"),
            new Assumption("sequence", "chained"),
            new Assumption("timer-spread", "5 %"),
            new Assumption("level-spread", "10 %"),
            new Assumption("contactors.K12.closing", "60 ms"),
            new Assumption("contactors.K12.opening", "60 ms"),
            new Assumption("breakers.Q1.opening", "100 ms"),
            new Assumption("protection.F1.place", "stator"),
            new Assumption("protection.F2.measures-by", "direct"),
            new Assumption("duty.starts.cold", "2"),
            new Assumption("duty.starts.hot", "1"),
            new Assumption("duty.restart-after", "0 s"),
            new Assumption("ambient.motor", "40 °C"),
            new Assumption("ambient.panel", "40 °C"),
            new Assumption("fuse-wear", "0.65"));
  }
}
