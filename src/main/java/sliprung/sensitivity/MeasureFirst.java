package sliprung.sensitivity;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import sliprung.review.FindingText;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/**
 * What to measure first: of each of the rules with the thinnest margins, which uncertain input
 * moves it most over what the input's evidence leaves open. The spreads are ours, to rank by; no
 * verdict rests on them.
 *
 * @param margins the thinnest first
 * @param readings what the readings of a real start leave open, in sentences; none: no readings
 */
public record MeasureFirst(List<ThinMargin> margins, List<String> readings) {
  /** How many rules are asked. */
  static final int RULES = 6;

  /** Nothing was asked. */
  public static final MeasureFirst NONE = new MeasureFirst(List.of(), List.of());

  /** A margin that moves less than this, over the wanted one, is not moved. */
  private static final double UNMOVED = 5e-3;

  /** Copies the lists. */
  public MeasureFirst {
    margins = List.copyOf(margins);
    readings = List.copyOf(readings);
  }

  /**
   * Of a review. Only the starts and corners that decide those margins today are computed again:
   * another corner may take over further out, so an end of a range may be a little thinner.
   */
  public static MeasureFirst of(Review review) {
    List<Finding> thin = thinnest(review);
    List<Narrowed> narrowed = StartReadings.of(review.starter());
    List<UncertainInput> inputs = UncertainInputs.of(review.starter(), narrowed);
    Map<Question, List<Sensitivity>> moved = new TreeMap<>();
    for (DecidingStarts starts : DecidingStarts.of(review, thin)) {
      for (Map.Entry<Question, List<Sensitivity>> e : moved(starts, inputs).entrySet()) {
        moved.put(e.getKey(), e.getValue());
      }
    }
    return new MeasureFirst(
        thin.stream()
            .filter(f -> moved.containsKey(Question.of(f)))
            .map(f -> new ThinMargin(f, moved.get(Question.of(f))))
            .toList(),
        StartReadings.says(review.starter(), narrowed));
  }

  /** The thinnest finding of each rule whose margin rests on a computed start. */
  static List<Finding> thinnest(Review review) {
    Map<String, Finding> byRule = new TreeMap<>();
    review.findings().stream()
        .filter(f -> f.start().isPresent() && f.verdict() != Verdict.NOT_JUDGED)
        .filter(f -> f.margin().isPresent() && f.wanted().orElse(0.0) > 0.0)
        .filter(f -> Double.isFinite(f.margin().getAsDouble()))
        .forEach(
            f ->
                byRule.merge(
                    f.rule(), f, (a, b) -> FindingText.share(b) < FindingText.share(a) ? b : a));
    return byRule.values().stream()
        .sorted(Comparator.comparingDouble(FindingText::share).thenComparing(Finding::rule))
        .limit(RULES)
        .toList();
  }

  private record Ends(Map<Question, OptionalDouble> low, Map<Question, OptionalDouble> high) {}

  /** What moves each margin that those starts give, the furthest first. */
  static Map<Question, List<Sensitivity>> moved(
      DecidingStarts starts, List<UncertainInput> inputs) {
    List<Ends> ends =
        inputs.parallelStream()
            .map(i -> new Ends(starts.margins(i.atLow()), starts.margins(i.atHigh())))
            .toList();
    Map<Question, List<Sensitivity>> moved = new TreeMap<>();
    for (Finding finding : starts.findings()) {
      Question question = Question.of(finding);
      List<Sensitivity> all = new ArrayList<>();
      for (int i = 0; i < inputs.size(); i++) {
        UncertainInput input = inputs.get(i);
        all.add(
            new Sensitivity(
                finding.rule(),
                finding.subject(),
                finding.margin().orElseThrow(),
                finding.wanted().orElseThrow(),
                input.path(),
                input.words(),
                input.grade(),
                input.low(),
                input.high(),
                ends.get(i).low().getOrDefault(question, OptionalDouble.empty()),
                ends.get(i).high().getOrDefault(question, OptionalDouble.empty())));
      }
      moved.put(
          question,
          all.stream()
              .filter(s -> s.reach() > UNMOVED)
              .sorted(
                  Comparator.comparingDouble(Sensitivity::reach)
                      .reversed()
                      .thenComparing(Sensitivity::words))
              .toList());
    }
    return moved;
  }

  /** What to measure first, in a sentence or two; empty where no margin was asked. */
  public Optional<String> says() {
    return margins.stream()
        .filter(m -> !m.inputs().isEmpty())
        .findFirst()
        .map(m -> "Thinnest margin that an input moves: " + m.named())
        .or(() -> margins.stream().findFirst().map(ThinMargin::named));
  }

  /**
   * A rule's question about a subject.
   *
   * @param rule {@code family/slug}
   * @param subject it is about
   */
  record Question(String rule, String subject) implements Comparable<Question> {
    static Question of(Finding finding) {
      return new Question(finding.rule(), finding.subject());
    }

    @Override
    public int compareTo(Question other) {
      return Comparator.comparing(Question::rule)
          .thenComparing(Question::subject)
          .compare(this, other);
    }
  }
}
