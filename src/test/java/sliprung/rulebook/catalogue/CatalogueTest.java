package sliprung.rulebook.catalogue;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sliprung.rulebook.Rule;
import sliprung.rulebook.RuleBook;

class CatalogueTest {
  private static final Path PAGES = Path.of("src", "main", "resources", "sliprung", "rules");

  /** Every rule of the book, built or not. */
  private static final Set<String> BOOK =
      Set.of(
          "trip/start",
          "trip/closing-peak",
          "trip/fuse-wear",
          "trip/running",
          "trip/voltage-dip",
          "held/exposure",
          "held/blind",
          "held/opens-what",
          "held/skipped",
          "locked/sequence",
          "locked/step",
          "locked/shorted",
          "locked/running",
          "locked/breakaway",
          "locked/rings",
          "sequence/pull-through",
          "sequence/false-close",
          "sequence/early",
          "sequence/late",
          "sequence/spread",
          "sequence/supervision",
          "sequence/grading",
          "sequence/torque",
          "contactor/line-category",
          "contactor/making",
          "contactor/breaking",
          "contactor/take-over",
          "contactor/carrying",
          "contactor/rotor-making",
          "contactor/rotor-voltage",
          "contactor/operations",
          "contactor/short-circuit",
          "contactor/welded",
          "contactor/order",
          "overload/dial",
          "overload/class",
          "overload/rotor",
          "short-circuit/rating",
          "short-circuit/capacity",
          "short-circuit/minimum",
          "short-circuit/upstream",
          "conductor/ampacity",
          "conductor/withstand",
          "resistor/start",
          "resistor/duty",
          "resistor/fan",
          "resistor/class",
          "resistor/restart",
          "data/nameplate",
          "data/plausible",
          "data/extrapolated",
          "data/assumed",
          "data/accepted");

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

  static Stream<String> built() {
    return Catalogue.built().keySet().stream();
  }

  @Test
  void built_and_not_built_are_the_whole_book_and_no_more() {
    Set<String> all = new TreeSet<>(Catalogue.built().keySet());
    assertThat(all).noneMatch(Catalogue.notBuilt()::containsKey);
    all.addAll(Catalogue.notBuilt().keySet());

    assertThat(all).containsExactlyInAnyOrderElementsOf(BOOK);
    assertThat(Catalogue.names()).containsExactlyElementsOf(all);
  }

  @Test
  void every_rule_that_must_be_judged_is_built() {
    assertThat(Catalogue.built().keySet()).containsAll(RuleBook.MUST_JUDGE);
  }

  @Test
  void rules_are_sorted_by_name_and_each_name_is_its_own() {
    List<String> names = Catalogue.rules().stream().map(r -> r.info().name()).toList();

    assertThat(names).isSorted().doesNotHaveDuplicates();
  }

  @ParameterizedTest
  @MethodSource("built")
  void a_rule_asks_one_question_and_names_its_reference_and_family(String name) {
    Rule.Info info = Catalogue.built().get(name);

    assertThat(info.name()).isEqualTo(name).matches("[a-z-]+/[a-z-]+");
    assertThat(info.family()).isEqualTo(name.substring(0, name.indexOf('/')));
    assertThat(info.question()).endsWith("?").doesNotContain("TODO");
    assertThat(info.reference()).isNotBlank();
  }

  @ParameterizedTest
  @MethodSource("built")
  void a_rule_has_a_page_under_ten_headings_each_with_text(String name) {
    String page = Catalogue.page(name).orElseThrow(() -> new AssertionError("no page"));

    assertThat(page).startsWith("# " + name + "\n");
    List<String> headings = page.lines().filter(l -> l.startsWith("## ")).toList();
    assertThat(headings).containsExactlyElementsOf(HEADINGS);
    String[] bodies = page.split("(?m)^## .*$");
    assertThat(bodies).hasSize(HEADINGS.size() + 1);
    for (int i = 1; i < bodies.length; i++) {
      assertThat(bodies[i].strip()).as(HEADINGS.get(i - 1)).isNotEmpty();
    }
  }

  @Test
  void no_page_stands_without_a_rule() throws IOException {
    List<String> pages = new ArrayList<>();
    try (Stream<Path> files = Files.walk(PAGES)) {
      files
          .filter(f -> f.toString().endsWith(".md"))
          .map(f -> PAGES.relativize(f).toString().replace('\\', '/').replace(".md", ""))
          .forEach(pages::add);
    }

    assertThat(pages).containsExactlyInAnyOrderElementsOf(Catalogue.built().keySet());
  }

  @Test
  void no_page_is_given_for_what_is_no_rule() {
    assertThat(Catalogue.page("held/nonsense")).isEmpty();
    assertThat(Catalogue.page("../practice/common")).isEmpty();
  }
}
