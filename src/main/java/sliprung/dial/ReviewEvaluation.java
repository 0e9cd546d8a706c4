package sliprung.dial;

import java.time.LocalDate;
import java.util.Map;
import java.util.TreeMap;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.review.FindingText;
import sliprung.review.KnownStarts;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.Finding;
import sliprung.starter.Starter;

/** Judges by the whole review: every start at every corner, every rule. */
public final class ReviewEvaluation implements Evaluation {
  /** Findings about the description itself, which no dial mends: defaults, acceptances. */
  private static final java.util.Set<String> ABOUT_THE_FILE =
      java.util.Set.of("data/assumed", "data/accepted");

  private final LocalDate date;
  private final KnownStarts known;

  /**
   * An evaluation.
   *
   * @param date at which accepted deviations are judged
   * @param today the starter as it is set: turning a device's dial leaves its starts as they are
   */
  public ReviewEvaluation(LocalDate date, Starter today) {
    this.date = date;
    this.known = new KnownStarts(today);
  }

  @Override
  public Judgement at(Starter starter) {
    return judgement(Reviewer.review(starter, date, known));
  }

  /** The answers of a review. */
  public static Judgement judgement(Review review) {
    Map<Question, Answer> answers = new TreeMap<>();
    for (Finding finding : review.findings()) {
      if (!ABOUT_THE_FILE.contains(finding.rule())) {
        answers.put(new Question(finding.rule(), finding.subject()), answer(finding));
      }
    }
    return Judgement.of(answers);
  }

  private static Answer answer(Finding finding) {
    return new Answer(
        finding.verdict(),
        finding.margin(),
        finding.wanted(),
        FindingText.decidedBy(finding),
        finding.start().map(s -> s.corner().id()).orElse(""));
  }
}
