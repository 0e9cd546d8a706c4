package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Element;
import sliprung.review.BlindSpots;
import sliprung.review.Crusher;
import sliprung.review.CrusherReview;
import sliprung.review.StepReadings;
import sliprung.starter.Starter;

class RecordPartsTest {
  private static final Starter STARTER = Crusher.named("JC-1");
  private static final String PAGE = ReviewHtml.text(Dossiers.plain());

  @Test
  void should_give_every_dial_in_its_own_units() {
    List<DialText> dials = DialText.of(STARTER);
    assertThat(dials).contains(new DialText("K11 step contactor", "timer", "4.2\u00a0s"));
    assertThat(dials).extracting(DialText::setting).anyMatch(s -> s.contains("behind 300/5"));
    assertThat(dials.size()).isGreaterThanOrEqualTo(5 + STARTER.protection().size());
  }

  @Test
  void should_leave_the_columns_for_the_hand_empty() {
    Element sheet =
        Parsed.elements(Parsed.xml(PAGE)).stream()
            .filter(e -> e.getAttribute("id").equals("door"))
            .findFirst()
            .orElseThrow();
    Element body = (Element) sheet.getElementsByTagName("tbody").item(0);
    for (int i = 0; i < body.getElementsByTagName("tr").getLength(); i++) {
      Element row = (Element) body.getElementsByTagName("tr").item(i);
      assertThat(row.getElementsByTagName("td").item(2).getTextContent()).isBlank();
      assertThat(row.getElementsByTagName("td").item(3).getTextContent()).isBlank();
    }
  }

  @Test
  void should_grade_an_input_by_the_nearest_statement_and_bracket_what_is_usual() {
    assertThat(InputsPart.grade(STARTER, "load.inertia")).isEqualTo("estimated");
    assertThat(InputsPart.grade(STARTER, "motor.power")).isEqualTo("(plate)");
    assertThat(InputsPart.grade(STARTER, "steps[2].after")).isEqualTo("(drawing)");
    assertThat(InputsPart.grade(STARTER, "margins.trip/start")).isEmpty();
  }

  @Test
  void should_show_each_input_as_written_beside_what_it_was_taken_for() {
    String text = Parsed.xml(PAGE).getDocumentElement().getTextContent();
    assertThat(text).contains("200 kW").contains("200000\u00a0W").contains("70\u00a0kg·m²");
  }

  @Test
  void should_never_let_a_short_bar_reach_its_mark() {
    assertThat(new MarginBar(0.9999).filled()).isLessThan((MarginBar.WIDTH - 1) / 2.0 - 1.0);
    assertThat(new MarginBar(1.0).filled()).isEqualTo((MarginBar.WIDTH - 1) / 2.0);
    assertThat(new MarginBar(0.0).filled()).isZero();
    assertThat(new MarginBar(80.0).filled()).isEqualTo(MarginBar.WIDTH - 1.0);
    assertThat(new MarginBar(Double.POSITIVE_INFINITY).filled()).isEqualTo(MarginBar.WIDTH - 1.0);
  }

  @Test
  void should_say_what_sees_in_words() {
    assertThat(BlindSpotPart.words(new BlindSpots.Cell(BlindSpots.Sight.SEES, 13.7, 1.0)))
        .isEqualTo("sees in\u00a013.7\u00a0s");
    assertThat(
            BlindSpotPart.words(
                new BlindSpots.Cell(BlindSpots.Sight.BLIND, Double.POSITIVE_INFINITY, 0.001)))
        .isEqualTo("blind in 1\u00a0% of cases");
    assertThat(BlindSpotPart.words(new BlindSpots.Cell(BlindSpots.Sight.LATE, 40.0, 1.0)))
        .isEqualTo("late: 40\u00a0s");
    assertThat(BlindSpotPart.words(new BlindSpots.Cell(BlindSpots.Sight.LIMIT_UNKNOWN, 2.0, 1.0)))
        .doesNotContain("sees in");
  }

  @Test
  void should_order_the_first_start_from_dead_to_loaded() {
    List<CheckList.Item> items =
        CheckList.of(CrusherReview.plain(), StepReadings.of(CrusherReview.plain()));
    assertThat(items.stream().map(CheckList.Item::state).distinct())
        .containsExactly(
            "Isolated, locked, proved dead on both sides",
            "Control voltage on, power isolated",
            "Power on, load off or light",
            "First start on its load");
    // between two leads lie two phases: 2 × (0.1845 + 0.0930 + 0.0469 + 0.0237 + 0.0119) Ω
    assertThat(items).anyMatch(i -> i.expect().contains("0.72\u00a0Ω"));
    // with K12 closed the first two sections are out: 2 × (0.0469 + 0.0237 + 0.0119) Ω
    assertThat(items)
        .anyMatch(i -> i.test().contains("K12") && i.expect().contains("0.165\u00a0Ω"));
    assertThat(items).anyMatch(i -> i.test().contains("F5") && i.expect().contains("K1 opens"));
  }

  @Test
  void should_name_the_record_by_its_inputs_date_and_version() {
    Dossier plain = Dossiers.plain();
    Dossier other =
        new Dossier(
            plain.review(),
            List.of(new InputFile("crusher.yaml", "cd".repeat(32), "")),
            List.of(),
            List.of(),
            "0.1.0");
    assertThat(plain.fingerprint()).matches("[0-9a-f]{12}").isNotEqualTo(other.fingerprint());
    assertThat(Dossiers.plain().fingerprint()).isEqualTo(plain.fingerprint());
  }

  @Test
  void should_break_overlong_words_on_paper_only() {
    String word = "w".repeat(100);
    assertThat(new ScreenFigures(Map.of()).fitted(word)).isEqualTo(word);
    assertThat(new PaperFigures(Paper.A4).fitted(word)).contains("\u200B");
    assertThat(new PaperFigures(Paper.A4).fitted("ordinary words")).isEqualTo("ordinary words");
  }

  @Test
  void should_keep_a_value_without_a_unit_as_it_is() {
    AsRead read = new AsRead("supply.band[1]", "-10 %", OptionalDouble.of(-0.1), "");
    Dossier dossier =
        new Dossier(CrusherReview.plain(), List.of(), List.of(read), List.of(), "0.1.0");
    assertThat(ReviewHtml.text(dossier)).contains("<td class=\"number\">-0.1</td>");
  }
}
