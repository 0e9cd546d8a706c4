package sliprung.rulebook.contactor;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Edge;
import sliprung.starter.Breaker;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * The devices that clear a short circuit in the stator line without a contactor: fuses, devices
 * given by points that open by themselves, and relays that open a breaker.
 */
final class ShortCircuitDevices {
  private final List<Member> members;

  private record Member(Device device, double openingSeconds) {}

  private ShortCircuitDevices(List<Member> members) {
    this.members = members;
  }

  /** Those of a starter. */
  static ShortCircuitDevices of(Starter starter) {
    List<Member> members = new ArrayList<>();
    for (Device device : starter.protection()) {
      if (device.fitting().place() != Device.Place.STATOR || !seesCurrent(device)) {
        continue;
      }
      Optional<Breaker> breaker = device.trips().flatMap(starter::breaker);
      boolean byItself =
          device instanceof Device.Fuse
              || device instanceof Device.Points && device.trips().isEmpty();
      if (byItself || breaker.isPresent()) {
        members.add(new Member(device, breaker.map(Breaker::openingSeconds).orElse(0.0)));
      }
    }
    return new ShortCircuitDevices(members);
  }

  private static boolean seesCurrent(Device device) {
    return !(device instanceof Device.SequenceTimer) && !(device instanceof Device.Standstill);
  }

  /** Whether there is none. */
  boolean isEmpty() {
    return members.isEmpty();
  }

  /** Their tags: {@code F1}, {@code F1 or F4}. */
  String tags() {
    return String.join(" or ", members.stream().map(m -> m.device().tag()).toList());
  }

  /**
   * When the first of them has opened at the latest: slow edges and the opening of breakers.
   *
   * @param amps constant stator current from cold
   * @param unknown time that a device counts with where its time cannot be told, s
   * @return seconds, infinite: never
   */
  double clearedBySeconds(OperatingTimes times, double amps, double unknown) {
    double first = Double.POSITIVE_INFINITY;
    for (Member member : members) {
      OptionalDouble seconds = times.seconds(member.device(), Edge.SLOW, amps);
      first =
          Math.min(
              first,
              seconds.isPresent() ? seconds.getAsDouble() + member.openingSeconds() : unknown);
    }
    return first;
  }
}
