package sliprung.machine;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

/**
 * Per-unit values that circuits of three-phase motors from about 1 kW upwards have. Wide on purpose
 * (judged): a value outside is more likely a slip of the pen on the plate than a strange motor.
 */
final class Usual {
  private Usual() {}

  /** A sentence for each value of a circuit outside its usual range. */
  static List<String> departures(Motor motor, CircuitData circuit) {
    double base = motor.voltage() / (Math.sqrt(3.0) * motor.current());
    List<String> found = new ArrayList<>();
    check(found, "Stator resistance", circuit.r1() / base, 0.0, 0.15);
    check(found, "Rotor resistance", circuit.r2() / base, 0.002, 0.20);
    check(found, "Leakage reactance", (circuit.x1() + circuit.x2()) / base, 0.06, 0.60);
    check(found, "Magnetizing reactance", circuit.xm() / base, 1.0, 10.0);
    return found;
  }

  private static void check(
      List<String> found, String what, double perUnit, double low, double high) {
    if (perUnit < low || perUnit > high) {
      found.add(
          String.format(
              Locale.ROOT,
              "%s is %.3g of the base impedance; %.3g to %.3g is usual: check the plate.",
              what,
              perUnit,
              low,
              high));
    }
  }
}
