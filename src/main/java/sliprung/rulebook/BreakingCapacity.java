package sliprung.rulebook;

import java.util.Map;
import java.util.Optional;
import sliprung.starter.Breaker;
import sliprung.starter.Contactor;

/**
 * The greatest current that a contactor or breaker is proven to break.
 *
 * @param tag contactor or breaker
 * @param amps RMS
 * @param basis such as {@code AC-3, 8 × 315 A}
 */
public record BreakingCapacity(String tag, double amps, String basis) {

  private static final String OWN = "its own tested breaking current";

  /** Whether the supply's voltage lies above the utilization categories of IEC 60947-4-1. */
  private static boolean isAboveCategories(Facts facts) {
    return facts.starter().supply().voltage()
        > facts.practice().figure("contactor.greatest-voltage").value();
  }

  /**
   * The capacity; of a contactor rated in several categories the greatest proven figure counts.
   *
   * @return empty where nothing proves one: no rating, no breaking capacity, a contactor above 1000
   *     V without a tested breaking current of its own (IEC 62271-106 figures are not held), one
   *     used above its rated voltage
   */
  public static Optional<BreakingCapacity> of(Facts facts, String tag) {
    Optional<Breaker> breaker = facts.starter().breaker(tag);
    if (breaker.isPresent()) {
      return breaker.get().breakingAmps().isPresent()
          ? Optional.of(
              new BreakingCapacity(
                  tag, breaker.get().breakingAmps().getAsDouble(), "its breaking capacity"))
          : Optional.empty();
    }
    Optional<Contactor> found = facts.starter().contactor(tag);
    if (found.isEmpty()
        || found.get().place() != Contactor.Place.LINE
        || found.get().ratedVoltage().isEmpty()
        || found.get().ratedVoltage().getAsDouble() < facts.starter().supply().voltage()) {
      return Optional.empty();
    }
    BreakingCapacity best = null;
    if (found.get().breakingAmps().isPresent()) {
      best = new BreakingCapacity(tag, found.get().breakingAmps().getAsDouble(), OWN);
    }
    if (isAboveCategories(facts)) {
      return Optional.ofNullable(best);
    }
    for (Map.Entry<String, Double> rating : found.get().ratings().entrySet()) {
      Optional<Practice.Figure> multiple = facts.practice().find(rating.getKey() + ".breaking");
      if (multiple.isEmpty()) {
        continue;
      }
      double amps = multiple.get().value() * rating.getValue();
      if (best == null || amps > best.amps()) {
        best =
            new BreakingCapacity(
                tag,
                amps,
                rating.getKey()
                    + ", "
                    + sliprung.quantity.Show.three(multiple.get().value())
                    + " × "
                    + sliprung.quantity.Show.amps(rating.getValue()));
      }
    }
    return Optional.ofNullable(best);
  }

  /** What to give so that a capacity can be judged. */
  public static String missingPath(Facts facts, String tag) {
    if (facts.starter().breaker(tag).isPresent()) {
      return "breakers." + tag + ".breaking";
    }
    Optional<Contactor> contactor = facts.starter().contactor(tag);
    if (contactor.isPresent() && contactor.get().ratedVoltage().isEmpty()) {
      return "contactors." + tag + ".rated-voltage";
    }
    return "contactors." + tag + (isAboveCategories(facts) ? ".breaking" : ".ratings");
  }
}
