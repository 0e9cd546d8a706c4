package sliprung.protection;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
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
    Passage passage = Passage.of(meter.apply(preload), waveform, starts);
    OptionalDouble energy =
        threePhaseOhms
            .map(
                ohms ->
                    OptionalDouble.of(
                        ohms.applyAsDouble(currents.history()) * waveform.jouleIntegral()))
            .orElse(OptionalDouble.empty());
    return new PartResponse(
        name, passage.use(), passage.reachedAtSeconds(), energy, Optional.empty());
  }
}
