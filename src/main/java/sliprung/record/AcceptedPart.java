package sliprung.record;

import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.review.FindingText;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;
import sliprung.starter.AcceptedDeviation;

/** Deviations that someone answers for. */
final class AcceptedPart {
  private AcceptedPart() {}

  static void write(Html page, Review review) {
    page.section("accepted", "Accepted deviations");
    List<AcceptedDeviation> accepted = review.starter().accepted();
    if (accepted.isEmpty()) {
      page.element("p", "None is written in the file.");
      page.end();
      return;
    }
    Cells cells =
        new Cells(page)
            .open(
                "Breaches and tight margins that a role answers for, judged at " + review.date(),
                List.of(
                    "subject", "rule", "#margin", "#down to", "reason", "by", "until", "state"));
    for (AcceptedDeviation deviation : accepted) {
      Optional<Finding> finding =
          review.findings().stream()
              .filter(f -> f.rule().equals(deviation.rule()))
              .filter(f -> f.subject().equals(deviation.subject()))
              .findFirst();
      cells.row(
          deviation.subject(),
          deviation.rule(),
          finding.map(FindingText::marginOfWanted).orElse("–"),
          Show.ratio(deviation.notBelow()),
          deviation.reason(),
          deviation.by(),
          deviation.until().toString(),
          state(review, deviation, finding));
    }
    cells.close();
    page.end();
  }

  private static String state(
      Review review, AcceptedDeviation deviation, Optional<Finding> finding) {
    if (finding.map(Finding::verdict).filter(v -> v == Verdict.ACCEPTED).isPresent()) {
      return "holds";
    }
    if (review.date().isAfter(deviation.until())) {
      return "expired";
    }
    return finding
        .filter(f -> f.verdict() == Verdict.BREACH || f.verdict() == Verdict.TIGHT)
        .map(f -> "does not cover: " + f.verdict().word())
        .orElse("meets no breach and no tight margin");
  }
}
