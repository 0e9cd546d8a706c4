package sliprung.rulebook;

import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.starter.Motor;

/**
 * The full-load current by which NFPA 70 sizes conductors and short-circuit devices: table 430.250,
 * or the plate where the table has no such motor or the motor is built for a low speed (430.6).
 *
 * @param amps full-load current
 * @param words where it comes from
 */
public record MotorTable(double amps, String words) {
  private static final double HORSEPOWER_WATTS = 745.7;
  private static final double SAME_POWER = 0.01;

  /** Motor voltages of the table with the system voltages they stand for. */
  private static final List<double[]> VOLTAGES =
      List.of(
          new double[] {200, 208},
          new double[] {230, 240},
          new double[] {460, 480},
          new double[] {575, 600},
          new double[] {2300, 2400});

  /** Of the motor of these facts. */
  public static MotorTable of(Facts facts) {
    Motor motor = facts.starter().motor();
    double synchronous = 60.0 * motor.frequency() / motor.polePairs();
    double slow = facts.practice().figure("nec.low-speed").value();
    if (synchronous < slow) {
      return new MotorTable(
          motor.current(), "the plate, for a motor of less than " + Show.three(slow) + " rpm");
    }
    Optional<Practice.Figure> figure =
        find(facts.practice(), motor.voltage(), motor.powerWatts() / HORSEPOWER_WATTS);
    return figure
        .map(f -> new MotorTable(f.value(), "table 430.250"))
        .orElseGet(
            () -> new MotorTable(motor.current(), "the plate; table 430.250 has no such motor"));
  }

  /** The table's figure, if it has that motor. */
  static Optional<Practice.Figure> find(Practice practice, double volts, double horsepower) {
    for (double[] column : VOLTAGES) {
      if (volts == column[0] || volts == column[1]) {
        String prefix = "flc." + Math.round(column[0]) + ".";
        return practice.figures().entrySet().stream()
            .filter(e -> e.getKey().startsWith(prefix))
            .filter(
                e -> {
                  double row = Double.parseDouble(e.getKey().substring(prefix.length()));
                  return Math.abs(row - horsepower) <= SAME_POWER * row;
                })
            .map(java.util.Map.Entry::getValue)
            .findFirst();
      }
    }
    return Optional.empty();
  }
}
