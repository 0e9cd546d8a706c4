package sliprung.config;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import sliprung.starter.Starter;

/** What came of reading a starter file: a starter, or every mistake of the file. */
public sealed interface StarterReading {

  /** Calls one function or the other. */
  default <R> R fold(Function<Described, R> described, Function<Refused, R> refused) {
    return this instanceof Described d ? described.apply(d) : refused.apply((Refused) this);
  }

  /** The starter; empty after a mistake. */
  default Optional<Described> described() {
    return fold(Optional::of, r -> Optional.empty());
  }

  /** The mistakes by place; none when there is a starter. */
  default List<Diagnostic> diagnostics() {
    return fold(d -> List.of(), Refused::mistakes);
  }

  /**
   * A starter.
   *
   * @param starter as described
   * @param places where each value stands, by its path; list entries count from 1
   * @param values every value as typed and as taken, in the order of the file
   * @param inputs the starter file, then every curve file it names
   */
  record Described(
      Starter starter, Map<String, Place> places, List<ReadValue> values, List<InputFile> inputs)
      implements StarterReading {

    /** Copies the collections. */
    public Described {
      places = Map.copyOf(places);
      values = List.copyOf(values);
      inputs = List.copyOf(inputs);
    }

    /** Where the value of that path stands. */
    public Optional<Place> place(String path) {
      return Optional.ofNullable(places.get(path));
    }
  }

  /**
   * Mistakes.
   *
   * @param mistakes all of the file, by place; at least one
   */
  record Refused(List<Diagnostic> mistakes) implements StarterReading {

    /** Copies the list. */
    public Refused {
      mistakes = List.copyOf(mistakes);
    }
  }
}
