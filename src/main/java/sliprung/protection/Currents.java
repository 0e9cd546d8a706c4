package sliprung.protection;

import java.util.HashMap;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.starter.Device.Measurement;
import sliprung.starter.Device.Place;

/** Every current of one history that a device measures or a part carries, taken out once. */
final class Currents {
  /** A current transformer reads nothing below about this frequency, Hz (common practice). */
  static final double TRANSFORMER_HERTZ = 5.0;

  private final StartHistory history;
  private final double synchronousSpeed;
  private final double frequency;
  private final Map<Channel.Quantity, Waveform> whole = new IdentityHashMap<>();
  private final Map<Place, Waveform> blind = new HashMap<>();
  private final Map<Double, Waveform> standing = new HashMap<>();

  /**
   * The currents of a history.
   *
   * @param synchronousSpeed rad/s
   * @param frequency of the supply, Hz
   */
  Currents(StartHistory history, double synchronousSpeed, double frequency) {
    this.history = history;
    this.synchronousSpeed = synchronousSpeed;
    this.frequency = frequency;
  }

  StartHistory history() {
    return history;
  }

  double synchronousSpeed() {
    return synchronousSpeed;
  }

  /** A channel's current. */
  Waveform of(Channel channel) {
    Waveform waveform =
        whole.computeIfAbsent(
            channel.quantity(), q -> Waveform.of(history, q, (trace, sample) -> true));
    return masked(waveform, channel.share());
  }

  /**
   * The current at a place.
   *
   * @param place whose current
   * @param measurement how it is measured
   * @param edge a transformer on the rotor side is blind below 5 Hz for the middle and slow edge;
   *     the fast edge assumes that it still reads
   */
  Waveform at(Place place, Measurement measurement, Edge edge) {
    if (place == Place.STATOR) {
      return of(Channel.stator());
    }
    Channel channel =
        place == Place.ROTOR ? Channel.ring() : Channel.ring(s -> s.bankIn() ? 1.0 : 0.0);
    if (measurement != Measurement.CT || edge == Edge.FAST) {
      return of(channel);
    }
    double least = TRANSFORMER_HERTZ / frequency * synchronousSpeed;
    return blind.computeIfAbsent(
        place,
        key ->
            masked(
                Waveform.of(
                    history,
                    channel.quantity(),
                    (trace, i) -> Math.abs(synchronousSpeed - trace.speed()[i]) >= least),
                channel.share()));
  }

  /** 1 while the rotor stands or turns no faster than a share of synchronous speed, else 0. */
  Waveform standing(double belowShare) {
    double limit = belowShare * synchronousSpeed;
    return standing.computeIfAbsent(
        belowShare,
        key ->
            Waveform.of(
                history,
                trace -> {
                  double[] flags = new double[trace.size()];
                  for (int i = 0; i < flags.length; i++) {
                    flags[i] = Math.abs(trace.speed()[i]) <= limit ? 1.0 : 0.0;
                  }
                  return flags;
                },
                (trace, sample) -> true));
  }

  /** Rated over present voltage at the starter, above 1 in a dip; a dead line is not computed. */
  Waveform reciprocalVoltage(double ratedVolts) {
    return Waveform.of(
        history,
        trace -> {
          double[] values = new double[trace.size()];
          for (int i = 0; i < values.length; i++) {
            values[i] = ratedVolts / trace.terminalVolts()[i];
          }
          return values;
        },
        (trace, sample) -> true);
  }

  private Waveform masked(Waveform waveform, Channel.Share share) {
    List<Stage> stages = history.everything();
    double[] shares = new double[stages.size()];
    boolean everywhere = true;
    for (int i = 0; i < shares.length; i++) {
      shares[i] = share.in(stages.get(i));
      everywhere &= shares[i] == 1.0;
    }
    return everywhere ? waveform : waveform.masked(shares);
  }
}
