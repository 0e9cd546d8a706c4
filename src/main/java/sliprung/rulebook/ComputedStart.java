package sliprung.rulebook;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.protection.StartMargins;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.tolerance.Corner;

/**
 * One start with what every device and part made of it.
 *
 * @param scenario what was supposed to happen
 * @param from thermal state before it
 * @param place in its series, from 1; 1 for faults
 * @param corner of the tolerances
 * @param history speed, currents, torque
 * @param devices every device at every edge it has
 * @param parts every part
 * @param circuit empty, or which of several circuits it was computed with
 */
public record ComputedStart(
    Scenario scenario,
    From from,
    int place,
    Corner corner,
    StartHistory history,
    List<DeviceResponse> devices,
    List<PartResponse> parts,
    String circuit) {

  /** A start computed with the only circuit. */
  public ComputedStart(
      Scenario scenario,
      From from,
      int place,
      Corner corner,
      StartHistory history,
      List<DeviceResponse> devices,
      List<PartResponse> parts) {
    this(scenario, from, place, corner, history, devices, parts, "");
  }

  /** Thermal state before a start. */
  public enum From {
    COLD,
    HOT;

    /** As written in records. */
    public String word() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /** Copies the lists. */
  public ComputedStart {
    devices = List.copyOf(devices);
    parts = List.copyOf(parts);
  }

  /**
   * Unique name: {@code cold}, {@code hot-2}, {@code held-1}, {@code locked-hot}; at a corner with
   * {@code @} and the corner's id behind.
   */
  public String id() {
    String name =
        scenario.isFault()
            ? scenario.id() + (from == From.HOT ? "-hot" : "")
            : from.word() + (place > 1 ? "-" + place : "");
    String there = corner.isNominal() ? name : name + "@" + corner.id();
    return circuit.isEmpty() ? there : there + "~" + circuit;
  }

  /** In words, such as {@code hot start} or {@code held on step 2, from hot}. */
  public String words() {
    if (scenario.isFault()) {
      return scenario.words() + ", from " + from.word();
    }
    return (place > 1 ? from.word() + " start " + place + " in a row" : from.word() + " start");
  }

  /**
   * Of permitted starts the one in which a device, at its fast edge, is nearest to operating by a
   * rising current; the first of equals. Empty where it has no such margin in any.
   */
  public static Optional<ComputedStart> nearest(Stream<ComputedStart> starts, String tag) {
    ComputedStart nearest = null;
    double least = Double.POSITIVE_INFINITY;
    for (ComputedStart start : starts.toList()) {
      Optional<StartMargins> margins =
          start.device(tag, Edge.FAST).flatMap(DeviceResponse::margins);
      if (margins.isPresent() && (nearest == null || margins.get().currentBelow(least))) {
        nearest = start;
        least = margins.get().current();
      }
    }
    return Optional.ofNullable(nearest);
  }

  /** The response of a device at an edge, if it has that edge. */
  public Optional<DeviceResponse> device(String tag, Edge edge) {
    return devices.stream().filter(d -> d.device().equals(tag) && d.edge() == edge).findFirst();
  }

  /** The response of a part. */
  public Optional<PartResponse> part(String name) {
    return parts.stream().filter(p -> p.part().equals(name)).findFirst();
  }
}
