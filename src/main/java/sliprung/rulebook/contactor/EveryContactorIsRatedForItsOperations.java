package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Rule;
import sliprung.starter.Contactor;
import sliprung.starter.Duty;
import sliprung.starter.Starter;

/**
 * {@code contactor/operations}: every contactor is declared for as many operating cycles an hour as
 * the duty makes of it.
 *
 * <p>Margin: declared cycles an hour over those of the duty.
 */
public final class EveryContactorIsRatedForItsOperations implements Rule {
  private static final Info INFO =
      new Info(
          "contactor/operations",
          "Are the contactors rated for that many operations an hour?",
          "IEC 60947-1 4.3.4.3, intermittent duty: class is cycles an hour",
          List.of("duty", "steps", "contactors.{subject}"));

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
    for (Contactor contactor : StepContactors.of(facts.starter())) {
      findings.add(judge(facts, contactor));
    }
    return Answer.of(findings, "no contactor is described in the line or in a step");
  }

  private static Finding judge(Facts facts, Contactor contactor) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, contactor.tag());
    Duty duty = facts.starter().duty();
    if (duty.startsPerHour().isEmpty()) {
      return builder.notJudged(
          List.of("duty.starts.per-hour"),
          "How often " + contactor.tag() + " operates is not known without the starts an hour.");
    }
    double starts = duty.startsPerHour().getAsDouble();
    double inches = perHour(duty.inching(), facts.starter(), contactor);
    double plugs = perHour(duty.plugging(), facts.starter(), contactor);
    double operations = starts + inches + plugs;
    String does =
        contactor.tag()
            + " operates "
            + Show.three(operations)
            + " times an hour ("
            + Show.three(starts)
            + " starts"
            + (inches > 0.0 ? ", " + Show.three(inches) + " inches" : "")
            + (plugs > 0.0 ? ", " + Show.three(plugs) + " times of plugging" : "")
            + ").";
    Optional<Double> asks = preferred(facts, operations);
    String needed =
        asks.map(c -> "class " + Show.three(c)).orElse("more than the preferred classes give");
    if (contactor.intermittentClass().isEmpty()) {
      return builder.notJudged(
          List.of("contactors." + contactor.tag() + ".intermittent-class"),
          does
              + " Of the preferred classes of intermittent duty that asks "
              + needed
              + "; what it is declared for is not given, and no category implies it.");
    }
    double declared = contactor.intermittentClass().getAsDouble();
    double margin = declared / operations;
    return builder
        .margin(margin)
        .figures(operations, declared, "1/h")
        .says(does + " It is declared for class " + Show.three(declared) + ", cycles an hour.")
        .mend(
            margin < facts.wanted(INFO.name())
                ? "Take a contactor of " + needed + ", or make fewer operations."
                : "")
        .byMargin();
  }

  /** Inching or plugging on a step operates the line contactor and the contactors before it. */
  private static double perHour(
      Optional<Duty.Repeated> operation, Starter starter, Contactor contactor) {
    return operation
        .filter(
            o ->
                contactor.place() == Contactor.Place.LINE
                    || IntStream.range(0, o.step() - 1)
                        .anyMatch(k -> starter.steps().get(k).contactor().equals(contactor.tag())))
        .map(Duty.Repeated::perHour)
        .orElse(0.0);
  }

  /** The least preferred class that covers so many cycles an hour; empty above the greatest. */
  static Optional<Double> preferred(Facts facts, double operations) {
    return facts.practice().figures().entrySet().stream()
        .filter(e -> e.getKey().startsWith("intermittent-class."))
        .map(e -> e.getValue().value())
        .sorted()
        .filter(c -> c >= operations)
        .findFirst();
  }
}
