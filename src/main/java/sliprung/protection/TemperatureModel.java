package sliprung.protection;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import sliprung.runup.StartHistory;
import sliprung.starter.Device;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;

/**
 * Sensors on the elements of some sections: each follows its element, a first-order body of its
 * own, with a first-order lag; the first that is past its limit trips. Use is the sensor's rise
 * over the rise that trips it.
 *
 * <p>After starts that have left the bank warm, sensors follow the same series as the bank in a
 * permitted start. Before a fault the fast edge has sensors as warm as their elements; the slow
 * edge has them cold, which is late and never early.
 */
final class TemperatureModel implements EdgeModel {
  private static final double SHORTEST_LAG_SECONDS = 1e-3;

  private final Edge edge;
  private final int coldStarts;
  private final List<Sensor> sensors;

  /** One section with its sensor, levels in shares of what trips it. */
  private record Sensor(
      int section, Channel channel, double referenceAmps, double tau, double lag, double share) {
    Meter meter(double element, double sensor) {
      return new TwoBodyMeter(referenceAmps, tau, lag, element / share, sensor / share);
    }
  }

  /**
   * An edge; only where nothing is {@link #missing}.
   *
   * @param riseKelvin that trips at this edge
   * @param lagSeconds at this edge
   * @param starter with its bank and duty
   */
  TemperatureModel(
      Device.Temperature device, Edge edge, double riseKelvin, double lagSeconds, Starter starter) {
    this.edge = edge;
    this.coldStarts = Math.max(1, starter.duty().coldStarts());
    ResistorBank bank = starter.resistors();
    this.sensors =
        device.sections().stream()
            .map(k -> sensor(bank, k, riseKelvin, Math.max(lagSeconds, SHORTEST_LAG_SECONDS)))
            .toList();
  }

  private static Sensor sensor(ResistorBank bank, int number, double rise, double lag) {
    SectionElement element = SectionElement.of(bank, number).orElseThrow();
    ResistorBank.Section section = bank.sections().get(number - 1);
    double share = rise / SectionElement.limitRiseKelvin(section).orElseThrow();
    return new Sensor(
        number,
        SectionParts.channel(bank, number),
        element.referenceAmps() * Math.sqrt(share),
        element.timeConstantSeconds(),
        lag,
        share);
  }

  /** Empty, or what is missing of a section that it watches. */
  static Optional<String> missing(Device.Temperature device, ResistorBank bank) {
    for (int number : device.sections()) {
      Optional<String> missing = SectionElement.missing(bank, number);
      if (missing.isEmpty()
          && SectionElement.limitRiseKelvin(bank.sections().get(number - 1)).isEmpty()) {
        missing = Optional.of("resistors.sections[" + number + "].rise");
      }
      if (missing.isPresent()) {
        return Optional.of(
            "how hot section " + number + " gets is not known: needs " + missing.get());
      }
    }
    return device.leastRiseKelvin() > 0.0
        ? Optional.empty()
        : Optional.of("its limit lies within the air of the bank: it may trip at any time");
  }

  private Meter before(Sensor sensor, Starts starts) {
    double level = starts.preload().sectionLevel(sensor.section());
    StartHistory history = starts.currents().history();
    if (level == 0.0) {
      return sensor.meter(0.0, 0.0);
    }
    if (!history.scenario().isFault()) {
      Meter meter = sensor.meter(0.0, 0.0);
      for (int n = 0; n < coldStarts; n++) {
        Passage.throughStart(meter, starts.currents().of(sensor.channel()));
      }
      return meter;
    }
    return sensor.meter(level, edge == Edge.SLOW ? 0.0 : level);
  }

  private Passage passage(Starts starts, UnaryOperator<Waveform> change) {
    Passage all = new Passage(0.0, 0.0, Double.POSITIVE_INFINITY);
    for (Sensor sensor : sensors) {
      Waveform waveform = change.apply(starts.currents().of(sensor.channel()));
      Passage one = Passage.of(before(sensor, starts), waveform, starts.count());
      all =
          new Passage(
              Math.max(all.use(), one.use()),
              Math.max(all.useAtRunUp(), one.useAtRunUp()),
              Math.min(all.reachedAtSeconds(), one.reachedAtSeconds()));
    }
    return all;
  }

  @Override
  public EdgeOutcome over(Starts starts, boolean withMargins) {
    Passage passage = passage(starts, UnaryOperator.identity());
    if (!withMargins) {
      return new EdgeOutcome(passage, Optional.empty(), Optional.empty(), Optional.empty());
    }
    return new EdgeOutcome(
        passage,
        Optional.of(
            new StartMargins(
                f -> passage(starts, w -> w.scaled(f, 1.0)).use(),
                f -> passage(starts, w -> w.scaled(1.0, f)).use(),
                passage.use(),
                Margin.COARSE)),
        Optional.empty(),
        Optional.empty());
  }

  /** Of the section whose sensor comes closest to its limit. */
  @Override
  public Optional<LevelOverTime> useOverTime(Starts starts) {
    return sensors.stream()
        .map(
            s ->
                LevelOverTime.ofLast(
                    before(s, starts), starts.currents().of(s.channel()), starts.count()))
        .max(Comparator.comparingDouble(LevelOverTime::greatest));
  }

  @Override
  public OptionalDouble seconds(double amps) {
    return OptionalDouble.empty();
  }
}
