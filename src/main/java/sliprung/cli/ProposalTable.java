package sliprung.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import sliprung.dial.DialText;
import sliprung.dial.Judgement;
import sliprung.dial.Judgement.Answer;
import sliprung.dial.Judgement.Question;
import sliprung.dial.Proposal;
import sliprung.quantity.Show;
import sliprung.rulebook.Verdict;
import sliprung.starter.Starter;

/** A proposal as a technician reads it: what to turn, then what it does to each rule. */
final class ProposalTable {
  private static final String SETTING = "%-8s %-22s %-12s %s";
  private static final String RULE = "%-24s %-18s %-24s %s";

  private final PrintWriter out;
  private final Terminal terminal;

  ProposalTable(PrintWriter out, Terminal terminal) {
    this.out = out;
    this.terminal = terminal;
  }

  void print(Starter starter, Proposal proposal, double seconds) {
    wrapped(
        Printable.of(starter.name())
            + String.format(
                Locale.ROOT, " · %d settings judged in %.0f s", proposal.evaluations(), seconds));
    out.println();
    if (proposal.changes().isEmpty()) {
      wrapped("Nothing found that betters the thinnest margin: today's settings stand.");
    } else {
      line(SETTING, "device", "dial", "set to", "proposed");
      for (Proposal.Change change : proposal.changes()) {
        row(
            SETTING,
            Printable.of(change.dial().device()),
            change.dial().setting(),
            DialText.setting(change.dial(), change.dial().value()),
            DialText.setting(change.dial(), change.to()));
      }
      out.println();
      line(RULE, "rule", "subject", "before", "after");
      for (Question question : proposal.moved()) {
        row(
            RULE,
            question.rule(),
            Printable.of(question.subject()),
            answer(proposal.before(), question),
            answer(proposal.after(), question));
      }
    }
    List<Question> left =
        proposal.after().answers().entrySet().stream()
            .filter(e -> e.getValue().verdict() == Verdict.BREACH)
            .map(java.util.Map.Entry::getKey)
            .toList();
    said("Still broken: ", left);
    said(
        "Breaks at an end of a dial's error, one dial at a time: ",
        List.copyOf(proposal.inexact()));
    out.println();
    wrapped(
        "Found from today's settings step by step and judged in full at the end; it is not proven"
            + " to be the best there is.");
  }

  private void said(String head, List<Question> questions) {
    if (!questions.isEmpty()) {
      out.println();
      wrapped(
          head
              + Printable.of(
                  questions.stream().map(DialText::words).collect(Collectors.joining("; ")))
              + ".");
    }
  }

  private static String answer(Judgement judgement, Question question) {
    Answer answer = judgement.answers().get(question);
    if (answer == null) {
      return "–";
    }
    return answer.verdict().word()
        + (answer.margin().isPresent() && answer.wanted().isPresent()
            ? " "
                + Show.ratio(answer.margin().getAsDouble())
                + " of "
                + Show.ratio(answer.wanted().getAsDouble())
            : "");
  }

  private void line(String format, Object... cells) {
    out.println(terminal.strong(String.format(format, cells)));
  }

  private void row(String format, Object... cells) {
    out.println(String.format(format, cells).replace('\u00a0', ' ').stripTrailing());
  }

  private void wrapped(String text) {
    Summary.wrap(text, terminal.columns()).forEach(out::println);
  }
}
