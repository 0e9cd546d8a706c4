package sliprung.runup;

import java.util.Arrays;
import sliprung.machine.OperatingPoint;

/** Gathers the pieces of motion of one stage into a trace. */
final class TraceBuilder {
  private final Circumstance circumstance;
  private double[] seconds = new double[64];
  private double[][] rows = new double[7][64];
  private int count;

  TraceBuilder(Circumstance circumstance) {
    this.circumstance = circumstance;
  }

  boolean isEmpty() {
    return count == 0;
  }

  /** Appends motion; a piece without duration adds nothing. */
  void add(Circumstance.Motion motion) {
    if (motion.endTime() <= motion.times()[0]) {
      return;
    }
    for (int i = count == 0 ? 0 : 1; i < motion.times().length; i++) {
      append(motion.times()[i], motion.speeds()[i]);
    }
  }

  private void append(double time, double speed) {
    if (count == seconds.length) {
      seconds = Arrays.copyOf(seconds, 2 * count);
      for (int r = 0; r < rows.length; r++) {
        rows[r] = Arrays.copyOf(rows[r], 2 * count);
      }
    }
    OperatingPoint point = circumstance.at(speed);
    seconds[count] = time;
    rows[0][count] = speed;
    rows[1][count] = point.statorAmps();
    rows[2][count] = point.ringAmps();
    rows[3][count] = point.torque();
    rows[4][count] = circumstance.loadTorque().applyAsDouble(speed);
    rows[5][count] = point.terminalVolts();
    rows[6][count] = point.inputWatts();
    count++;
  }

  Trace build() {
    double[][] cut = new double[rows.length][];
    for (int r = 0; r < rows.length; r++) {
      cut[r] = Arrays.copyOf(rows[r], count);
    }
    return new Trace(
        Arrays.copyOf(seconds, count), cut[0], cut[1], cut[2], cut[3], cut[4], cut[5], cut[6]);
  }
}
