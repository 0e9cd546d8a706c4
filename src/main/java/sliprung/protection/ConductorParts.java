package sliprung.protection;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.starter.Conductor;

/**
 * Cables: adiabatic withstand {@code ∫I²dt ≤ k²S²} (IEC 60364-4-43, 434.5.2), counted while the
 * current exceeds the ampacity. The form is meant for 5 s; for longer it forgets the heat that
 * leaves and so ends early.
 */
final class ConductorParts {
  private ConductorParts() {}

  /**
   * A cable as a part.
   *
   * @param name part
   * @param path of the cable in the file
   * @param conductor where described
   * @param channel its current
   */
  static Part part(String name, String path, Optional<Conductor> conductor, Channel channel) {
    if (conductor.isEmpty()) {
      return Part.missing(name, path);
    }
    Conductor cable = conductor.get();
    if (cable.ampacity().isEmpty()) {
      return Part.missing(name, path + ".ampacity");
    }
    OptionalDouble k = factor(cable);
    if (k.isEmpty()) {
      return Part.missing(name, path + ".insulation");
    }
    double root = k.getAsDouble() * cable.squareMillimetres();
    double budget = root * root;
    double ampacity = cable.ampacity().getAsDouble();
    return Part.of(
        name,
        channel,
        preload -> new AccumulatingMeter(i -> i > ampacity ? i * i / budget : 0.0, 0.0, ampacity));
  }

  /**
   * The factor k in A·√s/mm², IEC 60364-4-43, table 43A (rubber means 60 °C rubber; above 300 mm²
   * PVC ends at 140 °C).
   *
   * @return empty for an insulation without a figure
   */
  static OptionalDouble factor(Conductor conductor) {
    boolean copper = conductor.metal() == Conductor.Metal.COPPER;
    boolean large = conductor.squareMillimetres() > 300.0;
    return switch (conductor.insulation().trim().toUpperCase(Locale.ROOT)) {
      case "PVC" -> OptionalDouble.of(large ? (copper ? 103.0 : 68.0) : (copper ? 115.0 : 76.0));
      case "XLPE", "EPR" -> OptionalDouble.of(copper ? 143.0 : 94.0);
      case "RUBBER" -> OptionalDouble.of(copper ? 141.0 : 93.0);
      default -> OptionalDouble.empty();
    };
  }
}
