package sliprung.review;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/**
 * What the findings answer to one question.
 *
 * @param question asked
 * @param findings listed under it, worst first
 * @param elsewhere findings of this question's rules that could not be judged and are therefore
 *     listed under {@link Question#UNKNOWN}
 * @param mustJudgeMissing rules of this question that must be judged and were not
 */
public record Answer(
    Question question,
    List<Finding> findings,
    List<Finding> elsewhere,
    List<String> mustJudgeMissing) {

  /** Copies the lists. */
  public Answer {
    findings = List.copyOf(findings);
    elsewhere = List.copyOf(elsewhere);
    mustJudgeMissing = List.copyOf(mustJudgeMissing);
  }

  /**
   * The worst verdict of this question's rules; what was not judged counts, so that missing data
   * never looks like a pass. Of the last question: its worst finding, clear without one.
   */
  public Verdict worst() {
    Verdict worst =
        Stream.concat(findings.stream(), elsewhere.stream())
            .map(Finding::verdict)
            .min(Verdict::compareTo)
            .orElse(question == Question.UNKNOWN ? Verdict.CLEAR : Verdict.NOT_JUDGED);
    boolean missing = !mustJudgeMissing.isEmpty() && worst.compareTo(Verdict.NOT_JUDGED) > 0;
    return missing ? Verdict.NOT_JUDGED : worst;
  }

  /** The finding closest to its wanted margin, or furthest below it. */
  public Optional<Finding> thinnest() {
    return findings.stream()
        .filter(f -> f.margin().isPresent())
        .min(java.util.Comparator.comparingDouble(FindingText::share));
  }

  /** The finding to show first: the worst one. */
  public Optional<Finding> first() {
    return findings.stream().findFirst();
  }

  /**
   * A short word for the state of the question, such as {@code tight}; of the last one {@code 2
   * rules} or {@code nothing}.
   */
  public String word() {
    if (question != Question.UNKNOWN) {
      return worst().word();
    }
    long open =
        Stream.concat(
                findings.stream().filter(f -> f.verdict() == Verdict.NOT_JUDGED).map(Finding::rule),
                mustJudgeMissing.stream())
            .distinct()
            .count();
    return open == 0 ? "nothing" : open + (open == 1 ? " rule" : " rules");
  }
}
