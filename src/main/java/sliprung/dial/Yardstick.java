package sliprung.dial;

import java.util.HashSet;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;

/**
 * What counts as broken, against today's settings: every breach but those set apart, and every
 * question that was judged today and is not any more. A missing verdict never passes.
 *
 * @param today judgement of today's settings
 * @param apart breaches that are not counted
 */
record Yardstick(Judgement today, Set<Question> apart) {

  /**
   * Rules that name as subjects only what circumstances bring up. A subject of theirs may go; the
   * rule itself must still answer.
   */
  private static final Set<String> SUBJECTS_COME_AND_GO =
      Set.of("held/opens-what", "data/plausible", "data/extrapolated");

  private static final double MOST = 3.0;
  private static final double LEAST = -5.0;

  /** Copies the set. */
  Yardstick {
    apart = Set.copyOf(apart);
  }

  /** The questions that a judgement breaks. */
  SortedSet<Question> broken(Judgement judgement) {
    SortedSet<Question> broken = new TreeSet<>();
    Set<String> answering = new HashSet<>();
    for (Map.Entry<Question, Answer> e : judgement.answers().entrySet()) {
      answering.add(e.getKey().rule());
      boolean counts =
          e.getValue().isBreach()
              ? !apart.contains(e.getKey())
              : !e.getValue().isJudged() && wasJudged(e.getKey());
      if (counts) {
        broken.add(e.getKey());
      }
    }
    for (Map.Entry<Question, Answer> e : today.answers().entrySet()) {
      Question question = e.getKey();
      boolean gone =
          SUBJECTS_COME_AND_GO.contains(question.rule())
              ? !answering.contains(question.rule())
              : !judgement.answers().containsKey(question);
      if (gone && e.getValue().isJudged()) {
        broken.add(question);
      }
    }
    return broken;
  }

  /** A question of a new subject was judged where its rule left nothing unjudged. */
  private boolean wasJudged(Question question) {
    Answer before = today.answers().get(question);
    if (before != null) {
      return before.isJudged();
    }
    return today.answers().entrySet().stream()
        .filter(e -> e.getKey().rule().equals(question.rule()))
        .allMatch(e -> e.getValue().isJudged());
  }

  /**
   * Logarithm of a question's margin: below 0 where it is broken. Empty where the margin does not
   * tell: no margin, no answer, or a verdict that the margin alone does not give.
   */
  OptionalDouble height(Judgement judgement, Question question) {
    Answer answer = judgement.answers().get(question);
    if (answer == null || !answer.isJudged() || answer.margin().isEmpty()) {
      return OptionalDouble.empty();
    }
    double margin = answer.margin().getAsDouble();
    double height = margin <= 0.0 ? LEAST : Math.max(LEAST, Math.min(MOST, Math.log(margin)));
    return answer.isBreach() == (height < 0.0) ? OptionalDouble.of(height) : OptionalDouble.empty();
  }

  /** Least height of some questions; empty where one of them has none. */
  OptionalDouble least(Judgement judgement, Set<Question> questions) {
    double least = Double.POSITIVE_INFINITY;
    for (Question question : questions) {
      OptionalDouble height = height(judgement, question);
      if (height.isEmpty()) {
        return height;
      }
      least = Math.min(least, height.getAsDouble());
    }
    return questions.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(least);
  }
}
