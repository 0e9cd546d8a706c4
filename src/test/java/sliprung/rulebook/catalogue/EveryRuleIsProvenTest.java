package sliprung.rulebook.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Practice;
import sliprung.rulebook.Rule;
import sliprung.rulebook.catalogue.RuleCase.Kind;

/**
 * The proof of the whole rule book: every rule that the book names has its page, its reference and
 * its cases, every case gives its verdict, and every figure of a practice, moved by one per cent,
 * turns at least one of them.
 */
class EveryRuleIsProvenTest {
  private static final List<RuleCase> CASES = new ArrayList<>();

  static {
    lines("cases").map(RuleCase::of).forEach(CASES::add);
    CASES.addAll(TabledCases.all());
  }

  private static Map<RuleCase, Object> outcomes;

  /**
   * Judges every case. Cases of one starter share its facts, starters are computed side by side:
   * not in a static initializer, where the others would wait for this class and it for them.
   */
  @BeforeAll
  static void judgeEveryCase() {
    outcomes =
        CASES.stream()
            .collect(Collectors.groupingBy(RuleCase::starterKey, TreeMap::new, Collectors.toList()))
            .values()
            .parallelStream()
            .flatMap(EveryRuleIsProvenTest::judged)
            .collect(
                Collectors.toConcurrentMap(Map.Entry::getKey, Map.Entry::getValue, (a, b) -> a));
  }

  /** An outcome for each, or what was thrown instead: a broken case fails as itself. */
  private static Stream<Map.Entry<RuleCase, Object>> judged(List<RuleCase> ofOneStarter) {
    try {
      Facts facts = ofOneStarter.get(0).compute();
      List<Map.Entry<RuleCase, Object>> all = new ArrayList<>();
      ofOneStarter.forEach(c -> all.add(Map.entry(c, c.judge(facts))));
      return all.stream();
    } catch (RuntimeException e) {
      return ofOneStarter.stream().map(c -> Map.entry(c, e));
    }
  }

  private static RuleCase.Outcome outcome(RuleCase of) {
    Object outcome = outcomes.get(of);
    if (outcome instanceof RuntimeException e) {
      throw new AssertionError(of + ": " + e.getMessage(), e);
    }
    return (RuleCase.Outcome) outcome;
  }

  private static final List<String> HEADINGS =
      List.of(
          "## What it checks",
          "## Why it matters",
          "## Formula and symbols",
          "## Source",
          "## Inputs",
          "## Example that passes",
          "## Example that fails",
          "## What to change",
          "## When a deviation is reasonable",
          "## Limits");

  /** Lines of a resource that say something. */
  private static Stream<String> lines(String resource) {
    String path = "/rule-book/" + resource + ".txt";
    try (InputStream in =
        Objects.requireNonNull(EveryRuleIsProvenTest.class.getResourceAsStream(path), path)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines().filter(l -> !l.isBlank() && !l.startsWith("#")).toList().stream();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** A table of a word and a reason, both behind a bar each. */
  private static Map<String, String> reasons(String resource) {
    return lines(resource)
        .map(l -> l.split("\\|", 2))
        .collect(
            Collectors.toMap(
                c -> c[0].strip(), c -> c[1].strip(), (a, b) -> a + "; " + b, TreeMap::new));
  }

  @Test
  void the_catalogue_is_the_list_of_the_book() {
    List<String> book = lines("rules").map(String::strip).toList();

    assertThat(book).doesNotHaveDuplicates();
    assertThat(Catalogue.built().keySet()).containsExactlyInAnyOrderElementsOf(book);
    assertThat(Catalogue.notBuilt()).isEmpty();
  }

  @TestFactory
  Stream<DynamicTest> every_rule_has_its_page_its_reference_and_its_cases() {
    Map<String, String> without = reasons("without");
    return lines("rules")
        .map(String::strip)
        .map(
            rule ->
                DynamicTest.dynamicTest(
                    rule,
                    () -> {
                      Rule.Info info = Catalogue.built().get(rule);
                      assertThat(info.question()).endsWith("?");
                      assertThat(info.reference()).isNotBlank();
                      String page = Catalogue.page(rule).orElseThrow();
                      assertThat(page.lines().filter(l -> l.startsWith("## ")))
                          .containsExactlyElementsOf(HEADINGS);
                      Set<Kind> kinds = EnumSet.noneOf(Kind.class);
                      CASES.stream()
                          .filter(c -> c.rule().equals(rule))
                          .forEach(c -> kinds.add(c.kind()));
                      for (Kind kind : Kind.values()) {
                        String key = rule + " " + kind.word();
                        assertThat(kinds.contains(kind))
                            .as("%s: either a case or a reason why there is none", key)
                            .isNotEqualTo(without.containsKey(key));
                      }
                    }));
  }

  @TestFactory
  Stream<DynamicTest> every_case_gives_its_verdict() {
    return CASES.stream()
        .map(
            c ->
                DynamicTest.dynamicTest(
                    c.toString(), () -> assertThat(outcome(c).verdict()).isEqualTo(c.expected())));
  }

  /** A limit whose cases inside and outside gave one verdict would prove nothing. */
  @Test
  void inside_and_outside_differ() {
    Map<String, Set<String>> verdicts = new TreeMap<>();
    for (RuleCase one : CASES) {
      if (one.kind() == Kind.INSIDE || one.kind() == Kind.OUTSIDE) {
        verdicts.computeIfAbsent(one.rule(), r -> new TreeSet<>()).add(one.expected());
      }
    }
    assertThat(verdicts).hasSizeGreaterThan(45);
    verdicts.forEach((rule, seen) -> assertThat(seen).as(rule).hasSizeGreaterThan(1));
  }

  /**
   * Every figure of either practice is moved up and down by one per cent; each of the two turns a
   * case that names the figure, but for what is listed with its reason.
   */
  @TestFactory
  Stream<DynamicTest> every_figure_of_a_practice_moved_by_one_per_cent_turns_a_case() {
    Map<String, String> unmoved = reasons("unmoved");
    Set<String> keys = new TreeSet<>(Practice.named("iec").figures().keySet());
    keys.addAll(Practice.named("nec").figures().keySet());
    assertThat(keys)
        .containsAll(unmoved.keySet().stream().map(k -> k.replaceAll("[+-]$", "")).toList());
    return keys.stream()
        .map(
            key ->
                DynamicTest.dynamicTest(
                    key,
                    () -> {
                      turns(key, "+", unmoved);
                      turns(key, "-", unmoved);
                    }));
  }

  private static void turns(String key, String sign, Map<String, String> unmoved) {
    List<RuleCase> named =
        CASES.stream()
            .filter(c -> c.turns().contains(key) || c.turns().contains(key + sign))
            .toList();
    boolean turned = false;
    for (RuleCase one : named) {
      turned |= !outcome(one).moved().get(key + sign).equals(one.expected());
    }
    assertThat(turned)
        .as("%s%s: either a case that turns or a reason why none does", key, sign)
        .isNotEqualTo(unmoved.containsKey(key) || unmoved.containsKey(key + sign));
  }
}
