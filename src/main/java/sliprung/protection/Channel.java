package sliprung.protection;

import sliprung.runup.Stage;
import sliprung.runup.Trace;

/**
 * Which current of a history a device or part has.
 *
 * @param quantity sampled
 * @param share its current over the quantity's, stage by stage; 0: none
 */
record Channel(Quantity quantity, Share share) {
  /** Stator line current. */
  static final Quantity STATOR = Trace::statorAmps;

  /** Ring current. */
  static final Quantity RING = Trace::ringAmps;

  /** A sampled quantity, one value for each sample. */
  interface Quantity {
    double[] of(Trace trace);
  }

  /** A share in one stage. */
  interface Share {
    double in(Stage stage);
  }

  /** Stator line current in every stage. */
  static Channel stator() {
    return new Channel(STATOR, stage -> 1.0);
  }

  /** Ring current in every stage. */
  static Channel ring() {
    return new Channel(RING, stage -> 1.0);
  }

  /** Ring current times a share that depends on the stage. */
  static Channel ring(Share share) {
    return new Channel(RING, share);
  }
}
