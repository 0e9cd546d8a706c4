package sliprung.rulebook;

/** A rule's answer, worst first. */
public enum Verdict {
  BREACH("breach"),
  TIGHT("tight"),
  NOT_JUDGED("not judged"),
  ACCEPTED("accepted"),
  CLEAR("clear");

  private final String word;

  Verdict(String word) {
    this.word = word;
  }

  /** As written for people and in records. */
  public String word() {
    return word;
  }
}
