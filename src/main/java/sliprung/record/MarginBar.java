package sliprung.record;

/**
 * A bar that shows a margin against the wanted one, which is the mark in its middle: a bar that
 * ends left of the mark is short of it. Twice the wanted margin and more fill it.
 *
 * @param share margin over wanted margin
 */
record MarginBar(double share) {
  static final int WIDTH = 120;
  static final int HEIGHT = 16;

  /** Space above and below the bar, through which the mark sticks out. */
  static final int TOP = 3;

  /** Whether the margin is less than wanted. */
  boolean isShort() {
    return share < 1.0;
  }

  /** Length of the bar, px; short of the mark by at least a visible pixel where it is short. */
  double filled() {
    double whole = WIDTH - 1.0;
    double length = Math.max(0.0, Math.min(2.0, share)) / 2.0 * whole;
    return isShort() ? Math.min(length, whole / 2.0 - 1.5) : length;
  }
}
