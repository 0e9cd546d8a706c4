package sliprung.dial;

import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import sliprung.dial.Judgement.Question;

/**
 * Closes in on the end of a window: between a value inside and a value outside, by the margins of
 * what breaks outside where they tell, else by halving. Both sides are full evaluations.
 */
final class EdgeSearch {
  private static final double RELATIVE = 1e-3;
  private static final double SHARE_OF_STEP = 0.2;
  private static final double PUSH = 0.4;
  private static final int SLOW = 2;
  private static final int MOST = 40;

  private final Profile profile;
  private final Yardstick yardstick;

  EdgeSearch(Profile profile, Yardstick yardstick) {
    this.profile = profile;
    this.yardstick = yardstick;
  }

  /**
   * An end of a window.
   *
   * @param inside outermost value found unbroken
   * @param outside innermost value found broken
   */
  record Edge(double inside, double outside) {}

  /** The end between two values; the window lies on the side of the first. */
  Edge between(double inside, double outside) {
    double in = inside;
    double out = outside;
    int slow = 0;
    Set<Question> breaking = new TreeSet<>(yardstick.broken(profile.at(out)));
    for (int n = 0; n < MOST && Math.abs(out - in) > tolerance(in); n++) {
      double width = Math.abs(out - in);
      double x = slow < SLOW ? byMargin(in, out, breaking) : middle(in, out);
      Set<Question> broken = yardstick.broken(profile.at(x));
      if (broken.isEmpty()) {
        in = x;
      } else {
        out = x;
        breaking = new TreeSet<>(broken);
      }
      slow = Math.abs(out - in) > 0.5 * width ? slow + 1 : 0;
    }
    return new Edge(in, out);
  }

  double tolerance(double x) {
    double relative = RELATIVE * Math.abs(x);
    return profile.dial().scale().step().isPresent()
        ? Math.max(relative, SHARE_OF_STEP * profile.dial().scale().step().getAsDouble())
        : Math.max(relative, 1e-9 * profile.dial().high());
  }

  private double byMargin(double in, double out, Set<Question> breaking) {
    OptionalDouble atIn = yardstick.least(profile.at(in), breaking);
    OptionalDouble atOut = yardstick.least(profile.at(out), breaking);
    if (atIn.isEmpty() || atOut.isEmpty() || !(atIn.getAsDouble() > 0.0)) {
      return middle(in, out);
    }
    double a = atIn.getAsDouble();
    double b = atOut.getAsDouble();
    double root = in + (out - in) * a / (a - b);
    // a little towards the farther side, so that a good guess closes the bracket from both sides
    double push = PUSH * tolerance(root);
    boolean nearerIn = Math.abs(root - in) < Math.abs(root - out);
    double x = root + Math.copySign(push, nearerIn ? out - in : in - out);
    double least = Math.min(in, out);
    double most = Math.max(in, out);
    double guard = Math.min(push, 0.1 * (most - least));
    return Math.max(least + guard, Math.min(most - guard, x));
  }

  /** Halfway, in ratio where that means something. */
  static double middle(double a, double b) {
    return a > 0.0 && b > 0.0 ? Math.sqrt(a * b) : 0.5 * (a + b);
  }
}
