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
    page.open("section", "id", "question-" + question.number()).markup("\n");
    page.element("h2", question.number() + "  " + question.words());
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
    List<Finding> clear = new ArrayList<>();
    List<Finding> defaults = new ArrayList<>();
    for (Finding finding : answer.findings()) {
      if (finding.rule().equals("data/assumed") && finding.verdict() != Verdict.BREACH) {
        defaults.add(finding);
      } else if (finding.verdict() == Verdict.CLEAR) {
        clear.add(finding);
      } else {
        block(page, finding);
      }
    }
    if (!clear.isEmpty()) {
      clears(page, clear);
    }
    if (!defaults.isEmpty()) {
      defaults(page, defaults);
    }
    if (answer.findings().isEmpty()) {
      page.element(
          "p",
          question == Question.UNKNOWN
              ? "Every rule that was asked found the data it needs."
              : "No rule has given an answer here.");
    }
    page.end();
  }

  private static void block(Html page, Finding finding) {
    page.open("article", "class", "finding is-" + style(finding.verdict()));
    page.open("h3");
    page.open("span", "class", style(finding.verdict())).text(finding.verdict().word()).close();
    page.text(" ").open("b").text(finding.subject()).close();
    String margin = FindingText.marginOfWanted(finding);
    if (!margin.isEmpty()) {
      page.text(" margin " + margin + (finding.wanted().isPresent() ? " wanted" : ""));
    }
    page.end();
    page.element("p", finding.says());
    if (!finding.missing().isEmpty()) {
      page.element("p", "Missing: " + String.join(", ", finding.missing()) + ".");
    }
    if (!finding.mend().isEmpty()) {
      page.open("p").open("b").text("Next: ").close().text(finding.mend()).end();
    }
    finding
        .by()
        .ifPresent(
            by ->
                page.element(
                    "p",
                    "Accepted by "
                        + by
                        + finding.until().map(d -> " until " + d).orElse("")
                        + "."));
    page.open("p", "class", "quiet");
    page.text(evidence(finding)).text(" ");
    page.open("code").text(finding.rule()).close();
    page.end();
    page.end();
  }

  private static void defaults(Html page, List<Finding> findings) {
    Cells cells =
        new Cells(page)
            .open(
                "Defaults, taken because the file is silent, that decided a verdict; tight: it"
                    + " decided a breach or a tight margin",
                List.of("input", "verdict", "what was taken, and what it decided", "next"));
    findings.forEach(f -> cells.row(f.subject(), f.verdict().word(), f.says(), f.mend()));
    cells.close();
  }

  private static String evidence(Finding finding) {
    List<String> parts = new ArrayList<>();
    parts.add(FindingText.valueAgainstLimit(finding));
    parts.add(FindingText.decidedBy(finding));
    parts.add(finding.reference());
    parts.add(finding.weakestInput().isEmpty() ? "" : "rests on " + finding.weakestInput());
    return parts.stream().filter(p -> !p.isEmpty()).collect(Collectors.joining(" · "));
  }

  private static void clears(Html page, List<Finding> findings) {
    page.open("div", "class", "wide").open("table", "class", "clears").markup("\n");
    page.element("caption", "Clear, the thinnest margin first");
    page.open("thead").open("tr");
    for (String head : List.of("subject", "margin", "what happens, and what decided it", "rule")) {
      page.element("th", head, "scope", "col");
    }
    page.end().end();
    page.open("tbody").markup("\n");
    for (Finding finding : findings) {
      page.open("tr");
      page.element("th", finding.subject(), "scope", "row");
      page.element("td", FindingText.marginOfWanted(finding));
      page.open("td").text(finding.says());
      page.empty("br");
      page.open("span", "class", "quiet").text(evidence(finding)).end();
      page.end();
      page.open("td").open("code").text(finding.rule()).close().end();
      page.end();
    }
    page.end().end().end();
  }

  private static String style(Verdict verdict) {
    return verdict.word().replace(' ', '-');
  }
}
