package sliprung.protection;

import java.util.ArrayList;
import java.util.List;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/**
 * One current of one history as pieces: those of the start (of a fault all of them), then those of
 * the running after it.
 */
final class Waveform {
  private final Piece[] pieces;
  private final double startsAt;
  private final int startCount;
  private final int runUpCount;

  private Waveform(Piece[] pieces, double startsAt, int startCount, int runUpCount) {
    this.pieces = pieces;
    this.startsAt = startsAt;
    this.startCount = startCount;
    this.runUpCount = runUpCount;
  }

  /** Takes a current out of a history; a piece that contains the end of the run-up is cut there. */
  static Waveform of(StartHistory history, Channel channel) {
    double runUp =
        history.scenario().isFault()
            ? Double.POSITIVE_INFINITY
            : history.runUpSeconds().orElse(Double.POSITIVE_INFINITY);
    Collector collector = new Collector(runUp);
    for (Stage stage : history.stages()) {
      collector.add(stage, channel);
    }
    int startCount = collector.pieces.size();
    history.running().ifPresent(stage -> collector.add(stage, channel));
    return new Waveform(
        collector.pieces.toArray(Piece[]::new),
        history.stages().get(0).trace().seconds()[0],
        startCount,
        collector.runUpCount);
  }

  /** Number of pieces, running included. */
  int size() {
    return pieces.length;
  }

  /** Number of pieces of the start itself. */
  int startCount() {
    return startCount;
  }

  /** Number of pieces up to the end of the run-up. */
  int runUpCount() {
    return runUpCount;
  }

  /** One piece. */
  Piece piece(int index) {
    return pieces[index];
  }

  /** When it begins, s from line closing. */
  double startsAt() {
    return startsAt;
  }

  /** The start with its current and its time axis multiplied; the running after it unchanged. */
  Waveform scaled(double onCurrent, double onTime) {
    Piece[] changed = pieces.clone();
    for (int i = 0; i < startCount; i++) {
      changed[i] = pieces[i].scaled(onCurrent, onTime);
    }
    return new Waveform(changed, startsAt * onTime, startCount, runUpCount);
  }

  /** Integral of the square of the current over the start, A²s. */
  double jouleIntegral() {
    double sum = 0.0;
    for (int i = 0; i < startCount; i++) {
      sum += pieces[i].meanSquare() * pieces[i].seconds();
    }
    return sum;
  }

  private static final class Collector {
    private final List<Piece> pieces = new ArrayList<>();
    private final double runUp;
    private int runUpCount;
    private int stageBegin;

    Collector(double runUp) {
      this.runUp = runUp;
    }

    void add(Stage stage, Channel channel) {
      stageBegin = pieces.size();
      Trace trace = stage.trace();
      double share = channel.share(stage);
      double[] seconds = trace.seconds();
      if (share == 0.0) {
        add(new Piece(seconds[trace.last()] - seconds[0], 0.0, 0.0, 0.0, false), seconds[0]);
        return;
      }
      double[] values = channel.quantity(trace);
      double[] speed = trace.speed();
      for (int i = 0; i + 2 < seconds.length; i += 2) {
        double length = seconds[i + 2] - seconds[i];
        if (length <= 0.0) {
          continue;
        }
        boolean standing = speed[i] == 0.0 && speed[i + 1] == 0.0 && speed[i + 2] == 0.0;
        boolean read =
            channel.reads(trace, i) && channel.reads(trace, i + 1) && channel.reads(trace, i + 2);
        double k = read ? share : 0.0;
        add(
            new Piece(length, k * values[i], k * values[i + 1], k * values[i + 2], standing),
            seconds[i]);
      }
    }

    private void add(Piece piece, double from) {
      double end = from + piece.seconds();
      if (from < runUp && runUp < end) {
        double share = (runUp - from) / piece.seconds();
        pieces.add(piece.part(0.0, share));
        runUpCount = pieces.size();
        pieces.add(piece.part(share, 1.0));
        return;
      }
      Piece joined = joinedToLast(piece, from);
      if (joined == null) {
        pieces.add(piece);
      } else {
        pieces.set(pieces.size() - 1, joined);
      }
      if (end <= runUp) {
        runUpCount = pieces.size();
      }
    }

    /** Neighbours of one stage are joined, but never across the end of the run-up. */
    private Piece joinedToLast(Piece piece, double from) {
      boolean apart = pieces.size() == stageBegin || pieces.size() == runUpCount && from >= runUp;
      return apart ? null : pieces.get(pieces.size() - 1).joined(piece);
    }
  }
}
