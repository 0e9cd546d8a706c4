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
    Conditions common =
        new Conditions(
            source(starter.supply(), corner.supplyPu()),
            corner
                .inside()
                .map(Corner.Inside::loadFactor)
                .orElseGet(() -> load(starter, corner.load())),
            corner
                .inside()
                .map(Corner.Inside::bankFactor)
                .orElseGet(() -> bank(starter, corner.bank())),
            timer(starter, corner.timers()),
            level(starter, corner.timers()));
    return common.withOwn(
        corner.steps().stream()
            .map(side -> new Conditions.StepFactors(timer(starter, side), level(starter, side)))
            .toList());
  }

  /** Factor on the load's torques. */
  static double load(Starter starter, Corner.LoadSide side) {
    return switch (side) {
      case LIGHT -> 1.0 + starter.load().spreadLow();
      case NOMINAL -> 1.0;
      case HEAVY -> 1.0 + starter.load().spreadHigh();
    };
  }

  /** Factor on the bank's resistances. */
  static double bank(Starter starter, Corner.Bank bank) {
    double tolerance = starter.resistors().tolerance();
    return switch (bank) {
      case NOMINAL -> 1.0;
      case LOW -> 1.0 - tolerance;
      case HIGH -> 1.0 + tolerance;
      case HOT -> (1.0 + tolerance) * (1.0 + starter.resistors().hotRise());
    };
  }

  private static double late(Corner.Timers side) {
    return switch (side) {
      case EARLY -> -1.0;
      case NOMINAL, MIXED -> 0.0;
      case LATE -> 1.0;
    };
  }

  private static double timer(Starter starter, Corner.Timers side) {
    return 1.0 + late(side) * starter.timerSpread();
  }

  private static double level(Starter starter, Corner.Timers side) {
    return 1.0 - late(side) * starter.levelSpread();
  }

  /**
   * The source at a voltage: reactance from the least fault current at and below rated voltage,
   * from the greatest above it, where the greatest currents decide. Ideal without the least.
   */
  public static Source source(Supply supply, double supplyPu) {
    double volts = supply.voltage() * supplyPu;
    if (supply.faultMinAmps().isEmpty()) {
      return new Source(volts, 0.0);
    }
    double least = supply.faultMinAmps().getAsDouble();
    double amps = supplyPu > 1.0 ? supply.faultMaxAmps().orElse(least) : least;
    return new Source(volts, Source.reactanceOf(supply.voltage(), amps));
  }
}
