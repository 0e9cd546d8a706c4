package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import sliprung.machine.Source;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Conditions;
import sliprung.runup.Outcome;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartSimulator;
import sliprung.runup.Trace;
import sliprung.starter.Load;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/**
 * Torque against speed: what the motor gives on each step, what the load takes, and the way the
 * nominal cold start goes between them. Rated volts, nominal values.
 *
 * @param steps a curve for each step, rpm across, N·m up; the last with the rings shorted
 * @param load nominal starting torque of the load
 * @param loadLow with the lower spread
 * @param loadHigh with the upper spread
 * @param breakawayTorque of the load, N·m
 * @param path of the start
 * @param hangs where it settles if a step's contactor stays open
 * @param runningHangs the same at running load
 * @param runningTorque of the load when running, N·m
 * @param ratedTorque N·m
 * @param says what to see
 */
public record TorqueSpeed(
    List<StepCurve> steps,
    Curve load,
    Curve loadLow,
    Curve loadHigh,
    double breakawayTorque,
    Curve path,
    List<Hang> hangs,
    List<Hang> runningHangs,
    double runningTorque,
    double ratedTorque,
    String says) {
  private static final double RPM = 30.0 / Math.PI;
  private static final int POINTS = 240;
  private static final double BEYOND = 1.02;

  /**
   * A step.
   *
   * @param label such as {@code step 2}
   * @param curve rpm across, N·m up
   */
  public record StepCurve(String label, Curve curve) {}

  /**
   * Where a start hangs.
   *
   * @param step whose contactor stays open
   * @param rpm settled
   * @param torque N·m there
   */
  public record Hang(int step, double rpm, double torque) {}

  /** Copies the lists. */
  public TorqueSpeed {
    steps = List.copyOf(steps);
    hangs = List.copyOf(hangs);
    runningHangs = List.copyOf(runningHangs);
  }

  /** Of a review; empty where the nominal cold start was not computed. */
  public static Optional<TorqueSpeed> of(Review review) {
    return review.start("cold").map(cold -> of(review, cold));
  }

  private static TorqueSpeed of(Review review, ComputedStart cold) {
    Conditions nominal = Corners.conditions(review.starter(), Corner.NOMINAL);
    double synchronous = review.machine().synchronousSpeed();
    Curve path = path(cold);
    List<Hang> hangs = hangs(review, Scenario.LoadMode.START);
    List<Hang> running = hangs(review, Scenario.LoadMode.RUNNING);
    double least = 0.0;
    for (double rpm : path.across()) {
      least = Math.min(least, rpm);
    }
    for (Hang hang : hangs) {
      least = Math.min(least, hang.rpm());
    }
    for (Hang hang : running) {
      least = Math.min(least, hang.rpm());
    }
    double[] speeds = new double[POINTS + 1];
    for (int i = 0; i <= POINTS; i++) {
      // closer together near synchronous speed, where the last curves are steep
      double w = 1.0 - Math.pow(1.0 - (double) i / POINTS, 2.0);
      double from = least / RPM * BEYOND;
      speeds[i] = from + w * (synchronous - from);
    }
    Load load = review.starter().load();
    return new TorqueSpeed(
        steps(review, nominal, speeds),
        load(load, 1.0, synchronous, speeds),
        load(load, 1.0 + load.spreadLow(), synchronous, speeds),
        load(load, 1.0 + load.spreadHigh(), synchronous, speeds),
        load.breakawayTorque().orElse(load.torque().at(0.0)),
        path,
        hangs,
        running,
        new StartSimulator(review.starter(), review.machine()).runningTorque(nominal),
        review.starter().motor().ratedTorque(),
        says(cold, hangs, running));
  }

  private static List<StepCurve> steps(Review review, Conditions nominal, double[] speeds) {
    StartSimulator simulator = new StartSimulator(review.starter(), review.machine());
    Source source = nominal.source();
    int sections = review.starter().sectionCount();
    List<StepCurve> steps = new ArrayList<>();
    for (int step = 1; step <= sections + 1; step++) {
      List<Integer> in = IntStream.rangeClosed(step, sections).boxed().toList();
      double ohms = simulator.externalOhms(in, nominal);
      double[] rpm = new double[speeds.length];
      double[] torque = new double[speeds.length];
      for (int i = 0; i < speeds.length; i++) {
        rpm[i] = speeds[i] * RPM;
        torque[i] = review.machine().torque(source, ohms, review.machine().slip(speeds[i]));
      }
      steps.add(
          new StepCurve(step > sections ? "all cut out" : "step " + step, new Curve(rpm, torque)));
    }
    return steps;
  }

  private static Curve load(Load load, double factor, double synchronous, double[] speeds) {
    double[] rpm = new double[speeds.length];
    double[] torque = new double[speeds.length];
    for (int i = 0; i < speeds.length; i++) {
      rpm[i] = speeds[i] * RPM;
      torque[i] = load.torque().at(speeds[i] / synchronous) * factor;
    }
    return new Curve(rpm, torque);
  }

  private static Curve path(ComputedStart start) {
    List<double[]> points = new ArrayList<>();
    for (Stage stage : start.history().everything()) {
      Trace trace = stage.trace();
      for (int i = 0; i < trace.size(); i++) {
        points.add(new double[] {trace.speed()[i] * RPM, trace.torque()[i]});
      }
    }
    return new Curve(
        points.stream().mapToDouble(p -> p[0]).toArray(),
        points.stream().mapToDouble(p -> p[1]).toArray());
  }

  private static List<Hang> hangs(Review review, Scenario.LoadMode load) {
    List<Hang> hangs = new ArrayList<>();
    for (ComputedStart start : review.starts()) {
      boolean held =
          start.scenario().kind() == Scenario.Kind.HELD
              && start.scenario().load() == load
              && start.corner().isNominal()
              && start.circuit().isEmpty()
              && start.from() == ComputedStart.From.COLD
              && start.history().outcome() == Outcome.HELD;
      if (held) {
        Trace last = start.history().stages().get(start.history().stages().size() - 1).trace();
        int end = last.last();
        hangs.add(new Hang(start.scenario().step(), last.speed()[end] * RPM, last.torque()[end]));
      }
    }
    return hangs;
  }

  private static String says(ComputedStart cold, List<Hang> hangs, List<Hang> running) {
    String path =
        cold.history().runUpSeconds().isPresent()
            ? "The heavy line is the nominal cold start: it follows the curve of a step and goes up"
                + " to the next at each closing."
            : "The heavy line is the nominal cold start, which never runs up.";
    if (hangs.isEmpty()) {
      return path + " No step that stays in leaves the motor hanging at a steady speed.";
    }
    Hang slowest = hangs.get(0);
    Hang fastest = hangs.get(0);
    for (Hang hang : hangs) {
      slowest = hang.rpm() < slowest.rpm() ? hang : slowest;
      fastest = hang.rpm() > fastest.rpm() ? hang : fastest;
    }
    String at =
        slowest.step() == fastest.step()
            ? " at " + rpm(slowest) + " on step " + slowest.step() + "."
            : ": at "
                + rpm(slowest)
                + " on step "
                + slowest.step()
                + ", at "
                + rpm(fastest)
                + " on step "
                + fastest.step()
                + ".";
    return path
        + " If a contactor stays open the motor hangs where that step's curve meets the load"
        + at
        + (running.isEmpty() ? "" : " Diamonds: the same at running load.");
  }

  /** Speed of a hang in words. */
  static String rpm(Hang hang) {
    return Show.rpm(hang.rpm() / RPM);
  }
}
