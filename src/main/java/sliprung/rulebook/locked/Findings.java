package sliprung.rulebook.locked;

import sliprung.rulebook.Finding;

/** One more sentence on a finding. */
final class Findings {
  private Findings() {}

  static Finding saying(Finding f, String more) {
    return new Finding(
        f.rule(),
        f.verdict(),
        f.subject(),
        f.start(),
        f.edge(),
        f.margin(),
        f.wanted(),
        f.limit(),
        f.value(),
        f.unit(),
        f.says() + more,
        f.mend(),
        f.reference(),
        f.missing(),
        f.weakestInput(),
        f.by(),
        f.until());
  }
}
