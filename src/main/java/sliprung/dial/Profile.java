package sliprung.dial;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.NavigableMap;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;

/** Judgements along one dial, the others as they are; every value that was looked at is kept. */
final class Profile {
  private static final double UNMOVED = 1e-3;
  private static final double RATIO = 1.55;
  private static final int LEAST_INTERVALS = 6;
  private static final int MOST_INTERVALS = 14;

  private final Evaluation evaluation;
  private final sliprung.starter.Starter starter;
  private final Dial dial;
  private final TreeMap<Double, Judgement> points = new TreeMap<>();

  Profile(Evaluation evaluation, sliprung.starter.Starter starter, Dial dial) {
    this.evaluation = evaluation;
    this.starter = starter;
    this.dial = dial;
  }

  Dial dial() {
    return dial;
  }

  /** The judgement at a value. */
  Judgement at(double x) {
    Judgement known = points.get(x);
    if (known == null) {
      known = evaluation.at(dial.turned(starter, x));
      points.put(x, known);
    }
    return known;
  }

  /** Today's judgement. */
  Judgement today() {
    return at(dial.value());
  }

  NavigableMap<Double, Judgement> points() {
    return points;
  }

  /** Looks at several values at once, on every core. */
  void lookAt(double[] values) {
    double[] fresh = Arrays.stream(values).filter(x -> !points.containsKey(x)).distinct().toArray();
    List<Judgement> judged =
        Arrays.stream(fresh).boxed().toList().parallelStream()
            .map(x -> evaluation.at(dial.turned(starter, x)))
            .toList();
    for (int i = 0; i < fresh.length; i++) {
      points.put(fresh[i], judged.get(i));
    }
  }

  /** First values: today's, both ends, and between them in equal ratios. */
  double[] grid() {
    double low = dial.low();
    double high = dial.high();
    // a range that begins at 0 has no ratio: its least part is one interval
    double first =
        low > 0.0 ? low : Math.min(dial.value() > 0.0 ? dial.value() : high, high) / 64.0;
    Set<Double> grid = new TreeSet<>();
    grid.add(low);
    if (dial.value() > first && dial.value() < high) {
      intervals(first, dial.value(), grid);
      intervals(dial.value(), high, grid);
    } else {
      intervals(first, high, grid);
    }
    grid.add(dial.value());
    return grid.stream().mapToDouble(Double::doubleValue).toArray();
  }

  private static void intervals(double from, double to, Set<Double> into) {
    double span = Math.log(to / from);
    int n = (int) Math.round(span / Math.log(RATIO));
    n = Math.max(LEAST_INTERVALS / 2, Math.min(MOST_INTERVALS, n));
    into.add(from);
    for (int i = 1; i < n; i++) {
      into.add(from * Math.exp(span * i / n));
    }
    into.add(to);
  }

  /** Breaches of today that no value of this dial mends or moves. */
  Set<Question> unmoved() {
    return unmovedOf(today());
  }

  /** Breaches of a judgement that no value of this dial mends or moves. */
  Set<Question> unmovedOf(Judgement judgement) {
    Set<Question> unmoved = new HashSet<>();
    for (Map.Entry<Question, Answer> e : judgement.answers().entrySet()) {
      if (e.getValue().isBreach() && isUnmovedBreach(e.getKey())) {
        unmoved.add(e.getKey());
      }
    }
    return unmoved;
  }

  private boolean isUnmovedBreach(Question question) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    int without = 0;
    for (Judgement judgement : points.values()) {
      Answer answer = judgement.answers().get(question);
      if (answer == null || !answer.isBreach()) {
        return false;
      }
      if (answer.margin().isEmpty()) {
        without++;
        continue;
      }
      least = Math.min(least, answer.margin().getAsDouble());
      most = Math.max(most, answer.margin().getAsDouble());
    }
    if (without > 0) {
      return without == points.size();
    }
    return most - least <= UNMOVED * Math.max(Math.abs(most), Math.abs(least));
  }

  /** Questions whose relative margin this dial moves. */
  SortedSet<Question> moved() {
    SortedSet<Question> all = new TreeSet<>();
    points.values().forEach(j -> all.addAll(j.answers().keySet()));
    SortedSet<Question> moved = new TreeSet<>();
    for (Question question : all) {
      double[] margins =
          points.values().stream()
              .map(j -> relative(j, question))
              .filter(OptionalDouble::isPresent)
              .mapToDouble(OptionalDouble::getAsDouble)
              .toArray();
      double least = Arrays.stream(margins).min().orElse(0.0);
      double most = Arrays.stream(margins).max().orElse(0.0);
      if (most - least > UNMOVED * Math.abs(most)) {
        moved.add(question);
      }
    }
    return moved;
  }

  static OptionalDouble relative(Judgement judgement, Question question) {
    Answer answer = judgement.answers().get(question);
    return answer == null || !answer.isJudged() ? OptionalDouble.empty() : answer.relativeMargin();
  }

  /** The values looked at, rising. */
  List<Double> values() {
    return new ArrayList<>(points.keySet());
  }
}
