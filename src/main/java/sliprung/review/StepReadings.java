package sliprung.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/**
 * What a technician's meters show step by step in the nominal cold start, and what they show when
 * one step contactor does not close.
 *
 * @param normal every step of the good start, in order
 * @param leftOut for every step contactor and load what its failing looks like
 */
public record StepReadings(List<Step> normal, List<LeftOut> leftOut) {

  /** Rotor frequency in Hz below which a current transformer reads too little. */
  public static final double LEAST_CT_HERTZ = 5.0;

  /** Share of the last reading within which a reading counts as steady. */
  private static final double STEADY = 0.02;

  /**
   * Meter readings at one instant.
   *
   * @param seconds from line closing
   * @param speed rad/s
   * @param statorAmps RMS
   * @param ringAmps RMS
   * @param rotorHertz slip frequency
   * @param ringVolts between two slip rings, RMS: what the ring current drops over the resistance
   *     outside the winding
   */
  public record Reading(
      double seconds,
      double speed,
      double statorAmps,
      double ringAmps,
      double rotorHertz,
      double ringVolts) {}

  /**
   * One step of the good start.
   *
   * @param step from 1
   * @param closedBy tag of the contactor whose closing began it
   * @param begins just after that closing
   * @param ends just before the next
   * @param settled it does not end: the motor runs
   */
  public record Step(int step, String closedBy, Reading begins, Reading ends, boolean settled) {}

  /**
   * One contactor that does not close.
   *
   * @param contactor tag
   * @param start the computed fault
   * @param next after a skipped step: just after the next closing; empty where the sequence stops
   * @param read once the stator current stays within 2 % of its last value, or just before the
   *     circuit is opened if that comes first
   * @param hangs where it settles at last if nothing opens
   * @param clearing slow-edge response of the device that clears it, if any
   */
  public record LeftOut(
      String contactor,
      ComputedStart start,
      Optional<Reading> next,
      Reading read,
      Reading hangs,
      Optional<DeviceResponse> clearing) {

    /** Whether the circuit opens before the readings are steady. */
    public boolean opensFirst() {
      return clearing.filter(c -> c.clearsAtSeconds() <= read.seconds()).isPresent();
    }
  }

  /** Copies the lists. */
  public StepReadings {
    normal = List.copyOf(normal);
    leftOut = List.copyOf(leftOut);
  }

  /** Of a review. */
  public static StepReadings of(Review review) {
    List<Step> normal = new ArrayList<>();
    Optional<ComputedStart> cold = review.start("cold");
    if (cold.isPresent()) {
      for (Stage stage : cold.get().history().stages()) {
        normal.add(
            new Step(
                stage.step(),
                stage.closedBy(),
                reading(review, stage, 0),
                reading(review, stage, stage.trace().last()),
                stage.settled()));
      }
    }
    Facts facts = ReviewFacts.of(review);
    List<LeftOut> leftOut = new ArrayList<>();
    for (Scenario.Kind kind : List.of(Scenario.Kind.HELD, Scenario.Kind.SKIPPED)) {
      for (int k = 1; k <= review.starter().sectionCount(); k++) {
        for (Scenario.LoadMode load : Scenario.LoadMode.values()) {
          review
              .start(new Scenario(kind, k, load).id())
              .map(s -> leftOut(review, facts, s))
              .filter(StepReadings::isReached)
              .ifPresent(leftOut::add);
        }
      }
    }
    return new StepReadings(normal, leftOut);
  }

  /** Whether the last stage, in which a running load is put on, is reached before the opening. */
  private static boolean isReached(LeftOut row) {
    List<Stage> stages = row.start().history().stages();
    double from = stages.get(stages.size() - 1).fromSeconds();
    return row.start().scenario().load() == Scenario.LoadMode.START
        || row.clearing().filter(c -> c.clearsAtSeconds() <= from).isEmpty();
  }

  private static LeftOut leftOut(Review review, Facts facts, ComputedStart start) {
    List<Stage> stages = start.history().stages();
    Stage last = stages.get(stages.size() - 1);
    int failed = start.scenario().step();
    Optional<Reading> next = Optional.empty();
    if (start.scenario().kind() == Scenario.Kind.SKIPPED) {
      next =
          stages.stream()
              .filter(s -> s.step() > failed + 1)
              .findFirst()
              .map(s -> reading(review, s, 0));
    }
    Optional<DeviceResponse> clearing = Exposure.of(facts, start).clearing();
    double opens = clearing.map(DeviceResponse::clearsAtSeconds).orElse(Double.POSITIVE_INFINITY);
    return new LeftOut(
        review.starter().steps().get(failed - 1).contactor(),
        start,
        next,
        at(review, stages, Math.min(steady(stages), opens)),
        reading(review, last, last.trace().last()),
        clearing);
  }

  /** Readings at a time, those of the sample at or just before it. */
  private static Reading at(Review review, List<Stage> stages, double seconds) {
    Stage stage = stages.get(0);
    for (Stage candidate : stages) {
      if (candidate.fromSeconds() <= seconds) {
        stage = candidate;
      }
    }
    double[] times = stage.trace().seconds();
    int i = 0;
    while (i < stage.trace().last() && times[i + 1] <= seconds) {
      i++;
    }
    Reading sample = reading(review, stage, i);
    return new Reading(
        seconds,
        sample.speed(),
        sample.statorAmps(),
        sample.ringAmps(),
        sample.rotorHertz(),
        sample.ringVolts());
  }

  private static double steady(List<Stage> stages) {
    Trace last = stages.get(stages.size() - 1).trace();
    double end = last.statorAmps()[last.last()];
    double from = 0.0;
    for (Stage stage : stages) {
      Trace trace = stage.trace();
      for (int i = 0; i < trace.last(); i++) {
        if (Math.abs(trace.statorAmps()[i] - end) > STEADY * end) {
          from = trace.seconds()[i + 1];
        }
      }
    }
    return from;
  }

  private static Reading reading(Review review, Stage stage, int i) {
    Trace trace = stage.trace();
    double slip = review.machine().slip(trace.speed()[i]);
    return new Reading(
        trace.seconds()[i],
        trace.speed()[i],
        trace.statorAmps()[i],
        trace.ringAmps()[i],
        Math.abs(slip) * review.starter().supply().frequency(),
        Math.sqrt(3.0) * trace.ringAmps()[i] * stage.externalOhms());
  }
}
