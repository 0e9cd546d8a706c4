package sliprung.rulebook.overload;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import sliprung.machine.OperatingPoint;
import sliprung.protection.Edge;
import sliprung.quantity.Show;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.FindingBuilder;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Rule;
import sliprung.starter.Device;
import sliprung.starter.Motor;
import sliprung.starter.Starter;

/**
 * {@code overload/dial}: the current at which an overload relay trips in the end, held against the
 * motor.
 *
 * <p>Under {@code iec} the ultimate trip is at most 1.20 times rated current times service factor,
 * which a dial at rated current gives; up to 5 % above that it is tight. Margin: 1.05 times that
 * limit over the ultimate trip, wanted 1.05. Under {@code nec} the ultimate trip is at most the
 * share of nameplate current of NFPA 70 430.32(A)(1), and where the motor will not start or carry
 * its load that of 430.32(C). Margin: the share of (C) over the ultimate trip, wanted the share of
 * (C) over that of (A)(1): in between it is tight.
 *
 * <p>A relay whose least trip lies under the current that the drive really needs is tight: it trips
 * in service. What is needed: rated current, or the greatest running current if that is less.
 */
public final class TheDialFitsTheMotor implements Rule {
  /** A dial at exactly the limit shall not fail by rounding. */
  private static final double ROUNDING = 1e-9;

  private static final double HORSEPOWER_WATTS = 745.7;

  private static final Info INFO =
      new Info(
          "overload/dial",
          "At what current does the overload relay trip in the end, and may it?",
          "IEC 60947-4-1 table 3 (from memory); NFPA 70 430.32",
          List.of(
              "motor.current",
              "motor.service-factor",
              "load.running",
              "ambient.panel",
              "protection.{subject}"));

  @Override
  public Info info() {
    return INFO;
  }

  @Override
  public Answer judge(Facts facts) {
    List<Finding> findings = new ArrayList<>();
    for (Device device : facts.starter().protection()) {
      if (device instanceof Device.Overload overload) {
        findings.add(judge(facts, overload));
      }
    }
    if (findings.stream().noneMatch(f -> isInStator(facts, f))) {
      findings.add(
          facts.starter().protection().stream()
              .filter(IS_GUARD)
              .min(Comparator.comparingDouble(d -> surePickUp(facts, d)))
              .map(guard -> judgeGuard(facts, guard))
              .orElseGet(() -> unprotected(facts)));
    }
    return new Answer.Findings(findings);
  }

  /** The least constant current that surely operates a device, A; infinite where it is unknown. */
  private static double surePickUp(Facts facts, Device device) {
    return facts.bands().pickUpAmps(device, Edge.SLOW).orElse(Double.POSITIVE_INFINITY);
  }

  /**
   * Without an overload relay the device that follows the motor's current most closely stands in
   * for one, and is held against the same limits from where it surely operates.
   */
  private static Finding judgeGuard(Facts facts, Device guard) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, guard.tag());
    OptionalDouble sure = facts.bands().pickUpAmps(guard, Edge.SLOW);
    OptionalDouble first = facts.bands().pickUpAmps(guard, Edge.FAST);
    if (sure.isEmpty() || first.isEmpty()) {
      return builder.notJudged(
          List.of("protection." + guard.tag() + ".curve"),
          "No overload relay is described, and from which current "
              + guard.tag()
              + " surely operates is not known.");
    }
    double set = facts.bands().pickUpAmps(guard, Edge.MIDDLE).orElse(sure.getAsDouble());
    UltimateTrip trip =
        new UltimateTrip(
            set, sure.getAsDouble(), first.getAsDouble(), guard.tag(), Optional.empty());
    return facts.starter().practice() == Starter.Practice.NEC
        ? nec(facts, builder, trip)
        : iec(facts, builder, trip, facts.starter().motor().current(), greatestRunning(facts));
  }

  /**
   * Devices in the stator line, besides overload relays, that follow an overload of the motor and
   * open something: a fuse, by class or by its own points, opens nothing but itself.
   */
  private static final Predicate<Device> IS_GUARD =
      d ->
          d.fitting().place() == Device.Place.STATOR
              && d.trips().isPresent()
              && (d instanceof Device.Thermal
                  || d instanceof Device.InverseTime
                  || d instanceof Device.Points);

  private static boolean isInStator(Facts facts, Finding finding) {
    return facts
        .starter()
        .device(finding.subject())
        .filter(d -> d.fitting().place() == Device.Place.STATOR)
        .isPresent();
  }

  /** Fuses and elements set for short circuits see no overload; timers see no current at all. */
  private static Finding unprotected(Facts facts) {
    boolean nec = facts.starter().practice() == Starter.Practice.NEC;
    double rated = facts.starter().motor().current();
    return FindingBuilder.of(facts, INFO, "motor")
        .margin(0.0)
        .reference(
            nec
                ? "NFPA 70 430.32(A)(1)"
                : "IEC 60204-1 7.3, motors above 0.5 kW (number of the clause from memory)")
        .says(
            "Nothing in the stator line protects the motor against overload: no overload relay, no"
                + " thermal or inverse-time relay measures its "
                + Show.amps(rated)
                + ". A fuse or a short-circuit element lets a winding carry half as much again for"
                + " good.")
        .mend(
            "Fit an overload relay set to " + Show.amps(rated) + " that opens the line contactor.")
        .byMargin();
  }

  private static Finding judge(Facts facts, Device.Overload overload) {
    FindingBuilder builder = FindingBuilder.of(facts, INFO, overload.tag());
    Motor motor = facts.starter().motor();
    UltimateTrip trip = UltimateTrip.of(overload, facts);
    return switch (overload.fitting().place()) {
      case BANK ->
          builder.notJudged(
              List.of(),
              overload.tag()
                  + " trips in the end at "
                  + Show.amps(trip.mostAmps())
                  + " in the resistor leads. No limit of the motor applies there; whether it guards"
                  + " the bank, the held steps show.");
      case ROTOR ->
          motor.rotorCurrent().isPresent()
              ? iec(
                  facts, builder, trip, motor.rotorCurrent().getAsDouble(), OptionalDouble.empty())
              : builder.notJudged(
                  List.of("motor.rotor-current"),
                  overload.tag()
                      + " trips in the end at "
                      + Show.amps(trip.mostAmps())
                      + " in the rotor circuit, whose rated current is not given.");
      case STATOR ->
          facts.starter().practice() == Starter.Practice.NEC
              ? nec(facts, builder, trip)
              : iec(facts, builder, trip, motor.current(), greatestRunning(facts));
    };
  }

  private static Finding iec(
      Facts facts,
      FindingBuilder builder,
      UltimateTrip trip,
      double rated,
      OptionalDouble running) {
    double serviceFactor = facts.starter().motor().serviceFactor().orElse(1.0);
    double share =
        facts
                .practice()
                .find("overload.ultimate-trip")
                .orElseGet(() -> facts.practice().figure("overload.iec-relay.trips-by"))
                .value()
            * serviceFactor;
    double limit = share * rated;
    double above =
        facts.practice().find("overload.dial-above").map(Practice.Figure::value).orElse(1.0);
    double margin = above * snapped(limit / trip.mostAmps());
    double wanted = above * facts.wanted(INFO.name());
    builder
        .margin(margin)
        .wanted(wanted)
        .figures(trip.mostAmps(), margin < 1.0 ? above * limit : limit, "A")
        .reference("IEC 60947-4-1 table 3 (from memory)");
    String says =
        trip.sentence(rated)
            + " The limit is "
            + Show.amps(limit)
            + " ("
            + Show.ratio(share)
            + " times, for service factor "
            + Show.ratio(serviceFactor)
            + ")"
            + (above > 1.0 ? ", and " + Show.percent(above - 1.0) + " above it is the most." : ".");
    if (margin < wanted) {
      return builder
          .says(says)
          .mend("Turn it down to " + Show.amps(trip.dialFor(limit)) + ".")
          .byMargin();
    }
    return tooLow(builder, trip, rated, running, says, limit);
  }

  private static Finding nec(Facts facts, FindingBuilder builder, UltimateTrip trip) {
    Motor motor = facts.starter().motor();
    double greatest = facts.practice().figure("overload.greatest-horsepower").value();
    if (motor.powerWatts() > greatest * HORSEPOWER_WATTS) {
      return builder.notJudged(
          List.of(),
          trip.sentence(motor.current())
              + " Above "
              + Show.three(greatest)
              + " hp NFPA 70 430.32(D) asks for more than a percentage; it is not held here.");
    }
    double most = facts.practice().figure("overload.greatest-voltage").value();
    if (facts.starter().supply().voltage() > most) {
      return builder.notJudged(
          List.of(),
          trip.sentence(motor.current())
              + " Above "
              + Show.volts(most)
              + " NFPA 70 430.225 applies, which gives no percentage.");
    }
    double serviceFactor = motor.serviceFactor().orElse(1.0);
    String row = serviceFactor >= 1.15 ? "overload.service-factor-1.15" : "overload.other";
    double normal = facts.practice().figure(row).value();
    double cap = facts.practice().figure(row + ".will-not-start").value();
    double rated = motor.current();
    double margin = snapped(cap * rated / trip.mostAmps());
    double wanted = facts.wanted(INFO.name()) * cap / normal;
    String says =
        trip.sentence(rated)
            + " NFPA 70 430.32(A)(1) allows "
            + Show.amps(normal * rated)
            + " ("
            + Show.percent(normal)
            + ", "
            + (motor.serviceFactor().isPresent()
                ? "service factor " + Show.ratio(serviceFactor)
                : "no service factor given")
            + "), and (C) "
            + Show.amps(cap * rated)
            + " where it will not start or carry its load.";
    builder
        .margin(margin)
        .wanted(wanted)
        .figures(trip.mostAmps(), (margin < 1.0 ? cap : normal) * rated, "A")
        .reference("NFPA 70 430.32(A)(1) and (C)");
    if (margin < wanted * (1.0 - ROUNDING)) {
      return builder
          .says(says)
          .mend(
              "Turn it down to "
                  + Show.amps(trip.dialFor(normal * rated))
                  + "; a higher one needs the proof that the motor will not start otherwise.")
          .byMargin();
    }
    builder.margin(Math.max(margin, wanted)).wanted(wanted);
    return tooLow(builder, trip, rated, greatestRunning(facts), says, normal * rated);
  }

  private static Finding tooLow(
      FindingBuilder builder,
      UltimateTrip trip,
      double rated,
      OptionalDouble running,
      String says,
      double limit) {
    double needed = Math.min(rated, running.orElse(rated));
    if (trip.leastAmps() < needed * (1.0 - ROUNDING)) {
      return builder
          .says(
              says
                  + " The most sensitive relay trips from "
                  + Show.amps(trip.leastAmps())
                  + ", and the drive needs "
                  + Show.amps(needed)
                  + ": it trips in service.")
          .mend("Turn it up, to no more than " + Show.amps(trip.dialFor(limit)) + ".")
          .byMarginAtBestTight();
    }
    return builder.says(says).byMargin();
  }

  private static double snapped(double margin) {
    return Math.abs(margin - 1.0) < ROUNDING ? 1.0 : margin;
  }

  private static OptionalDouble greatestRunning(Facts facts) {
    return facts.running().values().stream()
        .flatMap(Optional::stream)
        .map(r -> r.point())
        .mapToDouble(OperatingPoint::statorAmps)
        .max();
  }
}
