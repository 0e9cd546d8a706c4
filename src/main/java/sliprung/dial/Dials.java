package sliprung.dial;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import sliprung.quantity.Dimension;
import sliprung.starter.Device;
import sliprung.starter.DialScale;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/** The dials of a starter: timers and levels of its steps, settings of its devices. */
public final class Dials {
  private Dials() {}

  /** Every dial, in the order of the file. A fuse has none, nor has a device given as points. */
  public static List<Dial> of(Starter starter) {
    List<Dial> dials = new ArrayList<>();
    for (int i = 0; i < starter.steps().size(); i++) {
      steps(starter, i, dials);
    }
    starter.protection().forEach(d -> dials.addAll(d.fold(new Devices(starter))));
    return List.copyOf(dials);
  }

  private static void steps(Starter starter, int index, List<Dial> into) {
    Step step = starter.steps().get(index);
    Step.ClosingRule rule = step.rule();
    if (rule instanceof Step.After after) {
      into.add(
          step(starter, index, "after", Dimension.TIME, after.seconds(), (s, v) -> rule(s, v)));
    } else if (rule instanceof Step.StatorBelow below) {
      into.add(
          step(
              starter,
              index,
              "stator-below",
              Dimension.CURRENT,
              below.amps(),
              (s, v) -> new Step(s.contactor(), new Step.StatorBelow(v), s.atLeastSeconds())));
    } else if (rule instanceof Step.RotorBelow below) {
      into.add(
          step(
              starter,
              index,
              "rotor-below",
              Dimension.CURRENT,
              below.amps(),
              (s, v) -> new Step(s.contactor(), new Step.RotorBelow(v), s.atLeastSeconds())));
    } else if (rule instanceof Step.RotorFrequencyBelow below) {
      into.add(
          step(
              starter,
              index,
              "rotor-frequency-below",
              Dimension.FREQUENCY,
              below.hertz(),
              (s, v) ->
                  new Step(s.contactor(), new Step.RotorFrequencyBelow(v), s.atLeastSeconds())));
    }
    if (rule.isLevel() && step.atLeastSeconds() > 0.0) {
      into.add(
          step(
              starter,
              index,
              "at-least",
              Dimension.TIME,
              step.atLeastSeconds(),
              (s, v) -> new Step(s.contactor(), s.rule(), v)));
    }
  }

  private static Step rule(Step step, double seconds) {
    return new Step(step.contactor(), new Step.After(seconds), step.atLeastSeconds());
  }

  private static Dial step(
      Starter starter,
      int index,
      String key,
      Dimension dimension,
      double value,
      BiFunction<Step, Double, Step> with) {
    String tag = starter.steps().get(index).contactor();
    String path = "steps." + tag + "." + key;
    return new Dial(
        path,
        tag,
        key,
        dimension,
        value,
        starter.dialScales().getOrDefault(path, DialScale.NONE),
        (s, v) -> {
          List<Step> steps = new ArrayList<>(s.steps());
          steps.set(index, with.apply(steps.get(index), v));
          return s.withSteps(steps);
        });
  }

  /** The dials of one device. */
  private record Devices(Starter starter) implements Device.Cases<List<Dial>> {

    @Override
    public List<Dial> fuse(Device.Fuse device) {
      return List.of();
    }

    @Override
    public List<Dial> points(Device.Points device) {
      return List.of();
    }

    @Override
    public List<Dial> overload(Device.Overload d) {
      return List.of(
          dial(
              d,
              "dial",
              Dimension.CURRENT,
              d.dialAmps(),
              (o, v) ->
                  new Device.Overload(
                      o.fitting(),
                      o.tripClass(),
                      v,
                      o.dialMeans(),
                      o.memoryKept(),
                      o.compensated())));
    }

    @Override
    public List<Dial> inverseTime(Device.InverseTime d) {
      return List.of(
          dial(
              d,
              "pick-up",
              Dimension.CURRENT,
              d.pickUpAmps(),
              (o, v) -> inverse(o, v, o.timeMultiplier())),
          dial(
              d,
              "time-multiplier",
              Dimension.NUMBER,
              d.timeMultiplier(),
              (o, v) -> inverse(o, o.pickUpAmps(), v)));
    }

    private static Device.InverseTime inverse(
        Device.InverseTime o, double pickUp, double multiplier) {
      return new Device.InverseTime(
          o.fitting(),
          o.law(),
          pickUp,
          multiplier,
          o.ct(),
          o.accuracy(),
          o.reset(),
          o.blockedAboveAmps());
    }

    @Override
    public List<Dial> instantaneous(Device.Instantaneous d) {
      return List.of(
          dial(
              d,
              "pick-up",
              Dimension.CURRENT,
              d.pickUpAmps(),
              (o, v) ->
                  new Device.Instantaneous(
                      o.fitting(),
                      v,
                      o.measures(),
                      o.overreach(),
                      o.accuracy(),
                      o.blockedAboveAmps())));
    }

    @Override
    public List<Dial> sequenceTimer(Device.SequenceTimer d) {
      return List.of(
          dial(
              d,
              "time",
              Dimension.TIME,
              d.seconds(),
              (o, v) -> new Device.SequenceTimer(o.fitting(), v, o.untilSpeedShare())));
    }

    @Override
    public List<Dial> thermal(Device.Thermal d) {
      return List.of(
          dial(
              d,
              "base",
              Dimension.CURRENT,
              d.baseAmps(),
              (o, v) -> thermal(o, v, o.timeConstantSeconds())),
          dial(
              d,
              "time-constant",
              Dimension.TIME,
              d.timeConstantSeconds(),
              (o, v) -> thermal(o, o.baseAmps(), v)));
    }

    private static Device.Thermal thermal(Device.Thermal o, double base, double timeConstant) {
      return new Device.Thermal(
          o.fitting(), base, o.factor(), timeConstant, o.accuracy(), o.memoryKept());
    }

    @Override
    public List<Dial> definiteTime(Device.DefiniteTime d) {
      return List.of(
          dial(
              d,
              "pick-up",
              Dimension.CURRENT,
              d.pickUpAmps(),
              (o, v) -> definite(o, v, o.seconds())),
          dial(d, "time", Dimension.TIME, d.seconds(), (o, v) -> definite(o, o.pickUpAmps(), v)));
    }

    private static Device.DefiniteTime definite(
        Device.DefiniteTime o, double pickUp, double seconds) {
      return new Device.DefiniteTime(
          o.fitting(), pickUp, seconds, o.accuracy(), o.blockedAboveAmps());
    }

    @Override
    public List<Dial> standstill(Device.Standstill d) {
      return List.of(
          dial(
              d,
              "time",
              Dimension.TIME,
              d.seconds(),
              (o, v) -> new Device.Standstill(o.fitting(), v)));
    }

    @Override
    public List<Dial> stepProof(Device.StepProof d) {
      return List.of(
          dial(
              d,
              "time",
              Dimension.TIME,
              d.seconds(),
              (o, v) -> new Device.StepProof(o.fitting(), v)));
    }

    @Override
    public List<Dial> undervoltage(Device.Undervoltage d) {
      return List.of(
          dial(
              d,
              "time",
              Dimension.TIME,
              d.seconds(),
              (o, v) -> new Device.Undervoltage(o.fitting(), o.share(), v, o.accuracy())));
    }

    @Override
    public List<Dial> temperature(Device.Temperature d) {
      return List.of(
          dial(
              d,
              d.absolute() ? "limit" : "rise",
              d.absolute() ? Dimension.TEMPERATURE : Dimension.TEMPERATURE_RISE,
              d.limit(),
              (o, v) ->
                  new Device.Temperature(
                      o.fitting(),
                      o.sections(),
                      v,
                      o.absolute(),
                      o.air(),
                      o.lagSeconds(),
                      o.accuracy())));
    }

    /**
     * The device is looked up anew in the starter that is set: another dial of it may have moved.
     */
    @SuppressWarnings("unchecked")
    private <D extends Device> Dial dial(
        D device, String key, Dimension dimension, double value, BiFunction<D, Double, D> with) {
      String path = "protection." + device.tag() + "." + key;
      return new Dial(
          path,
          device.tag(),
          key,
          dimension,
          value,
          starter.dialScales().getOrDefault(path, DialScale.NONE),
          (s, v) ->
              s.withProtection(
                  s.protection().stream()
                      .map(
                          d ->
                              d.tag().equals(device.tag())
                                  ? with.apply((D) device.getClass().cast(d), v)
                                  : d)
                      .toList()));
    }
  }
}
