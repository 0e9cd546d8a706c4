package sliprung.dial;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.starter.Starter;

/**
 * Finds the windows of a dial: a grid of full evaluations, what the margins betray between its
 * values, the ends by root search, and the recommended setting.
 */
public final class WindowSearch {
  private static final int MOST_ROUNDS = 3;

  private final Evaluation evaluation;

  /** A search that asks that evaluation, from several threads. */
  public WindowSearch(Evaluation evaluation) {
    this.evaluation = evaluation;
  }

  /** The report of one dial. */
  public DialReport of(Starter starter, Dial dial) {
    Profile profile = new Profile(evaluation, starter, dial);
    if (!(dial.high() > 0.0)) {
      return nothing(profile, "set to 0 and no dial range given: nothing to search");
    }
    profile.lookAt(profile.grid());
    Set<Question> apart = profile.unmoved();
    List<Window> windows = windows(profile, new Yardstick(profile.today(), apart));
    // a breach that seemed out of reach may move at a value that was looked at since
    for (int n = 0; n < MOST_ROUNDS && !profile.unmoved().equals(apart); n++) {
      apart = profile.unmoved();
      windows = windows(profile, new Yardstick(profile.today(), apart));
    }
    Yardstick yardstick = new Yardstick(profile.today(), apart);
    return windows.isEmpty() ? empty(profile, yardstick) : inside(profile, yardstick, windows);
  }

  private static DialReport inside(Profile profile, Yardstick yardstick, List<Window> windows) {
    Recommendation recommendation = new Recommendation(profile, yardstick, windows);
    Optional<Double> setting = recommendation.find();
    return new DialReport(
        profile.dial(),
        windows,
        new TreeSet<>(yardstick.apart()),
        setting,
        setting.isPresent() ? "" : recommendation.why(),
        Optional.empty(),
        new TreeSet<>(),
        List.of(),
        Optional.empty(),
        profile.points().size());
  }

  private static DialReport empty(Profile profile, Yardstick yardstick) {
    double best = best(profile, yardstick);
    Set<Question> ofToday = new TreeSet<>();
    profile.today().answers().forEach((q, a) -> addIf(a.isBreach(), q, ofToday));
    SortedSet<Question> left = yardstick.broken(profile.at(best));
    List<Window> noFurther =
        ofToday.isEmpty() ? List.of() : windows(profile, new Yardstick(profile.today(), ofToday));
    return new DialReport(
        profile.dial(),
        List.of(),
        new TreeSet<>(yardstick.apart()),
        Optional.empty(),
        "no value of this dial alone breaks nothing",
        Optional.of(best),
        left,
        noFurther,
        Optional.empty(),
        profile.points().size());
  }

  private static DialReport nothing(Profile profile, String why) {
    return new DialReport(
        profile.dial(),
        List.of(),
        new TreeSet<>(),
        Optional.empty(),
        why,
        Optional.empty(),
        new TreeSet<>(),
        List.of(),
        Optional.empty(),
        0);
  }

  private static void addIf(boolean condition, Question question, Set<Question> into) {
    if (condition) {
      into.add(question);
    }
  }

  /** The value that breaks the fewest questions, of these the one with the thickest margin. */
  static double best(Profile profile, Yardstick yardstick) {
    return profile.points().entrySet().stream()
        .min(
            Comparator.comparingInt(
                    (Map.Entry<Double, Judgement> e) -> yardstick.broken(e.getValue()).size())
                .thenComparingDouble(e -> -thinnest(yardstick, e.getValue())))
        .orElseThrow()
        .getKey();
  }

  private static double thinnest(Yardstick yardstick, Judgement judgement) {
    return yardstick.broken(judgement).stream()
        .map(q -> yardstick.height(judgement, q))
        .filter(OptionalDouble::isPresent)
        .mapToDouble(OptionalDouble::getAsDouble)
        .min()
        .orElse(0.0);
  }

  /** The windows along a profile whose grid has been looked at. */
  static List<Window> windows(Profile profile, Yardstick yardstick) {
    GapSearch gaps = new GapSearch(profile, yardstick);
    gaps.dips();
    gaps.bridges();
    EdgeSearch edges = new EdgeSearch(profile, yardstick);
    List<Double> xs = profile.values();
    List<Window> windows = new ArrayList<>();
    int i = 0;
    while (i < xs.size()) {
      if (!yardstick.broken(profile.at(xs.get(i))).isEmpty()) {
        i++;
        continue;
      }
      int last = i;
      while (last + 1 < xs.size() && yardstick.broken(profile.at(xs.get(last + 1))).isEmpty()) {
        last++;
      }
      windows.add(window(profile, yardstick, edges, xs, i, last));
      i = last + 1;
    }
    return windows;
  }

  private static Window window(
      Profile profile,
      Yardstick yardstick,
      EdgeSearch edges,
      List<Double> xs,
      int first,
      int last) {
    double low = xs.get(first);
    double high = xs.get(last);
    Window.Bound below = Window.Bound.ofRange(low);
    Window.Bound above = Window.Bound.ofRange(high);
    if (first > 0) {
      EdgeSearch.Edge edge = edges.between(low, xs.get(first - 1));
      low = edge.inside();
      below = bound(profile, yardstick, edge.outside());
    }
    if (last + 1 < xs.size()) {
      EdgeSearch.Edge edge = edges.between(high, xs.get(last + 1));
      high = edge.inside();
      above = bound(profile, yardstick, edge.outside());
    }
    return new Window(low, high, below, above);
  }

  /** Of what breaks just outside, the question nearest to its limit: the others break after it. */
  private static Window.Bound bound(Profile profile, Yardstick yardstick, double outside) {
    Judgement judgement = profile.at(outside);
    Question first =
        yardstick.broken(judgement).stream()
            .min(
                Comparator.comparingDouble(
                        (Question q) ->
                            -yardstick.height(judgement, q).orElse(Double.NEGATIVE_INFINITY))
                    .thenComparing(q -> q))
            .orElseThrow();
    Optional<Answer> answer = Optional.ofNullable(judgement.answers().get(first));
    return new Window.Bound(outside, Optional.of(first), answer);
  }
}
