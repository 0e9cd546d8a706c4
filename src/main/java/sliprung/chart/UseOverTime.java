package sliprung.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.LevelOverTime;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.quantity.Show;
import sliprung.review.DeviceText;
import sliprung.review.Preloads;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.StartSimulator;
import sliprung.starter.Device;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/**
 * How far each device comes towards operating in a permitted start and the 30 min of running after
 * it, at its fast edge: the last cold and the last hot start of their rows, nominal values.
 *
 * @param rows a device each, in the file's order
 * @param lastClosingSeconds when the last step closes; empty: never
 * @param coldStarts how many in a row, the last of which is shown
 * @param hotStarts likewise; 0: none is permitted
 * @param says what to see
 */
public record UseOverTime(
    List<Row> rows, OptionalDouble lastClosingSeconds, int coldStarts, int hotStarts, String says) {

  /**
   * A device.
   *
   * @param device tag
   * @param label tag and what it is
   * @param cold use; empty: not computed
   * @param hot use; empty: not computed
   * @param worst greatest use over every corner and every permitted start; empty: not computed
   */
  public record Row(
      String device,
      String label,
      Optional<LevelOverTime> cold,
      Optional<LevelOverTime> hot,
      Optional<Worst> worst) {

    /** Greatest use there is in this row; 0 without any. */
    public double greatest() {
      return Math.max(
          worst.map(Worst::use).orElse(0.0),
          Math.max(
              cold.map(LevelOverTime::greatest).orElse(0.0),
              hot.map(LevelOverTime::greatest).orElse(0.0)));
    }
  }

  /**
   * The start that comes closest.
   *
   * @param use greatest share of what operates it
   * @param where start and corner in words
   */
  public record Worst(double use, String where) {}

  /** Copies the list. */
  public UseOverTime {
    rows = List.copyOf(rows);
  }

  /** Of a review; empty where the nominal cold start was not computed or nothing is fitted. */
  public static Optional<UseOverTime> of(Review review) {
    return review
        .start("cold")
        .filter(cold -> !review.starter().protection().isEmpty())
        .map(cold -> of(review, cold));
  }

  private static UseOverTime of(Review review, ComputedStart cold) {
    StartProtection start =
        new ProtectionEvaluator(review.starter(), review.machine()).over(cold.history());
    StartSimulator simulator = new StartSimulator(review.starter(), review.machine());
    Preloads before =
        Preloads.of(
            review.starter(),
            simulator.runningPoint(Corners.conditions(review.starter(), Corner.NOMINAL)));
    int coldStarts = Math.max(1, review.starter().duty().coldStarts());
    int hotStarts = review.starter().duty().hotStarts();
    List<Row> rows = new ArrayList<>();
    for (Device device : review.starter().protection()) {
      String tag = device.tag();
      rows.add(
          new Row(
              tag,
              DeviceText.words(device),
              start.useOverTime(tag, Edge.FAST, DevicePreload.COLD, coldStarts),
              hotStarts == 0
                  ? Optional.empty()
                  : start.useOverTime(tag, Edge.FAST, before.devices(), hotStarts),
              worst(review, tag)));
    }
    OptionalDouble closing = cold.history().lastClosingSeconds();
    return new UseOverTime(rows, closing, coldStarts, hotStarts, says(rows, closing));
  }

  private static Optional<Worst> worst(Review review, String tag) {
    Worst worst = null;
    for (ComputedStart start : review.starts()) {
      Optional<DeviceResponse> response = start.device(tag, Edge.FAST);
      if (start.scenario().isFault()
          || response.isEmpty()
          || response.get().notJudged().isPresent()) {
        continue;
      }
      double use = response.get().use();
      if (worst == null || use > worst.use()) {
        worst = new Worst(use, start.words() + ", " + start.corner().words());
      }
    }
    return Optional.ofNullable(worst);
  }

  private static String says(List<Row> rows, OptionalDouble closing) {
    List<String> sentences = new ArrayList<>();
    List<Row> judged = rows.stream().filter(r -> r.worst().isPresent()).toList();
    List<String> operate =
        judged.stream().filter(r -> r.worst().get().use() >= 1.0).map(Row::device).toList();
    if (judged.isEmpty()) {
      sentences.add("No device's use could be computed.");
    } else if (operate.isEmpty()) {
      Row closest =
          judged.stream()
              .max(Comparator.comparingDouble(r -> r.worst().orElseThrow().use()))
              .orElseThrow();
      Worst worst = closest.worst().orElseThrow();
      sentences.add(
          "No device operates in a permitted start. Closest: "
              + closest.device()
              + " comes to "
              + Show.percent(Math.min(0.999, worst.use()))
              + " of operating ("
              + worst.where()
              + ").");
    } else {
      sentences.add(
          String.join(", ", operate)
              + (operate.size() == 1 ? " operates" : " operate")
              + " in a permitted start at the worst corner.");
    }
    List<String> late =
        closing.isEmpty()
            ? List.of()
            : rows.stream()
                .filter(r -> r.cold().isPresent())
                .filter(r -> peaksAfter(r.cold().get(), closing.getAsDouble()))
                .map(Row::device)
                .toList();
    if (!late.isEmpty()) {
      sentences.add("After the last closing still rising: " + String.join(", ", late) + ".");
    }
    List<String> unknown = rows.stream().filter(r -> r.worst().isEmpty()).map(Row::device).toList();
    if (!unknown.isEmpty()) {
      sentences.add("Not judged: " + String.join(", ", unknown) + ".");
    }
    return String.join(" ", sentences);
  }

  /** Whether the greatest level comes well after a time and stands clear of the one before it. */
  static boolean peaksAfter(LevelOverTime use, double seconds) {
    double before = 0.0;
    double after = 0.0;
    double[] t = use.seconds();
    double[] levels = use.levels();
    for (int i = 0; i < t.length; i++) {
      if (t[i] <= seconds) {
        before = Math.max(before, levels[i]);
      } else {
        after = Math.max(after, levels[i]);
      }
    }
    return after > 1.02 * before && after > 0.01;
  }
}
