package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.quantity.Show;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario;
import sliprung.starter.Contactor;
import sliprung.starter.ResistorBank;

/**
 * {@code contactor/welded}: an interlock proves every step contactor open before the line contactor
 * closes; otherwise, what a start with the rings shorted by a welded one would draw.
 *
 * <p>Margin without the interlock: making capacity over the closing current with the rings shorted,
 * by its first peak where the power factor is lower than tested. At best tight.
 */
public final class NothingClosesOntoShortedRings implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/welded",
          "Is every step contactor proven open before the line contactor closes?",
          "common practice; IEC 60947-4-1 table 7 for the making capacity",
          List.of(
              "interlocks",
              "supply.band",
              "supply.fault-current",
              "motor",
              "resistors",
              "protection",
              "contactors.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Contactor contactor : facts.starter().lineContactors()) {
      findings.add(judge(facts, contactor));
    }
    return Answer.of(findings, "no line contactor is described");
  }

  private static Finding judge(Facts facts, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Optional<StandstillCurrent> shorted = StandstillCurrent.ringsShorted(facts);
    if (facts.starter().interlocks().stepsOpenBeforeLine()) {
      return builder
          .says(
              "The interlock proves every step contactor open before "
                  + contactor.tag()
                  + " closes."
                  + shorted
                      .map(
                          s ->
                              " Without it a start with the rings shorted would draw "
                                  + Show.amps(s.amps())
                                  + ".")
                      .orElse(""))
          .build(Verdict.CLEAR);
    }
    Ratings ratings = Ratings.of(facts, contactor);
    Optional<Ratings.Gap> gap = ratings.gap();
    if (gap.isPresent()) {
      return builder.notJudged(gap.get().missing(), gap.get().why());
    }
    if (shorted.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    StandstillCurrent current = shorted.get();
    Ratings.Proven proven = ratings.making();
    double harder =
        Asymmetry.against(current.powerFactor(), proven.powerFactor(current.powerFactor()));
    boolean bridging = facts.starter().resistors().cutOut() == ResistorBank.CutOut.BRIDGING;
    return builder
        .at(current.start())
        .margin(proven.amps() / (current.amps() * harder))
        .figures(current.amps(), proven.amps(), "A")
        .says(
            (bridging
                    ? "Nothing proves the step contactors open: a line contactor that drops and"
                        + " returns with them closed starts on "
                    : "Nothing proves the step contactors open: with "
                        + last(facts)
                        + " welded the next start is made on ")
                + Show.amps(current.amps())
                + " at a power factor of "
                + Show.ratio(current.powerFactor())
                + ", rings shorted. "
                + contactor.tag()
                + " makes "
                + Show.amps(proven.amps())
                + " now and then ("
                + proven.words()
                + ")."
                + clears(facts))
        .mend(
            "Interlock the line contactor with an auxiliary contact of every step contactor that"
                + " proves it open.")
        .byMarginAtBestTight();
  }

  private static String last(Facts facts) {
    return facts.starter().steps().get(facts.starter().steps().size() - 1).contactor();
  }

  /** What becomes of it if the rotor does not turn. */
  private static String clears(Facts facts) {
    Optional<Exposure> worst = Exposures.worst(facts, facts.faults(Scenario.Kind.RINGS_SHORTED));
    Optional<DeviceResponse> clearing = worst.flatMap(Exposure::clearing);
    return clearing
        .map(
            d ->
                " If the rotor stands, "
                    + d.device()
                    + " clears it after "
                    + Show.seconds(d.clearsAtSeconds())
                    + " at the latest.")
        .orElse(worst.isPresent() ? " If the rotor stands, nothing is proven to clear it." : "");
  }
}
