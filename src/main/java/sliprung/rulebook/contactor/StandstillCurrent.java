package sliprung.rulebook.contactor;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import sliprung.machine.OperatingPoint;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.ComputedStart.From;
import sliprung.rulebook.Facts;
import sliprung.runup.Scenario;
import sliprung.runup.StartSimulator;

/**
 * The greatest stator current over the corners with the rotor circuit of one step, at rest or at
 * another slip: what a line contactor makes onto that step, and what it breaks when inching there.
 *
 * @param amps stator current, RMS
 * @param powerFactor at the motor's terminals
 * @param start a computed start at the corner that decided
 */
record StandstillCurrent(double amps, double powerFactor, ComputedStart start) {

  /** Slip of a rotor at rest. */
  static final double AT_REST = 1.0;

  /** Slip of a motor at full speed against a reversed field. */
  static final double PLUGGED = 2.0;

  /**
   * The greatest over the corners.
   *
   * @param step from 1; number of sections and one more: rings shorted
   * @param slip 1 at rest, 2 at plugging
   * @return empty where no permitted start was computed
   */
  static Optional<StandstillCurrent> on(Facts facts, int step, double slip) {
    List<Integer> in = IntStream.rangeClosed(step, facts.starter().sectionCount()).boxed().toList();
    StartSimulator circuit = new StartSimulator(facts.starter(), facts.machine());
    return facts
        .permitted()
        .filter(s -> s.place() == 1)
        .map(
            s -> {
              var conditions = s.history().conditions();
              double ohms = circuit.externalOhms(in, conditions);
              OperatingPoint at = facts.machine().at(conditions.source(), ohms, slip);
              return new StandstillCurrent(
                  at.statorAmps(), at.powerFactor(), closest(facts, s, step));
            })
        .reduce((a, b) -> b.amps() > a.amps() ? b : a);
  }

  /** Rings shorted, at rest. */
  static Optional<StandstillCurrent> ringsShorted(Facts facts) {
    return on(facts, facts.starter().sectionCount() + 1, AT_REST);
  }

  private static ComputedStart closest(Facts facts, ComputedStart permitted, int step) {
    Scenario scenario =
        step > facts.starter().sectionCount()
            ? new Scenario(Scenario.Kind.RINGS_SHORTED, 0, Scenario.LoadMode.START)
            : new Scenario(Scenario.Kind.LOCKED_STEP, step, Scenario.LoadMode.START);
    return step == 1
        ? permitted
        : facts.find(scenario, From.COLD, permitted.corner()).orElse(permitted);
  }
}
