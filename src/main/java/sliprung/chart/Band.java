package sliprung.chart;

/**
 * A device between its edges, as operating time at a constant current.
 *
 * @param label tag and what it is, such as {@code F3 very inverse}
 * @param amps rising stator amperes, RMS, primary
 * @param fastSeconds earliest operation at these; infinite: never
 * @param middleSeconds between the two, printed only; infinite: never, or not known
 * @param slowSeconds latest operation at these; infinite: never; not below the fast edge
 */
public record Band(
    String label,
    double[] amps,
    double[] fastSeconds,
    double[] middleSeconds,
    double[] slowSeconds) {

  /** Copies and checks. */
  public Band {
    amps = amps.clone();
    fastSeconds = fastSeconds.clone();
    middleSeconds = middleSeconds.clone();
    slowSeconds = slowSeconds.clone();
    if (amps.length < 2
        || amps.length != fastSeconds.length
        || amps.length != middleSeconds.length
        || amps.length != slowSeconds.length) {
      throw new IllegalArgumentException("two points or more, every edge at each: " + label);
    }
    for (int i = 1; i < amps.length; i++) {
      if (!(amps[i] > amps[i - 1])) {
        throw new IllegalArgumentException("amperes must rise: " + label);
      }
    }
  }

  /** Least of its amperes at which either edge ever operates, A; infinite: at none. */
  public double firstAmps() {
    for (int i = 0; i < amps.length; i++) {
      if (Double.isFinite(fastSeconds[i]) || Double.isFinite(slowSeconds[i])) {
        return amps[i];
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public double[] amps() {
    return amps.clone();
  }

  @Override
  public double[] fastSeconds() {
    return fastSeconds.clone();
  }

  @Override
  public double[] middleSeconds() {
    return middleSeconds.clone();
  }

  @Override
  public double[] slowSeconds() {
    return slowSeconds.clone();
  }
}
