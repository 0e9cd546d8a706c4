package sliprung.runup;

import java.util.function.DoubleUnaryOperator;

/** What is measured minus a level, as a function of the drive's state; met at 0 and below. */
interface Level {

  /**
   * The difference.
   *
   * @param speed rad/s
   * @param statorAmps RMS
   * @param ringAmps RMS
   */
  double above(double speed, double statorAmps, double ringAmps);

  /** A level of speed alone. */
  static Level ofSpeed(DoubleUnaryOperator difference) {
    return (speed, statorAmps, ringAmps) -> difference.applyAsDouble(speed);
  }
}
