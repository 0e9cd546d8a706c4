package sliprung.rulebook.contactor;

import java.util.Comparator;
import java.util.Map;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.rulebook.Practice;
import sliprung.starter.Contactor;
import sliprung.starter.ShortTime;

/**
 * What a contactor carries closed for a short time: as declared, else, of one rated in AC-3 or
 * AC-4, the overload withstand of IEC 60947-4-1, 9.3.5 for ten seconds.
 */
final class TenSecondWithstand {
  private static final double SECONDS = 10.0;

  private TenSecondWithstand() {}

  /** Empty where nothing is declared and no category gives it. */
  static Optional<ShortTime> of(Contactor contactor, Practice practice) {
    if (contactor.shortTime().isPresent()) {
      return contactor.shortTime();
    }
    if (contactor.place() != Contactor.Place.LINE
        || contactor.ratedVoltage().isEmpty()
        || contactor.ratedVoltage().getAsDouble()
            > practice.figure("contactor.greatest-voltage").value()) {
      return Optional.empty();
    }
    return contactor.ratings().entrySet().stream()
        .filter(e -> e.getKey().equals("AC-3") || e.getKey().equals("AC-4"))
        .map(Map.Entry::getValue)
        .max(Comparator.naturalOrder())
        .map(ie -> new ShortTime(amps(ie, practice), SECONDS));
  }

  /** Ten-second current by the greatest rated current in AC-3, A. */
  static double amps(double ratedAmps, Practice practice) {
    return ratedAmps <= practice.figure("withstand.large-above").value()
        ? practice.figure("withstand.multiple").value() * ratedAmps
        : Math.max(
            practice.figure("withstand.large-least").value(),
            practice.figure("withstand.large-multiple").value() * ratedAmps);
  }

  /** A short-time current for another time, on I²t: an estimate, good from about 5 s to 30 s. */
  static double scaledAmps(ShortTime shortTime, double seconds) {
    return shortTime.amps() * Math.sqrt(shortTime.seconds() / seconds);
  }

  /** {@code 2 520 A for 10 s}. */
  static String words(ShortTime shortTime) {
    return Show.amps(shortTime.amps()) + " for " + Show.seconds(shortTime.seconds());
  }
}
