package sliprung.config;

import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import sliprung.curve.CurveLibrary;
import sliprung.curve.InverseLaw;
import sliprung.curve.PointCurve;
import sliprung.curve.TripClass;
import sliprung.quantity.Dimension;
import sliprung.starter.Device;

/** Reads the settings of each kind of device; null where a mistake leaves no device to build. */
final class DeviceSettings {
  private final CurveLibrary library;
  private final PointCurves pointCurves;

  /** Finds the points of a device: path of the curve file and rating to curve. */
  @FunctionalInterface
  interface PointCurves {
    Optional<PointCurve> find(Field path, double ratingAmps);
  }

  DeviceSettings(CurveLibrary library, PointCurves pointCurves) {
    this.library = library;
    this.pointCurves = pointCurves;
  }

  Device fuse(Section section, Device.Fitting fitting) {
    Optional<Device.FuseClass> fuseClass =
        section.choice(
            "class", Words.inOrder("gG", Device.FuseClass.GG, "aM", Device.FuseClass.AM));
    double rating = section.number("rating", Dimension.CURRENT, Range.POSITIVE);
    boolean general = fuseClass.orElse(Device.FuseClass.GG) == Device.FuseClass.GG;
    return new Device.Fuse(
        fitting,
        fuseClass.orElse(Device.FuseClass.GG),
        rating,
        general ? library.ggGates(rating) : Optional.empty(),
        general ? Optional.empty() : Optional.of(library.am()),
        section.optionalNumber("breaking", Dimension.CURRENT, Range.POSITIVE));
  }

  Device overload(Section section, Device.Fitting fitting) {
    Optional<TripClass> tripClass = section.choice("class", byPrinted(library.tripClasses()));
    double dial = section.number("dial", Dimension.CURRENT, Range.POSITIVE);
    Device.DialMeans means =
        section.choiceOr(
            "dial-means",
            Words.inOrder(
                "full-load",
                Device.DialMeans.FULL_LOAD,
                "ultimate-trip",
                Device.DialMeans.ULTIMATE_TRIP),
            Device.DialMeans.FULL_LOAD,
            "full-load");
    boolean kept = memory(section);
    boolean compensated =
        section.choiceOr(
            "ambient", Words.inOrder("compensated", true, "none", false), true, "compensated");
    return tripClass
        .map(c -> (Device) new Device.Overload(fitting, c, dial, means, kept, compensated))
        .orElse(null);
  }

  /** Short names before long ones, so that messages read 5, 10, 10A, 20 … nema-30. */
  private static Map<String, TripClass> byPrinted(Map<String, TripClass> classes) {
    Map<String, TripClass> sorted = new LinkedHashMap<>();
    classes.values().stream()
        .sorted(
            Comparator.comparing((TripClass c) -> c.multiple() < 7.0)
                .thenComparing(c -> c.name().endsWith("E"))
                .thenComparing(TripClass::longestSeconds)
                .thenComparing(TripClass::name))
        .forEach(c -> sorted.put(c.name(), c));
    return sorted;
  }

  private static boolean memory(Section section) {
    return section.choiceOr("memory", Words.inOrder("kept", true, "lost", false), false, "lost");
  }

  private static Device.Accuracy accuracy(Section section) {
    Section accuracy = section.sectionOrDefaults("accuracy", "pick-up", "time");
    return new Device.Accuracy(
        accuracy.numberOr("pick-up", Dimension.SHARE, Range.SPREAD, 0.05, "5 %"),
        accuracy.numberOr("time", Dimension.SHARE, Range.SPREAD, 0.075, "7.5 %"));
  }

  private static OptionalDouble blockedAbove(Section section) {
    return section.optionalNumber("blocked-above", Dimension.CURRENT, Range.POSITIVE);
  }

  Device inverseTime(Section section, Device.Fitting fitting) {
    Optional<InverseLaw> law = section.choice("curve", new TreeMap<>(library.inverse()));
    double pickUp = section.number("pick-up", Dimension.CURRENT, Range.POSITIVE);
    double multiplier = section.number("time-multiplier", Dimension.NUMBER, Range.POSITIVE);
    Optional<Device.CurrentTransformer> ct = section.optional("ct").flatMap(DeviceSettings::ct);
    Device.Accuracy accuracy = accuracy(section);
    Device.Reset reset = reset(section, law);
    OptionalDouble blocked = blockedAbove(section);
    return law.map(
            l ->
                (Device)
                    new Device.InverseTime(
                        fitting, l, pickUp, multiplier, ct, accuracy, reset, blocked))
        .orElse(null);
  }

  private static Device.Reset reset(Section section, Optional<InverseLaw> law) {
    Device.Reset reset =
        section.choiceOr(
            "reset",
            Words.inOrder(
                "held",
                Device.Reset.HELD,
                "instant",
                Device.Reset.INSTANT,
                "standard",
                Device.Reset.STANDARD),
            Device.Reset.BY_EDGE,
            "held or instant by edge");
    if (reset == Device.Reset.STANDARD && law.isPresent() && law.get().resetSeconds().isEmpty()) {
      section
          .optional("reset")
          .get()
          .mistake(
              "expected held or instant for " + law.get().name() + " but found 'standard'",
              "the standard gives reset times for the IEEE curves only");
    }
    return reset;
  }

  private static Optional<Device.CurrentTransformer> ct(Field field) {
    Optional<String> text = field.text("a ratio such as 300/5");
    if (text.isEmpty()) {
      return Optional.empty();
    }
    String[] sides = text.get().split("/", -1);
    if (sides.length == 2
        && sides[0].strip().matches("\\d{1,6}(\\.\\d{1,3})?")
        && sides[1].strip().matches("\\d{1,3}(\\.\\d{1,3})?")) {
      double primary = Double.parseDouble(sides[0].strip());
      double secondary = Double.parseDouble(sides[1].strip());
      if (primary > 0.0 && secondary > 0.0) {
        return Optional.of(new Device.CurrentTransformer(primary, secondary));
      }
    }
    field.mistake(
        "expected a ratio of primary to secondary amperes but found " + field.value().found(),
        "write for example '300/5'");
    return Optional.empty();
  }

  Device instantaneous(Section section, Device.Fitting fitting) {
    return new Device.Instantaneous(
        fitting,
        section.number("pick-up", Dimension.CURRENT, Range.POSITIVE),
        section.choiceOr(
            "measures",
            Words.inOrder("rms", Device.Measures.RMS, "peak", Device.Measures.PEAK),
            Device.Measures.PEAK,
            "peak"),
        section.numberOr("overreach", Dimension.SHARE, Range.NOT_NEGATIVE, 0.10, "10 %"),
        accuracy(section),
        blockedAbove(section));
  }

  Device sequenceTimer(Section section, Device.Fitting fitting) {
    double seconds = section.number("time", Dimension.TIME, Range.POSITIVE);
    Optional<Field> until = section.required("until", "last-step or a speed", "last-step");
    OptionalDouble speed = OptionalDouble.empty();
    if (until.isPresent()) {
      if (until.get().isScalar()) {
        until.get().choice(Map.of("last-step", true));
      } else {
        speed =
            OptionalDouble.of(
                until
                    .get()
                    .section("speed")
                    .number(
                        "speed",
                        Dimension.SHARE,
                        new Range(0.0, false, 1.0, false, "above 0 % and below 100 %")));
      }
    }
    return new Device.SequenceTimer(fitting, seconds, speed);
  }

  Device thermal(Section section, Device.Fitting fitting) {
    return new Device.Thermal(
        fitting,
        section.number("base", Dimension.CURRENT, Range.POSITIVE),
        section.number("factor", Dimension.NUMBER, Range.POSITIVE),
        section.number("time-constant", Dimension.TIME, Range.POSITIVE),
        accuracy(section),
        memory(section));
  }

  Device definiteTime(Section section, Device.Fitting fitting) {
    return new Device.DefiniteTime(
        fitting,
        section.number("pick-up", Dimension.CURRENT, Range.POSITIVE),
        section.number("time", Dimension.TIME, Range.NOT_NEGATIVE),
        accuracy(section),
        blockedAbove(section));
  }

  Device points(Section section, Device.Fitting fitting) {
    double rating = section.number("rating", Dimension.CURRENT, Range.POSITIVE);
    return section
        .required("curve", "the path of a curve file", "curves/my-device.yaml")
        .flatMap(f -> pointCurves.find(f, rating))
        .map(c -> (Device) new Device.Points(fitting, c, rating))
        .orElse(null);
  }

  Device standstill(Section section, Device.Fitting fitting) {
    return new Device.Standstill(fitting, section.number("time", Dimension.TIME, Range.POSITIVE));
  }
}
