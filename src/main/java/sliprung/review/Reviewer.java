package sliprung.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import sliprung.machine.Identification;
import sliprung.machine.Machine;
import sliprung.machine.NameplateIdentification;
import sliprung.protection.Bands;
import sliprung.protection.Edge;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Finding;
import sliprung.rulebook.Practice;
import sliprung.rulebook.RuleBook;
import sliprung.rulebook.catalogue.Catalogue;
import sliprung.rulebook.resistor.Restart;
import sliprung.rulebook.resistor.Restarts;
import sliprung.starter.Device;
import sliprung.starter.Motor;
import sliprung.starter.Motor.CircuitData;
import sliprung.starter.Starter;

/** Reviews a starter: computes the facts once, asks the rule book, keeps the worst answers. */
public final class Reviewer {
  private Reviewer() {}

  /**
   * Reviews. Pure: the same starter and date give the same review.
   *
   * <p>Where the plate leaves the breakdown torque open, both ends of its usual range are computed,
   * and of each rule and subject the worse answer stands.
   *
   * @param starter what to review
   * @param date at which accepted deviations are judged
   */
  public static Review review(Starter starter, LocalDate date) {
    return review(starter, date, new KnownStarts(starter));
  }

  /**
   * Reviews a starter among others that are set differently: starts that are known are not computed
   * again.
   */
  public static Review review(Starter starter, LocalDate date, KnownStarts known) {
    List<Identification> identifications = NameplateIdentification.identify(starter.motor());
    List<RuleBook.Answers> answers = new ArrayList<>();
    List<ComputedStart> starts = new ArrayList<>();
    List<Restart> restarts = new ArrayList<>();
    Machine first = null;
    RunUpMethod method = null;
    for (int i = 0; i < identifications.size(); i++) {
      Machine machine = machine(starter, identifications.get(i));
      first = first == null ? machine : first;
      String circuit = i == 0 ? "" : "circuit-" + (i + 1);
      StartComputation.Computed computed =
          new StartComputation(starter, machine, circuit, known).compute();
      method = method == null ? computed.method() : method;
      Facts facts = facts(starter, machine, identifications.get(i), computed);
      starts.addAll(facts.starts());
      restarts.addAll(Restarts.of(facts));
      answers.add(new RuleBook(Catalogue.rules()).ask(facts, date));
    }
    return new Review(
        starter,
        date,
        first,
        identifications.get(0),
        starts,
        worst(answers),
        notApplicable(answers),
        List.copyOf(Catalogue.notBuilt().keySet()),
        List.copyOf(
            new TreeSet<>(answers.stream().flatMap(a -> a.mustJudgeMissing().stream()).toList())),
        Optional.ofNullable(method),
        Restarts.latest(restarts));
  }

  /** Computes everything that rules may look at. */
  public static Facts facts(
      Starter starter, Machine machine, Identification identification, String circuit) {
    return facts(
        starter,
        machine,
        identification,
        new StartComputation(starter, machine, circuit).compute());
  }

  /**
   * What rules may look at of some starts only, once for each circuit that the plate leaves open.
   */
  public static List<Facts> facts(Starter starter, StartSelection selection) {
    List<Facts> all = new ArrayList<>();
    for (Identification identification : NameplateIdentification.identify(starter.motor())) {
      Machine machine = machine(starter, identification);
      String circuit = all.isEmpty() ? "" : "circuit-" + (all.size() + 1);
      StartComputation.Computed computed =
          new StartComputation(starter, machine, circuit).compute(selection);
      all.add(facts(starter, machine, identification, computed));
    }
    return all;
  }

  private static Facts facts(
      Starter starter,
      Machine machine,
      Identification identification,
      StartComputation.Computed computed) {
    Bands bands = new Bands(starter);
    Map<String, Double> pickUps = new HashMap<>();
    for (Device device : starter.protection()) {
      bands.pickUpAmps(device, Edge.FAST).ifPresent(a -> pickUps.put(device.tag(), a));
    }
    return new Facts(
        starter,
        Practice.named(starter.practice().name().toLowerCase(Locale.ROOT)),
        machine,
        identification,
        computed.starts(),
        computed.running(),
        pickUps,
        bands);
  }

  /** The machine at the supply's frequency: reactances go with frequency. */
  public static Machine machine(Starter starter, Identification identification) {
    Motor motor = starter.motor();
    double f = starter.supply().frequency() / motor.frequency();
    CircuitData c = identification.circuit();
    CircuitData circuit =
        new CircuitData(c.r1(), c.x1() * f, c.xm() * f, c.r2(), c.x2() * f, c.ratio());
    return new Machine(circuit, starter.supply().frequency(), motor.polePairs());
  }

  private static List<Finding> worst(List<RuleBook.Answers> answers) {
    Map<String, Finding> byQuestion = new LinkedHashMap<>();
    for (RuleBook.Answers answer : answers) {
      for (Finding finding : answer.findings()) {
        byQuestion.merge(
            finding.rule() + " " + finding.subject(),
            finding,
            (a, b) -> WORST_FIRST.compare(b, a) < 0 ? b : a);
      }
    }
    return byQuestion.values().stream().sorted(WORST_FIRST).toList();
  }

  private static final Comparator<Finding> WORST_FIRST =
      Comparator.comparing(Finding::verdict)
          .thenComparingDouble(RuleBook::relativeMargin)
          .thenComparing(Finding::rule)
          .thenComparing(Finding::subject);

  private static List<Review.NotApplicable> notApplicable(List<RuleBook.Answers> answers) {
    TreeMap<String, String> all = new TreeMap<>();
    for (RuleBook.Answers answer : answers) {
      all.putAll(answer.notApplicable());
    }
    for (RuleBook.Answers answer : answers) {
      answer.findings().forEach(f -> all.remove(f.rule()));
    }
    return all.entrySet().stream()
        .map(e -> new Review.NotApplicable(e.getKey(), e.getValue()))
        .toList();
  }
}
