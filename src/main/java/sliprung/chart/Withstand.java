package sliprung.chart;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import sliprung.protection.ProtectionEvaluator;
import sliprung.review.PartText;
import sliprung.review.Review;

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

  /** Copies. */
  public Withstand {
    amps = amps.clone();
    seconds = seconds.clone();
  }

  /**
   * Of a review: stator winding and cable, slip rings, rotor cable and sections, as far as their
   * data are there.
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
    for (String part : List.of("rings", "rotor-conductor")) {
      add(lines, PartText.words(part), amps, seconds(evaluator, part, amps, ringPerStator));
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
    return lines;
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
