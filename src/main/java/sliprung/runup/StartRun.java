package sliprung.runup;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.Starter;

/** One computation of a start: the only mutable state, gone when it ends. */
final class StartRun {
  private static final double RUN_UP_SHARE = 0.005;
  private static final double BACKWARDS_SHARE = 0.001;

  private final StartSimulator simulator;
  private final Starter starter;
  private final Machine machine;
  private final Scenario scenario;
  private final Conditions conditions;
  private final Sequence sequence;
  private final List<Stage> stages = new ArrayList<>();
  private final boolean rotorLocked;
  private final double breakaway;
  private final double brakeReleased;
  private final DoubleUnaryOperator startingTorque;
  private Drive drive;
  private String closedBy;
  private double stageFrom;
  private int stageStep;
  private List<Integer> stageSections;
  private Circumstance circumstance;
  private OperatingPoint entry;
  private boolean settled;
  private double runUp = Double.NaN;

  StartRun(StartSimulator simulator, Scenario scenario, Conditions conditions, Drive drive) {
    this.simulator = simulator;
    this.starter = simulator.starter();
    this.machine = simulator.machine();
    this.scenario = scenario;
    this.conditions = conditions;
    this.drive = drive;
    this.sequence = new Sequence(starter, scenario, conditions);
    this.rotorLocked =
        scenario.kind() == Scenario.Kind.LOCKED || scenario.kind() == Scenario.Kind.LOCKED_STEP;
    Load load = starter.load();
    double synchronous = machine.synchronousSpeed();
    double factor = conditions.loadFactor();
    this.startingTorque = w -> load.torque().at(w / synchronous) * factor;
    this.breakaway = load.breakawayTorque().orElse(load.torque().at(0.0)) * factor;
    this.brakeReleased = rotorLocked ? 0.0 : load.brakeSeconds();
    this.closedBy = starter.lineContactors().isEmpty() ? "" : starter.lineContactors().get(0).tag();
  }

  StartHistory compute() {
    if (scenario.kind() == Scenario.Kind.RINGS_SHORTED
        || scenario.kind() == Scenario.Kind.RUNNING_LOCKED) {
      return ringsShorted();
    }
    beginStage(startingTorque);
    int neverReached = 0;
    while (true) {
      double due = sequence.nextTimeSeconds();
      if (sequence.waitsForLevel()) {
        neverReached = awaitLevel(due);
      } else if (Double.isInfinite(due)) {
        break;
      } else {
        advance(due);
      }
      if (neverReached > 0) {
        break;
      }
      OptionalInt closing = sequence.act(drive.time());
      if (closing.isPresent()) {
        endStage();
        closedBy = starter.steps().get(closing.getAsInt()).contactor();
        beginStage(startingTorque);
      }
    }
    return finish(neverReached);
  }

  private StartHistory ringsShorted() {
    circumstance = simulator.circumstance(conditions, List.of(), startingTorque, breakaway);
    drive.enter(circumstance);
    entry = circumstance.at(0.0);
    drive.stand(StartHistory.HORIZON_SECONDS);
    Stage stage =
        new Stage(
            starter.sectionCount() + 1,
            List.of(),
            circumstance.externalOhms(),
            0.0,
            StartHistory.HORIZON_SECONDS,
            true,
            closedBy,
            drive.trace(),
            entry,
            drive.peak());
    return new StartHistory(
        scenario,
        conditions,
        Outcome.LOCKED,
        List.of(stage),
        Optional.empty(),
        OptionalDouble.of(0.0), // what waits for the last step has nothing to wait for
        OptionalDouble.empty(),
        0);
  }

  private void beginStage(DoubleUnaryOperator loadTorque) {
    circumstance = simulator.circumstance(conditions, sequence.sectionsIn(), loadTorque, breakaway);
    drive.enter(circumstance);
    entry = circumstance.at(drive.speed());
    stageStep = sequence.step();
    stageSections = sequence.sectionsIn();
    stageFrom = drive.time();
    settled = false;
  }

  private void endStage() {
    if (drive.time() <= stageFrom) {
      return;
    }
    stages.add(
        new Stage(
            stageStep,
            stageSections,
            circumstance.externalOhms(),
            stageFrom,
            drive.time(),
            settled,
            closedBy,
            drive.trace(),
            entry,
            drive.peak()));
  }

  /** Moves on until a time or a stop; the brake holds the rotor until it has released. */
  private Circumstance.End move(double to, List<Level> stops) {
    if (drive.time() < brakeReleased) {
      drive.stand(Math.min(to, brakeReleased));
      if (drive.time() >= to) {
        return Circumstance.End.TIME;
      }
    }
    Circumstance.End end = drive.move(to, stops);
    settled |= end == Circumstance.End.SETTLED;
    return end;
  }

  /** Moves on to a time; a settled speed is kept until then. */
  private void advance(double to) {
    if (to <= drive.time()) {
      return;
    }
    if (rotorLocked) {
      settled = true;
      drive.stand(to);
    } else if (move(to, List.of()) == Circumstance.End.SETTLED) {
      drive.keep(to);
    }
  }

  /** Waits for a level; returns the number of its step if it is never reached, else 0. */
  private int awaitLevel(double due) {
    double from = sequence.levelFromSeconds();
    if (drive.time() < from) {
      advance(Math.min(from, due));
      if (drive.time() < from) {
        return 0;
      }
    }
    Level above = sequence.aboveLevel(machine);
    if (drive.value(above) <= 0.0) {
      sequence.levelMet(drive.time());
      return 0;
    }
    double limit = Math.min(due, StartHistory.HORIZON_SECONDS);
    if (rotorLocked || limit <= drive.time()) {
      return levelLost(due);
    }
    Circumstance.End end = move(limit, List.of(above));
    if (end == Circumstance.End.STOP) {
      sequence.levelMet(drive.time());
      return 0;
    }
    if (end == Circumstance.End.SETTLED) {
      return levelLost(due);
    }
    return Double.isInfinite(due) ? sequence.levelStep() : 0;
  }

  /** The level is not met and nothing moves any more: only a pending closing can change that. */
  private int levelLost(double due) {
    if (Double.isInfinite(due)) {
      return sequence.levelStep();
    }
    advance(due);
    return 0;
  }

  private StartHistory finish(int neverReached) {
    boolean allClosed = sequence.sectionsIn().isEmpty();
    boolean permitted = scenario.kind() == Scenario.Kind.PERMITTED;
    double horizon = Math.max(StartHistory.HORIZON_SECONDS, drive.time() + 1.0);
    if (rotorLocked) {
      settled = true;
      drive.stand(horizon);
    } else {
      settle(horizon, allClosed);
    }
    boolean running = isRunning(allClosed);
    if (!rotorLocked && !permitted && scenario.load() == Scenario.LoadMode.RUNNING) {
      endStage();
      beginStage(heldRunningTorque());
      settle(horizon, false);
      running = isRunning(allClosed);
    }
    if (!(permitted && running)) {
      advance(horizon);
    }
    endStage();
    Optional<Stage> after = permitted && running ? Optional.of(runOn()) : Optional.empty();
    return new StartHistory(
        scenario,
        conditions,
        outcome(running),
        stages,
        after,
        sequence.lastStepSeconds(),
        running && !Double.isNaN(runUp) ? OptionalDouble.of(runUp) : OptionalDouble.empty(),
        neverReached);
  }

  /** Moves until the speed has settled, noting when it comes within 0.5 % of where it settles. */
  private void settle(double horizon, boolean noteRunUp) {
    if (noteRunUp) {
      double speed = drive.speed();
      double balance = circumstance.balanceFrom(speed);
      double near = RUN_UP_SHARE * Math.abs(balance);
      if (Math.abs(speed - balance) > near && !Double.isInfinite(balance)) {
        double threshold = balance - Math.signum(balance - speed) * near;
        moveIfAny(horizon, List.of(Level.ofSpeed(w -> w - threshold)));
      }
      runUp = drive.time();
    }
    moveIfAny(horizon, List.of());
  }

  private void moveIfAny(double horizon, List<Level> stops) {
    if (drive.time() < horizon) {
      move(horizon, stops);
    }
  }

  private boolean isRunning(boolean allClosed) {
    double breakdown = machine.breakdownSlip(conditions.source(), circumstance.externalOhms());
    return settled && allClosed && drive.speed() > 0.0 && machine.slip(drive.speed()) <= breakdown;
  }

  private Outcome outcome(boolean running) {
    // The electrical transient swings a rotor back by a hair; only an active load drives it back.
    double backwardsSpeed =
        starter.load().active()
            ? -BACKWARDS_SHARE * machine.synchronousSpeed()
            : Double.NEGATIVE_INFINITY;
    boolean moved = false;
    boolean backwards = false;
    for (Stage stage : stages) {
      for (double w : stage.trace().speed()) {
        moved |= w != 0.0;
        backwards |= w < backwardsSpeed;
      }
    }
    if (!moved) {
      return Outcome.LOCKED;
    }
    if (backwards) {
      return Outcome.RUN_BACK;
    }
    if (!settled) {
      return Outcome.UNFINISHED;
    }
    return running ? Outcome.RUNNING : Outcome.HELD;
  }

  /** A square law stays square; every other running load is constant. */
  private DoubleUnaryOperator heldRunningTorque() {
    double torque = simulator.runningTorque(conditions);
    if (!starter.load().torque().isSquare()) {
      return w -> torque;
    }
    Motor motor = starter.motor();
    double rated = motor.speedRpm() * Math.PI / 30.0;
    return w -> torque * Math.max(0.0, w) * Math.max(0.0, w) / (rated * rated);
  }

  /** Thirty minutes at running load after a permitted start, with the steady circuit. */
  private Stage runOn() {
    double torque = simulator.runningTorque(conditions);
    drive = new SteadyDrive(drive.time(), drive.speed());
    double end = drive.time() + StartHistory.HORIZON_SECONDS;
    beginStage(w -> torque);
    advance(end);
    return new Stage(
        starter.sectionCount() + 1,
        List.of(),
        circumstance.externalOhms(),
        stageFrom,
        end,
        settled,
        closedBy,
        drive.trace(),
        entry,
        Optional.empty());
  }
}
