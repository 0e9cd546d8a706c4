package sliprung.protection;

import java.util.Optional;
import java.util.function.Supplier;

/**
 * An element that is back at its beginning whenever the motor has stopped: an overcurrent relay
 * whose reset is not declared as held falls back while the current is gone, long before the next
 * start of a series. Thermal devices and fuses remember instead.
 */
final class FreshEachStartMeter implements Meter {
  private final Supplier<Meter> fresh;
  private Meter inner;

  FreshEachStartMeter(Supplier<Meter> fresh) {
    this.fresh = fresh;
    this.inner = fresh.get();
  }

  @Override
  public void stopBetweenStarts() {
    inner = fresh.get();
  }

  @Override
  public double advance(Piece piece) {
    return inner.advance(piece);
  }

  @Override
  public double level() {
    return inner.level();
  }

  @Override
  public double peak() {
    return inner.peak();
  }

  @Override
  public Optional<String> bound() {
    return inner.bound();
  }

  @Override
  public Optional<String> doubt() {
    return inner.doubt();
  }
}
