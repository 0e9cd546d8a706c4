package sliprung.review;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Exposure;
import sliprung.rulebook.Facts;
import sliprung.starter.Device;

/**
 * Every fault against every fitted device as if it were the only one: does it clear the fault, and
 * before the first part reaches its limit? The worst over every corner, from cold and from hot.
 *
 * @param devices tags, in the file's order
 * @param rows one for each fault
 */
public record BlindSpots(List<String> devices, List<Row> rows) {

  /** What a device makes of a fault, worst first. */
  public enum Sight {
    /** It does not operate. */
    BLIND,
    /** It operates, but opens nothing that can interrupt this current. */
    CANNOT_OPEN,
    /** It operates, but nothing proves that what it opens breaks this current. */
    NOT_PROVEN,
    /** Its curve or settings do not tell. */
    NOT_JUDGED,
    /** It clears after a part has reached its limit. */
    LATE,
    /** It clears; a section's or winding's limit is not known. */
    LIMIT_UNKNOWN,
    /** It clears before any part reaches its limit. */
    SEES
  }

  /**
   * One device against one fault.
   *
   * @param sight the worst over the starts
   * @param seconds latest clearing of the starts with that sight, from line closing; infinite: none
   * @param share of the starts that have that sight, above 0, at most 1
   */
  public record Cell(Sight sight, double seconds, double share) {}

  /**
   * One fault.
   *
   * @param fault in words, such as {@code held on step 2}
   * @param cells one for each device
   */
  public record Row(String fault, List<Cell> cells) {

    /** Copies the list. */
    public Row {
      cells = List.copyOf(cells);
    }

    /** Whether no device clears the fault in time at every corner. */
    public boolean isUnseen() {
      return cells.stream().noneMatch(c -> c.sight() == Sight.SEES);
    }
  }

  /** Copies the lists. */
  public BlindSpots {
    devices = List.copyOf(devices);
    rows = List.copyOf(rows);
  }

  /** Of a review. */
  public static BlindSpots of(Review review) {
    Facts facts = ReviewFacts.of(review);
    List<String> devices = review.starter().protection().stream().map(Device::tag).toList();
    Map<String, List<ComputedStart>> faults = new LinkedHashMap<>();
    for (ComputedStart start : review.starts()) {
      if (start.scenario().isFault()) {
        faults.computeIfAbsent(start.scenario().words(), k -> new ArrayList<>()).add(start);
      }
    }
    List<Row> rows = new ArrayList<>();
    faults.forEach(
        (fault, starts) ->
            rows.add(
                new Row(fault, devices.stream().map(tag -> cell(facts, starts, tag)).toList())));
    return new BlindSpots(devices, rows);
  }

  private static Cell cell(Facts facts, List<ComputedStart> starts, String device) {
    List<String> others =
        facts.starter().protection().stream()
            .map(Device::tag)
            .filter(tag -> !tag.equals(device))
            .toList();
    Sight worst = Sight.SEES;
    double latest = 0.0;
    int count = 0;
    for (ComputedStart start : starts) {
      Exposure alone = Exposure.of(facts, start, others);
      Sight sight = sight(start, device, alone);
      if (sight.compareTo(worst) < 0) {
        worst = sight;
        latest = 0.0;
        count = 0;
      }
      if (sight == worst) {
        latest = Math.max(latest, alone.clearedAtSeconds());
        count++;
      }
    }
    return new Cell(worst, latest, (double) count / starts.size());
  }

  private static Sight sight(ComputedStart start, String device, Exposure alone) {
    Optional<DeviceResponse> slow = start.device(device, Edge.SLOW);
    if (slow.isEmpty() || slow.get().notJudged().isPresent()) {
      return Sight.NOT_JUDGED;
    }
    if (alone.clearing().isPresent()) {
      if (alone.limitAtSeconds() <= alone.clearedAtSeconds()) {
        return Sight.LATE;
      }
      return alone.missing().isEmpty() ? Sight.SEES : Sight.LIMIT_UNKNOWN;
    }
    if (alone.unproven().isPresent()) {
      return Sight.NOT_PROVEN;
    }
    return slow.get().operates() ? Sight.CANNOT_OPEN : Sight.BLIND;
  }
}
