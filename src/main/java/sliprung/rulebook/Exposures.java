package sliprung.rulebook;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import sliprung.quantity.Show;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.Trace;

/** What the rules about failed starts have in common: the worst exposure, and its finding. */
public final class Exposures {
  private Exposures() {}

  /** The exposure with the smallest clearing ratio. */
  public static Optional<Exposure> worst(Facts facts, Stream<ComputedStart> starts) {
    return starts
        .map(s -> Exposure.of(facts, s))
        .min(
            Comparator.comparingDouble(Exposure::clearingRatio)
                .thenComparingDouble(Exposure::limitAtSeconds)
                .thenComparing(e -> -e.greatestUse()));
  }

  /** The finding about one subject over every start that concerns it. */
  public static Finding finding(
      Facts facts, Rule.Info info, String subject, List<ComputedStart> starts) {
    return finding(facts, info, subject, starts, facts.wanted(info.name()));
  }

  /** Likewise, with a wanted clearing ratio that is not the rule's own wanted margin. */
  public static Finding finding(
      Facts facts, Rule.Info info, String subject, List<ComputedStart> starts, double wanted) {
    FindingBuilder builder = FindingBuilder.of(facts, info, subject);
    Exposure worst = worst(facts, starts.stream()).orElseThrow();
    builder.at(worst.start()).edge(sliprung.protection.Edge.SLOW);
    // what is known may already be past its limit: what is not known makes that no better
    if (!worst.missing().isEmpty() && worst.clearingRatio() >= 1.0) {
      return builder.notJudged(
          worst.missing(),
          where(worst.start()) + ": not every part that it heats has a known limit.");
    }
    builder.figures(worst.clearedAtSeconds(), worst.limitAtSeconds(), "s");
    double ratio = worst.clearingRatio();
    String sentence = where(worst.start()) + ": " + worst.clause() + ".";
    // what comes too late, whatever it is proven to break, saves nothing
    boolean mightSave =
        worst.unproven().filter(d -> worst.limitAtSeconds() >= d.clearsAtSeconds()).isPresent();
    if (ratio < wanted && mightSave) {
      String tag =
          facts
              .starter()
              .device(worst.unproven().get().device())
              .orElseThrow()
              .trips()
              .orElseThrow();
      return builder
          .mend("Give what " + tag + " is proven to break.")
          .notJudged(
              List.of(BreakingCapacity.missingPath(facts, tag)),
              sentence
                  + " "
                  + worst.unproven().get().device()
                  + " operates after "
                  + Show.seconds(worst.unproven().get().operatesAtSeconds())
                  + ", but nothing proves that "
                  + tag
                  + " breaks this current.");
    }
    builder.margin(ratio).wanted(wanted).mend(mend(facts, worst));
    if (Double.isInfinite(ratio)) {
      return builder.says(sentence).byMargin();
    }
    builder.says(sentence + " Clearing ratio " + Show.ratio(ratio) + exposed(worst) + ".");
    return builder.byMargin();
  }

  private static String exposed(Exposure worst) {
    return worst.exposureSeconds() > 0.0 && worst.clearing().isPresent()
        ? "; " + Show.seconds(worst.exposureSeconds()) + " past the limit"
        : "";
  }

  /** {@code Held on step 2 the motor settles at 1 233 rpm and draws 152 A}, without a stop. */
  public static String where(ComputedStart start) {
    Stage last = start.history().stages().get(start.history().stages().size() - 1);
    Trace trace = last.trace();
    double speed = trace.speed()[trace.last()];
    String words = start.scenario().words();
    String scenario = Character.toUpperCase(words.charAt(0)) + words.substring(1);
    String draws =
        "draws "
            + Show.amps(trace.statorAmps()[trace.last()])
            + " ("
            + Show.amps(trace.ringAmps()[trace.last()])
            + " in the rings)";
    return switch (start.scenario().kind()) {
      case SKIPPED ->
          "With "
              + words
              + (speed == 0.0
                  ? ", the rotor stands and "
                  : ", the motor settles at " + Show.rpm(speed) + " and ")
              + draws;
      case LOCKED -> scenario + ", the motor ends on step " + last.step() + " and " + draws;
      case LOCKED_STEP, RINGS_SHORTED, RUNNING_LOCKED -> scenario + " the motor " + draws;
      default ->
          speed == 0.0
              ? scenario + " the rotor stands and " + draws
              : scenario + " the motor settles at " + Show.rpm(speed) + " and " + draws;
    };
  }

  private static String mend(Facts facts, Exposure worst) {
    if (worst.clearingRatio() >= facts.wanted("held/exposure")) {
      return "";
    }
    if (worst.clearing().isEmpty()) {
      Scenario.Kind kind = worst.start().scenario().kind();
      if (kind == Scenario.Kind.SKIPPED) {
        return "Fit a proof of every step that clears before "
            + Show.seconds(worst.limitAtSeconds())
            + ", or measure the current or temperature of the bank itself: the rotor turns, and the"
            + " last step may still close.";
      }
      return kind == Scenario.Kind.HELD
          ? "Fit a sequence timer that trips the line contactor before "
              + Show.seconds(worst.limitAtSeconds())
              + ", or measure the current or temperature of the bank itself."
          : "Fit a rotation sensor or a stall relay that clears before "
              + Show.seconds(worst.limitAtSeconds())
              + ".";
    }
    return "Set "
        + worst.clearing().get().device()
        + " to clear within "
        + Show.seconds(worst.limitAtSeconds() / facts.wanted("held/exposure"))
        + ", or give "
        + Exposure.name(worst.first().orElseThrow().part()).toLowerCase(java.util.Locale.ROOT)
        + " more time.";
  }
}
