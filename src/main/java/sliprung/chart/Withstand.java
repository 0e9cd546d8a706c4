package sliprung.chart;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import sliprung.protection.ProtectionEvaluator;
import sliprung.review.PartText;
import sliprung.review.Review;
import sliprung.starter.Contactor;

/**
 * How long a part stands a constant current from cold with the rotor at rest.
 *
 * @param label of the part or of several alike
 * @param amps rising stator amperes, RMS; of a part on the ring side those that go with its own
 *     current at rest
 * @param seconds at these; infinite: for good
 */
public record Withstand(String label, double[] amps, double[] seconds) {
  private static final double STEPS_PER_DECADE = 60.0;
  private static final double LONGEST_SECONDS = 1e4;
  private static final int TAG_LETTERS = 30;
  private static final String CLOSED = ", closed";

  /** Counted only while the rotor stands. */
  static final String AT_REST = ", at rest";

  /** Copies. */
  public Withstand {
    amps = amps.clone();
    seconds = seconds.clone();
  }

  /**
   * Of a review: windings, cables, slip rings, sections and contactors, as far as their data are
   * there.
   *
   * @param ringPerStator ring amperes for a stator ampere at rest
   */
  static List<Withstand> of(Review review, double ringPerStator, double fromAmps, double toAmps) {
    ProtectionEvaluator evaluator = new ProtectionEvaluator(review.starter(), review.machine());
    double[] amps = new double[(int) (STEPS_PER_DECADE * Math.log10(toAmps / fromAmps)) + 2];
    for (int i = 0; i < amps.length; i++) {
      amps[i] = fromAmps * Math.pow(toAmps / fromAmps, i / (amps.length - 1.0));
    }
    List<Withstand> lines = new ArrayList<>();
    for (String part : List.of("stator", "stator-conductor")) {
      add(lines, PartText.words(part), amps, seconds(evaluator, part, amps, 1.0));
    }
    for (String part : List.of("rotor", "rings", "rotor-conductor")) {
      add(
          lines,
          PartText.words(part) + (part.equals("rotor-conductor") ? "" : AT_REST),
          amps,
          seconds(evaluator, part, amps, ringPerStator));
    }
    double share = ringPerStator * review.starter().resistors().sectionShare();
    Map<List<Double>, List<Integer>> alike = new LinkedHashMap<>();
    for (int number = 1; number <= review.starter().sectionCount(); number++) {
      alike
          .computeIfAbsent(
              seconds(evaluator, "section-" + number, amps, share), k -> new ArrayList<>())
          .add(number);
    }
    alike.forEach(
        (seconds, numbers) ->
            add(lines, TimeCurrentSheet.named("section", numbers), amps, seconds));
    contactors(review, evaluator, lines, amps, ringPerStator);
    return lines;
  }

  private static void contactors(
      Review review,
      ProtectionEvaluator evaluator,
      List<Withstand> lines,
      double[] amps,
      double ringPerStator) {
    Map<List<Double>, List<String>> alike = new LinkedHashMap<>();
    for (Contactor contactor : review.starter().contactors()) {
      boolean line = contactor.place() == Contactor.Place.LINE;
      boolean used =
          line
              || review.starter().steps().stream()
                  .anyMatch(s -> s.contactor().equals(contactor.tag()));
      if (used) {
        double share = line ? 1.0 : ringPerStator * ProtectionEvaluator.poleShare(contactor);
        alike
            .computeIfAbsent(
                seconds(evaluator, contactor.tag(), amps, share), k -> new ArrayList<>())
            .add(contactor.tag());
      }
    }
    alike.forEach(
        (seconds, tags) -> add(lines, Lines.cut(tags(tags), TAG_LETTERS) + CLOSED, amps, seconds));
  }

  private static String tags(List<String> tags) {
    return tags.size() > 2
        ? tags.get(0) + " to " + tags.get(tags.size() - 1)
        : String.join(", ", tags);
  }

  /** Whether of contactors, which are drawn apart from what heats up by itself. */
  boolean isSwitchgear() {
    return label.endsWith(CLOSED);
  }

  /** Times at each current; empty where data are missing. */
  private static List<Double> seconds(
      ProtectionEvaluator evaluator, String part, double[] amps, double share) {
    List<Double> seconds = new ArrayList<>();
    for (double a : amps) {
      OptionalDouble stands = evaluator.withstandSeconds(part, a * share);
      if (stands.isEmpty()) {
        return List.of();
      }
      seconds.add(stands.getAsDouble());
    }
    return seconds;
  }

  private static void add(
      List<Withstand> lines, String label, double[] amps, List<Double> seconds) {
    if (seconds.stream().anyMatch(t -> t < LONGEST_SECONDS)) {
      lines.add(
          new Withstand(label, amps, seconds.stream().mapToDouble(Double::doubleValue).toArray()));
    }
  }

  @Override
  public double[] amps() {
    return amps.clone();
  }

  @Override
  public double[] seconds() {
    return seconds.clone();
  }
}
