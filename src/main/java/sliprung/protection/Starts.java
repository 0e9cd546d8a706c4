package sliprung.protection;

import java.util.HashMap;
import java.util.Map;
import sliprung.runup.StartHistory;
import sliprung.starter.Device.Measurement;
import sliprung.starter.Device.Place;

/** Some equal starts in a row, with every current that a device measures taken out once. */
final class Starts {
  /** A current transformer reads nothing below about this frequency, Hz (common practice). */
  static final double TRANSFORMER_HERTZ = 5.0;

  private final StartHistory history;
  private final int count;
  private final DevicePreload preload;
  private final double synchronousSpeed;
  private final double frequency;
  private final Map<Key, Waveform> waveforms = new HashMap<>();

  private record Key(Place place, boolean blindWhenSlow, double standingBelow) {}

  /**
   * Starts.
   *
   * @param history of each
   * @param count 1 or more
   * @param preload before the first
   * @param synchronousSpeed rad/s
   * @param frequency of the supply, Hz
   */
  Starts(
      StartHistory history,
      int count,
      DevicePreload preload,
      double synchronousSpeed,
      double frequency) {
    this.history = history;
    this.count = count;
    this.preload = preload;
    this.synchronousSpeed = synchronousSpeed;
    this.frequency = frequency;
  }

  StartHistory history() {
    return history;
  }

  int count() {
    return count;
  }

  DevicePreload preload() {
    return preload;
  }

  double synchronousSpeed() {
    return synchronousSpeed;
  }

  /**
   * The current at a place.
   *
   * @param place whose current
   * @param measurement how it is measured
   * @param edge a transformer on the rotor side is blind below 5 Hz for the middle and slow edge;
   *     the fast edge assumes that it still reads
   */
  Waveform current(Place place, Measurement measurement, Edge edge) {
    boolean blind = place != Place.STATOR && measurement == Measurement.CT && edge != Edge.FAST;
    return waveforms.computeIfAbsent(
        new Key(place, blind, -1.0), key -> Waveform.of(history, channel(place, blind)));
  }

  /** 1 while the rotor stands or turns no faster than a share of synchronous speed, else 0. */
  Waveform standing(double belowShare) {
    return waveforms.computeIfAbsent(
        new Key(Place.STATOR, false, belowShare),
        key ->
            Waveform.of(
                history,
                Channel.of(
                    stage -> 1.0,
                    trace -> {
                      double[] flags = new double[trace.size()];
                      for (int i = 0; i < flags.length; i++) {
                        double speed = Math.abs(trace.speed()[i]);
                        flags[i] = speed <= belowShare * synchronousSpeed ? 1.0 : 0.0;
                      }
                      return flags;
                    })));
  }

  private Channel channel(Place place, boolean blind) {
    Channel channel =
        switch (place) {
          case STATOR -> Channel.stator();
          case ROTOR -> Channel.ring(stage -> 1.0);
          case BANK -> Channel.ring(stage -> stage.bankIn() ? 1.0 : 0.0);
        };
    return blind
        ? Channel.aboveFrequency(channel, synchronousSpeed, frequency, TRANSFORMER_HERTZ)
        : channel;
  }
}
