package sliprung.sampling;

import java.util.ArrayList;
import java.util.List;
import sliprung.machine.Machine;
import sliprung.protection.DevicePreload;
import sliprung.protection.DeviceResponse;
import sliprung.protection.Edge;
import sliprung.protection.PartPreload;
import sliprung.protection.PartResponse;
import sliprung.protection.ProtectionEvaluator;
import sliprung.protection.StartProtection;
import sliprung.review.Preloads;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.Starter;

/** Computes one sampled start with every device and part, with the steady circuit. */
final class OneStart {
  /** The relays that are looked at: the quickest of the kind, and one in the middle of its band. */
  static final List<Edge> RELAYS = List.of(Edge.FAST, Edge.MIDDLE);

  private final Starter starter;
  private final StartSimulator simulator;
  private final ProtectionEvaluator evaluator;

  OneStart(Starter starter, Machine machine) {
    this.starter = starter;
    this.simulator = new StartSimulator(starter, machine);
    this.evaluator = new ProtectionEvaluator(starter, machine);
  }

  /**
   * What a start came to: every figure, in the order of {@link #names}; NaN where there is none.
   *
   * @param conditions drawn
   */
  double[] at(Conditions conditions) {
    StartHistory history = simulator.run(Scenario.PERMITTED, conditions);
    StartProtection protection = evaluator.over(history);
    Preloads running = Preloads.of(starter, simulator.runningPoint(conditions));
    int cold = starter.duty().coldStarts();
    int hot = starter.duty().hotStarts();
    List<Double> sections = protection.sectionLevelsAfter(PartPreload.COLD, Math.max(1, cold));
    PartPreload restarted = running.parts(starter.duty().restartAfterSeconds(), sections);

    double[] figures = new double[names().size()];
    int at = 0;
    figures[at++] = history.runUpSeconds().orElse(Double.NaN);
    for (int step = 2; step <= starter.sectionCount() + 1; step++) {
      figures[at++] = closing(history, step);
    }
    for (Edge edge : RELAYS) {
      at =
          devices(
              figures, at, cold, protection.devices(edge, DevicePreload.COLD, Math.max(1, cold)));
      at = devices(figures, at, hot, protection.devices(edge, running.devices(), Math.max(1, hot)));
    }
    at = parts(figures, at, cold, protection.parts(PartPreload.COLD, Math.max(1, cold)));
    parts(figures, at, hot, protection.parts(restarted, Math.max(1, hot)));
    return figures;
  }

  private static double closing(StartHistory history, int step) {
    for (Stage stage : history.stages()) {
      if (stage.step() == step) {
        return stage.entry().statorAmps();
      }
    }
    return Double.NaN;
  }

  private static int devices(
      double[] figures, int from, int starts, List<DeviceResponse> responses) {
    int at = from;
    for (DeviceResponse response : responses) {
      figures[at++] = starts > 0 && response.notJudged().isEmpty() ? response.use() : Double.NaN;
    }
    return at;
  }

  private static int parts(double[] figures, int from, int starts, List<PartResponse> responses) {
    int at = from;
    for (PartResponse response : responses) {
      figures[at++] = starts > 0 && response.missing().isEmpty() ? response.use() : Double.NaN;
    }
    return at;
  }

  /** A figure's name and unit, and the device whose use it is, if any. */
  record Name(String words, String unit, String device, Edge relay, String series) {}

  /** Every figure, in order. */
  List<Name> names() {
    List<Name> names = new ArrayList<>();
    names.add(new Name("run-up time", "s", "", null, ""));
    for (int step = 2; step <= starter.sectionCount() + 1; step++) {
      String contactor = starter.steps().get(step - 2).contactor();
      names.add(new Name("closing current of " + contactor, "A", "", null, ""));
    }
    for (Edge relay : RELAYS) {
      for (String series : List.of("cold", "hot")) {
        starter
            .protection()
            .forEach(
                d ->
                    names.add(
                        new Name(
                            "use of " + d.tag() + ", " + words(relay) + ", " + series,
                            "",
                            d.tag(),
                            relay,
                            series)));
      }
    }
    for (String series : List.of("cold", "hot")) {
      evaluator
          .partNames()
          .forEach(p -> names.add(new Name("use of " + p + ", " + series, "", "", null, series)));
    }
    return names;
  }

  /** Which relay of its kind, in words. */
  static String words(Edge relay) {
    return relay == Edge.FAST ? "quickest of its kind" : "middle of its band";
  }
}
