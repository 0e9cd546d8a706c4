package sliprung.record;

import java.util.List;

/** What a reader must know before touching anything. */
final class Cautions {
  private static final List<String> CAUTIONS =
      List.of(
          "This page checks figures that somebody typed. It replaces neither tested coordination"
              + " tables nor commissioning tests nor a competent person. Local codes and licensed"
              + " practice come first, and the person who signs decides.",
          "Before any work: switch off, isolate, lock and tag, prove dead, earth, and release stored"
              + " energy (29 CFR 1910.147; NFPA 70E Article 120; EN 50110-1).",
          "An isolated stator does not make the rotor side dead. A coasting or overhauled slip-ring"
              + " motor can still drive its rings: prove both sides dead, brake or block the load.",
          "Ring voltage at standstill may exceed the line voltage; plugging brings about twice the"
              + " plate's figure.",
          "Resistors run at several hundred degrees and stay hot after isolation. Their exhaust air"
              + " burns. Keep combustible matter away and catch what may fall.",
          "A step that is missed leaves resistance in circuit: the motor crawls, the bank heats, and"
              + " an overload relay may see nothing. Fit an incomplete-sequence timer.",
          "A step contactor that has welded gives a start with little resistance. Prove every step"
              + " contactor open before the stator closes.",
          "A hoist with the rotor open or much resistance in circuit may run away. Brake and overspeed"
              + " device come first, electrical protection second.",
          "No automatic restart where people may be hurt. After loss of supply a crane drive stays"
              + " off until its controller has returned to off (29 CFR 1910.179).");

  private Cautions() {}

  static void write(Html page) {
    page.section("cautions", "Cautions");
    page.open("ul").markup("\n");
    CAUTIONS.forEach(c -> page.element("li", c));
    page.end();
    page.end();
  }
}
