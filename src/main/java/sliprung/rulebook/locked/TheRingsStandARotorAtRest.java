package sliprung.rulebook.locked;

import java.util.List;
import java.util.Optional;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;

/**
 * {@code locked/rings}: slip rings and brushes carry the ring current through a few square
 * millimetres while the rotor stands. Every failed start is held against what they stand at rest,
 * and every permitted start for as long as its rotor stands.
 */
public final class TheRingsStandARotorAtRest implements Rule {
  private static final String PART = "rings";
  private static final String SUBJECT = "slip rings";

  private static final Info INFO =
      new Info(
          "locked/rings",
          "Do slip rings and brushes stand a rotor at rest until it is cleared, or until it moves?",
          "common practice",
          List.of(
              "supply.band",
              "motor",
              "load.brake",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "steps",
              "protection"));

  private record Case(ComputedStart start, double ratio, Optional<Exposure> exposure) {}

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, SUBJECT);
    Case worst = null;
    for (ComputedStart start : facts.starts()) {
      Optional<PartResponse> rings = start.part(PART);
      if (rings.isEmpty()) {
        continue;
      }
      if (rings.get().missing().isPresent()) {
        return new Answer.Findings(
            List.of(
                builder.notJudged(
                    List.of(rings.get().missing().get()),
                    "What slip rings and brushes stand with the rotor at rest is not given.")));
      }
      Case found = of(facts, start, rings.get());
      if (worst == null || found.ratio() < worst.ratio()) {
        worst = found;
      }
    }
    if (worst == null) {
      return new Answer.NotApplicable("no start was computed");
    }
    return new Answer.Findings(List.of(finding(facts, builder, worst)));
  }

  private static Case of(Facts facts, ComputedStart start, PartResponse rings) {
    if (!start.scenario().isFault()) {
      return new Case(
          start,
          rings.use() > 0.0 ? 1.0 / rings.use() : Double.POSITIVE_INFINITY,
          Optional.empty());
    }
    if (Double.isInfinite(rings.limitAtSeconds())) {
      return new Case(start, Double.POSITIVE_INFINITY, Optional.empty());
    }
    Exposure exposure = Exposure.of(facts, start);
    return new Case(
        start, rings.limitAtSeconds() / exposure.clearedAtSeconds(), Optional.of(exposure));
  }

  private static sliprung.rulebook.Finding finding(
      Facts facts, FindingBuilder builder, Case worst) {
    builder.at(worst.start()).edge(Edge.SLOW);
    double wanted = facts.wanted(INFO.name());
    if (worst.exposure().isEmpty()) {
      return builder
          .margin(worst.ratio())
          .says(
              worst.start().scenario().isFault()
                  ? "In no failed start does the rotor stand long enough to reach the limit of the"
                      + " slip rings."
                  : "In a "
                      + worst.start().words()
                      + " the rotor stands until the slip rings come to "
                      + Show.percent(1.0 / worst.ratio())
                      + " of what they stand at rest.")
          .mend(worst.ratio() < wanted ? "Let the start break away sooner." : "")
          .byMargin();
    }
    Exposure exposure = worst.exposure().get();
    double limit = worst.start().part(PART).orElseThrow().limitAtSeconds();
    double cleared = exposure.clearedAtSeconds();
    builder.figures(cleared, limit, "s");
    String sentence =
        Exposures.where(worst.start())
            + ": the slip rings reach their limit after "
            + Show.seconds(limit)
            + "; "
            + exposure
                .clearing()
                .map(c -> c.device() + " clears after " + Show.seconds(cleared))
                .orElse("nothing clears it")
            + ".";
    if (worst.ratio() < wanted && exposure.unproven().isPresent()) {
      String tag =
          facts
              .starter()
              .device(exposure.unproven().get().device())
              .orElseThrow()
              .trips()
              .orElseThrow();
      return builder.notJudged(
          List.of(BreakingCapacity.missingPath(facts, tag)),
          sentence + " Nothing proves that " + tag + " breaks this current.");
    }
    return builder
        .margin(worst.ratio())
        .says(sentence + " Clearing ratio " + Show.ratio(worst.ratio()) + ".")
        .mend(
            worst.ratio() < wanted
                ? "Fit a rotation sensor that clears within " + Show.seconds(limit / wanted) + "."
                : "")
        .byMargin();
  }
}
