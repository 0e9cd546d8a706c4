package sliprung.protection;

import java.util.List;
import java.util.function.DoubleFunction;
import sliprung.curve.ThermalLaw;
import sliprung.curve.TripClass;
import sliprung.curve.TripClassBounds;
import sliprung.starter.Device;

/**
 * The relays that an overload's trip class, dial and ambient allow.
 *
 * <p>Ultimate trip currents as multiples of the setting (IEC 60947-4-1, table 3, from memory):
 * compensated 1.05 to 1.20 at 20 °C, from 1.00 at 40 °C, up to 1.30 at −5 °C. The table gives these
 * points and nothing between them: above 20 °C the earliest relay counts as at 40 °C, below 20 °C
 * the latest as at −5 °C, each on its safe side. Not compensated 1.0 to 1.2 at 40 °C; elsewhere the
 * strip has the difference of temperature to make up by current, with a rise of {@value
 * #STRIP_RISE_KELVIN} K at its ultimate current (assumed on the low side: a smaller rise widens the
 * band). NEMA classes trip ultimately at 1.00 to 1.25.
 *
 * <p>A dial that gives the ultimate trip current itself stands for a setting 1.125 times smaller,
 * the middle of the compensated band: an ultimate trip from 0.93 to 1.07 of the dial.
 */
final class OverloadRelays {
  static final double STRIP_RISE_KELVIN = 60.0;
  private static final double MIDDLE_PICK_UP = 1.125;

  /** Air at which the ultimate trip currents of a compensated relay are stated, °C. */
  private static final double REFERENCE_CELSIUS = 20.0;

  private final TripClass tripClass;
  private final double settingAmps;
  private final double least;
  private final double greatest;

  OverloadRelays(Device.Overload device, double panelCelsius) {
    this.tripClass = device.tripClass();
    this.settingAmps =
        device.dialMeans() == Device.DialMeans.ULTIMATE_TRIP
            ? device.dialAmps() / MIDDLE_PICK_UP
            : device.dialAmps();
    boolean nema = tripClass.warmLimitSeconds().isEmpty() && tripClass.multiple() < 7.0;
    if (!device.compensated()) {
      double shift =
          Math.sqrt(Math.max(0.05, (STRIP_RISE_KELVIN + 40.0 - panelCelsius) / STRIP_RISE_KELVIN));
      this.least = Math.min(1.0, shift);
      this.greatest = (nema ? 1.25 : 1.20) * Math.max(1.0, shift);
    } else {
      this.least = nema || panelCelsius > REFERENCE_CELSIUS ? 1.00 : 1.05;
      this.greatest = panelCelsius < REFERENCE_CELSIUS ? 1.30 : nema ? 1.25 : 1.20;
    }
  }

  /** Least ultimate trip current, A. */
  double leastPickUpAmps() {
    return least * settingAmps;
  }

  /** Greatest ultimate trip current, A. */
  double greatestPickUpAmps() {
    return greatest * settingAmps;
  }

  /** Whether the class has a shortest time, without which it has no fast edge and no middle. */
  boolean hasShortestTime() {
    return tripClass.shortestSeconds().isPresent();
  }

  /**
   * The earliest of three compliant relays, each started at the least ultimate trip current and
   * passing the class's shortest time from cold: one body; plain I²t above the pick-up; a heater
   * with lag and a strip.
   */
  DoubleFunction<Meter> fast() {
    double shortest = tripClass.shortestSeconds().orElseThrow();
    double multiple = tripClass.multiple();
    double pickUp = leastPickUpAmps();
    double tau = ThermalLaw.timeConstant(shortest, multiple, least);
    double joule = multiple * multiple * settingAmps * settingAmps * shortest;
    double lag = TripClassBounds.heaterLag(shortest);
    double strip = TripClassBounds.stripTimeConstant(shortest, multiple, least, lag);
    return before -> {
      double level = square(before / pickUp);
      return new EarliestMeter(
          List.of(
              new FirstOrderMeter(pickUp, tau, level),
              new AccumulatingMeter(i -> i > pickUp ? i * i / joule : 0.0, level, pickUp),
              new TwoBodyMeter(pickUp, lag, strip, level)));
    };
  }

  /** One body in the middle of the class. */
  DoubleFunction<Meter> middle() {
    double seconds =
        Math.sqrt(tripClass.shortestSeconds().orElseThrow() * tripClass.longestSeconds());
    double tau = ThermalLaw.timeConstant(seconds, tripClass.multiple(), MIDDLE_PICK_UP);
    double pickUp = MIDDLE_PICK_UP * settingAmps;
    return before -> new FirstOrderMeter(pickUp, tau, square(before / pickUp));
  }

  /** One body at the greatest ultimate trip current, with the slowest constant at each current. */
  DoubleFunction<Meter> slow() {
    double pickUp = greatestPickUpAmps();
    return before ->
        new FirstOrderMeter(
            pickUp,
            amps -> TripClassBounds.slowTimeConstant(tripClass, greatest, amps / settingAmps),
            square(before / pickUp));
  }

  private static double square(double x) {
    return x * x;
  }
}
