package sliprung.record;

import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/** The start itself over time. */
final class StartPart {
  private StartPart() {}

  static void write(Html page, Review review, ReviewPictures pictures) {
    Optional<ComputedStart> cold = review.start("cold");
    if (cold.isEmpty()) {
      return;
    }
    page.section("start", "The start");
    pictures.start().ifPresent(p -> ReviewLayout.figure(page, p));
    pictures.torque().ifPresent(p -> ReviewLayout.figure(page, p));
    stages(page, cold.get());
    page.end();
  }

  private static void stages(Html page, ComputedStart start) {
    Cells cells =
        new Cells(page)
            .open(
                "Torque and peaks of the nominal cold start, stage by stage: torque just after the"
                    + " closing that begins the stage and at its end; then the greatest instantaneous"
                    + " values of the electrical transient",
                List.of("step", "closed by", "#torque", "#stator peak", "#torque peak"));
    List<Stage> stages = start.history().stages();
    for (Stage stage : stages) {
      Trace trace = stage.trace();
      int end = trace.last();
      cells.row(
          Integer.toString(stage.step()),
          stage.closedBy(),
          Show.torque(stage.entry().torque()) + " → " + Show.torque(trace.torque()[end]),
          stage.peak().map(p -> Show.amps(p.statorAmps())).orElse("–"),
          stage.peak().map(p -> Show.torque(p.torque())).orElse("–"));
    }
    cells.close();
  }
}
