package sliprung.runup;

import java.util.List;
import sliprung.machine.Source;

/**
 * The circumstances of one start.
 *
 * @param source voltage and reactance
 * @param loadFactor on starting, running and breakaway torque
 * @param bankFactor on every resistance of the bank (sections and permanent)
 * @param timerFactor on every step timer
 * @param levelFactor on every level (above 1: earlier)
 * @param inertiaFactor on the inertia of motor and load together
 * @param own factors of each step in turn, in place of the common ones; empty: the common ones
 */
public record Conditions(
    Source source,
    double loadFactor,
    double bankFactor,
    double timerFactor,
    double levelFactor,
    double inertiaFactor,
    List<StepFactors> own) {

  /**
   * Factors of one step's rule.
   *
   * @param timer on its time
   * @param level on its level (above 1: earlier)
   */
  public record StepFactors(double timer, double level) {}

  /** Copies the list. */
  public Conditions {
    own = List.copyOf(own);
  }

  /** Every timer and every level alike, and the inertia as described. */
  public Conditions(
      Source source, double loadFactor, double bankFactor, double timerFactor, double levelFactor) {
    this(source, loadFactor, bankFactor, timerFactor, levelFactor, 1.0, List.of());
  }

  /** These with each step's own factors. */
  public Conditions withOwn(List<StepFactors> factors) {
    return new Conditions(
        source, loadFactor, bankFactor, timerFactor, levelFactor, inertiaFactor, factors);
  }

  /** These with another factor on the load. */
  public Conditions withLoad(double factor) {
    return new Conditions(source, factor, bankFactor, timerFactor, levelFactor, inertiaFactor, own);
  }

  /** Factor on the timer of a step, numbered from 1. */
  public double timerFactor(int step) {
    return own.isEmpty() ? timerFactor : own.get(step - 1).timer();
  }

  /** Factor on the level of a step, numbered from 1. */
  public double levelFactor(int step) {
    return own.isEmpty() ? levelFactor : own.get(step - 1).level();
  }
}
