package sliprung.protection;

/**
 * What the devices carried for long before a start. A definite timer and an inverse-time relay
 * begin at zero whatever it was.
 *
 * @param statorAmps steady stator current, A; 0: cold
 * @param ringAmps steady ring current, A; 0: cold
 * @param onlyKeptMemory relays whose memory is not kept have forgotten it: a relay cools in
 *     minutes, a motor in hours
 */
public record DevicePreload(double statorAmps, double ringAmps, boolean onlyKeptMemory) {

  /** Nothing before. */
  public static final DevicePreload COLD = new DevicePreload(0.0, 0.0, false);

  /** Every device is warm from running, as after a stop of no length. */
  public static DevicePreload running(double statorAmps, double ringAmps) {
    return new DevicePreload(statorAmps, ringAmps, false);
  }

  /** Only devices that keep their memory are warm from running; the part is hot, the relay not. */
  public static DevicePreload remembered(double statorAmps, double ringAmps) {
    return new DevicePreload(statorAmps, ringAmps, true);
  }
}
