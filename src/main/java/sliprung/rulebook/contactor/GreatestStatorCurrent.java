package sliprung.rulebook.contactor;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Optional;
import java.util.Set;
import sliprung.machine.OperatingPoint;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Duty;

/**
 * The greatest stator current that a stop, by hand or by a device, may have to break: over every
 * permitted start, its running, every failed start until it is cleared, a rotor at rest with rings
 * shorted, and the operations of the duty.
 *
 * @param amps RMS
 * @param powerFactor at the motor's terminals then
 * @param start the start that decided
 * @param when in words, such as {@code at the beginning of step 3, hot start}
 */
record GreatestStatorCurrent(double amps, double powerFactor, ComputedStart start, String when) {

  /** Over all of it; empty where nothing was computed. */
  static Optional<GreatestStatorCurrent> of(Facts facts) {
    Optional<GreatestStatorCurrent> greatest = Optional.empty();
    // the starts of a series share one history, and nothing cuts a permitted one short
    Set<StartHistory> permitted = Collections.newSetFromMap(new IdentityHashMap<>());
    for (ComputedStart start : facts.starts()) {
      if (start.scenario().isFault() || permitted.add(start.history())) {
        greatest = greater(greatest, in(facts, start));
      }
    }
    // A rotor that jams while running meets the last step's circuit at rest, whatever is
    // interlocked.
    greatest =
        greater(
            greatest,
            StandstillCurrent.ringsShorted(facts).map(s -> of(s, "jammed with rings shorted")));
    greatest = greater(greatest, operation(facts, facts.starter().duty().inching(), "inching", 1));
    return greater(greatest, operation(facts, facts.starter().duty().plugging(), "plugging", 2));
  }

  private static Optional<GreatestStatorCurrent> operation(
      Facts facts, Optional<Duty.Repeated> operation, String word, double slip) {
    return operation
        .filter(o -> o.perHour() > 0.0)
        .flatMap(o -> StandstillCurrent.on(facts, o.step(), slip))
        .map(s -> of(s, word));
  }

  private static GreatestStatorCurrent of(StandstillCurrent current, String when) {
    return new GreatestStatorCurrent(current.amps(), current.powerFactor(), current.start(), when);
  }

  private static Optional<GreatestStatorCurrent> greater(
      Optional<GreatestStatorCurrent> one, Optional<GreatestStatorCurrent> other) {
    if (one.isEmpty() || other.isEmpty()) {
      return one.isPresent() ? one : other;
    }
    return other.get().amps() > one.get().amps() ? other : one;
  }

  /** The greatest of one start until it is cleared; one sample past the clearing counts too. */
  private static Optional<GreatestStatorCurrent> in(Facts facts, ComputedStart start) {
    double end =
        start.scenario().isFault()
            ? Exposure.of(facts, start).clearedAtSeconds()
            : Double.POSITIVE_INFINITY;
    Stage stage = null;
    OperatingPoint greatest = null;
    for (Stage candidate : start.history().everything()) {
      Trace trace = candidate.trace();
      for (int i = 0; i < trace.size(); i++) {
        boolean beyond = (i == 0 ? candidate.fromSeconds() : trace.seconds()[i - 1]) > end;
        if (beyond) {
          break;
        }
        // capacities are RMS figures: without the offset that samples of a transient hold
        OperatingPoint point =
            facts
                .machine()
                .at(
                    start.history().conditions().source(),
                    candidate.externalOhms(),
                    facts.machine().slip(trace.speed()[i]));
        if (greatest == null || point.statorAmps() > greatest.statorAmps()) {
          greatest = point;
          stage = candidate;
        }
      }
    }
    if (greatest == null) {
      return Optional.empty();
    }
    boolean isRunning =
        start.history().running().isPresent() && stage == start.history().running().get();
    return Optional.of(
        new GreatestStatorCurrent(
            greatest.statorAmps(),
            greatest.powerFactor(),
            start,
            isRunning ? "running" : start.words() + ", on step " + stage.step()));
  }
}
