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
 * @param currentMargin factor on the start's current (not the preload) at which it would operate;
 *     permitted starts at the fast edge only; infinite where no factor up to 100 operates it
 * @param stretchMargin factor on the start's time axis at which it would operate; likewise
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
    OptionalDouble currentMargin,
    OptionalDouble stretchMargin,
    Optional<String> bound,
    Optional<String> notJudged) {

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
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty(),
        Optional.of(why));
  }
}
