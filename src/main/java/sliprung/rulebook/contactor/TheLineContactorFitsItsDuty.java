package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Contactor;

/**
 * {@code contactor/line-category}: the line contactor is rated in a category that covers what the
 * duty makes of it.
 *
 * <p>Margin: what is proven over what is asked, of the operation that is covered least. Start and
 * stop: greatest rated current in a motor category over the motor's rated current. Inching and
 * plugging as a routine: the durability figure over the current broken, and never more than the
 * share of the voltage at which it is proven. Occasional inching and plugging: the occasional
 * breaking capacity over the current broken, at best tight.
 */
public final class TheLineContactorFitsItsDuty implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/line-category",
          "Is the line contactor rated in a category that covers the operations of the duty?",
          "IEC 60947-4-1 table 1, table 7 and electrical durability",
          List.of(
              "supply.band", "motor", "resistors", "duty", "interlocks", "contactors.{subject}"));

  private static final String EDITION =
      " Edition: today's IEC 60947-4-1 gives AC-2 as starting and switching off slip-ring motors;"
          + " texts of the IEC 158 time added plugging and inching.";

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
    List<Demand> demands =
        new LineDuty(facts, contactor, ratings, facts.wanted(INFO.name())).demands();
    Demand worst = demands.stream().reduce((a, b) -> b.isWorseThan(a) ? b : a).orElseThrow();
    String others =
        demands.stream()
            .filter(d -> d != worst)
            .map(d -> " " + d.says())
            .collect(Collectors.joining());
    if (!Double.isNaN(worst.margin())) {
      builder.margin(worst.margin());
    }
    worst.start().ifPresent(builder::at);
    return builder
        .figures(worst.amps(), worst.provenAmps(), "A")
        .says(worst.says() + others + EDITION)
        .mend(worst.mend())
        .build(worst.verdict());
  }
}
