package sliprung.rulebook.data;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class DataRules {

  /** Every one; the engine itself answers {@code data/accepted} and {@code data/assumed}. */
  public static final List<Rule> ALL =
      List.of(
          new EveryCurveReachesFarEnough(),
          new ThePlateAgreesWithTheCircuit(),
          new TheInputsArePlausible());

  private DataRules() {}
}
