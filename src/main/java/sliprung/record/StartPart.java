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
                "Stages of the nominal cold start: each quantity just after the closing that begins"
                    + " the stage, and at its end (RMS); then the greatest instantaneous values of the"
                    + " electrical transient",
                List.of(
                    "step",
                    "closed by",
                    "#from",
                    "#to",
                    "#speed",
                    "#stator",
                    "#ring",
                    "#torque",
                    "#stator peak",
                    "#torque peak"));
    List<Stage> stages = start.history().stages();
    for (Stage stage : stages) {
      boolean last = stage == stages.get(stages.size() - 1);
      Trace trace = stage.trace();
      int end = trace.last();
      cells.row(
          Integer.toString(stage.step()),
          stage.closedBy(),
          Show.seconds(stage.fromSeconds()),
          last && stage.settled() ? "settled" : Show.seconds(stage.toSeconds()),
          Show.rpm(trace.speed()[0]) + " → " + Show.rpm(trace.speed()[end]),
          Show.amps(stage.entry().statorAmps()) + " → " + Show.amps(trace.statorAmps()[end]),
          Show.amps(stage.entry().ringAmps()) + " → " + Show.amps(trace.ringAmps()[end]),
          Show.torque(stage.entry().torque()) + " → " + Show.torque(trace.torque()[end]),
          stage.peak().map(p -> Show.amps(p.statorAmps())).orElse("–"),
          stage.peak().map(p -> Show.torque(p.torque())).orElse("–"));
    }
    cells.close();
  }
}
