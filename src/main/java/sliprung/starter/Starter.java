package sliprung.starter;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.IntStream;

/**
 * One rotor-resistance starter as described by its user.
 *
 * @param name tag shown on every page
 * @param practice rule book, iec or nec
 * @param supply source
 * @param motor plate and limits
 * @param load driven machine
 * @param resistors rotor bank
 * @param steps what cuts out each section, in order; one entry a section
 * @param sequence how the step timers are started
 * @param timerSpread of every timer, per unit
 * @param levelSpread of every level, per unit
 * @param contactors by tag, in the file's order
 * @param breakers by tag, in the file's order
 * @param protection devices, in the file's order
 * @param statorConductor cable to the stator
 * @param rotorConductor cable from the rings to the bank
 * @param duty starts and how often
 * @param limits what the plant asks for
 * @param margins wanted margins of the user's own, by rule
 * @param fuseWear share K of the pre-arcing current that a start may use, per unit
 * @param interlocks declared interlocks
 * @param ambient air temperatures
 * @param evidence how well an input is known, by its path in the file
 * @param accepted deviations someone answers for
 * @param assumptions defaults that were filled in
 * @param notYetJudged keys that were read and are kept for rules not built yet
 * @param method how starts are computed
 * @param dialScales scales of real dials, by the dial's name such as {@code protection.F2.dial}
 * @param distributions how what varies from start to start is spread; one that is not named lies
 *     anywhere in its spread with the same chance
 * @param readings of one real start; they tell what to measure, never a verdict
 */
public record Starter(
    String name,
    Practice practice,
    Supply supply,
    Motor motor,
    Load load,
    ResistorBank resistors,
    List<Step> steps,
    Sequence sequence,
    double timerSpread,
    double levelSpread,
    List<Contactor> contactors,
    List<Breaker> breakers,
    List<Device> protection,
    Optional<Conductor> statorConductor,
    Optional<Conductor> rotorConductor,
    Duty duty,
    Limits limits,
    Map<String, Double> margins,
    double fuseWear,
    Interlocks interlocks,
    Ambient ambient,
    Map<String, EvidenceGrade> evidence,
    List<AcceptedDeviation> accepted,
    List<Assumption> assumptions,
    List<String> notYetJudged,
    Method method,
    Map<String, DialScale> dialScales,
    Map<Varying, Distribution> distributions,
    Optional<Readings> readings) {

  /** The rule book a starter is held against. */
  public enum Practice {
    IEC,
    NEC
  }

  /** Who starts whose timer. */
  public enum Sequence {
    /** A step's timer starts when the step before has closed. */
    CHAINED,
    /** A step's timer starts when the timer before has elapsed. */
    CASCADED
  }

  /** How starts are computed. */
  public enum Method {
    /** Currents and torque follow the speed at once. */
    STEADY,
    /** With the electrical transient of every closing. */
    TRANSIENT,
    /** Steady where that is accurate enough for this starter. */
    AUTO;

    /** As written in files and records. */
    public String word() {
      return name().toLowerCase(Locale.ROOT);
    }
  }

  /** A starter whose method is left to the review. */
  public Starter(
      String name,
      Practice practice,
      Supply supply,
      Motor motor,
      Load load,
      ResistorBank resistors,
      List<Step> steps,
      Sequence sequence,
      double timerSpread,
      double levelSpread,
      List<Contactor> contactors,
      List<Breaker> breakers,
      List<Device> protection,
      Optional<Conductor> statorConductor,
      Optional<Conductor> rotorConductor,
      Duty duty,
      Limits limits,
      Map<String, Double> margins,
      double fuseWear,
      Interlocks interlocks,
      Ambient ambient,
      Map<String, EvidenceGrade> evidence,
      List<AcceptedDeviation> accepted,
      List<Assumption> assumptions,
      List<String> notYetJudged) {
    this(
        name,
        practice,
        supply,
        motor,
        load,
        resistors,
        steps,
        sequence,
        timerSpread,
        levelSpread,
        contactors,
        breakers,
        protection,
        statorConductor,
        rotorConductor,
        duty,
        limits,
        margins,
        fuseWear,
        interlocks,
        ambient,
        evidence,
        accepted,
        assumptions,
        notYetJudged,
        Method.AUTO);
  }

  /** A starter of whose dials no scale is declared. */
  public Starter(
      String name,
      Practice practice,
      Supply supply,
      Motor motor,
      Load load,
      ResistorBank resistors,
      List<Step> steps,
      Sequence sequence,
      double timerSpread,
      double levelSpread,
      List<Contactor> contactors,
      List<Breaker> breakers,
      List<Device> protection,
      Optional<Conductor> statorConductor,
      Optional<Conductor> rotorConductor,
      Duty duty,
      Limits limits,
      Map<String, Double> margins,
      double fuseWear,
      Interlocks interlocks,
      Ambient ambient,
      Map<String, EvidenceGrade> evidence,
      List<AcceptedDeviation> accepted,
      List<Assumption> assumptions,
      List<String> notYetJudged,
      Method method) {
    this(
        name,
        practice,
        supply,
        motor,
        load,
        resistors,
        steps,
        sequence,
        timerSpread,
        levelSpread,
        contactors,
        breakers,
        protection,
        statorConductor,
        rotorConductor,
        duty,
        limits,
        margins,
        fuseWear,
        interlocks,
        ambient,
        evidence,
        accepted,
        assumptions,
        notYetJudged,
        method,
        Map.of(),
        Map.of(),
        Optional.empty());
  }

  /** Copies the collections and checks that each section has its step. */
  public Starter {
    steps = List.copyOf(steps);
    contactors = List.copyOf(contactors);
    breakers = List.copyOf(breakers);
    protection = List.copyOf(protection);
    margins = new TreeMap<>(margins);
    evidence = new TreeMap<>(evidence);
    accepted = List.copyOf(accepted);
    assumptions = List.copyOf(assumptions);
    notYetJudged = List.copyOf(notYetJudged);
    dialScales = new TreeMap<>(dialScales);
    distributions = new TreeMap<>(distributions);
    if (steps.size() != resistors.sections().size()) {
      throw new IllegalArgumentException(
          steps.size() + " steps for " + resistors.sections().size() + " sections");
    }
  }

  /** The contactor of that tag. */
  public Optional<Contactor> contactor(String tag) {
    return contactors.stream().filter(c -> c.tag().equals(tag)).findFirst();
  }

  /** The breaker of that tag. */
  public Optional<Breaker> breaker(String tag) {
    return breakers.stream().filter(b -> b.tag().equals(tag)).findFirst();
  }

  /** The device of that tag. */
  public Optional<Device> device(String tag) {
    return protection.stream().filter(d -> d.tag().equals(tag)).findFirst();
  }

  /** The contactors that close the stator, usually one. */
  public List<Contactor> lineContactors() {
    return contactors.stream().filter(c -> c.place() == Contactor.Place.LINE).toList();
  }

  /**
   * Opening time in seconds of a contactor or breaker: the time from the order to the parting of
   * its main contacts; empty where nothing of that tag is described.
   */
  public OptionalDouble openingSeconds(String tag) {
    Optional<Contactor> contactor = contactor(tag);
    if (contactor.isPresent()) {
      return OptionalDouble.of(contactor.get().openingSeconds());
    }
    Optional<Breaker> breaker = breaker(tag);
    return breaker.isPresent()
        ? OptionalDouble.of(breaker.get().openingSeconds())
        : OptionalDouble.empty();
  }

  /**
   * Whether a step contactor carries ring current while those sections are in circuit. A bridging
   * one carries as long as its section is out; one that makes the star point only until a later one
   * has taken over.
   *
   * @param contactor tag
   * @param sectionsIn numbers from 1
   */
  public boolean carriesRingCurrent(String contactor, List<Integer> sectionsIn) {
    List<Integer> cutsOut =
        IntStream.rangeClosed(1, steps.size())
            .filter(k -> steps.get(k - 1).contactor().equals(contactor))
            .boxed()
            .toList();
    if (resistors.cutOut() == ResistorBank.CutOut.BRIDGING) {
      return cutsOut.stream().anyMatch(k -> !sectionsIn.contains(k));
    }
    int starPoint =
        sectionsIn.stream().mapToInt(Integer::intValue).min().orElse(sectionCount() + 1) - 1;
    return cutsOut.contains(starPoint);
  }

  /** Number of sections of the bank. */
  public int sectionCount() {
    return resistors.sections().size();
  }

  /** The same starter with other devices. */
  public Starter withProtection(List<Device> devices) {
    return with(supply, motor, load, resistors, steps, devices);
  }

  /** The same starter with other steps, as many. */
  public Starter withSteps(List<Step> others) {
    return with(supply, motor, load, resistors, others, protection);
  }

  /** The same starter with another bank of as many sections. */
  public Starter withResistors(ResistorBank bank) {
    return with(supply, motor, load, bank, steps, protection);
  }

  /** The same starter with another motor. */
  public Starter withMotor(Motor other) {
    return with(supply, other, load, resistors, steps, protection);
  }

  /** The same starter on another source. */
  public Starter withSupply(Supply other) {
    return with(other, motor, load, resistors, steps, protection);
  }

  /** The same starter with another load. */
  public Starter withLoad(Load other) {
    return with(supply, motor, other, resistors, steps, protection);
  }

  private Starter with(
      Supply source,
      Motor machine,
      Load driven,
      ResistorBank bank,
      List<Step> ofSteps,
      List<Device> devices) {
    return new Starter(
        name,
        practice,
        source,
        machine,
        driven,
        bank,
        ofSteps,
        sequence,
        timerSpread,
        levelSpread,
        contactors,
        breakers,
        devices,
        statorConductor,
        rotorConductor,
        duty,
        limits,
        margins,
        fuseWear,
        interlocks,
        ambient,
        evidence,
        accepted,
        assumptions,
        notYetJudged,
        method,
        dialScales,
        distributions,
        readings);
  }
}
