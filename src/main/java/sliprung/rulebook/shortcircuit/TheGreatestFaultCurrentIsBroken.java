package sliprung.rulebook.shortcircuit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Breaker;
import sliprung.starter.Device;

/**
 * {@code short-circuit/capacity}: every breaker and fuse in the stator line breaks the greatest
 * fault current.
 *
 * <p>Margin: breaking capacity over the greatest three-phase fault current at the starter.
 */
public final class TheGreatestFaultCurrentIsBroken implements Rule {
  private static final Info INFO =
      new Info(
          "short-circuit/capacity",
          "Does every breaker and fuse break the greatest fault current?",
          "IEC 60947-2 (Icu) and IEC 60269-1 (I1), from memory; NFPA 70 110.9",
          List.of("supply.fault-current", "breakers.{subject}", "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Breaker breaker : facts.starter().breakers()) {
      findings.add(
          judge(
              facts,
              breaker.tag(),
              breaker.breakingAmps(),
              "breakers." + breaker.tag() + ".breaking"));
    }
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Fuse fuse && fuse.fitting().place() == Device.Place.STATOR) {
        findings.add(
            Device.Fuse.gatesHoldAt(facts.starter().supply().voltage())
                ? judge(
                    facts,
                    fuse.tag(),
                    fuse.breakingAmps(),
                    "protection." + fuse.tag() + ".breaking")
                : lowVoltageFuse(facts, fuse));
      }
    }
    return Answer.of(findings, "no breaker and no fuse is described");
  }

  /** What a low-voltage fuse breaks it breaks at low voltage. */
  private static Finding lowVoltageFuse(Facts facts, Device.Fuse fuse) {
    return FindingBuilder.of(facts, INFO, fuse.tag())
        .mend("Describe the fuse that is there: kind points, with its own curve.")
        .notJudged(
            List.of("protection." + fuse.tag() + ".kind"),
            fuse.tag()
                + " is described as a low-voltage fuse, whose breaking capacity ends at "
                + Show.volts(Device.Fuse.GREATEST_VOLTS)
                + "; the supply has "
                + Show.volts(facts.starter().supply().voltage())
                + ".");
  }

  private static Finding judge(Facts facts, String tag, OptionalDouble breaks, String path) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, tag);
    OptionalDouble fault = facts.starter().supply().faultMaxAmps();
    List<String> missing = new ArrayList<>();
    if (breaks.isEmpty()) {
      missing.add(path);
    }
    if (fault.isEmpty()) {
      missing.add("supply.fault-current");
    }
    if (!missing.isEmpty()) {
      return builder.notJudged(
          missing,
          fault.isPresent()
              ? tag
                  + " may meet "
                  + Show.amps(fault.getAsDouble())
                  + "; what it breaks is not given."
              : "The greatest fault current at the starter is not given.");
    }
    double margin = breaks.getAsDouble() / fault.getAsDouble();
    return builder
        .margin(margin)
        .figures(fault.getAsDouble(), breaks.getAsDouble(), "A")
        .says(
            tag
                + " may meet "
                + Show.amps(fault.getAsDouble())
                + " and breaks "
                + Show.amps(breaks.getAsDouble())
                + ".")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Take one that breaks "
                    + Show.amps(fault.getAsDouble())
                    + ", or put a current-limiting fuse upstream with a tested combination."
                : "")
        .byMargin();
  }
}
