package sliprung.starter;

import java.util.Locale;

/** How well an input is known, best first. */
public enum EvidenceGrade {
  MEASURED(0.02),
  REPORT(0.03),
  PLATE(0.05),
  DRAWING(0.05),
  TOLD(0.15),
  ESTIMATED(0.25);

  private final double spread;

  EvidenceGrade(double spread) {
    this.spread = spread;
  }

  /**
   * How far off such an input may be, per unit either way: figures of our own, to tell which input
   * to measure first, never to judge by.
   */
  public double spread() {
    return spread;
  }

  /** As written in a starter file. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
