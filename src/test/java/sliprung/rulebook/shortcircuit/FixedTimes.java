package sliprung.rulebook.shortcircuit;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import sliprung.protection.Edge;
import sliprung.rulebook.contactor.OperatingTimes;
import sliprung.starter.Device;

/** Every device at every edge by one law, so that crossings are known beforehand. */
record FixedTimes(DoubleUnaryOperator law) implements OperatingTimes {
  @Override
  public OptionalDouble seconds(Device device, Edge edge, double amps) {
    return OptionalDouble.of(law.applyAsDouble(amps));
  }

  @Override
  public OptionalDouble secondsFromHot(Device device, Edge edge, double amps, double running) {
    return seconds(device, edge, amps);
  }

  @Override
  public Optional<String> unknown(Device device, Edge edge) {
    return Optional.empty();
  }
}
