package sliprung.rulebook.data;

import java.util.OptionalDouble;
import sliprung.machine.Source;
import sliprung.quantity.Show;
import sliprung.starter.Ambient;
import sliprung.starter.Load;
import sliprung.starter.Motor;
import sliprung.starter.Starter;
import sliprung.starter.Supply;

/** Supply, load, duty and air against the motor. */
final class DrivePlausibility {
  private DrivePlausibility() {}

  static void check(Tally tally) {
    supply(tally);
    inertia(tally);
    torque(tally);
    duty(tally);
    ambient(tally);
  }

  private static void supply(Tally tally) {
    Starter starter = tally.facts().starter();
    Supply supply = starter.supply();
    Motor motor = starter.motor();
    tally.ratio(
        "voltage",
        "supply.voltage",
        Tally.over(supply.voltage(), motor.voltage()),
        "The supply's voltage over the motor's",
        "Line to line both; a motor for two voltages has the figures of the connection in use.");
    tally.ratio(
        "frequency",
        "supply.frequency",
        Tally.over(supply.frequency(), motor.frequency()),
        "The supply's frequency over the motor's",
        "A motor of 50 Hz on 60 Hz is another motor: give the plate of the frequency in use.");
    tally.ratio(
        "fault-current",
        "supply.fault-current",
        Tally.over(supply.faultMinAmps(), supply.faultMaxAmps()),
        "The least fault current over the greatest",
        "The two are swapped.");
    Source ideal = new Source(supply.voltage(), 0.0);
    double locked = tally.facts().machine().at(ideal, lastStepOhms(starter), 1.0).statorAmps();
    tally.ratio(
        "fault-over-locked",
        "supply.fault-current.min",
        Tally.over(supply.faultMinAmps(), locked),
        "The least fault current over the motor's " + Show.amps(locked) + " with rings shorted",
        "The motor could not start from such a source: fault currents are often kA.");
  }

  private static double lastStepOhms(Starter starter) {
    return starter.resistors().permanentOhms() + starter.resistors().leadsOhms();
  }

  private static void inertia(Tally tally) {
    Starter starter = tally.facts().starter();
    double motor = starter.motor().inertia();
    double load = starter.load().inertia();
    tally.ratio(
        "inertia",
        "load.inertia",
        Tally.over(load, motor),
        "The load's inertia over the rotor's",
        "GD² is four times J, and g·cm² or lb·ft² are not kg·m²; behind a gear the load's inertia"
            + " counts by the square of the ratio.");
    double seconds =
        (motor + load)
            * starter.motor().synchronousSpeed(starter.supply().frequency())
            / starter.motor().ratedTorque();
    tally.check(
        "run-up",
        "load.inertia",
        OptionalDouble.of(seconds),
        "The time that rated torque alone would take to run up motor and load",
        Show::seconds,
        "Check both inertias: GD² is four times J.");
  }

  private static void torque(Tally tally) {
    Starter starter = tally.facts().starter();
    Load load = starter.load();
    double rated = starter.motor().ratedTorque();
    double greatest = 0.0;
    for (int percent = 0; percent <= 100; percent++) {
      greatest = Math.max(greatest, load.torque().at(percent / 100.0));
    }
    tally.ratio(
        "load-torque",
        "load.torque",
        Tally.over(greatest, rated),
        "The greatest starting torque of the load over rated torque",
        "Torque counts at the motor shaft: behind a gear it is divided by the ratio.");
    tally.ratio(
        "breakaway",
        "load.breakaway",
        Tally.over(load.breakawayTorque(), rated),
        "The breakaway torque over rated torque",
        "Torque counts at the motor shaft.");
    tally.check(
        "running",
        "load.running",
        OptionalDouble.of(load.runningShare()),
        "The running torque",
        share -> Show.percent(share) + " of rated",
        "Give it in percent of rated torque.");
  }

  private static void duty(Tally tally) {
    tally.check(
        "starts-per-hour",
        "duty.starts",
        tally.facts().starter().duty().startsPerHour(),
        "The number of starts an hour",
        Show::three,
        "More than that no bank is built for.");
  }

  private static void ambient(Tally tally) {
    Ambient ambient = tally.facts().starter().ambient();
    tally.check(
        "air",
        "ambient.motor",
        OptionalDouble.of(ambient.motorCelsius()),
        "The air around the motor",
        t -> Show.three(t) + "\u00a0°C",
        "Degrees Celsius.");
    tally.check(
        "air",
        "ambient.panel",
        OptionalDouble.of(ambient.panelCelsius()),
        "The air in the panel",
        t -> Show.three(t) + "\u00a0°C",
        "Degrees Celsius.");
  }
}
