package sliprung.sensitivity;

import java.util.List;
import sliprung.rulebook.Finding;

/**
 * A thin margin and what moves it.
 *
 * @param finding the thinnest of its rule
 * @param inputs that move it, the furthest first; none: no uncertain input does
 */
public record ThinMargin(Finding finding, List<Sensitivity> inputs) {

  /** Copies the list. */
  public ThinMargin {
    inputs = List.copyOf(inputs);
  }

  /** Subject and rule, then what to measure first. */
  public String named() {
    return finding.subject() + ", " + finding.rule() + ". " + says();
  }

  /** What to measure first, in a sentence. */
  public String says() {
    return inputs.isEmpty()
        ? "Within what its evidence leaves open no input moves it by as much as half a per cent of the"
            + " wanted margin."
        : inputs.get(0).says();
  }
}
