package sliprung.dial;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import sliprung.dial.Judgement.Question;

/**
 * Looks between the values of a grid for what the grid missed: a margin that dips below its limit
 * between two unbroken values (a hole), and an unbroken stretch between two broken ones. The
 * margins of the neighbours say where to look: each is followed from both sides to where the lines
 * meet.
 */
final class GapSearch {
  private static final int MOST_DIPS = 10;
  private static final int MOST_IN_A_GAP = 9;
  private static final double NARROWEST = 0.004;

  private static final double BESIDE = 0.25;
  private static final double INSET = 0.1;

  /** Lines that meet this close to the limit are looked at as well. */
  private static final double NEAR = 0.003;

  /** So are lines that come down so far from the lower of the inner values: a margin may bend. */
  private static final double SHARE_OF_WAY = 0.3;

  private final Profile profile;
  private final Yardstick yardstick;

  GapSearch(Profile profile, Yardstick yardstick) {
    this.profile = profile;
    this.yardstick = yardstick;
  }

  private boolean isBroken(double x) {
    return !yardstick.broken(profile.at(x)).isEmpty();
  }

  /** Looks for holes, the deepest suspicion first. */
  void dips() {
    for (int n = 0; n < MOST_DIPS; n++) {
      Optional<Meeting> suspect = deepest();
      if (suspect.isEmpty()) {
        return;
      }
      profile.at(suspect.get().x());
    }
  }

  /**
   * Where two lines meet.
   *
   * @param x value of the dial
   * @param height logarithm of the margin there
   */
  private record Meeting(double x, double height) {}

  private Optional<Meeting> deepest() {
    List<Double> xs = profile.values();
    Meeting deepest = null;
    for (int i = 1; i + 2 < xs.size(); i++) {
      double a = xs.get(i);
      double b = xs.get(i + 1);
      if (b - a < NARROWEST * b || isBroken(a) || isBroken(b)) {
        continue;
      }
      for (Question question : profile.at(a).answers().keySet()) {
        Optional<Meeting> found = meeting(question, xs, i, -1.0);
        if (found.isPresent()
            && found.get().height() < near(question, a, b)
            && (deepest == null || found.get().height() < deepest.height())) {
          deepest = found.get();
        }
      }
    }
    return Optional.ofNullable(deepest);
  }

  private double near(Question question, double a, double b) {
    double lower =
        Math.min(
            yardstick.height(profile.at(a), question).orElse(0.0),
            yardstick.height(profile.at(b), question).orElse(0.0));
    return NEAR + SHARE_OF_WAY * lower;
  }

  /**
   * Where a question's margin, followed from the two values on the left and the two on the right,
   * meets between the inner two.
   *
   * @param sense −1 for a dip, +1 for a peak
   */
  private Optional<Meeting> meeting(Question question, List<Double> xs, int i, double sense) {
    double[] u = new double[4];
    double[] y = new double[4];
    for (int k = 0; k < 4; k++) {
      double x = xs.get(i - 1 + k);
      OptionalDouble height = yardstick.height(profile.at(x), question);
      if (height.isEmpty() || !(x > 0.0)) {
        return Optional.empty();
      }
      u[k] = Math.log(x);
      y[k] = height.getAsDouble();
    }
    double left = (y[1] - y[0]) / (u[1] - u[0]);
    double right = (y[3] - y[2]) / (u[3] - u[2]);
    if (!(sense * left > 0.0 && sense * right < 0.0)) {
      return Optional.empty();
    }
    double at = (y[2] - y[1] + left * u[1] - right * u[2]) / (left - right);
    double width = u[2] - u[1];
    if (!(at > u[1] - BESIDE * width && at < u[2] + BESIDE * width)) {
      return Optional.empty();
    }
    // lines that meet beside the interval bend: the extreme may still lie just within it
    double inner = Math.max(u[1] + INSET * width, Math.min(u[2] - INSET * width, at));
    double fromLeft = y[1] + left * (inner - u[1]);
    double fromRight = y[2] - right * (u[2] - inner);
    double height = sense < 0.0 ? Math.min(fromLeft, fromRight) : Math.max(fromLeft, fromRight);
    return Optional.of(new Meeting(Math.exp(inner), height));
  }

  /** Looks for an unbroken stretch between broken neighbours. */
  void bridges() {
    List<Double> xs = new ArrayList<>(profile.values());
    for (int i = 0; i + 1 < xs.size(); i++) {
      if (isBroken(xs.get(i)) && isBroken(xs.get(i + 1))) {
        bridge(xs.get(i), xs.get(i + 1));
      }
    }
  }

  private void bridge(double left, double right) {
    double l = left;
    double r = right;
    for (int n = 0; n < MOST_IN_A_GAP && r - l > NARROWEST * r; n++) {
      Set<Question> low = yardstick.broken(profile.at(l));
      Set<Question> high = yardstick.broken(profile.at(r));
      Set<Question> both = new HashSet<>(low);
      both.retainAll(high);
      OptionalDouble x =
          both.isEmpty() ? OptionalDouble.of(between(l, r, low, high)) : peak(l, r, both);
      if (x.isEmpty()) {
        return;
      }
      Set<Question> here = new TreeSet<>(yardstick.broken(profile.at(x.getAsDouble())));
      if (here.isEmpty()) {
        return;
      }
      boolean asLow = here.stream().anyMatch(low::contains);
      boolean asHigh = here.stream().anyMatch(high::contains);
      if (asLow == asHigh) {
        return; // broken from both sides, or by something else: no stretch that the margins show
      }
      if (asLow) {
        l = x.getAsDouble();
      } else {
        r = x.getAsDouble();
      }
    }
  }

  /** Where what breaks on the left and what breaks on the right have the same margin. */
  private double between(double l, double r, Set<Question> low, Set<Question> high) {
    OptionalDouble lowLeft = yardstick.least(profile.at(l), low);
    OptionalDouble lowRight = yardstick.least(profile.at(r), low);
    OptionalDouble highLeft = yardstick.least(profile.at(l), high);
    OptionalDouble highRight = yardstick.least(profile.at(r), high);
    if (lowLeft.isEmpty() || lowRight.isEmpty() || highLeft.isEmpty() || highRight.isEmpty()) {
      return EdgeSearch.middle(l, r);
    }
    double before = highLeft.getAsDouble() - lowLeft.getAsDouble();
    double after = lowRight.getAsDouble() - highRight.getAsDouble();
    double share = Math.max(0.1, Math.min(0.9, before / (before + after)));
    return l > 0.0 ? l * Math.pow(r / l, share) : l + share * (r - l);
  }

  private OptionalDouble peak(double l, double r, Set<Question> both) {
    List<Double> xs = profile.values();
    int i = xs.indexOf(l);
    if (i < 1 || i + 2 >= xs.size() || xs.get(i + 1) != r) {
      return OptionalDouble.empty();
    }
    double x = Double.NaN;
    double lowest = Double.POSITIVE_INFINITY;
    for (Question question : both) {
      Optional<Meeting> peak = meeting(question, xs, i, 1.0);
      if (peak.isEmpty() || peak.get().height() < -NEAR) {
        return OptionalDouble.empty();
      }
      if (peak.get().height() < lowest) {
        lowest = peak.get().height();
        x = peak.get().x();
      }
    }
    return OptionalDouble.of(x);
  }
}
