package sliprung.review;

import sliprung.quantity.Show;
import sliprung.starter.Device;

/** Devices as people call them. */
public final class DeviceText {
  private static final Device.Cases<String> KIND = new Kinds();

  private DeviceText() {}

  /** {@code F3 very inverse}: tag and kind. */
  public static String words(Device device) {
    return device.tag() + " " + device.fold(KIND);
  }

  /** The kind of every device in a few words. */
  private static final class Kinds implements Device.Cases<String> {
    @Override
    public String fuse(Device.Fuse device) {
      return (device.fuseClass() == Device.FuseClass.GG ? "fuse gG " : "fuse aM ")
          + Show.amps(device.ratingAmps());
    }

    @Override
    public String overload(Device.Overload device) {
      return "overload class " + device.tripClass().name();
    }

    @Override
    public String inverseTime(Device.InverseTime device) {
      return device.law().title();
    }

    @Override
    public String instantaneous(Device.Instantaneous device) {
      return "instantaneous";
    }

    @Override
    public String sequenceTimer(Device.SequenceTimer device) {
      return "sequence timer";
    }

    @Override
    public String thermal(Device.Thermal device) {
      return "thermal";
    }

    @Override
    public String definiteTime(Device.DefiniteTime device) {
      return "definite time";
    }

    @Override
    public String points(Device.Points device) {
      return device.curve().name();
    }

    @Override
    public String standstill(Device.Standstill device) {
      return "rotation sensor";
    }

    @Override
    public String stepProof(Device.StepProof device) {
      return "proof of steps";
    }

    @Override
    public String undervoltage(Device.Undervoltage device) {
      return "undervoltage";
    }

    @Override
    public String temperature(Device.Temperature device) {
      return "bank temperature";
    }
  }
}
