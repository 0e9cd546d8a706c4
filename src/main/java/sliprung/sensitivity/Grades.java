package sliprung.sensitivity;

import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.starter.EvidenceGrade;
import sliprung.starter.Starter;

/** How well an input is known, as far as the file says. */
final class Grades {
  private final Starter starter;

  Grades(Starter starter) {
    this.starter = starter;
  }

  /**
   * The grade of an input: a default that was filled in counts as estimated; then what is stated it
   * or for what it lies in, the nearest first; then the weakest of what is stated within it; else
   * the plate for the motor and the drawing for the rest.
   *
   * @param path of the input
   * @param leaves where the input is a part of the entries of a list: last words of their paths
   */
  EvidenceGrade of(String path, String... leaves) {
    if (starter.assumptions().stream().anyMatch(a -> a.path().equals(path))) {
      return EvidenceGrade.ESTIMATED;
    }
    Map<String, EvidenceGrade> stated = starter.evidence();
    Optional<EvidenceGrade> within =
        stated.entrySet().stream()
            .filter(e -> lies(e.getKey(), path) && endsIn(e.getKey(), List.of(leaves)))
            .map(Map.Entry::getValue)
            .max(Comparator.naturalOrder());
    return within
        .or(
            () ->
                stated.entrySet().stream()
                    .filter(e -> e.getKey().equals(path) || lies(path, e.getKey()))
                    .max(Comparator.comparingInt(e -> e.getKey().length()))
                    .map(Map.Entry::getValue))
        .orElse(path.startsWith("motor.") ? EvidenceGrade.PLATE : EvidenceGrade.DRAWING);
  }

  private static boolean lies(String path, String in) {
    return path.startsWith(in + ".") || path.startsWith(in + "[");
  }

  /** Whether a path below an entry of a list is about one of these parts, or about all of them. */
  private static boolean endsIn(String path, List<String> leaves) {
    return leaves.isEmpty()
        || path.endsWith("]")
        || leaves.stream().anyMatch(leaf -> (path + ".").contains("." + leaf + "."));
  }
}
