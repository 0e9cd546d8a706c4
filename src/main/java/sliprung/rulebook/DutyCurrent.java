package sliprung.rulebook;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import sliprung.machine.OperatingPoint;
import sliprung.quantity.Show;
import sliprung.runup.Stage;
import sliprung.runup.StartSimulator;
import sliprung.runup.StartSimulator.RunningPoint;
import sliprung.starter.Duty;

/**
 * What a conductor or pole carries, by the starts and their frequency: running for good, and RMS
 * over the cycle {@code √(Σ I²t / T)} with running all the time that is left between two starts.
 *
 * <p>An inch counts with the seconds of the practice's figure {@code duty.inch-seconds}, plugging
 * with the length of a run-up at the current of slip 2.
 */
public final class DutyCurrent {
  private static final double HOUR = 3600.0;
  private static final double PLUGGED = 2.0;

  private final Facts facts;
  private final boolean ring;
  private final ToDoubleFunction<List<Integer>> share;

  /**
   * A current of this starter.
   *
   * @param ring of the rings, else of the stator line
   * @param share what the subject carries of it, by the sections in circuit
   */
  public DutyCurrent(Facts facts, boolean ring, ToDoubleFunction<List<Integer>> share) {
    this.facts = facts;
    this.ring = ring;
    this.share = share;
  }

  /**
   * A current found.
   *
   * @param amps RMS
   * @param start that decided; empty for the running current of a corner without a start
   */
  public record Found(double amps, Optional<ComputedStart> start) {}

  /** The greatest running current over the corners; empty where none was computed. */
  public Optional<Found> forGood() {
    return facts.running().entrySet().stream()
        .filter(e -> e.getValue().isPresent())
        .map(
            e ->
                new Found(
                    amps(e.getValue().get().point()) * share.applyAsDouble(List.of()),
                    facts.find(
                        sliprung.runup.Scenario.PERMITTED, ComputedStart.From.COLD, e.getKey())))
        .reduce((a, b) -> b.amps() > a.amps() ? b : a);
  }

  /** The greatest current just as it flows in any permitted start. */
  public Optional<Found> greatest() {
    return cold()
        .map(s -> new Found(greatest(s), Optional.of(s)))
        .reduce((a, b) -> b.amps() > a.amps() ? b : a);
  }

  /**
   * The greatest RMS current over the cycle; where the starts an hour are not given, over starts
   * without any pause or running alone, whichever is more: no cycle has more.
   */
  public Optional<Found> rms() {
    return cold()
        .map(s -> new Found(rms(s), Optional.of(s)))
        .reduce((a, b) -> b.amps() > a.amps() ? b : a);
  }

  /** {@code over 4 starts an hour}, or that they are not given. */
  public String words() {
    Duty duty = facts.starter().duty();
    String starts =
        duty.startsPerHour().isPresent()
            ? "over " + Show.three(duty.startsPerHour().getAsDouble()) + " starts an hour"
            : "start after start without a pause";
    String inching =
        duty.inching()
            .filter(o -> o.perHour() > 0.0)
            .map(o -> ", " + Show.three(o.perHour()) + " inches of " + Show.seconds(inchSeconds()))
            .orElse("");
    return starts
        + inching
        + duty.plugging()
            .filter(o -> o.perHour() > 0.0)
            .map(o -> ", " + Show.three(o.perHour()) + " times of plugging")
            .orElse("");
  }

  private java.util.stream.Stream<ComputedStart> cold() {
    return facts.permitted().filter(s -> s.place() == 1 && s.from() == ComputedStart.From.COLD);
  }

  private double amps(OperatingPoint point) {
    return ring ? point.ringAmps() : point.statorAmps();
  }

  private double[] amps(Stage stage) {
    return ring ? stage.trace().ringAmps() : stage.trace().statorAmps();
  }

  private double greatest(ComputedStart start) {
    double greatest = 0.0;
    for (Stage stage : start.history().stages()) {
      double part = share.applyAsDouble(stage.sectionsIn());
      for (double amps : amps(stage)) {
        greatest = Math.max(greatest, part * amps);
      }
    }
    return greatest;
  }

  private double rms(ComputedStart start) {
    double heat = 0.0;
    for (Stage stage : start.history().stages()) {
      double part = share.applyAsDouble(stage.sectionsIn());
      heat += part * part * stage.trace().integralOfSquare(amps(stage));
    }
    List<Stage> stages = start.history().stages();
    double seconds = stages.get(stages.size() - 1).toSeconds();
    double running =
        share.applyAsDouble(List.of())
            * Optional.ofNullable(facts.running().get(start.corner()))
                .flatMap(r -> r)
                .map(RunningPoint::point)
                .map(this::amps)
                .orElse(0.0);
    double extra = repeated(start, seconds);
    Duty duty = facts.starter().duty();
    if (duty.startsPerHour().isEmpty()) {
      return Math.sqrt(Math.max(heat / seconds, running * running) + extra);
    }
    double cycle = HOUR / duty.startsPerHour().getAsDouble();
    double left = Math.max(0.0, cycle - seconds);
    return Math.sqrt((heat + running * running * left) / (left + seconds) + extra);
  }

  /** Mean square that inching and plugging add, A². */
  private double repeated(ComputedStart start, double runUpSeconds) {
    Duty duty = facts.starter().duty();
    return duty.inching().map(o -> meanSquare(start, o, 1.0, inchSeconds())).orElse(0.0)
        + duty.plugging().map(o -> meanSquare(start, o, PLUGGED, runUpSeconds)).orElse(0.0);
  }

  private double inchSeconds() {
    return facts.practice().figure("duty.inch-seconds").value();
  }

  private double meanSquare(
      ComputedStart start, Duty.Repeated operation, double slip, double seconds) {
    List<Integer> in =
        IntStream.rangeClosed(operation.step(), facts.starter().sectionCount()).boxed().toList();
    double ohms =
        new StartSimulator(facts.starter(), facts.machine())
            .externalOhms(in, start.history().conditions());
    double amps =
        share.applyAsDouble(in)
            * amps(facts.machine().at(start.history().conditions().source(), ohms, slip));
    return amps * amps * operation.perHour() * seconds / HOUR;
  }
}
