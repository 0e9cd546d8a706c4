package sliprung.record;

import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.review.DeviceText;
import sliprung.review.FindingText;
import sliprung.review.TripMatrix;
import sliprung.rulebook.BreakingCapacity;

/** Device by what it opens and the greatest current that it may open. */
final class TripMatrixPart {
  private TripMatrixPart() {}

  static void write(Html page, TripMatrix matrix) {
    if (matrix.rows().isEmpty()) {
      return;
    }
    page.section("trips", "Who opens what");
    Cells cells =
        new Cells(page)
            .open(
                "Trip matrix: the greatest stator current at which each device may open, over every"
                    + " computed start and edge, unless another has surely cleared before",
                List.of(
                    "device",
                    "opens",
                    "#greatest current",
                    "when",
                    "#short circuit, up to",
                    "proven to break"),
                "class",
                "trips");
    for (TripMatrix.Row row : matrix.rows()) {
      cells.row(
          DeviceText.words(row.device()),
          opens(row),
          row.greatest().map(o -> Show.amps(o.amps())).orElse("–"),
          row.greatest().map(TripMatrixPart::when).orElse("operates in no computed start"),
          row.shortCircuitAmps().isPresent()
              ? Show.amps(row.shortCircuitAmps().getAsDouble())
              : "–",
          proven(row));
    }
    cells.close();
    page.element(
        "p",
        "Short circuits are not computed. A device that opens a contactor must leave them to the"
            + " fuse or breaker: see contactor/take-over. What a fuse breaks is on its body.",
        "class",
        "quiet");
    page.end();
  }

  private static String opens(TripMatrix.Row row) {
    return row.isFuse()
        ? "the stator line, itself"
        : row.opens().orElse("nothing that the file names");
  }

  private static String when(TripMatrix.Opening opening) {
    return Show.seconds(opening.seconds())
        + ", "
        + FindingText.circumstances(opening.start())
        + ", "
        + opening.edge().word()
        + " edge";
  }

  private static String proven(TripMatrix.Row row) {
    if (row.isFuse()) {
      return "see its body";
    }
    Optional<BreakingCapacity> proven = row.proven();
    return proven.map(c -> Show.amps(c.amps()) + " (" + c.basis() + ")").orElse("not proven");
  }
}
