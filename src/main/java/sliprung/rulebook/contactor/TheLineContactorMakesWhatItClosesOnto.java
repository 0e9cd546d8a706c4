package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Contactor;

/**
 * {@code contactor/making}: the line contactor is proven to make the current it closes onto, as a
 * routine on step 1, and now and then with rings shorted where that may be met.
 *
 * <p>Margin: occasional making capacity over the closing current, which counts by its first peak
 * where the circuit's power factor is lower than the test's. Wanted: occasional over routine
 * capacity, so that a current above the routine capacity is tight and one above the occasional
 * capacity a breach.
 */
public final class TheLineContactorMakesWhatItClosesOnto implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/making",
          "Is the line contactor proven to make the current it closes onto?",
          "IEC 60947-4-1 table 7 (occasional) and table 10 (routine, from memory)",
          List.of("supply.band", "motor", "resistors", "interlocks", "contactors.{subject}"));

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
    Ratings ratings = Ratings.of(facts, contactor);
    Optional<Ratings.Gap> gap = ratings.gap();
    if (gap.isPresent()) {
      return builder.notJudged(gap.get().missing(), gap.get().why());
    }
    Optional<StandstillCurrent> closing = StandstillCurrent.on(facts, 1, StandstillCurrent.AT_REST);
    if (closing.isEmpty()) {
      return builder.notJudged(List.of(), "No permitted start was computed.");
    }
    Ratings.Proven occasional = ratings.making();
    Ratings.Proven routine = ratings.routine();
    boolean mayMeetShorted = !facts.starter().interlocks().stepsOpenBeforeLine();
    StandstillCurrent shorted = StandstillCurrent.ringsShorted(facts).orElseThrow();
    String sentences =
        closing(contactor, closing.get(), occasional, routine)
            + shorted(contactor, shorted, occasional, mayMeetShorted);
    double wanted = facts.wanted(INFO.name());
    double shortedMargin = margin(shorted, occasional);
    if (mayMeetShorted && shortedMargin < wanted) {
      return builder
          .at(shorted.start())
          .margin(shortedMargin)
          .figures(shorted.amps(), occasional.amps(), "A")
          .says(shorted(contactor, shorted, occasional, true).trim())
          .mend(
              "Interlock the line contactor with every step contactor proven open, or take one that"
                  + " makes "
                  + Show.amps(shorted.amps())
                  + ".")
          .byMargin();
    }
    double margin = margin(closing.get(), occasional);
    double wantedOnStepOne = wanted * occasional.amps() / routine.amps();
    builder
        .at(closing.get().start())
        .margin(margin)
        .wanted(wantedOnStepOne)
        .figures(closing.get().amps(), margin < 1.0 ? occasional.amps() : routine.amps(), "A")
        .says(sentences);
    if (margin < wantedOnStepOne) {
      builder.mend(
          "More resistance on step 1, or a line contactor that makes "
              + Show.amps(closing.get().amps())
              + " as a routine.");
    }
    return builder.byMargin();
  }

  /** Capacity over current; a current at a lower power factor than tested counts by its peak. */
  private static double margin(StandstillCurrent current, Ratings.Proven proven) {
    double harder =
        Asymmetry.against(current.powerFactor(), proven.powerFactor(current.powerFactor()));
    return proven.amps() / (current.amps() * harder);
  }

  private static String closing(
      Contactor contactor,
      StandstillCurrent closing,
      Ratings.Proven occasional,
      Ratings.Proven routine) {
    return contactor.tag()
        + " closes onto "
        + Show.amps(closing.amps())
        + " on step 1 at a power factor of "
        + Show.ratio(closing.powerFactor())
        + ". It is proven for "
        + Show.amps(routine.amps())
        + " as a routine ("
        + routine.words()
        + ") and for "
        + Show.amps(occasional.amps())
        + " now and then ("
        + occasional.words()
        + "), at a power factor of "
        + Show.ratio(occasional.powerFactor(closing.powerFactor()))
        + ".";
  }

  private static String shorted(
      Contactor contactor, StandstillCurrent shorted, Ratings.Proven occasional, boolean mayBeMet) {
    String onto =
        " With rings shorted "
            + contactor.tag()
            + " would close onto "
            + Show.amps(shorted.amps())
            + " at a power factor of "
            + Show.ratio(shorted.powerFactor());
    return mayBeMet
        ? onto
            + ", and no interlock rules that out; it is proven for "
            + Show.amps(occasional.amps())
            + " now and then ("
            + occasional.words()
            + ") at "
            + Show.ratio(occasional.powerFactor(shorted.powerFactor()))
            + "."
        : onto + "; the interlock that proves every step open keeps it from that.";
  }
}
