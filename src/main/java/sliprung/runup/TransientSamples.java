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
  private static final double CHANGE = 1e-4;

  private static final int MOST_PIECES = 64;
  private static final double RMS = Math.sqrt(2.0);

  private final Circumstance circumstance;
  private final FluxModel model;
  private final CycleMean cycles;
  private final TraceBuilder trace = new TraceBuilder();
  private final double[] early = new double[FluxModel.STATES];
  private final double[] late = new double[FluxModel.STATES];
  private final double[] within = new double[FluxModel.STATES];
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

  /**
   * One instant: the state and the components of both currents, peak A.
   *
   * @param statorSquare squared magnitude, A²
   * @param ringSquare likewise
   */
  private record Sample(
      double time, double[] state, double[] currents, double statorSquare, double ringSquare) {}

  private Sample sample(double time, double[] state) {
    if (state[FluxModel.SPEED] < 0.0 && !circumstance.active()) {
      // what the error of a step leaves of a rotor that a passive load holds at rest
      state[FluxModel.SPEED] = 0.0;
    }
    double[] c = {
      model.statorReal(state),
      model.statorImaginary(state),
      model.ringReal(state),
      model.ringImaginary(state)
    };
    return new Sample(time, state, c, c[0] * c[0] + c[1] * c[1], c[2] * c[2] + c[3] * c[3]);
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
    double half = 0.5 * (to - from);
    solution.at(from + 0.5 * half, early);
    Sample middle = sample(from + half, solution.at(from + half));
    solution.at(from + 1.5 * half, late);
    Sample end = sample(to, solution.at(to));
    int pieces = pieces(last, middle, end);
    Sample between = null;
    for (int i = 1; i <= 2 * pieces; i++) {
      double at = from + half * i / pieces;
      Sample here = i == 2 * pieces ? end : i == pieces ? middle : sample(at, solution.at(at));
      if (i % 2 == 1) {
        between = here;
      } else {
        piece(last, between, here);
      }
    }
    double spacing = half / pieces;
    stator.refine(from, to, spacing, t -> model.statorAmps(within(solution, t)) * RMS);
    ring.refine(from, to, spacing, t -> model.ringAmps(within(solution, t)) * RMS);
    torque.refine(from, to, spacing, t -> model.torque(within(solution, t)));
    backTorque.refine(from, to, spacing, t -> -model.torque(within(solution, t)));
  }

  private double[] within(SystemFlow.Dense solution, double time) {
    solution.at(time, within);
    return within;
  }

  /** As many as Simpson's rule needs, whose error goes with the fourth power of the length. */
  private int pieces(Sample first, Sample middle, Sample end) {
    double change =
        Math.max(
            change(
                first.statorSquare,
                square(model.statorReal(early), model.statorImaginary(early)),
                middle.statorSquare,
                square(model.statorReal(late), model.statorImaginary(late)),
                end.statorSquare),
            change(
                first.ringSquare,
                square(model.ringReal(early), model.ringImaginary(early)),
                middle.ringSquare,
                square(model.ringReal(late), model.ringImaginary(late)),
                end.ringSquare));
    int pieces = 1;
    while (change > CHANGE && pieces < MOST_PIECES) {
      pieces *= 2;
      change /= 16.0;
    }
    return pieces;
  }

  private static double square(double real, double imaginary) {
    return real * real + imaginary * imaginary;
  }

  /** By how much the integral changes when the piece is halved, over itself. */
  private static double change(double a, double b, double c, double d, double e) {
    double coarse = (a + 4.0 * c + e) / 6.0;
    double fine = (a + 4.0 * b + 2.0 * c + 4.0 * d + e) / 12.0;
    return Math.abs(coarse - fine) / Math.max(fine, Double.MIN_NORMAL);
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
    double statorPeak = Math.sqrt(sample.statorSquare);
    double ringPeak = Math.sqrt(sample.ringSquare);
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
