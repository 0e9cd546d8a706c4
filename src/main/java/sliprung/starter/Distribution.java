package sliprung.starter;

import java.util.Locale;

/** How a value is distributed over its spread. */
public enum Distribution {
  /** Everywhere alike. */
  UNIFORM,
  /** Most in the middle, none at the ends. */
  TRIANGULAR,
  /** Normal about the middle, cut at the ends of the spread, which lie two deviations away. */
  NORMAL;

  /** As written in a starter file. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
