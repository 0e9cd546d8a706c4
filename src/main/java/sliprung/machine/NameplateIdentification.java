package sliprung.machine;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import sliprung.machine.Identification.Residual;
import sliprung.numeric.LeastSquares;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;

/**
 * The equivalent circuit behind a nameplate.
 *
 * <p>Six unknowns (R1, X1, Xm, R2, X2, ratio), positive and of very different size, so their
 * logarithms are fitted, by weighted least squares on the logarithms of computed over plate: rated
 * current, power factor, torque at rated speed, standstill rotor voltage, rotor current, breakdown
 * torque, locked-rotor current. Weak expectations tie what the plate leaves open: X1 ≈ X2, R1 from
 * the losses, and wide ones keep every unknown finite. Several starts, always the same; the best
 * end counts. A plate that no circuit explains gets the nearest circuit and residuals beyond
 * tolerance, never a refusal; one that only an unusual circuit explains gets a note.
 */
public final class NameplateIdentification {
  /**
   * Usual breakdown torque of slip-ring motors, over rated, where the plate is silent: 2.25 (least
   * of NEMA MG 1-12.41 for wound rotors of 20 hp and more, from memory) to 3.0 (judged).
   */
  static final double BREAKDOWN_LOW = 2.25;

  static final double BREAKDOWN_HIGH = 3.0;

  private NameplateIdentification() {}

  /**
   * Identifies the circuit, or compares the given one with the plate.
   *
   * @param motor every figure present is positive and finite
   * @return one identification; two where neither breakdown torque nor locked-rotor current is
   *     known: for the low and the high end of the usual breakdown torque, in this order, both to
   *     be run
   */
  public static List<Identification> identify(Motor motor) {
    if (motor.circuit().isPresent()) {
      return List.of(compared(motor, motor.circuit().get()));
    }
    List<String> notes = notes(motor);
    if (motor.breakdownTorque().isPresent()) {
      return List.of(fitted(motor, motor.breakdownTorque(), notes));
    }
    if (motor.lockedCurrent().isPresent()) {
      notes.add(
          "Breakdown torque is not given: the leakage reactances follow from the locked-rotor"
              + " current.");
      return List.of(fitted(motor, OptionalDouble.empty(), notes));
    }
    List<Identification> ends = new ArrayList<>();
    for (double end : new double[] {BREAKDOWN_LOW, BREAKDOWN_HIGH}) {
      List<String> withEnd = new ArrayList<>(notes);
      withEnd.add(
          String.format(
              Locale.ROOT,
              "Breakdown torque is not given: both ends of its usual range, %.2f and %.2f times"
                  + " rated, are run; this circuit is for %.2f.",
              BREAKDOWN_LOW,
              BREAKDOWN_HIGH,
              end));
      ends.add(fitted(motor, OptionalDouble.of(end), withEnd));
    }
    return List.copyOf(ends);
  }

  private static Identification compared(Motor motor, CircuitData circuit) {
    Nameplate plate = new Nameplate(motor, motor.breakdownTorque());
    List<String> notes = new ArrayList<>();
    notes.add("The circuit is given; the plate is only compared with it.");
    notes.addAll(Usual.departures(motor, circuit));
    return new Identification(circuit, true, plate.residuals(circuit), notes);
  }

  private static List<String> notes(Motor motor) {
    List<String> notes = new ArrayList<>();
    notes.add(
        String.format(
            Locale.ROOT,
            "Air-gap torque is taken as %.3f times shaft torque at rated load.",
            Nameplate.AIR_GAP_OVER_SHAFT));
    if (motor.powerFactor().isEmpty() && motor.efficiency().isPresent()) {
      notes.add("Power factor is not given: it follows from power, efficiency and current.");
    } else if (motor.powerFactor().isEmpty()) {
      notes.add(
          "Neither power factor nor efficiency is given: the magnetizing current is taken as about"
              + " 0.4 times rated.");
    }
    if (motor.efficiency().isEmpty()) {
      notes.add("Efficiency is not given: the stator resistance is taken near the rotor's.");
    }
    if (motor.rotorVoltage().isEmpty() && motor.rotorCurrent().isEmpty()) {
      notes.add(
          "Neither rotor voltage nor rotor current is given: the ratio is taken as 1, so ring"
              + " quantities mean nothing.");
    }
    return notes;
  }

  private static Identification fitted(Motor motor, OptionalDouble breakdown, List<String> notes) {
    Nameplate plate = new Nameplate(motor, breakdown);
    Expectation expectation = Expectation.of(plate, breakdown);
    LeastSquares.Solution best =
        expectation.starts().stream()
            .map(start -> LeastSquares.minimize(p -> deviations(plate, expectation, p), start))
            .min(Comparator.comparingDouble(LeastSquares.Solution::cost))
            .orElseThrow();
    CircuitData circuit = Expectation.circuit(best.point());
    List<String> all = new ArrayList<>(notes);
    all.addAll(Usual.departures(motor, circuit));
    return new Identification(circuit, false, plate.residuals(circuit), all);
  }

  /** What is squared and summed: plate figures at their weight, then the expectations. */
  private static double[] deviations(Nameplate plate, Expectation expectation, double[] point) {
    List<Double> all = new ArrayList<>();
    CircuitData circuit = Expectation.circuit(point);
    for (Residual r : plate.residuals(circuit)) {
      double spread = spread(r.quantity());
      if (spread < Double.POSITIVE_INFINITY) {
        all.add(Math.log(Math.max(1e-300, r.computed()) / r.plate()) / spread);
      }
    }
    if (plate.motor().powerFactor().isEmpty()) {
      plate
          .powerFactor()
          .ifPresent(
              pf -> {
                double computed =
                    plate.machine(circuit).at(plate.source(), 0.0, plate.slip()).powerFactor();
                all.add(Math.log(Math.max(1e-300, computed) / pf) / spread("power factor"));
              });
    }
    expectation.deviations(point).forEach(all::add);
    return all.stream().mapToDouble(Double::doubleValue).toArray();
  }

  /**
   * Relative spread at which a figure is weighed. Efficiency is not fitted: the circuit has no core
   * loss; the losses enter by the expected R1.
   */
  private static double spread(String quantity) {
    return switch (quantity) {
      case "rotor current" -> 0.03;
      case "breakdown torque" -> 0.02;
      case "locked-rotor current" -> 0.05;
      case "efficiency" -> Double.POSITIVE_INFINITY;
      default -> 0.01;
    };
  }
}
