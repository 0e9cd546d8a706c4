package sliprung.runup;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.Machine;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;

/**
 * Computes starts: {@code J dω/dt = Te(ω, step) − T_load(ω)} stage by stage, quasi-static.
 *
 * <p>Time counts from the main contacts of the line contactor. At rest the rotor moves only if the
 * steady torque exceeds the breakaway torque; an active load drives it backwards when the torque is
 * too small and the brake is off.
 */
public final class StartSimulator {
  private static final double RUN_UP_SHARE = 0.005;

  private final Starter starter;
  private final Machine machine;
  private final double inertia;

  /** A simulator of one starter with one circuit. */
  public StartSimulator(Starter starter, Machine machine) {
    this.starter = starter;
    this.machine = machine;
    this.inertia = starter.motor().inertia() + starter.load().inertia();
  }

  /** Computes one start. Pure: the same arguments give the same history. */
  public StartHistory run(Scenario scenario, Conditions conditions) {
    return new Run(scenario, conditions).compute();
  }

  /**
   * The running point: the running torque with the last step's circuit.
   *
   * @return speed in rad/s and currents; empty where the motor cannot carry that torque
   */
  public Optional<RunningPoint> runningPoint(Conditions conditions) {
    double torque = runningTorque(conditions);
    Circumstance last = circumstance(conditions, List.of(), w -> torque, 0.0);
    double start = 0.999999 * machine.synchronousSpeed();
    double balance = last.balanceFrom(start);
    double slip = machine.slip(balance);
    if (Double.isInfinite(balance)
        || slip > machine.breakdownSlip(conditions.source(), last.externalOhms())) {
      return Optional.empty();
    }
    return Optional.of(new RunningPoint(balance, last.at(balance)));
  }

  /** Running torque in N·m: its share of rated torque, at the conditions' load. */
  public double runningTorque(Conditions conditions) {
    return starter.load().runningShare() * starter.motor().ratedTorque() * conditions.loadFactor();
  }

  /** Rotor-circuit resistance outside the winding with those sections in, Ω per phase. */
  public double externalOhms(List<Integer> sectionsIn, Conditions conditions) {
    ResistorBank bank = starter.resistors();
    double ohms = 0.0;
    for (int section : sectionsIn) {
      ohms += bank.sections().get(section - 1).ohms();
    }
    return (ohms * bank.starFactor() + bank.permanentOhms()) * conditions.bankFactor()
        + bank.leadsOhms();
  }

  private Circumstance circumstance(
      Conditions conditions,
      List<Integer> sectionsIn,
      DoubleUnaryOperator loadTorque,
      double breakaway) {
    return new Circumstance(
        machine,
        conditions.source(),
        externalOhms(sectionsIn, conditions),
        loadTorque,
        breakaway,
        starter.load().active(),
        inertia);
  }

  /** One computation: the only mutable state, gone when it ends. */
  private final class Run {
    private final Scenario scenario;
    private final Conditions conditions;
    private final Sequence sequence;
    private final List<Stage> stages = new ArrayList<>();
    private final boolean rotorLocked;
    private final double breakaway;
    private final double brakeReleased;
    private final DoubleUnaryOperator startingTorque;
    private String closedBy;
    private double time;
    private double speed;
    private double stageFrom;
    private int stageStep;
    private List<Integer> stageSections;
    private Circumstance circumstance;
    private TraceBuilder trace;
    private boolean settled;
    private double runUp = Double.NaN;

    Run(Scenario scenario, Conditions conditions) {
      this.scenario = scenario;
      this.conditions = conditions;
      this.sequence = new Sequence(starter, scenario, conditions);
      this.rotorLocked =
          scenario.kind() == Scenario.Kind.LOCKED || scenario.kind() == Scenario.Kind.LOCKED_STEP;
      Load load = starter.load();
      double synchronous = machine.synchronousSpeed();
      double factor = conditions.loadFactor();
      this.startingTorque = w -> load.torque().at(w / synchronous) * factor;
      this.breakaway = load.breakawayTorque().orElse(load.torque().at(0.0)) * factor;
      this.brakeReleased = rotorLocked ? 0.0 : load.brakeSeconds();
      this.closedBy =
          starter.lineContactors().isEmpty() ? "" : starter.lineContactors().get(0).tag();
    }

    StartHistory compute() {
      if (scenario.kind() == Scenario.Kind.RINGS_SHORTED) {
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
        OptionalInt closing = sequence.act(time);
        if (closing.isPresent()) {
          endStage();
          closedBy = starter.steps().get(closing.getAsInt()).contactor();
          beginStage(startingTorque);
        }
      }
      return finish(neverReached);
    }

    private StartHistory ringsShorted() {
      circumstance = circumstance(conditions, List.of(), startingTorque, breakaway);
      trace = new TraceBuilder(circumstance);
      trace.add(
          Circumstance.Motion.constant(
              0.0, StartHistory.HORIZON_SECONDS, 0.0, Circumstance.End.SETTLED));
      Stage stage =
          new Stage(
              starter.sectionCount() + 1,
              List.of(),
              circumstance.externalOhms(),
              0.0,
              StartHistory.HORIZON_SECONDS,
              true,
              closedBy,
              trace.build());
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
      circumstance = circumstance(conditions, sequence.sectionsIn(), loadTorque, breakaway);
      trace = new TraceBuilder(circumstance);
      stageStep = sequence.step();
      stageSections = sequence.sectionsIn();
      stageFrom = time;
      settled = false;
    }

    private void endStage() {
      if (trace.isEmpty()) {
        return;
      }
      stages.add(
          new Stage(
              stageStep,
              stageSections,
              circumstance.externalOhms(),
              stageFrom,
              time,
              settled,
              closedBy,
              trace.build()));
    }

    private void stand(double to) {
      if (to > time) {
        trace.add(Circumstance.Motion.constant(time, to, 0.0, Circumstance.End.TIME));
        time = to;
      }
    }

    /** Moves on until a time or a stop; the brake holds the rotor until it has released. */
    private Circumstance.End move(double to, List<DoubleUnaryOperator> stops) {
      if (time < brakeReleased) {
        stand(Math.min(to, brakeReleased));
        if (time >= to) {
          return Circumstance.End.TIME;
        }
      }
      Circumstance.Motion motion = circumstance.move(time, speed, to, stops);
      trace.add(motion);
      time = motion.endTime();
      speed = motion.endSpeed();
      settled |= motion.end() == Circumstance.End.SETTLED;
      return motion.end();
    }

    /** Moves on to a time; a settled speed is kept until then. */
    private void advance(double to) {
      if (to <= time) {
        return;
      }
      if (rotorLocked) {
        settled = true;
        stand(to);
      } else if (move(to, List.of()) == Circumstance.End.SETTLED && time < to) {
        trace.add(Circumstance.Motion.constant(time, to, speed, Circumstance.End.SETTLED));
        time = to;
      }
    }

    /** Waits for a level; returns the number of its step if it is never reached, else 0. */
    private int awaitLevel(double due) {
      double from = sequence.levelFromSeconds();
      if (time < from) {
        advance(Math.min(from, due));
        if (time < from) {
          return 0;
        }
      }
      DoubleUnaryOperator above = sequence.aboveLevel(circumstance);
      if (above.applyAsDouble(speed) <= 0.0) {
        sequence.levelMet(time);
        return 0;
      }
      double limit = Math.min(due, StartHistory.HORIZON_SECONDS);
      if (rotorLocked || limit <= time) {
        return levelLost(due);
      }
      Circumstance.End end = move(limit, List.of(above));
      if (end == Circumstance.End.STOP) {
        sequence.levelMet(time);
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
      double horizon = Math.max(StartHistory.HORIZON_SECONDS, time + 1.0);
      if (rotorLocked) {
        settled = true;
        stand(horizon);
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
          sequence.lastStepClosed()
              ? OptionalDouble.of(sequence.lastClosingSeconds())
              : OptionalDouble.empty(),
          running && !Double.isNaN(runUp) ? OptionalDouble.of(runUp) : OptionalDouble.empty(),
          neverReached);
    }

    /** Moves until the speed has settled, noting when it comes within 0.5 % of where it settles. */
    private void settle(double horizon, boolean noteRunUp) {
      if (noteRunUp) {
        double balance = circumstance.balanceFrom(speed);
        double near = RUN_UP_SHARE * Math.abs(balance);
        if (Math.abs(speed - balance) > near && !Double.isInfinite(balance)) {
          double threshold = balance - Math.signum(balance - speed) * near;
          moveIfAny(horizon, List.of(w -> w - threshold));
        }
        runUp = time;
      }
      moveIfAny(horizon, List.of());
    }

    private void moveIfAny(double horizon, List<DoubleUnaryOperator> stops) {
      if (time < horizon) {
        move(horizon, stops);
      }
    }

    private boolean isRunning(boolean allClosed) {
      double breakdown = machine.breakdownSlip(conditions.source(), circumstance.externalOhms());
      return settled && allClosed && speed > 0.0 && machine.slip(speed) <= breakdown;
    }

    private Outcome outcome(boolean running) {
      boolean moved = false;
      boolean backwards = false;
      for (Stage stage : stages) {
        for (double w : stage.trace().speed()) {
          moved |= w != 0.0;
          backwards |= w < 0.0;
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
      double torque = runningTorque(conditions);
      if (!starter.load().torque().isSquare()) {
        return w -> torque;
      }
      Motor motor = starter.motor();
      double rated = motor.speedRpm() * Math.PI / 30.0;
      return w -> torque * Math.max(0.0, w) * Math.max(0.0, w) / (rated * rated);
    }

    /** Thirty minutes at running load after a permitted start. */
    private Stage runOn() {
      double torque = runningTorque(conditions);
      double end = time + StartHistory.HORIZON_SECONDS;
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
          trace.build());
    }
  }

  /**
   * Running at the running torque.
   *
   * @param speed rad/s
   * @param point currents and torque
   */
  public record RunningPoint(double speed, sliprung.machine.OperatingPoint point) {}
}
