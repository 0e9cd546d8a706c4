package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.MakingCapacity;
import sliprung.rulebook.Rule;
import sliprung.runup.ClosingPeak;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.starter.Contactor;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/**
 * {@code held/skipped}: a step contactor that fails in a cascade with a star-point bank leaves its
 * section to the next one, and a welded one leaves its sections to the line contactor. The RMS
 * current that is then made is held against the making capacity of what makes it, and a start with
 * steps closed is held against the first limit. Torque peaks of failed starts are known at the
 * nominal corner only.
 */
public final class TwoSectionsAtOnceAreStood implements Rule {
  private static final Info INFO =
      new Info(
          "held/skipped",
          "Where two sections can go at once, or a start begin with steps closed, is that current made"
              + " and cleared?",
          "IEC 60947-4-1 table 7; common practice",
          List.of(
              "supply.band",
              "supply.fault-current",
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "sequence",
              "timer-spread",
              "interlocks",
              "contactors"));

  private static final List<Scenario.Kind> CLOSED =
      List.of(Scenario.Kind.WELDED, Scenario.Kind.RINGS_SHORTED_START, Scenario.Kind.RECLOSED);

  /**
   * The greatest making over the corners.
   *
   * @param torque just after it, steady
   * @param greatestTorque over all corners, with the peak of the closing where it was computed
   */
  private record Made(
      ComputedStart start, double poleAmps, double lineAmps, double torque, double greatestTorque) {

    /** This and one more closing. */
    static Made worse(Made before, ComputedStart start, Stage stage, double poleAmps) {
      double torque = stage.peak().map(ClosingPeak::greatestTorque).orElse(stage.entry().torque());
      double greatest = before == null ? torque : Math.max(before.greatestTorque(), torque);
      return before == null || poleAmps > before.poleAmps()
          ? new Made(start, poleAmps, stage.entry().statorAmps(), stage.entry().torque(), greatest)
          : new Made(
              before.start(), before.poleAmps(), before.lineAmps(), before.torque(), greatest);
    }
  }

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    Starter starter = facts.starter();
    List<Finding> findings = new ArrayList<>();
    if (starter.resistors().cutOut() == ResistorBank.CutOut.STAR_POINT) {
      for (int step = 1; step < starter.sectionCount(); step++) {
        skipped(facts, step).ifPresent(findings::add);
      }
    }
    for (Scenario scenario : startsWithStepsClosed(facts)) {
      List<ComputedStart> starts =
          facts.faults(scenario.kind()).filter(s -> s.scenario().equals(scenario)).toList();
      findings.addAll(stepsClosed(facts, scenario, starts));
    }
    return Answer.of(findings, whyNone(starter));
  }

  private static String whyNone(Starter starter) {
    String skips =
        starter.sequence() == Starter.Sequence.CHAINED
            ? "the steps are chained, so that one that fails stops the sequence"
            : "each contactor bridges its own section, so that none takes two";
    return skips + "; every step is proven open before the line contactor closes";
  }

  private static List<Scenario> startsWithStepsClosed(Facts facts) {
    return facts.starts().stream()
        .map(ComputedStart::scenario)
        .filter(s -> CLOSED.contains(s.kind()))
        .distinct()
        .toList();
  }

  /** Contactor {@code step} fails; the next one cuts out two sections. */
  private static Optional<Finding> skipped(Facts facts, int step) {
    Step next = facts.starter().steps().get(step);
    Contactor contactor = facts.starter().contactor(next.contactor()).orElseThrow();
    double share = poleShare(facts, contactor);
    Made worst = null;
    for (ComputedStart start :
        facts
            .faultsOnStep(step, k -> k == Scenario.Kind.SKIPPED)
            .filter(s -> s.scenario().load() == Scenario.LoadMode.START)
            .toList()) {
      for (Stage stage : start.history().stages()) {
        if (stage.closedBy().equals(next.contactor())) {
          double amps = stage.entry().ringAmps() * share;
          worst = Made.worse(worst, start, stage, amps);
        }
      }
    }
    if (worst == null) {
      return Optional.empty();
    }
    String sentence =
        "With step contactor "
            + step
            + " failed, "
            + contactor.tag()
            + " cuts out sections "
            + step
            + " and "
            + (step + 1)
            + " at once and makes "
            + Show.amps(worst.poleAmps())
            + " in a pole ("
            + Show.amps(worst.lineAmps())
            + " in the stator, "
            + Show.torque(worst.torque())
            + ").";
    return Optional.of(
        making(
            facts,
            "step " + step + " skipped",
            contactor,
            worst,
            sentence,
            "Chain the steps, so that a failed one stops the sequence."));
  }

  private static List<Finding> stepsClosed(
      Facts facts, Scenario scenario, List<ComputedStart> starts) {
    String words = scenario.words();
    List<Finding> findings = new ArrayList<>();
    Made worst = null;
    for (ComputedStart start : starts) {
      Stage first = start.history().stages().get(0);
      worst = Made.worse(worst, start, first, first.entry().statorAmps());
    }
    if (!facts.starter().lineContactors().isEmpty()) {
      Contactor line = facts.starter().lineContactors().get(0);
      findings.add(
          making(
              facts,
              words,
              line,
              worst,
              Character.toUpperCase(words.charAt(0))
                  + words.substring(1)
                  + ", the motor draws "
                  + Show.amps(worst.poleAmps())
                  + " and gives "
                  + Show.torque(worst.torque())
                  + " at rest; "
                  + line.tag()
                  + " makes it. Nothing proves the steps open before the line contactor closes."
                  + residual(scenario, starts),
              "Prove every step contactor open before the line contactor closes"
                  + " (interlocks.steps-open-before-line)."));
    }
    findings.add(
        Exposures.finding(
            facts, INFO, "clearing, " + words, starts, facts.wanted("held/exposure")));
    return findings;
  }

  /** What a rotor that still turns adds; how long the line was off is not an input. */
  private static String residual(Scenario scenario, List<ComputedStart> starts) {
    if (scenario.kind() != Scenario.Kind.RECLOSED) {
      return "";
    }
    double amps = 0.0;
    double torque = 0.0;
    for (ComputedStart start : starts) {
      Optional<ClosingPeak> peak = start.history().stages().get(0).peak();
      amps = Math.max(amps, peak.map(ClosingPeak::statorAmps).orElse(0.0));
      torque = Math.max(torque, peak.map(ClosingPeak::greatestTorque).orElse(0.0));
    }
    return " While the rotor still turns, it closes onto the residual voltage: up to "
        + Show.amps(amps)
        + " peak and "
        + Show.torque(torque)
        + " either way. How long the line is off is not an input: the worst of any dead time"
        + " counts, at the worst angle. No making capacity is proven against such a peak.";
  }

  private static Finding making(
      Facts facts, String subject, Contactor contactor, Made made, String sentence, String mend) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, subject).at(made.start());
    Optional<MakingCapacity> capacity = MakingCapacity.of(facts, contactor);
    if (capacity.isEmpty()) {
      return builder.notJudged(
          MakingCapacity.missing(facts, contactor),
          sentence + " Nothing proves what " + contactor.tag() + " makes.");
    }
    OptionalDouble torqueLimit = facts.starter().limits().torquePeak();
    boolean reclosed = made.start().scenario().kind() == Scenario.Kind.RECLOSED;
    double byCurrent = capacity.get().amps() / made.poleAmps();
    double byTorque =
        torqueLimit.isPresent()
            ? torqueLimit.getAsDouble() / made.greatestTorque()
            : Double.POSITIVE_INFINITY;
    boolean current = byCurrent <= byTorque;
    double margin = Math.min(byCurrent, byTorque);
    if (reclosed && margin >= 1.0) {
      // a margin from the current at rest would read as one for a rotor that still turns
      return builder
          .mend(mend)
          .notJudged(
              List.of("interlocks.steps-open-before-line"),
              sentence
                  + " At rest "
                  + contactor.tag()
                  + " would make it ("
                  + Show.amps(capacity.get().amps())
                  + ", an RMS figure).");
    }
    builder
        .margin(margin)
        .figures(
            current ? made.poleAmps() : made.greatestTorque(),
            current ? capacity.get().amps() : torqueLimit.getAsDouble(),
            current ? "A" : "N·m")
        .says(
            sentence
                + " "
                + contactor.tag()
                + " is proven to make "
                + Show.amps(capacity.get().amps())
                + " ("
                + capacity.get().basis()
                + "), an RMS figure."
                + (torqueLimit.isPresent()
                    ? " The torque comes to "
                        + Show.torque(made.greatestTorque())
                        + ", peaks counted where they were computed; the plant allows "
                        + Show.torque(torqueLimit.getAsDouble())
                        + "."
                    : ""));
    if (margin < facts.wanted(INFO.name())) {
      builder.mend(mend);
    }
    // Peaks of failed starts are not computed at every corner.
    return torqueLimit.isPresent() ? builder.mend(mend).byMarginAtBestTight() : builder.byMargin();
  }

  /** Pole current over ring current; a delta is never even. */
  private static double poleShare(Facts facts, Contactor contactor) {
    return contactor.poles().orElse(Contactor.Poles.STAR) == Contactor.Poles.DELTA
        ? 1.0 / facts.practice().figure("rotor.delta-share").value()
        : 1.0;
  }
}
