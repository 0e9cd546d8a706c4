package sliprung.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import sliprung.protection.LevelOverTime;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.quantity.Show;
import sliprung.review.Preloads;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.Duty;
import sliprung.tolerance.Corners;

/**
 * How hot the sections of the bank become in each permitted row of starts, as a share of the
 * element rise at their limit, at the corner where one of them comes highest.
 *
 * @param rows cold and hot row of starts
 * @param corner it was computed at, in words
 * @param missing sections without data, with the input each lacks
 * @param says what to see
 */
public record SectionLevels(List<Row> rows, String corner, List<String> missing, String says) {
  private static final double AFTER = 1.6;
  private static final String PART = "section-";

  /**
   * A row of starts.
   *
   * @param title such as {@code 2 starts in a row from cold}
   * @param sections a line each
   * @param closings of the line contactor, s from the first
   * @param endSeconds of the picture
   */
  public record Row(
      String title, List<Section> sections, List<Double> closings, double endSeconds) {
    /** Copies the lists. */
    public Row {
      sections = List.copyOf(sections);
      closings = List.copyOf(closings);
    }
  }

  /**
   * A section.
   *
   * @param number from 1
   * @param level 1 at its limit
   */
  public record Section(int number, LevelOverTime level) {}

  /** Copies the lists. */
  public SectionLevels {
    rows = List.copyOf(rows);
    missing = List.copyOf(missing);
  }

  /** Of a review; empty where no section has data or no permitted start was computed. */
  public static Optional<SectionLevels> of(Review review) {
    return review.starts().stream()
        .filter(s -> !s.scenario().isFault() && s.circuit().isEmpty())
        .filter(s -> greatest(s) >= 0.0)
        .max(
            Comparator.comparingDouble(SectionLevels::greatest)
                .thenComparing(Comparator.comparing(ComputedStart::id).reversed()))
        .map(worst -> of(review, worst));
  }

  /** Greatest use of a section in a start; below 0 where none has data. */
  private static double greatest(ComputedStart start) {
    return start.parts().stream()
        .filter(p -> p.part().startsWith(PART) && p.missing().isEmpty())
        .mapToDouble(PartResponse::use)
        .max()
        .orElse(-1.0);
  }

  private static SectionLevels of(Review review, ComputedStart worst) {
    StartProtection start =
        new ProtectionEvaluator(review.starter(), review.machine()).over(worst.history());
    Duty duty = review.starter().duty();
    int cold = Math.max(1, duty.coldStarts());
    List<Row> rows = new ArrayList<>();
    rows.add(row(review, start, PartPreload.COLD, cold, "from cold"));
    if (duty.hotStarts() > 0) {
      StartSimulator simulator = new StartSimulator(review.starter(), review.machine());
      Preloads before =
          Preloads.of(
              review.starter(),
              simulator.runningPoint(Corners.conditions(review.starter(), worst.corner())));
      PartPreload hot =
          before.parts(
              duty.restartAfterSeconds(), start.sectionLevelsAfter(PartPreload.COLD, cold));
      rows.add(row(review, start, hot, duty.hotStarts(), "from hot, after the row from cold"));
    }
    List<String> missing = new ArrayList<>();
    for (PartResponse part : worst.parts()) {
      if (part.part().startsWith(PART) && part.missing().isPresent()) {
        missing.add(part.missing().get());
      }
    }
    return new SectionLevels(rows, worst.corner().words(), missing, says(rows, worst, missing));
  }

  private static Row row(
      Review review, StartProtection start, PartPreload preload, int starts, String from) {
    List<Section> sections = new ArrayList<>();
    for (int number = 1; number <= review.starter().sectionCount(); number++) {
      Optional<LevelOverTime> level = start.levelOverTime(PART + number, preload, starts);
      if (level.isPresent()) {
        sections.add(new Section(number, level.get()));
      }
    }
    StartHistory history = start.history();
    double one = history.stages().get(history.stages().size() - 1).toSeconds();
    List<Double> closings = new ArrayList<>();
    for (int n = 0; n < starts; n++) {
      closings.add(n * one);
    }
    String title = (starts == 1 ? "one start " : starts + " starts in a row ") + from;
    return new Row(title, sections, closings, starts * one * AFTER);
  }

  private static String says(List<Row> rows, ComputedStart worst, List<String> missing) {
    Row hottestRow = rows.get(0);
    Section hottest = rows.get(0).sections().get(0);
    for (Row row : rows) {
      for (Section section : row.sections()) {
        if (section.level().greatest() > hottest.level().greatest()) {
          hottest = section;
          hottestRow = row;
        }
      }
    }
    double share = hottest.level().greatest();
    String text =
        "Hottest: section "
            + hottest.number()
            + (share >= 1.0 ? " passes its limit: " : " comes to ")
            + Show.percent(share < 1.0 ? Math.min(0.999, share) : share)
            + " of it"
            + (share >= 1.0 ? "" : "s limit")
            + " in "
            + hottestRow.title()
            + " ("
            + worst.corner().words()
            + ").";
    return missing.isEmpty()
        ? text
        : text + " Not judged, give " + String.join(", ", missing) + ".";
  }
}
