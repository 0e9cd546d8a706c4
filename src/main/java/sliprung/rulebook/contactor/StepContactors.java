package sliprung.rulebook.contactor;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.starter.Contactor;
import sliprung.starter.Starter;

/** The contactors of the steps, and what is proven of them in a rotor circuit. */
final class StepContactors {
  private StepContactors() {}

  /** In the order of the steps, each once. */
  static List<Contactor> of(Starter starter) {
    return starter.steps().stream()
        .map(s -> s.contactor())
        .distinct()
        .flatMap(tag -> starter.contactor(tag).stream())
        .toList();
  }

  /** Rated rotor current, else the rated current in AC-2, A. */
  static OptionalDouble rotorRating(Facts facts, Contactor contactor) {
    return contactor.rotorRatingAmps().isPresent()
        ? contactor.rotorRatingAmps()
        : Category.of(contactor, facts.practice()).stream()
            .filter(Category::isSlipRing)
            .mapToDouble(Category::ratedAmps)
            .findFirst();
  }

  /** Standstill rotor voltage with the rings open, greatest over the corners, V; 0 for none. */
  static double greatestRingVolts(Facts facts) {
    return facts
        .permitted()
        .filter(s -> s.place() == 1)
        .mapToDouble(s -> facts.machine().openRingVolts(s.history().conditions().source()))
        .max()
        .orElse(0.0);
  }

  /** The start at the corner of the greatest standstill rotor voltage. */
  static Optional<ComputedStart> atGreatestRingVolts(Facts facts) {
    return facts
        .permitted()
        .filter(s -> s.place() == 1)
        .reduce(
            (a, b) ->
                facts.machine().openRingVolts(b.history().conditions().source())
                        > facts.machine().openRingVolts(a.history().conditions().source())
                    ? b
                    : a);
  }

  /** Not judged where the rings have more than the standard covers. */
  static Optional<Finding> beyondTheStandard(
      Facts facts, Contactor contactor, FindingBuilder builder) {
    double limit = facts.practice().figure("contactor.greatest-voltage").value();
    double rings = facts.starter().motor().rotorVoltage().orElseGet(() -> greatestRingVolts(facts));
    if (rings <= limit) {
      return Optional.empty();
    }
    return Optional.of(
        builder.notJudged(
            List.of(),
            contactor.tag()
                + " stands in a rotor circuit of "
                + Show.volts(rings)
                + ". IEC 60947-4-1 ends at "
                + Show.volts(limit)
                + "."));
  }
}
