package sliprung.protection;

/**
 * A heater that follows the current with a lag, and a strip that follows the heater: {@code θh' =
 * ((I/I_ref)² − θh)/τh}, {@code θs' = (θh − θs)/τs}; it operates when the strip reaches 1. Exact
 * for a constant current over any length, the hump of a cooling heater included.
 */
final class TwoBodyMeter implements Meter {
  private final double referenceAmps;
  private final double heaterTau;
  private final double stripTau;
  private double heater;
  private double strip;
  private double peak;

  /**
   * An element.
   *
   * @param referenceAmps current that ends at 1
   * @param heaterTau lag of the heater, s
   * @param stripTau time constant of the strip, s
   * @param level both bodies to begin with
   */
  TwoBodyMeter(double referenceAmps, double heaterTau, double stripTau, double level) {
    this(referenceAmps, heaterTau, stripTau, level, level);
  }

  /** The same, heater and strip not equally warm to begin with. */
  TwoBodyMeter(
      double referenceAmps, double heaterTau, double stripTau, double heater, double strip) {
    this.referenceAmps = referenceAmps;
    this.heaterTau = heaterTau;
    // equal constants have another closed form; a millionth apart serves as well
    this.stripTau =
        Math.abs(stripTau - heaterTau) < 1e-6 * heaterTau ? stripTau * (1.0 + 1e-6) : stripTau;
    this.heater = heater;
    this.strip = strip;
    this.peak = strip;
  }

  @Override
  public double advance(Piece piece) {
    double end = piece.meanSquare() / (referenceAmps * referenceAmps);
    double pull = (heater - end) * heaterTau / (heaterTau - stripTau);
    double rest = strip - end - pull;
    double before = strip;
    double h = piece.seconds();

    double humpAt = humpAt(heater - end - pull, rest, h);
    double top = humpAt > 0.0 ? at(end, pull, rest, humpAt) : before;
    double reached = Double.POSITIVE_INFINITY;
    double after = at(end, pull, rest, h);
    if (before < 1.0 && end <= FirstOrderMeter.AT_LIMIT && heater <= FirstOrderMeter.AT_LIMIT) {
      top = Math.min(top, FirstOrderMeter.BELOW_ONE);
      after = Math.min(after, FirstOrderMeter.BELOW_ONE);
    }
    if (before >= 1.0) {
      reached = 0.0;
    } else if (humpAt > 0.0 && top >= 1.0) {
      reached = rise(end, pull, rest, 0.0, humpAt);
    } else if (after >= 1.0) {
      reached = rise(end, pull, rest, Math.max(0.0, humpAt), h);
    }
    heater = end + (heater - end) * Math.exp(-h / heaterTau);
    strip = after;
    peak = Math.max(Math.max(before, after), top);
    return reached;
  }

  private double at(double end, double pull, double rest, double t) {
    return end + pull * Math.exp(-t / heaterTau) + rest * Math.exp(-t / stripTau);
  }

  /** When heater and strip are equally warm, the only turning point; 0 if not inside the piece. */
  private double humpAt(double heaterExcess, double stripExcess, double length) {
    double ratio = stripExcess / heaterExcess;
    if (!(ratio > 0.0)) {
      return 0.0;
    }
    double t = Math.log(ratio) / (1.0 / stripTau - 1.0 / heaterTau);
    return t > 0.0 && t < length ? t : 0.0;
  }

  private double rise(double end, double pull, double rest, double from, double to) {
    double low = from;
    double high = to;
    for (int i = 0; i < 60; i++) {
      double t = 0.5 * (low + high);
      if (at(end, pull, rest, t) >= 1.0) {
        high = t;
      } else {
        low = t;
      }
    }
    return high;
  }

  @Override
  public double level() {
    return strip;
  }

  @Override
  public double peak() {
    return peak;
  }
}
