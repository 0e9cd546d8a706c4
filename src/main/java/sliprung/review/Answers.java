package sliprung.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.starter.Starter;

/**
 * A review as people ask for it: one headline, then the findings under the four questions. Terminal
 * and page read the same words from here.
 *
 * @param headline one to three sentences; never reads clear while a must-judge rule is not judged
 * @param answers one for each question, in their order
 */
public record Answers(String headline, List<Answer> answers) {
  private static final Comparator<Finding> WORST_FIRST =
      Comparator.comparing(Finding::verdict)
          .thenComparingDouble(FindingText::share)
          .thenComparing(Finding::rule)
          .thenComparing(Finding::subject);

  /** Under the last question what was not judged comes before defaults that decided something. */
  private static final Comparator<Finding> OPEN_FIRST =
      Comparator.<Finding>comparingInt(
              f -> f.verdict() == Verdict.BREACH ? 0 : f.verdict() == Verdict.NOT_JUDGED ? 1 : 2)
          .thenComparing(WORST_FIRST);

  /** Copies the list. */
  public Answers {
    answers = List.copyOf(answers);
  }

  /** The answers of a review. */
  public static Answers of(Review review) {
    List<Answer> answers = new ArrayList<>();
    for (Question question : Question.values()) {
      answers.add(answer(question, review));
    }
    return new Answers(headline(review), answers);
  }

  /** The answer to one question. */
  public Answer to(Question question) {
    return answers.get(question.ordinal());
  }

  /**
   * What was reviewed, in one line: {@code JC-1 primary jaw crusher · iec · 690 V 50 Hz 200 kW · 5
   * sections · 144 starts}.
   */
  public static String banner(Review review) {
    Starter starter = review.starter();
    int sections = starter.sectionCount();
    return String.join(
        " · ",
        starter.name(),
        starter.practice().name().toLowerCase(java.util.Locale.ROOT),
        Show.volts(starter.supply().voltage())
            + " "
            + Show.three(starter.supply().frequency())
            + "\u00a0Hz "
            + Show.three(starter.motor().powerWatts() / 1000.0)
            + "\u00a0kW",
        sections + (sections == 1 ? " section" : " sections"),
        review.starts().size() + " starts");
  }

  private static Answer answer(Question question, Review review) {
    List<Finding> here = new ArrayList<>();
    List<Finding> elsewhere = new ArrayList<>();
    for (Finding finding : review.findings()) {
      Question asked = Question.of(finding.rule());
      Question listed = finding.verdict() == Verdict.NOT_JUDGED ? Question.UNKNOWN : asked;
      if (listed == question) {
        here.add(finding);
      } else if (asked == question) {
        elsewhere.add(finding);
      }
    }
    here.sort(question == Question.UNKNOWN ? OPEN_FIRST : WORST_FIRST);
    elsewhere.sort(WORST_FIRST);
    List<String> missing =
        review.mustJudgeMissing().stream()
            .filter(r -> question == Question.UNKNOWN || Question.of(r) == question)
            .toList();
    return new Answer(question, here, elsewhere, missing);
  }

  private static String headline(Review review) {
    List<String> sentences = new ArrayList<>();
    List<Finding> breaches =
        review.findings().stream()
            .filter(f -> f.verdict() == Verdict.BREACH)
            .sorted(WORST_FIRST)
            .toList();
    List<String> missing = review.mustJudgeMissing();
    if (!breaches.isEmpty()) {
      Finding worst = breaches.get(0);
      sentences.add(breaches.size() == 1 ? "One breach." : breaches.size() + " breaches.");
      sentences.add("Worst: " + named(worst));
    } else {
      sentences.add(noBreach(review));
    }
    if (!missing.isEmpty()) {
      sentences.add(
          (missing.size() == 1
                  ? "A rule that must be judged was not judged: "
                  : missing.size() + " rules that must be judged were not judged: ")
              + String.join(", ", missing)
              + ".");
    }
    if (breaches.isEmpty()) {
      thinnest(review).ifPresent(f -> sentences.add("Thinnest: " + thin(f)));
    }
    return String.join(" ", sentences);
  }

  private static String noBreach(Review review) {
    boolean judged = review.findings().stream().anyMatch(f -> f.verdict() != Verdict.NOT_JUDGED);
    if (!judged) {
      return "Nothing could be judged.";
    }
    long accepted = review.findings().stream().filter(f -> f.verdict() == Verdict.ACCEPTED).count();
    String found = review.mustJudgeMissing().isEmpty() ? "No breach" : "No breach found";
    return accepted == 0
        ? found + "."
        : found + " but " + accepted + (accepted == 1 ? " accepted deviation." : " accepted ones.");
  }

  /** The judged finding closest to its wanted margin; accepted ones count. */
  public static Optional<Finding> thinnest(Review review) {
    return review.findings().stream()
        .filter(f -> f.verdict() != Verdict.NOT_JUDGED && f.margin().isPresent())
        .min(Comparator.comparingDouble(FindingText::share).thenComparing(WORST_FIRST));
  }

  private static String thin(Finding finding) {
    double margin = finding.margin().orElse(Double.POSITIVE_INFINITY);
    if (finding.rule().equals("trip/start")
        && finding.start().isPresent()
        && margin >= 1.0
        && margin < 2.0) {
      String start = finding.start().get().words();
      return finding.subject()
          + " comes within "
          + Show.percent(margin - 1.0)
          + " of tripping a "
          + start
          + ".";
    }
    return named(finding);
  }

  /** The first sentence about a finding, led by its subject where the sentence does not name it. */
  private static String named(Finding finding) {
    String sentence = FindingText.firstSentence(finding.says());
    return sentence
            .toLowerCase(java.util.Locale.ROOT)
            .contains(finding.subject().toLowerCase(java.util.Locale.ROOT))
        ? sentence
        : finding.subject() + ": " + sentence;
  }
}
