package sliprung.protection;

/**
 * A timer that runs while the current stays above a pick-up and falls back to zero once it is below
 * the drop-off; its level is the time elapsed over the time set.
 */
final class TimerMeter implements Meter {
  private final double pickUpAmps;
  private final double dropOffAmps;
  private final double setSeconds;
  private boolean running;
  private double elapsed;
  private double peak;

  /**
   * A timer.
   *
   * @param pickUpAmps starts above it
   * @param dropOffAmps falls back at or below it; at most the pick-up
   * @param setSeconds 0 or more
   */
  TimerMeter(double pickUpAmps, double dropOffAmps, double setSeconds) {
    this.pickUpAmps = pickUpAmps;
    this.dropOffAmps = dropOffAmps;
    // a timer set to nothing still has to start
    this.setSeconds = Math.max(setSeconds, 1e-9);
  }

  @Override
  public double advance(Piece piece) {
    double reached = Double.POSITIVE_INFINITY;
    double passed = 0.0;
    peak = level();
    for (Piece part : piece.cutAt(pickUpAmps, dropOffAmps)) {
      double amps = part.middle();
      if (amps > pickUpAmps) {
        running = true;
      } else if (amps <= dropOffAmps) {
        running = false;
        elapsed = 0.0;
      }
      if (running) {
        double wait = Math.max(0.0, setSeconds - elapsed);
        if (wait <= part.seconds()) {
          reached = Math.min(reached, passed + wait);
        }
        elapsed += part.seconds();
        peak = Math.max(peak, level());
      }
      passed += part.seconds();
    }
    return reached;
  }

  @Override
  public double level() {
    return elapsed / setSeconds;
  }

  @Override
  public double peak() {
    return peak;
  }
}
