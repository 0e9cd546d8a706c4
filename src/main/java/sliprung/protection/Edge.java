package sliprung.protection;

import java.util.Locale;

/** Which of the relays that carry the same name. */
public enum Edge {
  /** The earliest a compliant device may operate. */
  FAST,
  /** Printed, never decisive. */
  MIDDLE,
  /** The latest. */
  SLOW;

  /** As written in records. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
