package sliprung.protection;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.fixture.Starters;
import sliprung.machine.Machine;
import sliprung.machine.Source;
import sliprung.runup.Conditions;
import sliprung.runup.StartSimulator;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.ResistorBank;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.TorqueCurve;

/**
 * A starter with devices, its machine and its nominal conditions.
 *
 * @param starter described
 * @param machine its circuit
 * @param nominal rated voltage, everything nominal
 */
record Plants(Starter starter, Machine machine, Conditions nominal) {

  StartSimulator simulator() {
    return new StartSimulator(starter, machine);
  }

  ProtectionEvaluator evaluator() {
    return new ProtectionEvaluator(starter, machine);
  }

  /** The invented fan-500: leads, a permanent resistance and a source reactance. */
  static Plants fan500() {
    CircuitData circuit = new CircuitData(0.026, 0.135, 4.1, 0.0275, 0.14, 1.37);
    Starter bare =
        Starters.bare(
            500,
            50,
            982,
            132e3,
            circuit,
            67.5,
            new TorqueCurve.Square(1050),
            new double[] {0.36, 0.19, 0.1, 0.055},
            new Step.After(5),
            new Step.After(4),
            new Step.After(3),
            new Step.After(2));
    Starter starter =
        with(
            bare,
            185,
            225,
            bank(
                bare,
                ResistorBank.Connection.STAR,
                ResistorBank.CutOut.STAR_POINT,
                79,
                360,
                0.008,
                0.004),
            Contactor.Poles.STAR,
            Devices.overload("OL1", Devices.CLASS_20, 185),
            Devices.overload("OL2", Devices.CLASS_10, 190),
            Devices.inverse(Devices.VERY_INVERSE, 240, 0.4),
            Devices.sequence(22));
    return new Plants(
        starter,
        new Machine(circuit, 50, 3),
        new Conditions(new Source(500, Source.reactanceOf(500, 6500)), 1, 1, 1, 1));
  }

  /** The invented trolley-480: a delta bank and steps closed by current. */
  static Plants trolley480() {
    CircuitData circuit = new CircuitData(0.2, 0.42, 10.5, 0.235, 0.44, 1.86);
    Starter bare =
        Starters.bare(
            480,
            60,
            868,
            40 * 745.7,
            circuit,
            10.6,
            new TorqueCurve.Linear(150),
            new double[] {1.15, 0.62, 0.33},
            new Step.StatorBelow(58),
            new Step.RotorBelow(92),
            new Step.After(0.9));
    Starter starter =
        with(
            bare,
            52,
            76,
            bank(bare, ResistorBank.Connection.DELTA, ResistorBank.CutOut.BRIDGING, 27, 122, 0, 0),
            Contactor.Poles.DELTA,
            Devices.overload("OL1", Devices.CLASS_10, 52),
            Devices.overload("OL2", Devices.CLASS_30, 52),
            Devices.inverse(Devices.IEEE_VERY, 62, 2),
            Devices.sequence(14));
    return new Plants(
        starter, new Machine(circuit, 60, 4), new Conditions(new Source(480, 0), 1, 1, 1, 1));
  }

  /** The invented crusher-6600: a frequency level already true at entry. */
  static Plants crusher6600() {
    CircuitData circuit = new CircuitData(0.55, 4.9, 150, 0.62, 5.1, 6.6);
    Starter bare =
        Starters.bare(
            6600,
            50,
            592,
            710e3,
            circuit,
            880,
            new TorqueCurve.Table(
                new double[] {0, 0.1, 0.5, 1}, new double[] {5200, 2600, 3100, 5400}),
            new double[] {0.62, 0.31, 0.155, 0.078, 0.039},
            new Step.After(3.5),
            new Step.After(2.4),
            new Step.RotorFrequencyBelow(18),
            new Step.After(1.2),
            new Step.After(0.8));
    Starter starter =
        with(
            bare,
            79,
            452,
            bank(
                bare, ResistorBank.Connection.STAR, ResistorBank.CutOut.STAR_POINT, 158, 723, 0, 0),
            Contactor.Poles.STAR,
            Devices.overload("OL1", Devices.CLASS_20, 79),
            Devices.overload("OL2", Devices.CLASS_30, 80),
            Devices.inverse(Devices.EXTREMELY_INVERSE, 95, 1.2),
            Devices.sequence(20));
    return new Plants(
        starter, new Machine(circuit, 50, 5), new Conditions(new Source(6600, 0), 1, 1, 1, 1));
  }

  /** The plant with other devices. */
  Plants protectedBy(Device... devices) {
    return new Plants(withDevices(starter, Arrays.asList(devices)), machine, nominal);
  }

  private static ResistorBank bank(
      Starter bare,
      ResistorBank.Connection connection,
      ResistorBank.CutOut cutOut,
      double continuous,
      double shortTime,
      double permanent,
      double leads) {
    List<ResistorBank.Section> sections = new ArrayList<>();
    for (ResistorBank.Section section : bare.resistors().sections()) {
      sections.add(
          new ResistorBank.Section(
              section.ohms(),
              OptionalDouble.of(continuous),
              Optional.of(new ShortTime(shortTime, 20)),
              OptionalDouble.empty(),
              OptionalDouble.empty()));
    }
    return new ResistorBank(connection, cutOut, sections, true, permanent, leads, 0.1, 0.2, 1200);
  }

  private static Starter with(
      Starter bare,
      double statorAmps,
      double ringAmps,
      ResistorBank bank,
      Contactor.Poles poles,
      Device... devices) {
    Motor m = bare.motor();
    Motor motor =
        new Motor(
            m.voltage(),
            m.frequency(),
            m.powerWatts(),
            statorAmps,
            m.speedRpm(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.of(ringAmps),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            m.inertia(),
            OptionalDouble.of(20),
            OptionalDouble.of(14),
            OptionalDouble.of(1800),
            OptionalDouble.of(5400),
            Optional.of(new ShortTime(2 * ringAmps, 15)),
            m.circuit());
    List<Contactor> contactors = new ArrayList<>();
    for (Contactor c : bare.contactors()) {
      boolean line = c.place() == Contactor.Place.LINE;
      contactors.add(
          new Contactor(
              c.tag(),
              c.place(),
              line ? Map.of("AC-2", 1.2 * statorAmps, "AC-3", 1.2 * statorAmps) : Map.of(),
              OptionalDouble.of(m.voltage()),
              line ? Optional.empty() : Optional.of(poles),
              line ? OptionalDouble.empty() : OptionalDouble.of(1.2 * ringAmps),
              OptionalDouble.empty(),
              line ? Optional.empty() : Optional.of(new ShortTime(5 * ringAmps, 10)),
              0.0,
              line ? 0.06 : 0.0,
              Optional.empty()));
    }
    Load load = bare.load();
    return new Starter(
        bare.name(),
        bare.practice(),
        bare.supply(),
        motor,
        load,
        bank,
        bare.steps(),
        bare.sequence(),
        bare.timerSpread(),
        bare.levelSpread(),
        contactors,
        List.of(new sliprung.starter.Breaker("Q1", OptionalDouble.of(25e3), 0.05)),
        Arrays.asList(devices),
        bare.statorConductor(),
        bare.rotorConductor(),
        bare.duty(),
        bare.limits(),
        bare.margins(),
        bare.fuseWear(),
        bare.interlocks(),
        bare.ambient(),
        bare.evidence(),
        bare.accepted(),
        bare.assumptions(),
        bare.notYetJudged());
  }

  private static Starter withDevices(Starter s, List<Device> devices) {
    return new Starter(
        s.name(),
        s.practice(),
        s.supply(),
        s.motor(),
        s.load(),
        s.resistors(),
        s.steps(),
        s.sequence(),
        s.timerSpread(),
        s.levelSpread(),
        s.contactors(),
        s.breakers(),
        devices,
        s.statorConductor(),
        s.rotorConductor(),
        s.duty(),
        s.limits(),
        s.margins(),
        s.fuseWear(),
        s.interlocks(),
        s.ambient(),
        s.evidence(),
        s.accepted(),
        s.assumptions(),
        s.notYetJudged());
  }
}
