package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.review.BlindSpots;

/** Fault by fitted device: sees it in that time, late, or blind. */
final class BlindSpotPart {
  private BlindSpotPart() {}

  static void write(Html page, BlindSpots spots) {
    if (spots.rows().isEmpty() || spots.devices().isEmpty()) {
      return;
    }
    page.section("blind-spots", "What sees which fault");
    long unseen = spots.rows().stream().filter(BlindSpots.Row::isUnseen).count();
    page.element(
        "p",
        unseen == 0
            ? "Every fault has a device that by itself clears it in time at every corner."
            : unseen
                + " of "
                + spots.rows().size()
                + (unseen == 1 ? " faults has" : " faults have")
                + " no device that by itself clears it in time at every corner; whether two of them"
                + " do it together, the findings say.");
    List<String> heads = new ArrayList<>(List.of("fault"));
    heads.addAll(spots.devices());
    Cells cells =
        new Cells(page)
            .open(
                "Blind-spot table: each device as if it were the only one, slow edge, worst over"
                    + " every corner from cold and from hot; latest clearing from line closing",
                heads);
    for (BlindSpots.Row row : spots.rows()) {
      List<String> texts = new ArrayList<>(List.of(row.fault()));
      List<String> classes = new ArrayList<>(List.of(""));
      for (BlindSpots.Cell cell : row.cells()) {
        texts.add(words(cell));
        classes.add(weight(cell.sight()));
      }
      cells.row(texts, classes);
    }
    cells.close();
    page.element(
        "p",
        "Late: cleared after the first part has reached its limit. A share of cases stands beside"
            + " blind and late where the device does better in the others.",
        "class",
        "quiet");
    page.end();
  }

  /** What sees in time stands out, what is blind steps back; the words say it too. */
  private static String weight(BlindSpots.Sight sight) {
    return switch (sight) {
      case SEES -> "strong";
      case BLIND -> "plain";
      default -> "some";
    };
  }

  static String words(BlindSpots.Cell cell) {
    String in = cell.share() < 1.0 ? " in " + share(cell.share()) + " of cases" : "";
    String at = Double.isInfinite(cell.seconds()) ? "" : Show.seconds(cell.seconds());
    return switch (cell.sight()) {
      case BLIND -> "blind" + in;
      case CANNOT_OPEN -> "sees, cannot open it" + in;
      case NOT_PROVEN -> "sees, breaking not proven" + in;
      case NOT_JUDGED -> "not judged";
      case LATE -> "late: " + at + in;
      case LIMIT_UNKNOWN -> at + ", limit not known";
      case SEES -> "sees in\u00a0" + at.replace(" ", "\u00a0");
    };
  }

  /** Never 0 % nor 100 %: some do, some do not. */
  private static String share(double share) {
    long percent = Math.min(99, Math.max(1, Math.round(share * 100.0)));
    return percent + "\u00a0%";
  }
}
