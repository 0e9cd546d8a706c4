package sliprung.protection;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/** A device that is not fitted, tried on computed starts: when would it operate? */
public final class DeviceTrial {
  private final Map<Edge, EdgeModel> models = new EnumMap<>(Edge.class);

  /**
   * A trial.
   *
   * @param device with its settings
   * @param starter whose timers, bank and supply it would meet
   */
  public DeviceTrial(Device device, Starter starter) {
    models.putAll(Bands.models(device, starter));
  }

  /** Empty, or why an edge cannot be computed at all. */
  public Optional<String> unknown(Edge edge) {
    return models.get(edge).unknown();
  }

  /**
   * When it operates over the last of some starts in a row, s from line closing; infinite: never;
   * empty where it cannot be told.
   *
   * @param over a history
   * @param edge which device of its set
   * @param preload before the first
   * @param starts 1 or more
   */
  public OptionalDouble operatesSeconds(
      StartProtection over, Edge edge, DevicePreload preload, int starts) {
    EdgeModel.EdgeOutcome outcome =
        models.get(edge).over(new Starts(over.currents(), starts, preload), false);
    return outcome.notJudged().isPresent()
        ? OptionalDouble.empty()
        : OptionalDouble.of(outcome.passage().reachedAtSeconds());
  }
}
