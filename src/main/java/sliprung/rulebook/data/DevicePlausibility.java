package sliprung.rulebook.data;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.starter.Device;
import sliprung.starter.Motor;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/** The protective devices' settings against the current of the place where they measure. */
final class DevicePlausibility implements Device.Cases<Void> {
  /** Greatest a.c. voltage of IEC 60269-1 fuses (from memory). */
  private final Tally tally;

  private DevicePlausibility(Tally tally) {
    this.tally = tally;
  }

  static void check(Tally tally) {
    DevicePlausibility checks = new DevicePlausibility(tally);
    tally.facts().starter().protection().forEach(d -> d.fold(checks));
  }

  private Starter starter() {
    return tally.facts().starter();
  }

  /** Rated current at the place of a device; none in resistor leads. */
  private OptionalDouble rated(Device device) {
    Motor motor = starter().motor();
    return switch (device.fitting().place()) {
      case STATOR -> OptionalDouble.of(motor.current());
      case ROTOR -> motor.rotorCurrent();
      case BANK -> OptionalDouble.empty();
    };
  }

  private static String path(Device device, String key) {
    return "protection." + device.tag() + "." + key;
  }

  private void setting(String name, Device device, String key, double amps, String hint) {
    tally.ratio(
        name,
        path(device, key),
        Tally.over(OptionalDouble.of(amps), rated(device)),
        device.tag() + "'s " + key + " over the rated current where it measures",
        hint);
  }

  @Override
  public Void fuse(Device.Fuse device) {
    setting(
        "fuse-rating",
        device,
        "rating",
        device.ratingAmps(),
        "A fuse carries rated current for good and lets the start through.");
    tally.ratio(
        "fuse-voltage",
        path(device, "kind"),
        OptionalDouble.of(starter().supply().voltage() / Device.Fuse.GREATEST_VOLTS),
        "the supply's voltage over the 1 000 V up to which the gates of " + device.tag() + " hold",
        "Above 1000 V a low-voltage fuse has no place; give the real fuse's own curve as points.");
    return null;
  }

  @Override
  public Void overload(Device.Overload device) {
    setting(
        "dial",
        device,
        "dial",
        device.dialAmps(),
        "Primary amperes; behind a current transformer the dial counts by its ratio.");
    return null;
  }

  @Override
  public Void inverseTime(Device.InverseTime device) {
    setting("pick-up", device, "pick-up", device.pickUpAmps(), "Primary amperes.");
    Optional<Device.CurrentTransformer> ct = device.ct();
    if (ct.isPresent()) {
      tally.ratio(
          "ct-pick-up",
          path(device, "ct"),
          Tally.over(device.pickUpAmps(), ct.get().primary()),
          device.tag() + "'s pick-up over the primary current of its transformer",
          "Pick-up is in primary amperes; the ratio is primary over secondary.");
      tally.ratio(
          "ct-rated",
          path(device, "ct"),
          Tally.over(rated(device), ct.get().primary()),
          "Rated current over the primary current of " + device.tag() + "'s transformer",
          "The ratio is primary over secondary.");
    }
    return null;
  }

  @Override
  public Void instantaneous(Device.Instantaneous device) {
    setting("instantaneous", device, "pick-up", device.pickUpAmps(), "Primary amperes, RMS.");
    return null;
  }

  @Override
  public Void sequenceTimer(Device.SequenceTimer device) {
    double steps = 0.0;
    for (Step step : starter().steps()) {
      if (!(step.rule() instanceof Step.After after)) {
        return null;
      }
      steps += after.seconds();
    }
    tally.ratio(
        "sequence-timer",
        path(device, "time"),
        Tally.over(device.seconds(), steps),
        device.tag() + "'s time over the sum of the step timers, " + Show.seconds(steps),
        "A sequence timer runs from line closing and outlasts the whole sequence.");
    return null;
  }

  @Override
  public Void thermal(Device.Thermal device) {
    setting(
        "dial",
        device,
        "base",
        device.factor() * device.baseAmps(),
        "Primary amperes, base current times factor.");
    return null;
  }

  @Override
  public Void definiteTime(Device.DefiniteTime device) {
    setting("pick-up", device, "pick-up", device.pickUpAmps(), "Primary amperes.");
    return null;
  }

  @Override
  public Void points(Device.Points device) {
    setting("points-rating", device, "rating", device.ratingAmps(), "Primary amperes.");
    return null;
  }

  @Override
  public Void standstill(Device.Standstill device) {
    tally.check(
        "standstill",
        path(device, "time"),
        OptionalDouble.of(device.seconds()),
        device.tag() + "'s time",
        Show::seconds,
        "Seconds at rest with the line closed.");
    return null;
  }

  @Override
  public Void stepProof(Device.StepProof device) {
    OptionalDouble longest =
        starter().steps().stream()
            .filter(s -> s.rule() instanceof Step.After)
            .mapToDouble(s -> ((Step.After) s.rule()).seconds())
            .max();
    tally.ratio(
        "step-proof",
        path(device, "time"),
        Tally.over(OptionalDouble.of(device.seconds()), longest),
        device.tag() + "'s time over the longest step timer",
        "A proof of steps waits longer than the longest step and runs anew from each closing.");
    return null;
  }

  @Override
  public Void undervoltage(Device.Undervoltage device) {
    tally.check(
        "undervoltage",
        path(device, "below"),
        OptionalDouble.of(device.share()),
        device.tag() + "'s voltage",
        Show::percent,
        "A share of the rated voltage.");
    return null;
  }

  @Override
  public Void temperature(Device.Temperature device) {
    if (device.absolute()) {
      tally.check(
          "element-temperature",
          path(device, "limit"),
          OptionalDouble.of(device.limit()),
          device.tag() + "'s limit",
          celsius -> Show.three(celsius) + "\u00a0°C",
          "Temperature of the element, well above the hottest air.");
    } else {
      tally.check(
          "element-rise",
          path(device, "rise"),
          OptionalDouble.of(device.limit()),
          device.tag() + "'s limit",
          kelvin -> Show.three(kelvin) + "\u00a0K",
          "Rise of the element over the air of the bank.");
    }
    tally.check(
        "sensor-lag",
        path(device, "lag"),
        OptionalDouble.of(device.lagSeconds()),
        device.tag() + "'s lag",
        Show::seconds,
        "Time constant of the sensor itself, s or min.");
    return null;
  }
}
