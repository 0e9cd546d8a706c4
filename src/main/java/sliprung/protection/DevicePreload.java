package sliprung.protection;

import java.util.List;

/**
 * What the devices carried for long before a start. A definite timer and an inverse-time relay
 * begin at zero whatever it was.
 *
 * @param statorAmps steady stator current, A; 0: cold
 * @param ringAmps steady ring current, A; 0: cold
 * @param onlyKeptMemory relays whose memory is not kept have forgotten it: a relay cools in
 *     minutes, a motor in hours
 * @param sectionLevels level of each section before the start, 1 at its limit; empty: all cold
 */
public record DevicePreload(
    double statorAmps, double ringAmps, boolean onlyKeptMemory, List<Double> sectionLevels) {

  /** Nothing before. */
  public static final DevicePreload COLD = new DevicePreload(0.0, 0.0, false, List.of());

  /** Copies the list. */
  public DevicePreload {
    sectionLevels = List.copyOf(sectionLevels);
  }

  /** Every device is warm from running, as after a stop of no length. */
  public static DevicePreload running(double statorAmps, double ringAmps) {
    return new DevicePreload(statorAmps, ringAmps, false, List.of());
  }

  /** Only devices that keep their memory are warm from running; the part is hot, the relay not. */
  public static DevicePreload remembered(double statorAmps, double ringAmps) {
    return new DevicePreload(statorAmps, ringAmps, true, List.of());
  }

  /** The same on a bank that starts before have left warm. */
  public DevicePreload onWarmBank(List<Double> levels) {
    return new DevicePreload(statorAmps, ringAmps, onlyKeptMemory, levels);
  }

  /** Level of a section, numbered from 1. */
  double sectionLevel(int number) {
    return number <= sectionLevels.size() ? sectionLevels.get(number - 1) : 0.0;
  }
}
