package sliprung.protection;

/**
 * What a meter went through over the last of a number of starts in a row.
 *
 * @param use greatest level over the start and the running after it
 * @param useAtRunUp greatest level up to the end of the run-up; of a fault, of the whole history
 * @param reachedAtSeconds when the level first reached 1, from line closing; infinite: never
 */
record Passage(double use, double useAtRunUp, double reachedAtSeconds) {

  /**
   * Moves a meter through starts in a row without pause or running between them, and through the
   * running after the last.
   *
   * @param meter as left by what was before
   * @param waveform of one start
   * @param starts 1 or more
   */
  static Passage of(Meter meter, Waveform waveform, int starts) {
    for (int n = 1; n < starts; n++) {
      throughStart(meter, waveform);
      meter.stopBetweenStarts();
    }
    double use = meter.level();
    double atRunUp = use;
    double reached = use >= 1.0 ? waveform.startsAt() : Double.POSITIVE_INFINITY;
    double at = waveform.startsAt();
    for (int i = 0; i < waveform.size(); i++) {
      Piece piece = waveform.piece(i);
      double offset = meter.advance(piece);
      if (offset < Double.POSITIVE_INFINITY && Double.isInfinite(reached)) {
        reached = at + offset;
      }
      at += piece.seconds();
      use = Math.max(use, meter.peak());
      if (i < waveform.runUpCount()) {
        atRunUp = use;
      }
    }
    return new Passage(use, atRunUp, reached);
  }

  /** Moves a meter through one start, without the running after it. */
  static void throughStart(Meter meter, Waveform waveform) {
    for (int i = 0; i < waveform.startCount(); i++) {
      meter.advance(waveform.piece(i));
    }
  }
}
