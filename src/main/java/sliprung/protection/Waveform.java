package sliprung.protection;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;

/**
 * One current of one history as pieces: those of the start (of a fault all of them), then those of
 * the running after it.
 */
final class Waveform {
  private final Piece[] pieces;
  private final int[] stageOf;
  private final double startsAt;
  private final int startCount;
  private final int runUpCount;

  private Waveform(Piece[] pieces, int[] stageOf, double startsAt, int startCount, int runUpCount) {
    this.pieces = pieces;
    this.stageOf = stageOf;
    this.startsAt = startsAt;
    this.startCount = startCount;
    this.runUpCount = runUpCount;
  }

  /** Whether a sample is measured at all. */
  interface Readable {
    boolean at(Trace trace, int sample);
  }

  /**
   * Takes a quantity out of a history. Neighbours that one quadratic describes are joined; a piece
   * that contains the end of the run-up is cut there.
   */
  static Waveform of(StartHistory history, Channel.Quantity quantity, Readable readable) {
    double runUp =
        history.scenario().isFault()
            ? Double.POSITIVE_INFINITY
            : history.runUpSeconds().orElse(Double.POSITIVE_INFINITY);
    Collector collector = new Collector(runUp);
    for (Stage stage : history.stages()) {
      collector.add(stage, quantity, readable);
    }
    int startCount = collector.pieces.size();
    history.running().ifPresent(stage -> collector.add(stage, quantity, readable));
    return new Waveform(
        collector.pieces.toArray(Piece[]::new),
        collector.stageOf.stream().mapToInt(Integer::intValue).toArray(),
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
    return new Waveform(changed, stageOf, startsAt * onTime, startCount, runUpCount);
  }

  /** The current times one share for each stage, the running after the start included. */
  Waveform masked(double[] shares) {
    Piece[] changed = pieces.clone();
    for (int i = 0; i < changed.length; i++) {
      double share = shares[stageOf[i]];
      changed[i] = share == 1.0 ? pieces[i] : pieces[i].scaled(share, 1.0);
    }
    return new Waveform(changed, stageOf, startsAt, startCount, runUpCount);
  }

  /**
   * When the current last rose to a level before a time and stayed at or above it until then, s;
   * empty where it was below it just before that time.
   */
  OptionalDouble lastRiseSeconds(double level, double beforeSeconds) {
    double rose = Double.NaN;
    double at = startsAt;
    for (Piece piece : pieces) {
      for (Piece part : piece.cutAt(level)) {
        if (at >= beforeSeconds) {
          break;
        }
        if (part.middle() < level) {
          rose = Double.NaN;
        } else if (Double.isNaN(rose)) {
          rose = at;
        }
        at += part.seconds();
      }
    }
    return Double.isNaN(rose) ? OptionalDouble.empty() : OptionalDouble.of(rose);
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
    private final List<Integer> stageOf = new ArrayList<>();
    private final double runUp;
    private int runUpCount;
    private int stageBegin;
    private int stages;

    Collector(double runUp) {
      this.runUp = runUp;
    }

    void add(Stage stage, Channel.Quantity quantity, Readable readable) {
      stageBegin = pieces.size();
      Trace trace = stage.trace();
      double[] seconds = trace.seconds();
      double[] values = quantity.of(trace);
      double[] speed = trace.speed();
      for (int i = 0; i + 2 < seconds.length; i += 2) {
        double length = seconds[i + 2] - seconds[i];
        if (length <= 0.0) {
          continue;
        }
        boolean standing = speed[i] == 0.0 && speed[i + 1] == 0.0 && speed[i + 2] == 0.0;
        boolean read =
            readable.at(trace, i) && readable.at(trace, i + 1) && readable.at(trace, i + 2);
        Piece piece =
            read
                ? new Piece(length, values[i], values[i + 1], values[i + 2], standing)
                : new Piece(length, 0.0, 0.0, 0.0, standing);
        add(piece, seconds[i]);
      }
      stages++;
    }

    private void add(Piece piece, double from) {
      double end = from + piece.seconds();
      if (from < runUp && runUp < end) {
        double share = (runUp - from) / piece.seconds();
        append(piece.part(0.0, share));
        runUpCount = pieces.size();
        append(piece.part(share, 1.0));
        return;
      }
      Piece joined = joinedToLast(piece, from);
      if (joined == null) {
        append(piece);
      } else {
        pieces.set(pieces.size() - 1, joined);
      }
      if (end <= runUp) {
        runUpCount = pieces.size();
      }
    }

    private void append(Piece piece) {
      pieces.add(piece);
      stageOf.add(stages);
    }

    /** Neighbours of one stage are joined, but never across the end of the run-up. */
    private Piece joinedToLast(Piece piece, double from) {
      boolean apart = pieces.size() == stageBegin || pieces.size() == runUpCount && from >= runUp;
      return apart ? null : pieces.get(pieces.size() - 1).joined(piece);
    }
  }
}
