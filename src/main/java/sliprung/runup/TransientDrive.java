package sliprung.runup;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.FluxModel;
import sliprung.numeric.SystemFlow;

/**
 * Moves with the electrical transient: the circuit is dead before line closing, flux linkages and
 * speed go on through every closing.
 *
 * <p>At rest the rotor stays where its steady torque does not exceed the breakaway torque; once it
 * may move, a passive load still never drives it backwards. Currents are the magnitude of the space
 * vector over √2.
 */
final class TransientDrive implements Drive {
  /** Error of a step, over the flux at no load and over synchronous speed. */
  private static final double ERROR = 1e-8;

  /**
   * Rates below this count as settled: of a flux linkage over that of the supply, of the speed over
   * synchronous speed in a second. Well above what the errors of the steps leave.
   */
  private static final double SETTLED = 1e-6;

  /** A speed this close to the balance of torques is taken for it, over synchronous speed. */
  private static final double AT_BALANCE = 1e-4;

  /** Longest time in s that a stage is followed with the transient before it goes on steady. */
  private static final double LONGEST = 30.0;

  /** Time in s after which the currents of a standing rotor are steady, whatever the rates. */
  private static final double STANDING = 5.0;

  /** A speed beyond which a drive that runs away goes on steady, over synchronous speed. */
  private static final double RUNS_AWAY = 2.0;

  private double time;
  private double stageFrom;
  private double[] state = new double[FluxModel.STATES];
  private Circumstance circumstance;
  private FluxModel model;
  private TransientSamples samples;
  private CycleMean cycles;

  @Override
  public double time() {
    return time;
  }

  @Override
  public double speed() {
    return state[FluxModel.SPEED];
  }

  @Override
  public double value(Level level) {
    return value(level, state);
  }

  private double value(Level level, double[] at) {
    return level.above(at[FluxModel.SPEED], model.statorAmps(at), model.ringAmps(at));
  }

  @Override
  public void enter(Circumstance entered) {
    circumstance = entered;
    model = new FluxModel(entered.machine(), entered.source(), entered.externalOhms());
    if (cycles == null) {
      cycles = new CycleMean(2.0 * Math.PI / model.electricalSpeed());
    }
    samples = new TransientSamples(entered, model, cycles);
    stageFrom = time;
  }

  @Override
  public Circumstance.End move(double to, List<Level> stops) {
    double limit = Math.min(to, stageFrom + LONGEST);
    if (time < limit && !runsAway(state)) {
      Circumstance.End end = moveWithTransient(limit, stops);
      if (end != Circumstance.End.TIME || time >= to) {
        return end;
      }
    }
    return moveSteadily(to, stops);
  }

  private boolean runsAway(double[] at) {
    return Math.abs(at[FluxModel.SPEED])
        >= RUNS_AWAY * circumstance.machine().synchronousSpeed() * (1.0 - 1e-9);
  }

  /** The closing is long past, or no step follows: currents have caught up with the speed. */
  private Circumstance.End moveSteadily(double to, List<Level> stops) {
    List<DoubleUnaryOperator> functions =
        stops.stream()
            .map(level -> (DoubleUnaryOperator) w -> value(level, model.settledAt(w)))
            .toList();
    Circumstance.Motion motion = circumstance.move(time, speed(), to, functions);
    double[] times = motion.times();
    double[] speeds = motion.speeds();
    for (int i = 0; i + 2 < times.length && motion.endTime() > times[0]; i += 2) {
      samples.piece(
          times[i],
          model.settledAt(speeds[i]),
          times[i + 1],
          model.settledAt(speeds[i + 1]),
          times[i + 2],
          model.settledAt(speeds[i + 2]));
    }
    time = motion.endTime();
    state = model.settledAt(motion.endSpeed());
    return motion.end();
  }

  private Circumstance.End moveWithTransient(double to, List<Level> stops) {
    if (state[FluxModel.SPEED] == 0.0 && circumstance.stands()) {
      return run(to, true, true, stops);
    }
    double from = time;
    Circumstance.End end = run(to, false, true, stops);
    while (end == Circumstance.End.SETTLED && !atBalance() && time < to) {
      // A crawl past a dip of the torque is slow, too: go on for a while, whatever the rates.
      end = run(Math.min(to, time + 0.1 + 0.1 * (time - from)), false, false, stops);
      if (end == Circumstance.End.TIME && time < to && !runsAway(state)) {
        end = run(to, false, true, stops);
      }
    }
    return end;
  }

  private boolean atBalance() {
    double balance = circumstance.balanceFrom(speed());
    if (Math.abs(balance - speed()) > AT_BALANCE * circumstance.machine().synchronousSpeed()) {
      return false;
    }
    state = model.settledAt(balance);
    return true;
  }

  private Circumstance.End run(double to, boolean held, boolean untilSettled, List<Level> stops) {
    if (to <= time) {
      return Circumstance.End.TIME;
    }
    if (untilSettled && restless(held, state) <= 0.0) {
      return Circumstance.End.SETTLED;
    }
    double fastest = RUNS_AWAY * circumstance.machine().synchronousSpeed();
    SystemFlow.Stop[] all = new SystemFlow.Stop[stops.size() + (untilSettled ? 2 : 1)];
    for (int i = 0; i < stops.size(); i++) {
      Level level = stops.get(i);
      all[i] = y -> value(level, y);
    }
    all[stops.size()] = y -> fastest - Math.abs(y[FluxModel.SPEED]);
    if (untilSettled) {
      all[stops.size() + 1] = y -> restless(held, y);
    }
    double flux = ERROR * model.ratedFlux();
    double speed = ERROR * circumstance.machine().synchronousSpeed();
    samples.begin(time, state);
    SystemFlow.End end =
        SystemFlow.run(
            (y, rate) -> rates(held, y, rate),
            new double[] {flux, flux, flux, flux, speed},
            time,
            state,
            to,
            samples,
            all);
    time = end.time();
    state = end.state();
    if (end.crossed() < 0 || end.crossed() == stops.size()) {
      return Circumstance.End.TIME;
    }
    return end.crossed() > stops.size() ? Circumstance.End.SETTLED : Circumstance.End.STOP;
  }

  private void rates(boolean held, double[] at, double[] rate) {
    model.fluxRates(at, rate);
    if (held) {
      rate[FluxModel.SPEED] = 0.0;
      return;
    }
    double speed = at[FluxModel.SPEED];
    double net = model.torque(at) - circumstance.loadTorque().applyAsDouble(speed);
    boolean atRest = speed <= 0.0 && net < 0.0 && !circumstance.active();
    rate[FluxModel.SPEED] = atRest ? 0.0 : net / circumstance.inertia();
  }

  /** Greatest rate over its scale, less what counts as settled. */
  private double restless(boolean held, double[] at) {
    double[] rate = new double[FluxModel.STATES];
    rates(held, at, rate);
    double flux = 0.0;
    for (int i = 0; i < FluxModel.SPEED; i++) {
      flux = Math.max(flux, Math.abs(rate[i]));
    }
    double speed = Math.abs(rate[FluxModel.SPEED]) / circumstance.machine().synchronousSpeed();
    return Math.max(flux / (model.electricalSpeed() * model.ratedFlux()), speed) - SETTLED;
  }

  @Override
  public void stand(double to) {
    if (to <= time) {
      return;
    }
    run(Math.min(to, time + STANDING), true, true, List.of());
    if (time < to) {
      state = model.settledAt(0.0);
      keep(to);
    }
  }

  @Override
  public void keep(double to) {
    if (to > time) {
      samples.constant(time, to, state);
      time = to;
    }
  }

  @Override
  public Trace trace() {
    return samples.trace();
  }

  @Override
  public Optional<ClosingPeak> peak() {
    return samples.peak();
  }
}
