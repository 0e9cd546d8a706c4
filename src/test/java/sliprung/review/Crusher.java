package sliprung.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.curve.InverseLaw;
import sliprung.curve.TripClass;
import sliprung.starter.Ambient;
import sliprung.starter.Assumption;
import sliprung.starter.Breaker;
import sliprung.starter.Conductor;
import sliprung.starter.Contactor;
import sliprung.starter.Device;
import sliprung.starter.Device.Fitting;
import sliprung.starter.Device.Measurement;
import sliprung.starter.Device.Place;
import sliprung.starter.Duty;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Interlocks;
import sliprung.starter.Limits;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.ResistorBank;
import sliprung.starter.ResistorBank.Section;
import sliprung.starter.ShortTime;
import sliprung.starter.Starter;
import sliprung.starter.Step;
import sliprung.starter.Supply;
import sliprung.starter.TorqueCurve;

/** An invented five-section starter of a jaw crusher, for tests of what is written about it. */
public final class Crusher {
  private Crusher() {}

  /** The starter under a name and with a reason that may be hostile text. */
  public static Starter named(String name) {
    return starter(name, Map.of("AC-2", 315.0, "AC-3", 315.0));
  }

  /** The starter with a line contactor that nothing is known of. */
  public static Starter withoutLineRatings(String name) {
    return starter(name, Map.of());
  }

  private static Starter starter(String name, Map<String, Double> lineRatings) {
    Motor motor =
        new Motor(
            690,
            50,
            200e3,
            208,
            1478,
            of(0.86),
            of(0.945),
            of(1.0),
            of(420),
            of(285),
            of(2.8),
            none(),
            6,
            of(20),
            of(14),
            of(1800),
            of(5400),
            Optional.of(new ShortTime(600, 15)),
            Optional.of(new Motor.CircuitData(0.030, 0.183, 4.795, 0.0298, 0.183, 1.568)));
    ResistorBank bank =
        new ResistorBank(
            ResistorBank.Connection.STAR,
            ResistorBank.CutOut.STAR_POINT,
            List.of(
                section(0.1845, 130, 600, 15),
                section(0.0930, 175, 760, 16),
                section(0.0469, 175, 760, 16),
                section(0.0237, 175, 760, 16),
                section(0.0119, 175, 760, 16)),
            true,
            0,
            0,
            0.10,
            0.20,
            1200);
    double[] after = {4.2, 2.4, 1.4, 0.9, 0.7};
    List<Step> steps = new ArrayList<>();
    List<Contactor> contactors = new ArrayList<>();
    contactors.add(
        new Contactor(
            "K1",
            Contactor.Place.LINE,
            lineRatings,
            of(690),
            Optional.empty(),
            none(),
            none(),
            Optional.empty(),
            0.06,
            0.06,
            Optional.empty()));
    for (int k = 1; k <= after.length; k++) {
      steps.add(new Step("K1" + k, new Step.After(after[k - 1]), 0));
      contactors.add(
          new Contactor(
              "K1" + k,
              Contactor.Place.ROTOR,
              Map.of(),
              of(690),
              Optional.of(Contactor.Poles.DELTA),
              of(315),
              of(315),
              Optional.of(new ShortTime(1300, 10)),
              0.06,
              0.06,
              Optional.empty()));
    }
    return new Starter(
        name,
        Starter.Practice.IEC,
        new Supply(690, 50, -0.1, 0.1, of(18e3), of(9e3)),
        motor,
        new Load(
            70,
            of(700),
            new TorqueCurve.Table(new double[] {0, 0.3, 1}, new double[] {250, 300, 450}),
            0.7,
            -0.2,
            0.2,
            false,
            0),
        bank,
        steps,
        Starter.Sequence.CHAINED,
        0.05,
        0.10,
        contactors,
        List.of(new Breaker("Q1", of(25e3), 0.05)),
        devices(),
        Optional.of(new Conductor(120, Conductor.Metal.COPPER, "XLPE", of(280))),
        Optional.of(new Conductor(150, Conductor.Metal.COPPER, "XLPE", of(340))),
        new Duty(2, 1, of(4), 0, Optional.empty(), Optional.empty()),
        new Limits(of(650), none(), none()),
        Map.of("trip/start", 1.15),
        0.65,
        new Interlocks(true, true),
        new Ambient(40, 35),
        Map.of("load.inertia", EvidenceGrade.ESTIMATED),
        List.of(),
        List.of(
            new Assumption("resistors.enclosure", "20 min"),
            new Assumption("protection.F2.dial-means", "full-load")),
        List.of("conductors"));
  }

  private static List<Device> devices() {
    InverseLaw very =
        new InverseLaw(
            "iec-very-inverse", "very inverse", 13.5, 1, 0, none(), "IEC 60255-151", "verified");
    TripClass ten =
        new TripClass("10", 7.2, of(4), 10, of(240), "IEC 60947-4-1, table 2", "verified");
    Device.Accuracy accuracy = new Device.Accuracy(0.05, 0.075);
    return List.of(
        new Device.Overload(fitting("F2", "K1"), ten, 208, Device.DialMeans.FULL_LOAD, false, true),
        new Device.InverseTime(
            fitting("F3", "Q1"),
            very,
            265,
            0.25,
            Optional.of(new Device.CurrentTransformer(300, 5)),
            accuracy,
            Device.Reset.BY_EDGE,
            none()),
        new Device.SequenceTimer(fitting("F5", "K1"), 13, none()));
  }

  private static Fitting fitting(String tag, String trips) {
    return new Fitting(tag, Place.STATOR, Optional.of(trips), Measurement.DIRECT);
  }

  private static Section section(double ohms, double carries, double amps, double seconds) {
    return new Section(
        ohms, of(carries), Optional.of(new ShortTime(amps, seconds)), none(), none());
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }

  private static OptionalDouble none() {
    return OptionalDouble.empty();
  }
}
