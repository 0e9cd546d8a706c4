package sliprung.rulebook;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import sliprung.protection.Edge;

/**
 * Gathers a finding; the verdict follows from margin and wanted margin, or from what is missing.
 */
public final class FindingBuilder {
  private final Facts facts;
  private final Rule.Info info;
  private final String subject;
  private ComputedStart start;
  private Edge edge;
  private OptionalDouble margin = OptionalDouble.empty();
  private OptionalDouble wanted = OptionalDouble.empty();
  private OptionalDouble limit = OptionalDouble.empty();
  private OptionalDouble value = OptionalDouble.empty();
  private String unit = "";
  private String says = "";
  private String mend = "";
  private String reference;
  private final List<String> missing = new ArrayList<>();

  private FindingBuilder(Facts facts, Rule.Info info, String subject) {
    this.facts = facts;
    this.info = info;
    this.subject = subject;
    this.reference = info.reference();
  }

  /** A finding of a rule about a subject. */
  public static FindingBuilder of(Facts facts, Rule.Info info, String subject) {
    return new FindingBuilder(facts, info, subject);
  }

  /** The start that decided. */
  public FindingBuilder at(ComputedStart decidingStart) {
    this.start = decidingStart;
    return this;
  }

  /** The device edge that decided. */
  public FindingBuilder edge(Edge decidingEdge) {
    this.edge = decidingEdge;
    return this;
  }

  /** The margin, larger is better, 1 at the limit; the wanted one is the rule's own. */
  public FindingBuilder margin(double found) {
    this.margin = OptionalDouble.of(found);
    this.wanted = OptionalDouble.of(facts.wanted(info.name()));
    return this;
  }

  /** Another wanted margin than the rule's own. */
  public FindingBuilder wanted(double wish) {
    this.wanted = OptionalDouble.of(wish);
    return this;
  }

  /** Value found and the limit it is held against. */
  public FindingBuilder figures(double found, double against, String inUnit) {
    this.value = Double.isFinite(found) ? OptionalDouble.of(found) : OptionalDouble.empty();
    this.limit = Double.isFinite(against) ? OptionalDouble.of(against) : OptionalDouble.empty();
    this.unit = inUnit;
    return this;
  }

  /** What happens, in amperes and seconds first. */
  public FindingBuilder says(String sentence) {
    this.says = sentence;
    return this;
  }

  /** What to do or measure next. */
  public FindingBuilder mend(String sentence) {
    this.mend = sentence;
    return this;
  }

  /** A closer reference than the rule's own. */
  public FindingBuilder reference(String text) {
    this.reference = text;
    return this;
  }

  /** Not judged for want of these inputs. */
  public Finding notJudged(List<String> paths, String why) {
    missing.addAll(paths);
    this.says = why;
    this.margin = OptionalDouble.empty();
    this.wanted = OptionalDouble.empty();
    if (mend.isEmpty() && !paths.isEmpty()) {
      this.mend = "Give " + String.join(", ", paths) + ".";
    }
    return build(Verdict.NOT_JUDGED);
  }

  /** Breach below 1, tight below the wanted margin, else clear. */
  public Finding byMargin() {
    double found = margin.orElseThrow();
    if (Double.isNaN(found)) {
      throw new IllegalStateException(info.name() + " " + subject + ": margin is not a number");
    }
    Verdict verdict =
        found < 1.0 ? Verdict.BREACH : found < wanted.orElseThrow() ? Verdict.TIGHT : Verdict.CLEAR;
    return build(verdict);
  }

  /** As {@link #byMargin()}, but at best tight. */
  public Finding byMarginAtBestTight() {
    return build(margin.orElseThrow() < 1.0 ? Verdict.BREACH : Verdict.TIGHT);
  }

  /** A verdict without a margin, or one that the margin alone does not give. */
  public Finding build(Verdict verdict) {
    return new Finding(
        info.name(),
        verdict,
        subject,
        Optional.ofNullable(start),
        Optional.ofNullable(edge),
        margin,
        wanted,
        limit,
        value,
        unit,
        says,
        mend,
        reference,
        missing,
        facts.weakestInput(info, subject),
        Optional.empty(),
        Optional.empty());
  }
}
