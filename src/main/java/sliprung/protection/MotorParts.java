package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.starter.Motor;
import sliprung.starter.ShortTime;

/** The motor's windings and its slip rings. */
final class MotorParts {
  private static final double WITHOUT_SERVICE_FACTOR = 1.05;

  private final Motor motor;
  private final Machine machine;

  MotorParts(Motor motor, Machine machine) {
    this.motor = motor;
    this.machine = machine;
  }

  /**
   * Stator winding: first order with the heating time constant; it ends at its limit at the service
   * factor times rated current, 1.05 times without one. At rest it is energized only while it
   * stalls and then heats with the same constant.
   */
  Part stator() {
    if (motor.heatingSeconds().isEmpty()) {
      return Part.missing("stator", "motor.heating");
    }
    double heating = motor.heatingSeconds().getAsDouble();
    double reference = motor.serviceFactor().orElse(WITHOUT_SERVICE_FACTOR) * motor.current();
    return Part.of(
            "stator",
            Channel.stator(),
            preload -> {
              double share = preload.statorAmps() / reference;
              return new FirstOrderMeter(reference, heating, share * share * cooled(preload));
            })
        .withOhms(history -> 3.0 * machine.circuit().r1());
  }

  /** Rotor winding, see {@link RotorWindingMeter}. */
  Part rotor() {
    Optional<String> missing = missingForRotor();
    if (missing.isPresent()) {
      return Part.missing("rotor", missing.get());
    }
    double cold = motor.stallColdSeconds().getAsDouble();
    double shorted = shortedRingAmps();
    RotorWindingMeter.Winding winding =
        new RotorWindingMeter.Winding(
            ratedRingAmps(),
            shorted * shorted * cold,
            1.0 - motor.stallHotSeconds().getAsDouble() / cold,
            motor.heatingSeconds().getAsDouble(),
            motor.coolingSeconds().getAsDouble());
    double ratio = machine.circuit().ratio();
    return Part.of(
            "rotor",
            Channel.ring(),
            preload ->
                new RotorWindingMeter(
                    winding, winding.levelAt(preload.ringAmps()) * cooled(preload)))
        .withOhms(history -> 3.0 * machine.circuit().r2() / (ratio * ratio));
  }

  private Optional<String> missingForRotor() {
    if (motor.stallColdSeconds().isEmpty()) {
      return Optional.of("motor.stall-limit.cold");
    }
    if (motor.stallHotSeconds().isEmpty()) {
      return Optional.of("motor.stall-limit.hot");
    }
    if (motor.stallHotSeconds().getAsDouble() > motor.stallColdSeconds().getAsDouble()) {
      // a winding that stands more when hot: the two contradict each other, neither is a limit
      return Optional.of("motor.stall-limit");
    }
    if (motor.heatingSeconds().isEmpty()) {
      return Optional.of("motor.heating");
    }
    return motor.coolingSeconds().isEmpty() ? Optional.of("motor.cooling") : Optional.empty();
  }

  /** Slip rings and brushes: the I²t they stand at rest, counted only while the rotor stands. */
  Part rings() {
    if (motor.ringsAtRest().isEmpty()) {
      return Part.missing("rings", "motor.rings-at-rest");
    }
    ShortTime limit = motor.ringsAtRest().get();
    double budget = limit.jouleIntegral();
    return Part.of(
        "rings",
        Channel.ring(),
        preload -> new OnlyAtRestMeter(new AccumulatingMeter(i -> i * i / budget, 0.0)));
  }

  private double cooled(PartPreload preload) {
    OptionalDouble cooling = motor.coolingSeconds();
    return cooling.isPresent() ? Math.exp(-preload.pauseSeconds() / cooling.getAsDouble()) : 1.0;
  }

  /** Ring current at rest with the rings shorted, at rated voltage from an ideal source, A. */
  private double shortedRingAmps() {
    return machine.at(new Source(motor.voltage(), 0.0), 0.0, 1.0).ringAmps();
  }

  /** Rated ring current from the plate, else from the circuit at rated speed, A. */
  private double ratedRingAmps() {
    double slip = machine.slip(motor.speedRpm() * Math.PI / 30.0);
    return motor
        .rotorCurrent()
        .orElseGet(() -> machine.at(new Source(motor.voltage(), 0.0), 0.0, slip).ringAmps());
  }

  /** A meter that stands still while the rotor turns. */
  private static final class OnlyAtRestMeter implements Meter {
    private final Meter inner;

    OnlyAtRestMeter(Meter inner) {
      this.inner = inner;
    }

    @Override
    public double advance(Piece piece) {
      return piece.standing() ? inner.advance(piece) : Double.POSITIVE_INFINITY;
    }

    @Override
    public double level() {
      return inner.level();
    }

    @Override
    public double peak() {
      return inner.level();
    }
  }
}
