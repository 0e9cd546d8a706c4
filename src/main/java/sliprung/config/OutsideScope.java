package sliprung.config;

import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** Equipment that this format does not describe, refused by name instead of as a typing mistake. */
final class OutsideScope {
  private static final String LIQUID =
      "a liquid or liquid-vapour starter changes its resistance without steps and is not described"
          + " by this format: expected a bank of metal sections but found ";
  private static final String UNBALANCED =
      "resistance that differs from phase to phase (unbalanced stepping) is not computed: expected"
          + " the same resistance in all phases but found ";
  private static final String CONVERTER =
      "a converter in the rotor circuit is not described by this format: expected a bank of metal"
          + " sections but found ";

  private static final Map<String, String> WORDS =
      Map.ofEntries(
          Map.entry("liquid", LIQUID),
          Map.entry("liquid-vapour", LIQUID),
          Map.entry("liquid-vapor", LIQUID),
          Map.entry("liquid-starter", LIQUID),
          Map.entry("liquid-rheostat", LIQUID),
          Map.entry("electrolyte", LIQUID),
          Map.entry("electrodes", LIQUID),
          Map.entry("unbalanced", UNBALANCED),
          Map.entry("unbalance", UNBALANCED),
          Map.entry("unbalanced-stepping", UNBALANCED),
          Map.entry("per-phase", UNBALANCED),
          Map.entry("phases", UNBALANCED),
          Map.entry("phase-a", UNBALANCED),
          Map.entry("phase-b", UNBALANCED),
          Map.entry("phase-c", UNBALANCED),
          Map.entry("asymmetrical", UNBALANCED),
          Map.entry("slip-recovery", CONVERTER),
          Map.entry("converter", CONVERTER));

  private OutsideScope() {}

  /** A sentence of its own for such a word. */
  static Optional<String> sentence(String word) {
    String plain = word.toLowerCase(Locale.ROOT).replaceAll("[_\\s]", "-");
    return Optional.ofNullable(WORDS.get(plain)).map(s -> s + "'" + Wording.clip(word) + "'");
  }
}
