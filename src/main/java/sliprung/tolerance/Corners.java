package sliprung.tolerance;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sliprung.machine.Source;
import sliprung.runup.Conditions;
import sliprung.starter.Starter;
import sliprung.starter.Supply;

/**
 * The corners of a starter, by brute force: voltage × load × bank × timers, and the nominal point
 * first. A spread of nothing gives no corner of its own.
 */
public final class Corners {
  private Corners() {}

  /** Every corner, the nominal one first, each with its conditions. */
  public static Map<Corner, Conditions> of(Starter starter) {
    Map<Corner, Conditions> corners = new LinkedHashMap<>();
    List<Conditions> seen = new ArrayList<>();
    add(corners, seen, starter, Corner.NOMINAL);
    double[] volts = {1.0 + starter.supply().bandLow(), 1.0 + starter.supply().bandHigh()};
    Corner.LoadSide[] loads = {Corner.LoadSide.LIGHT, Corner.LoadSide.HEAVY};
    Corner.Bank[] banks = {Corner.Bank.LOW, Corner.Bank.HIGH, Corner.Bank.HOT};
    Corner.Timers[] timers = {Corner.Timers.EARLY, Corner.Timers.LATE};
    for (double supply : volts) {
      for (Corner.LoadSide load : loads) {
        for (Corner.Bank bank : banks) {
          for (Corner.Timers timer : timers) {
            add(corners, seen, starter, new Corner(supply, load, bank, timer));
          }
        }
      }
    }
    return corners;
  }

  private static void add(
      Map<Corner, Conditions> corners, List<Conditions> seen, Starter starter, Corner corner) {
    Conditions conditions = conditions(starter, corner);
    if (!seen.contains(conditions)) {
      seen.add(conditions);
      corners.put(corner, conditions);
    }
  }

  /** The conditions that a corner stands for. */
  public static Conditions conditions(Starter starter, Corner corner) {
    double load =
        switch (corner.load()) {
          case LIGHT -> 1.0 + starter.load().spreadLow();
          case NOMINAL -> 1.0;
          case HEAVY -> 1.0 + starter.load().spreadHigh();
        };
    double tolerance = starter.resistors().tolerance();
    double bank =
        switch (corner.bank()) {
          case NOMINAL -> 1.0;
          case LOW -> 1.0 - tolerance;
          case HIGH -> 1.0 + tolerance;
          case HOT -> (1.0 + tolerance) * (1.0 + starter.resistors().hotRise());
        };
    double late =
        switch (corner.timers()) {
          case EARLY -> -1.0;
          case NOMINAL -> 0.0;
          case LATE -> 1.0;
        };
    return new Conditions(
        source(starter.supply(), corner.supplyPu()),
        load,
        bank,
        1.0 + late * starter.timerSpread(),
        1.0 - late * starter.levelSpread());
  }

  /**
   * The source at a voltage: reactance from the least fault current at and below rated voltage,
   * from the greatest above it, where the greatest currents decide. Ideal without the least.
   */
  private static Source source(Supply supply, double supplyPu) {
    double volts = supply.voltage() * supplyPu;
    if (supply.faultMinAmps().isEmpty()) {
      return new Source(volts, 0.0);
    }
    double least = supply.faultMinAmps().getAsDouble();
    double amps = supplyPu > 1.0 ? supply.faultMaxAmps().orElse(least) : least;
    return new Source(volts, Source.reactanceOf(supply.voltage(), amps));
  }
}
