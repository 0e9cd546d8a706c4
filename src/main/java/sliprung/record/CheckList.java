package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.quantity.Show;
import sliprung.review.Review;
import sliprung.review.StepReadings;
import sliprung.rulebook.ComputedStart;
import sliprung.starter.Device;
import sliprung.starter.Motor;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.starter.Step;

/** What is tested before and during a first start, in the order of the work. */
final class CheckList {
  private static final String DEAD = "Isolated, locked, proved dead on both sides";
  private static final String CONTROL = "Control voltage on, power isolated";
  private static final String POWER = "Power on, load off or light";
  private static final String START = "First start on its load";

  private final Review review;
  private final Starter starter;
  private final String line;
  private final List<Item> items = new ArrayList<>();

  private CheckList(Review review) {
    this.review = review;
    this.starter = review.starter();
    this.line =
        starter.lineContactors().isEmpty()
            ? "the line contactor"
            : starter.lineContactors().get(0).tag();
  }

  /**
   * One test.
   *
   * @param state of the plant in which it is done
   * @param test what to do
   * @param expect what must be seen
   */
  record Item(String state, String test, String expect) {}

  /** The list for a starter. */
  static List<Item> of(Review review, StepReadings readings) {
    CheckList list = new CheckList(review);
    list.dead();
    list.control();
    list.power();
    list.start(readings);
    return List.copyOf(list.items);
  }

  private void add(String state, String test, String expect) {
    items.add(new Item(state, test, expect));
  }

  private void dead() {
    Motor motor = starter.motor();
    add(
        DEAD,
        "Measure stator and rings, phase to phase and to earth; brake or block the load.",
        "No voltage; the rotor cannot turn.");
    add(
        DEAD,
        "Compare the plate with the inputs.",
        Show.three(motor.powerWatts() / 1000.0)
            + "\u00a0kW, "
            + Show.volts(motor.voltage())
            + ", "
            + Show.amps(motor.current())
            + ", "
            + Math.round(motor.speedRpm())
            + "\u00a0rpm"
            + (motor.rotorVoltage().isPresent()
                ? "; rotor " + Show.volts(motor.rotorVoltage().getAsDouble())
                : "")
            + (motor.rotorCurrent().isPresent()
                ? " " + Show.amps(motor.rotorCurrent().getAsDouble())
                : "")
            + ".");
    add(
        DEAD,
        "Bank disconnected from the rings, every step contactor open: measure between each two of"
            + " its leads.",
        ohms(starter.sectionCount(), 0) + ", the three alike.");
    ResistorBank bank = starter.resistors();
    for (int k = 1; k <= starter.sectionCount(); k++) {
      String contactor = starter.steps().get(k - 1).contactor();
      boolean starPoint = bank.cutOut() == ResistorBank.CutOut.STAR_POINT;
      add(
          DEAD,
          "Close " + contactor + " by hand alone and measure the same.",
          (starPoint ? ohms(starter.sectionCount(), k) : without(k)) + ", the three alike.");
    }
    add(
        DEAD,
        "Read every dial and fuse; write it into the settings sheet before turning anything.",
        "As the sheet calls for.");
  }

  /** With the first sections out. */
  private String ohms(int sections, int out) {
    double sum = 0.0;
    for (int i = out; i < sections; i++) {
      sum += starter.resistors().sections().get(i).ohms();
    }
    return between(sum);
  }

  /** With one section bridged. */
  private String without(int section) {
    double sum = 0.0;
    for (int i = 0; i < starter.sectionCount(); i++) {
      sum += i == section - 1 ? 0.0 : starter.resistors().sections().get(i).ohms();
    }
    return between(sum);
  }

  private String between(double ohms) {
    ResistorBank bank = starter.resistors();
    double two = 2.0 * (ohms * bank.starFactor() + bank.permanentOhms());
    return two == 0.0
        ? "Next to nothing: contacts and cable only"
        : Show.three(two) + "\u00a0Ω ± " + Show.percent(bank.tolerance()) + ", cold";
  }

  private void control() {
    add(
        CONTROL,
        "Hold each step contactor closed in turn and order a start.",
        line
            + " does not close"
            + (starter.interlocks().stepsOpenBeforeLine()
                ? "."
                : ". The file declares no such interlock."));
    add(CONTROL, "Order a start and time the step contactors.", sequence());
    for (int k = 1; k <= starter.sectionCount(); k++) {
      add(
          CONTROL,
          "Keep " + starter.steps().get(k - 1).contactor() + " from closing and order a start.",
          held());
    }
    for (Device device : starter.protection()) {
      TripTest.of(starter, device).ifPresent(t -> add(CONTROL, t.test(), t.expect()));
    }
    add(
        CONTROL,
        "Interrupt the control voltage during the sequence and give it back.",
        "Everything drops out; nothing starts by itself.");
    add(CONTROL, "Operate every stop and emergency stop.", line + " opens; it stays open.");
  }

  private String sequence() {
    List<String> times = new ArrayList<>();
    for (Step step : starter.steps()) {
      if (step.rule() instanceof Step.After after) {
        double closing =
            starter.contactor(step.contactor()).map(c -> c.closingSeconds()).orElse(0.0);
        times.add(
            step.contactor() + " " + Show.seconds(after.seconds()) + " + " + Show.seconds(closing));
      } else {
        times.add(step.contactor() + " by its level: feed the level in");
      }
    }
    String from =
        starter.sequence() == Starter.Sequence.CHAINED
            ? "each after the closing before: "
            : "each after the order before (the closing time does not add up): ";
    return "In this order, "
        + from
        + String.join(", ", times)
        + "; each time ± "
        + Show.percent(starter.timerSpread())
        + ".";
  }

  /** What a timer that waits for a step does when the step fails. */
  private static Optional<String> timer(Device device) {
    String opens = device.tag() + " opens " + device.trips().orElse("nothing") + " ";
    if (device instanceof Device.SequenceTimer timer) {
      return Optional.of(opens + "after " + Show.seconds(timer.seconds()));
    }
    return device instanceof Device.StepProof proof
        ? Optional.of(opens + Show.seconds(proof.seconds()) + " after the closing before")
        : Optional.empty();
  }

  private String held() {
    List<String> timers = starter.protection().stream().flatMap(d -> timer(d).stream()).toList();
    String stops =
        starter.sequence() == Starter.Sequence.CHAINED || starter.interlocks().everyStepProven()
            ? "No later contactor closes"
            : "Later contactors still close";
    return stops
        + "; "
        + (timers.isEmpty() ? "no timer is fitted that trips" : String.join(", ", timers))
        + ".";
  }

  private void power() {
    starter
        .motor()
        .rotorVoltage()
        .ifPresent(
            volts ->
                add(
                    POWER,
                    "Rings open and the rotor at rest, rated volts for a moment: measure between"
                        + " each two rings.",
                    Show.volts(volts * starter.supply().voltage() / starter.motor().voltage())
                        + ", the three alike; the rotor does not run up."));
    add(POWER, "Switch on for a moment on step 1.", "The right direction of rotation.");
    if (starter.load().brakeSeconds() > 0.0) {
      add(
          POWER,
          "Time the brake from the closing of " + line + ".",
          "Released after "
              + Show.seconds(starter.load().brakeSeconds())
              + "; applied at once when "
              + line
              + " opens.");
    }
    if (starter.load().active()) {
      add(
          POWER,
          "Lift the load a little and stop; start again from that height.",
          "The load never runs back; the overspeed device has been proved.");
    }
  }

  private void start(StepReadings readings) {
    for (StepReadings.Step step : readings.normal()) {
      StepReadings.Reading at = step.begins();
      add(
          START,
          "Read at the beginning of step " + step.step() + ".",
          "About "
              + Show.amps(at.statorAmps())
              + " in the stator, "
              + Show.amps(at.ringAmps())
              + " in the rings, "
              + Show.rpm(at.speed())
              + ".");
    }
    add(START, "Time the run-up.", runUp());
    add(
        START,
        "Make the permitted series: "
            + starter.duty().coldStarts()
            + " in a row from cold; after running hot, "
            + starter.duty().hotStarts()
            + " in a row.",
        "No device operates.");
    add(
        START,
        "Feel for heat at joints, contactors, cables and rings after isolating and proving dead.",
        "None warmer than its neighbours.");
    add(START, "Write as-left settings; file this record.", "Sheet signed, at the panel door.");
  }

  private String runUp() {
    double slowest =
        review.starts().stream()
            .filter(s -> !s.scenario().isFault())
            .filter(s -> s.history().runUpSeconds().isPresent())
            .mapToDouble(s -> s.history().runUpSeconds().getAsDouble())
            .max()
            .orElse(Double.NaN);
    String nominal =
        review
            .start("cold")
            .map(ComputedStart::history)
            .filter(h -> h.runUpSeconds().isPresent())
            .map(h -> Show.seconds(h.runUpSeconds().getAsDouble()))
            .orElse("not reached");
    return "About "
        + nominal
        + (Double.isNaN(slowest) ? "." : "; slower than " + Show.seconds(slowest) + ": find out.");
  }
}
