package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.machine.FluxModel;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.numeric.SystemFlow;
import sliprung.starter.Motor.CircuitData;

/**
 * The direct-on-line start of {@code lbl-buildings-dol} (origin and licence beside the files): the
 * library's own result, and the curves digitised from a thesis within what digitising left.
 */
@Tag("outside")
class DirectOnLineTransientTest {
  private static final double RPM = 30.0 / Math.PI;
  private static final double OMEGA = 2.0 * Math.PI * 50.0;
  private static final double END = 0.8;
  private static final double DIGITISED_BEHIND = 0.45e-3;
  private static final FluxModel MODEL =
      new FluxModel(
          new Machine(
              new CircuitData(1.0, OMEGA * 0.0051, OMEGA * 0.1406, 1.145, OMEGA * 0.0052, 1.0),
              50.0,
              2),
          new Source(311.08 * Math.sqrt(1.5), 0.0),
          0.0);
  private static final Course COURSE = Course.compute();

  /** Samples of the start at a step of 0.05 ms at most. */
  private record Course(double[] times, double[][] states) {
    static Course compute() {
      List<Double> times = new ArrayList<>(List.of(0.0));
      List<double[]> states = new ArrayList<>(List.of(new double[FluxModel.STATES]));
      SystemFlow.run(
          (y, rate) -> {
            MODEL.fluxRates(y, rate);
            rate[FluxModel.SPEED] = (MODEL.torque(y) - 26.5) / 0.17;
          },
          new double[] {1e-9, 1e-9, 1e-9, 1e-9, 1e-7},
          0.0,
          new double[FluxModel.STATES],
          END,
          (from, to, solution) -> {
            int parts = (int) Math.ceil((to - from) / 5e-5);
            for (int i = 1; i <= parts; i++) {
              double t = from + (to - from) * i / parts;
              times.add(t);
              states.add(solution.at(t));
            }
          });
      return new Course(
          times.stream().mapToDouble(Double::doubleValue).toArray(),
          states.toArray(double[][]::new));
    }

    double at(double time, Quantity quantity) {
      int i = Math.abs(Arrays.binarySearch(times, time));
      int first = Math.max(0, Math.min(i - 3, times.length - 6));
      double[] t = Arrays.copyOfRange(times, first, first + 6);
      double[] v = new double[6];
      for (int k = 0; k < 6; k++) {
        v[k] = quantity.of(states[first + k]);
      }
      return Samples.at(t, v, Math.max(0.0, Math.min(END, time)));
    }
  }

  private interface Quantity {
    double of(double[] state);
  }

  private static double rpm(double time) {
    return COURSE.at(time, y -> y[FluxModel.SPEED]) * RPM;
  }

  private static double torque(double time) {
    return COURSE.at(time, MODEL::torque);
  }

  /** Phase a, whose voltage begins as a sine. */
  private static double phaseAmps(double time) {
    double real = COURSE.at(time, MODEL::statorReal);
    double imaginary = COURSE.at(time, MODEL::statorImaginary);
    double angle = OMEGA * time - Math.PI / 2.0;
    return real * Math.cos(angle) - imaginary * Math.sin(angle);
  }

  private static double[][] digitised(String name) throws IOException {
    return text(name + ".csv")
        .lines()
        .skip(1)
        .map(line -> Stream.of(line.split(",")).mapToDouble(Double::parseDouble).toArray())
        .filter(row -> row[0] <= END)
        .toArray(double[][]::new);
  }

  private static double[] library(String variable) throws IOException {
    String line =
        text("library_reference_result.txt")
            .lines()
            .filter(l -> l.startsWith(variable + "=["))
            .findFirst()
            .orElseThrow();
    String inside = line.substring(line.indexOf('[') + 1, line.indexOf(']'));
    return Stream.of(inside.split(",")).mapToDouble(Double::parseDouble).toArray();
  }

  private static String text(String name) throws IOException {
    String path = "/lbl-buildings-dol/" + name;
    try (InputStream in =
        Objects.requireNonNull(DirectOnLineTransientTest.class.getResourceAsStream(path), path)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
  }

  private record Error(double rms, double greatest) {
    static Error of(double[][] rows, DoubleUnaryOperator ours) {
      double squares = 0.0;
      double greatest = 0.0;
      for (double[] row : rows) {
        double error = ours.applyAsDouble(row[0]) - row[1];
        squares += error * error;
        greatest = Math.max(greatest, Math.abs(error));
      }
      return new Error(Math.sqrt(squares / rows.length), greatest);
    }
  }

  private static Error againstLibrary(String variable, DoubleUnaryOperator ours)
      throws IOException {
    double[] values = library(variable);
    assertThat(values).hasSize(101);
    double[][] rows = new double[101][];
    for (int i = 0; i < 101; i++) {
      rows[i] = new double[] {END * i / 100.0, values[i]};
    }
    return Error.of(rows, ours);
  }

  @Test
  void speed_torque_and_current_of_the_library_are_met() throws IOException {
    assertThat(againstLibrary("motDri.speBlo.N", DirectOnLineTransientTest::rpm).greatest())
        .isLessThan(0.1);
    assertThat(againstLibrary("motDri.speBlo.tau_e", DirectOnLineTransientTest::torque).greatest())
        .isLessThan(0.15);
    assertThat(againstLibrary("motDri.curBlo.I_a", DirectOnLineTransientTest::phaseAmps).greatest())
        .isLessThan(0.05);
  }

  /** Independent flux model (SciPy) on the same inputs; end speed by the library. */
  @TestFactory
  Stream<DynamicTest> should_meet_the_speeds_of_an_independent_model() {
    return OutsideTable.read("lbl-dol")
        .tests(
            row ->
                assertThat(rpm(row.number("time_s")))
                    .isCloseTo(row.number("rpm"), within(row.number("tolerance"))));
  }

  @Test
  void the_digitised_curves_of_the_thesis_are_met_within_their_digitising() throws IOException {
    Error speed = Error.of(digitised("speed"), DirectOnLineTransientTest::rpm);
    assertThat(speed.rms()).isLessThan(3.6);
    assertThat(speed.greatest()).isLessThan(7.5);

    Error current =
        Error.of(
            digitised("current"), t -> t + DIGITISED_BEHIND > END ? phaseAmps(END) : shifted(t));
    assertThat(current.rms()).isLessThan(2.75);
    Error torque = Error.of(digitised("torque"), t -> torque(Math.min(END, t + DIGITISED_BEHIND)));
    assertThat(torque.rms()).isLessThan(0.025 * 160.0);
  }

  private static double shifted(double time) {
    return phaseAmps(time + DIGITISED_BEHIND);
  }
}
