package sliprung.dial;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import sliprung.dial.Judgement.Question;
import sliprung.starter.Starter;

/**
 * Looks for a second dial where one alone has no window: the second is set to a value at which it
 * eases what the first leaves broken, then the first is searched anew. Bounded: a few trials for
 * each dial. A pair that is found has been evaluated in full; that none was found proves nothing.
 */
final class PairSearch {
  private static final int MOST_TRIALS = 3;
  private static final int VALUES_OF_EACH = 2;
  private static final double LEAST_GAIN = 1e-3;

  /** What a broken question without a margin counts. */
  private static final double WITHOUT_MARGIN = -1.0;

  private final Evaluation evaluation;
  private final Starter starter;
  private final List<DialReport> reports;

  PairSearch(Evaluation evaluation, Starter starter, List<DialReport> reports) {
    this.evaluation = evaluation;
    this.starter = starter;
    this.reports = reports;
  }

  /**
   * A second dial at a value.
   *
   * @param further whether it breaks something that today is not broken
   * @param gain how much the margins of what is to be mended rise
   */
  private record Trial(Dial other, double value, boolean further, double gain) {}

  /** The report, with a pair where one was found. */
  DialReport complete(DialReport report) {
    if (!report.windows().isEmpty() || report.left().isEmpty()) {
      return report;
    }
    int looked = report.looked();
    for (Trial trial : trials(report)) {
      Starter other = trial.other().turned(starter, trial.value());
      Profile profile = new Profile(evaluation, other, report.dial());
      profile.lookAt(profile.grid());
      Judgement today = evaluation.at(starter);
      Set<Question> apart = new HashSet<>(report.apart());
      apart.retainAll(profile.unmovedOf(today));
      List<Window> windows = WindowSearch.windows(profile, new Yardstick(today, apart));
      looked += profile.points().size();
      if (!windows.isEmpty()) {
        Window widest =
            windows.stream()
                .max(Comparator.comparingDouble(w -> w.high() / Math.max(w.low(), 1e-9)))
                .orElseThrow();
        return report.with(new DialReport.Pair(trial.other(), trial.value(), widest), looked);
      }
    }
    return report;
  }

  private List<Trial> trials(DialReport report) {
    Judgement today = evaluation.at(starter);
    Set<Question> toMend = new HashSet<>(report.left());
    today
        .answers()
        .forEach((q, a) -> addIf(a.isBreach() && !report.apart().contains(q), q, toMend));
    List<Trial> trials = new ArrayList<>();
    for (DialReport second : reports) {
      if (second.dial().path().equals(report.dial().path()) || second.looked() == 0) {
        continue;
      }
      Profile profile = new Profile(evaluation, starter, second.dial());
      profile.lookAt(profile.grid());
      second.recommended().ifPresent(profile::at);
      for (Window window : second.noFurther()) {
        profile.at(inward(second.dial(), window.low(), window));
        profile.at(inward(second.dial(), window.high(), window));
      }
      Yardstick yardstick = new Yardstick(today, second.apart());
      Yardstick further = new Yardstick(today, breaches(today));
      profile.points().entrySet().stream()
          .map(
              e ->
                  new Trial(
                      second.dial(),
                      second.dial().onScale(e.getKey()), // it is searched there in full
                      !further.broken(e.getValue()).isEmpty(),
                      depth(yardstick, e.getValue(), toMend) - depth(yardstick, today, toMend)))
          .filter(t -> t.gain() > LEAST_GAIN)
          .sorted(ORDER)
          .limit(VALUES_OF_EACH)
          .forEach(trials::add);
    }
    return trials.stream().sorted(ORDER).limit(MOST_TRIALS).toList();
  }

  /** The setting of a dial at an end of a window, within the window where there is one. */
  private static double inward(Dial dial, double end, Window window) {
    double setting = dial.onScale(end);
    if (window.contains(setting)) {
      return setting;
    }
    double next = dial.neighbour(setting, setting > window.high() ? -1 : 1);
    return window.contains(next) ? next : setting;
  }

  private static final Comparator<Trial> ORDER =
      Comparator.comparing(Trial::further)
          .thenComparingDouble(t -> -t.gain())
          .thenComparingDouble(t -> Math.abs(Math.log(t.value() / t.other().value())));

  /** How far below their limits some questions lie in all; 0 where none is broken. */
  private static double depth(Yardstick yardstick, Judgement judgement, Set<Question> questions) {
    Set<Question> broken = yardstick.broken(judgement);
    return questions.stream()
        .filter(broken::contains)
        .mapToDouble(q -> Math.min(0.0, yardstick.height(judgement, q).orElse(WITHOUT_MARGIN)))
        .sum();
  }

  private static Set<Question> breaches(Judgement judgement) {
    Set<Question> breaches = new HashSet<>();
    judgement.answers().forEach((q, a) -> addIf(a.isBreach(), q, breaches));
    return breaches;
  }

  private static void addIf(boolean condition, Question question, Set<Question> into) {
    if (condition) {
      into.add(question);
    }
  }
}
