package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.numeric.Root;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.sensitivity.Narrowed.Span;
import sliprung.starter.Readings;
import sliprung.starter.Starter;
import sliprung.tolerance.Corners;

/**
 * A start that was read, computed for other inertia and load. More inertia at the same load never
 * shortens a start nor lowers a current before a closing, so what agrees at one load is a span of
 * inertia, and each end of it is a root.
 */
final class RealStart {
  /** Of a reading that never comes: any real one is less. */
  private static final double NEVER = 1e9;

  private static final double ACCURACY = 1e-4;

  private final Starter starter;
  private final Readings readings;
  private final StartSimulator simulator;
  private final Source source;

  RealStart(Starter starter, Readings readings, Machine machine) {
    this.starter = starter;
    this.readings = readings;
    this.simulator = new StartSimulator(starter, machine);
    double reactance =
        Corners.source(starter.supply(), readings.volts() / starter.supply().voltage()).reactance();
    this.source = new Source(readings.volts(), reactance);
  }

  /** Factors on the load's inertia, within a span, that agree with what was read while starting. */
  Optional<Span> inertia(double torqueFactor, Span within) {
    Optional<Double> least =
        least(j -> shortfall(j, torqueFactor), within).filter(j -> j <= within.high());
    Optional<Double> greatest = greatest(j -> excess(j, torqueFactor), within);
    return least.isPresent() && greatest.isPresent() && least.get() <= greatest.get()
        ? Optional.of(new Span(least.get(), greatest.get()))
        : Optional.empty();
  }

  /** Factors on the running torque, within a span, that agree with the running current. */
  Optional<Span> running(Span within) {
    double amps = readings.runningAmps().orElseThrow();
    Optional<Double> least = least(f -> runningAmps(f) - amps * (1.0 - readings.clamp()), within);
    Optional<Double> greatest =
        greatest(f -> runningAmps(f) - amps * (1.0 + readings.clamp()), within);
    return least.isPresent() && greatest.isPresent() && least.get() <= greatest.get()
        ? Optional.of(new Span(least.get(), greatest.get()))
        : Optional.empty();
  }

  /** The least argument at which a rising function is not below 0. */
  private static Optional<Double> least(DoubleUnaryOperator rising, Span within) {
    if (rising.applyAsDouble(within.low()) >= 0.0) {
      return Optional.of(within.low());
    }
    return rising.applyAsDouble(within.high()) < 0.0
        ? Optional.empty()
        : Optional.of(Root.find(rising, within.low(), within.high(), ACCURACY));
  }

  /** The greatest argument at which a rising function is not above 0. */
  private static Optional<Double> greatest(DoubleUnaryOperator rising, Span within) {
    if (rising.applyAsDouble(within.high()) <= 0.0) {
      return Optional.of(within.high());
    }
    return rising.applyAsDouble(within.low()) > 0.0
        ? Optional.empty()
        : Optional.of(Root.find(rising, within.low(), within.high(), ACCURACY));
  }

  /** The worst of what could have been read less the least that agrees, in accuracies. */
  private double shortfall(double inertia, double torque) {
    return compared(inertia, torque).stream().mapToDouble(c -> c.most() + 1.0).min().orElseThrow();
  }

  /** The worst of what could have been read less the greatest that agrees, in accuracies. */
  private double excess(double inertia, double torque) {
    return compared(inertia, torque).stream().mapToDouble(c -> c.least() - 1.0).max().orElseThrow();
  }

  /**
   * Computed less read, in accuracies of the reading.
   *
   * @param least with timers and levels of either side
   * @param most likewise
   */
  private record Compared(double least, double most) {
    static Compared of(double read, double accuracy, double early, double late) {
      return new Compared(
          (Math.min(early, late) - read) / accuracy, (Math.max(early, late) - read) / accuracy);
    }
  }

  /** Timers and levels were somewhere in their spread: each reading may have them at either end. */
  private List<Compared> compared(double inertia, double torque) {
    StartHistory early = start(inertia, torque, -1.0);
    StartHistory late =
        starter.timerSpread() == 0.0 && starter.levelSpread() == 0.0
            ? early
            : start(inertia, torque, 1.0);
    List<Compared> all = new ArrayList<>();
    readings
        .runUpSeconds()
        .ifPresent(
            s ->
                all.add(
                    Compared.of(
                        s,
                        readings.clockSeconds(),
                        early.runUpSeconds().orElse(NEVER),
                        late.runUpSeconds().orElse(NEVER))));
    readings
        .ampsBefore()
        .forEach(
            (tag, amps) ->
                all.add(
                    Compared.of(
                        amps,
                        readings.clamp() * amps,
                        ampsBefore(early, tag),
                        ampsBefore(late, tag))));
    return all;
  }

  private StartHistory start(double inertia, double torque, double lateness) {
    double motor = starter.motor().inertia();
    double driven = starter.load().inertia();
    double factor = (motor + inertia * driven) / (motor + driven);
    return simulator.run(
        Scenario.PERMITTED,
        new Conditions(
            source,
            torque,
            1.0,
            1.0 + lateness * starter.timerSpread(),
            1.0 - lateness * starter.levelSpread(),
            factor,
            List.of()));
  }

  private static double ampsBefore(StartHistory start, String contactor) {
    for (int i = 1; i < start.stages().size(); i++) {
      if (start.stages().get(i).closedBy().equals(contactor)) {
        Stage before = start.stages().get(i - 1);
        return before.trace().statorAmps()[before.trace().last()];
      }
    }
    return NEVER;
  }

  private double runningAmps(double factor) {
    return simulator
        .runningPoint(new Conditions(source, factor, 1.0, 1.0, 1.0))
        .map(r -> r.point().statorAmps())
        .orElse(NEVER);
  }
}
