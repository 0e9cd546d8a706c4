package sliprung.record;

import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;

/** The figures of the practice that this review was held against, each with clause and mark. */
final class PracticePart {
  private static final String WANTED = "wanted.";

  /** Ranges behind data/plausible: ours, some eighty, and none of them decides a margin. */
  private static final String PLAUSIBLE = "plausible.";

  private PracticePart() {}

  static void write(Html page, Review review) {
    String name = review.starter().practice().name().toLowerCase(Locale.ROOT);
    page.section("practice", "Figures of the practice");
    Cells cells =
        new Cells(page)
            .open(
                "Practice "
                    + name
                    + ": wanted margins of the rules that were asked, and the standards' figures"
                    + " behind them; a mark says who has seen the figure in its source",
                List.of("figure", "#value", "clause", "mark"),
                "class",
                "dense");
    for (Practice.Figure figure : used(review, Practice.named(name)).toList()) {
      cells.row(figure.key(), Show.three(figure.value()), figure.clause(), figure.mark());
    }
    cells.close();
    page.end();
  }

  private static Stream<Practice.Figure> used(Review review, Practice practice) {
    Set<String> asked = review.findings().stream().map(Finding::rule).collect(Collectors.toSet());
    Set<String> categories =
        review.starter().contactors().stream()
            .flatMap(c -> c.ratings().keySet().stream())
            .collect(Collectors.toSet());
    return practice.figures().values().stream()
        .filter(f -> !f.key().startsWith(PLAUSIBLE))
        .filter(
            f -> !f.key().startsWith(WANTED) || asked.contains(f.key().substring(WANTED.length())))
        .filter(f -> !f.key().startsWith("AC-") || categories.contains(f.key().split("\\.", 2)[0]));
  }
}
