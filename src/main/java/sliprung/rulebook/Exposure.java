package sliprung.rulebook;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartResponse;
import sliprung.quantity.Show;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Device;

/**
 * What becomes of one failed start: which device really clears it first, and which part reaches its
 * limit first.
 *
 * <p>A device clears only if, at its slow edge, it operates and what it opens is in the stator line
 * and proven to break the current at that instant; a fuse clears by itself.
 *
 * @param start the failed start
 * @param clearing slow-edge response of the device that clears first
 * @param unproven device that would clear earlier, or at all, if what it opens were proven able
 * @param first the part that reaches its limit first
 * @param missing paths of inputs without which a section or winding cannot be judged
 */
public record Exposure(
    ComputedStart start,
    Optional<DeviceResponse> clearing,
    Optional<DeviceResponse> unproven,
    Optional<PartResponse> first,
    List<String> missing) {

  /** Works it out. */
  public static Exposure of(Facts facts, ComputedStart start) {
    return of(facts, start, List.of());
  }

  /** Works it out as if some devices were not there. */
  public static Exposure of(Facts facts, ComputedStart start, List<String> without) {
    Optional<DeviceResponse> clearing = Optional.empty();
    Optional<DeviceResponse> unproven = Optional.empty();
    List<DeviceResponse> slow =
        start.devices().stream()
            .filter(d -> d.edge() == Edge.SLOW && d.operates())
            .filter(d -> !without.contains(d.device()))
            .filter(d -> d.clearsAtSeconds() < Double.POSITIVE_INFINITY)
            .sorted(Comparator.comparingDouble(DeviceResponse::clearsAtSeconds))
            .toList();
    for (DeviceResponse response : slow) {
      Ability ability = ability(facts, start, response);
      if (ability == Ability.PROVEN) {
        clearing = Optional.of(response);
        break;
      }
      if (ability == Ability.UNKNOWN && unproven.isEmpty()) {
        unproven = Optional.of(response);
      }
    }
    Optional<PartResponse> first =
        start.parts().stream()
            .filter(p -> p.missing().isEmpty())
            .filter(p -> p.limitAtSeconds() < Double.POSITIVE_INFINITY)
            .min(Comparator.comparingDouble(PartResponse::limitAtSeconds));
    List<String> missing = new ArrayList<>();
    for (PartResponse part : start.parts()) {
      if (isEssential(part.part()) && part.missing().isPresent()) {
        missing.add(part.missing().get());
      }
    }
    return new Exposure(start, clearing, unproven, first, missing.stream().distinct().toList());
  }

  /** Sections and windings: the parts without which a failed start cannot be judged. */
  private static boolean isEssential(String part) {
    return part.startsWith("section-") || part.equals("stator") || part.equals("rotor");
  }

  private enum Ability {
    PROVEN,
    UNABLE,
    UNKNOWN
  }

  private static Ability ability(Facts facts, ComputedStart start, DeviceResponse response) {
    Device device = facts.starter().device(response.device()).orElseThrow();
    if (device instanceof Device.Fuse) {
      return Ability.PROVEN;
    }
    String opens = device.trips().orElse("");
    boolean inLine =
        facts.starter().breaker(opens).isPresent()
            || facts.starter().lineContactors().stream().anyMatch(c -> c.tag().equals(opens));
    if (!inLine) {
      return Ability.UNABLE;
    }
    Optional<BreakingCapacity> capacity = BreakingCapacity.of(facts, opens);
    if (capacity.isEmpty()) {
      return Ability.UNKNOWN;
    }
    double amps = statorAmpsAt(start.history(), response.operatesAtSeconds());
    return amps <= capacity.get().amps() ? Ability.PROVEN : Ability.UNABLE;
  }

  /** Stator current in A at a time in s. */
  public static double statorAmpsAt(StartHistory history, double seconds) {
    List<Stage> stages = history.everything();
    Stage stage = stages.get(0);
    for (Stage candidate : stages) {
      if (candidate.fromSeconds() <= seconds) {
        stage = candidate;
      }
    }
    Trace trace = stage.trace();
    return trace.at(trace.statorAmps(), seconds);
  }

  /** When the circuit is opened, s; infinite: never. */
  public double clearedAtSeconds() {
    return clearing.map(DeviceResponse::clearsAtSeconds).orElse(Double.POSITIVE_INFINITY);
  }

  /** When the first part reaches its limit, s; infinite: none does. */
  public double limitAtSeconds() {
    return first.map(PartResponse::limitAtSeconds).orElse(Double.POSITIVE_INFINITY);
  }

  /** First limit over clearing; infinite where no part reaches a limit, 0 where nothing clears. */
  public double clearingRatio() {
    double limit = limitAtSeconds();
    if (Double.isInfinite(limit)) {
      return Double.POSITIVE_INFINITY;
    }
    return limit / clearedAtSeconds();
  }

  /**
   * Time that the first part spends past its limit, s; to the end of the history if never cleared.
   */
  public double exposureSeconds() {
    double end = Math.min(clearedAtSeconds(), start.history().endSeconds());
    return Math.max(0.0, end - limitAtSeconds());
  }

  /** A thin margin against never being cleared: the greatest use of a part that no device stops. */
  public double greatestUse() {
    return start.parts().stream()
        .filter(p -> p.missing().isEmpty())
        .mapToDouble(PartResponse::use)
        .max()
        .orElse(0.0);
  }

  /** {@code section 2 reaches its limit after 109 s; F5 clears after 13.7 s}. */
  public String clause() {
    String limit =
        first
            .map(
                p ->
                    p.limitAtSeconds() > 0.0
                        ? limit(p.part()) + " after " + Show.seconds(p.limitAtSeconds())
                        : lower(name(p.part())) + " was past its limit before the fault")
            .orElse("no part reaches its limit");
    String clears =
        clearing
            .map(d -> d.device() + " clears after " + Show.seconds(d.clearsAtSeconds()))
            .orElse(nothing());
    return limit + "; " + clears;
  }

  private String nothing() {
    String clears = unproven.isPresent() ? "nothing is proven to clear it" : "nothing clears it";
    boolean late =
        limitAtSeconds() > start.history().endSeconds() && Double.isFinite(limitAtSeconds());
    return late ? clears + " within 30\u00a0min" : clears;
  }

  private static String limit(String part) {
    String name = name(part);
    String within = part.startsWith("section-") || name.startsWith("The ") ? lower(name) : name;
    return within + (part.equals("rings") ? " reach their limit" : " reaches its limit");
  }

  private static String lower(String name) {
    return Character.toLowerCase(name.charAt(0)) + name.substring(1);
  }

  /** A part's name at the beginning of a sentence. */
  public static String name(String part) {
    return switch (part) {
      case "stator" -> "The stator winding";
      case "rotor" -> "The rotor winding";
      case "rings" -> "The slip rings";
      case "stator-conductor" -> "The stator cable";
      case "rotor-conductor" -> "The rotor cable";
      default ->
          part.startsWith("section-") ? "Section " + part.substring("section-".length()) : part;
    };
  }
}
