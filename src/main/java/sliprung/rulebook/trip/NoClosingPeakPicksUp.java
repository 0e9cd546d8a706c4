package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.Trace;
import sliprung.starter.Device;

/**
 * {@code trip/closing-peak}: no instantaneous element picks up on any closing of a permitted start,
 * nor in the running after it.
 *
 * <p>An element that measures peaks sees the greatest magnitude of the space vector against √2
 * times its pick-up; one that measures RMS sees the fundamental over one supply period, and never
 * less than the steady current just after the closing. Its overreach counts in both cases.
 */
public final class NoClosingPeakPicksUp implements Rule {
  private static final Info INFO =
      new Info(
          "trip/closing-peak",
          "Does no instantaneous element pick up on any closing, offset and overreach included?",
          "IEEE 3004.8 instantaneous settings; common practice",
          List.of(
              "supply.band",
              "motor",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Instantaneous element) {
        findings.add(judge(facts, element));
      }
    }
    return Answer.of(findings, "no instantaneous element is fitted");
  }

  /** What an element measures at most, in its own measure (peak or RMS), and where. */
  private record Met(double amps, ComputedStart start, String when) {}

  private static Finding judge(Facts facts, Device.Instantaneous element) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, element.tag()).edge(Edge.FAST);
    Met worst = null;
    for (ComputedStart start : facts.permitted().toList()) {
      for (Stage stage : start.history().stages()) {
        if (stage.peak().isEmpty()) {
          return builder
              .at(start)
              .notJudged(
                  List.of(),
                  "The transient of step "
                      + stage.step()
                      + " was not computed: with it the start takes another course than with the"
                      + " steady circuit.");
        }
        worst = greater(worst, closing(element, start, stage, stage.peak().get()));
      }
      Optional<Stage> running = start.history().running();
      if (running.isPresent()) {
        worst = greater(worst, running(element, start, running.get()));
      }
    }
    if (worst == null) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    double pickUp = pickUp(element);
    double margin = worst.amps() > 0.0 ? pickUp / worst.amps() : Double.POSITIVE_INFINITY;
    boolean peak = measuresPeak(element);
    return builder
        .at(worst.start())
        .margin(Math.min(margin, MOST))
        .figures(worst.amps(), pickUp, "A")
        .says(
            Show.amps(worst.amps())
                + (peak ? " peak" : " RMS over one period")
                + " at "
                + element.tag()
                + " "
                + worst.when()
                + "; it may pick up from "
                + Show.amps(pickUp)
                + (peak ? " peak" : " RMS")
                + " (set to "
                + Show.amps(element.pickUpAmps())
                + " RMS, overreach "
                + Show.percent(element.overreach())
                + ")."
                + reclosed(facts, element, pickUp))
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Raise its pick-up, or give it a short delay; check that it still sees the least"
                    + " fault."
                : "")
        .byMargin();
  }

  /** Beyond this a margin says nothing more. */
  private static final double MOST = 1000.0;

  private static boolean measuresPeak(Device.Instantaneous element) {
    return element.measures() == Device.Measures.PEAK;
  }

  /** Least current that may pick up, in the element's own measure, A. */
  private static double pickUp(Device.Instantaneous element) {
    double rms =
        element.pickUpAmps() * (1.0 - element.accuracy().pickUp()) / (1.0 + element.overreach());
    return measuresPeak(element) ? Math.sqrt(2.0) * rms : rms;
  }

  private static Met greater(Met one, Met other) {
    return one == null || other.amps() > one.amps() ? other : one;
  }

  private static Met closing(
      Device.Instantaneous element, ComputedStart start, Stage stage, ClosingPeak peak) {
    String when = "after " + stage.closedBy() + " has closed (step " + stage.step() + ")";
    boolean stator = element.fitting().place() == Device.Place.STATOR;
    double amps;
    if (measuresPeak(element)) {
      amps = stator ? peak.statorAmps() : peak.ringAmps();
    } else {
      amps =
          stator
              ? Math.max(peak.statorRms(), stage.entry().statorAmps())
              : Math.max(peak.ringRms(), stage.entry().ringAmps());
    }
    boolean dead = element.fitting().place() == Device.Place.BANK && !stage.bankIn();
    return new Met(dead ? 0.0 : amps, start, when);
  }

  /**
   * A reclosing is a fault: that the element picks up then is no defect, but whoever looks for the
   * cause should know of it.
   */
  private static String reclosed(Facts facts, Device.Instantaneous element, double pickUp) {
    double amps = 0.0;
    for (ComputedStart start : facts.faults(Scenario.Kind.RECLOSED).toList()) {
      Stage stage = start.history().stages().get(0);
      if (stage.peak().isPresent()) {
        amps = Math.max(amps, closing(element, start, stage, stage.peak().get()).amps());
      }
    }
    if (amps < pickUp) {
      return "";
    }
    return " Should the line return while the rotor turns with every step contactor closed, it may"
        + " measure "
        + Show.amps(amps)
        + " and pick up.";
  }

  private static Met running(Device.Instantaneous element, ComputedStart start, Stage stage) {
    Trace trace = stage.trace();
    double[] quantity =
        element.fitting().place() == Device.Place.STATOR ? trace.statorAmps() : trace.ringAmps();
    double rms = 0.0;
    for (double amps : quantity) {
      rms = Math.max(rms, amps);
    }
    boolean dead = element.fitting().place() == Device.Place.BANK && !stage.bankIn();
    double measured = measuresPeak(element) ? Math.sqrt(2.0) * rms : rms;
    return new Met(dead ? 0.0 : measured, start, "while running");
  }
}
