package sliprung.rulebook.held;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import sliprung.curve.TripClass;
import sliprung.quantity.Show;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.overload.TheClassFitsStartAndStall;
import sliprung.starter.Device;
import sliprung.starter.ResistorBank;

/**
 * The cheapest mend that clears every held and skipped step in time, with the window of its
 * setting.
 *
 * @param what would be fitted or set
 * @param window in the dial's own unit
 * @param unit of the dial: s, A, K or % of a section's permitted rise
 * @param why the cheaper ones do not do, a sentence each
 */
record HeldStepMend(String what, SettingWindow window, String unit, List<String> why) {
  private static final String SECONDS = "s";
  private static final String AMPS = "A";
  private static final double SHORTEST_SECONDS = 0.1;
  private static final double LONGEST_SECONDS = 1800.0;

  /** Time constant of a sensor clamped to an element, s (common practice). */
  static final double SENSOR_LAG_SECONDS = 20.0;

  HeldStepMend {
    why = List.copyOf(why);
  }

  /** In two or three sentences: the window, what bounds it, why nothing cheaper. */
  String sentence() {
    String ends =
        "Cheapest that clears every held step in time at every corner: "
            + what
            + ", set between "
            + show(roundedUp(window.low()))
            + " ("
            + window.lowBy().map(s -> "the " + name(s) + " must pass").orElse("its least")
            + ") and "
            + show(roundedDown(window.high()))
            + " ("
            + window.highBy().map(s -> name(s) + " must be cleared").orElse("its greatest")
            + "). A rotor that does not turn may ask for less: see locked/step and"
            + " sequence/supervision.";
    return why.isEmpty() ? ends : ends + " " + String.join(" ", why);
  }

  private String show(double setting) {
    return unit.equals(SECONDS)
        ? Show.seconds(setting)
        : unit.equals(AMPS) ? Show.amps(setting) : Show.three(setting) + "\u00a0" + unit;
  }

  /** Three digits that still lie inside. */
  private static double roundedUp(double value) {
    double unit = Math.pow(10.0, Math.floor(Math.log10(value)) - 2.0);
    return Math.ceil(value / unit - 1e-9) * unit;
  }

  private static double roundedDown(double value) {
    double unit = Math.pow(10.0, Math.floor(Math.log10(value)) - 2.0);
    return Math.floor(value / unit + 1e-9) * unit;
  }

  private static String name(ComputedStart start) {
    return start.words();
  }

  /** The cheapest mend; empty where none of those tried does, or nothing is proven to break. */
  static Optional<HeldStepMend> cheapest(Facts facts) {
    HeldStepTrials trials = new HeldStepTrials(facts);
    Optional<String> opens = trials.opens();
    if (opens.isEmpty()) {
      return Optional.empty();
    }
    return new Seeker(facts, trials, opens.get()).seek();
  }

  /** Tries one after the other, cheapest first. */
  private static final class Seeker {
    private final Facts facts;
    private final HeldStepTrials trials;
    private final String opens;
    private final double wanted;
    private final List<String> why = new ArrayList<>();

    Seeker(Facts facts, HeldStepTrials trials, String opens) {
      this.facts = facts;
      this.trials = trials;
      this.opens = opens;
      this.wanted = facts.wanted("trip/start");
    }

    Optional<HeldStepMend> seek() {
      for (Device device : facts.starter().protection()) {
        Optional<HeldStepMend> found = turned(device);
        if (found.isPresent()) {
          return found;
        }
      }
      Device.Fitting stator = fitting(Device.Place.STATOR);
      Optional<HeldStepMend> timer =
          tried(
              "a sequence timer on the last step's auxiliary contact, opening " + opens,
              "A sequence timer",
              SECONDS,
              t -> new Device.SequenceTimer(stator, t, OptionalDouble.empty()),
              SHORTEST_SECONDS,
              LONGEST_SECONDS,
              facts.wanted("sequence/supervision"));
      if (timer.isPresent()) {
        return timer;
      }
      Optional<HeldStepMend> proof =
          tried(
              "a proof of steps (every step contactor's auxiliary contact, one timer that runs anew"
                  + " from each closing), opening "
                  + opens,
              "A proof of steps",
              SECONDS,
              t -> new Device.StepProof(stator, t),
              SHORTEST_SECONDS,
              LONGEST_SECONDS,
              wanted);
      if (proof.isPresent()) {
        return proof;
      }
      Optional<HeldStepMend> overload = bankOverload();
      return overload.isPresent() ? overload : temperature();
    }

    private Device.Fitting fitting(Device.Place place) {
      return new Device.Fitting("candidate", place, Optional.of(opens), Device.Measurement.DIRECT);
    }

    private Optional<HeldStepMend> tried(
        String what,
        String name,
        String unit,
        DoubleFunction<Device> device,
        double from,
        double to,
        double margin) {
      SettingWindow.Search search = trials.window(device, from, to, margin);
      if (search.window().isEmpty()) {
        why.add(whyNot(name, unit, search));
      }
      return search.map(w -> new HeldStepMend(what, w, unit, why));
    }

    private static String whyNot(String name, String unit, SettingWindow.Search search) {
      if (search.uncleared().isPresent()) {
        return name
            + " does not clear it in time whatever its setting: "
            + search.uncleared().get().words()
            + ".";
      }
      return name
          + " would have to be set to "
          + (unit.equals(SECONDS) ? Show.seconds(search.greatest()) : Show.amps(search.greatest()))
          + " or less and then has not the wanted margin in a "
          + search.tripped().orElseThrow().words()
          + ".";
    }

    /** A relay that is fitted, with another pick-up. */
    private Optional<HeldStepMend> turned(Device device) {
      if (device.trips().isEmpty()
          || !facts.bands().unknown(device, sliprung.protection.Edge.FAST).isEmpty()) {
        return Optional.empty();
      }
      Optional<Turned> turned = Turned.of(device);
      if (turned.isEmpty()) {
        return Optional.empty();
      }
      Turned dial = turned.get();
      return tried(
          device.tag() + " as fitted, if its dial reaches",
          device.tag(),
          AMPS,
          dial.at(),
          0.1 * dial.now(),
          10.0 * dial.now(),
          marginOf(device));
    }

    private double marginOf(Device device) {
      return device instanceof Device.Overload overload
          ? Math.max(wanted, classAlone(overload.tripClass().name()))
          : wanted;
    }

    private double classAlone(String name) {
      String digits = name.replaceAll("[^0-9]", "");
      int number = Integer.parseInt(digits);
      String key = number <= 10 ? "10" : number <= 20 ? "20" : "30";
      return facts.practice().figure("class-alone." + key).value();
    }

    private Optional<HeldStepMend> bankOverload() {
      double ring = facts.starter().motor().rotorCurrent().orElse(100.0);
      for (TripClass tripClass : TheClassFitsStartAndStall.classes(facts)) {
        Optional<HeldStepMend> found =
            tried(
                "an overload of class "
                    + tripClass.name()
                    + " in the resistor leads, of a kind that reads down to direct current, opening "
                    + opens,
                "An overload of class " + tripClass.name() + " in the resistor leads",
                AMPS,
                amps ->
                    new Device.Overload(
                        fitting(Device.Place.BANK),
                        tripClass,
                        amps,
                        Device.DialMeans.FULL_LOAD,
                        false,
                        true),
                0.01 * ring,
                10.0 * ring,
                Math.max(wanted, classAlone(tripClass.name())));
        if (found.isPresent()) {
          return found;
        }
      }
      return Optional.empty();
    }

    /** On every element, in kelvins where the sections' rises are given, else in per cent. */
    private Optional<HeldStepMend> temperature() {
      ResistorBank bank = facts.starter().resistors();
      boolean kelvins =
          bank.sections().stream()
              .allMatch(s -> sliprung.protection.SectionElement.limitRiseKelvin(s).isPresent());
      if (!kelvins) {
        return Optional.empty();
      }
      List<Integer> all = IntStream.rangeClosed(1, bank.sections().size()).boxed().toList();
      return tried(
          "a temperature sensor on an element of every section (lag up to "
              + Show.seconds(SENSOR_LAG_SECONDS)
              + "), opening "
              + opens,
          "A temperature sensor on the elements",
          "K",
          rise ->
              new Device.Temperature(
                  fitting(Device.Place.BANK),
                  all,
                  rise,
                  false,
                  new Device.Air(-5.0, 40.0),
                  SENSOR_LAG_SECONDS,
                  new Device.Accuracy(0.05, 0.20)),
          1.0,
          1000.0,
          // heat goes with the square of the current
          wanted * wanted);
    }
  }

  /** A relay's pick-up as a dial. */
  private record Turned(double now, DoubleFunction<Device> at) {
    static Optional<Turned> of(Device device) {
      if (device instanceof Device.Overload d) {
        return Optional.of(
            new Turned(
                d.dialAmps(),
                amps ->
                    new Device.Overload(
                        d.fitting(),
                        d.tripClass(),
                        amps,
                        d.dialMeans(),
                        d.memoryKept(),
                        d.compensated())));
      }
      if (device instanceof Device.InverseTime d) {
        return Optional.of(
            new Turned(
                d.pickUpAmps(),
                amps ->
                    new Device.InverseTime(
                        d.fitting(),
                        d.law(),
                        amps,
                        d.timeMultiplier(),
                        d.ct(),
                        d.accuracy(),
                        d.reset(),
                        d.blockedAboveAmps())));
      }
      if (device instanceof Device.DefiniteTime d) {
        return Optional.of(
            new Turned(
                d.pickUpAmps(),
                amps ->
                    new Device.DefiniteTime(
                        d.fitting(), amps, d.seconds(), d.accuracy(), d.blockedAboveAmps())));
      }
      if (device instanceof Device.Thermal d) {
        return Optional.of(
            new Turned(
                d.baseAmps(),
                amps ->
                    new Device.Thermal(
                        d.fitting(),
                        amps,
                        d.factor(),
                        d.timeConstantSeconds(),
                        d.accuracy(),
                        d.memoryKept())));
      }
      return Optional.empty();
    }
  }
}
