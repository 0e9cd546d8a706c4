package sliprung.chart;

/**
 * Points of a line on any two axes, in the order in which it is drawn.
 *
 * @param across values on the axis below
 * @param up values on the axis on the left
 */
public record Curve(double[] across, double[] up) {

  /** Copies and checks. */
  public Curve {
    across = across.clone();
    up = up.clone();
    if (across.length != up.length) {
      throw new IllegalArgumentException("a value for each place");
    }
  }

  @Override
  public double[] across() {
    return across.clone();
  }

  @Override
  public double[] up() {
    return up.clone();
  }

  /** Number of points. */
  public int size() {
    return across.length;
  }
}
