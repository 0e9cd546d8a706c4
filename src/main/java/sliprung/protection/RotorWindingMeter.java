package sliprung.protection;

/**
 * A rotor winding: the level that running leaves and the excess that a start or a stall adds.
 *
 * <p>The stall times give both. From cold a rotor stands {@code B = I_s² t_cold} with its rings
 * shorted at rest, from running temperature {@code t_hot}; so running at rated current leaves it at
 * the level {@code 1 − t_hot/t_cold}. Running level r and excess D follow
 *
 * <pre>
 *   turning:  dr/dt = ((1 − t_hot/t_cold) (I2/I2n)² − r)/τ_heating
 *             dD/dt = max(I2² − I2n², 0)/B − D/τ_heating
 *   at rest:  dD/dt = I2²/B − D/τ_cooling,  r stays
 * </pre>
 *
 * <p>and use is r + D. Why two states: with I2²/B alone a turning rotor at its rated current would
 * settle at {@code I2n² τ_heating/B}, which is above 1 for ordinary data, although it is at rated
 * load; what rated load does is in r already, so that only what exceeds it may add to D.
 */
final class RotorWindingMeter implements Meter {

  /**
   * The winding's data.
   *
   * @param ratedAmps rated ring current
   * @param budget B, A²s
   * @param ratedLevel level after long running at rated current, 1 − t_hot/t_cold
   * @param heatingSeconds time constant, turning
   * @param coolingSeconds time constant, at rest
   */
  record Winding(
      double ratedAmps,
      double budget,
      double ratedLevel,
      double heatingSeconds,
      double coolingSeconds) {

    /** Level after long running at a ring current. */
    double levelAt(double ringAmps) {
      return ratedLevel * (ringAmps / ratedAmps) * (ringAmps / ratedAmps);
    }
  }

  private final Winding winding;
  private double running;
  private double excess;
  private double peak;

  /** A winding at a running level, without excess. */
  RotorWindingMeter(Winding winding, double running) {
    this.winding = winding;
    this.running = running;
    this.peak = running;
  }

  @Override
  public double advance(Piece piece) {
    double reached = level() >= 1.0 ? 0.0 : Double.POSITIVE_INFINITY;
    double passed = 0.0;
    peak = level();
    for (Piece part : piece.cutAt(winding.ratedAmps())) {
      double offset = advanceWithin(part);
      if (Double.isInfinite(reached)) {
        reached = passed + offset;
      }
      passed += part.seconds();
      peak = Math.max(peak, level());
    }
    return reached;
  }

  private double advanceWithin(Piece part) {
    double square = part.meanSquare();
    double rated = winding.ratedAmps() * winding.ratedAmps();
    double tau = part.standing() ? winding.coolingSeconds() : winding.heatingSeconds();
    double added = part.standing() ? square : Math.max(0.0, square - rated);
    double excessEnd = added / winding.budget() * tau;
    double runningEnd = part.standing() ? running : winding.ratedLevel() * square / rated;
    double before = level();
    double end = runningEnd + excessEnd;
    double decay = Math.exp(-part.seconds() / tau);
    running = runningEnd + (running - runningEnd) * decay;
    excess = excessEnd + (excess - excessEnd) * decay;
    if (before < 1.0 && level() >= 1.0) {
      // both states share one time constant: their sum is a single exponential
      return Math.min(part.seconds(), tau * Math.log((end - before) / (end - 1.0)));
    }
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public double level() {
    return running + excess;
  }

  @Override
  public double peak() {
    return peak;
  }
}
