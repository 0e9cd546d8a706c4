package sliprung.config;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.BiFunction;
import java.util.stream.Stream;
import sliprung.curve.CurveLibrary;
import sliprung.curve.InverseLaw;
import sliprung.curve.PointCurve;
import sliprung.curve.TripClass;
import sliprung.quantity.Dimension;
import sliprung.starter.Device;

/** Reads one kind of device after the other of {@code protection}. */
final class DeviceReader {
  private static final List<String> MEASURING = List.of("kind", "trips", "place", "measures-by");

  private final CurveLibrary library;
  private final PointCurves pointCurves;
  private final Map<String, Kind> kinds = new LinkedHashMap<>();

  /**
   * One kind of device.
   *
   * @param keys it may have
   * @param usual how it measures in the stator line unless the file says
   */
  private record Kind(
      String[] keys, Device.Measurement usual, BiFunction<Section, Device.Fitting, Device> read) {}

  /** Finds the points of a device: path of the curve file and rating to curve. */
  @FunctionalInterface
  interface PointCurves {
    Optional<PointCurve> find(Field path, double ratingAmps);
  }

  DeviceReader(CurveLibrary library, PointCurves pointCurves) {
    this.library = library;
    this.pointCurves = pointCurves;
    Device.Measurement direct = Device.Measurement.DIRECT;
    Device.Measurement ct = Device.Measurement.CT;
    kind("fuse", direct, this::fuse, List.of("kind", "place"), "class", "rating");
    kind(
        "overload",
        direct,
        this::overload,
        MEASURING,
        "class",
        "dial",
        "dial-means",
        "memory",
        "ambient");
    kind(
        "inverse-time",
        ct,
        this::inverseTime,
        MEASURING,
        "curve",
        "pick-up",
        "time-multiplier",
        "ct",
        "accuracy",
        "reset",
        "blocked-above");
    kind(
        "instantaneous",
        ct,
        this::instantaneous,
        MEASURING,
        "pick-up",
        "measures",
        "overreach",
        "accuracy",
        "blocked-above");
    kind("sequence-timer", direct, this::sequenceTimer, List.of("kind", "trips"), "time", "until");
    kind(
        "thermal",
        ct,
        this::thermal,
        MEASURING,
        "base",
        "factor",
        "time-constant",
        "accuracy",
        "memory");
    kind(
        "definite-time",
        ct,
        this::definiteTime,
        MEASURING,
        "pick-up",
        "time",
        "accuracy",
        "blocked-above");
    kind("points", ct, this::points, MEASURING, "curve", "rating");
    kind("standstill", direct, this::standstill, List.of("kind", "trips"), "time");
  }

  private void kind(
      String name,
      Device.Measurement usual,
      BiFunction<Section, Device.Fitting, Device> read,
      List<String> common,
      String... own) {
    String[] keys = Stream.concat(common.stream(), Arrays.stream(own)).toArray(String[]::new);
    kinds.put(name, new Kind(keys, usual, read));
  }

  /** All devices that could be read, in the file's order. */
  List<Device> read(Section root, Switchgear switchgear) {
    Optional<Field> field =
        root.required(
            "protection",
            "a mapping of tags to devices",
            "{F2: {kind: overload, class: 10, dial: 208 A, trips: K1}}");
    List<Device> devices = new ArrayList<>();
    if (field.isPresent()) {
      for (Field device : field.get().section().fields()) {
        device(device, switchgear).ifPresent(devices::add);
      }
    }
    return devices;
  }

  private Optional<Device> device(Field field, Switchgear switchgear) {
    if (!(field.value() instanceof YamlNode.Mapping mapping)) {
      field.section("kind");
      return Optional.empty();
    }
    Optional<YamlNode> kindNode =
        mapping.entries().stream()
            .filter(e -> e.key() instanceof YamlNode.Scalar s && s.text().equals("kind"))
            .map(YamlNode.Entry::value)
            .findFirst();
    String name =
        kindNode
            .filter(YamlNode.Scalar.class::isInstance)
            .map(n -> ((YamlNode.Scalar) n).text().strip())
            .orElse("");
    Kind kind = kinds.get(name);
    if (kind == null) {
      // Without its kind nobody can say which keys a device has: only the kind is a mistake.
      Section unknown = field.section();
      unknown.choice("kind", kinds);
      return Optional.empty();
    }
    Section section = field.section(kind.keys());
    return Optional.ofNullable(
        kind.read().apply(section, fitting(field.key(), section, kind, switchgear)));
  }

  private static Device.Fitting fitting(
      String tag, Section section, Kind kind, Switchgear switchgear) {
    Optional<Field> trips = section.optional("trips");
    Optional<String> opened = trips.flatMap(f -> f.text("the tag of a contactor or breaker"));
    if (opened.isPresent() && switchgear.readable() && !switchgear.has(opened.get())) {
      trips
          .get()
          .mistake(
              "expected the tag of a contactor or breaker but found '"
                  + Wording.clip(opened.get())
                  + "', which nothing has",
              "described are " + switchgear.tags());
    }
    List<String> keys = List.of(kind.keys());
    Device.Place place = Device.Place.STATOR;
    if (keys.contains("place")) {
      place =
          section.choiceOr(
              "place",
              Words.inOrder(
                  "stator",
                  Device.Place.STATOR,
                  "rotor",
                  Device.Place.ROTOR,
                  "bank",
                  Device.Place.BANK),
              Device.Place.STATOR,
              "stator");
    }
    Device.Measurement measuresBy = kind.usual();
    if (keys.contains("measures-by")) {
      Device.Measurement usual =
          place == Device.Place.STATOR ? kind.usual() : Device.Measurement.CT;
      measuresBy =
          section.choiceOr(
              "measures-by",
              Words.inOrder(
                  "direct",
                  Device.Measurement.DIRECT,
                  "ct",
                  Device.Measurement.CT,
                  "dc-capable",
                  Device.Measurement.DC_CAPABLE),
              usual,
              usual == Device.Measurement.CT ? "ct" : "direct");
    }
    return new Device.Fitting(tag, place, opened, measuresBy);
  }

  private Device fuse(Section section, Device.Fitting fitting) {
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
        general ? Optional.empty() : Optional.of(library.am()));
  }

  private Device overload(Section section, Device.Fitting fitting) {
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
            java.util.Comparator.comparing((TripClass c) -> c.multiple() < 7.0)
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

  private Device inverseTime(Section section, Device.Fitting fitting) {
    Optional<InverseLaw> law = section.choice("curve", new TreeMap<>(library.inverse()));
    double pickUp = section.number("pick-up", Dimension.CURRENT, Range.POSITIVE);
    double multiplier = section.number("time-multiplier", Dimension.NUMBER, Range.POSITIVE);
    Optional<Device.CurrentTransformer> ct = section.optional("ct").flatMap(DeviceReader::ct);
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

  private Device instantaneous(Section section, Device.Fitting fitting) {
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

  private Device sequenceTimer(Section section, Device.Fitting fitting) {
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

  private Device thermal(Section section, Device.Fitting fitting) {
    return new Device.Thermal(
        fitting,
        section.number("base", Dimension.CURRENT, Range.POSITIVE),
        section.number("factor", Dimension.NUMBER, Range.POSITIVE),
        section.number("time-constant", Dimension.TIME, Range.POSITIVE),
        accuracy(section),
        memory(section));
  }

  private Device definiteTime(Section section, Device.Fitting fitting) {
    return new Device.DefiniteTime(
        fitting,
        section.number("pick-up", Dimension.CURRENT, Range.POSITIVE),
        section.number("time", Dimension.TIME, Range.NOT_NEGATIVE),
        accuracy(section),
        blockedAbove(section));
  }

  private Device points(Section section, Device.Fitting fitting) {
    double rating = section.number("rating", Dimension.CURRENT, Range.POSITIVE);
    return section
        .required("curve", "the path of a curve file", "curves/my-device.yaml")
        .flatMap(f -> pointCurves.find(f, rating))
        .map(c -> (Device) new Device.Points(fitting, c, rating))
        .orElse(null);
  }

  private Device standstill(Section section, Device.Fitting fitting) {
    return new Device.Standstill(fitting, section.number("time", Dimension.TIME, Range.POSITIVE));
  }
}
