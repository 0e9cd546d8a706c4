package sliprung.config;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import sliprung.starter.Breaker;
import sliprung.starter.Contactor;

/**
 * What was read of contactors and breakers, for the tags that others name.
 *
 * @param contactors in the file's order
 * @param breakers in the file's order
 * @param unplaced contactors whose place was a mistake
 * @param readable whether the list of tags is complete: otherwise an unknown tag is no mistake
 */
record Switchgear(
    List<Contactor> contactors, List<Breaker> breakers, Set<String> unplaced, boolean readable) {

  Optional<Contactor> contactor(String tag) {
    return contactors.stream().filter(c -> c.tag().equals(tag)).findFirst();
  }

  boolean placeKnown(String tag) {
    return !unplaced.contains(tag);
  }

  boolean has(String tag) {
    return contactor(tag).isPresent() || breakers.stream().anyMatch(b -> b.tag().equals(tag));
  }

  /** For a hint. */
  String contactorTags() {
    return list(contactors.stream().map(Contactor::tag).toList());
  }

  /** For a hint. */
  String tags() {
    return list(
        java.util.stream.Stream.concat(
                contactors.stream().map(Contactor::tag), breakers.stream().map(Breaker::tag))
            .toList());
  }

  private static String list(List<String> tags) {
    return tags.isEmpty() ? "none" : Wording.clip(String.join(", ", tags));
  }
}
