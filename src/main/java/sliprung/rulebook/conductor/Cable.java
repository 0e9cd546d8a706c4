package sliprung.rulebook.conductor;

import java.util.Optional;
import sliprung.starter.Conductor;
import sliprung.starter.Starter;

/**
 * One of the two cables of a starter.
 *
 * @param subject of a finding
 * @param path in the file
 * @param ring whether it carries ring current
 * @param conductor as described
 */
record Cable(String subject, String path, boolean ring, Optional<Conductor> conductor) {

  /** To the stator. */
  static Cable stator(Starter starter) {
    return new Cable("stator cable", "conductors.stator", false, starter.statorConductor());
  }

  /** From the rings to the bank. */
  static Cable rotor(Starter starter) {
    return new Cable("rotor cable", "conductors.rotor", true, starter.rotorConductor());
  }
}
