package sliprung.rulebook.sequence;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.runup.Stage;
import sliprung.starter.Starter;

/**
 * One closing of a step contactor in a permitted start.
 *
 * @param start the start
 * @param step number of the step contactor, from 1
 * @param before the stage it ends
 * @param after the stage it begins
 */
record Closing(ComputedStart start, int step, Stage before, Stage after) {

  /** Stator current just after it, RMS A. */
  double statorAmps() {
    return after.entry().statorAmps();
  }

  /** Ring current just after it, RMS A. */
  double ringAmps() {
    return after.entry().ringAmps();
  }

  /** Speed at it, rad/s. */
  double speed() {
    return after.trace().speed()[0];
  }

  /** One start of each corner: within a series, and from hot, the currents are the same. */
  static Stream<ComputedStart> starts(Facts facts) {
    return facts.permitted().filter(s -> s.place() == 1 && s.from() == ComputedStart.From.COLD);
  }

  /** Every closing of one start, in time. */
  static List<Closing> of(Starter starter, ComputedStart start) {
    List<Closing> closings = new ArrayList<>();
    List<Stage> stages = start.history().stages();
    for (int i = 1; i < stages.size(); i++) {
      for (int k = 1; k <= starter.steps().size(); k++) {
        if (starter.steps().get(k - 1).contactor().equals(stages.get(i).closedBy())) {
          closings.add(new Closing(start, k, stages.get(i - 1), stages.get(i)));
          break;
        }
      }
    }
    return closings;
  }

  /** Every closing of one step contactor over the corners. */
  static List<Closing> of(Facts facts, int step) {
    return starts(facts)
        .flatMap(s -> of(facts.starter(), s).stream())
        .filter(c -> c.step() == step)
        .toList();
  }
}
