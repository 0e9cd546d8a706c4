package sliprung.protection;

/**
 * First-order thermal element {@code dθ/dt = ((I/I_ref)² − θ)/τ}, at its limit at θ = 1. Exact for
 * a constant current over any length; a varying one enters each piece with the mean of its square.
 */
final class FirstOrderMeter implements Meter {
  /** An end value that is 1 but for rounding: approached for ever, never reached. */
  static final double AT_LIMIT = 1.0 + 1e-12;

  static final double BELOW_ONE = Math.nextDown(1.0);

  private final double referenceAmps;
  private final Piece.OfCurrent timeConstant;
  private double theta;
  private double peak;

  /**
   * An element.
   *
   * @param referenceAmps current that ends at θ = 1
   * @param timeConstant τ in s of a current
   * @param theta level to begin with
   */
  FirstOrderMeter(double referenceAmps, Piece.OfCurrent timeConstant, double theta) {
    this.referenceAmps = referenceAmps;
    this.timeConstant = timeConstant;
    this.theta = theta;
    this.peak = theta;
  }

  FirstOrderMeter(double referenceAmps, double timeConstantSeconds, double theta) {
    this(referenceAmps, amps -> timeConstantSeconds, theta);
  }

  @Override
  public double advance(Piece piece) {
    double square = piece.meanSquare();
    double end = square / (referenceAmps * referenceAmps);
    double tau = timeConstant.at(Math.sqrt(square));
    double before = theta;
    theta = end + (before - end) * Math.exp(-piece.seconds() / tau);
    if (before < 1.0 && end <= AT_LIMIT) {
      theta = Math.min(theta, BELOW_ONE);
    }
    peak = Math.max(before, theta);
    if (before >= 1.0) {
      return 0.0;
    }
    return theta >= 1.0
        ? Math.min(piece.seconds(), tau * Math.log((end - before) / (end - 1.0)))
        : Double.POSITIVE_INFINITY;
  }

  @Override
  public double level() {
    return theta;
  }

  @Override
  public double peak() {
    return peak;
  }
}
