package sliprung.protection;

import java.util.Arrays;

/**
 * A short time of one current: the quadratic through its values at the beginning, halfway and at
 * the end.
 *
 * @param seconds length, above 0
 * @param first A, RMS
 * @param middle A, RMS
 * @param last A, RMS
 * @param standing the rotor stands still throughout
 */
record Piece(double seconds, double first, double middle, double last, boolean standing) {
  private static final double[] NODES = {0.5 - Math.sqrt(0.15), 0.5, 0.5 + Math.sqrt(0.15)};
  private static final double SAME = 1e-5;
  private static final double HARDLY = 1e-3;
  private static final double LONGEST_VARYING = 0.5;
  private static final double[] WEIGHTS = {5.0 / 18.0, 8.0 / 18.0, 5.0 / 18.0};

  /** A piece of constant current with the rotor turning. */
  static Piece constant(double seconds, double amps) {
    return new Piece(seconds, amps, amps, amps, false);
  }

  /** A function of the current. */
  interface OfCurrent {
    double at(double amps);
  }

  /** The current at a share of the length, 0 to 1. */
  double amps(double share) {
    double slope = -3.0 * first + 4.0 * middle - last;
    double bend = 2.0 * (first - 2.0 * middle + last);
    return first + share * (slope + share * bend);
  }

  /** Mean of the square of the current, A², Simpson's rule. */
  double meanSquare() {
    return (first * first + 4.0 * middle * middle + last * last) / 6.0;
  }

  /** Greatest of the three values, A. */
  double greatest() {
    return Math.max(first, Math.max(middle, last));
  }

  /**
   * Integral over the first share of the length of a function of the current (Gauss, three inner
   * points: no value is taken at an end, where the function may jump).
   */
  double integral(OfCurrent function, double share) {
    double sum = 0.0;
    for (int i = 0; i < NODES.length; i++) {
      sum += WEIGHTS[i] * function.at(amps(share * NODES[i]));
    }
    return sum * share * seconds;
  }

  /** The piece with its current and its length multiplied. */
  Piece scaled(double onCurrent, double onTime) {
    return new Piece(
        onTime * seconds, onCurrent * first, onCurrent * middle, onCurrent * last, standing);
  }

  /** The piece between two shares of its length. */
  Piece part(double from, double to) {
    return new Piece(
        (to - from) * seconds, amps(from), amps(0.5 * (from + to)), amps(to), standing);
  }

  /**
   * This piece and the one after it as one, if a single quadratic tells the same: within {@value
   * #SAME} of the greatest current, and no longer than {@value #LONGEST_VARYING} s unless the
   * current hardly varies (elements take a piece at its mean square).
   *
   * @return null where it does not
   */
  Piece joined(Piece next) {
    if (standing != next.standing) {
      return null;
    }
    double whole = seconds + next.seconds;
    double greatest = Math.max(greatest(), next.greatest());
    double least = Math.min(least(), next.least());
    if (whole > LONGEST_VARYING && greatest - least > HARDLY * greatest) {
      return null;
    }
    double cut = seconds / whole;
    double halfway = cut >= 0.5 ? amps(0.5 / cut) : next.amps((0.5 - cut) / (1.0 - cut));
    Piece one = new Piece(whole, first, halfway, next.last, standing);
    double slack = SAME * greatest;
    boolean same =
        Math.abs(one.amps(0.5 * cut) - middle) <= slack
            && Math.abs(one.amps(cut) - last) <= slack
            && Math.abs(next.first - last) <= slack
            && Math.abs(one.amps(0.5 * (1.0 + cut)) - next.middle) <= slack;
    return same ? one : null;
  }

  private double least() {
    return Math.min(first, Math.min(middle, last));
  }

  /** Cut wherever the current passes one of the levels; mostly the piece itself, uncut. */
  Piece[] cutAt(double... levels) {
    if (clearOf(levels)) {
      return new Piece[] {this};
    }
    double[] cuts = new double[2 * levels.length + 2];
    int count = 1;
    double slope = -3.0 * first + 4.0 * middle - last;
    double bend = 2.0 * (first - 2.0 * middle + last);
    for (double level : levels) {
      count = roots(bend, slope, first - level, cuts, count);
    }
    if (count == 1) {
      return new Piece[] {this};
    }
    cuts[count++] = 1.0;
    double[] at = Arrays.copyOf(cuts, count);
    Arrays.sort(at);
    Piece[] parts = new Piece[count - 1];
    int kept = 0;
    for (int i = 1; i < count; i++) {
      if (at[i] - at[i - 1] > 1e-12) {
        parts[kept++] = part(at[i - 1], at[i]);
      }
    }
    return Arrays.copyOf(parts, kept);
  }

  /** Whether the current surely stays on one side of every level. */
  boolean clearOf(double... levels) {
    // a quadratic leaves the range of its three values by at most an eighth of their range
    double least = least();
    double greatest = greatest();
    double excess = 0.125 * (greatest - least);
    for (double level : levels) {
      if (level >= least - excess && level <= greatest + excess && greatest > least) {
        return false;
      }
    }
    return true;
  }

  /** Appends the roots of {@code a x² + b x + c} that lie inside the piece. */
  private static int roots(double a, double b, double c, double[] into, int count) {
    int n = count;
    double discriminant = b * b - 4.0 * a * c;
    if (discriminant < 0.0) {
      return n;
    }
    // the stable form: no difference of nearly equal numbers
    double q = -0.5 * (b + Math.copySign(Math.sqrt(discriminant), b));
    double x1 = q / a;
    double x2 = c / q;
    if (x1 > 0.0 && x1 < 1.0) {
      into[n++] = x1;
    }
    if (x2 > 0.0 && x2 < 1.0 && x2 != x1) {
      into[n++] = x2;
    }
    return n;
  }
}
