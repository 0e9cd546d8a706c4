package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.FindingText;
import sliprung.review.Question;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/** The four questions: at a glance, then each with its findings. */
final class AnswerPart {
  private AnswerPart() {}

  /** A row for each question with its state and its worst finding. */
  static void glance(Html page, Answers answers) {
    page.open("table", "class", "glance", "aria-label", "The four questions");
    page.open("tbody");
    for (Answer answer : answers.answers()) {
      page.open("tr");
      page.open("th", "scope", "row");
      page.open("a", "href", "#question-" + answer.question().number());
      page.text(answer.question().number() + " " + answer.question().words()).close();
      page.end();
      page.open("td", "class", "state");
      page.element("span", answer.word(), "class", style(answer)).end();
      page.element("td", worst(answer));
      page.end();
    }
    page.end();
    page.end();
  }

  private static String style(Answer answer) {
    return answer.question() == Question.UNKNOWN && answer.word().equals("nothing")
        ? "clear"
        : style(answer.worst());
  }

  private static String worst(Answer answer) {
    boolean last = answer.question() == Question.UNKNOWN;
    Optional<Finding> shown =
        last
            ? answer.first().filter(f -> f.verdict() != Verdict.TIGHT)
            : answer.first().filter(f -> f.verdict() == Verdict.BREACH).or(answer::thinnest);
    List<String> texts = new ArrayList<>();
    if (!answer.mustJudgeMissing().isEmpty()) {
      texts.add(mustJudge(answer));
    }
    shown.or(() -> last ? Optional.empty() : answer.first()).ifPresent(f -> texts.add(line(f)));
    if (!last && !answer.elsewhere().isEmpty()) {
      texts.add(answer.elsewhere().size() + " not judged: see 4.");
    }
    if (last) {
      texts.add("Unbalanced faults are never judged.");
    } else if (texts.isEmpty()) {
      texts.add("Nothing was judged.");
    }
    return String.join(" ", texts);
  }

  private static String line(Finding finding) {
    String margin = FindingText.marginOfWanted(finding);
    String text = FindingText.because(finding) + ".";
    String words = text.toLowerCase(Locale.ROOT);
    boolean named = words.contains(finding.subject().toLowerCase(Locale.ROOT));
    String lead = named ? "" : finding.subject() + ": ";
    return lead + text + (margin.isEmpty() ? "" : " Margin " + margin + " wanted.");
  }

  private static String mustJudge(Answer answer) {
    List<String> rules = answer.mustJudgeMissing();
    return String.join(", ", rules)
        + " must be judged and "
        + (rules.size() == 1 ? "was not." : "were not.");
  }

  /** One question with its findings. */
  static void write(Html page, Answer answer) {
    Question question = answer.question();
    page.section("question-" + question.number(), question.number() + "  " + question.words());
    if (!answer.mustJudgeMissing().isEmpty()) {
      page.element(
          "p", "Must be judged and was not: " + String.join(", ", answer.mustJudgeMissing()) + ".");
    }
    if (!answer.elsewhere().isEmpty()) {
      String subjects =
          answer.elsewhere().stream()
              .map(f -> f.subject() + " (" + f.rule() + ")")
              .distinct()
              .collect(Collectors.joining(", "));
      page.element("p", "Not judged, and listed under question 4: " + subjects + ".");
    }
    FindingPart.write(page, answer.findings());
    if (answer.findings().isEmpty()) {
      page.element(
          "p",
          question == Question.UNKNOWN
              ? "Every rule that was asked found the data it needs."
              : "No rule has given an answer here.");
    }
    page.end();
  }

  static String style(Verdict verdict) {
    return verdict.word().replace(' ', '-');
  }
}
