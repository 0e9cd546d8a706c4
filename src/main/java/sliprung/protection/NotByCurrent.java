package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;

/** A model whose quantity is no current: no constant current has an operating time. */
record NotByCurrent(EdgeModel inner) implements EdgeModel {
  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    return inner.over(starts, withMargins);
  }

  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    return inner.useOverTime(starts);
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return OptionalDouble.empty();
  }
}
