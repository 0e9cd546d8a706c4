package sliprung.starter;

import java.util.OptionalDouble;

/**
 * A cable.
 *
 * @param squareMillimetres conductor area, mm²
 * @param metal conductor
 * @param insulation as written, such as {@code XLPE}
 * @param ampacity what it carries for good, A
 */
public record Conductor(
    double squareMillimetres, Metal metal, String insulation, OptionalDouble ampacity) {

  /** Conductor metal. */
  public enum Metal {
    COPPER,
    ALUMINIUM
  }
}
