package sliprung.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.FindingText;
import sliprung.review.Question;
import sliprung.review.Review;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Verdict;

/**
 * Every finding that has a margin, against the margin that is wanted of it, under the four
 * questions.
 *
 * @param groups in the order of the questions; a question without margins has none
 * @param without findings that were not judged and so have no margin
 * @param says what to see
 */
public record MarginOverview(List<Group> groups, int without, String says) {

  /**
   * A question.
   *
   * @param question asked
   * @param rows thinnest first
   */
  public record Group(Question question, List<Row> rows) {
    /** Copies the list. */
    public Group {
      rows = List.copyOf(rows);
    }
  }

  /**
   * A finding.
   *
   * @param subject device, contactor or part
   * @param rule {@code family/slug}
   * @param verdict answer
   * @param share margin over the wanted one, 1 where none is wanted; infinite: no limit
   * @param text such as {@code 1.07 of 1.10}
   */
  public record Row(String subject, String rule, Verdict verdict, double share, String text) {
    /** Whether the margin is less than wanted. */
    public boolean isShort() {
      return share < 1.0;
    }
  }

  /** Copies the list. */
  public MarginOverview {
    groups = List.copyOf(groups);
  }

  /** Of a review. */
  public static MarginOverview of(Review review) {
    List<Group> groups = new ArrayList<>();
    List<Row> all = new ArrayList<>();
    for (Answer answer : Answers.of(review).answers()) {
      List<Row> rows =
          answer.findings().stream()
              .filter(f -> f.margin().isPresent() && f.verdict() != Verdict.NOT_JUDGED)
              .map(MarginOverview::row)
              .sorted(
                  Comparator.comparingDouble(Row::share)
                      .thenComparing(Row::rule)
                      .thenComparing(Row::subject))
              .toList();
      if (!rows.isEmpty()) {
        groups.add(new Group(answer.question(), rows));
        all.addAll(rows);
      }
    }
    int without =
        (int) review.findings().stream().filter(f -> f.verdict() == Verdict.NOT_JUDGED).count();
    return new MarginOverview(groups, without, says(all, without));
  }

  /**
   * The same in parts of at most so many rows, each short enough for a sheet of paper; the sentence
   * stands on the first.
   */
  public List<MarginOverview> parts(int mostRows) {
    List<MarginOverview> parts = new ArrayList<>();
    List<Group> here = new ArrayList<>();
    int room = mostRows;
    for (Group group : groups) {
      int from = 0;
      while (from < group.rows().size()) {
        int to = Math.min(group.rows().size(), from + room);
        here.add(new Group(group.question(), group.rows().subList(from, to)));
        room -= to - from;
        from = to;
        if (room == 0) {
          parts.add(part(here, parts.size()));
          here.clear();
          room = mostRows;
        }
      }
    }
    if (!here.isEmpty() || parts.isEmpty()) {
      parts.add(part(here, parts.size()));
    }
    return parts;
  }

  private MarginOverview part(List<Group> some, int before) {
    return new MarginOverview(some, without, before == 0 ? says : "Margins, continued.");
  }

  private static Row row(Finding finding) {
    return new Row(
        finding.subject(),
        finding.rule(),
        finding.verdict(),
        FindingText.share(finding),
        Double.isInfinite(finding.margin().getAsDouble())
            ? Show.ratio(finding.margin().getAsDouble())
            : FindingText.marginOfWanted(finding));
  }

  private static String says(List<Row> rows, int without) {
    String open =
        without == 0
            ? ""
            : " "
                + without
                + (without == 1 ? " finding" : " findings")
                + " could not be judged and "
                + (without == 1 ? "has" : "have")
                + " no bar here.";
    if (rows.isEmpty()) {
      return "No finding has a margin." + open;
    }
    long few = rows.stream().filter(Row::isShort).count();
    Row thinnest = rows.stream().min(Comparator.comparingDouble(Row::share)).orElseThrow();
    String counted =
        few == 0
            ? "All " + rows.size() + " margins are as wide as wanted."
            : few + " of " + rows.size() + " margins " + (few == 1 ? "is" : "are") + " too thin.";
    return counted
        + " Thinnest: "
        + thinnest.subject()
        + " ("
        + thinnest.rule()
        + ") with "
        + thinnest.text()
        + "."
        + open;
  }
}
