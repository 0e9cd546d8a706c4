package sliprung.machine;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sliprung.machine.Identification.Residual;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

/**
 * The figures of a plate and what a circuit makes of each of them.
 *
 * <p>Tolerances are those that a true plate may differ by: the schedule of IEC 60034-1 where it has
 * one (efficiency, power factor, slip, breakdown torque, locked-rotor current), else ours, said
 * beside each.
 */
final class Nameplate {
  /**
   * Air-gap torque over shaft torque at rated load: friction, windage and stray load loss, which
   * the circuit does not hold. 1 to 2 % in machines of 10 kW to 1 MW; 1.2 % is taken (judged).
   */
  static final double AIR_GAP_OVER_SHAFT = 1.012;

  /** The schedule has no tolerance on current; it follows from efficiency and power factor. */
  private static final double CURRENT_TOLERANCE = 0.05;

  /** Judged: measured on the motor, but seldom corrected for the magnetizing current. */
  private static final double ROTOR_VOLTAGE_TOLERANCE = 0.05;

  /** Judged: plates often round it or print power over rotor voltage. */
  private static final double ROTOR_CURRENT_TOLERANCE = 0.10;

  private static final double SLIP_TOLERANCE = 0.20;
  private static final double SLIP_TOLERANCE_BELOW_1_KW = 0.30;
  private static final double BREAKDOWN_TOLERANCE = 0.10;
  private static final double LOCKED_CURRENT_TOLERANCE = 0.20;

  /** Smallest slip taken: a plate whose speed is synchronous has residuals, not infinities. */
  private static final double LEAST_SLIP = 1e-4;

  private final Motor motor;
  private final OptionalDouble breakdownTorque;

  /**
   * A plate.
   *
   * @param motor as described
   * @param breakdownTorque over rated torque: the plate's, or one end of the usual range
   */
  Nameplate(Motor motor, OptionalDouble breakdownTorque) {
    this.motor = motor;
    this.breakdownTorque = breakdownTorque;
  }

  Motor motor() {
    return motor;
  }

  Source source() {
    return new Source(motor.voltage(), 0.0);
  }

  Machine machine(CircuitData circuit) {
    return new Machine(circuit, motor.frequency(), motor.polePairs());
  }

  double synchronousSpeed() {
    return motor.synchronousSpeed(motor.frequency());
  }

  /** Rated slip, never below {@link #LEAST_SLIP}. */
  double slip() {
    double speed = motor.speedRpm() * Math.PI / 30.0;
    return Math.max(LEAST_SLIP, 1.0 - speed / synchronousSpeed());
  }

  /** Rated air-gap torque, N·m. */
  double airGapTorque() {
    return AIR_GAP_OVER_SHAFT * motor.ratedTorque();
  }

  /**
   * Power factor: the plate's, else from power, efficiency, voltage and current (then never above
   * 1), else empty.
   */
  OptionalDouble powerFactor() {
    if (motor.powerFactor().isPresent() || motor.efficiency().isEmpty()) {
      return motor.powerFactor();
    }
    double apparent = Math.sqrt(3.0) * motor.voltage() * motor.current();
    double input = motor.powerWatts() / motor.efficiency().getAsDouble();
    return OptionalDouble.of(Math.min(1.0, input / apparent));
  }

  /** Each figure given, against the circuit's; in a fixed order. */
  List<Residual> residuals(CircuitData circuit) {
    Machine machine = machine(circuit);
    OperatingPoint rated = machine.at(source(), 0.0, slip());
    List<Residual> all = new ArrayList<>();
    all.add(
        new Residual(
            "stator current", motor.current(), rated.statorAmps(), "A", CURRENT_TOLERANCE));
    motor
        .powerFactor()
        .ifPresent(
            pf ->
                all.add(
                    new Residual(
                        "power factor", pf, rated.powerFactor(), "", powerFactorTolerance(pf))));
    motor
        .efficiency()
        .ifPresent(
            eta ->
                all.add(
                    new Residual(
                        "efficiency", eta, efficiency(rated), "", efficiencyTolerance(eta))));
    // The torque at the plate's speed is nearly proportional to slip: slip's tolerance is its own.
    all.add(
        new Residual(
            "torque at rated speed",
            motor.ratedTorque(),
            rated.torque() / AIR_GAP_OVER_SHAFT,
            "N·m",
            motor.powerWatts() < 1000.0 ? SLIP_TOLERANCE_BELOW_1_KW : SLIP_TOLERANCE));
    motor
        .rotorVoltage()
        .ifPresent(
            u20 ->
                all.add(
                    new Residual(
                        "rotor voltage",
                        u20,
                        machine.openRingVolts(source()),
                        "V",
                        ROTOR_VOLTAGE_TOLERANCE)));
    motor
        .rotorCurrent()
        .ifPresent(
            i2 ->
                all.add(
                    new Residual(
                        "rotor current", i2, rated.ringAmps(), "A", ROTOR_CURRENT_TOLERANCE)));
    breakdownTorque.ifPresent(
        k ->
            all.add(
                new Residual(
                    "breakdown torque",
                    k * motor.ratedTorque(),
                    machine.breakdownTorque(source()),
                    "N·m",
                    BREAKDOWN_TOLERANCE)));
    motor
        .lockedCurrent()
        .ifPresent(
            amps ->
                all.add(
                    new Residual(
                        "locked-rotor current",
                        amps,
                        machine.at(source(), 0.0, 1.0).statorAmps(),
                        "A",
                        LOCKED_CURRENT_TOLERANCE)));
    return all;
  }

  /** Shaft power over input of the circuit, which holds no core loss. */
  private double efficiency(OperatingPoint rated) {
    double shaft = rated.torque() / AIR_GAP_OVER_SHAFT * synchronousSpeed() * (1.0 - slip());
    return shaft / rated.inputWatts();
  }

  /** IEC 60034-1: −(1 − cos φ)/6, at least 0.02 and at most 0.07 (limits from memory). */
  private static double powerFactorTolerance(double pf) {
    return Math.min(0.07, Math.max(0.02, (1.0 - pf) / 6.0)) / pf;
  }

  /**
   * IEC 60034-1: −15 % of the losses to 150 kW, −10 % above; and 35 % of the losses more, since the
   * circuit has no core loss (judged: core loss is a fifth to a third of the losses).
   */
  private double efficiencyTolerance(double eta) {
    double schedule = motor.powerWatts() > 150e3 ? 0.10 : 0.15;
    return (schedule + 0.35) * Math.max(0.0, 1.0 - eta) / eta;
  }
}
