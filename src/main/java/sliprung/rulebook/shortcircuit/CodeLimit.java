package sliprung.rulebook.shortcircuit;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.rulebook.Practice;
import sliprung.starter.Device;

/**
 * What NFPA 70 430.52 allows a short-circuit device of a wound-rotor motor.
 *
 * @param kind in words
 * @param share of full-load current, table 430.52(C)(1)
 * @param allowedAmps that share, of a fuse or breaker the next standard size (Exception 1)
 * @param exceptionAmps most where the motor will not start otherwise (Exception 2)
 */
record CodeLimit(String kind, double share, double allowedAmps, double exceptionAmps) {

  /** For a device; empty where the section names no such kind. */
  static Optional<CodeLimit> of(Device device, double fullLoadAmps, Practice practice) {
    if (device instanceof Device.Fuse) {
      // nothing says which kind of fuse it is: the lesser exception counts
      return Optional.of(
          sized("fuse", practice, fullLoadAmps, "430.52.fuse", "430.52.fuse.exception"));
    }
    if (device instanceof Device.Instantaneous) {
      double share = practice.figure("430.52.instantaneous").value();
      double most = practice.figure("430.52.instantaneous.exception").value();
      return Optional.of(
          new CodeLimit("instantaneous breaker", share, share * fullLoadAmps, most * fullLoadAmps));
    }
    if (!device.measuresCurrent()) {
      return Optional.empty();
    }
    boolean small = fullLoadAmps <= practice.figure("430.52.breaker.small-up-to").value();
    return Optional.of(
        sized(
            "inverse-time breaker",
            practice,
            fullLoadAmps,
            "430.52.breaker",
            "430.52.breaker.exception." + (small ? "small" : "large")));
  }

  private static CodeLimit sized(
      String kind, Practice practice, double fullLoadAmps, String key, String exception) {
    double share = practice.figure(key).value();
    double allowed = share * fullLoadAmps;
    return new CodeLimit(
        kind,
        share,
        nextSize(practice, allowed).orElse(allowed),
        Math.max(
            practice.figure(exception).value() * fullLoadAmps,
            nextSize(practice, allowed).orElse(allowed)));
  }

  /** The next standard size that is not less; empty above the greatest. */
  static OptionalDouble nextSize(Practice practice, double amps) {
    return practice.figures().entrySet().stream()
        .filter(e -> e.getKey().startsWith("size."))
        .mapToDouble(e -> e.getValue().value())
        .filter(s -> s >= amps * (1.0 - 1e-12))
        .min();
  }
}
