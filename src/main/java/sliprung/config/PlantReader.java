package sliprung.config;

import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Dimension;
import sliprung.starter.Ambient;
import sliprung.starter.Conductor;
import sliprung.starter.Interlocks;
import sliprung.starter.Limits;

/** Reads what the plant adds: conductors, limits, interlocks, ambient, fuse wear. */
final class PlantReader {
  private final Section root;

  PlantReader(Section root) {
    this.root = root;
  }

  /** The cables of one side, {@code stator} or {@code rotor}. */
  static Optional<Conductor> conductor(Section conductors, String side) {
    Optional<Field> field = conductors.optional(side);
    if (field.isEmpty()) {
      return Optional.empty();
    }
    Section cable = field.get().section("area", "metal", "insulation", "ampacity");
    double area = cable.number("area", Dimension.AREA, Range.POSITIVE);
    Conductor.Metal metal =
        cable
            .choice(
                "metal",
                Words.inOrder(
                    "copper", Conductor.Metal.COPPER, "aluminium", Conductor.Metal.ALUMINIUM))
            .orElse(Conductor.Metal.COPPER);
    String insulation = cable.text("insulation", "the insulation", "XLPE").orElse("");
    OptionalDouble ampacity = cable.optionalNumber("ampacity", Dimension.CURRENT, Range.POSITIVE);
    return Optional.of(new Conductor(area, metal, insulation, ampacity));
  }

  Section conductors() {
    return root.sectionOrDefaults("conductors", "stator", "rotor");
  }

  Limits limits() {
    Section limits = root.sectionOrDefaults("limits", "closing-current", "torque-peak");
    Section closing = limits.sectionOrDefaults("closing-current", "stator", "rotor");
    return new Limits(
        closing.optionalNumber("stator", Dimension.CURRENT, Range.POSITIVE),
        closing.optionalNumber("rotor", Dimension.CURRENT, Range.POSITIVE),
        limits.optionalNumber("torque-peak", Dimension.TORQUE, Range.POSITIVE));
  }

  Interlocks interlocks() {
    Section interlocks =
        root.sectionOrDefaults("interlocks", "steps-open-before-line", "every-step-proven");
    return new Interlocks(
        interlocks.optional("steps-open-before-line").flatMap(Field::yesOrNo).orElse(false),
        interlocks.optional("every-step-proven").flatMap(Field::yesOrNo).orElse(false));
  }

  Ambient ambient() {
    Section ambient = root.sectionOrDefaults("ambient", "motor", "panel");
    return new Ambient(
        ambient.numberOr("motor", Dimension.TEMPERATURE, Range.TEMPERATURE, 40.0, "40 °C"),
        ambient.numberOr("panel", Dimension.TEMPERATURE, Range.TEMPERATURE, 40.0, "40 °C"));
  }

  double fuseWear() {
    return root.numberOr("fuse-wear", Dimension.NUMBER, Range.FRACTION, 0.65, "0.65");
  }
}
