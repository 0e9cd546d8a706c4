package sliprung.rulebook.trip;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Device;

/**
 * {@code trip/fuse-wear}: the start stays under K times the fuse's pre-arcing current at its own
 * duration, so that thousands of starts do not age it.
 *
 * <p>A varying start has no single current. For every duration up to the run-up the RMS over the
 * most loaded seconds of that length is held against the current that melts the fuse in that time;
 * the greatest share counts. From gates alone the pre-arcing current is only bounded: under K at
 * the fast edge is sure, over K at the slow edge is sure, between them the mean decides between
 * tight and not judged.
 */
public final class TheStartSparesTheFuse implements Rule {
  private static final Info INFO =
      new Info(
          "trip/fuse-wear",
          "Does the start stay far enough below the fuse's pre-arcing current not to age it?",
          "IEC 60644, the same kind of factor on current; IEC 60269-1 gates",
          List.of(
              "supply.band",
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
              "timer-spread",
              "level-spread",
              "fuse-wear",
              "protection.{subject}"));

  private record Worst(ComputedStart start, PreArcing.Reach reach) {}

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Device> fuses =
        facts.starter().protection().stream()
            .filter(d -> d.fitting().place() == Device.Place.STATOR)
            .filter(
                d -> d instanceof Device.Fuse || d instanceof Device.Points && d.trips().isEmpty())
            .toList();
    if (fuses.isEmpty()) {
      return new Answer.NotApplicable("no fuse is fitted");
    }
    // every start of a series draws the same current: one of each corner is enough
    Map<ComputedStart, MostLoaded> starts = new LinkedHashMap<>();
    facts
        .permitted()
        .filter(s -> s.place() == 1 && s.from() == ComputedStart.From.COLD)
        .forEach(s -> starts.put(s, MostLoaded.of(s.history())));
    List<Finding> findings = new ArrayList<>();
    for (Device fuse : fuses) {
      findings.add(judge(facts, fuse, starts));
    }
    return new Answer.Findings(findings);
  }

  private static Finding judge(Facts facts, Device fuse, Map<ComputedStart, MostLoaded> starts) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, fuse.tag()).edge(Edge.FAST);
    String curve = "protection." + fuse.tag() + ".curve";
    Optional<String> unknown = facts.bands().unknown(fuse, Edge.FAST);
    if (unknown.isPresent()) {
      return builder.notJudged(List.of(curve), fuse.tag() + ": " + unknown.get() + ".");
    }
    double greatest =
        starts.values().stream().mapToDouble(MostLoaded::greatestAmps).max().orElse(0.0);
    Map<Edge, Worst> worst = new EnumMap<>(Edge.class);
    for (Edge edge : Edge.values()) {
      PreArcing law = new PreArcing(facts.bands(), fuse, edge, greatest);
      for (Map.Entry<ComputedStart, MostLoaded> start : starts.entrySet()) {
        if (edge == Edge.FAST && !law.tells(start.getValue())) {
          return builder
              .at(start.getKey())
              .notJudged(
                  List.of(curve),
                  fuse.tag() + "'s curve ends before the currents and times of this start.");
        }
        PreArcing.Reach reach = law.reach(start.getValue());
        worst.merge(
            edge,
            new Worst(start.getKey(), reach),
            (a, b) -> b.reach().share() > a.reach().share() ? b : a);
      }
    }
    return finding(facts, fuse, builder, worst);
  }

  private static Finding finding(
      Facts facts, Device fuse, FindingBuilder builder, Map<Edge, Worst> worst) {
    double k = facts.starter().fuseWear();
    Worst fast = worst.get(Edge.FAST);
    double share = fast.reach().share();
    String sentence = sentence(fuse, fast, k);
    boolean gates = fuse instanceof Device.Fuse;
    String rests =
        gates ? " This rests on the gates of the standard, between which no curve is pinned." : "";
    builder.at(fast.start()).figures(share, k, "share of the pre-arcing current");
    if (share <= k || !gates) {
      return builder
          .margin(k / share)
          .says(sentence + rests)
          .mend(share > k ? "Take a higher rating under the declared coordination." : "")
          .byMargin();
    }
    double slow = worst.get(Edge.SLOW).reach().share();
    double mean = worst.get(Edge.MIDDLE).reach().share();
    String whole =
        sentence
            + " Over the whole band it is "
            + Show.percent(slow)
            + " to "
            + Show.percent(share)
            + ", "
            + Show.percent(mean)
            + " of a mean curve."
            + rests;
    if (slow > k) {
      return builder
          .at(worst.get(Edge.SLOW).start())
          .edge(Edge.SLOW)
          .margin(k / slow)
          .figures(slow, k, "share of the pre-arcing current")
          .says(whole)
          .mend("Take a higher rating under the declared coordination.")
          .byMargin();
    }
    if (mean > k) {
      return builder
          .mend("Give the fuse's own curve as points, or take a higher rating.")
          .notJudged(List.of("protection." + fuse.tag() + ".curve"), whole);
    }
    return builder
        .margin(k / mean)
        .says(whole)
        .mend("Give the fuse's own curve as points, or take a higher rating.")
        .build(Verdict.TIGHT);
  }

  private static String sentence(Device fuse, Worst fast, double k) {
    PreArcing.Reach reach = fast.reach();
    if (reach.share() <= 0.0) {
      return "Nothing of a start comes near the pre-arcing current of " + fuse.tag() + ".";
    }
    return "The most loaded "
        + Show.seconds(reach.seconds())
        + " of a start come to "
        + Show.amps(reach.rmsAmps())
        + " RMS, "
        + Show.percent(reach.share())
        + " of the "
        + Show.amps(reach.meltsAmps())
        + " at which the quickest "
        + fuse.tag()
        + " melts in that time; K is "
        + Show.percent(k)
        + ".";
  }
}
