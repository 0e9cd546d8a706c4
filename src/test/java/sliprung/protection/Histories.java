package sliprung.protection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.machine.Source;
import sliprung.runup.Conditions;
import sliprung.runup.Outcome;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/** Histories made by hand, of stages of constant current. */
final class Histories {
  private static final Conditions NOMINAL = new Conditions(new Source(500, 0), 1, 1, 1, 1);

  private final List<Stage> stages = new ArrayList<>();
  private Stage running;
  private double at;

  private Histories() {}

  static Histories start() {
    return new Histories();
  }

  /** One more stage at a constant speed. */
  Histories stage(
      double seconds, List<Integer> sectionsIn, double statorAmps, double ringAmps, double speed) {
    stages.add(constant(seconds, sectionsIn, statorAmps, ringAmps, speed));
    return this;
  }

  /** Half an hour of running after the start. */
  Histories running(double statorAmps, double ringAmps, double speed) {
    running = constant(StartHistory.HORIZON_SECONDS, List.of(), statorAmps, ringAmps, speed);
    return this;
  }

  private Stage constant(
      double seconds, List<Integer> sectionsIn, double statorAmps, double ringAmps, double speed) {
    double from = at;
    at += seconds;
    double[] times = {from, from + 0.5 * seconds, at};
    double[] zero = new double[3];
    Trace trace =
        new Trace(times, same(speed), same(statorAmps), same(ringAmps), zero, zero, zero, zero);
    return new Stage(
        stages.size() + 1, sectionsIn, 0.0, from, at, true, "K1" + stages.size(), trace);
  }

  private static double[] same(double value) {
    double[] values = new double[3];
    Arrays.fill(values, value);
    return values;
  }

  /** A permitted start whose last step closed and which ran up at the end of its stages. */
  StartHistory permitted() {
    double end = running == null ? at : running.fromSeconds();
    return new StartHistory(
        Scenario.PERMITTED,
        NOMINAL,
        Outcome.RUNNING,
        stages,
        Optional.ofNullable(running),
        OptionalDouble.of(stages.get(stages.size() - 1).fromSeconds()),
        OptionalDouble.of(end),
        0);
  }

  /** A start held on step 1 in which no last step ever closes. */
  StartHistory held() {
    return new StartHistory(
        new Scenario(Scenario.Kind.HELD, 1, Scenario.LoadMode.START),
        NOMINAL,
        Outcome.HELD,
        stages,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }

  /** A locked rotor. */
  StartHistory locked() {
    return new StartHistory(
        new Scenario(Scenario.Kind.LOCKED, 0, Scenario.LoadMode.START),
        NOMINAL,
        Outcome.LOCKED,
        stages,
        Optional.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0);
  }
}
