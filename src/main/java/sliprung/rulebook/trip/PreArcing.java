package sliprung.rulebook.trip;

import java.util.OptionalDouble;
import sliprung.protection.Bands;
import sliprung.protection.Edge;
import sliprung.starter.Device;

/**
 * One edge of a fuse from cold as a table of currents in small equal ratios and the time each takes
 * to melt it, to be held against the most loaded seconds of a start.
 */
final class PreArcing {
  private static final int STEPS_PER_DECADE = 1000;

  private final double[] amps;
  private final double[] seconds;

  /**
   * How near a start comes.
   *
   * @param share RMS over the most loaded seconds, over the current that melts in that time
   * @param seconds how many seconds decide
   * @param rmsAmps over them
   * @param meltsAmps that melts in that time at this edge
   */
  record Reach(double share, double seconds, double rmsAmps, double meltsAmps) {}

  /**
   * A table.
   *
   * @param greatestAmps greatest current of the starts
   */
  PreArcing(Bands bands, Device device, Edge edge, double greatestAmps) {
    double from = 0.05 * greatestAmps;
    double to = 5.0 * greatestAmps;
    int count = (int) Math.ceil(STEPS_PER_DECADE * Math.log10(to / from)) + 1;
    amps = new double[count];
    seconds = new double[count];
    for (int k = 0; k < count; k++) {
      amps[k] = from * Math.pow(10.0, (double) k / STEPS_PER_DECADE);
      OptionalDouble time = bands.operatingSeconds(device, edge, amps[k]);
      seconds[k] = time.orElse(Double.NaN);
    }
  }

  /**
   * Whether the curve tells what it is asked: the time of every current up to the greatest, or that
   * a smaller one takes longer than the start lasts.
   */
  boolean tells(MostLoaded start) {
    double shortestUnknown = Double.NaN;
    for (int k = amps.length - 1; k >= 0; k--) {
      if (Double.isNaN(seconds[k])) {
        if (amps[k] <= start.greatestAmps() && !(shortestUnknown > start.seconds())) {
          return false;
        }
      } else {
        shortestUnknown = seconds[k];
      }
    }
    return true;
  }

  /**
   * The greatest share over every duration up to the start's. Between two currents of the table the
   * smaller current meets the time of the greater one: the answer errs by a quarter of a per cent
   * to the safe side.
   */
  Reach reach(MostLoaded start) {
    Reach worst = new Reach(0.0, 0.0, 0.0, Double.POSITIVE_INFINITY);
    for (int k = 0; k + 1 < amps.length; k++) {
      double time = seconds[k + 1];
      if (Double.isNaN(time) || time <= 0.0 || time > start.seconds()) {
        continue;
      }
      double rms = start.rmsOver(time);
      if (rms / amps[k] > worst.share()) {
        worst = new Reach(rms / amps[k], time, rms, amps[k]);
      }
    }
    return worst;
  }
}
