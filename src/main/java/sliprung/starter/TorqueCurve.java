package sliprung.starter;

import java.util.Arrays;

/**
 * Load torque in N·m by share of synchronous speed: linear between points, constant outside, or a
 * power law. Motion backwards meets the torque at rest.
 */
public sealed interface TorqueCurve {

  /**
   * Torque in N·m.
   *
   * @param share speed over synchronous speed
   */
  double at(double share);

  /** Whether the torque rises with the square of speed: a running load keeps that shape. */
  default boolean isSquare() {
    return false;
  }

  /**
   * Points, linear between, constant outside.
   *
   * @param shares rising shares of synchronous speed
   * @param torques N·m at these
   */
  record Table(double[] shares, double[] torques) implements TorqueCurve {

    /** Copies and checks. */
    public Table {
      shares = shares.clone();
      torques = torques.clone();
      if (shares.length == 0 || shares.length != torques.length) {
        throw new IllegalArgumentException("a torque for each share");
      }
      for (int i = 1; i < shares.length; i++) {
        if (!(shares[i] > shares[i - 1])) {
          throw new IllegalArgumentException("shares must rise");
        }
      }
    }

    @Override
    public double at(double share) {
      int n = shares.length;
      if (share <= shares[0]) {
        return torques[0];
      }
      if (share >= shares[n - 1]) {
        return torques[n - 1];
      }
      int upper = 1; // a table has a handful of points and is asked millions of times
      while (shares[upper] < share) {
        upper++;
      }
      double w = (share - shares[upper - 1]) / (shares[upper] - shares[upper - 1]);
      return torques[upper - 1] + w * (torques[upper] - torques[upper - 1]);
    }

    @Override
    public double[] shares() {
      return shares.clone();
    }

    @Override
    public double[] torques() {
      return torques.clone();
    }

    @Override
    public boolean equals(Object other) {
      return other instanceof Table t
          && Arrays.equals(shares, t.shares)
          && Arrays.equals(torques, t.torques);
    }

    @Override
    public int hashCode() {
      return 31 * Arrays.hashCode(shares) + Arrays.hashCode(torques);
    }

    @Override
    public String toString() {
      return "Table" + Arrays.toString(shares) + Arrays.toString(torques);
    }
  }

  /**
   * The same torque at every speed.
   *
   * @param torque N·m
   */
  record Constant(double torque) implements TorqueCurve {
    @Override
    public double at(double share) {
      return torque;
    }
  }

  /**
   * Proportional to speed.
   *
   * @param torqueAtSynchronous N·m at synchronous speed
   */
  record Linear(double torqueAtSynchronous) implements TorqueCurve {
    @Override
    public double at(double share) {
      return torqueAtSynchronous * Math.max(0.0, share);
    }
  }

  /**
   * Proportional to the square of speed.
   *
   * @param torqueAtSynchronous N·m at synchronous speed
   */
  record Square(double torqueAtSynchronous) implements TorqueCurve {
    @Override
    public double at(double share) {
      double forward = Math.max(0.0, share);
      return torqueAtSynchronous * forward * forward;
    }

    @Override
    public boolean isSquare() {
      return true;
    }
  }
}
