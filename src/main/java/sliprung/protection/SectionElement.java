package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.starter.ResistorBank;
import sliprung.starter.ShortTime;

/**
 * One section of the bank as a first-order thermal element, from its two ratings.
 *
 * <p>Both end at one temperature, or each at a rise of its own. With r the short-time rise over the
 * continuous rise (1 for one temperature), {@code τ = −t/ln(1 − r (I_c/I_st)²)}. The limit is the
 * lower of the two rises throughout, which is what a section that stays on must keep to.
 *
 * @param referenceAmps current in its own conductor that ends at the limit
 * @param timeConstantSeconds τ
 */
public record SectionElement(double referenceAmps, double timeConstantSeconds) {
  /** Shortest time constant of a metal section that is believed, s. */
  public static final double SHORTEST_SECONDS = 20.0;

  /** Longest time constant of a metal section that is believed, s. */
  public static final double LONGEST_SECONDS = 3600.0;

  /** Whether the time constant is that of a metal section; otherwise the ratings contradict. */
  public boolean plausible() {
    return timeConstantSeconds >= SHORTEST_SECONDS && timeConstantSeconds <= LONGEST_SECONDS;
  }

  /**
   * Path of the first input that is missing, or of the ratings if they contradict each other.
   *
   * @param bank with the section
   * @param number of the section, from 1
   */
  public static Optional<String> missing(ResistorBank bank, int number) {
    ResistorBank.Section section = bank.sections().get(number - 1);
    String path = "resistors.sections[" + number + "].";
    if (section.continuousAmps().isEmpty()) {
      return Optional.of(path + "continuous");
    }
    if (section.shortTime().isEmpty()) {
      return Optional.of(path + "short-time");
    }
    if (!bank.sameLimit()
        && (section.continuousRiseKelvin().isEmpty() || section.shortTimeRiseKelvin().isEmpty())) {
      return Optional.of("resistors.same-limit");
    }
    return element(bank, section).plausible() ? Optional.empty() : Optional.of(path + "short-time");
  }

  /** The element where the data suffice and make sense; the arguments are those of missing. */
  public static Optional<SectionElement> of(ResistorBank bank, int number) {
    return missing(bank, number).isPresent()
        ? Optional.empty()
        : Optional.of(element(bank, bank.sections().get(number - 1)));
  }

  /**
   * Time constant in s that the two ratings of a section imply, believable or not; empty where one
   * is missing. NaN where the short-time rating asks for less than the continuous one.
   */
  public static Optional<SectionElement> implied(ResistorBank bank, int number) {
    ResistorBank.Section section = bank.sections().get(number - 1);
    boolean complete =
        section.continuousAmps().isPresent()
            && section.shortTime().isPresent()
            && (bank.sameLimit()
                || section.continuousRiseKelvin().isPresent()
                    && section.shortTimeRiseKelvin().isPresent());
    return complete ? Optional.of(element(bank, section)) : Optional.empty();
  }

  /** Rise in K over the air at a section's limit; empty where no rise is given. */
  public static OptionalDouble limitRiseKelvin(ResistorBank.Section section) {
    return section.continuousRiseKelvin().isPresent() && section.shortTimeRiseKelvin().isPresent()
        ? OptionalDouble.of(
            Math.min(
                section.continuousRiseKelvin().getAsDouble(),
                section.shortTimeRiseKelvin().getAsDouble()))
        : OptionalDouble.empty();
  }

  private static SectionElement element(ResistorBank bank, ResistorBank.Section section) {
    double continuous = section.continuousAmps().orElseThrow();
    ShortTime shortTime = section.shortTime().orElseThrow();
    double rises = 1.0;
    if (section.continuousRiseKelvin().isPresent() && section.shortTimeRiseKelvin().isPresent()) {
      rises =
          section.shortTimeRiseKelvin().getAsDouble()
              / section.continuousRiseKelvin().getAsDouble();
    } else if (!bank.sameLimit()) {
      throw new IllegalStateException("two ratings without a common limit");
    }
    double share = rises * Math.pow(continuous / shortTime.amps(), 2.0);
    double tau = -shortTime.seconds() / Math.log(1.0 - share);
    return new SectionElement(continuous * Math.sqrt(Math.min(1.0, rises)), tau);
  }
}
