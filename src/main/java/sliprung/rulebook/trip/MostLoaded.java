package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/**
 * The stator current of a start, sorted: for each duration the RMS over the most loaded seconds of
 * that length, wherever they lie. No stretch of the start of that length has a greater one.
 */
final class MostLoaded {
  private final double[] seconds;
  private final double[] joule;
  private final double greatest;

  private record Piece(double seconds, double meanSquare) {}

  private MostLoaded(List<Piece> pieces, double greatest) {
    pieces.sort(Comparator.comparingDouble(Piece::meanSquare).reversed());
    this.greatest = greatest;
    seconds = new double[pieces.size() + 1];
    joule = new double[pieces.size() + 1];
    for (int i = 0; i < pieces.size(); i++) {
      seconds[i + 1] = seconds[i] + pieces.get(i).seconds();
      joule[i + 1] = joule[i] + pieces.get(i).seconds() * pieces.get(i).meanSquare();
    }
  }

  /** Of a permitted start up to the end of its run-up, or of all of it where it never runs up. */
  static MostLoaded of(StartHistory history) {
    double end = history.runUpSeconds().orElse(Double.POSITIVE_INFINITY);
    List<Piece> pieces = new ArrayList<>();
    double greatest = 0.0;
    for (Stage stage : history.stages()) {
      Trace trace = stage.trace();
      double[] t = trace.seconds();
      double[] i = trace.statorAmps();
      for (int k = 0; k + 2 < t.length; k += 2) {
        double length = Math.min(end, t[k + 2]) - t[k];
        if (length > 0.0) {
          double square = (i[k] * i[k] + 4.0 * i[k + 1] * i[k + 1] + i[k + 2] * i[k + 2]) / 6.0;
          pieces.add(new Piece(length, square));
          greatest = Math.max(greatest, Math.max(i[k], Math.max(i[k + 1], i[k + 2])));
        }
      }
    }
    return new MostLoaded(pieces, greatest);
  }

  /** Length of the start, s. */
  double seconds() {
    return seconds[seconds.length - 1];
  }

  /** Greatest RMS current of the start, A. */
  double greatestAmps() {
    return greatest;
  }

  /** RMS in A over the most loaded {@code length} seconds, above 0. */
  double rmsOver(double length) {
    int low = 0;
    int high = seconds.length - 1;
    if (length >= seconds[high]) {
      return Math.sqrt(joule[high] / length);
    }
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (seconds[middle] <= length) {
        low = middle;
      } else {
        high = middle;
      }
    }
    double share = (length - seconds[low]) / (seconds[high] - seconds[low]);
    return Math.sqrt((joule[low] + share * (joule[high] - joule[low])) / length);
  }
}
