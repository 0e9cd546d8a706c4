package sliprung.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.FindingText;
import sliprung.review.Question;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.sensitivity.MeasureFirst;

/** A review as a technician reads it on a terminal: plain lines that survive a pipe. */
final class Summary {
  private static final String INDENT = "   ";
  private static final int VERDICT = 12;
  private static final int SUBJECT = 18;
  private static final int MARGIN = 15;
  private static final int CLEAR_SHOWN = 3;

  private final PrintWriter out;
  private final Terminal terminal;
  private final boolean everything;

  /**
   * A summary.
   *
   * @param everything every clear finding too, not only the thinnest of each question
   */
  Summary(PrintWriter out, Terminal terminal, boolean everything) {
    this.out = out;
    this.terminal = terminal;
    this.everything = everything;
  }

  /**
   * Prints a review.
   *
   * @param seconds that it took
   * @param measureFirst what to measure first; none where nobody asked
   */
  void print(Review review, double seconds, MeasureFirst measureFirst) {
    Answers answers = Answers.of(review);
    wrapped(
        "",
        Printable.of(Answers.banner(review))
            + String.format(Locale.ROOT, " computed in %.1f s", seconds),
        "  ");
    out.println();
    for (String line : wrap(Printable.of(answers.headline()), terminal.columns())) {
      out.println(terminal.strong(line));
    }
    measureFirst.readings().forEach(says -> wrapped("", Printable.of(says), "  "));
    measureFirst.says().ifPresent(says -> wrapped("", Printable.of(says), "  "));
    review.method().ifPresent(m -> wrapped("", "Model error: " + Printable.of(m.says()), "  "));
    for (Answer answer : answers.answers()) {
      out.println();
      out.println(terminal.strong(answer.question().number() + "  " + answer.question().words()));
      answer(answer, review);
    }
    out.println();
  }

  private void answer(Answer answer, Review review) {
    int clear = 0;
    int hidden = 0;
    for (Finding finding : answer.findings()) {
      if (finding.verdict() == Verdict.CLEAR && !everything && ++clear > CLEAR_SHOWN) {
        hidden++;
        continue;
      }
      finding(finding);
    }
    if (hidden > 0) {
      out.println(INDENT + "and " + hidden + " more clear (--all shows them)");
    }
    if (!answer.elsewhere().isEmpty()) {
      wrapped(
          INDENT,
          "not judged here, see 4: "
              + String.join(
                  ", ", answer.elsewhere().stream().map(Finding::rule).distinct().toList()),
          INDENT);
    }
    if (answer.question() == Question.UNKNOWN) {
      outOfReach(review);
    }
  }

  private void outOfReach(Review review) {
    review
        .notApplicable()
        .forEach(
            n ->
                wrapped(
                    INDENT,
                    String.format("%-" + VERDICT + "s", "no subject")
                        + n.rule()
                        + ": "
                        + Printable.of(n.because()),
                    INDENT + " ".repeat(VERDICT)));
    if (!review.notBuilt().isEmpty()) {
      wrapped(
          INDENT,
          "not built    "
              + review.notBuilt().size()
              + " rules of the book: "
              + String.join(", ", review.notBuilt()),
          INDENT + " ".repeat(VERDICT));
    }
    if (!review.starter().notYetJudged().isEmpty()) {
      wrapped(
          INDENT,
          "not yet used "
              + "read and kept, no rule that is built asks for it: "
              + Printable.of(String.join(", ", review.starter().notYetJudged())),
          INDENT + " ".repeat(VERDICT));
    }
    wrapped(
        INDENT,
        "not solved   unbalanced faults: one pole, one phase, an open section, a lifted brush",
        INDENT + " ".repeat(VERDICT));
  }

  private void finding(Finding finding) {
    String margin = FindingText.marginOfWanted(finding);
    String head =
        String.format(
            "%-" + SUBJECT + "s %-" + MARGIN + "s %s",
            Printable.of(finding.subject()),
            margin.isEmpty() ? "–" : margin,
            finding.rule());
    out.println(INDENT + terminal.verdict(finding.verdict(), VERDICT) + head);
    String body = INDENT + " ".repeat(VERDICT);
    boolean full = finding.verdict() != Verdict.CLEAR;
    String decided = FindingText.decidedBy(finding);
    wrapped(body, Printable.of(full ? finding.says() : FindingText.because(finding)), body);
    if (full && !decided.isEmpty()) {
      wrapped(body, "At: " + Printable.of(decided) + ".", body);
    }
    if (finding.verdict() != Verdict.CLEAR && !finding.mend().isEmpty()) {
      wrapped(body, "Mend: " + Printable.of(finding.mend()), body);
    }
    finding
        .until()
        .ifPresent(
            until ->
                wrapped(
                    body, "Until " + until + ", " + Printable.of(finding.by().orElse("")), body));
  }

  private void wrapped(String first, String text, String next) {
    List<String> lines = wrap(text, terminal.columns() - Math.max(first.length(), next.length()));
    for (int i = 0; i < lines.size(); i++) {
      out.println((i == 0 ? first : next) + lines.get(i));
    }
  }

  /** Breaks at spaces, not at no-break spaces; these are plain ones in what is printed. */
  static List<String> wrap(String text, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" +")) {
      if (line.length() > 0 && line.length() + 1 + word.length() > width) {
        lines.add(plain(line));
        line.setLength(0);
      }
      if (line.length() > 0) {
        line.append(' ');
      }
      line.append(word);
    }
    lines.add(plain(line));
    return lines;
  }

  /** Anyone who searches the output for {@code 152 A} finds it. */
  private static String plain(StringBuilder line) {
    return line.toString().replace('\u00a0', ' ');
  }

  /**
   * Where the record was written.
   *
   * @param sheets what there is on paper
   */
  void written(String place, String sheets) {
    out.println("Record: " + Printable.of(place));
    out.println("        (" + sheets + ")");
    out.println();
  }
}
