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
 * The devices that clear a short circuit in the stator line without a contactor.
 *
 * <p>Made for it are fuses, devices given by points, and instantaneous elements that open a
 * breaker. Relays with a delay that open a breaker are counted only where there is none of those: a
 * contactor's breaking capacity shall not hang on the setting of a delayed relay next to a fuse.
 */
public final class ShortCircuitDevices {
  private final List<Member> members;

  private record Member(Device device, double openingSeconds) {}

  private ShortCircuitDevices(List<Member> members) {
    this.members = members;
  }

  /** Those of a starter. */
  public static ShortCircuitDevices of(Starter starter) {
    List<Member> made = new ArrayList<>();
    List<Member> delayed = new ArrayList<>();
    for (Device device : starter.protection()) {
      if (device.fitting().place() != Device.Place.STATOR) {
        continue;
      }
      Optional<Breaker> breaker = device.trips().flatMap(starter::breaker);
      Member member = new Member(device, breaker.map(Breaker::openingSeconds).orElse(0.0));
      boolean opensByItself = device.trips().isEmpty();
      if (device instanceof Device.Fuse) {
        made.add(new Member(device, 0.0));
      } else if (device instanceof Device.Points && (opensByItself || breaker.isPresent())) {
        made.add(member);
      } else if (device instanceof Device.Instantaneous && breaker.isPresent()) {
        made.add(member);
      } else if (breaker.isPresent() && device.measuresCurrent()) {
        delayed.add(member);
      }
    }
    return new ShortCircuitDevices(made.isEmpty() ? delayed : made);
  }

  /** Whether there is none. */
  public boolean isEmpty() {
    return members.isEmpty();
  }

  /** The devices, in the file's order. */
  public List<Device> devices() {
    return members.stream().map(Member::device).toList();
  }

  /** Whether a device is one of them. */
  public boolean has(String tag) {
    return members.stream().anyMatch(m -> m.device().tag().equals(tag));
  }

  /** Opening time in s of what a device of them opens; 0 where it opens the circuit itself. */
  public double openingSeconds(Device device) {
    return members.stream()
        .filter(m -> m.device().equals(device))
        .mapToDouble(Member::openingSeconds)
        .findFirst()
        .orElse(0.0);
  }

  /** Their tags: {@code F1}, {@code F1 or F4}. */
  public String tags() {
    return String.join(" or ", members.stream().map(m -> m.device().tag()).toList());
  }

  /**
   * When the first of them has opened at the latest: slow edges and the opening of breakers.
   *
   * @param amps constant stator current from cold
   * @param unknown time that a device counts with where its time cannot be told, s
   * @return seconds, infinite: never
   */
  public double clearedBySeconds(OperatingTimes times, double amps, double unknown) {
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
