package sliprung.sensitivity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.fixture.StarterText;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.Starter;
import sliprung.starter.TorqueCurve;

class UncertainInputsTest {
  private static final StarterText SMALL = StarterText.small();
  private static final Starter CRUSHER = StarterText.crusher().starter();

  private static UncertainInput input(Starter starter, String words) {
    return UncertainInputs.of(starter).stream()
        .filter(i -> i.words().equals(words))
        .findFirst()
        .orElseThrow(() -> new AssertionError(words));
  }

  @Test
  void each_input_moves_the_starter_and_nothing_is_asked_twice() {
    for (Starter starter : List.of(SMALL.starter(), CRUSHER)) {
      List<UncertainInput> inputs = UncertainInputs.of(starter);
      assertThat(inputs).extracting(UncertainInput::words).doesNotHaveDuplicates();
      assertThat(inputs)
          .allSatisfy(
              i -> {
                assertThat(i.atLow()).isNotEqualTo(starter);
                assertThat(i.atHigh()).isNotEqualTo(starter);
                assertThat(i.low()).isCloseTo(1.0 - i.grade().spread(), within(1e-12));
              });
    }
  }

  @Test
  void a_given_circuit_is_asked_and_else_the_plate_it_is_identified_from() {
    List<String> given =
        UncertainInputs.of(SMALL.starter()).stream().map(UncertainInput::path).toList();
    List<String> identified =
        UncertainInputs.of(CRUSHER).stream().map(UncertainInput::path).toList();

    assertThat(given).contains("motor.circuit.r2").doesNotContain("motor.current");
    assertThat(identified)
        .contains("motor.current", "motor.breakdown-torque", "motor.rotor-voltage")
        .doesNotContain("motor.circuit.r2");
  }

  @Test
  void grades_are_the_nearest_stated_then_the_usual_and_a_default_counts_as_estimated() {
    Starter starter =
        SMALL
            .without("breakaway:")
            .plus(
                "evidence:\n  load: told\n  load.inertia: measured\n"
                    + "  resistors.sections[2].resistance: report")
            .starter();

    assertThat(input(starter, "the load's inertia").grade()).isEqualTo(EvidenceGrade.MEASURED);
    assertThat(input(starter, "the load's torque while starting").grade())
        .isEqualTo(EvidenceGrade.TOLD);
    assertThat(input(starter, "the load's breakaway torque").grade())
        .isEqualTo(EvidenceGrade.ESTIMATED);
    assertThat(input(starter, "the bank's resistance").grade()).isEqualTo(EvidenceGrade.REPORT);
    assertThat(input(starter, "the sections' current ratings").grade())
        .isEqualTo(EvidenceGrade.DRAWING);
    assertThat(input(starter, "the rotor resistance").grade()).isEqualTo(EvidenceGrade.PLATE);
  }

  @Test
  void the_weakest_statement_about_the_sections_counts() {
    Starter starter =
        SMALL
            .plus(
                "evidence:\n  resistors.sections[1].resistance: told\n"
                    + "  resistors.sections[2].resistance: measured")
            .starter();

    assertThat(input(starter, "the bank's resistance").grade()).isEqualTo(EvidenceGrade.TOLD);
  }

  @Test
  void a_value_of_the_motor_is_scaled_alone() {
    Motor motor = CRUSHER.motor();

    Motor slower = MotorValue.SLIP.times(motor, 1.05);
    assertThat(1500.0 - slower.speedRpm()).isCloseTo(22.0 * 1.05, within(1e-9));
    assertThat(MotorValue.LOSSES.times(motor, 1.2).efficiency().orElseThrow())
        .isCloseTo(1.0 - 0.055 * 1.2, within(1e-12));
    assertThat(MotorValue.POWER_FACTOR.times(motor, 1.25).powerFactor().orElseThrow())
        .isEqualTo(0.99);
    assertThat(MotorValue.STALL_LIMIT.times(motor, 0.5).stallHotSeconds().orElseThrow())
        .isEqualTo(7.0);
    assertThat(MotorValue.RINGS_AT_REST.times(motor, 2.0).ringsAtRest().orElseThrow().seconds())
        .isEqualTo(30.0);
    for (MotorValue value : MotorValue.values()) {
      assertThat(value.times(motor, 1.0)).as(value.name()).isEqualTo(motor);
    }
  }

  @Test
  void a_torque_curve_keeps_its_shape() {
    for (TorqueCurve curve :
        List.of(
            new TorqueCurve.Constant(100.0),
            new TorqueCurve.Linear(100.0),
            new TorqueCurve.Square(100.0),
            new TorqueCurve.Table(new double[] {0.0, 1.0}, new double[] {50.0, 100.0}))) {
      Load load = SMALL.starter().load();
      Load with =
          new Load(
              load.inertia(), load.breakawayTorque(), curve, load.runningShare(), 0, 0, false, 0);
      Load scaled = LoadValue.TORQUE.times(with, 1.15);
      assertThat(scaled.torque()).hasSameClassAs(curve);
      for (double share : new double[] {0.0, 0.3, 1.0}) {
        assertThat(scaled.torque().at(share)).isCloseTo(1.15 * curve.at(share), within(1e-9));
      }
      assertThat(scaled.breakawayTorque()).isEqualTo(load.breakawayTorque());
    }
  }
}
