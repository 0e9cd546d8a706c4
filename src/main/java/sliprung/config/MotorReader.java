package sliprung.config;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.Motor;
import sliprung.starter.ShortTime;

/** Reads {@code motor}. */
final class MotorReader {
  private final Section motor;
  private final boolean circuitGiven;

  private MotorReader(Section motor) {
    this.motor = motor;
    this.circuitGiven = motor.has("circuit");
  }

  static Motor read(Section root) {
    Section motor =
        root.requiredSection(
            "motor",
            "{voltage: 690 V, …}",
            "voltage",
            "frequency",
            "power",
            "current",
            "speed",
            "power-factor",
            "efficiency",
            "service-factor",
            "rotor-voltage",
            "rotor-current",
            "breakdown-torque",
            "locked-current",
            "inertia",
            "stall-limit",
            "heating",
            "cooling",
            "rings-at-rest",
            "circuit");
    return new MotorReader(motor).read();
  }

  private Motor read() {
    double frequency = motor.number("frequency", Dimension.FREQUENCY, Range.POSITIVE);
    double speed = motor.number("speed", Dimension.SPEED, Range.POSITIVE);
    belowSynchronous(speed, frequency);
    Section stall = motor.sectionOrDefaults("stall-limit", "cold", "hot");
    OptionalDouble cold = OptionalDouble.empty();
    if (motor.has("stall-limit")) {
      cold = OptionalDouble.of(stall.number("cold", Dimension.TIME, Range.POSITIVE));
    }
    OptionalDouble hot = stall.optionalNumber("hot", Dimension.TIME, Range.POSITIVE);
    return new Motor(
        motor.number("voltage", Dimension.VOLTAGE, Range.POSITIVE),
        frequency,
        motor.number("power", Dimension.POWER, Range.POSITIVE),
        motor.number("current", Dimension.CURRENT, Range.POSITIVE),
        speed,
        plate("power-factor", Dimension.NUMBER, Range.FRACTION, "0.86"),
        plate("efficiency", Dimension.SHARE, Range.FRACTION_PERCENT, "94.5 %"),
        motor.optionalNumber("service-factor", Dimension.NUMBER, Range.POSITIVE),
        plate("rotor-voltage", Dimension.VOLTAGE, Range.POSITIVE, "420 V"),
        plate("rotor-current", Dimension.CURRENT, Range.POSITIVE, "285 A"),
        motor.optionalNumber("breakdown-torque", Dimension.NUMBER, Range.ABOVE_ONE),
        motor.optionalNumber("locked-current", Dimension.CURRENT, Range.POSITIVE),
        motor.number("inertia", Dimension.INERTIA, Range.POSITIVE),
        cold,
        hot,
        motor.optionalNumber("heating", Dimension.TIME, Range.POSITIVE),
        motor.optionalNumber("cooling", Dimension.TIME, Range.POSITIVE),
        shortTime(motor, "rings-at-rest"),
        circuit());
  }

  /** A figure of the plate that identification needs: may be left out beside a circuit. */
  private OptionalDouble plate(String key, Dimension dimension, Range range, String example) {
    if (circuitGiven) {
      return motor.optionalNumber(key, dimension, range);
    }
    return motor
        .required(key, dimension.words(), example)
        .map(f -> OptionalDouble.of(f.number(dimension, range)))
        .orElse(OptionalDouble.empty());
  }

  private void belowSynchronous(double speed, double frequency) {
    if (Double.isNaN(speed) || Double.isNaN(frequency)) {
      return;
    }
    double fastest = 60.0 * frequency;
    double pairs = Math.floor(fastest / speed);
    if (pairs < 1.0 || speed >= fastest / pairs) {
      Field field = motor.optional("speed").get();
      field.mistake(
          "expected a rated speed below a synchronous speed of "
              + motor.optional("frequency").get().value().found()
              + ", but found "
              + field.value().found(),
          "a motor turns slower than 60 × frequency / pole pairs, by its slip");
    }
  }

  /** A current with the time it is carried: {@code {current: 600 A, time: 15 s}}. */
  static Optional<ShortTime> shortTime(Section section, String key) {
    Optional<Field> field = section.optional(key);
    if (field.isEmpty()) {
      return Optional.empty();
    }
    Section rating = field.get().section("current", "time");
    return Optional.of(
        new ShortTime(
            rating.number("current", Dimension.CURRENT, Range.POSITIVE),
            rating.number("time", Dimension.TIME, Range.POSITIVE)));
  }

  private Optional<Motor.CircuitData> circuit() {
    Optional<Field> field = motor.optional("circuit");
    if (field.isEmpty()) {
      return Optional.empty();
    }
    Section circuit = field.get().section("r1", "x1", "xm", "r2", "x2", "ratio");
    return Optional.of(
        new Motor.CircuitData(
            circuit.number("r1", Dimension.RESISTANCE, Range.NOT_NEGATIVE),
            circuit.number("x1", Dimension.RESISTANCE, Range.POSITIVE),
            circuit.number("xm", Dimension.RESISTANCE, Range.POSITIVE),
            circuit.number("r2", Dimension.RESISTANCE, Range.POSITIVE),
            circuit.number("x2", Dimension.RESISTANCE, Range.POSITIVE),
            circuit.number("ratio", Dimension.NUMBER, Range.POSITIVE)));
  }
}
