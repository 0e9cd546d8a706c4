package sliprung.dial;

import sliprung.starter.Starter;

/**
 * Judges a starter as it is set. The one seam between the searches and the computation: the
 * searches ask nothing else. Must be pure and safe to call from several threads.
 */
@FunctionalInterface
public interface Evaluation {

  /** Every rule's answer about that starter. */
  Judgement at(Starter starter);
}
