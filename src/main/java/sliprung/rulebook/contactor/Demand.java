package sliprung.rulebook.contactor;

import java.util.Optional;
import sliprung.rulebook.ComputedStart;
import sliprung.rulebook.Verdict;

/**
 * One operation asked of a line contactor against what its categories prove.
 *
 * @param verdict of this operation alone
 * @param margin proven over asked; NaN where nothing proves it at all
 * @param amps asked, RMS
 * @param provenAmps proven, RMS
 * @param says in amperes first
 * @param mend empty where nothing is to mend
 * @param start that decided
 */
record Demand(
    Verdict verdict,
    double margin,
    double amps,
    double provenAmps,
    String says,
    String mend,
    Optional<ComputedStart> start) {

  /** Whether this is worse than another: by verdict, then by margin. */
  boolean isWorseThan(Demand other) {
    int byVerdict = verdict.compareTo(other.verdict);
    return byVerdict != 0 ? byVerdict < 0 : !(margin >= other.margin);
  }
}
