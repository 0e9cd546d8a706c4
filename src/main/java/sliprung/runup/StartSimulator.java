package sliprung.runup;

import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.Machine;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;

/**
 * Computes starts: {@code J dω/dt = Te − T_load(ω)} stage by stage, with the steady circuit or with
 * the electrical transient.
 *
 * <p>Time counts from the main contacts of the line contactor. At rest the rotor moves only if the
 * steady torque exceeds the breakaway torque; an active load drives it backwards when the torque is
 * too small and the brake is off.
 */
public final class StartSimulator {
  private final Starter starter;
  private final Machine machine;
  private final double inertia;

  /** A simulator of one starter with one circuit. */
  public StartSimulator(Starter starter, Machine machine) {
    this.starter = starter;
    this.machine = machine;
    this.inertia = starter.motor().inertia() + starter.load().inertia();
  }

  /** Computes one start with the steady circuit. Pure: the same arguments give the same history. */
  public StartHistory run(Scenario scenario, Conditions conditions) {
    return new StartRun(this, scenario, conditions, new SteadyDrive()).compute();
  }

  /**
   * Computes one start with the electrical transient: from rest with the circuit dead before,
   * through every closing. Its stages carry the peaks of their closings; currents are the magnitude
   * of the space vector over √2. The thirty minutes at running load after it are steady.
   */
  public StartHistory runTransient(Scenario scenario, Conditions conditions) {
    return new StartRun(this, scenario, conditions, new TransientDrive()).compute();
  }

  /**
   * The start after the line was lost and has returned with every step contactor closed: from rest,
   * with the steady circuit, which heats most; its first closing carries the greatest peaks of a
   * rotor that still turns or stands, over every dead time and angle of the residual voltage.
   */
  public StartHistory runReclosed(Scenario scenario, Conditions conditions) {
    StartHistory steady = run(scenario, conditions);
    double torque = runningTorque(conditions);
    Circumstance closed = circumstance(conditions, List.of(), w -> torque, 0.0);
    ClosingPeak peak = new Reclosing(closed, torque).greatest();
    Trace trace = steady.stages().get(0).trace();
    for (int i = 0; i < trace.size(); i++) {
      peak = peak.orTorque(trace.torque()[i], trace.seconds()[i]);
    }
    return steady.withFirstPeak(peak);
  }

  Starter starter() {
    return starter;
  }

  Machine machine() {
    return machine;
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

  Circumstance circumstance(
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
        inertia * conditions.inertiaFactor());
  }

  /**
   * Running at the running torque.
   *
   * @param speed rad/s
   * @param point currents and torque
   */
  public record RunningPoint(double speed, sliprung.machine.OperatingPoint point) {}
}
