package sliprung.cli;

import java.io.PrintWriter;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;
import sliprung.rulebook.Rule;
import sliprung.rulebook.RuleBook;
import sliprung.rulebook.catalogue.Catalogue;

/** The rule catalogue. */
@Command(
    name = "rules",
    mixinStandardHelpOptions = true,
    description = "Lists the rules, or prints the page of one.")
final class RulesCommand implements Callable<Integer> {
  private final PrintWriter out;
  private final PrintWriter err;

  @Parameters(arity = "0..1", paramLabel = "NAME", description = "A rule, such as held/blind.")
  private String name;

  RulesCommand(PrintWriter out, PrintWriter err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    if (name == null) {
      list();
      return ExitStatus.CLEAR;
    }
    Optional<String> page = Catalogue.page(name);
    if (page.isPresent()) {
      out.println(page.get());
      return ExitStatus.CLEAR;
    }
    String question = Catalogue.notBuilt().get(name);
    if (question != null) {
      out.println(name + " is in the rule book but not built yet: " + question);
      return ExitStatus.CLEAR;
    }
    err.println(
        "sliprung: no rule is named " + Printable.of(name) + "; 'sliprung rules' lists them.");
    return ExitStatus.WRONG_INPUT;
  }

  private void list() {
    out.println("Rules that are asked (* must be judged):");
    for (Map.Entry<String, Rule.Info> rule : Catalogue.built().entrySet()) {
      String mark = RuleBook.MUST_JUDGE.contains(rule.getKey()) ? "*" : " ";
      row(mark + " " + rule.getKey(), rule.getValue().question());
    }
    if (Catalogue.notBuilt().isEmpty()) {
      return;
    }
    out.println();
    out.println("Rules of the book that are not built yet:");
    Catalogue.notBuilt().forEach((rule, question) -> row("  " + rule, question));
  }

  private void row(String head, String text) {
    String first = String.format("%-28s", head);
    for (String line : Summary.wrap(text, Terminal.PLAIN.columns() - first.length())) {
      out.println(first + line);
      first = " ".repeat(first.length());
    }
  }
}
