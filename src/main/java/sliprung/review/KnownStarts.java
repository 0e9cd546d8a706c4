package sliprung.review;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import sliprung.runup.Scenario;
import sliprung.runup.StartHistory;
import sliprung.starter.Starter;
import sliprung.tolerance.Corner;

/**
 * The histories of one starter, for reviews of others that differ from it in their devices alone: a
 * device does not change a start, it only looks at it. Of any other starter nothing is kept. Safe
 * for several threads.
 */
public final class KnownStarts {
  private final Starter withoutDevices;
  private final Map<Key, StartHistory> histories = new ConcurrentHashMap<>();
  private final Map<String, List<?>> permitted = new ConcurrentHashMap<>();

  private record Key(String circuit, Corner corner, Scenario scenario) {}

  /** Of a starter, as it is set today. */
  public KnownStarts(Starter starter) {
    this.withoutDevices = starter.withProtection(List.of());
  }

  /** Whether the histories of a starter are those of this one. */
  boolean serve(Starter starter) {
    return starter.withProtection(List.of()).equals(withoutDevices);
  }

  /** The permitted starts of every corner with a circuit, computed when first asked for. */
  @SuppressWarnings("unchecked")
  <T> List<T> permitted(String circuit, Supplier<List<T>> compute) {
    List<?> known = permitted.get(circuit);
    if (known == null) {
      // not computeIfAbsent: the computation itself works on several threads
      known = compute.get();
      permitted.putIfAbsent(circuit, known);
    }
    return (List<T>) known;
  }

  /** A failed start, computed when first asked for. */
  StartHistory fault(
      String circuit, Corner corner, Scenario scenario, Supplier<StartHistory> compute) {
    Key key = new Key(circuit, corner, scenario);
    StartHistory known = histories.get(key);
    if (known == null) {
      known = compute.get();
      histories.putIfAbsent(key, known);
    }
    return known;
  }
}
