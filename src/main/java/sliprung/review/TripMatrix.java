package sliprung.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.starter.Device;

/**
 * What every device opens, and the greatest current at which it may do so.
 *
 * @param rows in the file's order
 */
public record TripMatrix(List<Row> rows) {

  /**
   * One device.
   *
   * @param device with its settings
   * @param opens tag of what it opens; empty: itself (a fuse) or nothing
   * @param greatest greatest stator current that it may open in a computed start; empty: it opens
   *     none
   * @param shortCircuitAmps greatest prospective short-circuit current, where the device is there
   *     to open it: a fuse, or a relay measuring stator current that opens a breaker
   * @param proven what is proven of the thing it opens
   */
  public record Row(
      Device device,
      Optional<String> opens,
      Optional<Opening> greatest,
      OptionalDouble shortCircuitAmps,
      Optional<BreakingCapacity> proven) {

    /** Whether a fuse, which opens by itself. */
    public boolean isFuse() {
      return device instanceof Device.Fuse;
    }
  }

  /**
   * One opening.
   *
   * @param start in which it happens
   * @param edge of the device
   * @param seconds from line closing
   * @param amps stator current at that time, RMS
   */
  public record Opening(ComputedStart start, Edge edge, double seconds, double amps) {}

  /** Copies the list. */
  public TripMatrix {
    rows = List.copyOf(rows);
  }

  /**
   * Of a review. An operation counts unless another device has surely cleared the start before:
   * proven able to, at its slow edge.
   */
  public static TripMatrix of(Review review) {
    Facts facts = ReviewFacts.of(review);
    List<Row> rows = new ArrayList<>();
    for (Device device : review.starter().protection()) {
      Optional<String> opens = device.trips();
      rows.add(
          new Row(
              device,
              opens,
              opens.isPresent() || device instanceof Device.Fuse
                  ? greatest(facts, device)
                  : Optional.empty(),
              shortCircuit(facts, device),
              opens.flatMap(tag -> BreakingCapacity.of(facts, tag))));
    }
    return new TripMatrix(rows);
  }

  private static Optional<Opening> greatest(Facts facts, Device device) {
    Opening greatest = null;
    for (ComputedStart start : facts.starts()) {
      for (DeviceResponse response : start.devices()) {
        if (!response.device().equals(device.tag()) || !response.operates()) {
          continue;
        }
        double at = response.operatesAtSeconds();
        double amps = Exposure.statorAmpsAt(start.history(), at);
        boolean more = greatest == null || amps > greatest.amps();
        if (more && !clearedBefore(facts, start, response)) {
          greatest = new Opening(start, response.edge(), at, amps);
        }
      }
    }
    return Optional.ofNullable(greatest);
  }

  private static boolean clearedBefore(Facts facts, ComputedStart start, DeviceResponse response) {
    return Exposure.of(facts, start, List.of(response.device())).clearedAtSeconds()
        < response.operatesAtSeconds();
  }

  private static OptionalDouble shortCircuit(Facts facts, Device device) {
    boolean overcurrent =
        device instanceof Device.InverseTime
            || device instanceof Device.Instantaneous
            || device instanceof Device.DefiniteTime
            || device instanceof Device.Points;
    boolean breaker = device.trips().flatMap(facts.starter()::breaker).isPresent();
    boolean stator = device.fitting().place() == Device.Place.STATOR;
    boolean there = device instanceof Device.Fuse || (overcurrent && breaker);
    return stator && there ? facts.starter().supply().faultMaxAmps() : OptionalDouble.empty();
  }
}
