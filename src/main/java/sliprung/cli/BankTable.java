package sliprung.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Optional;
import sliprung.dial.BankGrading.Graded;
import sliprung.dial.BankGrading.Shared;
import sliprung.quantity.Show;
import sliprung.starter.Starter;

/** A graded bank as an engineer reads it. */
final class BankTable {
  private static final String ROW = "%-12s %-24s %-24s %s";

  private final PrintWriter out;
  private final Terminal terminal;

  BankTable(PrintWriter out, Terminal terminal) {
    this.out = out;
    this.terminal = terminal;
  }

  void print(Starter starter, Graded graded) {
    wrapped(
        Printable.of(starter.name())
            + " · the bank shared out for even closing currents in the nominal start, its whole"
            + " resistance kept");
    out.println();
    out.println(
        terminal.strong(
            String.format(
                ROW,
                "section",
                "today",
                "geometric, ratio " + Show.three(graded.ratio()),
                graded.numeric().isPresent() ? "numeric, steps as set" : "")));
    for (int k = 0; k < graded.today().ohms().size(); k++) {
      row(
          String.valueOf(k + 1),
          cell(graded.today(), k),
          cell(graded.geometric(), k),
          cell(graded.numeric(), k));
    }
    row(
        "spread",
        spread(graded.today()),
        spread(graded.geometric()),
        graded.numeric().map(BankTable::spread).orElse(""));
    out.println();
    wrapped(
        "Each cell: the section, then the ring current just after its step contactor has closed."
            + " Spread: greatest over least of these.");
    wrapped(
        graded.geometric().isEven()
            ? "The geometric rule holds: its closings are even."
            : "The geometric rule holds where every step closes at the same lower current; these"
                + " steps do not, so that the bank was found numerically as well.");
    wrapped(
        "Write the resistances into a copy of the file and review it: nothing else is judged here.");
  }

  private static String cell(Optional<Shared> shared, int k) {
    return shared.map(s -> cell(s, k)).orElse("");
  }

  private static String cell(Shared shared, int k) {
    List<Double> amps = shared.closingAmps();
    return Show.three(shared.ohms().get(k))
        + " Ω, "
        + (k < amps.size() ? Show.amps(amps.get(k)) : "not closed");
  }

  private static String spread(Shared shared) {
    return shared.spread().isPresent() ? Show.ratio(shared.spread().getAsDouble()) : "–";
  }

  private void row(Object... cells) {
    out.println(String.format(ROW, cells).replace('\u00a0', ' ').stripTrailing());
  }

  private void wrapped(String text) {
    Summary.wrap(text, terminal.columns()).forEach(out::println);
  }
}
