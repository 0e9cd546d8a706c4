package sliprung.dial;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.AtomicInteger;
import sliprung.starter.Starter;

/** Remembers every judgement and counts how many were really computed. */
public final class CountedEvaluation implements Evaluation {
  private final Evaluation inner;
  private final Map<Starter, Judgement> known = new ConcurrentHashMap<>();
  private final AtomicInteger computed = new AtomicInteger();

  /** Counts what reaches that evaluation. */
  public CountedEvaluation(Evaluation inner) {
    this.inner = inner;
  }

  @Override
  public Judgement at(Starter starter) {
    // not computeIfAbsent: an evaluation is long and works on several threads itself
    Judgement before = known.get(starter);
    if (before != null) {
      return before;
    }
    computed.incrementAndGet();
    Judgement judged = inner.at(starter);
    known.put(starter, judged);
    return judged;
  }

  /** How many settings were computed. */
  public int computed() {
    return computed.get();
  }
}
