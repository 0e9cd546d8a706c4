package sliprung.record;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.review.FindingText;
import sliprung.review.Review;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.resistor.Restart;

/** When the motor may be started again, and what limits it. */
final class RestartPart {
  private RestartPart() {}

  static void write(Html page, Review review) {
    if (review.restarts().isEmpty()) {
      return;
    }
    page.section("restart", "When it may be started again");
    Cells cells =
        new Cells(page)
            .open(
                "Earliest restart, counted from the opening of the line; the latest over every"
                    + " corner",
                List.of("after", "#earliest restart", "limited by", "at the corner"),
                "class",
                "restart");
    for (Restart restart : review.restarts()) {
      cells.row(restart.after().words(), pause(restart), limitedBy(restart), corner(restart));
    }
    cells.close();
    page.element(
        "p",
        "A pause is a bound, late rather than early: what is left of the heat of before and a whole"
            + " start from cold together stay within every limit. After a trip or a failed start"
            + " find the cause first, whatever the pause. Past"
            + " starts are those of duty.past-starts, from running hot, at rest ever since: their"
            + " pause counts from now.",
        "class",
        "quiet");
    page.end();
  }

  static String pause(Restart restart) {
    if (restart.pastLimit()) {
      return "inspect first";
    }
    if (Double.isInfinite(restart.seconds())) {
      return "no pause is enough";
    }
    return restart.seconds() > 0.0 ? Show.seconds(restart.seconds()) : "at once";
  }

  static String limitedBy(Restart restart) {
    if (restart.limitedBy().isEmpty()) {
      return "–";
    }
    String name = Exposure.name(restart.limitedBy());
    String words =
        name.startsWith("The ") || name.startsWith("Section ")
            ? Character.toLowerCase(name.charAt(0)) + name.substring(1)
            : name;
    return restart.pastLimit() ? words + ", past its limit" : words;
  }

  private static String corner(Restart restart) {
    return FindingText.circumstances(restart.start());
  }
}
