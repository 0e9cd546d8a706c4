package sliprung.rulebook.contactor;

import sliprung.rulebook.Practice;
import sliprung.starter.Contactor;

/** Current of one pole of a rotor contactor, by how its poles are joined. */
final class PoleCurrent {
  private PoleCurrent() {}

  /**
   * In theory: ring current in a star and with two poles, ring current over √3 in a delta.
   *
   * @param ringAmps RMS
   */
  static double inTheory(Contactor contactor, double ringAmps) {
    return isDelta(contactor) ? ringAmps / Math.sqrt(3.0) : ringAmps;
  }

  /**
   * For a verdict: as in theory, but a delta does not share evenly and counts with ring current
   * over 1.4. A contactor that does not say how its poles are joined counts as a star.
   *
   * @param ringAmps RMS
   */
  static double forVerdict(Contactor contactor, double ringAmps, Practice practice) {
    return isDelta(contactor) ? ringAmps / practice.figure("rotor.delta-share").value() : ringAmps;
  }

  /** {@code a pole, in delta: ring current over 1.4}. */
  static String words(Contactor contactor) {
    return switch (contactor.poles().orElse(Contactor.Poles.STAR)) {
      case DELTA -> "a pole in delta, ring current over 1.4 (in theory over 1.73)";
      case TWO -> "a pole of two, the whole ring current";
      case STAR -> "a pole in star, the whole ring current";
    };
  }

  private static boolean isDelta(Contactor contactor) {
    return contactor.poles().equals(java.util.Optional.of(Contactor.Poles.DELTA));
  }
}
