package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Supplier;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Exposures;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.rulebook.Verdict;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.Trace;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * {@code held/blind}: which fitted devices see a held step at all. A device sees only if its slow
 * edge operates at the corner of least current.
 */
public final class SomethingSeesEveryHeldStep implements Rule {
  private static final Info INFO =
      new Info(
          "held/blind",
          "Which fitted devices see a step contactor that failed to close, and which stay blind?",
          "common practice; NFPA 70 430.32(E) where the practice is nec",
          List.of(
              "motor",
              "load",
              "resistors.connection",
              "resistors.cut-out",
              "resistors.sections",
              "resistors.same-limit",
              "resistors.permanent",
              "resistors.leads",
              "resistors.tolerance",
              "resistors.hot-rise",
              "protection"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    Supplier<String> mend = once(() -> mend(facts));
    for (int step = 1; step <= facts.starter().sectionCount(); step++) {
      List<ComputedStart> starts = facts.faultsOnStep(step, k -> k == Scenario.Kind.HELD).toList();
      findings.add(judge(facts, step, starts, mend));
    }
    return Answer.of(findings, "the bank has no sections");
  }

  /** One mend serves every step, and trying takes a while: it is sought when first needed. */
  private static Supplier<String> once(Supplier<String> sought) {
    AtomicReference<String> kept = new AtomicReference<>();
    return () -> kept.updateAndGet(found -> found == null ? sought.get() : found);
  }

  private static String mend(Facts facts) {
    return HeldStepMend.cheapest(facts)
        .map(HeldStepMend::sentence)
        .orElse(
            "Fit a sequence timer on the last step's auxiliary contact, a proof of every step, an"
                + " overload in the resistor leads or a temperature sensor on the elements; no"
                + " setting of one alone was found that clears every held step in time and lets"
                + " every good start pass.");
  }

  private static Finding judge(
      Facts facts, int step, List<ComputedStart> starts, Supplier<String> mend) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, "step " + step).edge(Edge.SLOW);
    List<String> seeing = new ArrayList<>();
    List<String> blind = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      boolean always =
          starts.stream()
              .allMatch(
                  s ->
                      s.device(device.tag(), Edge.SLOW)
                          .filter(d -> d.operates() && Double.isFinite(d.clearsAtSeconds()))
                          .isPresent());
      (always ? seeing : blind).add(device.tag());
    }
    ComputedStart least =
        starts.stream()
            .min(Comparator.comparingDouble(SomethingSeesEveryHeldStep::settledAmps))
            .orElseThrow();
    double amps = settledAmps(least);
    builder.at(least).figures(amps, Double.NaN, "A");
    String where = Exposures.where(least);
    if (!seeing.isEmpty()) {
      return builder
          .says(
              where
                  + ": "
                  + list(seeing)
                  + (seeing.size() == 1 ? " sees it" : " see it")
                  + (blind.isEmpty() ? "." : "; " + list(blind) + blindVerb(blind) + " blind."))
          .build(Verdict.CLEAR);
    }
    Optional<Exposure> exposure = Exposures.worst(facts, starts.stream());
    Exposure worst = exposure.orElseThrow();
    if (!worst.missing().isEmpty() && worst.clearingRatio() >= 1.0) {
      return builder.notJudged(
          worst.missing(), where + ": no fitted device sees it, and what it heats is not known.");
    }
    boolean harms = Double.isFinite(worst.limitAtSeconds());
    String heats =
        harms
            ? " "
                + Exposure.name(worst.first().orElseThrow().part())
                + " lasts "
                + Show.seconds(worst.limitAtSeconds())
                + " at worst ("
                + worst.start().corner().words()
                + ")."
            : " No part reaches its limit within 30 min.";
    return builder
        .says(where + ": no fitted device sees it at every corner." + heats + code(facts))
        .mend(harms ? mend.get() + turns(facts, least) : "Fit a sequence timer.")
        .build(harms ? Verdict.BREACH : Verdict.TIGHT);
  }

  /** A rotation sensor is what people think of first. */
  private static String turns(Facts facts, ComputedStart least) {
    List<Stage> stages = least.history().stages();
    Trace trace = stages.get(stages.size() - 1).trace();
    double speed = trace.speed()[trace.last()];
    String rotation =
        speed > 0.0
            ? " A rotation sensor sees nothing: the rotor turns at " + Show.rpm(speed) + "."
            : "";
    return facts.starter().interlocks().everyStepProven()
        ? rotation
            + " interlocks.every-step-proven names no time and opens nothing: give it as kind"
            + " step-proof to have it credited."
        : rotation;
  }

  private static String code(Facts facts) {
    return facts.starter().practice() == Starter.Practice.NEC
        ? " NFPA 70 counts the secondary circuit as protected by the motor overload (430.32(E));"
            + " the physics does not."
        : "";
  }

  private static String blindVerb(List<String> tags) {
    return tags.size() == 1 ? " stays" : " stay";
  }

  private static String list(List<String> tags) {
    return String.join(", ", tags);
  }

  private static double settledAmps(ComputedStart start) {
    List<Stage> stages = start.history().stages();
    Stage last = stages.get(stages.size() - 1);
    return last.trace().statorAmps()[last.trace().last()];
  }
}
