package sliprung.record;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Finding;

/** Which of the computed starts a record keeps: the nominal ones and those that decided. */
final class RecordedStarts {
  private RecordedStarts() {}

  /** Nominal starts in the review's order, then deciding ones in the findings' order, each once. */
  static List<ComputedStart> of(Review review) {
    Map<String, ComputedStart> kept = new LinkedHashMap<>();
    for (ComputedStart start : review.starts()) {
      if (start.corner().isNominal()) {
        kept.putIfAbsent(start.id(), start);
      }
    }
    for (Finding finding : review.findings()) {
      finding.start().ifPresent(s -> kept.putIfAbsent(s.id(), s));
    }
    return new ArrayList<>(kept.values());
  }
}
