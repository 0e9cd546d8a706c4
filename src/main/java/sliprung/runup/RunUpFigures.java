package sliprung.runup;

import java.util.OptionalDouble;
import java.util.function.Function;

/**
 * What a start comes to, from line closing to the end of its run-up.
 *
 * @param runUpSeconds see {@link StartHistory}
 * @param statorSquare ∫I² dt of the stator line, A²s
 * @param ringSquare ∫I² dt of a ring, A²s
 */
public record RunUpFigures(double runUpSeconds, double statorSquare, double ringSquare) {

  /** Of a start; not a number where it never runs up. */
  public static RunUpFigures of(StartHistory history) {
    OptionalDouble runUp = history.runUpSeconds();
    if (runUp.isEmpty()) {
      return new RunUpFigures(Double.NaN, Double.NaN, Double.NaN);
    }
    return new RunUpFigures(
        runUp.getAsDouble(),
        square(history, Trace::statorAmps, runUp.getAsDouble()),
        square(history, Trace::ringAmps, runUp.getAsDouble()));
  }

  private static double square(
      StartHistory history, Function<Trace, double[]> quantity, double until) {
    double sum = 0.0;
    for (Stage stage : history.stages()) {
      Trace trace = stage.trace();
      double[] t = trace.seconds();
      double[] i = quantity.apply(trace);
      // the end of the run-up is an end of a piece
      for (int k = 0; k + 2 < t.length && t[k + 1] < until; k += 2) {
        sum +=
            (t[k + 2] - t[k])
                * (i[k] * i[k] + 4.0 * i[k + 1] * i[k + 1] + i[k + 2] * i[k + 2])
                / 6.0;
      }
    }
    return sum;
  }
}
