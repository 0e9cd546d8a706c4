package sliprung.protection;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.curve.AmGates;
import sliprung.curve.FuseGates;
import sliprung.curve.InverseLaw;
import sliprung.curve.PointCurve;
import sliprung.curve.TripClass;
import sliprung.starter.Device;

/** Devices for tests, on standard laws. */
final class Devices {
  static final InverseLaw STANDARD_INVERSE = law(0.14, 0.02, 0.0, OptionalDouble.empty());
  static final InverseLaw VERY_INVERSE = law(13.5, 1.0, 0.0, OptionalDouble.empty());
  static final InverseLaw EXTREMELY_INVERSE = law(80.0, 2.0, 0.0, OptionalDouble.empty());
  static final InverseLaw IEEE_VERY = law(19.61, 2.0, 0.491, OptionalDouble.of(21.6));
  static final InverseLaw IEEE_EXTREMELY = law(28.2, 2.0, 0.1217, OptionalDouble.of(29.1));

  static final TripClass CLASS_2 = new TripClass("2", 7.2, none(), 2, of(120), "", "");
  static final TripClass CLASS_10 = new TripClass("10", 7.2, of(4), 10, of(240), "", "");
  static final TripClass CLASS_20 = new TripClass("20", 7.2, of(6), 20, of(480), "", "");
  static final TripClass CLASS_30 = new TripClass("30", 7.2, of(9), 30, of(720), "", "");
  static final TripClass NEMA_20 = new TripClass("nema-20", 6.0, none(), 20, none(), "", "");

  static final FuseGates GG_250 =
      new FuseGates(250, 750, 1650, 2590, 4500, 250e3, 760e3, 312.5, 400, 10800, "IEC 60269-1", "");
  static final AmGates AM =
      new AmGates(
          List.of(new AmGates.Gate(4, 60), new AmGates.Gate(8, 0.5), new AmGates.Gate(10, 0.2)),
          List.of(
              new AmGates.Gate(6.3, 60), new AmGates.Gate(12.5, 0.5), new AmGates.Gate(19, 0.1)),
          6.3,
          "IEC 60269-1",
          "");

  static final Device.Accuracy EXACT = new Device.Accuracy(0.0, 0.0);
  static final Device.Accuracy CUSTOMARY = new Device.Accuracy(0.05, 0.075);

  private Devices() {}

  private static OptionalDouble none() {
    return OptionalDouble.empty();
  }

  private static OptionalDouble of(double value) {
    return OptionalDouble.of(value);
  }

  private static InverseLaw law(double k, double alpha, double c, OptionalDouble reset) {
    return new InverseLaw("law", "law", k, alpha, c, reset, "", "");
  }

  static Device.Fitting at(String tag, Device.Place place, String trips) {
    return new Device.Fitting(tag, place, Optional.ofNullable(trips), Device.Measurement.DIRECT);
  }

  static Device.Overload overload(String tag, TripClass tripClass, double dialAmps) {
    return new Device.Overload(
        at(tag, Device.Place.STATOR, "K1"),
        tripClass,
        dialAmps,
        Device.DialMeans.FULL_LOAD,
        false,
        true);
  }

  static Device.InverseTime inverse(InverseLaw law, double pickUpAmps, double timeMultiplier) {
    return new Device.InverseTime(
        at("INV", Device.Place.STATOR, "Q1"),
        law,
        pickUpAmps,
        timeMultiplier,
        Optional.empty(),
        CUSTOMARY,
        Device.Reset.BY_EDGE,
        OptionalDouble.empty());
  }

  static Device.Fuse gg(FuseGates gates) {
    return new Device.Fuse(
        at("F1", Device.Place.STATOR, null),
        Device.FuseClass.GG,
        gates.ratingAmps(),
        Optional.of(gates),
        Optional.empty());
  }

  static Device.Fuse am(double ratingAmps) {
    return new Device.Fuse(
        at("F1", Device.Place.STATOR, null),
        Device.FuseClass.AM,
        ratingAmps,
        Optional.empty(),
        Optional.of(AM));
  }

  static Device.SequenceTimer sequence(double seconds) {
    return new Device.SequenceTimer(
        at("SEQ", Device.Place.STATOR, "K1"), seconds, OptionalDouble.empty());
  }

  static Device.Points points(
      double ratingAmps, List<PointCurve.Point> fast, List<PointCurve.Point> slow) {
    return new Device.Points(
        at("P1", Device.Place.STATOR, "K1"), new PointCurve("points", fast, slow, ""), ratingAmps);
  }
}
