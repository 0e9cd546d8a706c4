package sliprung.record;

import java.util.List;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.review.FindingText;
import sliprung.sensitivity.MeasureFirst;
import sliprung.sensitivity.Sensitivity;
import sliprung.sensitivity.ThinMargin;

/** Which uncertain inputs move the thinnest margins most. */
final class MeasureFirstPart {
  /** Inputs a margin on a page; the JSON file has all. */
  private static final int SHOWN = 3;

  private MeasureFirstPart() {}

  static void write(Html page, MeasureFirst first) {
    if (first.margins().isEmpty() && first.readings().isEmpty()) {
      return;
    }
    page.section("measure-first", "Measure first");
    if (!first.readings().isEmpty()) {
      page.element("p", String.join(" ", first.readings()));
      page.element(
          "p",
          "The readings are held against a start whose circuit and cold bank are as described,"
              + " its timers and levels anywhere in their spread. What they leave open is used here only, to rank what to measure: every"
              + " verdict rests on the inputs as described, over their whole spreads.",
          "class",
          "quiet");
    }
    if (first.margins().isEmpty()) {
      page.end();
      return;
    }
    first.says().ifPresent(says -> page.element("p", says));
    Cells cells =
        new Cells(page)
            .open(
                "The thinnest margin of each of "
                    + first.margins().size()
                    + " rules, and what moves it most",
                List.of(
                    "subject, rule",
                    "#margin of wanted",
                    "input",
                    "how well known",
                    "#margin at its least",
                    "#margin at its greatest"),
                "class",
                "measure");
    first.margins().forEach(m -> rows(cells, m));
    cells.close();
    page.element(
        "p",
        "Each input is put, alone, to both ends of what its evidence grade leaves open. What the"
            + " grades leave open is our own figure, to rank by: no verdict rests on it. The starts"
            + " and corners that decide today are computed again; further out another corner may"
            + " take over and be thinner.",
        "class",
        "quiet");
    page.end();
  }

  private static void rows(Cells cells, ThinMargin thin) {
    String head = thin.finding().subject() + ", " + thin.finding().rule();
    String margin = FindingText.marginOfWanted(thin.finding());
    if (thin.inputs().isEmpty()) {
      cells.row(head, margin, "none moves it", "–", "–", "–");
    }
    for (Sensitivity s : thin.inputs().stream().limit(SHOWN).toList()) {
      cells.row(head, margin, s.words(), s.evidence(), shown(s.low()), shown(s.high()));
      head = "";
      margin = "";
    }
  }

  private static String shown(OptionalDouble margin) {
    return margin.isEmpty() ? "none given" : Show.ratio(margin.getAsDouble());
  }
}
