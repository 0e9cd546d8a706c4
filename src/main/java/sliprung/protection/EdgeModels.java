package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.Supplier;
import sliprung.curve.AmBounds;
import sliprung.curve.AmGates;
import sliprung.curve.FuseGates;
import sliprung.curve.GgBounds;
import sliprung.curve.PointEdge;
import sliprung.curve.TimeCurrentEdge;
import sliprung.quantity.Show;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** Makes the model of one edge of every kind of device. */
final class EdgeModels implements Device.Cases<EdgeModel> {
  /** Factor on the pre-arcing currents of a fuse warm from load (customary). */
  static final double PREHEATED = 0.85;

  /** Where a running timer falls back, over its pick-up, at the fast edge (common practice). */
  private static final double DROP_OFF = 0.95;

  /** Below this share of synchronous speed a rotation sensor may still report a standing rotor. */
  private static final double SENSOR_SHARE = 0.01;

  private final Edge edge;
  private final Starter starter;

  /**
   * Models of an edge.
   *
   * @param edge which relay of its set
   * @param starter with its timers' spread, the air around the relays, its bank and supply
   */
  EdgeModels(Edge edge, Starter starter) {
    this.edge = edge;
    this.starter = starter;
  }

  /** A value at this edge: smaller at the fast, larger at the slow. */
  private double spread(double value, double perUnit) {
    return switch (edge) {
      case FAST -> value * (1.0 - perUnit);
      case MIDDLE -> value;
      case SLOW -> value * (1.0 + perUnit);
    };
  }

  @Override
  public EdgeModel fuse(Device.Fuse device) {
    if (!Device.Fuse.gatesHoldAt(starter.supply().voltage())) {
      return new UnknownModel(
          "the gates of a low-voltage fuse end at 1\u00a0000\u00a0V; the fuse that is there needs its"
              + " own curve as points");
    }
    if (device.gates().isPresent()) {
      FuseGates gates = device.gates().get();
      return switch (edge) {
        case FAST ->
            measuring(
                device,
                before -> {
                  double preheat = before > 0.0 ? PREHEATED : 1.0;
                  return new FuseMeter(
                      GgBounds.fast(gates, preheat), gates.notIn10sAmps() * preheat);
                });
        case MIDDLE -> curve(device, GgBounds.middle(gates));
        case SLOW -> curve(device, GgBounds.slow(gates));
      };
    }
    if (device.amGates().isPresent()) {
      AmGates gates = device.amGates().get();
      double rating = device.ratingAmps();
      return switch (edge) {
        case FAST ->
            measuring(
                device,
                before -> {
                  double preheat = before > 0.0 ? PREHEATED : 1.0;
                  return new FuseMeter(
                      AmBounds.fast(gates, rating, preheat),
                      AmBounds.firstGateAmps(gates, rating, preheat));
                });
        case MIDDLE -> curve(device, AmBounds.middle(gates, rating));
        case SLOW -> curve(device, AmBounds.slow(gates, rating));
      };
    }
    return new UnknownModel(
        "no gates for a fuse of " + Show.amps(device.ratingAmps()) + " of its class");
  }

  private EdgeModel curve(Device device, TimeCurrentEdge law) {
    return measuring(
        device, before -> new AccumulatingMeter(i -> 1.0 / law.seconds(i), 0.0, law.breaks()));
  }

  @Override
  public EdgeModel overload(Device.Overload device) {
    OverloadRelays relays = new OverloadRelays(device, starter.ambient().panelCelsius());
    if (edge != Edge.SLOW && !relays.hasShortestTime()) {
      return new UnknownModel(
          "trip class " + device.tripClass().name() + " has no shortest time: needs a curve");
    }
    DoubleFunction<Meter> meter =
        switch (edge) {
          case FAST -> relays.fast();
          case MIDDLE -> relays.middle();
          case SLOW -> relays.slow();
        };
    return measuring(device, device.memoryKept(), meter, Margin.COARSE);
  }

  @Override
  public EdgeModel inverseTime(Device.InverseTime device) {
    InverseTimeEdge law = new InverseTimeEdge(device, edge);
    return measuring(
        device,
        device.blockedAboveAmps(),
        before -> {
          Supplier<Meter> meter =
              () ->
                  blocked(
                      new AccumulatingMeter(law::rate, 0.0, law.breaks()),
                      device.blockedAboveAmps(),
                      device.accuracy());
          return device.reset() == Device.Reset.HELD ? meter.get() : new FreshEachStartMeter(meter);
        });
  }

  @Override
  public EdgeModel instantaneous(Device.Instantaneous device) {
    double pickUp = spread(device.pickUpAmps(), device.accuracy().pickUp());
    double threshold = edge == Edge.FAST ? pickUp / (1.0 + device.overreach()) : pickUp;
    return measuring(
        device,
        device.blockedAboveAmps(),
        before ->
            blocked(new ThresholdMeter(threshold), device.blockedAboveAmps(), device.accuracy()));
  }

  @Override
  public EdgeModel definiteTime(Device.DefiniteTime device) {
    double pickUp = spread(device.pickUpAmps(), device.accuracy().pickUp());
    double seconds = spread(device.seconds(), timer());
    double dropOff = edge == Edge.FAST ? DROP_OFF * pickUp : pickUp;
    return measuring(
        device,
        device.blockedAboveAmps(),
        before ->
            blocked(
                new TimerMeter(pickUp, dropOff, seconds),
                device.blockedAboveAmps(),
                device.accuracy()));
  }

  @Override
  public EdgeModel thermal(Device.Thermal device) {
    double reference = spread(device.factor() * device.baseAmps(), device.accuracy().pickUp());
    double tau = spread(device.timeConstantSeconds(), device.accuracy().time());
    return measuring(
        device,
        device.memoryKept(),
        before -> {
          double share = before / reference;
          return new FirstOrderMeter(reference, tau, share * share);
        },
        Margin.COARSE);
  }

  @Override
  public EdgeModel points(Device.Points device) {
    PointEdge fast = new PointEdge(device.curve().fast());
    PointEdge slow = new PointEdge(device.curve().slow());
    double rating = device.ratingAmps();
    return switch (edge) {
      case FAST -> measuring(device, before -> new PointsMeter(fast, rating, true));
      // printed only: the slow edge's points at the mean time would claim more than is known
      case MIDDLE -> measuring(device, before -> new MeanPointsMeter(fast, slow, rating));
      case SLOW -> measuring(device, before -> new PointsMeter(slow, rating, false));
    };
  }

  @Override
  public EdgeModel sequenceTimer(Device.SequenceTimer device) {
    return new SequenceTimerModel(device, spread(1.0, timer()));
  }

  @Override
  public EdgeModel standstill(Device.Standstill device) {
    double seconds = spread(device.seconds(), timer());
    double below = edge == Edge.FAST ? SENSOR_SHARE : 0.0;
    return new MeasuringModel(
        currents -> currents.standing(below),
        preload -> 0.0,
        before -> new TimerMeter(0.5, 0.5, seconds),
        Margin.COARSE);
  }

  @Override
  public EdgeModel stepProof(Device.StepProof device) {
    return new StepProofModel(starter, spread(device.seconds(), timer()));
  }

  @Override
  public EdgeModel undervoltage(Device.Undervoltage device) {
    // reciprocal voltage: a dip is a rise, so that pick-up, delay and margin mean what they do
    // elsewhere
    double rated = starter.supply().voltage();
    double sign = edge == Edge.FAST ? 1.0 : edge == Edge.SLOW ? -1.0 : 0.0;
    double pickUp = 1.0 / (device.share() * (1.0 + sign * device.accuracy().pickUp()));
    double seconds = spread(device.seconds(), timer());
    return new NotByCurrent(
        new MeasuringModel(
            currents -> currents.reciprocalVoltage(rated),
            preload -> 0.0,
            before -> new TimerMeter(pickUp, pickUp, seconds),
            Margin.COARSE));
  }

  @Override
  public EdgeModel temperature(Device.Temperature device) {
    double rise =
        switch (edge) {
          case FAST -> device.leastRiseKelvin();
          case MIDDLE -> 0.5 * (device.leastRiseKelvin() + device.greatestRiseKelvin());
          case SLOW -> device.greatestRiseKelvin();
        };
    Optional<String> missing = TemperatureModel.missing(device, starter.resistors());
    return missing.isPresent()
        ? new UnknownModel(missing.get())
        : new TemperatureModel(
            device, edge, rise, spread(device.lagSeconds(), device.accuracy().time()), starter);
  }

  private double timer() {
    return starter.timerSpread();
  }

  private Meter blocked(Meter meter, OptionalDouble aboveAmps, Device.Accuracy accuracy) {
    if (aboveAmps.isEmpty()) {
      return meter;
    }
    // the fast edge blocks late, the slow edge early
    double sign = edge == Edge.FAST ? 1.0 : edge == Edge.SLOW ? -1.0 : 0.0;
    double level = aboveAmps.getAsDouble() * (1.0 + sign * accuracy.pickUp());
    return new BlockedMeter(meter, level, edge != Edge.SLOW);
  }

  private EdgeModel measuring(Device device, DoubleFunction<Meter> meter) {
    return measuring(device, true, meter, Margin.COARSE);
  }

  /** A block above a current lets use fall again with a rising factor on the current. */
  private EdgeModel measuring(
      Device device, OptionalDouble blockedAboveAmps, DoubleFunction<Meter> meter) {
    return measuring(
        device, true, meter, blockedAboveAmps.isPresent() ? Margin.FINE : Margin.COARSE);
  }

  private EdgeModel measuring(
      Device device, boolean memoryKept, DoubleFunction<Meter> meter, double stride) {
    Device.Place place = device.fitting().place();
    return new MeasuringModel(
        currents -> currents.at(place, device.fitting().measuresBy(), edge),
        preload -> {
          if (preload.onlyKeptMemory() && !memoryKept) {
            return 0.0;
          }
          return switch (place) {
            case STATOR -> preload.statorAmps();
            case ROTOR -> preload.ringAmps();
            case BANK -> 0.0;
          };
        },
        meter,
        stride);
  }
}
