package sliprung.curve;

/**
 * Sound bounds on the pre-arcing time of a gG fuse-link from the gates of IEC 60269-1, which are
 * points and no curve. Between them only this is used: the curve is convex on a log-log sheet and
 * nowhere flatter than I²t.
 */
public final class GgBounds {
  /** Time of the pre-arcing I²t limits, s. */
  private static final double ADIABATIC_SECONDS = 0.01;

  private GgBounds() {}

  /**
   * No compliant link melts sooner. Up to the conventional non-fusing current it never melts; up to
   * the 10 s gate {@code 10 (I_min10/I)²}, up to the 0.1 s gate {@code 0.1 (I_min0.1/I)²}, above it
   * the least I²t.
   *
   * @param gates of its rating
   * @param preheat factor on the currents of a link warm from load, 1 from cold (0.85 customary);
   *     the non-fusing current is a steady limit and keeps its value
   */
  public static TimeCurrentEdge fast(FuseGates gates, double preheat) {
    double ten = gates.notIn10sAmps() * preheat;
    double tenth = gates.notIn100msAmps() * preheat;
    double joule = gates.leastPreArcing() * preheat * preheat;
    double never = gates.nonFusingAmps();
    return new Edge(never, ten, tenth) {
      @Override
      public double seconds(double amps) {
        if (amps <= never) {
          return Double.POSITIVE_INFINITY;
        }
        if (amps <= ten) {
          return 10.0 * (ten / amps) * (ten / amps);
        }
        return amps <= tenth ? 0.1 * (tenth / amps) * (tenth / amps) : joule / (amps * amps);
      }
    };
  }

  /**
   * Every compliant link has melted by then. Below the 5 s gate only the conventional fusing
   * current in the conventional time is sure; then the log-log chords through (I_max5, 5 s),
   * (I_max0.1, 0.1 s) and the current whose greatest I²t takes 10 ms; then the greatest I²t.
   */
  public static TimeCurrentEdge slow(FuseGates gates) {
    double five = gates.within5sAmps();
    double tenth = gates.within100msAmps();
    double adiabatic = Math.max(tenth, Math.sqrt(gates.greatestPreArcing() / ADIABATIC_SECONDS));
    return new Edge(gates.fusingAmps(), five, tenth, adiabatic) {
      @Override
      public double seconds(double amps) {
        if (amps < gates.fusingAmps()) {
          return Double.POSITIVE_INFINITY;
        }
        if (amps < five) {
          return gates.conventionalSeconds();
        }
        if (amps <= tenth) {
          return LogLog.at(five, 5.0, tenth, 0.1, amps);
        }
        return amps < adiabatic
            ? LogLog.at(tenth, 0.1, adiabatic, ADIABATIC_SECONDS, amps)
            : gates.greatestPreArcing() / (amps * amps);
      }
    };
  }

  /**
   * The mean of the two as people draw it, for printing only: chords through the geometric means of
   * the paired gates.
   */
  public static TimeCurrentEdge middle(FuseGates gates) {
    double[] amps = {
      Math.sqrt(gates.nonFusingAmps() * gates.fusingAmps()),
      Math.sqrt(gates.notIn10sAmps() * gates.within5sAmps()),
      Math.sqrt(gates.notIn100msAmps() * gates.within100msAmps()),
      Math.pow(gates.leastPreArcing() * gates.greatestPreArcing(), 0.25)
          / Math.sqrt(ADIABATIC_SECONDS)
    };
    double[] seconds = {gates.conventionalSeconds(), Math.sqrt(50.0), 0.1, ADIABATIC_SECONDS};
    return new Edge(amps) {
      @Override
      public double seconds(double i) {
        if (i < amps[0]) {
          return Double.POSITIVE_INFINITY;
        }
        for (int k = 1; k < amps.length; k++) {
          if (i < amps[k]) {
            return LogLog.at(amps[k - 1], seconds[k - 1], amps[k], seconds[k], i);
          }
        }
        int last = amps.length - 1;
        return seconds[last] * (amps[last] / i) * (amps[last] / i);
      }
    };
  }

  /** An edge with its breaks. */
  private abstract static class Edge implements TimeCurrentEdge {
    private final double[] breaks;

    Edge(double... breaks) {
      this.breaks = breaks.clone();
    }

    @Override
    public double[] breaks() {
      return breaks.clone();
    }
  }
}
