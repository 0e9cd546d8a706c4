package sliprung.rulebook.shortcircuit;

import sliprung.starter.Device;

/**
 * Rated current of a fuse or breaker, pick-up or dial of a relay, A; infinite of what measures no
 * current.
 */
final class SettingAmps implements Device.Cases<Double> {
  @Override
  public Double fuse(Device.Fuse device) {
    return device.ratingAmps();
  }

  @Override
  public Double overload(Device.Overload device) {
    return device.dialAmps();
  }

  @Override
  public Double inverseTime(Device.InverseTime device) {
    return device.pickUpAmps();
  }

  @Override
  public Double instantaneous(Device.Instantaneous device) {
    return device.pickUpAmps();
  }

  @Override
  public Double sequenceTimer(Device.SequenceTimer device) {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public Double thermal(Device.Thermal device) {
    return device.factor() * device.baseAmps();
  }

  @Override
  public Double definiteTime(Device.DefiniteTime device) {
    return device.pickUpAmps();
  }

  @Override
  public Double points(Device.Points device) {
    return device.ratingAmps();
  }

  @Override
  public Double standstill(Device.Standstill device) {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public Double stepProof(Device.StepProof device) {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public Double undervoltage(Device.Undervoltage device) {
    return Double.POSITIVE_INFINITY;
  }

  @Override
  public Double temperature(Device.Temperature device) {
    return Double.POSITIVE_INFINITY;
  }
}
