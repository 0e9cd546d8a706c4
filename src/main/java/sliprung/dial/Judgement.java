package sliprung.dial;

import java.util.Comparator;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.SortedMap;
import java.util.TreeMap;
import sliprung.rulebook.Verdict;

/**
 * What the rule book says of one setting, without the starts behind it.
 *
 * @param answers by rule and subject
 */
public record Judgement(SortedMap<Question, Answer> answers) {

  /**
   * One rule's question about one subject.
   *
   * @param rule {@code family/slug}
   * @param subject device, contactor, section, conductor or input
   */
  public record Question(String rule, String subject) implements Comparable<Question> {
    @Override
    public int compareTo(Question other) {
      return Comparator.comparing(Question::rule)
          .thenComparing(Question::subject)
          .compare(this, other);
    }
  }

  /**
   * One answer.
   *
   * @param verdict of the rule
   * @param margin 1 at the limit, larger is better; empty where the verdict has none
   * @param wanted margin, where there is a margin
   * @param circumstances start, corner and edge that decided, in words; may be empty
   * @param corner id of the deciding corner; may be empty
   */
  public record Answer(
      Verdict verdict,
      OptionalDouble margin,
      OptionalDouble wanted,
      String circumstances,
      String corner) {

    /** Margin over wanted margin; empty without a margin above 0. */
    public OptionalDouble relativeMargin() {
      return margin.isPresent() && wanted.isPresent()
          ? OptionalDouble.of(margin.getAsDouble() / wanted.getAsDouble())
          : OptionalDouble.empty();
    }

    boolean isBreach() {
      return verdict == Verdict.BREACH;
    }

    boolean isJudged() {
      return verdict != Verdict.NOT_JUDGED;
    }
  }

  /** Copies the map. */
  public Judgement {
    answers = java.util.Collections.unmodifiableSortedMap(new TreeMap<>(answers));
  }

  /** Answers from a map of any order. */
  public static Judgement of(Map<Question, Answer> answers) {
    return new Judgement(new TreeMap<>(answers));
  }
}
