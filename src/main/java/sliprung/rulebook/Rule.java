package sliprung.rulebook;

import java.util.List;

/**
 * One question about a starter. Stateless: facts in, answer out; nothing is computed twice here.
 */
public interface Rule {

  /** What the catalogue says of it. */
  Info info();

  /** Answers. */
  Answer judge(Facts facts);

  /**
   * What the catalogue says of a rule.
   *
   * @param name {@code family/slug}, never reused
   * @param question in one sentence
   * @param reference standard and clause, or {@code common practice}
   * @param inputs paths, or beginnings of paths, of the inputs it rests on; {@code {subject}}
   *     stands for the subject of a finding
   */
  record Info(String name, String question, String reference, List<String> inputs) {

    /** Copies the list. */
    public Info {
      inputs = List.copyOf(inputs);
    }

    /** The part before the slash. */
    public String family() {
      return name.substring(0, name.indexOf('/'));
    }
  }

  /** What a rule answers. */
  sealed interface Answer {

    /**
     * One finding for each subject.
     *
     * @param findings at least one
     */
    record Findings(List<Finding> findings) implements Answer {

      /** Copies the list and refuses silence. */
      public Findings {
        findings = List.copyOf(findings);
        if (findings.isEmpty()) {
          throw new IllegalArgumentException("a rule never passes by silence");
        }
      }
    }

    /**
     * The starter has nothing the rule could ask about.
     *
     * @param because why
     */
    record NotApplicable(String because) implements Answer {}

    /** Findings, or not applicable where there are none. */
    static Answer of(List<Finding> findings, String becauseNone) {
      return findings.isEmpty() ? new NotApplicable(becauseNone) : new Findings(findings);
    }
  }
}
