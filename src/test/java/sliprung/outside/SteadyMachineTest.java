package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import sliprung.machine.Machine;
import sliprung.machine.OperatingPoint;
import sliprung.machine.Source;
import sliprung.numeric.Root;
import sliprung.outside.OutsideTable.Row;
import sliprung.starter.Motor.CircuitData;

/** Worked examples of textbooks and published simulations in the steady state. */
@Tag("outside")
class SteadyMachineTest {

  @TestFactory
  Stream<DynamicTest> should_reproduce_the_printed_figure() {
    return OutsideTable.read("machine-steady")
        .tests(
            row ->
                assertThat(new Case(row).quantity())
                    .as(row.text("source"))
                    .isCloseTo(row.number("expected"), within(tolerance(row))));
  }

  private static double tolerance(Row row) {
    String text = row.text("tolerance");
    if (text.equals("digits")) {
      return row.halfLastDigit("expected");
    }
    double percent = Double.parseDouble(text.replace(" %", ""));
    return percent / 100.0 * Math.abs(row.number("expected"));
  }

  /** One row: a machine, an external resistance, a slip. */
  private static final class Case {
    private final Row row;
    private final Machine machine;
    private final Source source;
    private final double hertz;
    private final double external;

    Case(Row row) {
      this.row = row;
      this.hertz = row.number("hertz");
      this.machine =
          new Machine(
              new CircuitData(
                  row.number("r1"),
                  row.number("x1"),
                  row.number("xm"),
                  row.number("r2"),
                  row.number("x2"),
                  row.number("ratio")),
              hertz,
              (int) row.number("poles") / 2);
      this.source = new Source(Math.sqrt(3.0) * row.number("phase_volts"), 0.0);
      this.external = row.number("external");
    }

    double quantity() {
      return switch (row.text("quantity")) {
        case "statorAmps" -> point().statorAmps();
        case "ringAmps" -> point().ringAmps();
        case "torque" -> point().torque();
        case "powerFactor" -> point().powerFactor();
        case "mechanicalWatts" -> mechanicalWatts();
        case "efficiency" -> mechanicalWatts() / point().inputWatts();
        // reference: friction and windage, W
        case "shaftWatts" -> shaftWatts();
        case "shaftTorque" -> shaftWatts() / (machine.synchronousSpeed() * (1.0 - slip()));
        case "shaftEfficiency" -> shaftWatts() / point().inputWatts();
        case "rotorWatts" ->
            3.0 * Math.pow(point().ringAmps() / ratio(), 2) * machine.circuit().r2();
        case "breakdownTorque" -> machine.breakdownTorque(source);
        case "breakdownSlip" -> machine.breakdownSlip(source, external);
        case "breakdownRpm" -> rpm(machine.breakdownSlip(source, external));
        case "standstillOhms" -> machine.externalOhmsForGreatestStandstillTorque(source);
        case "rotorHertz" -> machine.slip(machine.synchronousSpeed() * (1.0 - slip())) * hertz;
        case "rpm" -> rpm(slip());
        // reference: slip with the rings shorted
        case "currentOverReference" -> point().statorAmps() / reference().statorAmps();
        case "torqueOverReference" -> Math.abs(point().torque() / reference().torque());
        case "breakdownOverReference" ->
            machine.breakdownTorque(source)
                / machine.torque(source, external, row.number("reference"));
        // reference: load torque, N·m
        case "rpmAtLoad" -> rpmAt(row.number("reference"));
        // slip: with the rings shorted, which gives the load torque
        case "rpmSameTorque" -> rpmAt(shortedTorque());
        case "rpmHalfTorque" -> rpmAt(0.5 * shortedTorque());
        case "rpmSquareLaw" -> rpmOfSquareLaw();
        default -> throw new IllegalStateException(row.toString());
      };
    }

    private double ratio() {
      return machine.circuit().ratio();
    }

    private double slip() {
      return row.number("slip");
    }

    private OperatingPoint point() {
      return machine.at(source, external, slip());
    }

    private OperatingPoint reference() {
      return machine.at(source, 0.0, row.number("reference"));
    }

    private double shortedTorque() {
      return machine.torque(source, 0.0, slip());
    }

    private double mechanicalWatts() {
      return point().torque() * machine.synchronousSpeed() * (1.0 - slip());
    }

    private double shaftWatts() {
      return mechanicalWatts() - row.number("reference");
    }

    private double rpm(double slip) {
      return machine.synchronousSpeed() * (1.0 - slip) * 30.0 / Math.PI;
    }

    private double rpmAt(double torque) {
      return rpm(machine.slipAt(source, external, torque).orElseThrow());
    }

    private double rpmOfSquareLaw() {
      double torque = shortedTorque();
      double full = 1.0 - slip();
      double balance =
          Root.find(
              s ->
                  machine.torque(source, external, s)
                      - torque * (1.0 - s) * (1.0 - s) / (full * full),
              1e-6,
              1.0,
              1e-13);
      return rpm(balance);
    }
  }
}
