package sliprung.machine;

import java.util.List;
import sliprung.starter.Motor.CircuitData;

/**
 * How the circuit was come by, and how well it meets the plate.
 *
 * @param circuit the circuit used
 * @param given true: the user gave it; false: identified from the plate
 * @param residuals each plate figure against the circuit's
 * @param notes what was assumed on the way, in sentences
 */
public record Identification(
    CircuitData circuit, boolean given, List<Residual> residuals, List<String> notes) {

  /**
   * One plate figure against the circuit's.
   *
   * @param quantity such as {@code stator current}
   * @param plate the plate's figure
   * @param computed the circuit's figure
   * @param unit of both
   * @param tolerance relative difference that the plate's own tolerance explains
   */
  public record Residual(
      String quantity, double plate, double computed, String unit, double tolerance) {

    /** Relative difference, computed over plate minus one. */
    public double relative() {
      return computed / plate - 1.0;
    }
  }

  /** Copies the lists. */
  public Identification {
    residuals = List.copyOf(residuals);
    notes = List.copyOf(notes);
  }
}
