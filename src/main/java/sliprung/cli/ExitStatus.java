package sliprung.cli;

import java.util.List;

/** What the program answers to a script. */
final class ExitStatus {
  static final int CLEAR = 0;
  static final int BREACH = 1;
  static final int WRONG_INPUT = 2;
  static final int DEFECT = 3;
  static final int NOT_JUDGED = 4;

  private static final List<Integer> WORST_FIRST =
      List.of(DEFECT, WRONG_INPUT, BREACH, NOT_JUDGED, CLEAR);

  private ExitStatus() {}

  /** The worse of two. */
  static int worse(int one, int other) {
    return WORST_FIRST.indexOf(one) <= WORST_FIRST.indexOf(other) ? one : other;
  }
}
