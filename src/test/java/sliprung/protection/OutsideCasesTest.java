package sliprung.protection;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.TestFactory;
import sliprung.config.CurveLibraryReader;
import sliprung.curve.CurveLibrary;
import sliprung.curve.FuseGates;
import sliprung.curve.GgBounds;
import sliprung.curve.InverseLaw;
import sliprung.curve.PointCurve;
import sliprung.curve.PointEdge;
import sliprung.curve.ThermalLaw;
import sliprung.curve.TripClass;
import sliprung.outside.OutsideTable;
import sliprung.outside.OutsideTable.Row;
import sliprung.starter.Conductor;
import sliprung.starter.Device;

/** Laws and elements against standards, textbooks and independently computed cases. */
@Tag("outside")
class OutsideCasesTest {
  private static final CurveLibrary LIBRARY = CurveLibraryReader.builtIn();

  private static InverseLaw law(Row row) {
    return LIBRARY.inverseLaw(row.text("law") + "-inverse").orElseThrow();
  }

  @TestFactory
  Stream<DynamicTest> inverse_time_laws() {
    return OutsideTable.read("inverse-time")
        .tests(
            row -> {
              InverseLaw law = law(row);
              double multiple = row.number("multiple");
              double timeMultiplier = row.number("time_multiplier");
              double seconds =
                  row.text("quantity").equals("reset")
                      ? law.fullResetSeconds(multiple, timeMultiplier).orElseThrow()
                      : law.seconds(multiple, timeMultiplier);
              check(row, seconds);
            });
  }

  @TestFactory
  Stream<DynamicTest> inverse_time_relays_under_varying_current() {
    return OutsideTable.read("inverse-dynamic")
        .tests(
            row -> {
              Device.InverseTime relay =
                  new Device.InverseTime(
                      Devices.at("51", Device.Place.STATOR, "Q1"),
                      law(row),
                      100.0,
                      1.0,
                      java.util.Optional.empty(),
                      Devices.EXACT,
                      Device.Reset.valueOf(row.text("reset").toUpperCase(java.util.Locale.ROOT)),
                      OptionalDouble.empty());
              InverseTimeEdge edge = new InverseTimeEdge(relay, Edge.MIDDLE);
              AccumulatingMeter meter = new AccumulatingMeter(edge::rate, 0.0, edge.breaks());
              double at = 0.0;
              double trips = Double.POSITIVE_INFINITY;
              for (Piece piece : profile(row.text("profile"))) {
                double offset = meter.advance(piece);
                trips = Math.min(trips, at + offset);
                at += piece.seconds();
              }
              check(row, row.text("quantity").equals("trip") ? trips : meter.level());
            });
  }

  private static List<Piece> profile(String text) {
    List<Piece> pieces = new java.util.ArrayList<>();
    if (text.equals("decay")) {
      for (int i = 0; i < 100; i++) {
        double t = 0.1 * i;
        pieces.add(
            new Piece(0.1, 600 - 50 * t, 600 - 50 * (t + 0.05), 600 - 50 * (t + 0.1), false));
      }
      return pieces;
    }
    for (String step : text.split(";")) {
      String[] cell = step.split(":");
      pieces.add(Piece.constant(Double.parseDouble(cell[1]), 100.0 * Double.parseDouble(cell[0])));
    }
    return pieces;
  }

  @TestFactory
  Stream<DynamicTest> thermal_relays_in_closed_form_and_in_pieces() {
    return OutsideTable.read("thermal-relay")
        .tests(
            row -> {
              double tau = row.number("tau_s");
              double reference = row.number("k");
              double amps = row.number("amps");
              double earlier = row.number("earlier_amps");
              check(row, ThermalLaw.seconds(tau, amps, reference, earlier));

              double share = earlier / reference;
              FirstOrderMeter meter = new FirstOrderMeter(reference, tau, share * share);
              double step = row.number("expected") / 7.3;
              double at = 0.0;
              double trips = Double.POSITIVE_INFINITY;
              while (Double.isInfinite(trips)) {
                trips = at + meter.advance(Piece.constant(step, amps));
                at += step;
              }
              check(row, trips);
            });
  }

  @TestFactory
  Stream<DynamicTest> one_body_fits_of_trip_classes() {
    return OutsideTable.read("trip-class-fit")
        .tests(
            row ->
                check(
                    row,
                    ThermalLaw.timeConstant(
                        row.number("seconds"),
                        row.number("multiple"),
                        row.number("pick_up"),
                        row.number("earlier"))));
  }

  @TestFactory
  Stream<DynamicTest> cold_trip_times_at_the_ends_of_a_trip_class() {
    return OutsideTable.read("trip-class-range")
        .tests(
            row -> {
              TripClass tripClass = LIBRARY.tripClass(row.text("class")).orElseThrow();
              OverloadRelays relays =
                  new OverloadRelays(Devices.overload("F2", tripClass, 100), 20.0);
              Meter meter =
                  row.text("edge").equals("fast") ? relays.fast().apply(0) : relays.slow().apply(0);
              double trips = meter.advance(Piece.constant(1000, 100 * row.number("multiple")));
              assertThat(trips)
                  .as(row.name())
                  .isCloseTo(row.number("expected"), within(1e-6 * row.number("expected")));
            });
  }

  @TestFactory
  Stream<DynamicTest> edges_of_a_gg_fuse() {
    FuseGates gates = LIBRARY.ggGates(100).orElseThrow();
    PointEdge straight =
        new PointEdge(List.of(new PointCurve.Point(290, 10), new PointCurve.Point(820, 0.1)));
    return OutsideTable.read("gg-100")
        .tests(
            row -> {
              double amps = row.number("amps");
              double seconds =
                  switch (row.text("edge")) {
                    case "fast" -> GgBounds.fast(gates, 1.0).seconds(amps);
                    case "slow" -> GgBounds.slow(gates).seconds(amps);
                    default -> straight.seconds(amps);
                  };
              if (row.text("expected").equals("never")) {
                assertThat(seconds).as(row.name()).isInfinite();
              } else {
                check(row, seconds);
              }
            });
  }

  @TestFactory
  Stream<DynamicTest> first_order_heating_and_cooling() {
    return OutsideTable.read("first-order-heating")
        .tests(
            row -> {
              double tauOn = row.number("tau_on");
              double tauOff = row.number("tau_off");
              double end = row.number("end");
              FirstOrderMeter meter =
                  new FirstOrderMeter(1.0, amps -> amps > 0 ? tauOn : tauOff, row.number("begin"));
              double peak = 0.0;
              for (int n = 0; n < row.number("cycles"); n++) {
                meter.advance(Piece.constant(row.number("on"), Math.sqrt(end)));
                peak = meter.level();
                if (row.number("off") > 0) {
                  meter.advance(Piece.constant(row.number("off"), 0.0));
                }
              }
              check(row, row.text("quantity").equals("peak") ? peak : meter.level());
            });
  }

  @TestFactory
  Stream<DynamicTest> factor_k_of_cables() {
    return OutsideTable.read("conductor-k")
        .tests(
            row ->
                assertThat(ConductorParts.factor(cable(row)).orElseThrow())
                    .as(row.name())
                    .isEqualTo(row.number("expected")));
  }

  @TestFactory
  Stream<DynamicTest> adiabatic_withstand_of_cables() {
    return OutsideTable.read("conductor-withstand")
        .tests(
            row -> {
              Part part =
                  ConductorParts.part(
                      "stator-conductor",
                      "conductors.stator",
                      java.util.Optional.of(cable(row)),
                      Channel.stator());
              Meter meter = part.meter().apply(PartPreload.COLD);
              check(row, meter.advance(Piece.constant(100, row.number("amps"))));
            });
  }

  private static Conductor cable(Row row) {
    return new Conductor(
        row.number("area_mm2"),
        Conductor.Metal.valueOf(row.text("metal")),
        row.text("insulation"),
        OptionalDouble.of(50));
  }

  private static void check(Row row, double actual) {
    assertThat(actual)
        .as(row.name() + " (" + row.text("source") + ")")
        .isCloseTo(row.number("expected"), within(row.number("tolerance")));
  }
}
