package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.review.DeviceText;
import sliprung.starter.Device;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/**
 * One dial as it is read on the panel.
 *
 * @param device tag and kind
 * @param dial what is turned, switched or fitted
 * @param setting in the dial's own units
 */
record DialText(String device, String dial, String setting) {

  /** Every dial of a starter: step timers in the order of the start, then devices. */
  static List<DialText> of(Starter starter) {
    List<DialText> dials = new ArrayList<>();
    for (Step step : starter.steps()) {
      step(dials, step);
    }
    for (Device device : starter.protection()) {
      device.fold(new Dials(dials, starter.supply().voltage()));
    }
    return dials;
  }

  private static void step(List<DialText> dials, Step step) {
    String device = step.contactor() + " step contactor";
    if (step.rule() instanceof Step.After after) {
      dials.add(new DialText(device, "timer", Show.seconds(after.seconds())));
    } else if (step.rule() instanceof Step.StatorBelow below) {
      dials.add(new DialText(device, "closes below, stator", Show.amps(below.amps())));
    } else if (step.rule() instanceof Step.RotorBelow below) {
      dials.add(new DialText(device, "closes below, rings", Show.amps(below.amps())));
    } else if (step.rule() instanceof Step.RotorFrequencyBelow below) {
      dials.add(
          new DialText(device, "closes below, rotor", Show.three(below.hertz()) + "\u00a0Hz"));
    }
    if (step.atLeastSeconds() > 0.0) {
      dials.add(new DialText(device, "not before", Show.seconds(step.atLeastSeconds())));
    }
  }

  /** The dials of every kind of device. */
  private record Dials(List<DialText> into, double rated) implements Device.Cases<Void> {
    private Void put(Device device, String dial, String setting) {
      into.add(new DialText(DeviceText.words(device), dial, setting));
      return null;
    }

    private Void pickUp(Device device, double amps) {
      return put(device, "pick-up, primary", Show.amps(amps));
    }

    private void blocked(Device device, OptionalDouble amps) {
      amps.ifPresent(a -> put(device, "blocked above", Show.amps(a)));
    }

    @Override
    public Void fuse(Device.Fuse device) {
      String kind = device.fuseClass() == Device.FuseClass.GG ? "gG " : "aM ";
      into.add(
          new DialText(
              device.tag() + " fuse", "link fitted", kind + Show.amps(device.ratingAmps())));
      return null;
    }

    @Override
    public Void overload(Device.Overload device) {
      return put(
          device,
          device.dialMeans() == Device.DialMeans.FULL_LOAD ? "full-load current" : "trips above",
          Show.amps(device.dialAmps()));
    }

    @Override
    public Void inverseTime(Device.InverseTime device) {
      String pickUp = Show.amps(device.pickUpAmps());
      if (device.ct().isPresent()) {
        Device.CurrentTransformer ct = device.ct().get();
        double turned = device.pickUpAmps() / ct.primary();
        pickUp +=
            " = "
                + Show.amps(turned * ct.secondary())
                + " behind "
                + Show.three(ct.primary())
                + "/"
                + Show.three(ct.secondary());
      }
      put(device, "pick-up", pickUp);
      put(device, "time multiplier", Show.three(device.timeMultiplier()));
      blocked(device, device.blockedAboveAmps());
      return null;
    }

    @Override
    public Void instantaneous(Device.Instantaneous device) {
      pickUp(device, device.pickUpAmps());
      blocked(device, device.blockedAboveAmps());
      return null;
    }

    @Override
    public Void sequenceTimer(Device.SequenceTimer device) {
      return put(device, "timer", Show.seconds(device.seconds()));
    }

    @Override
    public Void thermal(Device.Thermal device) {
      put(device, "base current", Show.amps(device.baseAmps()));
      put(device, "factor k", Show.three(device.factor()));
      return put(device, "time constant", Show.seconds(device.timeConstantSeconds()));
    }

    @Override
    public Void definiteTime(Device.DefiniteTime device) {
      pickUp(device, device.pickUpAmps());
      put(device, "delay", Show.seconds(device.seconds()));
      blocked(device, device.blockedAboveAmps());
      return null;
    }

    @Override
    public Void points(Device.Points device) {
      return put(device, "rating", Show.amps(device.ratingAmps()));
    }

    @Override
    public Void standstill(Device.Standstill device) {
      return put(device, "time at rest", Show.seconds(device.seconds()));
    }

    @Override
    public Void stepProof(Device.StepProof device) {
      return put(device, "time for each step", Show.seconds(device.seconds()));
    }

    @Override
    public Void undervoltage(Device.Undervoltage device) {
      double volts = device.share() * rated;
      put(
          device,
          "drops below",
          Show.percent(device.share()) + " = " + Show.volts(volts) + " line to line");
      return put(device, "delay", Show.seconds(device.seconds()));
    }

    @Override
    public Void temperature(Device.Temperature device) {
      return put(
          device,
          device.absolute() ? "trips above, element" : "trips above, rise of the element",
          Show.three(device.limit()) + (device.absolute() ? "\u00a0°C" : "\u00a0K"));
    }
  }
}
