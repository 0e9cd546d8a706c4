package sliprung.benchmark;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import sliprung.config.CurveLibraryReader;
import sliprung.config.StarterReader;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.review.Review;
import sliprung.review.Reviewer;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.sampling.Sampled;
import sliprung.sampling.StartSampling;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/** What a start, its devices, a sampling and a review of a demo starter cost, warm. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 2)
@Fork(1)
public class StartBenchmark {
  /** Which demo. */
  @Param("crusher")
  public String demo;

  private Starter starter;
  private Machine machine;
  private StartSimulator simulator;
  private ProtectionEvaluator evaluator;
  private Conditions nominal;
  private StartHistory history;

  /** Runs every benchmark of this package; arguments are patterns of names. */
  public static void main(String[] patterns) throws RunnerException {
    OptionsBuilder options = new OptionsBuilder();
    for (String pattern : patterns.length == 0 ? new String[] {"sliprung"} : patterns) {
      options.include(pattern);
    }
    new Runner(options.build()).run();
  }

  /** Reads the demo. */
  @Setup
  public void read() {
    starter =
        new StarterReader(CurveLibraryReader.builtIn(), Catalogue.names())
            .read(Path.of("configs", demo + ".yaml"))
            .described()
            .orElseThrow()
            .starter();
    machine = Reviewer.machine(starter, NameplateIdentification.identify(starter.motor()).get(0));
    simulator = new StartSimulator(starter, machine);
    evaluator = new ProtectionEvaluator(starter, machine);
    nominal = Corners.conditions(starter, Corner.NOMINAL);
    history = simulator.run(Scenario.PERMITTED, nominal);
  }

  /** One permitted start by the steady circuit. */
  @Benchmark
  public StartHistory steadyStart() {
    return simulator.run(Scenario.PERMITTED, nominal);
  }

  /** The same with the electrical transient. */
  @Benchmark
  public StartHistory transientStart() {
    return simulator.runTransient(Scenario.PERMITTED, nominal);
  }

  /** Every device at one edge over a start that is computed. */
  @Benchmark
  public List<DeviceResponse> devicesAtOneEdge() {
    return evaluator.over(history).devices(Edge.FAST, DevicePreload.COLD, 1);
  }

  /** A start by the steady circuit with every device at one edge: what SciPy is held against. */
  @Benchmark
  public List<DeviceResponse> startWithDevices() {
    return evaluator
        .over(simulator.run(Scenario.PERMITTED, nominal))
        .devices(Edge.FAST, DevicePreload.COLD, 1);
  }

  /** Every part over a start that is computed. */
  @Benchmark
  public List<PartResponse> parts() {
    StartProtection over = evaluator.over(history);
    return over.parts(PartPreload.COLD, 1);
  }

  /** A thousand sampled starts with every device at two edges and every part, cold and hot. */
  @Benchmark
  public Sampled thousandSampledStarts() {
    return StartSampling.of(starter, List.of(machine), 1000, 1);
  }

  /** A whole review without its record. */
  @Benchmark
  public Review review() {
    return Reviewer.review(starter, LocalDate.of(2026, 12, 1));
  }
}
