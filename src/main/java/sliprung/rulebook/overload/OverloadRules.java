package sliprung.rulebook.overload;

import java.util.List;
import sliprung.rulebook.Rule;

/** The rules of this family, by name. */
public final class OverloadRules {

  /** Every one. */
  public static final List<Rule> ALL =
      List.of(
          new TheClassFitsStartAndStall(),
          new TheDialFitsTheMotor(),
          new NoOverloadIsCreditedWithTheBank());

  private OverloadRules() {}
}
