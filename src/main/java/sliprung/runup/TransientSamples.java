package sliprung.runup;

import java.util.Optional;
import sliprung.machine.FluxModel;
import sliprung.numeric.SystemFlow;

/**
 * Samples of one stage of a transient: as close as Simpson's rule needs for the squares of both
 * currents, and the peaks met.
 */
final class TransientSamples implements SystemFlow.Steps {
  /** Greatest share by which halving a piece may change the integral of a squared current. */
  private static final double CHANGE = 1e-6;

  private static final int MOST_HALVINGS = 6;
  private static final double RMS = Math.sqrt(2.0);

  private final Circumstance circumstance;
  private final FluxModel model;
  private final CycleMean cycles;
  private final TraceBuilder trace = new TraceBuilder();
  private final PeakTracker stator = new PeakTracker();
  private final PeakTracker ring = new PeakTracker();
  private final PeakTracker torque = new PeakTracker();
  private final PeakTracker backTorque = new PeakTracker();
  private double statorRms;
  private double ringRms;
  private Sample last;

  TransientSamples(Circumstance circumstance, FluxModel model, CycleMean cycles) {
    this.circumstance = circumstance;
    this.model = model;
    this.cycles = cycles;
  }

  /** One instant. */
  private record Sample(double time, double[] state, double[] currents, double[] squares) {}

  private Sample sample(double time, double[] state) {
    double[] currents = {
      model.statorReal(state),
      model.statorImaginary(state),
      model.ringReal(state),
      model.ringImaginary(state)
    };
    return new Sample(
        time,
        state,
        currents,
        new double[] {
          currents[0] * currents[0] + currents[1] * currents[1],
          currents[2] * currents[2] + currents[3] * currents[3]
        });
  }

  /** Motion begins at a state. */
  void begin(double time, double[] state) {
    last = sample(time, state.clone());
    if (trace.isEmpty()) {
      append(last);
    }
  }

  @Override
  public void step(double from, double to, SystemFlow.Dense solution) {
    if (to <= from) {
      return;
    }
    Sample first = last;
    Sample end = sample(to, solution.at(to));
    Sample middle = sample(0.5 * (from + to), solution.at(0.5 * (from + to)));
    halve(first, middle, end, solution, 0);
  }

  private void halve(
      Sample first, Sample middle, Sample end, SystemFlow.Dense solution, int halvings) {
    double left = 0.5 * (first.time + middle.time);
    double right = 0.5 * (middle.time + end.time);
    if (left <= first.time || right >= end.time) {
      piece(first, middle, end);
      return;
    }
    Sample leftMiddle = sample(left, solution.at(left));
    Sample rightMiddle = sample(right, solution.at(right));
    if (halvings >= MOST_HALVINGS
        || (smooth(first, leftMiddle, middle, rightMiddle, end, 0)
            && smooth(first, leftMiddle, middle, rightMiddle, end, 1))) {
      piece(first, middle, end);
      return;
    }
    halve(first, leftMiddle, middle, solution, halvings + 1);
    halve(middle, rightMiddle, end, solution, halvings + 1);
  }

  private static boolean smooth(Sample a, Sample b, Sample c, Sample d, Sample e, int k) {
    double coarse = (a.squares[k] + 4.0 * c.squares[k] + e.squares[k]) / 6.0;
    double fine =
        (a.squares[k] + 4.0 * b.squares[k] + 2.0 * c.squares[k] + 4.0 * d.squares[k] + e.squares[k])
            / 12.0;
    return Math.abs(coarse - fine) <= CHANGE * fine;
  }

  private void piece(Sample first, Sample middle, Sample end) {
    append(middle);
    append(end);
    cycles.add(end.time - first.time, first.currents, middle.currents, end.currents);
    statorRms = Math.max(statorRms, cycles.rms(0));
    ringRms = Math.max(ringRms, cycles.rms(2));
    last = end;
  }

  /** Everything stays as it is until a time. */
  void constant(double from, double to, double[] state) {
    piece(from, state, 0.5 * (from + to), state, to, state);
  }

  /** A piece of motion by its beginning, its middle in time and its end. */
  void piece(
      double from, double[] first, double halfway, double[] middle, double to, double[] end) {
    begin(from, first);
    piece(last, sample(halfway, middle), sample(to, end));
  }

  private void append(Sample sample) {
    double[] state = sample.state;
    double speed = state[FluxModel.SPEED];
    double statorPeak = Math.sqrt(sample.squares[0]);
    double ringPeak = Math.sqrt(sample.squares[1]);
    double newtonMetres = model.torque(state);
    FluxModel.Terminals terminals = model.terminals(state);
    trace.append(
        sample.time,
        speed,
        statorPeak / RMS,
        ringPeak / RMS,
        newtonMetres,
        circumstance.loadTorque().applyAsDouble(speed),
        terminals.volts(),
        terminals.inputWatts());
    stator.add(sample.time, statorPeak);
    ring.add(sample.time, ringPeak);
    torque.add(sample.time, newtonMetres);
    backTorque.add(sample.time, -newtonMetres);
  }

  Trace trace() {
    return trace.build();
  }

  Optional<ClosingPeak> peak() {
    return Optional.of(
        new ClosingPeak(
            stator.value(),
            stator.time(),
            ring.value(),
            torque.value(),
            torque.time(),
            -backTorque.value(),
            statorRms,
            ringRms));
  }
}
