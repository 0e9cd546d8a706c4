package sliprung.starter;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.curve.AmGates;
import sliprung.curve.FuseGates;
import sliprung.curve.InverseLaw;
import sliprung.curve.PointCurve;
import sliprung.curve.TripClass;

/** A protective device and its settings. Currents are RMS primary amperes. */
public sealed interface Device {

  /** What every device has. */
  Fitting fitting();

  /** Calls the case of this kind of device. */
  <R> R fold(Cases<R> cases);

  /** Tag on the drawing. */
  default String tag() {
    return fitting().tag();
  }

  /** Whether its operating time is a matter of a current: neither a timer nor another quantity. */
  default boolean measuresCurrent() {
    return true;
  }

  /** Tag of what it opens; empty: it opens the circuit itself (a fuse) or nothing is said. */
  default Optional<String> trips() {
    return fitting().trips();
  }

  /**
   * What every device has.
   *
   * @param tag on the drawing
   * @param place whose current it measures
   * @param trips tag of the contactor or breaker it opens
   * @param measuresBy how it measures; a current transformer reads nothing below about 5 Hz
   */
  record Fitting(String tag, Place place, Optional<String> trips, Measurement measuresBy) {}

  /** Whose current a device measures. */
  enum Place {
    STATOR,
    ROTOR,
    BANK
  }

  /** How a device measures. */
  enum Measurement {
    DIRECT,
    CT,
    DC_CAPABLE
  }

  /** What an overload dial means. */
  enum DialMeans {
    FULL_LOAD,
    ULTIMATE_TRIP
  }

  /** What an inverse-time relay forgets below its pick-up. */
  enum Reset {
    /** Unknown: the fast edge holds, the slow edge forgets at once. */
    BY_EDGE,
    HELD,
    INSTANT,
    STANDARD
  }

  /** What an instantaneous element measures. */
  enum Measures {
    RMS,
    PEAK
  }

  /** Fuse-link class. */
  enum FuseClass {
    GG,
    AM
  }

  /**
   * A current transformer.
   *
   * @param primary A
   * @param secondary A
   */
  record CurrentTransformer(double primary, double secondary) {}

  /**
   * Declared accuracy.
   *
   * @param pickUp per unit
   * @param time per unit
   */
  record Accuracy(double pickUp, double time) {}

  /**
   * A fuse.
   *
   * @param fuseClass gG or aM
   * @param ratingAmps rated current
   * @param gates gG gates of that rating; empty for aM, or where the standard has no such rating
   * @param amGates aM gates; empty for gG
   * @param breakingAmps declared breaking capacity, RMS
   */
  record Fuse(
      Fitting fitting,
      FuseClass fuseClass,
      double ratingAmps,
      Optional<FuseGates> gates,
      Optional<AmGates> amGates,
      OptionalDouble breakingAmps)
      implements Device {

    /** A.c. volts up to which gates and ratings of IEC 60269 hold (its scope, from memory). */
    public static final double GREATEST_VOLTS = 1000.0;

    /** Whether the gates say anything of a fuse at that line voltage. */
    public static boolean gatesHoldAt(double volts) {
      return volts <= GREATEST_VOLTS;
    }

    /** A fuse without a declared breaking capacity. */
    public Fuse(
        Fitting fitting,
        FuseClass fuseClass,
        double ratingAmps,
        Optional<FuseGates> gates,
        Optional<AmGates> amGates) {
      this(fitting, fuseClass, ratingAmps, gates, amGates, OptionalDouble.empty());
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.fuse(this);
    }
  }

  /**
   * A thermal or electronic overload relay of a trip class.
   *
   * @param tripClass set of relays
   * @param dialAmps what the dial is set to
   * @param dialMeans full-load current or ultimate trip
   * @param memoryKept keeps its thermal state through loss of supply and between starts
   * @param compensated ambient-compensated
   */
  record Overload(
      Fitting fitting,
      TripClass tripClass,
      double dialAmps,
      DialMeans dialMeans,
      boolean memoryKept,
      boolean compensated)
      implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.overload(this);
    }
  }

  /**
   * An inverse-time overcurrent relay.
   *
   * @param law its curve
   * @param pickUpAmps primary
   * @param timeMultiplier TMS or time dial
   * @param ct current transformer where given
   * @param accuracy declared, or the customary one
   * @param reset what it forgets
   * @param blockedAboveAmps current above which it does not trip
   */
  record InverseTime(
      Fitting fitting,
      InverseLaw law,
      double pickUpAmps,
      double timeMultiplier,
      Optional<CurrentTransformer> ct,
      Accuracy accuracy,
      Reset reset,
      OptionalDouble blockedAboveAmps)
      implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.inverseTime(this);
    }
  }

  /**
   * An instantaneous element.
   *
   * @param pickUpAmps primary, RMS of a sine wave also where it measures peaks
   * @param measures RMS or peak
   * @param overreach per unit
   * @param blockedAboveAmps current above which it does not trip
   */
  record Instantaneous(
      Fitting fitting,
      double pickUpAmps,
      Measures measures,
      double overreach,
      Accuracy accuracy,
      OptionalDouble blockedAboveAmps)
      implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.instantaneous(this);
    }
  }

  /**
   * A sequence timer: trips when its stop event has not come in time.
   *
   * @param seconds from line closing
   * @param untilSpeedShare stop event: that share of synchronous speed; empty: the last step has
   *     closed
   */
  record SequenceTimer(Fitting fitting, double seconds, OptionalDouble untilSpeedShare)
      implements Device {
    @Override
    public boolean measuresCurrent() {
      return false;
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.sequenceTimer(this);
    }
  }

  /**
   * A thermal relay by IEC 60255-149: one time constant.
   *
   * @param baseAmps basic current I_B
   * @param factor k
   * @param timeConstantSeconds τ
   */
  record Thermal(
      Fitting fitting,
      double baseAmps,
      double factor,
      double timeConstantSeconds,
      Accuracy accuracy,
      boolean memoryKept)
      implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.thermal(this);
    }
  }

  /**
   * A definite-time overcurrent relay.
   *
   * @param pickUpAmps primary
   * @param seconds delay
   */
  record DefiniteTime(
      Fitting fitting,
      double pickUpAmps,
      double seconds,
      Accuracy accuracy,
      OptionalDouble blockedAboveAmps)
      implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.definiteTime(this);
    }
  }

  /**
   * A device with its own curve as points.
   *
   * @param curve both edges in amperes and seconds, already scaled to the rating
   * @param ratingAmps rating
   */
  record Points(Fitting fitting, PointCurve curve, double ratingAmps) implements Device {
    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.points(this);
    }
  }

  /**
   * A rotation sensor: trips when the rotor stands too long with the line closed.
   *
   * @param seconds permitted at rest
   */
  record Standstill(Fitting fitting, double seconds) implements Device {
    @Override
    public boolean measuresCurrent() {
      return false;
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.standstill(this);
    }
  }

  /**
   * Proof of every step: trips when the next step contactor has not reported closed in time. The
   * time runs anew from each closing.
   *
   * @param seconds from the closing before, the line contactor's for the first step
   */
  record StepProof(Fitting fitting, double seconds) implements Device {
    @Override
    public boolean measuresCurrent() {
      return false;
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.stepProof(this);
    }
  }

  /**
   * An undervoltage relay: trips when the voltage at the starter stays below a share of rated.
   *
   * @param share of the rated supply voltage, per unit
   * @param seconds delay
   */
  record Undervoltage(Fitting fitting, double share, double seconds, Accuracy accuracy)
      implements Device {
    @Override
    public boolean measuresCurrent() {
      return false;
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.undervoltage(this);
    }
  }

  /**
   * Air around a bank.
   *
   * @param coldestCelsius °C
   * @param hottestCelsius °C, no less
   */
  record Air(double coldestCelsius, double hottestCelsius) {}

  /**
   * A temperature sensor on resistor elements, one on each section that it watches: it follows the
   * element with a lag.
   *
   * @param sections numbers from 1, rising; never empty
   * @param limit where it trips: a rise over the air in K, or a temperature in °C
   * @param absolute whether the limit is a temperature
   * @param air what a temperature is above; not used with a rise
   * @param lagSeconds time constant of the sensor
   * @param accuracy of the limit (pick-up) and of the lag (time)
   */
  record Temperature(
      Fitting fitting,
      List<Integer> sections,
      double limit,
      boolean absolute,
      Air air,
      double lagSeconds,
      Accuracy accuracy)
      implements Device {

    /** Copies the list. */
    public Temperature {
      sections = List.copyOf(sections);
    }

    /** Least rise of an element over its air in K at which it may trip. */
    public double leastRiseKelvin() {
      double low = limit * (1.0 - accuracy.pickUp());
      return absolute ? low - air.hottestCelsius() : low;
    }

    /** Greatest rise of an element over its air in K up to which it may stay. */
    public double greatestRiseKelvin() {
      double high = limit * (1.0 + accuracy.pickUp());
      return absolute ? high - air.coldestCelsius() : high;
    }

    @Override
    public boolean measuresCurrent() {
      return false;
    }

    @Override
    public <R> R fold(Cases<R> cases) {
      return cases.temperature(this);
    }
  }

  /** One function for each kind of device: the compiler finds a missed kind. */
  interface Cases<R> {
    R fuse(Fuse device);

    R overload(Overload device);

    R inverseTime(InverseTime device);

    R instantaneous(Instantaneous device);

    R sequenceTimer(SequenceTimer device);

    R thermal(Thermal device);

    R definiteTime(DefiniteTime device);

    R points(Points device);

    R standstill(Standstill device);

    R stepProof(StepProof device);

    R undervoltage(Undervoltage device);

    R temperature(Temperature device);
  }
}
