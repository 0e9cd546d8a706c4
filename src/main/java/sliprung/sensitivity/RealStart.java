package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
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

  /** The worst of computed less the least that agrees, per unit of its accuracy. */
  private double shortfall(double inertia, double torque) {
    return computed(inertia, torque).stream().mapToDouble(c -> c.off() + 1.0).min().orElseThrow();
  }

  /** The worst of computed less the greatest that agrees, per unit of its accuracy. */
  private double excess(double inertia, double torque) {
    return computed(inertia, torque).stream().mapToDouble(c -> c.off() - 1.0).max().orElseThrow();
  }

  private record Compared(double computed, double read, double accuracy) {
    double off() {
      return (computed - read) / accuracy;
    }
  }

  private List<Compared> computed(double inertia, double torque) {
    double motor = starter.motor().inertia();
    double driven = starter.load().inertia();
    double factor = (motor + inertia * driven) / (motor + driven);
    StartHistory start =
        simulator.run(
            Scenario.PERMITTED, new Conditions(source, torque, 1.0, 1.0, 1.0, factor, List.of()));
    List<Compared> all = new ArrayList<>();
    readings
        .runUpSeconds()
        .ifPresent(
            s ->
                all.add(
                    new Compared(start.runUpSeconds().orElse(NEVER), s, readings.clockSeconds())));
    for (Map.Entry<String, Double> e : readings.ampsBefore().entrySet()) {
      all.add(
          new Compared(
              ampsBefore(start, e.getKey()), e.getValue(), readings.clamp() * e.getValue()));
    }
    return all;
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
