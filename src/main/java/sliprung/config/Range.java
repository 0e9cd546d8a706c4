package sliprung.config;

/**
 * Values that mean something, in the unit of the dimension. What is merely implausible lies inside.
 *
 * @param low least
 * @param lowIncluded whether the least itself is inside
 * @param high greatest
 * @param highIncluded whether the greatest itself is inside
 * @param words such as {@code above 0}
 */
record Range(double low, boolean lowIncluded, double high, boolean highIncluded, String words) {
  static final Range ANY =
      new Range(Double.NEGATIVE_INFINITY, false, Double.POSITIVE_INFINITY, false, "of any size");
  static final Range POSITIVE = new Range(0.0, false, Double.POSITIVE_INFINITY, false, "above 0");
  static final Range NOT_NEGATIVE =
      new Range(0.0, true, Double.POSITIVE_INFINITY, false, "0 or more");
  static final Range ABOVE_ONE = new Range(1.0, false, Double.POSITIVE_INFINITY, false, "above 1");

  /** Above 0, at most 1. */
  static final Range FRACTION = new Range(0.0, false, 1.0, true, "above 0 and at most 1");

  /** As {@link #FRACTION}, in per cent. */
  static final Range FRACTION_PERCENT =
      new Range(0.0, false, 1.0, true, "above 0 % and at most 100 %");

  /** A spread to either side: a value less all of itself would be nothing. */
  static final Range SPREAD = new Range(0.0, true, 1.0, false, "from 0 % to below 100 %");

  /** A signed difference: less than all of it, no more than ten times. */
  static final Range DIFFERENCE =
      new Range(-1.0, false, 10.0, true, "above -100 % and at most 1000 %");

  /** Of what only grows, in per cent. */
  static final Range AT_LEAST_ALL = new Range(1.0, true, 100.0, true, "from 100 % to 10 000 %");

  /** Of a resistor element. */
  static final Range ELEMENT = new Range(0.0, false, 1200.0, true, "above 0 °C up to 1200 °C");

  static final Range TEMPERATURE = new Range(-90.0, true, 200.0, true, "from -90 °C to 200 °C");

  boolean contains(double value) {
    return (lowIncluded ? value >= low : value > low)
        && (highIncluded ? value <= high : value < high);
  }

  /** Whole numbers. */
  static Range whole(int low, int high) {
    return new Range(low, true, high, true, "from " + low + " to " + high);
  }
}
