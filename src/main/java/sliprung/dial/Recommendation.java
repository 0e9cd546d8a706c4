package sliprung.dial;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeMap;
import sliprung.dial.Judgement.Question;

/**
 * The setting of the real dial with the thickest thinnest margin. Between the values that were
 * looked at margins are interpolated; what is recommended has been evaluated in full, together with
 * both ends of the dial's error.
 */
final class Recommendation {
  private static final int CANDIDATES = 400;
  private static final int MOST_ROUNDS = 5;
  private static final int MOST_REFUSALS = 6;

  /** Thinnest margins this close count as the same: the setting nearest to today's is taken. */
  private static final double SAME = 0.005;

  private final Profile profile;
  private final Yardstick yardstick;
  private final List<Window> windows;

  /**
   * Half as much again as is wanted is enough: beyond it no margin draws a dial away from today.
   */
  static final double ENOUGH = Math.log(1.5);

  private String why = "";

  Recommendation(Profile profile, Yardstick yardstick, List<Window> windows) {
    this.profile = profile;
    this.yardstick = yardstick;
    this.windows = windows;
  }

  /** Why nothing was found. */
  String why() {
    return why;
  }

  Optional<Double> find() {
    List<Double> settings = settings();
    if (settings.isEmpty()) {
      why =
          profile.dial().scale().error() > 0.0
              ? "no setting keeps the true value inside over the dial's error"
              : "no setting of the dial lies in the window";
      return Optional.empty();
    }
    int refused = 0;
    for (int n = 0; n < MOST_ROUNDS + MOST_REFUSALS; n++) {
      Map<Question, TreeMap<Double, Double>> margins = margins();
      double setting = best(settings, margins);
      boolean fresh = reach(setting).stream().anyMatch(x -> !profile.points().containsKey(x));
      boolean sound =
          reach(setting).stream().allMatch(x -> yardstick.broken(profile.at(x)).isEmpty());
      if (!sound) {
        // a hole that the margins did not betray: this setting is out, whatever lies around it
        settings.remove(setting);
        refused++;
        if (settings.isEmpty() || refused > MOST_REFUSALS) {
          why = "the settings that were tried break something within the dial's error";
          return Optional.empty();
        }
        continue;
      }
      if (!fresh || n >= MOST_ROUNDS) {
        return Optional.of(setting);
      }
    }
    why = "no setting was found";
    return Optional.empty();
  }

  /** True values that a setting may stand for: itself and both ends of the error. */
  private List<Double> reach(double setting) {
    double error = profile.dial().scale().error();
    return error == 0.0
        ? List.of(setting)
        : List.of(Math.max(setting - error, 0.0), setting, setting + error);
  }

  /** Settings of the real dial whose true value stays in one window. */
  private List<Double> settings() {
    double error = profile.dial().scale().error();
    List<Double> settings = new ArrayList<>();
    for (Window window : windows) {
      double low = window.low();
      double high = window.high();
      for (int i = 0; i <= CANDIDATES; i++) {
        double share = (double) i / CANDIDATES;
        double wish = low > 0.0 ? low * Math.pow(high / low, share) : low + share * (high - low);
        add(profile.dial().onScale(wish), window, error, settings);
      }
      add(profile.dial().value(), window, error, settings);
    }
    return settings;
  }

  private void add(double setting, Window window, double error, List<Double> into) {
    boolean nothingBelow = window.below().breaks().isEmpty();
    boolean nothingAbove = window.above().breaks().isEmpty();
    boolean inside =
        window.contains(setting)
            && (nothingBelow || setting - error >= window.low())
            && (nothingAbove || setting + error <= window.high());
    if (inside && !into.contains(setting)) {
      into.add(setting);
    }
  }

  /** Logarithms of the relative margins that this dial moves, by value. */
  private Map<Question, TreeMap<Double, Double>> margins() {
    SortedSet<Question> moved = profile.moved();
    moved.removeAll(Set.copyOf(yardstick.apart()));
    Map<Question, TreeMap<Double, Double>> margins = new TreeMap<>();
    profile
        .points()
        .forEach(
            (x, judgement) -> {
              for (Question question : moved) {
                OptionalDouble relative = Profile.relative(judgement, question);
                if (relative.isPresent()) {
                  margins
                      .computeIfAbsent(question, q -> new TreeMap<>())
                      .put(x, log(relative.getAsDouble()));
                }
              }
            });
    return margins;
  }

  private static double log(double margin) {
    return Math.max(-5.0, Math.min(ENOUGH, margin > 0.0 ? Math.log(margin) : -5.0));
  }

  private double best(List<Double> settings, Map<Question, TreeMap<Double, Double>> margins) {
    Map<Double, Double> thinnest = new TreeMap<>();
    settings.forEach(
        s ->
            thinnest.put(
                s, reach(s).stream().mapToDouble(x -> thinnest(x, margins)).min().orElseThrow()));
    double most = thinnest.values().stream().max(Comparator.naturalOrder()).orElseThrow();
    double today = profile.dial().value();
    return settings.stream()
        .filter(s -> thinnest.get(s) >= most - SAME)
        .min(Comparator.comparingDouble(s -> Math.abs(Math.log(Math.max(s, 1e-12) / today))))
        .orElseThrow();
  }

  private double thinnest(double x, Map<Question, TreeMap<Double, Double>> margins) {
    return margins.values().stream().mapToDouble(m -> interpolated(x, m)).min().orElse(0.0);
  }

  /** Between the values looked at on either side; a rule that is silent at both thins nothing. */
  private double interpolated(double x, NavigableMap<Double, Double> margin) {
    Double low = profile.points().floorKey(x);
    Double high = profile.points().ceilingKey(x);
    Double below = low == null ? null : margin.get(low);
    Double above = high == null ? null : margin.get(high);
    if (below == null || above == null) {
      return below == null && above == null ? ENOUGH : below == null ? above : below;
    }
    if (low.equals(high)) {
      return below;
    }
    double w = (x - low) / (high - low);
    return below + w * (above - below);
  }
}
