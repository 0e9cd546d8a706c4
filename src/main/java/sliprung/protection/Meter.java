package sliprung.protection;

import java.util.Optional;

/**
 * What one element of a device or one heated part has gone through so far: a state that moves
 * forward piece by piece. A device operates and a part is at its limit when the level reaches 1.
 */
interface Meter {

  /**
   * Moves forward by a piece.
   *
   * @return seconds into the piece at which the level first reaches 1 and may act; infinite: not in
   *     this piece
   */
  double advance(Piece piece);

  /** Level now: share of what makes it operate. */
  double level();

  /** Greatest level during the last {@link #advance} at which it could have acted. */
  double peak();

  /** The motor has stopped and the next start of a series follows without a pause to speak of. */
  default void stopBetweenStarts() {}

  /** Empty, or why an operation is only a bound and not proven. Asked after a run. */
  default Optional<String> bound() {
    return Optional.empty();
  }

  /** Empty, or why the run cannot be judged. Asked after a run. */
  default Optional<String> doubt() {
    return Optional.empty();
  }
}
