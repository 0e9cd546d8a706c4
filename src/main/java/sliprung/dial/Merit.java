package sliprung.dial;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;

/**
 * How good a set of settings is: first what is broken, then the thinnest margin of what the dials
 * move, then how much is missing to the wanted margins in all.
 *
 * @param broken how many questions are broken, those apart not counted
 * @param thinnest least logarithm of a relative margin, at most {@link Recommendation#ENOUGH}
 * @param missing sum of the logarithms below 0
 */
record Merit(int broken, double thinnest, double missing) implements Comparable<Merit> {
  private static final double SAME = 1e-4;
  private static final double FLOOR = -5.0;

  /** The merit of a judgement, counting the margins of some questions. */
  static Merit of(Judgement judgement, Yardstick yardstick, Set<Question> counted) {
    double thinnest = Recommendation.ENOUGH;
    double missing = 0.0;
    for (Map.Entry<Question, Answer> e : judgement.answers().entrySet()) {
      OptionalDouble height = height(e.getValue());
      if (counted.contains(e.getKey()) && height.isPresent()) {
        thinnest = Math.min(thinnest, height.getAsDouble());
        missing += Math.min(0.0, height.getAsDouble());
      }
    }
    return new Merit(yardstick.broken(judgement).size(), thinnest, missing);
  }

  /** Logarithm of the relative margin; empty where there is none. */
  static OptionalDouble height(Answer answer) {
    OptionalDouble relative = answer.isJudged() ? answer.relativeMargin() : OptionalDouble.empty();
    if (relative.isEmpty()) {
      return relative;
    }
    double margin = relative.getAsDouble();
    return OptionalDouble.of(
        margin > 0.0 ? Math.max(FLOOR, Math.min(3.0, Math.log(margin))) : FLOOR);
  }

  /** Above 0 where this is better. */
  @Override
  public int compareTo(Merit other) {
    if (broken != other.broken) {
      return Integer.compare(other.broken, broken);
    }
    if (Math.abs(thinnest - other.thinnest) > SAME) {
      return Double.compare(thinnest, other.thinnest);
    }
    return Math.abs(missing - other.missing) > SAME ? Double.compare(missing, other.missing) : 0;
  }

  /** Whether this is as good as the other but for a little of the margins. */
  boolean isAbout(Merit other, double little) {
    return broken <= other.broken
        && thinnest >= other.thinnest - little
        && missing >= other.missing - little;
  }
}
