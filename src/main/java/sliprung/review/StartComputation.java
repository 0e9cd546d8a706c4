package sliprung.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.machine.Machine;
import sliprung.protection.DevicePreload;
import sliprung.protection.PartPreload;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Conditions;
import sliprung.runup.ModelError;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Duty;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;
import sliprung.tolerance.WorstPoints;

/** Computes every start of a starter at every corner, and what devices and parts make of it. */
final class StartComputation {
  private final Starter starter;
  private final StartSimulator simulator;
  private final ProtectionEvaluator evaluator;
  private final String circuit;
  private final KnownStarts known;

  /**
   * A computation.
   *
   * @param circuit empty, or which of several circuits the machine stands for
   */
  StartComputation(Starter starter, Machine machine, String circuit) {
    this(starter, machine, circuit, new KnownStarts(starter));
  }

  /** A computation that takes from known starts what is the same. */
  StartComputation(Starter starter, Machine machine, String circuit, KnownStarts known) {
    this.starter = starter;
    this.known = known.serve(starter) ? known : new KnownStarts(starter);
    this.simulator = new StartSimulator(starter, machine);
    this.evaluator = new ProtectionEvaluator(starter, machine);
    this.circuit = circuit;
  }

  /**
   * Everything that was computed.
   *
   * @param starts nominal corner first; within a corner permitted starts, then faults
   * @param running the running point at each corner
   * @param method how the starts were computed
   */
  record Computed(
      List<ComputedStart> starts,
      Map<Corner, Optional<RunningPoint>> running,
      RunUpMethod method) {}

  private record AtCorner(
      Corner corner, Optional<RunningPoint> running, List<ComputedStart> starts) {}

  /** The permitted start of one corner, both ways; or the steady one for both. */
  private record Both(
      Corner corner,
      Conditions conditions,
      StartHistory steady,
      StartHistory withTransient,
      boolean isBoth) {
    ModelError error() {
      return ModelError.between(steady, withTransient);
    }
  }

  /** Corners share nothing, so both cores work on them; the order stays that of the corners. */
  Computed compute() {
    return compute(known.permitted(circuit, this::permitted), faults(), starter.method());
  }

  /** Only some starts: the permitted ones and some faults at some corners, by one method. */
  Computed compute(StartSelection selection) {
    Map<Corner, Conditions> points = new LinkedHashMap<>();
    selection.corners().forEach(c -> points.put(c, Corners.conditions(starter, c)));
    List<Scenario> wanted = faults().stream().filter(selection.faults()::contains).toList();
    return compute(permitted(points, selection.withTransient()), wanted, selection.method());
  }

  private Computed compute(List<Both> permitted, List<Scenario> faults, Starter.Method asked) {
    Map<Corner, ModelError> errors = new LinkedHashMap<>();
    permitted.forEach(p -> errors.put(p.corner(), p.error()));
    RunUpMethod method = RunUpMethod.choose(asked, errors);
    List<AtCorner> corners = permitted.parallelStream().map(p -> at(p, faults, method)).toList();
    List<ComputedStart> starts = new ArrayList<>();
    Map<Corner, Optional<RunningPoint>> running = new LinkedHashMap<>();
    for (AtCorner at : corners) {
      starts.addAll(at.starts());
      running.put(at.corner(), at.running());
    }
    return new Computed(starts, running, method);
  }

  private List<Both> permitted() {
    Map<Corner, Conditions> points = new LinkedHashMap<>(Corners.of(starter));
    points.putAll(WorstPoints.of(starter, simulator));
    return permitted(points, true);
  }

  private List<Both> permitted(Map<Corner, Conditions> points, boolean withTransient) {
    return points.entrySet().stream().toList().parallelStream()
        .map(e -> both(e.getKey(), e.getValue(), withTransient))
        .toList();
  }

  private Both both(Corner corner, Conditions conditions, boolean withTransient) {
    StartHistory steady = simulator.run(Scenario.PERMITTED, conditions);
    return new Both(
        corner,
        conditions,
        steady,
        withTransient ? simulator.runTransient(Scenario.PERMITTED, conditions) : steady,
        withTransient);
  }

  /**
   * The history of a failed start: it lasts long against any transient and is followed with the
   * steady circuit, at the nominal corner with the peaks of the transient.
   */
  private StartHistory fault(Scenario fault, Both at) {
    if (fault.kind() == Scenario.Kind.RUNNING_LOCKED) {
      return simulator.run(fault, at.conditions()); // nothing closes: there is no closing peak
    }
    if (fault.kind() == Scenario.Kind.RECLOSED) {
      return simulator.runReclosed(fault, at.conditions());
    }
    StartHistory steady = simulator.run(fault, at.conditions());
    return at.corner().isNominal() && at.isBoth()
        ? steady.withPeaksOf(simulator.runTransient(fault, at.conditions()))
        : steady;
  }

  private AtCorner at(Both both, List<Scenario> faults, RunUpMethod method) {
    Corner corner = both.corner();
    Conditions conditions = both.conditions();
    StartHistory chosen =
        method.isTransient()
            ? both.withTransient()
            : both.steady().withPeaksOf(both.withTransient());
    Optional<RunningPoint> running = simulator.runningPoint(conditions);
    Preloads before = Preloads.of(starter, running);
    Duty duty = starter.duty();

    List<ComputedStart> starts = new ArrayList<>();
    StartProtection permitted = evaluator.over(chosen);
    for (int n = 1; n <= duty.coldStarts(); n++) {
      starts.add(
          permitted(
              corner, permitted, ComputedStart.From.COLD, n, DevicePreload.COLD, PartPreload.COLD));
    }
    List<Double> sections =
        permitted.sectionLevelsAfter(PartPreload.COLD, Math.max(1, duty.coldStarts()));
    DevicePreload warm = before.devices().onWarmBank(sections);
    PartPreload restarted = before.parts(duty.restartAfterSeconds(), sections);
    for (int n = 1; n <= duty.hotStarts(); n++) {
      starts.add(permitted(corner, permitted, ComputedStart.From.HOT, n, warm, restarted));
    }

    DevicePreload forgotten = before.remembered().onWarmBank(sections);
    PartPreload hot = before.parts(0.0, sections);
    for (Scenario fault : faults) {
      StartProtection history =
          evaluator.over(known.fault(circuit, corner, fault, () -> fault(fault, both)));
      if (fault.kind() == Scenario.Kind.RUNNING_LOCKED) {
        starts.add(
            fault(
                corner,
                history,
                ComputedStart.From.HOT,
                warmFromLightLoad(conditions).onWarmBank(sections),
                hot));
        continue;
      }
      // a reclosed motor was running just before: it has no cold start
      if (fault.kind() != Scenario.Kind.RECLOSED) {
        starts.add(
            fault(corner, history, ComputedStart.From.COLD, DevicePreload.COLD, PartPreload.COLD));
      }
      starts.add(fault(corner, history, ComputedStart.From.HOT, forgotten, hot));
    }
    return new AtCorner(corner, running, starts);
  }

  /**
   * What a relay still holds of the running when the motor jams: real heat, but only that of the
   * least load of the spread. A relay follows the load in minutes, the motor in hours.
   */
  private DevicePreload warmFromLightLoad(Conditions conditions) {
    double light = Math.min(conditions.loadFactor(), 1.0 + starter.load().spreadLow());
    Conditions lightly = conditions.withLoad(light);
    return simulator
        .runningPoint(lightly)
        .map(r -> DevicePreload.running(r.point().statorAmps(), r.point().ringAmps()))
        .orElse(DevicePreload.COLD);
  }

  private ComputedStart permitted(
      Corner corner,
      StartProtection start,
      ComputedStart.From from,
      int place,
      DevicePreload devices,
      PartPreload parts) {
    return new ComputedStart(
        Scenario.PERMITTED,
        from,
        place,
        corner,
        start.history(),
        start.devices(devices, place),
        start.parts(parts, place),
        circuit);
  }

  private ComputedStart fault(
      Corner corner,
      StartProtection start,
      ComputedStart.From from,
      DevicePreload devices,
      PartPreload parts) {
    return new ComputedStart(
        start.history().scenario(),
        from,
        1,
        corner,
        start.history(),
        start.devices(devices, 1),
        start.parts(parts, 1),
        circuit);
  }

  private List<Scenario> faults() {
    List<Scenario> faults = new ArrayList<>();
    int sections = starter.sectionCount();
    for (Scenario.LoadMode load : Scenario.LoadMode.values()) {
      for (int step = 1; step <= sections; step++) {
        faults.add(new Scenario(Scenario.Kind.HELD, step, load));
      }
    }
    if (starter.sequence() == Starter.Sequence.CASCADED) {
      for (int step = 1; step < sections; step++) {
        faults.add(new Scenario(Scenario.Kind.SKIPPED, step, Scenario.LoadMode.START));
        faults.add(new Scenario(Scenario.Kind.SKIPPED, step, Scenario.LoadMode.RUNNING));
      }
    }
    faults.add(new Scenario(Scenario.Kind.LOCKED, 0, Scenario.LoadMode.START));
    for (int step = 1; step <= sections; step++) {
      faults.add(new Scenario(Scenario.Kind.LOCKED_STEP, step, Scenario.LoadMode.START));
    }
    faults.add(new Scenario(Scenario.Kind.RINGS_SHORTED, 0, Scenario.LoadMode.START));
    faults.add(new Scenario(Scenario.Kind.RUNNING_LOCKED, 0, Scenario.LoadMode.START));
    if (!starter.interlocks().stepsOpenBeforeLine()) {
      faults.addAll(stepsClosedAtLineClosing());
    }
    return faults;
  }

  /** What only an interlock that proves every step contactor open excludes. */
  private List<Scenario> stepsClosedAtLineClosing() {
    List<Scenario> faults = new ArrayList<>();
    int sections = starter.sectionCount();
    boolean starPoint = starter.resistors().cutOut() == ResistorBank.CutOut.STAR_POINT;
    for (int step = 1; step <= sections; step++) {
      faults.add(
          starPoint && step == sections
              ? new Scenario(Scenario.Kind.RINGS_SHORTED_START, 0, Scenario.LoadMode.START)
              : new Scenario(Scenario.Kind.WELDED, step, Scenario.LoadMode.START));
    }
    faults.add(new Scenario(Scenario.Kind.RECLOSED, 0, Scenario.LoadMode.START));
    return faults;
  }
}
