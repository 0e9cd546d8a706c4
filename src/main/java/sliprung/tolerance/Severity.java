package sliprung.tolerance;

import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Starter;

/**
 * How hard a start is on what it passes through, in measures that devices and parts go by: run-up
 * time, the integrals of I² and I⁴ of the stator current (relays and fuses), of I² of the ring
 * current, and for each step the stator and ring current that its contactor closes onto, the time
 * spent before it, and the heat of the section it cuts out.
 */
final class Severity {
  private static final int OF_THE_START = 4;
  private static final int OF_A_STEP = 4;

  private Severity() {}

  /** Every measure of a permitted start; larger is worse. A start that fails is not measured. */
  static double[] of(Starter starter, StartHistory start) {
    int steps = starter.sectionCount();
    double[] measures = new double[OF_THE_START + OF_A_STEP * steps];
    if (start.runUpSeconds().isEmpty()) {
      return measures;
    }
    measures[0] = start.runUpSeconds().getAsDouble();
    for (Stage stage : start.stages()) {
      Trace trace = stage.trace();
      double ring = trace.integralOfSquare(trace.ringAmps());
      measures[1] += trace.integralOfSquare(trace.statorAmps());
      measures[2] += trace.integralOfSquare(squares(trace.statorAmps()));
      measures[3] += ring;
      for (int section : stage.sectionsIn()) {
        measures[at(section, 0)] += ring;
      }
      int closed = stage.step() - 1;
      if (closed >= 1 && closed <= steps) {
        measures[at(closed, 1)] = Math.max(measures[at(closed, 1)], stage.entry().statorAmps());
        measures[at(closed, 2)] = Math.max(measures[at(closed, 2)], stage.entry().ringAmps());
      }
      if (stage.step() <= steps) {
        measures[at(stage.step(), 3)] = stage.toSeconds() - stage.fromSeconds();
      }
    }
    return measures;
  }

  private static int at(int step, int measure) {
    return OF_THE_START + OF_A_STEP * (step - 1) + measure;
  }

  private static double[] squares(double[] values) {
    double[] squares = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      squares[i] = values[i] * values[i];
    }
    return squares;
  }
}
