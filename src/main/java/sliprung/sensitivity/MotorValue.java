package sliprung.sensitivity;

import java.util.OptionalDouble;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.ShortTime;

/** A value of the motor that may be off. */
enum MotorValue {
  CURRENT("motor.current", "the motor's rated current"),
  /** The rated slip: a speed off by per cents would be another motor's. */
  SLIP("motor.speed", "the motor's rated slip"),
  POWER_FACTOR("motor.power-factor", "the motor's power factor"),
  /** The losses: the efficiency itself can hardly be off. */
  LOSSES("motor.efficiency", "the motor's losses"),
  ROTOR_VOLTAGE("motor.rotor-voltage", "the standstill rotor voltage"),
  ROTOR_CURRENT("motor.rotor-current", "the rated rotor current"),
  BREAKDOWN_TORQUE("motor.breakdown-torque", "the breakdown torque"),
  LOCKED_CURRENT("motor.locked-current", "the locked-rotor current"),
  STATOR_RESISTANCE("motor.circuit.r1", "the stator resistance"),
  /** Of stator and rotor together. */
  LEAKAGE("motor.circuit.x2", "the leakage reactance"),
  MAGNETIZING("motor.circuit.xm", "the magnetizing reactance"),
  ROTOR_RESISTANCE("motor.circuit.r2", "the rotor resistance"),
  RATIO("motor.circuit.ratio", "the stator to rotor ratio"),
  /** From cold and from hot together. */
  STALL_LIMIT("motor.stall-limit", "the motor's stall limit"),
  RINGS_AT_REST("motor.rings-at-rest", "what the slip rings stand at rest");

  private static final double GREATEST_POWER_FACTOR = 0.99;

  private final String path;
  private final String words;

  MotorValue(String path, String words) {
    this.path = path;
    this.words = words;
  }

  String path() {
    return path;
  }

  String words() {
    return words;
  }

  /** Whether the motor has that value and it is used: beside a circuit the plate's is not. */
  boolean isIn(Motor motor) {
    boolean given = motor.circuit().isPresent();
    return switch (this) {
      case CURRENT, SLIP -> !given;
      case POWER_FACTOR -> !given && motor.powerFactor().isPresent();
      case LOSSES -> !given && motor.efficiency().isPresent();
      case ROTOR_VOLTAGE -> !given && motor.rotorVoltage().isPresent();
      case ROTOR_CURRENT -> !given && motor.rotorCurrent().isPresent();
      case BREAKDOWN_TORQUE -> !given && motor.breakdownTorque().isPresent();
      case LOCKED_CURRENT -> !given && motor.lockedCurrent().isPresent();
      case STATOR_RESISTANCE, LEAKAGE, MAGNETIZING, ROTOR_RESISTANCE, RATIO -> given;
      case STALL_LIMIT ->
          motor.stallColdSeconds().isPresent() || motor.stallHotSeconds().isPresent();
      case RINGS_AT_REST -> motor.ringsAtRest().isPresent();
    };
  }

  /** The motor with that factor on this value. */
  Motor times(Motor motor, double factor) {
    return new Motor(
        motor.voltage(),
        motor.frequency(),
        motor.powerWatts(),
        motor.current() * on(CURRENT, factor),
        this == SLIP ? withSlip(motor, factor) : motor.speedRpm(),
        powerFactor(motor.powerFactor(), on(POWER_FACTOR, factor)),
        efficiency(motor.efficiency(), on(LOSSES, factor)),
        motor.serviceFactor(),
        times(motor.rotorVoltage(), on(ROTOR_VOLTAGE, factor)),
        times(motor.rotorCurrent(), on(ROTOR_CURRENT, factor)),
        times(motor.breakdownTorque(), on(BREAKDOWN_TORQUE, factor)),
        times(motor.lockedCurrent(), on(LOCKED_CURRENT, factor)),
        motor.inertia(),
        times(motor.stallColdSeconds(), on(STALL_LIMIT, factor)),
        times(motor.stallHotSeconds(), on(STALL_LIMIT, factor)),
        motor.heatingSeconds(),
        motor.coolingSeconds(),
        motor
            .ringsAtRest()
            .map(r -> new ShortTime(r.amps(), r.seconds() * on(RINGS_AT_REST, factor))),
        motor.circuit().map(c -> circuit(c, factor)));
  }

  private CircuitData circuit(CircuitData c, double factor) {
    return new CircuitData(
        c.r1() * on(STATOR_RESISTANCE, factor),
        c.x1() * on(LEAKAGE, factor),
        c.xm() * on(MAGNETIZING, factor),
        c.r2() * on(ROTOR_RESISTANCE, factor),
        c.x2() * on(LEAKAGE, factor),
        c.ratio() * on(RATIO, factor));
  }

  private double on(MotorValue value, double factor) {
    return this == value ? factor : 1.0;
  }

  private static double withSlip(Motor motor, double factor) {
    double synchronous = motor.synchronousSpeed(motor.frequency()) * 30.0 / Math.PI;
    return synchronous - (synchronous - motor.speedRpm()) * factor;
  }

  private static OptionalDouble powerFactor(OptionalDouble value, double factor) {
    return value.isEmpty() || factor == 1.0
        ? value
        : OptionalDouble.of(
            Math.min(
                Math.max(GREATEST_POWER_FACTOR, value.getAsDouble()),
                value.getAsDouble() * factor));
  }

  private static OptionalDouble efficiency(OptionalDouble value, double factor) {
    return value.isEmpty() || factor == 1.0
        ? value
        : OptionalDouble.of(1.0 - (1.0 - value.getAsDouble()) * factor);
  }

  static OptionalDouble times(OptionalDouble value, double factor) {
    return value.isEmpty() ? value : OptionalDouble.of(value.getAsDouble() * factor);
  }
}
