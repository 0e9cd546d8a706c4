package sliprung.rulebook.shortcircuit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Device;

/**
 * {@code short-circuit/upstream}: of two gG fuses in series only the smaller one melts: the greater
 * is two steps of the rating series higher, nominally 1.6 : 1.
 *
 * <p>Margin: steps between them over two. Positions are compared, not ratios: 100 A over 63 A is
 * 1.587.
 */
public final class TheUpstreamFuseStaysWhole implements Rule {
  private static final String SERIES = "fuse-series.";

  private static final Info INFO =
      new Info(
          "short-circuit/upstream",
          "Does a fuse discriminate against the one upstream?",
          "IEC 60269-1, ratio 1.6 : 1 from 16 A",
          List.of("protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Device.Fuse> fuses = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Fuse fuse && fuse.fitting().place() == Device.Place.STATOR) {
        fuses.add(fuse);
      }
    }
    fuses.sort(Comparator.comparingDouble(Device.Fuse::ratingAmps));
    List<Finding> findings = new ArrayList<>();
    for (int i = 0; i + 1 < fuses.size(); i++) {
      findings.add(judge(facts, fuses.get(i), fuses.get(i + 1)));
    }
    return Answer.of(findings, "no two fuses in series are described in the stator line");
  }

  private static Finding judge(Facts facts, Device.Fuse smaller, Device.Fuse greater) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, greater.tag());
    String pair =
        greater.tag()
            + " of "
            + Show.amps(greater.ratingAmps())
            + " stands in series with "
            + smaller.tag()
            + " of "
            + Show.amps(smaller.ratingAmps());
    int low = position(facts, smaller);
    int high = position(facts, greater);
    if (!Device.Fuse.gatesHoldAt(facts.starter().supply().voltage())) {
      return builder.notJudged(
          List.of("protection." + greater.tag() + ".kind"),
          pair + ": the ratio of 1.6 holds for low-voltage fuses alone.");
    }
    if (low < 0 || high < 0) {
      return builder.notJudged(
          List.of(),
          pair + ": the ratio of 1.6 holds for gG fuses of the standard's ratings alone.");
    }
    double wanted = facts.practice().figure("short-circuit.series-steps").value();
    double margin = (high - low) / wanted;
    return builder
        .margin(margin)
        .figures(high - low, wanted, "")
        .says(
            pair
                + ", "
                + (high - low)
                + (high - low == 1 ? " step" : " steps")
                + " of the rating series apart; "
                + Show.three(wanted)
                + " make 1.6 : 1"
                + (margin < 1.0 ? ", and with fewer both may melt." : "."))
        .mend(margin < 1.0 ? "Take ratings two steps apart." : "")
        .byMargin();
  }

  /** Position in the rating series from 16 A; negative for what is not in it or not gG. */
  static int position(Facts facts, Device.Fuse fuse) {
    if (fuse.fuseClass() != Device.FuseClass.GG) {
      return -1;
    }
    List<Double> series =
        facts.practice().figures().entrySet().stream()
            .filter(e -> e.getKey().startsWith(SERIES))
            .map(e -> e.getValue().value())
            .sorted()
            .toList();
    return series.indexOf(fuse.ratingAmps());
  }
}
