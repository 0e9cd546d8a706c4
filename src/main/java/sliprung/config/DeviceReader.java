package sliprung.config;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.stream.Stream;
import sliprung.curve.CurveLibrary;
import sliprung.quantity.Dimension;
import sliprung.starter.Device;

/** Reads one kind of device after the other of {@code protection}. */
final class DeviceReader {
  private static final List<String> MEASURING = List.of("kind", "trips", "place", "measures-by");

  private final Map<String, Kind> kinds = new LinkedHashMap<>();

  /**
   * One kind of device.
   *
   * @param keys it may have
   * @param usual how it measures in the stator line unless the file says
   */
  private record Kind(
      String[] keys, Device.Measurement usual, BiFunction<Section, Device.Fitting, Device> read) {}

  /**
   * A reader.
   *
   * @param sectionCount of the bank; 0 where it could not be read
   */
  DeviceReader(CurveLibrary library, DeviceSettings.PointCurves pointCurves, int sectionCount) {
    SupervisionSettings supervision = new SupervisionSettings(sectionCount);
    DeviceSettings settings = new DeviceSettings(library, pointCurves);
    Device.Measurement direct = Device.Measurement.DIRECT;
    Device.Measurement ct = Device.Measurement.CT;
    kind("fuse", direct, settings::fuse, List.of("kind", "place"), "class", "rating", "breaking");
    kind(
        "overload",
        direct,
        settings::overload,
        MEASURING,
        "class",
        "dial",
        "dial-means",
        "memory",
        "ambient");
    kind(
        "inverse-time",
        ct,
        settings::inverseTime,
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
        settings::instantaneous,
        MEASURING,
        "pick-up",
        "measures",
        "overreach",
        "accuracy",
        "blocked-above");
    kind(
        "sequence-timer",
        direct,
        settings::sequenceTimer,
        List.of("kind", "trips"),
        "time",
        "until");
    kind(
        "thermal",
        ct,
        settings::thermal,
        MEASURING,
        "base",
        "factor",
        "time-constant",
        "accuracy",
        "memory");
    kind(
        "definite-time",
        ct,
        settings::definiteTime,
        MEASURING,
        "pick-up",
        "time",
        "accuracy",
        "blocked-above");
    kind("points", ct, settings::points, MEASURING, "curve", "rating");
    kind("standstill", direct, settings::standstill, List.of("kind", "trips"), "time");
    kind("step-proof", direct, supervision::stepProof, List.of("kind", "trips"), "time");
    kind(
        "undervoltage",
        direct,
        supervision::undervoltage,
        List.of("kind", "trips"),
        "below",
        "time",
        "accuracy");
    kind(
        "temperature",
        direct,
        supervision::temperature,
        List.of("kind", "trips", "place"),
        "sections",
        "limit",
        "rise",
        "air",
        "lag",
        "accuracy");
  }

  private static final Map<String, List<DialReader.Dial>> DIALS =
      Map.ofEntries(
          dials("overload", new DialReader.Dial("dial", Dimension.CURRENT)),
          dials(
              "inverse-time",
              new DialReader.Dial("pick-up", Dimension.CURRENT),
              new DialReader.Dial("time-multiplier", Dimension.NUMBER)),
          dials("instantaneous", new DialReader.Dial("pick-up", Dimension.CURRENT)),
          dials("sequence-timer", new DialReader.Dial("time", Dimension.TIME)),
          dials(
              "thermal",
              new DialReader.Dial("base", Dimension.CURRENT),
              new DialReader.Dial("time-constant", Dimension.TIME)),
          dials(
              "definite-time",
              new DialReader.Dial("pick-up", Dimension.CURRENT),
              new DialReader.Dial("time", Dimension.TIME)),
          dials("standstill", new DialReader.Dial("time", Dimension.TIME)),
          dials("step-proof", new DialReader.Dial("time", Dimension.TIME)),
          dials("undervoltage", new DialReader.Dial("time", Dimension.TIME)),
          dials(
              "temperature",
              new DialReader.Dial("limit", Dimension.TEMPERATURE),
              new DialReader.Dial("rise", Dimension.TEMPERATURE_RISE)));

  private static Map.Entry<String, List<DialReader.Dial>> dials(
      String kind, DialReader.Dial... dials) {
    return Map.entry(kind, List.of(dials));
  }

  private void kind(
      String name,
      Device.Measurement usual,
      BiFunction<Section, Device.Fitting, Device> read,
      List<String> common,
      String... own) {
    Stream<String> dials =
        DIALS.containsKey(name) ? Arrays.stream(DialReader.KEYS) : Stream.empty();
    String[] keys =
        Stream.concat(Stream.concat(common.stream(), Arrays.stream(own)), dials)
            .toArray(String[]::new);
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
    Device read = kind.read().apply(section, fitting(field.key(), section, kind, switchgear));
    DialReader.read(
        section, "protection." + Wording.clip(field.key()), DIALS.getOrDefault(name, List.of()));
    return Optional.ofNullable(read);
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
    if (keys.contains("lag")) {
      // a sensor on elements sits in the bank and nowhere else
      section.optional("place").ifPresent(f -> f.choice(Map.of("bank", Device.Place.BANK)));
      place = Device.Place.BANK;
    } else if (keys.contains("place")) {
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
}
