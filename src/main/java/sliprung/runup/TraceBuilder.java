package sliprung.runup;

import java.util.Arrays;
import sliprung.machine.OperatingPoint;

/** Gathers the samples of one stage into a trace. */
final class TraceBuilder {
  /** Most stages of a failed start are held at one speed: few samples. */
  private static final int FIRST_SIZE = 16;

  private double[] seconds = new double[FIRST_SIZE];
  private final double[][] rows = new double[7][FIRST_SIZE];
  private int count;

  boolean isEmpty() {
    return count == 0;
  }

  /** A sample of the steady circuit at a speed. */
  void append(double time, double speed, Circumstance circumstance) {
    OperatingPoint point = circumstance.at(speed);
    append(
        time,
        speed,
        point.statorAmps(),
        point.ringAmps(),
        point.torque(),
        circumstance.loadTorque().applyAsDouble(speed),
        point.terminalVolts(),
        point.inputWatts());
  }

  /** A sample: time and then the columns of the trace. */
  void append(double time, double... columns) {
    if (count == seconds.length) {
      seconds = Arrays.copyOf(seconds, 2 * count);
      for (int r = 0; r < rows.length; r++) {
        rows[r] = Arrays.copyOf(rows[r], 2 * count);
      }
    }
    seconds[count] = time;
    for (int r = 0; r < rows.length; r++) {
      rows[r][count] = columns[r];
    }
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
