package sliprung.protection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * How a level, 1 at operation or at a limit, goes over time: what a {@link Passage} sums up, sample
 * by sample. Where an element acts within a sample and falls back, its peak stands between the two.
 *
 * @param seconds rising, from the line closing of the first start shown
 * @param levels at these
 */
public record LevelOverTime(double[] seconds, double[] levels) {
  /** A steady current is cut so that a bend of its logarithm of time is still seen. */
  private static final double STRETCH = 1.06;

  private static final double SHORTEST_SECONDS = 0.02;

  /** Copies. */
  public LevelOverTime {
    seconds = seconds.clone();
    levels = levels.clone();
  }

  @Override
  public double[] seconds() {
    return seconds.clone();
  }

  @Override
  public double[] levels() {
    return levels.clone();
  }

  /** Greatest level; 0 without any sample. */
  public double greatest() {
    return Arrays.stream(levels).max().orElse(0.0);
  }

  /** Over the last of some starts in a row and the running after it, as {@link Passage#of}. */
  static LevelOverTime ofLast(Meter meter, Waveform waveform, int starts) {
    for (int n = 1; n < starts; n++) {
      Passage.throughStart(meter, waveform);
      meter.stopBetweenStarts();
    }
    Recorder recorder = new Recorder(meter, waveform.startsAt());
    recorder.through(waveform, waveform.size());
    return recorder.result();
  }

  /** Over all of some starts in a row and the running after the last, one after the other. */
  static LevelOverTime ofAll(Meter meter, Waveform waveform, int starts) {
    Recorder recorder = new Recorder(meter, waveform.startsAt());
    for (int n = 1; n < starts; n++) {
      recorder.through(waveform, waveform.startCount());
      meter.stopBetweenStarts();
    }
    recorder.through(waveform, waveform.size());
    return recorder.result();
  }

  private static final class Recorder {
    private final Meter meter;
    private final List<double[]> points = new ArrayList<>();
    private double at;
    private double since;

    Recorder(Meter meter, double from) {
      this.meter = meter;
      this.at = from;
      points.add(new double[] {from, meter.level()});
    }

    void through(Waveform waveform, int pieces) {
      since = at;
      for (int i = 0; i < pieces; i++) {
        Piece piece = waveform.piece(i);
        double from = at;
        double share = 0.0;
        while (share < 1.0) {
          double elapsed = from + share * piece.seconds() - since;
          double step = Math.max(SHORTEST_SECONDS, elapsed * (STRETCH - 1.0)) / piece.seconds();
          double to = share + step > 0.999 ? 1.0 : share + step;
          record(piece.part(share, to));
          share = to;
        }
        at = from + piece.seconds();
      }
    }

    private void record(Piece part) {
      double before = meter.level();
      double last = points.get(points.size() - 1)[0];
      meter.advance(part);
      double after = meter.level();
      boolean remembers = before > 0.0 || after > 0.0;
      if (remembers && meter.peak() > Math.max(before, after) * (1.0 + 1e-9)) {
        points.add(new double[] {last + 0.5 * part.seconds(), meter.peak()});
      }
      // an element without memory is at its peak as long as the current lasts
      points.add(new double[] {last + part.seconds(), remembers ? after : meter.peak()});
    }

    LevelOverTime result() {
      return new LevelOverTime(
          points.stream().mapToDouble(p -> p[0]).toArray(),
          points.stream().mapToDouble(p -> p[1]).toArray());
    }
  }
}
