package sliprung.chart;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import sliprung.record.Parsed;
import sliprung.review.CrusherReview;
import sliprung.review.Review;

class SvgTest {
  private static final Review REVIEW = CrusherReview.plain();
  private static final Band BAND =
      new Band(
          "F3 <b> & \u0001",
          new double[] {250, 500, 5000},
          new double[] {Double.POSITIVE_INFINITY, 3, 0.1},
          new double[] {Double.POSITIVE_INFINITY, 3.5, 0.15},
          new double[] {Double.POSITIVE_INFINITY, 4, 0.2});

  private static List<Picture> pictures() {
    return List.of(
        FirstLimitDrawing.picture(FirstLimitChart.of(REVIEW)),
        StartDrawing.picture(StartOverTime.of(REVIEW).orElseThrow()),
        TimeCurrentDrawing.picture(TimeCurrentSheet.of(REVIEW, List.of(BAND))),
        MarginDrawing.pictures(MarginOverview.of(REVIEW)).get(0),
        TorqueSpeedDrawing.picture(TorqueSpeed.of(REVIEW).orElseThrow()),
        UseDrawing.picture(UseOverTime.of(REVIEW).orElseThrow()),
        SectionDrawing.picture(SectionLevels.of(REVIEW).orElseThrow()));
  }

  @Test
  void should_be_well_formed_and_scale() {
    for (Picture picture : pictures()) {
      Element root = Parsed.xml(Svg.inline(picture)).getDocumentElement();
      assertThat(root.getTagName()).isEqualTo("svg");
      assertThat(root.getAttribute("viewBox"))
          .isEqualTo("0 0 " + picture.width() + " " + picture.height());
      Parsed.xml(Svg.file(picture));
    }
  }

  @Test
  void should_carry_title_and_sentence_for_those_who_cannot_see_it() {
    for (Picture picture : pictures()) {
      Element root = Parsed.xml(Svg.inline(picture)).getDocumentElement();
      assertThat(root.getElementsByTagName("title").item(0).getTextContent())
          .isEqualTo(picture.title());
      assertThat(root.getElementsByTagName("desc").item(0).getTextContent())
          .isEqualTo(picture.says());
    }
  }

  @Test
  void should_stand_inside_a_page_without_document_type_or_foreign_ids() {
    for (Picture picture : pictures()) {
      String svg = Svg.inline(picture);
      assertThat(svg).startsWith("<svg").doesNotContain("DOCTYPE").doesNotContain("<?xml");
      Document document = Parsed.xml(svg);
      assertThat(Parsed.elements(document))
          .extracting(e -> e.getAttribute("id"))
          .filteredOn(id -> !id.isEmpty())
          .allSatisfy(id -> assertThat(id).startsWith(picture.name()));
    }
  }

  @Test
  void should_write_words_as_words_and_hostile_ones_too() {
    String svg = Svg.inline(pictures().get(2));
    Document document = Parsed.xml(svg);
    assertThat(document.getDocumentElement().getTextContent())
        .contains("F3 <b> & \uFFFD")
        .contains("stator current, A RMS");
    assertThat(svg).doesNotContain("<b>");
  }

  @Test
  void should_mark_lines_with_the_axes_they_belong_to() throws Exception {
    for (Picture picture : pictures()) {
      Element root = Parsed.xml(Svg.inline(picture)).getDocumentElement();
      JsonNode frames = new ObjectMapper().readTree(root.getAttribute("data-frames"));
      for (JsonNode frame : frames) {
        assertThat(frame.get("x").size()).isEqualTo(5);
        assertThat(frame.get("x").get(1).asDouble())
            .isGreaterThan(frame.get("x").get(0).asDouble());
        // up is down on a screen
        assertThat(frame.get("y").get(1).asDouble()).isLessThan(frame.get("y").get(0).asDouble());
      }
      List<Element> marked =
          Parsed.elements(root.getOwnerDocument()).stream()
              .filter(e -> e.getAttribute("class").equals("series"))
              .toList();
      assertThat(marked).as(picture.name()).isNotEmpty();
      for (Element element : marked) {
        assertThat(element.getAttribute("data-series")).isNotBlank();
        if (element.hasAttribute("data-frame")) {
          assertThat(Integer.parseInt(element.getAttribute("data-frame")))
              .isBetween(0, frames.size() - 1);
          assertThat(element.getAttribute("data-line")).isNotBlank();
        }
      }
    }
  }

  @Test
  void should_mark_a_hostile_name_as_plain_text() {
    Document document = Parsed.xml(Svg.inline(pictures().get(2)));
    assertThat(Parsed.elements(document))
        .extracting(e -> e.getAttribute("data-line"))
        .contains("F3 <b> & \uFFFD, fast");
  }

  @Test
  void should_let_a_marked_line_be_read_back_as_its_value() throws Exception {
    Picture picture = StartOverTime.of(REVIEW).map(StartDrawing::picture).orElseThrow();
    Element root = Parsed.xml(Svg.inline(picture)).getDocumentElement();
    JsonNode frames = new ObjectMapper().readTree(root.getAttribute("data-frames"));
    Element line =
        Parsed.elements(root.getOwnerDocument()).stream()
            .filter(e -> e.getAttribute("data-line").equals("stator current"))
            .findFirst()
            .orElseThrow();
    JsonNode y = frames.get(Integer.parseInt(line.getAttribute("data-frame"))).get("y");
    String[] numbers = line.getAttribute("d").substring(1).split("[L ]");
    double share =
        (Double.parseDouble(numbers[1]) - y.get(0).asDouble())
            / (y.get(1).asDouble() - y.get(0).asDouble());
    double amps = y.get(2).asDouble() + share * (y.get(3).asDouble() - y.get(2).asDouble());
    double first =
        REVIEW.start("cold").orElseThrow().history().stages().get(0).trace().statorAmps()[0];
    assertThat(amps).isCloseTo(first, org.assertj.core.api.Assertions.within(0.005 * first));
  }

  @Test
  void should_write_the_same_bytes_twice() {
    List<Picture> once = pictures();
    List<Picture> twice = pictures();
    for (int i = 0; i < once.size(); i++) {
      assertThat(Svg.file(twice.get(i))).isEqualTo(Svg.file(once.get(i)));
    }
  }
}
