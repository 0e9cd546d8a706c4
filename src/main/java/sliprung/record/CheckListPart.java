package sliprung.record;

import java.util.List;
import sliprung.review.Review;
import sliprung.review.StepReadings;

/** Interlocks and first start, a line a test, boxes for the hand. */
final class CheckListPart {
  private CheckListPart() {}

  static void write(Html page, Review review, StepReadings readings) {
    page.section("first-start", "Interlocks and first start");
    page.element(
        "p",
        "In the order of the work. Stop at the first line that does not come out as expected, and"
            + " find out why.");
    List<CheckList.Item> items = CheckList.of(review, readings);
    Cells cells = null;
    String state = "";
    int number = 1;
    for (CheckList.Item item : items) {
      if (!item.state().equals(state)) {
        if (cells != null) {
          cells.close();
        }
        state = item.state();
        cells =
            new Cells(page)
                .open(state, List.of("", "do", "expect", "found", "done"), "class", "checks hand");
      }
      cells.row(Integer.toString(number++), item.test(), item.expect(), "\u00a0", "□");
    }
    if (cells != null) {
      cells.close();
    }
    page.end();
  }
}
