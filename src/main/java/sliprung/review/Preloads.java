package sliprung.review;

import java.util.List;
import java.util.Optional;
import sliprung.protection.DevicePreload;
import sliprung.protection.PartPreload;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Starter;

/**
 * What a motor was warm from before a start from hot: its running point, or its rated currents
 * where it cannot carry its load (which {@code trip/running} finds).
 *
 * @param statorAmps RMS
 * @param ringAmps RMS
 */
public record Preloads(double statorAmps, double ringAmps) {

  /** Of a running point. */
  public static Preloads of(Starter starter, Optional<RunningPoint> running) {
    return new Preloads(
        running.map(r -> r.point().statorAmps()).orElse(starter.motor().current()),
        running.map(r -> r.point().ringAmps()).orElse(starter.motor().rotorCurrent().orElse(0.0)));
  }

  /** Devices before a hot start: all warm, as after a stop of no length. */
  public DevicePreload devices() {
    return DevicePreload.running(statorAmps, ringAmps);
  }

  /** Devices before a fault from hot: only those that keep their memory are warm. */
  public DevicePreload remembered() {
    return DevicePreload.remembered(statorAmps, ringAmps);
  }

  /**
   * Parts before a start from hot.
   *
   * @param pauseSeconds at rest before it
   * @param sectionLevels as the starts before have left them
   */
  public PartPreload parts(double pauseSeconds, List<Double> sectionLevels) {
    return new PartPreload(statorAmps, ringAmps, pauseSeconds, sectionLevels);
  }
}
