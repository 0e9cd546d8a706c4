package sliprung.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.protection.StartMargins;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.ComputedStart.From;
import sliprung.runup.Conditions;
import sliprung.runup.Outcome;
import sliprung.runup.Scenario;
import sliprung.runup.Scenario.Kind;
import sliprung.runup.Scenario.LoadMode;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.tolerance.Corner;

/** Rough starts of {@link Crusher}: plausible shapes, coarse steps, invented device answers. */
final class CrusherStarts {
  private static final int STEPS_A_SAMPLE = 20;
  private static final double HORIZON = 1800;
  private final Starter starter;
  private final Machine machine;

  CrusherStarts(Starter starter, Machine machine) {
    this.starter = starter;
    this.machine = machine;
  }

  ComputedStart permitted(From from, int place, Corner corner) {
    return start(Scenario.PERMITTED, from, place, corner);
  }

  ComputedStart fault(Kind kind, int step, LoadMode load, From from, Corner corner) {
    return start(new Scenario(kind, step, load), from, 1, corner);
  }

  private ComputedStart start(Scenario scenario, From from, int place, Corner corner) {
    double load =
        corner.load() == Corner.LoadSide.HEAVY
            ? 1.2
            : corner.load() == Corner.LoadSide.LIGHT ? 0.8 : 1.0;
    double bank = corner.bank() == Corner.Bank.LOW ? 0.9 : 1.0;
    double timers = corner.timers() == Corner.Timers.LATE ? 1.05 : 1.0;
    Source source = new Source(690 * corner.supplyPu(), 0.0443);
    Conditions conditions = new Conditions(source, load, bank, timers, 1.0);
    List<Stage> stages = new ArrayList<>();
    boolean turns = scenario.kind() == Kind.PERMITTED || scenario.kind() == Kind.HELD;
    int last = scenario.step() > 0 ? scenario.step() : starter.sectionCount() + 1;
    int first = scenario.kind() == Kind.RINGS_SHORTED ? starter.sectionCount() + 1 : 1;
    double speed = 0;
    double time = 0;
    for (int step = first; step <= last; step++) {
      double end =
          step < last || (!scenario.isFault() && step <= starter.sectionCount())
              ? time + ((Step.After) starter.steps().get(step - 1).rule()).seconds() * timers + 0.06
              : scenario.isFault() ? HORIZON : time + 3;
      Stage stage = stage(step, time, end, speed, turns, conditions, scenario.load());
      stages.add(stage);
      speed = stage.trace().speed()[stage.trace().last()];
      time = end;
    }
    boolean permitted = !scenario.isFault();
    double lastClosing = stages.get(stages.size() - 1).fromSeconds();
    Optional<Stage> running =
        permitted
            ? Optional.of(
                stage(last, time, time + HORIZON, speed, true, conditions, LoadMode.RUNNING))
            : Optional.empty();
    StartHistory history =
        new StartHistory(
            scenario,
            conditions,
            permitted ? Outcome.RUNNING : turns ? Outcome.HELD : Outcome.LOCKED,
            stages,
            running,
            permitted ? OptionalDouble.of(lastClosing) : OptionalDouble.empty(),
            permitted ? OptionalDouble.of(lastClosing + 0.9) : OptionalDouble.empty(),
            0);
    return new ComputedStart(
        scenario,
        from,
        place,
        corner,
        history,
        devices(scenario, history, corner),
        parts(scenario, stages));
  }

  private Stage stage(
      int step, double from, double to, double speed, boolean turns, Conditions c, LoadMode mode) {
    double ohms = 0;
    for (int k = step; k <= starter.sectionCount(); k++) {
      ohms += starter.resistors().sections().get(k - 1).ohms() * c.bankFactor();
    }
    double integrated = Math.min(to - from, 30);
    int samples = 41;
    double[][] v = new double[8][samples];
    double w = speed;
    double h = integrated / (samples - 1);
    for (int i = 0; i < samples; i++) {
      OperatingPoint at = machine.at(c.source(), ohms, machine.slip(w));
      double torque = load(w, c, mode);
      double[] row = {
        from + i * h,
        w,
        at.statorAmps(),
        at.ringAmps(),
        at.torque(),
        torque,
        at.terminalVolts(),
        at.inputWatts()
      };
      for (int q = 0; q < row.length; q++) {
        v[q][i] = row[q];
      }
      for (int j = 0; turns && j < STEPS_A_SAMPLE; j++) {
        double accelerating = machine.torque(c.source(), ohms, machine.slip(w)) - load(w, c, mode);
        w +=
            h
                / STEPS_A_SAMPLE
                * accelerating
                / (starter.motor().inertia() + starter.load().inertia());
      }
    }
    v[0][samples - 1] = to;
    List<Integer> in = IntStream.rangeClosed(step, starter.sectionCount()).boxed().toList();
    String by = step == 1 ? "K1" : starter.steps().get(step - 2).contactor();
    Trace trace = new Trace(v[0], v[1], v[2], v[3], v[4], v[5], v[6], v[7]);
    return new Stage(step, in, ohms, from, to, to - from > 60, by, trace);
  }

  private double load(double speed, Conditions c, LoadMode mode) {
    double share = speed / machine.synchronousSpeed();
    return mode == LoadMode.RUNNING ? 900 : c.loadFactor() * starter.load().torque().at(share);
  }

  private List<DeviceResponse> devices(Scenario scenario, StartHistory history, Corner corner) {
    List<DeviceResponse> out = new ArrayList<>();
    boolean permitted = !scenario.isFault();
    double joule = 0;
    for (Stage stage : history.stages()) {
      joule += stage.trace().integralOfSquare(stage.trace().statorAmps());
    }
    for (Edge edge : Edge.values()) {
      double spread = edge == Edge.FAST ? 1.15 : edge == Edge.SLOW ? 0.85 : 1.0;
      double budget = 208 * 208 * 52 * (2 - spread);
      double settled = settledAmps(history);
      boolean sees = scenario.kind() != Kind.HELD || settled > 260;
      double use = permitted ? joule / budget / 1.6 * spread : sees ? 9 : settled / 300;
      double operates =
          !permitted && sees ? 208 * 208 * 60 / (settled * settled) / spread : never();
      out.add(response("F2", edge, use, operates, 0.06, permitted, 1.52));
      out.add(
          response(
              "F3",
              edge,
              use * 0.9,
              operates * 1.4,
              0.05,
              permitted,
              corner.isNominal() ? 1.31 : 1.07));
      boolean timer = scenario.kind() == Kind.HELD;
      double set = edge == Edge.FAST ? 12.35 : edge == Edge.SLOW ? 13.65 : 13;
      out.add(
          response(
              "F5",
              edge,
              timer ? HORIZON / set : history.lastClosingSeconds().orElse(10) / set,
              timer ? set : never(),
              0.06,
              permitted,
              2.0));
    }
    return out;
  }

  private static DeviceResponse response(
      String tag,
      Edge edge,
      double use,
      double operates,
      double opening,
      boolean permitted,
      double margin) {
    boolean fast = permitted && edge == Edge.FAST;
    return new DeviceResponse(
        tag,
        edge,
        use,
        Math.min(use, 0.99),
        operates,
        operates + opening,
        fast ? Optional.of(StartMargins.known(margin, margin * margin)) : Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  private List<PartResponse> parts(Scenario scenario, List<Stage> stages) {
    List<PartResponse> out = new ArrayList<>();
    for (int k = 1; k <= starter.sectionCount(); k++) {
      double carries = starter.resistors().sections().get(k - 1).continuousAmps().orElseThrow();
      double tau = k == 1 ? 312 : 294;
      double theta = 0;
      double limit = never();
      double use = 0;
      for (Stage stage : stages) {
        double amps = stage.sectionsIn().contains(k) ? stage.trace().ringAmps()[20] : 0;
        double target = amps * amps / carries / carries;
        double dt = stage.toSeconds() - stage.fromSeconds();
        if (target > 1 && theta < 1 && Double.isInfinite(limit)) {
          double t = tau * Math.log((target - theta) / (target - 1));
          limit = t < dt ? stage.fromSeconds() + t : limit;
        }
        theta = target + (theta - target) * Math.exp(-dt / tau);
        use = Math.max(use, theta);
      }
      out.add(
          new PartResponse(
              "section-" + k, use, limit, OptionalDouble.of(1e6 / k), Optional.empty()));
    }
    double stall = scenario.kind() == Kind.RINGS_SHORTED ? 14 : never();
    out.add(new PartResponse("rotor", 0.4, stall, OptionalDouble.empty(), Optional.empty()));
    out.add(PartResponse.missing("rings", "motor.rings-at-rest"));
    return out;
  }

  private static double settledAmps(StartHistory history) {
    Trace last = history.stages().get(history.stages().size() - 1).trace();
    return last.statorAmps()[last.last()];
  }

  private static double never() {
    return Double.POSITIVE_INFINITY;
  }
}
