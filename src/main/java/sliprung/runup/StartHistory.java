package sliprung.runup;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One computed start.
 *
 * @param scenario what was supposed to happen
 * @param conditions the circumstances
 * @param outcome how it ended
 * @param stages in order; of a fault the last one runs to the end of the history
 * @param running after a permitted start: thirty minutes at running load; empty otherwise
 * @param lastClosingSeconds when the contactor of the last step closed; empty: it never did
 * @param runUpSeconds line closing until the last step has closed and the speed is within 0.5 % of
 *     the speed it settles at; empty: never
 * @param levelNeverReached number of the step whose level was never reached; 0 if none
 */
public record StartHistory(
    Scenario scenario,
    Conditions conditions,
    Outcome outcome,
    List<Stage> stages,
    Optional<Stage> running,
    OptionalDouble lastClosingSeconds,
    OptionalDouble runUpSeconds,
    int levelNeverReached) {

  /** Length in seconds of a fault's history and of the running after a permitted start. */
  public static final double HORIZON_SECONDS = 1800.0;

  /** Copies the list. */
  public StartHistory {
    stages = List.copyOf(stages);
  }

  /**
   * This history with the peaks of another computation of the same start: of each stage in turn, as
   * long as the same contactors closed.
   */
  public StartHistory withPeaksOf(StartHistory other) {
    java.util.ArrayList<Stage> with = new java.util.ArrayList<>(stages);
    for (int i = 0; i < Math.min(stages.size(), other.stages.size()); i++) {
      Stage theirs = other.stages.get(i);
      if (!theirs.closedBy().equals(stages.get(i).closedBy())) {
        break;
      }
      with.set(i, stages.get(i).with(theirs.peak()));
    }
    return new StartHistory(
        scenario,
        conditions,
        outcome,
        with,
        running,
        lastClosingSeconds,
        runUpSeconds,
        levelNeverReached);
  }

  /** This history with that peak of its first closing. */
  StartHistory withFirstPeak(ClosingPeak peak) {
    java.util.ArrayList<Stage> with = new java.util.ArrayList<>(stages);
    with.set(0, stages.get(0).with(Optional.of(peak)));
    return new StartHistory(
        scenario,
        conditions,
        outcome,
        with,
        running,
        lastClosingSeconds,
        runUpSeconds,
        levelNeverReached);
  }

  /** Every stage with its samples, the running after the start included. */
  public List<Stage> everything() {
    if (running.isEmpty()) {
      return stages;
    }
    java.util.ArrayList<Stage> all = new java.util.ArrayList<>(stages);
    all.add(running.get());
    return all;
  }

  /** End of the history, s. */
  public double endSeconds() {
    return running.map(Stage::toSeconds).orElseGet(() -> stages.get(stages.size() - 1).toSeconds());
  }

  /** When the rotor first moved is not kept; this tells whether it ever did. */
  public boolean everMoved() {
    for (Stage stage : stages) {
      double[] speed = stage.trace().speed();
      for (double w : speed) {
        if (Math.abs(w) > 0.0) {
          return true;
        }
      }
    }
    return false;
  }
}
