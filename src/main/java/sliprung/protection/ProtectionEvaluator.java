package sliprung.protection;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import sliprung.machine.Machine;
import sliprung.runup.StartHistory;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Starter;

/**
 * What every device and every heated part of one starter makes of a computed start.
 *
 * <p>Several starts in a row are equal and follow each other without pause and without running in
 * between; the answer is about the last. The models are built once and never change: keep one
 * evaluator for a starter and a machine, on any number of threads.
 */
public final class ProtectionEvaluator {
  private final Starter starter;
  private final double synchronousSpeed;
  private final Map<Device, Map<Edge, EdgeModel>> devices = new LinkedHashMap<>();
  private final SectionParts sections;
  private final List<Part> parts = new ArrayList<>();

  /**
   * An evaluator.
   *
   * @param starter with its devices and parts
   * @param machine circuit at the supply's frequency
   */
  public ProtectionEvaluator(Starter starter, Machine machine) {
    this.starter = starter;
    this.synchronousSpeed = machine.synchronousSpeed();
    for (Device device : starter.protection()) {
      devices.put(device, Bands.models(device, starter));
    }
    this.sections = new SectionParts(starter.resistors());
    MotorParts motor = new MotorParts(starter.motor(), machine);
    parts.addAll(sections.parts());
    parts.add(motor.stator());
    parts.add(motor.rotor());
    parts.add(motor.rings());
    parts.add(
        ConductorParts.part(
            "stator-conductor", "conductors.stator", starter.statorConductor(), Channel.stator()));
    parts.add(
        ConductorParts.part(
            "rotor-conductor", "conductors.rotor", starter.rotorConductor(), Channel.ring()));
    parts.addAll(new ContactorParts(starter).parts());
  }

  /** A history to ask about; several questions about one cost little more than one. */
  public StartProtection over(StartHistory history) {
    return new StartProtection(
        this, new Currents(history, synchronousSpeed, starter.supply().frequency()));
  }

  /** {@link StartProtection#devices} over a single start. */
  public List<DeviceResponse> devices(StartHistory history, DevicePreload preload) {
    return devices(history, preload, 1);
  }

  /** {@link StartProtection#devices}. */
  public List<DeviceResponse> devices(StartHistory history, DevicePreload preload, int starts) {
    return over(history).devices(preload, starts);
  }

  /** {@link StartProtection#parts} over a single start. */
  public List<PartResponse> parts(StartHistory history, PartPreload preload) {
    return parts(history, preload, 1);
  }

  /** {@link StartProtection#parts}. */
  public List<PartResponse> parts(StartHistory history, PartPreload preload, int starts) {
    return over(history).parts(preload, starts);
  }

  /** {@link StartProtection#sectionLevelsAfter}. */
  public List<Double> sectionLevelsAfter(StartHistory history, PartPreload preload, int starts) {
    return over(history).sectionLevelsAfter(preload, starts);
  }

  /**
   * How long a part stands a constant current in its own conductor, from cold with the rotor at
   * rest.
   *
   * @param part as in {@link PartResponse}
   * @param amps RMS
   * @return seconds, infinite: for good; empty where its data are missing
   */
  public OptionalDouble withstandSeconds(String part, double amps) {
    return part(part).withstandSeconds(amps);
  }

  /** Current in a pole of a step contactor over the ring current, by the way its poles join. */
  public static double poleShare(Contactor contactor) {
    return ContactorParts.poleShare(contactor);
  }

  /** The model of one edge of the device of a tag. */
  EdgeModel model(String tag, Edge edge) {
    return devices.entrySet().stream()
        .filter(e -> e.getKey().tag().equals(tag))
        .map(e -> e.getValue().get(edge))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no device " + tag));
  }

  /** The part of a name. */
  Part part(String name) {
    return parts.stream()
        .filter(p -> p.name().equals(name))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no part " + name));
  }

  List<DeviceResponse> devices(Starts row) {
    List<DeviceResponse> responses = new ArrayList<>();
    for (Map.Entry<Device, Map<Edge, EdgeModel>> entry : devices.entrySet()) {
      for (Map.Entry<Edge, EdgeModel> model : entry.getValue().entrySet()) {
        responses.add(respond(entry.getKey(), model.getKey(), model.getValue(), row));
      }
    }
    return responses;
  }

  List<DeviceResponse> devices(Edge edge, Starts row) {
    return devices.entrySet().stream()
        .map(entry -> respond(entry.getKey(), edge, entry.getValue().get(edge), row))
        .toList();
  }

  /** Names of the parts, in the order of every list of responses. */
  public List<String> partNames() {
    return parts.stream().map(Part::name).toList();
  }

  List<PartResponse> parts(Currents currents, PartPreload preload, int starts) {
    return parts(currents, preload, starts, name -> true);
  }

  List<PartResponse> parts(
      Currents currents, PartPreload preload, int starts, Predicate<String> which) {
    return parts.stream()
        .filter(part -> which.test(part.name()))
        .map(part -> part.over(currents, preload, starts))
        .toList();
  }

  List<Double> sectionLevelsAfter(Currents currents, PartPreload preload, int starts) {
    return sections.levelsAfter(currents, preload, starts);
  }

  private DeviceResponse respond(Device device, Edge edge, EdgeModel model, Starts row) {
    boolean withMargins = edge == Edge.FAST && !row.currents().history().scenario().isFault();
    EdgeModel.EdgeOutcome outcome = model.over(row, withMargins);
    if (outcome.notJudged().isPresent()) {
      return DeviceResponse.notJudged(device.tag(), edge, outcome.notJudged().get());
    }
    double operates = outcome.passage().reachedAtSeconds();
    return new DeviceResponse(
        device.tag(),
        edge,
        outcome.passage().use(),
        outcome.passage().useAtRunUp(),
        operates,
        clears(device, operates),
        outcome.margins(),
        operates < Double.POSITIVE_INFINITY ? outcome.bound() : Optional.empty(),
        outcome.notJudged());
  }

  /**
   * When the circuit is open: operation and opening time of what the device trips. A fuse opens it
   * itself; only its pre-arcing time counts, the arc is over within a period or two. Any other
   * device that trips nothing clears nothing.
   */
  private double clears(Device device, double operates) {
    if (device instanceof Device.Fuse) {
      return operates;
    }
    OptionalDouble opening =
        device.trips().map(starter::openingSeconds).orElse(OptionalDouble.empty());
    return opening.isPresent() ? operates + opening.getAsDouble() : Double.POSITIVE_INFINITY;
  }
}
