package sliprung.protection;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.starter.Contactor;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;

/**
 * Contactors: the I²t of their short-time rating, counted while the pole current exceeds what they
 * carry for good. A line contactor without a declared rating but proved in AC-3 or AC-4 up to 1000
 * V has the withstand of IEC 60947-4-1, 9.3.5 (from memory): 8 times its greatest rated current for
 * 10 s, above 630 A 6 times but not less than 5040 A.
 */
final class ContactorParts {
  /**
   * Ring current over the pole current of a contactor in delta. In theory √3; contact resistances
   * are never equal.
   */
  private static final double DELTA = 1.4;

  private final Starter starter;

  ContactorParts(Starter starter) {
    this.starter = starter;
  }

  List<Part> parts() {
    List<Part> parts = new ArrayList<>();
    for (Contactor contactor : starter.contactors()) {
      if (contactor.place() == Contactor.Place.LINE) {
        parts.add(part(contactor, Channel.stator()));
      } else {
        if (starter.steps().stream().anyMatch(s -> s.contactor().equals(contactor.tag()))) {
          double share = poleShare(contactor);
          parts.add(
              part(
                  contactor,
                  Channel.ring(
                      stage ->
                          starter.carriesRingCurrent(contactor.tag(), stage.sectionsIn())
                              ? share
                              : 0.0)));
        }
      }
    }
    return parts;
  }

  private Part part(Contactor contactor, Channel channel) {
    String path = "contactors." + contactor.tag() + ".";
    Optional<ShortTime> shortTime = shortTime(contactor);
    if (shortTime.isEmpty()) {
      return Part.missing(contactor.tag(), path + "short-time");
    }
    OptionalDouble forGood = forGoodAmps(contactor);
    if (forGood.isEmpty()) {
      return Part.missing(contactor.tag(), path + "thermal");
    }
    double budget = shortTime.get().jouleIntegral();
    double thermal = forGood.getAsDouble();
    return Part.of(
        contactor.tag(),
        channel,
        preload -> new AccumulatingMeter(i -> i > thermal ? i * i / budget : 0.0, 0.0, thermal));
  }

  private static Optional<ShortTime> shortTime(Contactor contactor) {
    if (contactor.shortTime().isPresent()) {
      return contactor.shortTime();
    }
    if (contactor.place() != Contactor.Place.LINE
        || contactor.ratedVoltage().isEmpty()
        || contactor.ratedVoltage().getAsDouble() > 1000.0) {
      return Optional.empty();
    }
    return contactor.ratings().entrySet().stream()
        .filter(e -> e.getKey().equals("AC-3") || e.getKey().equals("AC-4"))
        .map(Map.Entry::getValue)
        .max(Double::compare)
        .map(ie -> new ShortTime(ie <= 630.0 ? 8.0 * ie : Math.max(5040.0, 6.0 * ie), 10.0));
  }

  private static OptionalDouble forGoodAmps(Contactor contactor) {
    if (contactor.thermalAmps().isPresent()) {
      return contactor.thermalAmps();
    }
    if (contactor.rotorRatingAmps().isPresent()) {
      return contactor.rotorRatingAmps();
    }
    return contactor.ratings().values().stream().mapToDouble(Double::doubleValue).max();
  }

  /** Pole current over ring current. */
  static double poleShare(Contactor contactor) {
    return contactor.poles().orElse(Contactor.Poles.STAR) == Contactor.Poles.DELTA
        ? 1.0 / DELTA
        : 1.0;
  }
}
