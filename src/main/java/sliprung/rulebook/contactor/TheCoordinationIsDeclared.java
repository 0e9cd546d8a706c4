package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.starter.Contactor;
import sliprung.starter.Device;

/**
 * {@code contactor/short-circuit}: the line contactor and the short-circuit device in series are a
 * declared, tested combination up to the greatest fault current.
 *
 * <p>Margin: declared conditional current over the greatest fault current; without it the test
 * current r of the table over that, at best tight above r.
 */
public final class TheCoordinationIsDeclared implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/short-circuit",
          "Is the coordination with the short-circuit device declared and tested?",
          "IEC 60947-4-1 8.2.5 and the table of the current r (from memory)",
          List.of("supply.fault-current", "protection", "contactors.{subject}"));

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
    String path = "contactors." + contactor.tag() + ".coordination";
    ShortCircuitDevices devices = ShortCircuitDevices.of(facts.starter());
    boolean inScope =
        facts.starter().supply().voltage()
            <= facts.practice().figure("contactor.greatest-voltage").value();
    OptionalDouble r = inScope ? testAmps(facts.practice(), contactor) : OptionalDouble.empty();
    if (contactor.coordination().isEmpty()) {
      return builder
          .mend("Declare the tested combination (" + path + "), from the maker's tables.")
          .notJudged(
              List.of(path),
              (devices.isEmpty()
                      ? "No short-circuit device is described in series with " + contactor.tag()
                      : "No tested combination of "
                          + contactor.tag()
                          + " with "
                          + devices.tags()
                          + " is declared")
                  + ". Let-through and welding are not computed by anyone: only the maker's tests"
                  + " say what is left of it after a fault"
                  + (r.isPresent()
                      ? "; they begin at " + Show.amps(r.getAsDouble()) + " for its size."
                      : "."));
    }
    Contactor.Coordination declared = contactor.coordination().get();
    String after =
        declared.type() == 2
            ? "type 2: after a fault it is fit for further use, welds that part easily excepted"
            : "type 1: after a fault nobody is harmed, and it may need new parts";
    String says =
        "The combination of "
            + contactor.tag()
            + " with "
            + declared.with()
            + " is declared "
            + after
            + ".";
    if (!devices.has(declared.with()) && facts.starter().breaker(declared.with()).isEmpty()) {
      return builder
          .says(
              says
                  + " "
                  + declared.with()
                  + " is no short-circuit device of this starter: the declaration is of another"
                  + " combination.")
          .mend("Declare the combination that is built in.")
          .build(Verdict.BREACH);
    }
    boolean lowVoltageFuse =
        facts.starter().device(declared.with()).filter(d -> d instanceof Device.Fuse).isPresent();
    if (lowVoltageFuse && !Device.Fuse.gatesHoldAt(facts.starter().supply().voltage())) {
      return builder
          .mend("Describe the fuse that is there: kind points, with its own curve.")
          .notJudged(
              List.of("protection." + declared.with() + ".kind"),
              says
                  + " "
                  + declared.with()
                  + " is described as a low-voltage fuse, and the supply has "
                  + Show.volts(facts.starter().supply().voltage())
                  + ": no such combination was ever tested.");
    }
    OptionalDouble fault = facts.starter().supply().faultMaxAmps();
    if (fault.isEmpty()) {
      return builder.notJudged(
          List.of("supply.fault-current"), says + " Up to which fault current is the question.");
    }
    double amps = fault.getAsDouble();
    if (declared.upToAmps().isPresent()) {
      double upTo = declared.upToAmps().getAsDouble();
      return builder
          .margin(upTo / amps)
          .figures(amps, upTo, "A")
          .says(
              says
                  + " It holds up to "
                  + Show.amps(upTo)
                  + "; the greatest fault current is "
                  + Show.amps(amps)
                  + ".")
          .mend(upTo < amps ? "Take a combination tested at " + Show.amps(amps) + "." : "")
          .byMargin();
    }
    if (r.isEmpty()) {
      return builder.notJudged(
          List.of(path + ".up-to"), says + " The current up to which it holds is not given.");
    }
    double test = r.getAsDouble();
    String tested =
        says
            + " Every such test is made at "
            + Show.amps(test)
            + " for its size; the greatest fault current is "
            + Show.amps(amps)
            + ".";
    if (amps <= test) {
      return builder.margin(test / amps).figures(amps, test, "A").says(tested).byMargin();
    }
    return builder
        .figures(amps, test, "A")
        .says(tested + " Whether it holds there, the declaration must say.")
        .mend("Give its conditional short-circuit current (" + path + ".up-to).")
        .build(Verdict.TIGHT);
  }

  /** The test current r of a contactor by its rated current in AC-3; empty without one. */
  static OptionalDouble testAmps(Practice practice, Contactor contactor) {
    Double rated = contactor.ratings().get("AC-3");
    return rated == null ? OptionalDouble.empty() : testAmps(practice, rated);
  }

  /**
   * The test current r, A; the figure of a row is keyed by the greatest rated current it holds for.
   *
   * @param ratedAmps in AC-3; above the last row by agreement: empty
   */
  static OptionalDouble testAmps(Practice practice, double ratedAmps) {
    Optional<Practice.Figure> row =
        practice.figures().entrySet().stream()
            .filter(e -> e.getKey().startsWith(ROW))
            .filter(e -> upTo(e.getKey()) >= ratedAmps)
            .min(Comparator.comparingDouble(e -> upTo(e.getKey())))
            .map(java.util.Map.Entry::getValue);
    return row.isPresent() ? OptionalDouble.of(row.get().value()) : OptionalDouble.empty();
  }

  private static final String ROW = "r-current.";

  private static double upTo(String key) {
    return Double.parseDouble(key.substring(ROW.length()));
  }
}
