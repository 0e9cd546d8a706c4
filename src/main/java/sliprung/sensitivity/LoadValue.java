package sliprung.sensitivity;

import java.util.Arrays;
import java.util.OptionalDouble;
import sliprung.starter.Load;
import sliprung.starter.TorqueCurve;

/** A value of the driven machine that may be off. */
enum LoadValue {
  INERTIA("load.inertia", "the load's inertia"),
  /** While starting; the breakaway torque too where the file leaves it to the curve. */
  TORQUE("load.torque", "the load's torque while starting"),
  BREAKAWAY("load.breakaway", "the load's breakaway torque"),
  RUNNING("load.running", "the load's running torque");

  private final String path;
  private final String words;

  LoadValue(String path, String words) {
    this.path = path;
    this.words = words;
  }

  String path() {
    return path;
  }

  String words() {
    return words;
  }

  /** The load with that factor on this value. */
  Load times(Load load, double factor) {
    return new Load(
        load.inertia() * on(INERTIA, factor),
        this == BREAKAWAY
            ? OptionalDouble.of(load.breakawayTorque().orElse(load.torque().at(0.0)) * factor)
            : load.breakawayTorque(),
        this == TORQUE ? times(load.torque(), factor) : load.torque(),
        load.runningShare() * on(RUNNING, factor),
        load.spreadLow(),
        load.spreadHigh(),
        load.active(),
        load.brakeSeconds());
  }

  private double on(LoadValue value, double factor) {
    return this == value ? factor : 1.0;
  }

  private static TorqueCurve times(TorqueCurve curve, double factor) {
    if (curve instanceof TorqueCurve.Table table) {
      return new TorqueCurve.Table(
          table.shares(), Arrays.stream(table.torques()).map(t -> t * factor).toArray());
    }
    if (curve instanceof TorqueCurve.Linear linear) {
      return new TorqueCurve.Linear(linear.torqueAtSynchronous() * factor);
    }
    if (curve instanceof TorqueCurve.Square square) {
      return new TorqueCurve.Square(square.torqueAtSynchronous() * factor);
    }
    return new TorqueCurve.Constant(((TorqueCurve.Constant) curve).torque() * factor);
  }
}
