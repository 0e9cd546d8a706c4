package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What one device does at one edge over one start.
 *
 * @param device tag
 * @param edge which relay of its set
 * @param use greatest share of what makes it operate; 1 or more: it operates
 * @param useAtRunUp greatest share up to the end of the run-up; of a fault, of the whole history
 * @param operatesAtSeconds from line closing; infinite: never
 * @param clearsAtSeconds operation and opening of what it trips; infinite: never
 * @param margins how far from operating; permitted starts at the fast edge only
 * @param bound empty, or why an operation found here is only a bound and not proven (a fuse between
 *     its non-fusing current and its first gate)
 * @param notJudged empty, or why this edge cannot be computed; then the figures mean nothing
 */
public record DeviceResponse(
    String device,
    Edge edge,
    double use,
    double useAtRunUp,
    double operatesAtSeconds,
    double clearsAtSeconds,
    Optional<StartMargins> margins,
    Optional<String> bound,
    Optional<String> notJudged) {

  /** {@link StartMargins#current}; empty where there is none. */
  public OptionalDouble currentMargin() {
    return margins.isPresent()
        ? OptionalDouble.of(margins.get().current())
        : OptionalDouble.empty();
  }

  /** {@link StartMargins#stretch}; empty where there is none. */
  public OptionalDouble stretchMargin() {
    return margins.isPresent()
        ? OptionalDouble.of(margins.get().stretch())
        : OptionalDouble.empty();
  }

  /** Whether it operates. */
  public boolean operates() {
    return notJudged.isEmpty() && operatesAtSeconds < Double.POSITIVE_INFINITY;
  }

  /** A response that cannot be computed. */
  public static DeviceResponse notJudged(String device, Edge edge, String why) {
    return new DeviceResponse(
        device,
        edge,
        Double.NaN,
        Double.NaN,
        Double.POSITIVE_INFINITY,
        Double.POSITIVE_INFINITY,
        Optional.empty(),
        Optional.empty(),
        Optional.of(why));
  }
}
