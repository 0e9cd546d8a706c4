package sliprung.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.Trace;
import sliprung.starter.Device;

/**
 * The nominal cold start over time, with the band of all corners behind it.
 *
 * @param speedRpm rotor speed
 * @param statorAmps RMS
 * @param ringAmps RMS
 * @param terminalVolts line to line
 * @param ratedVolts of the motor
 * @param stages columns
 * @param timers sequence timers and rotation sensors, as ticks on the axis
 * @param runningFrom when the running load comes on after the start, s; empty: not shown
 * @param corners how many permitted cold starts the bands cover
 * @param endSeconds of the picture
 * @param says what to see
 */
public record StartOverTime(
    Banded speedRpm,
    Banded statorAmps,
    Banded ringAmps,
    Banded terminalVolts,
    double ratedVolts,
    List<Column> stages,
    List<TimerTick> timers,
    OptionalDouble runningFrom,
    int corners,
    double endSeconds,
    String says) {
  private static final double RPM = 30.0 / Math.PI;
  private static final double AFTER = 1.15;
  private static final double NEVER_RUN_UP_SECONDS = 30.0;

  /**
   * A nominal line and its band.
   *
   * @param nominal values
   * @param low least over the corners
   * @param high greatest over the corners
   */
  public record Banded(Series nominal, Series low, Series high) {
    /** Greatest value in sight. */
    public double greatest() {
      return Math.max(nominal.greatest(), high.greatest());
    }
  }

  /**
   * A stage.
   *
   * @param step from 1
   * @param closedBy contactor that began it
   * @param fromSeconds from line closing
   * @param toSeconds likewise
   */
  public record Column(int step, String closedBy, double fromSeconds, double toSeconds) {}

  /**
   * A timer that supervises the start; a rotation sensor's counts only while the rotor stands.
   *
   * @param device tag
   * @param seconds set
   * @param earliest with its spread
   * @param latest with its spread
   */
  public record TimerTick(String device, double seconds, double earliest, double latest) {}

  /** Copies the lists. */
  public StartOverTime {
    stages = List.copyOf(stages);
    timers = List.copyOf(timers);
  }

  /** Of a review; empty where the nominal cold start was not computed. */
  public static Optional<StartOverTime> of(Review review) {
    return review.start("cold").map(cold -> of(review, cold));
  }

  private static StartOverTime of(Review review, ComputedStart cold) {
    List<StartHistory> corners =
        review.starts().stream()
            .filter(s -> !s.scenario().isFault() && s.place() == 1)
            .filter(s -> s.from() == ComputedStart.From.COLD)
            .map(ComputedStart::history)
            .toList();
    List<TimerTick> timers = timers(review);
    double end = end(corners, timers);
    StartHistory history = cold.history();
    List<Column> columns = new ArrayList<>();
    for (Stage stage : history.stages()) {
      if (stage.fromSeconds() < end) {
        columns.add(
            new Column(
                stage.step(),
                stage.closedBy(),
                stage.fromSeconds(),
                Math.min(end, stage.toSeconds())));
      }
    }
    // the running after the start stands on the last step
    if (!columns.isEmpty() && history.running().isPresent()) {
      Column last = columns.remove(columns.size() - 1);
      columns.add(new Column(last.step(), last.closedBy(), last.fromSeconds(), end));
    }
    return new StartOverTime(
        banded(history, corners, Trace::speed, RPM, end),
        banded(history, corners, Trace::statorAmps, 1.0, end),
        banded(history, corners, Trace::ringAmps, 1.0, end),
        banded(history, corners, Trace::terminalVolts, 1.0, end),
        review.starter().motor().voltage(),
        columns,
        timers.stream().filter(t -> t.seconds() <= end).toList(),
        history.running().stream().mapToDouble(Stage::fromSeconds).filter(t -> t < end).findFirst(),
        corners.size(),
        end,
        says(history, corners));
  }

  private static Banded banded(
      StartHistory history,
      List<StartHistory> corners,
      java.util.function.Function<Trace, double[]> quantity,
      double factor,
      double end) {
    List<Series> edges = Sampling.edges(corners, quantity, factor, end);
    return new Banded(Sampling.series(history, quantity, factor, end), edges.get(0), edges.get(1));
  }

  private static double end(List<StartHistory> corners, List<TimerTick> timers) {
    double end = 0.0;
    for (StartHistory history : corners) {
      OptionalDouble done =
          history.runUpSeconds().isPresent()
              ? history.runUpSeconds()
              : history.lastClosingSeconds();
      double lastStage = history.stages().get(history.stages().size() - 1).fromSeconds();
      end = Math.max(end, done.orElse(lastStage + NEVER_RUN_UP_SECONDS));
    }
    end *= AFTER;
    for (TimerTick timer : timers) {
      if (timer.latest() < 2.0 * end) {
        end = Math.max(end, timer.latest() * 1.05);
      }
    }
    return end;
  }

  private static List<TimerTick> timers(Review review) {
    double spread = review.starter().timerSpread();
    List<TimerTick> ticks = new ArrayList<>();
    for (Device device : review.starter().protection()) {
      if (device instanceof Device.SequenceTimer timer) {
        ticks.add(tick(timer.tag(), timer.seconds(), spread));
      } else if (device instanceof Device.Standstill sensor) {
        ticks.add(tick(sensor.tag() + " at rest", sensor.seconds(), spread));
      } else if (device instanceof Device.StepProof proof) {
        ticks.add(tick(proof.tag() + " each step", proof.seconds(), spread));
      }
    }
    return ticks;
  }

  private static TimerTick tick(String device, double seconds, double spread) {
    return new TimerTick(device, seconds, seconds * (1.0 - spread), seconds * (1.0 + spread));
  }

  private static String says(StartHistory history, List<StartHistory> corners) {
    double peak = 0.0;
    for (Stage stage : history.stages()) {
      for (double amps : stage.trace().statorAmps()) {
        peak = Math.max(peak, amps);
      }
    }
    String nominal =
        history.runUpSeconds().isPresent()
            ? "The nominal cold start runs up in "
                + Show.seconds(history.runUpSeconds().getAsDouble())
                + " and draws at most "
                + Show.amps(peak)
                + "."
            : "The nominal cold start never runs up: it ends " + history.outcome().word() + ".";
    long stuck = corners.stream().filter(c -> c.runUpSeconds().isEmpty()).count();
    double slowest =
        corners.stream().mapToDouble(c -> c.runUpSeconds().orElse(0.0)).max().orElse(0.0);
    if (stuck > 0) {
      return nominal + " At " + stuck + " of " + corners.size() + " corners it never runs up.";
    }
    return corners.size() > 1
        ? nominal + " Over all corners the slowest takes " + Show.seconds(slowest) + "."
        : nominal;
  }
}
