package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Function;

/** An edge that follows from what a meter makes of a current. */
final class MeasuringModel implements EdgeModel {
  /** Long enough for every operating time that a standard knows, s. */
  private static final double LONGEST = 1e6;

  private final Function<Currents, Waveform> current;
  private final Function<DevicePreload, Meter> meter;
  private final double stride;

  /**
   * An edge.
   *
   * @param current the current it measures
   * @param preloadAmps the part of a preload at its place
   * @param meter a new meter after that steady current
   * @param stride of its current margin, see {@link Margin}
   */
  MeasuringModel(
      Function<Currents, Waveform> current,
      java.util.function.ToDoubleFunction<DevicePreload> preloadAmps,
      DoubleFunction<Meter> meter,
      double stride) {
    this.current = current;
    this.stride = stride;
    this.meter = preload -> meter.apply(preloadAmps.applyAsDouble(preload));
  }

  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    Waveform waveform = current.apply(starts.currents());
    Meter used = meter.apply(starts.preload());
    Passage passage = Passage.of(used, waveform, starts.count());
    Optional<String> doubt = used.doubt();
    if (doubt.isPresent()) {
      return EdgeOutcome.notJudged(doubt.get());
    }
    if (!withMargins) {
      return new EdgeOutcome(passage, Optional.empty(), used.bound(), doubt);
    }
    DoubleUnaryOperator byCurrent = f -> use(starts, waveform.scaled(f, 1.0));
    DoubleUnaryOperator byTime = f -> use(starts, waveform.scaled(1.0, f));
    return new EdgeOutcome(
        passage,
        Optional.of(new StartMargins(byCurrent, byTime, passage.use(), stride)),
        used.bound(),
        doubt);
  }

  /** Greatest use; a run that cannot be judged counts as an operation. */
  private double use(Starts starts, Waveform waveform) {
    Meter fresh = meter.apply(starts.preload());
    double use = Passage.of(fresh, waveform, starts.count()).use();
    return fresh.doubt().isPresent() ? Math.max(1.0, use) : use;
  }

  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    Meter used = meter.apply(starts.preload());
    LevelOverTime use =
        LevelOverTime.ofLast(used, current.apply(starts.currents()), starts.count());
    return used.doubt().isPresent() ? Optional.empty() : Optional.of(use);
  }

  @Override
  public OptionalDouble pickedUpSeconds(Currents currents, double beforeSeconds) {
    OptionalDouble pickUp = Bands.pickUpAmps(this);
    return pickUp.isPresent()
        ? current.apply(currents).lastRiseSeconds(pickUp.getAsDouble(), beforeSeconds)
        : OptionalDouble.empty();
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return seconds(amps, DevicePreload.COLD);
  }

  @Override
  public OptionalDouble seconds(double amps, DevicePreload preload) {
    Meter fresh = meter.apply(preload);
    double reached = fresh.advance(Piece.constant(LONGEST, amps));
    return fresh.doubt().isPresent() ? OptionalDouble.empty() : OptionalDouble.of(reached);
  }
}
