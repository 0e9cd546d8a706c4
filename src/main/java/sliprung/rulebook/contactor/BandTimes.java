package sliprung.rulebook.contactor;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Bands;
import sliprung.protection.DevicePreload;
import sliprung.protection.Edge;
import sliprung.rulebook.Facts;
import sliprung.starter.Device;

/** Operating times out of the devices' bands. */
public final class BandTimes implements OperatingTimes {
  private final Bands bands;

  /** Of the devices of these facts. */
  public BandTimes(Facts facts) {
    this.bands = facts.bands();
  }

  @Override
  public OptionalDouble seconds(Device device, Edge edge, double amps) {
    return bands.operatingSeconds(device, edge, amps);
  }

  @Override
  public OptionalDouble secondsFromHot(Device device, Edge edge, double amps, double runningAmps) {
    // only devices in the stator line are asked; a ring current is not needed
    return bands.operatingSeconds(device, edge, amps, DevicePreload.running(runningAmps, 0.0));
  }

  @Override
  public Optional<String> unknown(Device device, Edge edge) {
    return bands.unknown(device, edge);
  }
}
