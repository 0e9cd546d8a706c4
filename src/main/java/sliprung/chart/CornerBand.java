package sliprung.chart;

import java.util.List;
import java.util.Optional;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;

/**
 * The duration curves of the permitted start at every corner, as one area.
 *
 * @param amps rising stator amperes, RMS
 * @param leastSeconds least time at or above these, over the corners; 0: some corner never is
 * @param greatestSeconds greatest time likewise
 * @param corners how many
 */
public record CornerBand(
    double[] amps, double[] leastSeconds, double[] greatestSeconds, int corners) {
  private static final int LEVELS = 120;

  /** Copies. */
  public CornerBand {
    amps = amps.clone();
    leastSeconds = leastSeconds.clone();
    greatestSeconds = greatestSeconds.clone();
  }

  /** Of a review; empty where fewer than two corners were computed. */
  public static Optional<CornerBand> of(Review review) {
    List<ComputedStart> starts =
        review.starts().stream()
            .filter(s -> !s.scenario().isFault() && s.place() == 1)
            .filter(s -> s.from() == ComputedStart.From.COLD)
            .toList();
    if (starts.size() < 2) {
      return Optional.empty();
    }
    double least = Double.POSITIVE_INFINITY;
    double greatest = 0.0;
    for (ComputedStart start : starts) {
      for (Stage stage : start.history().stages()) {
        for (double a : stage.trace().statorAmps()) {
          least = Math.min(least, a);
          greatest = Math.max(greatest, a);
        }
      }
    }
    least = Math.max(least, DurationCurve.LEAST_SHARE * greatest);
    double[] amps = new double[LEVELS];
    double[] low = new double[LEVELS];
    double[] high = new double[LEVELS];
    for (int k = 0; k < LEVELS; k++) {
      amps[k] = least * Math.pow(greatest / least, k / (LEVELS - 1.0)) * (1.0 - 1e-9);
      low[k] = Double.POSITIVE_INFINITY;
      for (ComputedStart start : starts) {
        double seconds =
            DurationCurve.secondsAtOrAbove(
                start.history().stages(), amps[k], DurationCurve.until(start));
        low[k] = Math.min(low[k], seconds);
        high[k] = Math.max(high[k], seconds);
      }
    }
    return Optional.of(new CornerBand(amps, low, high, starts.size()));
  }

  @Override
  public double[] amps() {
    return amps.clone();
  }

  @Override
  public double[] leastSeconds() {
    return leastSeconds.clone();
  }

  @Override
  public double[] greatestSeconds() {
    return greatestSeconds.clone();
  }
}
