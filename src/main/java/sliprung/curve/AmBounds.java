package sliprung.curve;

import java.util.List;

/**
 * Sound bounds on the pre-arcing time of an aM fuse-link from the gates of IEC 60269-1: convex on a
 * log-log sheet and nowhere flatter than I²t, as for gG. Such a link covers short circuits only.
 */
public final class AmBounds {
  /**
   * Above the last gate the standard pins no shortest time and no I²t; a link is taken to melt this
   * soon there, s.
   */
  private static final double SOONEST_SECONDS = 0.001;

  private AmBounds() {}

  /**
   * No compliant link melts sooner: {@code t_k (I_k/I)²} of the best gate above the current. Up to
   * the rated current it never melts.
   *
   * @param gates as multiples of the rating
   * @param ratingAmps rated current
   * @param preheat factor on the gates' currents of a link warm from load, 1 from cold
   */
  public static TimeCurrentEdge fast(AmGates gates, double ratingAmps, double preheat) {
    List<AmGates.Gate> pins = gates.notBefore();
    double[] breaks = new double[pins.size() + 1];
    breaks[0] = ratingAmps;
    for (int k = 0; k < pins.size(); k++) {
      breaks[k + 1] = pins.get(k).multiple() * ratingAmps * preheat;
    }
    return new Scaled(breaks) {
      @Override
      public double seconds(double amps) {
        if (amps <= ratingAmps) {
          return Double.POSITIVE_INFINITY;
        }
        double best = SOONEST_SECONDS;
        for (AmGates.Gate pin : pins) {
          double gate = pin.multiple() * ratingAmps * preheat;
          if (amps <= gate) {
            best = Math.max(best, pin.seconds() * (gate / amps) * (gate / amps));
          }
        }
        return best;
      }
    };
  }

  /**
   * First current in A at which {@link #fast} rests on a gate of its own and not on I²t before it.
   */
  public static double firstGateAmps(AmGates gates, double ratingAmps, double preheat) {
    return gates.notBefore().get(0).multiple() * ratingAmps * preheat;
  }

  /**
   * Every compliant link has melted by then. Below its least breaking current a link is never
   * credited; chords between the gates, and I²t beyond the last.
   */
  public static TimeCurrentEdge slow(AmGates gates, double ratingAmps) {
    List<AmGates.Gate> pins = gates.cleared();
    double least = Math.max(gates.leastBreakingMultiple(), pins.get(0).multiple()) * ratingAmps;
    double[] breaks = new double[pins.size() + 1];
    breaks[0] = least;
    for (int k = 0; k < pins.size(); k++) {
      breaks[k + 1] = pins.get(k).multiple() * ratingAmps;
    }
    return new Scaled(breaks) {
      @Override
      public double seconds(double amps) {
        return amps < least ? Double.POSITIVE_INFINITY : chord(pins, amps / ratingAmps);
      }
    };
  }

  /** For printing only: the geometric mean of the two edges where both are finite. */
  public static TimeCurrentEdge middle(AmGates gates, double ratingAmps) {
    TimeCurrentEdge fast = fast(gates, ratingAmps, 1.0);
    TimeCurrentEdge slow = slow(gates, ratingAmps);
    return new Scaled(slow.breaks()) {
      @Override
      public double seconds(double amps) {
        double late = slow.seconds(amps);
        return Double.isInfinite(late) ? late : Math.sqrt(fast.seconds(amps) * late);
      }
    };
  }

  private static double chord(List<AmGates.Gate> pins, double multiple) {
    for (int k = 1; k < pins.size(); k++) {
      AmGates.Gate from = pins.get(k - 1);
      AmGates.Gate to = pins.get(k);
      if (multiple < to.multiple()) {
        return LogLog.at(from.multiple(), from.seconds(), to.multiple(), to.seconds(), multiple);
      }
    }
    AmGates.Gate last = pins.get(pins.size() - 1);
    double ratio = last.multiple() / multiple;
    return last.seconds() * ratio * ratio;
  }

  private abstract static class Scaled implements TimeCurrentEdge {
    private final double[] breaks;

    Scaled(double[] breaks) {
      this.breaks = breaks.clone();
      java.util.Arrays.sort(this.breaks);
    }

    @Override
    public double[] breaks() {
      return breaks.clone();
    }
  }
}
