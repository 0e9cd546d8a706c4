package sliprung.record;

import java.util.List;
import sliprung.review.Review;

/** The settings sheet for the panel door: one page of its own, columns for the hand. */
final class DoorSheetPart {
  private static final int BIG = 12;
  private static final int MIDDLE = 17;

  private DoorSheetPart() {}

  static void write(Html page, Dossier dossier) {
    Review review = dossier.review();
    List<DialText> dials = DialText.of(review.starter());
    page.section("door", "Settings", "class", "sheet " + size(dials.size()));
    page.element("p", review.starter().name(), "class", "tag");
    Cells cells =
        new Cells(page)
            .open(
                "Calculated settings of record "
                    + dossier.fingerprint()
                    + ", "
                    + review.date()
                    + ". Write what you find before you turn anything.",
                List.of("device", "dial", "calls for", "as found", "set to"));
    dials.forEach(d -> cells.row(d.device(), d.dial(), d.setting(), "", ""));
    cells.close();
    page.open("div", "class", "wide").open("table", "class", "hand", "aria-label", "By hand");
    page.open("tbody");
    blank(page, "Set by", "Date");
    blank(page, "Test set", "Trips proved on");
    blank(page, "Calibrated until", "Air at the panel");
    blank(page, "Witness", "Signature");
    page.end().end().end();
    page.end();
  }

  /** So that it fits one page: smaller letters for more dials. */
  private static String size(int dials) {
    return dials <= BIG ? "big" : dials <= MIDDLE ? "middle" : "small";
  }

  private static void blank(Html page, String left, String right) {
    page.open("tr");
    page.element("th", left, "scope", "row").element("td", "\u00a0");
    page.element("th", right, "scope", "row").element("td", "\u00a0");
    page.end();
  }
}
