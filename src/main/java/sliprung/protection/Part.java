package sliprung.protection;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;

/**
 * One heated part.
 *
 * @param name as in {@link PartResponse}
 * @param missing empty, or the path of the input without which it cannot be judged
 * @param channel current in it
 * @param meter from a preload; never asked where something is missing
 * @param threePhaseOhms three times its resistance in one start; empty: its heat is not known
 */
record Part(
    String name,
    Optional<String> missing,
    Channel channel,
    Function<PartPreload, Meter> meter,
    Optional<ToDoubleFunction<StartHistory>> threePhaseOhms) {

  private static final double LONGEST = 1e6;

  /** Longer than any time constant's last creep. */
  private static final double BEYOND_SECONDS = 1e6;

  /** A part that cannot be judged. */
  static Part missing(String name, String path) {
    return new Part(
        name,
        Optional.of(path),
        Channel.stator(),
        preload -> {
          throw new IllegalStateException(name + " has no limit");
        },
        Optional.empty());
  }

  /** A part without known resistance. */
  static Part of(String name, Channel channel, Function<PartPreload, Meter> meter) {
    return new Part(name, Optional.empty(), channel, meter, Optional.empty());
  }

  /** How long it stands a constant current from cold at rest, s; empty where data are missing. */
  OptionalDouble withstandSeconds(double amps) {
    return missing.isPresent()
        ? OptionalDouble.empty()
        : OptionalDouble.of(
            meter.apply(PartPreload.COLD).advance(new Piece(LONGEST, amps, amps, amps, true)));
  }

  /** The part with its resistance. */
  Part withOhms(ToDoubleFunction<StartHistory> threePhase) {
    return new Part(name, missing, channel, meter, Optional.of(threePhase));
  }

  /** Its level over some starts in a row; empty where its data are missing. */
  Optional<LevelOverTime> levelOverTime(Currents currents, PartPreload preload, int starts) {
    return missing.isPresent()
        ? Optional.empty()
        : Optional.of(LevelOverTime.ofAll(meter.apply(preload), currents.of(channel), starts));
  }

  /** What it goes through in the last of some starts in a row. */
  PartResponse over(Currents currents, PartPreload preload, int starts) {
    if (missing.isPresent()) {
      return PartResponse.missing(name, missing.get());
    }
    Waveform waveform = currents.of(channel);
    Meter used = meter.apply(preload);
    Passage passage = Passage.of(used, waveform, starts);
    OptionalDouble energy =
        threePhaseOhms
            .map(
                ohms ->
                    OptionalDouble.of(
                        ohms.applyAsDouble(currents.history()) * waveform.jouleIntegral()))
            .orElse(OptionalDouble.empty());
    double limitAt = passage.reachedAtSeconds();
    if (Double.isInfinite(limitAt) && goesOnSteadily(currents.history())) {
      limitAt = beyond(used, waveform, currents.history().endSeconds());
    }
    return new PartResponse(name, passage.use(), limitAt, energy, Optional.empty());
  }

  /** A fault that has settled goes on as it is until something opens the circuit. */
  private static boolean goesOnSteadily(StartHistory history) {
    List<Stage> stages = history.stages();
    return history.scenario().isFault() && stages.get(stages.size() - 1).settled();
  }

  /**
   * When the limit comes after the end of the history, in closed form: what creeps towards a level
   * above its limit reaches it, however late.
   */
  private static double beyond(Meter used, Waveform waveform, double end) {
    Piece last = waveform.piece(waveform.size() - 1);
    double amps = last.last();
    return end + used.advance(new Piece(BEYOND_SECONDS, amps, amps, amps, last.standing()));
  }
}
