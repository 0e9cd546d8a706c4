package sliprung.starter;

import java.util.Locale;

/** How well an input is known, best first. */
public enum EvidenceGrade {
  MEASURED,
  REPORT,
  PLATE,
  DRAWING,
  TOLD,
  ESTIMATED;

  /** As written in a starter file. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
