package sliprung.record;

import java.util.List;
import sliprung.quantity.Show;
import sliprung.review.StepReadings;
import sliprung.runup.Scenario;

/** What meters show step by step, and with one step left out. */
final class StepTablePart {
  /** What a clamp meter and the supply's voltage leave open together, per unit. */
  private static final double METER_ERROR = 0.05;

  private static final String ARROW = " → ";

  private StepTablePart() {}

  static void write(Html page, StepReadings readings) {
    if (readings.normal().isEmpty()) {
      return;
    }
    page.section("steps", "What the meters show");
    normal(page, readings.normal());
    leftOut(page, readings, Scenario.Kind.HELD);
    leftOut(page, readings, Scenario.Kind.SKIPPED);
    page.element(
        "p",
        "Nominal values from cold: rated volts, the starting load as described, resistors as drawn"
            + " and cold. Ring volts are between two rings. A clamp or any current transformer reads"
            + " too little below about 5\u00a0Hz: such ring readings are marked *; measure them with"
            + " a probe for direct current, or take the ring volts.",
        "class",
        "quiet");
    page.end();
  }

  private static void normal(Html page, List<StepReadings.Step> steps) {
    Cells cells =
        new Cells(page)
            .open(
                "Step table of a good start: just after the closing that begins the step, then just"
                    + " before the next",
                List.of(
                    "step",
                    "closed by",
                    "#time",
                    "#speed",
                    "#stator",
                    "#rings",
                    "#rotor",
                    "#ring" + " volts"));
    for (StepReadings.Step step : steps) {
      StepReadings.Reading a = step.begins();
      StepReadings.Reading b = step.ends();
      cells.row(
          Integer.toString(step.step()),
          step.closedBy(),
          Show.seconds(a.seconds()) + ARROW + (step.settled() ? "runs" : Show.seconds(b.seconds())),
          Show.rpm(a.speed()) + ARROW + Show.rpm(b.speed()),
          Show.amps(a.statorAmps()) + ARROW + Show.amps(b.statorAmps()),
          ring(a) + ARROW + ring(b),
          Show.three(a.rotorHertz()) + ARROW + hertz(b),
          Show.three(a.ringVolts()) + ARROW + Show.volts(b.ringVolts()));
    }
    cells.close();
  }

  private static void leftOut(Html page, StepReadings readings, Scenario.Kind kind) {
    List<StepReadings.LeftOut> rows =
        readings.leftOut().stream().filter(l -> l.start().scenario().kind() == kind).toList();
    if (rows.isEmpty()) {
      return;
    }
    boolean skipped = kind == Scenario.Kind.SKIPPED;
    Cells cells =
        new Cells(page)
            .open(
                skipped
                    ? "The same with one step left out while the sequence goes on: the jump at the"
                        + " next closing, then where it settles"
                    : "The same with one step contactor that does not close and the sequence waiting"
                        + " for it: where the motor hangs",
                List.of(
                    "does not close",
                    "load",
                    skipped ? "next closing" : "hangs on",
                    "read at",
                    "#speed",
                    "#stator",
                    "#rings",
                    "#rotor",
                    "#ring volts",
                    "would settle at",
                    "opened by"),
                "class",
                skipped ? "skipped" : "held");
    for (StepReadings.LeftOut row : rows) {
      StepReadings.Reading r = row.read();
      cells.row(
          row.contactor(),
          row.start().scenario().load() == Scenario.LoadMode.START ? "starting" : "running",
          row.next().map(StepTablePart::jump).orElse("step " + row.start().scenario().step()),
          Show.seconds(r.seconds()) + (row.opensFirst() ? ", opening" : ", steady"),
          Show.rpm(r.speed()),
          Show.amps(r.statorAmps()),
          ring(r),
          hertz(r),
          Show.volts(r.ringVolts()),
          Show.rpm(row.hangs().speed()) + ", " + Show.amps(row.hangs().statorAmps()),
          row.clearing()
              .map(c -> c.device() + " by " + Show.seconds(c.clearsAtSeconds()))
              .orElse("nothing"));
    }
    cells.close();
    if (!skipped && ammeterCannotTell(rows)) {
      page.element(
          "p",
          "The stator current hardly differs between these cases: an ammeter cannot tell which"
              + " contactor stayed open. Go by the speed or the ring volts.");
    }
  }

  /** Whether two neighbours among the cases at one load draw stator currents alike to a meter. */
  private static boolean ammeterCannotTell(List<StepReadings.LeftOut> rows) {
    List<StepReadings.LeftOut> starting =
        rows.stream().filter(r -> r.start().scenario().load() == Scenario.LoadMode.START).toList();
    for (int k = 1; k < starting.size(); k++) {
      double one = starting.get(k - 1).read().statorAmps();
      double other = starting.get(k).read().statorAmps();
      if (Math.abs(one - other) < METER_ERROR * Math.max(one, other)) {
        return true;
      }
    }
    return false;
  }

  private static String jump(StepReadings.Reading next) {
    return Show.seconds(next.seconds())
        + ": stator "
        + Show.amps(next.statorAmps())
        + ", rings "
        + Show.amps(next.ringAmps());
  }

  private static String ring(StepReadings.Reading reading) {
    return Show.amps(reading.ringAmps())
        + (reading.rotorHertz() < StepReadings.LEAST_CT_HERTZ ? "*" : "");
  }

  private static String hertz(StepReadings.Reading reading) {
    return Show.three(reading.rotorHertz()) + "\u00a0Hz";
  }
}
