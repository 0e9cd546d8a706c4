package sliprung.chart;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.DoubleStream;
import sliprung.machine.Source;
import sliprung.quantity.Show;
import sliprung.review.PartText;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Outcome;
import sliprung.runup.Scenario;
import sliprung.runup.Scenario.Kind;
import sliprung.runup.Trace;
import sliprung.starter.Motor;

/**
 * Starts and devices on one sheet, stator amperes across, seconds up, both logarithmic.
 *
 * @param bands devices between their edges
 * @param starts permitted starts and the locked one as duration curves, nominal values
 * @param held settled currents of held steps
 * @param ratedAmps of the motor
 * @param stall what the rotor winding stands with the rings shorted
 * @param scales beside the stator's
 * @param withstand of the parts
 * @param takeOvers of fuses from overload relays
 * @param corners the start at every corner
 * @param says what to see
 */
public record TimeCurrentSheet(
    List<Band> bands,
    List<DurationCurve> starts,
    List<HeldCurrent> held,
    double ratedAmps,
    List<Stall> stall,
    SheetScales scales,
    List<Withstand> withstand,
    List<TakeOverMark> takeOvers,
    Optional<CornerBand> corners,
    String says) {
  private static final double WIDEST = 60.0;
  private static final double LEAST_SHARE = 0.2;

  /** How far below the rated current the sheet goes down at most. */
  private static final double LEAST_OF_RATED = 20.0;

  /** A take-over must lie well inside the sheet, which ends at four times the greatest. */
  private static final double TAKE_OVER_ROOM = 3.0;

  /** Two settled currents closer than this are drawn as one line. */
  private static final double SAME = 0.03;

  private static final int MOST_LABELLED = 3;

  /**
   * The current on which held steps settle.
   *
   * @param label which; empty for one of many between the least and the greatest
   * @param amps stator, RMS
   */
  public record HeldCurrent(String label, double amps) {}

  /**
   * A stall limit.
   *
   * @param label cold or hot
   * @param amps stator, at rest with the rings shorted, rated voltage
   * @param seconds permitted
   */
  public record Stall(String label, double amps, double seconds) {}

  /** Copies the lists. */
  public TimeCurrentSheet {
    bands = List.copyOf(bands);
    starts = List.copyOf(starts);
    held = List.copyOf(held);
    stall = List.copyOf(stall);
    withstand = List.copyOf(withstand);
    takeOvers = List.copyOf(takeOvers);
  }

  /** Of a review and the bands of its devices. */
  public static TimeCurrentSheet of(Review review, List<Band> bands) {
    List<DurationCurve> starts = new ArrayList<>();
    Optional<ComputedStart> cold = review.start("cold");
    cold.ifPresent(s -> starts.add(curve("start", s)));
    review
        .start("hot")
        .filter(hot -> cold.isEmpty() || differs(hot, cold.get()))
        .ifPresent(s -> starts.add(curve("hot start", s)));
    review.start("locked").ifPresent(s -> starts.add(curve("locked, sequence running", s)));
    List<HeldCurrent> held = held(review);
    SheetScales scales = SheetScales.of(review);
    List<Withstand> withstand =
        Withstand.of(
            review,
            scales.ringPerStator(),
            review.starter().motor().current() * LEAST_SHARE,
            review.starter().motor().current() * WIDEST);
    return new TimeCurrentSheet(
        bands,
        starts,
        held,
        review.starter().motor().current(),
        stall(review, withstand),
        scales,
        withstand,
        TakeOverMark.of(review.starter()),
        CornerBand.of(review),
        says(review, bands, held, scales));
  }

  private static DurationCurve curve(String label, ComputedStart start) {
    return DurationCurve.stator(label, start.history().stages(), DurationCurve.until(start));
  }

  private static boolean differs(ComputedStart a, ComputedStart b) {
    double x = a.history().runUpSeconds().orElse(-1.0);
    double y = b.history().runUpSeconds().orElse(-1.0);
    return Math.abs(x - y) > SAME * Math.abs(y);
  }

  private static List<HeldCurrent> held(Review review) {
    List<ComputedStart> starts =
        review.starts().stream()
            .filter(s -> s.corner().isNominal() && s.from() == ComputedStart.From.COLD)
            .filter(s -> s.scenario().kind() == Kind.HELD)
            .filter(s -> s.history().outcome() == Outcome.HELD)
            .sorted(Comparator.comparingDouble(TimeCurrentSheet::settledAmps))
            .toList();
    List<HeldCurrent> lines = new ArrayList<>();
    List<ComputedStart> group = new ArrayList<>();
    for (ComputedStart start : starts) {
      boolean far =
          !group.isEmpty() && settledAmps(start) > settledAmps(group.get(0)) * (1.0 + SAME);
      if (far) {
        lines.add(line(group));
        group.clear();
      }
      group.add(start);
    }
    if (!group.isEmpty()) {
      lines.add(line(group));
    }
    return lines.size() <= MOST_LABELLED ? lines : outermostLabelled(lines);
  }

  /** Of many lines only the least and the greatest keep a label; it says so. */
  static List<HeldCurrent> outermostLabelled(List<HeldCurrent> rising) {
    List<HeldCurrent> lines = new ArrayList<>();
    for (int i = 0; i < rising.size(); i++) {
      HeldCurrent line = rising.get(i);
      String label =
          i == 0
              ? "least: " + line.label()
              : i < rising.size() - 1 ? "" : "greatest: " + line.label();
      lines.add(new HeldCurrent(label, line.amps()));
    }
    return lines;
  }

  private static HeldCurrent line(List<ComputedStart> group) {
    List<Integer> steps = group.stream().map(s -> s.scenario().step()).distinct().sorted().toList();
    boolean running =
        group.stream().allMatch(s -> s.scenario().load() == Scenario.LoadMode.RUNNING);
    double amps = settledAmps(group.get(group.size() - 1));
    String load = running ? " at running load" : "";
    return new HeldCurrent("held on " + steps(steps) + load + ": " + Show.amps(amps), amps);
  }

  /** {@code step 2}, {@code steps 1–5} or {@code steps 1, 3}. */
  static String steps(List<Integer> rising) {
    return named("step", rising);
  }

  /** The same of anything numbered. */
  static String named(String what, List<Integer> rising) {
    int first = rising.get(0);
    int last = rising.get(rising.size() - 1);
    if (rising.size() == 1) {
      return what + " " + first;
    }
    return last - first == rising.size() - 1 && rising.size() > 2
        ? what + "s " + first + "–" + last
        : what + "s " + rising.stream().map(String::valueOf).collect(Collectors.joining(", "));
  }

  private static double settledAmps(ComputedStart start) {
    Trace last = start.history().stages().get(start.history().stages().size() - 1).trace();
    return last.statorAmps()[last.last()];
  }

  /**
   * At the current that they are declared for, rated voltage from an ideal source. The cold limit
   * is a point of the winding's own line, where that is drawn.
   */
  private static List<Stall> stall(Review review, List<Withstand> withstand) {
    boolean drawn =
        withstand.stream()
            .anyMatch(w -> w.label().equals(PartText.words("rotor") + Withstand.AT_REST));
    Motor motor = review.starter().motor();
    double amps = review.machine().at(new Source(motor.voltage(), 0.0), 0.0, 1.0).statorAmps();
    List<Stall> stall = new ArrayList<>();
    if (!drawn) {
      motor.stallColdSeconds().ifPresent(t -> stall.add(new Stall("stall limit cold", amps, t)));
    }
    motor.stallHotSeconds().ifPresent(t -> stall.add(new Stall("stall limit hot", amps, t)));
    return stall;
  }

  private static String says(
      Review review, List<Band> bands, List<HeldCurrent> held, SheetScales scales) {
    return seen(review, bands, held) + " " + scales.sentence();
  }

  private static String seen(Review review, List<Band> bands, List<HeldCurrent> held) {
    String meaning =
        "A start has no single point here: its curve says how long the current stays at or above"
            + " each value (light blue: at every corner). Grey: each device between its fast and"
            + " its slow edge. Orange: how long a part stands a current with the rotor at rest,"
            + " hatched where it is past its limit. Both from cold, at a constant current.";
    double rated = review.starter().motor().current();
    if (held.isEmpty() || held.get(0).amps() >= rated) {
      return meaning;
    }
    double amps = held.get(0).amps();
    double first = bands.stream().mapToDouble(Band::firstAmps).min().orElse(0.0);
    return meaning
        + " Held on a step the motor can settle at "
        + Show.amps(amps)
        + ", below its rated "
        + Show.amps(rated)
        + (amps < first ? " and left of every device on this sheet." : ".");
  }

  /** Greatest ampere of what is computed. */
  public double greatestAmps() {
    DoubleStream curves = starts.stream().flatMapToDouble(c -> DoubleStream.of(c.amps()));
    DoubleStream limits =
        DoubleStream.concat(
            stall.stream().mapToDouble(Stall::amps),
            takeOvers.stream().mapToDouble(m -> m.amps() / TAKE_OVER_ROOM));
    return DoubleStream.concat(curves, limits).max().orElse(ratedAmps * 6.0);
  }

  /** Least ampere of what is computed; never far below the rated: a current rises from zero. */
  public double leastAmps() {
    DoubleStream curves = starts.stream().flatMapToDouble(c -> DoubleStream.of(c.amps()));
    DoubleStream lines = held.stream().mapToDouble(HeldCurrent::amps);
    double least = DoubleStream.concat(curves, lines).min().orElse(ratedAmps);
    return Math.min(ratedAmps, Math.max(least, ratedAmps / LEAST_OF_RATED));
  }
}
