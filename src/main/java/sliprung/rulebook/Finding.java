package sliprung.rulebook;

import java.time.LocalDate;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Edge;

/**
 * One answer of one rule about one subject.
 *
 * @param rule {@code family/slug}
 * @param verdict the answer
 * @param subject device, contactor, section, conductor or input
 * @param start the start that decided it
 * @param edge the device edge that decided it
 * @param margin dimensionless, larger is better; what it is a ratio of, the rule's page says
 * @param wanted margin
 * @param limit the value is held against
 * @param value found
 * @param unit of limit and value
 * @param says one or two sentences, in amperes and seconds first
 * @param mend what to do or measure next
 * @param reference standard and clause
 * @param missing paths of missing inputs, with which it could be judged
 * @param weakestInput path and evidence grade of the weakest input it rests on
 * @param by who answers for an accepted deviation
 * @param until last day of an accepted deviation
 */
public record Finding(
    String rule,
    Verdict verdict,
    String subject,
    Optional<ComputedStart> start,
    Optional<Edge> edge,
    OptionalDouble margin,
    OptionalDouble wanted,
    OptionalDouble limit,
    OptionalDouble value,
    String unit,
    String says,
    String mend,
    String reference,
    List<String> missing,
    String weakestInput,
    Optional<String> by,
    Optional<LocalDate> until) {

  /** Copies the list and refuses a verdict that its own figures contradict. */
  public Finding {
    Objects.requireNonNull(verdict);
    missing = List.copyOf(missing);
    if (verdict == Verdict.CLEAR
        && margin.isPresent()
        && wanted.isPresent()
        && !(margin.getAsDouble() >= wanted.getAsDouble())) {
      throw new IllegalArgumentException(
          rule + " " + subject + ": clear with margin " + margin + " under " + wanted);
    }
  }
}
