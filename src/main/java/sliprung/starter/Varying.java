package sliprung.starter;

import java.util.Locale;

/** What differs from one start to the next, or is not known exactly. */
public enum Varying {
  /** Voltage, over the supply's band. */
  VOLTAGE,
  /** Starting, running and breakaway torque, over the load's spread. */
  LOAD,
  /** Resistance of the cold bank, over its tolerance. */
  BANK,
  /** How hot the bank is, from cold to its full hot rise. */
  HEAT,
  /** Each step timer, over the spread of timers. */
  TIMERS,
  /** Each level, over the spread of levels. */
  LEVELS,
  /** Inertia of motor and load, over what its evidence grade leaves open. */
  INERTIA;

  /** As written in a starter file. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
