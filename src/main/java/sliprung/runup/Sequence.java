package sliprung.runup;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import sliprung.machine.Machine;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/**
 * The step contactors as wired: who is told to close when, which fails, which sections are in.
 *
 * <p>A contactor closes by its rule plus its own closing time. Chained: a step's rule counts from
 * the main contacts of the closing before; cascaded: from the moment the rule before was met, so
 * that closing times do not add up. A level already met at entry counts after the least dwell,
 * never in the first 100 ms after a closing, while the current builds up.
 */
final class Sequence {
  private static final double CURRENT_BUILDS_UP_SECONDS = 0.1;

  private final Starter starter;
  private final Scenario scenario;
  private final Conditions conditions;
  private final double frequency;
  private final List<Pending> pending = new ArrayList<>();
  private final List<Integer> sectionsIn = new ArrayList<>();
  private int next;
  private boolean armed = true;
  private double reference;
  private double lastClosing;
  private OptionalDouble lastStepSeconds = OptionalDouble.empty();
  private int step = 1;

  private record Pending(double atSeconds, int index) {}

  Sequence(Starter starter, Scenario scenario, Conditions conditions) {
    this.starter = starter;
    this.scenario = scenario;
    this.conditions = conditions;
    this.frequency = starter.supply().frequency();
    for (int i = 1; i <= starter.sectionCount(); i++) {
      sectionsIn.add(i);
    }
    switch (scenario.kind()) {
      case WELDED -> weld(scenario.step() - 1);
      case RINGS_SHORTED_START -> weld(starter.sectionCount() - 1);
      case RECLOSED -> closeEverything();
      default -> {
        // every step contactor is open when the line contactor closes
      }
    }
  }

  /** A welded contactor is closed from the beginning; nothing in the wiring notices. */
  private void weld(int index) {
    cutOutBy(index);
    if (starter.resistors().cutOut() == ResistorBank.CutOut.STAR_POINT) {
      step = index + 2;
    }
    if (index == starter.steps().size() - 1) {
      lastStepSeconds = OptionalDouble.of(0.0);
    }
  }

  private void closeEverything() {
    sectionsIn.clear();
    next = starter.steps().size();
    step = starter.sectionCount() + 1;
    lastStepSeconds = OptionalDouble.of(0.0);
  }

  List<Integer> sectionsIn() {
    return List.copyOf(sectionsIn);
  }

  int step() {
    return step;
  }

  /** When the contactor of the last step was first closed, s from line closing; empty: never. */
  OptionalDouble lastStepSeconds() {
    return lastStepSeconds;
  }

  /** Whether a rule is being waited for. */
  private boolean waiting() {
    return armed && next < starter.steps().size() && !frozenAt(next);
  }

  private boolean frozenAt(int index) {
    boolean freezes =
        scenario.kind() == Scenario.Kind.HELD || scenario.kind() == Scenario.Kind.LOCKED_STEP;
    return freezes && scenario.step() == index + 1;
  }

  private Step current() {
    return starter.steps().get(next);
  }

  /**
   * When the next closing or timer is due; infinite where only a level or nothing is waited for.
   */
  double nextTimeSeconds() {
    double due =
        pending.stream().mapToDouble(Pending::atSeconds).min().orElse(Double.POSITIVE_INFINITY);
    if (waiting() && current().rule() instanceof Step.After after) {
      due = Math.min(due, reference + after.seconds() * conditions.timerFactor(next + 1));
    }
    return due;
  }

  /** Whether a level is being waited for. */
  boolean waitsForLevel() {
    return waiting() && current().rule().isLevel();
  }

  /** From when on the level counts, s. */
  double levelFromSeconds() {
    return Math.max(
        reference + current().atLeastSeconds() * conditions.timerFactor(next + 1),
        lastClosing + CURRENT_BUILDS_UP_SECONDS);
  }

  /** Number of the step whose level is waited for, from 1. */
  int levelStep() {
    return next + 1;
  }

  /** What is measured minus the level: the level is met at 0 and below. */
  Level aboveLevel(Machine machine) {
    Step.ClosingRule rule = current().rule();
    if (rule instanceof Step.RotorFrequencyBelow below) {
      double level = below.hertz() * conditions.levelFactor(next + 1);
      return Level.ofSpeed(w -> Math.abs(machine.slip(w)) * frequency - level);
    }
    boolean stator = rule instanceof Step.StatorBelow;
    double amps = stator ? ((Step.StatorBelow) rule).amps() : ((Step.RotorBelow) rule).amps();
    double level = amps * conditions.levelFactor(next + 1);
    return (speed, statorAmps, ringAmps) -> (stator ? statorAmps : ringAmps) - level;
  }

  /** The level is met now. */
  void levelMet(double atSeconds) {
    fire(atSeconds);
  }

  /**
   * Acts on what is due now.
   *
   * @return the index of the contactor whose main contacts close now, if any
   */
  OptionalInt act(double now) {
    if (waiting()
        && current().rule() instanceof Step.After after
        && reference + after.seconds() * conditions.timerFactor(next + 1) <= now) {
      fire(now);
    }
    pending.sort(Comparator.comparingDouble(Pending::atSeconds).thenComparingInt(Pending::index));
    if (pending.isEmpty() || pending.get(0).atSeconds() > now) {
      return OptionalInt.empty();
    }
    int index = pending.remove(0).index();
    close(index, now);
    return OptionalInt.of(index);
  }

  private void fire(double now) {
    int index = next;
    boolean fails = scenario.kind() == Scenario.Kind.SKIPPED && scenario.step() == index + 1;
    if (!fails) {
      pending.add(new Pending(now + closingSeconds(index), index));
    }
    if (starter.sequence() == Starter.Sequence.CASCADED) {
      next++;
      reference = now;
    } else {
      armed = false;
    }
  }

  private double closingSeconds(int index) {
    return starter.contactor(starter.steps().get(index).contactor()).orElseThrow().closingSeconds();
  }

  private void close(int index, double now) {
    cutOutBy(index);
    step = Math.max(step, index + 2);
    lastClosing = now;
    if (index == starter.steps().size() - 1 && lastStepSeconds.isEmpty()) {
      lastStepSeconds = OptionalDouble.of(now);
    }
    if (starter.sequence() == Starter.Sequence.CHAINED) {
      armed = true;
      next = index + 1;
      reference = now;
    }
  }

  private void cutOutBy(int index) {
    if (starter.resistors().cutOut() == ResistorBank.CutOut.STAR_POINT) {
      sectionsIn.removeIf(section -> section <= index + 1);
    } else {
      sectionsIn.remove(Integer.valueOf(index + 1));
    }
  }
}
