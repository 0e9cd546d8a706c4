package sliprung.protection;

import java.util.function.DoubleUnaryOperator;

/**
 * How far a device is from operating in a permitted start: the factor on the start's current (not
 * the preload), and on its time axis, at which it would. Worked out when asked for: a review looks
 * at the nearest of many starts, and whether another is nearer takes one passage instead of a
 * search.
 */
public final class StartMargins {
  private final DoubleUnaryOperator byCurrent;
  private final DoubleUnaryOperator byTime;
  private final double use;
  private final double stride;
  private double current = Double.NaN;
  private double stretch = Double.NaN;

  /**
   * Margins to be worked out.
   *
   * @param byCurrent use of a factor on the current
   * @param byTime use of a factor on the time axis
   * @param use at factor 1
   * @param stride of the current margin, see {@link Margin}
   */
  StartMargins(
      DoubleUnaryOperator byCurrent, DoubleUnaryOperator byTime, double use, double stride) {
    this.byCurrent = byCurrent;
    this.byTime = byTime;
    this.use = use;
    this.stride = stride;
  }

  private StartMargins(double current, double stretch) {
    this(f -> Double.NaN, f -> Double.NaN, Double.NaN, Margin.COARSE);
    this.current = current;
    this.stretch = stretch;
  }

  /** Margins that are known. */
  public static StartMargins known(double current, double stretch) {
    return new StartMargins(current, stretch);
  }

  /** Factor on the current; infinite where none up to 100 operates it, 0 where it always does. */
  public synchronized double current() {
    if (Double.isNaN(current)) {
      current = Margin.of(byCurrent, use, stride);
    }
    return current;
  }

  /** Factor on the time axis; likewise. */
  public synchronized double stretch() {
    if (Double.isNaN(stretch)) {
      stretch = Margin.of(byTime, use, Margin.COARSE);
    }
    return stretch;
  }

  /** Whether the current margin is below a factor: no more than one passage where it is not. */
  public synchronized boolean currentBelow(double factor) {
    boolean rises = stride >= Margin.COARSE;
    if (Double.isNaN(current) && rises && factor <= Margin.GREATEST) {
      return factor > 0.0 && byCurrent.applyAsDouble(factor) >= 1.0 && current() < factor;
    }
    return current() < factor;
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof StartMargins m
        && Double.compare(current(), m.current()) == 0
        && Double.compare(stretch(), m.stretch()) == 0;
  }

  @Override
  public int hashCode() {
    return Double.hashCode(current()) * 31 + Double.hashCode(stretch());
  }

  @Override
  public String toString() {
    return "current " + current() + ", stretch " + stretch();
  }
}
