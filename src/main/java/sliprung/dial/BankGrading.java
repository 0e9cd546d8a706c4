package sliprung.dial;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.numeric.LeastSquares;
import sliprung.review.Reviewer;
import sliprung.runup.Conditions;
import sliprung.runup.Scenario;
import sliprung.runup.Stage;
import sliprung.runup.StartHistory;
import sliprung.runup.StartSimulator;
import sliprung.starter.ResistorBank;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;
import sliprung.tolerance.Corners;

/**
 * Shares out a bank so that the step contactors close onto even ring currents. The whole bank keeps
 * its resistance: it sets the starting torque.
 *
 * <p>Where every step closes at the same lower current, the totals of the rotor circuit form a
 * geometric progression down to the rotor's own resistance: every current depends on resistance and
 * slip through their ratio alone. Where timers close the steps at other currents it is found
 * numerically, by the nominal start.
 */
public final class BankGrading {
  /** Greatest over least closing current up to which closings count as even. */
  static final double EVEN = 1.02;

  private static final double NOT_CLOSED = 3.0;

  private BankGrading() {}

  /**
   * Sections of a bank by the geometric progression.
   *
   * @param first whole rotor circuit on step 1, Ω per phase
   * @param last rotor circuit when all sections are out, Ω per phase: above 0, below {@code first}
   * @param sections how many
   * @return each section in the order in which it is cut out, Ω
   */
  public static double[] geometric(double first, double last, int sections) {
    if (!(last > 0.0) || !(first > last) || sections < 1) {
      throw new IllegalArgumentException("a rotor circuit that falls from first to last");
    }
    double ratio = Math.pow(last / first, 1.0 / sections);
    double[] ohms = new double[sections];
    double total = first;
    for (int k = 0; k < sections; k++) {
      ohms[k] = total * (1.0 - ratio);
      total *= ratio;
    }
    return ohms;
  }

  /**
   * A bank and what its contactors close onto in the nominal start.
   *
   * @param ohms of the sections, as connected
   * @param closingAmps ring current just after each step contactor has closed, RMS; shorter than
   *     the sections where one never closes
   */
  public record Shared(List<Double> ohms, List<Double> closingAmps) {

    /** Greatest over least closing current; empty where a step contactor never closes. */
    public OptionalDouble spread() {
      if (closingAmps.size() < ohms.size()) {
        return OptionalDouble.empty();
      }
      double most = closingAmps.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
      double least = closingAmps.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
      return OptionalDouble.of(most / least);
    }

    /** Whether the closings are even. */
    public boolean isEven() {
      return spread().isPresent() && spread().getAsDouble() <= EVEN;
    }
  }

  /**
   * What was found.
   *
   * @param today the bank as it is
   * @param ratio of one total of the rotor circuit to the one before, by the progression
   * @param geometric the bank by the progression
   * @param numeric where the progression does not give even closings: the bank with the most even
   *     ones found, steps and timers as they are
   */
  public record Graded(Shared today, double ratio, Shared geometric, Optional<Shared> numeric) {}

  /** Grades the bank of a starter; of an open breakdown torque the first circuit counts. */
  public static Graded of(Starter starter) {
    Machine machine =
        Reviewer.machine(starter, NameplateIdentification.identify(starter.motor()).get(0));
    ResistorBank bank = starter.resistors();
    double turns = machine.circuit().ratio();
    double last =
        machine.circuit().r2() / (turns * turns) + bank.permanentOhms() + bank.leadsOhms();
    double whole = bank.sections().stream().mapToDouble(ResistorBank.Section::ohms).sum();
    double first = last + whole * bank.starFactor();
    int n = bank.sections().size();
    double[] star = geometric(first, last, n);
    double[] graded = Arrays.stream(star).map(r -> r / bank.starFactor()).toArray();

    double[] asIs = bank.sections().stream().mapToDouble(ResistorBank.Section::ohms).toArray();
    Shared today = shared(starter, machine, asIs);
    Shared geometric = shared(starter, machine, graded);
    Optional<Shared> numeric =
        geometric.isEven() || n < 2
            ? Optional.empty()
            : Optional.of(shared(starter, machine, numeric(starter, machine, graded, whole)));
    return new Graded(today, Math.pow(last / first, 1.0 / n), geometric, numeric);
  }

  private static double[] numeric(Starter starter, Machine machine, double[] from, double whole) {
    int n = from.length;
    double[] start = new double[n - 1];
    for (int i = 0; i < n - 1; i++) {
      start[i] = Math.log(from[i] / from[n - 1]);
    }
    LeastSquares.Solution found =
        LeastSquares.minimize(p -> unevenness(shared(starter, machine, ohms(p, whole)), n), start);
    return ohms(found.point(), whole);
  }

  /** Sections from the logarithms of their shares; the whole is kept. */
  private static double[] ohms(double[] logarithms, double whole) {
    double[] shares = new double[logarithms.length + 1];
    for (int i = 0; i < logarithms.length; i++) {
      shares[i] = Math.exp(Math.max(-8.0, Math.min(8.0, logarithms[i])));
    }
    shares[logarithms.length] = 1.0;
    double sum = Arrays.stream(shares).sum();
    return Arrays.stream(shares).map(s -> whole * s / sum).toArray();
  }

  private static double[] unevenness(Shared shared, int sections) {
    double[] residuals = new double[sections];
    Arrays.fill(residuals, NOT_CLOSED);
    double mean = shared.closingAmps().stream().mapToDouble(Math::log).average().orElse(0.0);
    for (int i = 0; i < shared.closingAmps().size(); i++) {
      residuals[i] = Math.log(shared.closingAmps().get(i)) - mean;
    }
    return residuals;
  }

  private static Shared shared(Starter starter, Machine machine, double[] ohms) {
    Starter with = starter.withResistors(bank(starter.resistors(), ohms));
    Conditions nominal = Corners.conditions(with, Corner.NOMINAL);
    StartHistory start = new StartSimulator(with, machine).run(Scenario.PERMITTED, nominal);
    List<Double> closings = new ArrayList<>();
    for (Stage stage : start.stages()) {
      if (with.steps().stream().anyMatch(s -> s.contactor().equals(stage.closedBy()))) {
        closings.add(stage.entry().ringAmps());
      }
    }
    return new Shared(Arrays.stream(ohms).boxed().toList(), closings);
  }

  private static ResistorBank bank(ResistorBank bank, double[] ohms) {
    List<ResistorBank.Section> sections = new ArrayList<>();
    for (int i = 0; i < ohms.length; i++) {
      ResistorBank.Section s = bank.sections().get(i);
      sections.add(
          new ResistorBank.Section(
              ohms[i],
              s.continuousAmps(),
              s.shortTime(),
              s.continuousRiseKelvin(),
              s.shortTimeRiseKelvin()));
    }
    return new ResistorBank(
        bank.connection(),
        bank.cutOut(),
        sections,
        bank.sameLimit(),
        bank.permanentOhms(),
        bank.leadsOhms(),
        bank.tolerance(),
        bank.hotRise(),
        bank.enclosureSeconds());
  }
}
