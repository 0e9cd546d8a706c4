package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;

/** An edge that nothing is known of. */
final class UnknownModel implements EdgeModel {
  private final String why;

  UnknownModel(String why) {
    this.why = why;
  }

  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    return EdgeOutcome.notJudged(why);
  }

  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    return Optional.empty();
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return OptionalDouble.empty();
  }

  @Override
  public Optional<String> unknown() {
    return Optional.of(why);
  }
}
