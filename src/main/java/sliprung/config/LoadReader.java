package sliprung.config;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.quantity.Quantity;
import sliprung.starter.Load;
import sliprung.starter.TorqueCurve;

/** Reads {@code load}; behind a gear, converts it to the motor shaft. */
final class LoadReader {
  private final Section load;
  private final double ratio;

  private LoadReader(Section load, double ratio) {
    this.load = load;
    this.ratio = ratio;
  }

  static Load read(Section root) {
    Section load =
        root.requiredSection(
            "load",
            "{inertia: 70 kg·m², torque: {constant: 900 N·m}}",
            "inertia",
            "breakaway",
            "torque",
            "gear",
            "running",
            "spread",
            "active",
            "brake");
    double ratio =
        load.optional("gear")
            .map(f -> f.section("ratio").number("ratio", Dimension.NUMBER, Range.POSITIVE))
            .orElse(1.0);
    return new LoadReader(load, ratio).read();
  }

  private Load read() {
    OptionalDouble breakaway =
        load.optionalNumber("breakaway", Dimension.TORQUE, Range.NOT_NEGATIVE);
    if (breakaway.isEmpty()) {
      load.assume("breakaway", "the torque at 0 %");
    }
    double[] spread = SupplyReader.pair(load, "spread", 0.20, "±20 %");
    return new Load(
        load.number("inertia", Dimension.INERTIA, Range.NOT_NEGATIVE) / (ratio * ratio),
        breakaway.isPresent()
            ? OptionalDouble.of(breakaway.getAsDouble() / ratio)
            : OptionalDouble.empty(),
        torque(),
        load.numberOr("running", Dimension.SHARE, Range.NOT_NEGATIVE, 1.0, "100 %"),
        spread[0],
        spread[1],
        load.optional("active").flatMap(Field::yesOrNo).orElse(false),
        load.optionalNumber("brake", Dimension.TIME, Range.NOT_NEGATIVE).orElse(0.0));
  }

  private TorqueCurve torque() {
    Optional<Field> field =
        load.required(
            "torque", "a torque curve", "{0 %: 250 N·m, 100 %: 450 N·m}' or '{constant: 900 N·m}");
    if (field.isEmpty()) {
      return new TorqueCurve.Constant(Double.NaN);
    }
    if (field.get().value() instanceof YamlNode.Mapping m
        && m.entries().stream().noneMatch(LoadReader::isLawName)) {
      return table(field.get());
    }
    Section law = field.get().section("constant", "linear", "square");
    if (law.isSilent()) {
      return new TorqueCurve.Constant(Double.NaN);
    }
    if (law.fields().size() != 1) {
      field
          .get()
          .mistake(
              "expected one of constant, linear, square or a table by speed but found "
                  + law.fields().size()
                  + " of them");
      law.fields().forEach(f -> f.number(Dimension.TORQUE, Range.NOT_NEGATIVE));
      return new TorqueCurve.Constant(Double.NaN);
    }
    double value = law.fields().get(0).number(Dimension.TORQUE, Range.NOT_NEGATIVE) / ratio;
    return law.has("constant")
        ? new TorqueCurve.Constant(value)
        : law.has("linear") ? new TorqueCurve.Linear(value) : new TorqueCurve.Square(value);
  }

  /** A key that begins with a letter is meant as the name of a law, a table's key as a share. */
  private static boolean isLawName(YamlNode.Entry entry) {
    return entry.key() instanceof YamlNode.Scalar s
        && !s.text().isEmpty()
        && Character.isLetter(s.text().codePointAt(0));
  }

  private TorqueCurve table(Field field) {
    Section table = field.section();
    List<double[]> points = new ArrayList<>();
    for (Field point : table.fields()) {
      double share = share(point);
      double torque = point.number(Dimension.TORQUE, Range.NOT_NEGATIVE) / ratio;
      if (!points.isEmpty() && share <= points.get(points.size() - 1)[0]) {
        load.reading()
            .mistake(
                point.keyPlace(),
                point.path(),
                "expected shares of synchronous speed that rise but found '"
                    + point.key()
                    + "' after a share as great");
      }
      points.add(new double[] {share, torque});
    }
    if (points.isEmpty()) {
      field.mistake(
          "expected a torque for at least one speed but found nothing",
          "write for example '{0 %: 250 N·m, 100 %: 450 N·m}'");
    }
    boolean sound = !points.isEmpty();
    for (int i = 0; i < points.size(); i++) {
      sound &= i == 0 ? !Double.isNaN(points.get(0)[0]) : points.get(i)[0] > points.get(i - 1)[0];
    }
    return sound
        ? new TorqueCurve.Table(
            points.stream().mapToDouble(p -> p[0]).toArray(),
            points.stream().mapToDouble(p -> p[1]).toArray())
        : new TorqueCurve.Constant(Double.NaN);
  }

  private double share(Field point) {
    Quantity.Parsed parsed = Quantity.parse(point.key(), Dimension.SHARE);
    if (parsed.mistake().isPresent()) {
      load.reading()
          .mistake(
              point.keyPlace(),
              point.path(),
              "expected a share of synchronous speed but found " + parsed.mistake().get().found(),
              Optional.of("write for example '30 %: 300 N·m'"));
      return Double.NaN;
    }
    double share = parsed.value().getAsDouble();
    if (share < 0.0) {
      load.reading()
          .mistake(
              point.keyPlace(),
              point.path(),
              "expected a share of synchronous speed of 0 % or more but found '"
                  + point.key()
                  + "'");
      return Double.NaN;
    }
    return share;
  }
}
