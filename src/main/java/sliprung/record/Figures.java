package sliprung.record;

import sliprung.chart.Picture;

/**
 * How charts, margin bars and overlong words come onto a page: on a screen and on paper in
 * different ways.
 */
interface Figures {
  /** Puts a chart where the page stands. */
  void chart(Html page, Picture picture);

  /**
   * Puts a margin bar where the page stands.
   *
   * @param share margin over wanted margin, 0 or more
   */
  void bar(Html page, double share);

  /** How many rows of a short table may stand beside one another. */
  int rowsAbreast();

  /** A text as it can be set there. */
  String fitted(String text);
}
