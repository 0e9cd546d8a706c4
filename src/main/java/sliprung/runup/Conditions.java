package sliprung.runup;

import sliprung.machine.Source;

/**
 * The circumstances of one start.
 *
 * @param source voltage and reactance
 * @param loadFactor on starting, running and breakaway torque
 * @param bankFactor on every resistance of the bank (sections and permanent)
 * @param timerFactor on every step timer
 * @param levelFactor on every level (above 1: earlier)
 */
public record Conditions(
    Source source, double loadFactor, double bankFactor, double timerFactor, double levelFactor) {}
