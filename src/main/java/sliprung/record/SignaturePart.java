package sliprung.record;

import java.util.List;

/** The block for names and dates, left empty. */
final class SignaturePart {
  private SignaturePart() {}

  static void write(Html page, Dossier dossier) {
    page.section("signatures", "Signed", "class", "together");
    page.element(
        "p",
        "Who signs answers for the inputs listed with their hashes, for the deviations accepted"
            + " above, and for what was not judged. Record "
            + dossier.fingerprint()
            + ".");
    Cells cells =
        new Cells(page)
            .open(
                "By hand",
                List.of("", "name", "role", "signature", "date"),
                "class",
                "hand signatures");
    for (String who : List.of("Prepared", "Checked", "Settings proved on site", "Approved")) {
      cells.row(who, "\u00a0", "\u00a0", "\u00a0", "\u00a0");
    }
    cells.close();
    page.end();
  }
}
