package sliprung.runup;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.OperatingPoint;

/** Moves with the steady circuit: currents and torque follow the speed at once. */
final class SteadyDrive implements Drive {
  private double time;
  private double speed;
  private Circumstance circumstance;
  private TraceBuilder trace;

  /** From line closing at rest. */
  SteadyDrive() {
    this(0.0, 0.0);
  }

  /** From a time and a speed in rad/s. */
  SteadyDrive(double time, double speed) {
    this.time = time;
    this.speed = speed;
  }

  @Override
  public double time() {
    return time;
  }

  @Override
  public double speed() {
    return speed;
  }

  @Override
  public double value(Level level) {
    return value(level, speed);
  }

  private double value(Level level, double atSpeed) {
    OperatingPoint point = circumstance.at(atSpeed);
    return level.above(atSpeed, point.statorAmps(), point.ringAmps());
  }

  @Override
  public void enter(Circumstance entered) {
    circumstance = entered;
    trace = new TraceBuilder();
  }

  @Override
  public Circumstance.End move(double to, List<Level> stops) {
    List<DoubleUnaryOperator> functions =
        stops.stream().map(level -> (DoubleUnaryOperator) w -> value(level, w)).toList();
    Circumstance.Motion motion = circumstance.move(time, speed, to, functions);
    add(motion);
    speed = motion.endSpeed();
    return motion.end();
  }

  @Override
  public void stand(double to) {
    if (to > time) {
      add(Circumstance.Motion.constant(time, to, 0.0, Circumstance.End.TIME));
    }
  }

  @Override
  public void keep(double to) {
    if (to > time) {
      add(Circumstance.Motion.constant(time, to, speed, Circumstance.End.SETTLED));
    }
  }

  /** Appends motion; a piece without duration adds nothing. */
  private void add(Circumstance.Motion motion) {
    time = motion.endTime();
    if (time <= motion.times()[0]) {
      return;
    }
    for (int i = trace.isEmpty() ? 0 : 1; i < motion.times().length; i++) {
      trace.append(motion.times()[i], motion.speeds()[i], circumstance);
    }
  }

  @Override
  public Trace trace() {
    return trace.build();
  }

  @Override
  public Optional<ClosingPeak> peak() {
    return Optional.empty();
  }
}
