package sliprung.rulebook.sequence;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;

/**
 * {@code sequence/grading}: the ring currents just after the closings are even in the nominal
 * start. Tight at most: uneven steps work, with a higher peak than the start needs.
 */
public final class TheClosingsAreEven implements Rule {
  private static final Info INFO =
      new Info(
          "sequence/grading",
          "Are the closing currents of the steps even in the nominal start, and which section would"
              + " even them?",
          "common practice",
          List.of(
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.permanent",
              "resistors.leads",
              "steps",
              "sequence"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    int sections = facts.starter().sectionCount();
    if (sections < 2) {
      return new Answer.NotApplicable("one closing has nothing to be even with");
    }
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "closings");
    Optional<ComputedStart> nominal =
        Closing.starts(facts).filter(s -> s.corner().isNominal()).findFirst();
    List<Closing> closings = nominal.map(s -> Closing.of(facts.starter(), s)).orElse(List.of());
    nominal.ifPresent(builder::at);
    if (closings.size() < sections) {
      return new Answer.Findings(
          List.of(
              builder.notJudged(
                  List.of(),
                  "Only "
                      + closings.size()
                      + " of "
                      + sections
                      + " step contactors close in the nominal start.")));
    }
    Comparator<Closing> byCurrent = Comparator.comparingDouble(Closing::ringAmps);
    Closing high = closings.stream().max(byCurrent).orElseThrow();
    Closing low = closings.stream().min(byCurrent).orElseThrow();
    double ratio = high.ringAmps() / low.ringAmps();
    double allowed = facts.practice().figure("grading.ratio").value();
    double margin = allowed / ratio;
    builder
        .figures(ratio, allowed, "greatest over least")
        .says(
            "The closings put "
                + Show.amps(low.ringAmps())
                + " (step contactor "
                + low.step()
                + ") to "
                + Show.amps(high.ringAmps())
                + " (step contactor "
                + high.step()
                + ") through the rings, a ratio of "
                + Show.ratio(ratio)
                + ".");
    // no margin where they are uneven: under 1 it would read as a limit that is not met
    return new Answer.Findings(
        List.of(
            margin < facts.wanted(INFO.name())
                ? builder.mend(mend(closings, high, low, sections)).build(Verdict.TIGHT)
                : builder.margin(margin).byMargin()));
  }

  /** The closing that lies farther from the geometric mean is the one to move. */
  private static String mend(List<Closing> closings, Closing high, Closing low, int sections) {
    double mean =
        Math.exp(
            closings.stream().mapToDouble(c -> Math.log(c.ringAmps())).average().orElseThrow());
    boolean tooHigh = high.ringAmps() / mean >= mean / low.ringAmps();
    int step = tooHigh ? high.step() : low.step();
    if (tooHigh && step == sections) {
      return "Lower section "
          + sections
          + ", so that the motor is faster when the last step contactor closes, or close it later.";
    }
    if (tooHigh) {
      return "Raise section "
          + (step + 1)
          + " at the cost of section "
          + step
          + ", or close later.";
    }
    return step == sections
        ? "Raise section " + sections + ", or close the last step contactor sooner."
        : "Lower section "
            + (step + 1)
            + " in favour of section "
            + step
            + ", or close step contactor "
            + step
            + " sooner.";
  }
}
