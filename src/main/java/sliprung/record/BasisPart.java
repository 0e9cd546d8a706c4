package sliprung.record;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.review.FindingText;
import sliprung.review.Review;
import sliprung.starter.Assumption;
import sliprung.starter.Motor;

/** What a review rests on, and what it leaves out. */
final class BasisPart {
  private BasisPart() {}

  /** What this version never judges, under the last question. */
  static void notJudged(Html page, Review review) {
    page.open("section").markup("\n");
    page.element("h3", "Never judged here: unbalanced faults");
    page.element(
        "p",
        "Every current on this page is balanced. One pole of a step contactor that stays open, a"
            + " lost phase, an open resistor section or a lifted brush are not computed. They are"
            + " not judged, and nothing above says that they are cleared.");
    if (!review.notBuilt().isEmpty()) {
      page.element("h3", "Questions that this version does not ask");
      page.element("p", String.join(", ", review.notBuilt()) + ".", "class", "quiet");
    }
    if (!review.starter().notYetJudged().isEmpty()) {
      page.element("h3", "Read from the file, but judged by no rule yet");
      page.element("p", String.join(", ", review.starter().notYetJudged()) + ".", "class", "quiet");
    }
    if (!review.notApplicable().isEmpty()) {
      Cells cells =
          new Cells(page)
              .open("Rules without a subject in this starter", List.of("rule", "because"));
      review.notApplicable().forEach(n -> cells.row(n.rule(), n.because()));
      cells.close();
    }
    page.end();
  }

  /** Circuit, residuals, defaults and evidence. */
  static void write(Html page, Review review) {
    page.section("basis", "What this rests on");
    circuit(page, review);
    List<Assumption> assumptions = review.starter().assumptions();
    if (!assumptions.isEmpty()) {
      Cells.abreast(
          page,
          "Defaults that were filled in because the file does not say",
          List.of("missing key", "taken as"),
          assumptions.stream().map(x -> List.of(x.path(), x.value())).toList(),
          "dense");
    }
    if (!review.starter().margins().isEmpty()) {
      Cells cells =
          new Cells(page)
              .open("Wanted margins of the user's own", List.of("rule", "#wanted margin"));
      review.starter().margins().forEach((rule, margin) -> cells.row(rule, Show.ratio(margin)));
      cells.close();
    }
    page.end();
  }

  private static void circuit(Html page, Review review) {
    Motor.CircuitData c = review.machine().circuit();
    page.element(
        "p",
        (review.identification().given()
                ? "The motor's circuit was given"
                : "The motor's circuit was identified from its plate")
            + " (star equivalent, ohms per phase, referred to the stator): R1 "
            + Show.three(c.r1())
            + ", X1 "
            + Show.three(c.x1())
            + ", Xm "
            + Show.three(c.xm())
            + ", R2 "
            + Show.three(c.r2())
            + ", X2 "
            + Show.three(c.x2())
            + "; stator to rotor ratio "
            + Show.three(c.ratio())
            + ".");
    review.method().ifPresent(method -> page.element("p", method.says()));
    review.identification().notes().forEach(note -> page.element("p", note));
    if (!review.identification().residuals().isEmpty()) {
      Cells cells =
          new Cells(page)
              .open(
                  "The plate against the circuit",
                  List.of(
                      "quantity",
                      "#plate",
                      "#circuit",
                      "#difference",
                      "#explained by rounding and tolerance"));
      review
          .identification()
          .residuals()
          .forEach(
              r ->
                  cells.row(
                      r.quantity(),
                      FindingText.quantity(r.plate(), r.unit()),
                      FindingText.quantity(r.computed(), r.unit()),
                      Show.percent(r.relative()),
                      "± " + Show.percent(r.tolerance())));
      cells.close();
    }
  }
}
