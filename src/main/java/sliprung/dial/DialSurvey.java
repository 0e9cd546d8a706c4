package sliprung.dial;

import java.util.List;
import sliprung.starter.Starter;

/**
 * Every dial of a starter.
 *
 * @param today judgement of today's settings
 * @param reports in the order of the file
 * @param evaluations how many settings were judged in full
 */
public record DialSurvey(Judgement today, List<DialReport> reports, int evaluations) {

  /** Copies the list. */
  public DialSurvey {
    reports = List.copyOf(reports);
  }

  /** Searches every dial; dials share nothing, so every core works on one. */
  public static DialSurvey of(Starter starter, Evaluation evaluation) {
    CountedEvaluation counted = new CountedEvaluation(evaluation);
    Judgement today = counted.at(starter);
    WindowSearch search = new WindowSearch(counted);
    List<DialReport> alone =
        Dials.of(starter).parallelStream().map(d -> search.of(starter, d)).toList();
    PairSearch pairs = new PairSearch(counted, starter, alone);
    List<DialReport> reports = alone.stream().map(pairs::complete).toList();
    return new DialSurvey(today, reports, counted.computed());
  }
}
