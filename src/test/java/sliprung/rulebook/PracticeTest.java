package sliprung.rulebook;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import sliprung.fixture.StarterText;
import sliprung.rulebook.catalogue.Catalogue;

class PracticeTest {
  private static final Set<String> MARKS =
      Set.of("verified", "from memory", "common practice", "ours");

  @ParameterizedTest
  @ValueSource(strings = {"iec", "nec"})
  void every_figure_has_its_clause_and_its_mark(String name) {
    Practice practice = Practice.named(name);

    assertThat(practice.figures()).hasSizeGreaterThan(20);
    practice
        .figures()
        .forEach(
            (key, figure) -> {
              assertThat(figure.key()).isEqualTo(key);
              assertThat(figure.value()).as(key).isFinite();
              assertThat(figure.clause()).as(key).isNotBlank();
              assertThat(figure.mark()).as(key).isIn(MARKS);
            });
  }

  @ParameterizedTest
  @ValueSource(strings = {"iec", "nec"})
  void every_wanted_margin_belongs_to_a_rule_and_asks_for_the_limit_at_least(String name) {
    Practice.named(name).figures().values().stream()
        .filter(f -> f.key().startsWith("wanted."))
        .forEach(
            f -> {
              assertThat(Catalogue.names()).contains(f.key().substring("wanted.".length()));
              assertThat(f.value()).as(f.key()).isGreaterThanOrEqualTo(1.0);
            });
  }

  /** The margins that the rule book names. */
  @ParameterizedTest
  @CsvSource({
    "trip/start, 1.10",
    "trip/running, 1.10",
    "held/exposure, 1.25",
    "locked/sequence, 1.25",
    "locked/step, 1.25",
    "locked/shorted, 1.25",
    "locked/breakaway, 1.10",
    "sequence/supervision, 1.10",
    "resistor/start, 1.10",
    "contactor/making, 1.00",
    "contactor/breaking, 1.00"
  })
  void wanted_margins_are_those_of_the_book(String rule, double wanted) {
    assertThat(Practice.named("iec").figure("wanted." + rule).value()).isEqualTo(wanted);
    assertThat(Practice.named("nec").figure("wanted." + rule).value()).isEqualTo(wanted);
  }

  /** Whatever answers by a margin can be asked what it wants. */
  @ParameterizedTest
  @ValueSource(strings = {"iec", "nec"})
  void a_rule_that_answers_by_a_margin_has_a_wanted_one(String name) {
    StarterText text =
        StarterText.small()
            .with("practice: iec", "practice: " + name)
            .with("{contactor: K12, after: 2 s}", "{contactor: K12, rotor-below: 80 A}")
            .under("F2:", "  F4: {kind: instantaneous, pick-up: 200 A, trips: Q1}");
    Practice practice = Practice.named(name);
    Set<String> byMargin =
        new java.util.TreeSet<>(
            text.review().findings().stream()
                .filter(f -> f.margin().isPresent())
                .map(Finding::rule)
                .toList());

    assertThat(byMargin).hasSizeGreaterThan(12);
    assertThat(byMargin).allMatch(rule -> practice.find("wanted." + rule).isPresent());
  }

  @Test
  void a_figure_that_is_not_there_is_a_defect() {
    Practice iec = Practice.named("iec");

    assertThat(iec.find("nothing")).isEmpty();
    assertThatThrownBy(() -> iec.figure("nothing")).isInstanceOf(IllegalStateException.class);
    assertThatThrownBy(() -> Practice.named("none")).isInstanceOf(IllegalStateException.class);
  }
}
