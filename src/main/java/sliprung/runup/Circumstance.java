package sliprung.runup;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.numeric.Flow;

/**
 * The drive on one step against one load: {@code J dω/dt = Te(ω) − T_load(ω)}.
 *
 * @param machine the motor
 * @param source the supply
 * @param externalOhms outside the rotor winding, actual ohms per phase
 * @param loadTorque N·m by speed in rad/s
 * @param breakawayTorque N·m that the torque at rest must exceed before the rotor moves forwards
 * @param active the load drives backwards when the torque is too small
 * @param inertia motor and load, kg·m²
 */
record Circumstance(
    Machine machine,
    Source source,
    double externalOhms,
    DoubleUnaryOperator loadTorque,
    double breakawayTorque,
    boolean active,
    double inertia) {

  /** Share of synchronous speed within which a speed counts as settled. */
  static final double SETTLED = 1e-9;

  /** A shorter time than any contactor's moves nothing, and no integrator steps through it. */
  private static final double SHORTEST_SECONDS = 1e-9;

  private static final int SCAN = 400;

  OperatingPoint at(double speed) {
    return machine.at(source, externalOhms, machine.slip(speed));
  }

  double netTorque(double speed) {
    return machine.torque(source, externalOhms, machine.slip(speed))
        - loadTorque.applyAsDouble(speed);
  }

  double acceleration(double speed) {
    return netTorque(speed) / inertia;
  }

  /** Whether a rotor at rest stays at rest, brakes apart. */
  boolean stands() {
    double torque = at(0.0).torque();
    double load = loadTorque.applyAsDouble(0.0);
    if (torque > Math.max(breakawayTorque, load)) {
      return false;
    }
    return !(active && torque < load);
  }

  /**
   * The speed at which the drive would settle from a speed at which it is moving: the first balance
   * in the direction of motion, rest for a passive load that stops it, or infinite where there is
   * none up to twice synchronous speed either way.
   */
  double balanceFrom(double speed) {
    double net = netTorque(speed);
    if (net == 0.0) {
      return speed;
    }
    double direction = Math.signum(net);
    double synchronous = machine.synchronousSpeed();
    double floor = active ? -2.0 * synchronous : 0.0;
    double bound = direction > 0 ? Math.max(2.0 * synchronous, speed) : Math.min(floor, speed);
    double before = speed;
    double step = direction * synchronous / SCAN;
    while (true) {
      double next = before + step;
      boolean beyond = direction > 0 ? next >= bound : next <= bound;
      if (beyond) {
        next = bound;
      }
      if (netTorque(next) * direction <= 0.0) {
        return bisect(before, next, direction);
      }
      if (beyond) {
        return active || direction > 0 ? direction * Double.POSITIVE_INFINITY : 0.0;
      }
      before = next;
    }
  }

  /** Halves until the doubles run out: the bracket is narrow and the function costs little. */
  private double bisect(double moving, double past, double direction) {
    double a = moving;
    double b = past;
    for (int i = 0; i < 100; i++) {
      double middle = 0.5 * (a + b);
      if (middle == a || middle == b) {
        break;
      }
      if (netTorque(middle) * direction > 0.0) {
        a = middle;
      } else {
        b = middle;
      }
    }
    return 0.5 * (a + b);
  }

  /** Why a piece of motion ended. */
  enum End {
    TIME,
    SETTLED,
    STOP
  }

  /**
   * A piece of motion.
   *
   * @param times odd number, with midpoints
   * @param speeds rad/s
   * @param end why it ended
   */
  record Motion(double[] times, double[] speeds, End end) {
    double endTime() {
      return times[times.length - 1];
    }

    double endSpeed() {
      return speeds[speeds.length - 1];
    }

    static Motion constant(double from, double to, double speed, End end) {
      return new Motion(
          new double[] {from, 0.5 * (from + to), to}, new double[] {speed, speed, speed}, end);
    }
  }

  /**
   * Moves on from a speed until a time, until it has settled, or until one of the stops.
   *
   * @param stops functions of speed that end it at a change of sign
   */
  Motion move(double fromTime, double speed, double toTime, List<DoubleUnaryOperator> stops) {
    if (speed == 0.0 && stands()) {
      return Motion.constant(fromTime, fromTime, 0.0, End.SETTLED);
    }
    if (toTime - fromTime < SHORTEST_SECONDS) {
      return Motion.constant(fromTime, toTime, speed, End.TIME);
    }
    double balance = balanceFrom(speed);
    double tolerance = SETTLED * machine.synchronousSpeed();
    if (Math.abs(speed - balance) <= tolerance) {
      return Motion.constant(fromTime, fromTime, balance, End.SETTLED);
    }
    boolean comesToRest = balance == 0.0 && !active;
    double target = comesToRest ? 0.0 : balance - Math.signum(balance - speed) * tolerance;
    DoubleUnaryOperator[] all = new DoubleUnaryOperator[stops.size() + 1];
    for (int i = 0; i < stops.size(); i++) {
      all[i] = stops.get(i);
    }
    all[stops.size()] = Double.isInfinite(target) ? w -> 1.0 : w -> w - target;
    Flow.Samples samples =
        Flow.run(this::acceleration, machine.synchronousSpeed(), fromTime, speed, toTime, all);
    End end =
        samples.crossed() < 0
            ? End.TIME
            : samples.crossed() == stops.size() ? End.SETTLED : End.STOP;
    double[] speeds = samples.values();
    if (end == End.SETTLED) {
      speeds[speeds.length - 1] = balance;
    }
    return new Motion(samples.times(), speeds, end);
  }
}
