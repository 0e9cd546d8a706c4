package sliprung.rulebook.contactor;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import sliprung.quantity.Show;
import sliprung.rulebook.BreakingCapacity;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Practice;
import sliprung.starter.Contactor;

/** What a contactor is proven for at this supply, or why that cannot be said. */
final class Ratings {
  private final List<Category> categories;
  private final Optional<Gap> gap;

  private Ratings(List<Category> categories, Optional<Gap> gap) {
    this.categories = categories;
    this.gap = gap;
  }

  /**
   * Why nothing can be said.
   *
   * @param missing paths
   * @param why in a sentence
   */
  record Gap(List<String> missing, String why) {}

  /**
   * A proven current.
   *
   * @param amps RMS
   * @param category that proves it; empty: its own test
   * @param words such as {@code AC-3: 8 × 315 A}
   */
  record Proven(double amps, Optional<Category> category, String words) {

    /** Power factor of the test; that of its own test is not known and taken as the current's. */
    double powerFactor(double current) {
      return category.map(Category::powerFactor).orElse(current);
    }
  }

  /** The ratings of a contactor in the main circuit of this starter. */
  static Ratings of(Facts facts, Contactor contactor) {
    Practice practice = facts.practice();
    String path = "contactors." + contactor.tag();
    double volts = facts.starter().supply().voltage();
    double greatest = practice.figure("contactor.greatest-voltage").value();
    if (volts > greatest) {
      return without(
          List.of(),
          contactor.tag()
              + " switches "
              + Show.volts(volts)
              + ". The categories of IEC 60947-4-1 end at "
              + Show.volts(greatest)
              + "; the figures of IEC 62271-106 are not held here.");
    }
    List<Category> categories = Category.of(contactor, practice);
    if (categories.isEmpty()) {
      return without(
          List.of(path + ".ratings"),
          contactor.tag()
              + " has no utilization category: NEMA sizes carry none, and nothing else is given."
              + " Its rated current in AC-2, AC-3 or AC-4 would let it be judged.");
    }
    if (contactor.ratedVoltage().isEmpty()) {
      return without(
          List.of(path + ".rated-voltage"),
          contactor.tag()
              + " has rated currents but no rated voltage; a rated current holds at one voltage.");
    }
    double rated = contactor.ratedVoltage().getAsDouble();
    if (rated < volts) {
      return without(
          List.of(path + ".rated-voltage"),
          contactor.tag()
              + "'s rated currents hold at "
              + Show.volts(rated)
              + ", and it switches "
              + Show.volts(volts)
              + ".");
    }
    return new Ratings(categories, Optional.empty());
  }

  /**
   * What a contactor of the main circuit is proven to break; empty where nothing proves it, see
   * {@link #gap()}.
   */
  static Optional<Proven> breaking(Facts facts, Contactor contactor) {
    Ratings ratings = of(facts, contactor);
    if (ratings.gap().isEmpty() && contactor.breakingAmps().isEmpty()) {
      return Optional.of(ratings.breaking());
    }
    return BreakingCapacity.of(facts, contactor.tag())
        .map(c -> new Proven(c.amps(), Optional.empty(), c.basis()));
  }

  private static Ratings without(List<String> missing, String why) {
    return new Ratings(List.of(), Optional.of(new Gap(missing, why)));
  }

  /** Why nothing can be said; empty where the categories hold. */
  Optional<Gap> gap() {
    return gap;
  }

  /** The categories; at least one where there is no gap. */
  List<Category> categories() {
    return categories;
  }

  /** The categories meant for motors. */
  List<Category> forMotors() {
    return categories.stream().filter(Category::isForMotors).toList();
  }

  /** Greatest current it makes now and then. */
  Proven making() {
    return greatest(Category::making);
  }

  /** Greatest current it breaks now and then. */
  Proven breaking() {
    return greatest(Category::breaking);
  }

  /** Greatest current it makes and breaks as a routine. */
  Proven routine() {
    return greatest(Category::routine);
  }

  private Proven greatest(ToDoubleFunction<Category> multiple) {
    Category best =
        categories.stream()
            .max(Comparator.comparingDouble(c -> multiple.applyAsDouble(c) * c.ratedAmps()))
            .orElseThrow();
    double factor = multiple.applyAsDouble(best);
    return new Proven(factor * best.ratedAmps(), Optional.of(best), best.words(factor));
  }
}
