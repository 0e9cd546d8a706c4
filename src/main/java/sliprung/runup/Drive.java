package sliprung.runup;

import java.util.List;
import java.util.Optional;

/** The moving state of one computation: time, speed, currents, and the samples of the stage. */
interface Drive {

  /** Now, s from line closing. */
  double time();

  /** Speed now, rad/s. */
  double speed();

  /** What a level measures now. */
  double value(Level level);

  /** A closing: from now on this circuit; the samples begin anew. */
  void enter(Circumstance circumstance);

  /** Moves on until a time, until everything has settled, or until a level changes its sign. */
  Circumstance.End move(double to, List<Level> stops);

  /** Holds the rotor at rest until a time. */
  void stand(double to);

  /** Keeps what has settled until a time. */
  void keep(double to);

  /** The samples of the stage. */
  Trace trace();

  /** The peak of the closing that began the stage; empty where it is not computed. */
  Optional<ClosingPeak> peak();
}
