package sliprung.rulebook.contactor;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import sliprung.protection.Edge;
import sliprung.starter.Device;

/** Operating times by simple laws, so that crossings are known beforehand. */
final class PowerLaws implements OperatingTimes {
  private final Map<String, DoubleUnaryOperator> laws = new HashMap<>();
  private final Map<String, String> unknown = new HashMap<>();

  PowerLaws law(String tag, Edge edge, DoubleUnaryOperator seconds) {
    laws.put(tag + edge, seconds);
    return this;
  }

  PowerLaws unknown(String tag, Edge edge, String why) {
    unknown.put(tag + edge, why);
    return this;
  }

  /** A law that is not a number cannot be told there. */
  @Override
  public OptionalDouble seconds(Device device, Edge edge, double amps) {
    DoubleUnaryOperator law = laws.get(device.tag() + edge);
    double seconds = law == null ? Double.NaN : law.applyAsDouble(amps);
    return Double.isNaN(seconds) ? OptionalDouble.empty() : OptionalDouble.of(seconds);
  }

  /** A tenth of the time from cold. */
  @Override
  public OptionalDouble secondsFromHot(Device device, Edge edge, double amps, double runningAmps) {
    OptionalDouble cold = seconds(device, edge, amps);
    return cold.isPresent() ? OptionalDouble.of(0.1 * cold.getAsDouble()) : cold;
  }

  @Override
  public Optional<String> unknown(Device device, Edge edge) {
    return Optional.ofNullable(unknown.get(device.tag() + edge));
  }
}
