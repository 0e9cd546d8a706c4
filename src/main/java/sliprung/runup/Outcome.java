package sliprung.runup;

/** How a start ends. */
public enum Outcome {
  RUNNING("running"),
  HELD("held"),
  LOCKED("locked"),
  RUN_BACK("run-back"),
  UNFINISHED("unfinished");

  private final String word;

  Outcome(String word) {
    this.word = word;
  }

  /** As written in records. */
  public String word() {
    return word;
  }
}
