package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import sliprung.review.CrusherReview;
import sliprung.review.Question;
import sliprung.review.Review;

class ReviewHtmlTest {
  private static final List<InputFile> INPUTS =
      List.of(new InputFile("crusher.yaml", "00ff", "starter: <b>\n  <![CDATA[ x ]]>\n"));
  private static final String PAGE = page(CrusherReview.plain());

  @Test
  void should_be_well_formed_with_hostile_text_everywhere() {
    String page = ReviewHtml.text(Dossiers.hostile());
    Document document = Parsed.xml(page);
    assertThat(Parsed.elements(document))
        .extracting(Element::getTagName)
        .doesNotContain("img", "iframe", "object", "link")
        .filteredOn("script"::equals)
        .hasSize(1);
    assertThat(page.split("<script", -1)).hasSize(2);
    assertThat(document.getElementsByTagName("script").item(0).getTextContent())
        .isEqualTo(PageScript.text());
    assertThat(page).doesNotContain("<img").doesNotContain("\u0000").doesNotContain("\u001b");
    assertThat(page).doesNotContain("\u202E");
    assertThat(document.getElementsByTagName("h1").item(0).getTextContent())
        .startsWith("<script>alert(1)</script> ]]> \" ' &");
  }

  @Test
  void should_carry_no_way_to_run_or_load_anything() {
    Document document = Parsed.xml(PAGE);
    for (Element element : Parsed.elements(document)) {
      for (int i = 0; i < element.getAttributes().getLength(); i++) {
        String name = element.getAttributes().item(i).getNodeName();
        assertThat(name).doesNotStartWith("on").isNotIn("src", "style", "srcset", "action");
        if (name.equals("href")) {
          assertThat(element.getAttribute(name)).startsWith("#");
        }
      }
    }
    assertThat(PAGE).contains("default-src 'none'".replace("'", "&#39;"));
    assertThat(document.getElementsByTagName("style").item(0).getTextContent())
        .doesNotContain("url(")
        .doesNotContain("@import");
  }

  @Test
  void should_allow_exactly_the_style_it_carries() throws Exception {
    String style = Parsed.xml(PAGE).getElementsByTagName("style").item(0).getTextContent();
    byte[] hash =
        java.security.MessageDigest.getInstance("SHA-256")
            .digest(style.getBytes(java.nio.charset.StandardCharsets.UTF_8));
    assertThat(PAGE).contains("sha256-" + java.util.Base64.getEncoder().encodeToString(hash));
  }

  @Test
  void should_allow_exactly_the_script_it_carries() throws Exception {
    Document document = Parsed.xml(PAGE);
    String script = document.getElementsByTagName("script").item(0).getTextContent();
    byte[] hash =
        java.security.MessageDigest.getInstance("SHA-256")
            .digest(script.getBytes(java.nio.charset.StandardCharsets.UTF_8));
    String policy =
        Parsed.elements(document).stream()
            .filter(e -> e.getAttribute("http-equiv").equals("Content-Security-Policy"))
            .findFirst()
            .orElseThrow()
            .getAttribute("content");
    assertThat(policy)
        .contains("script-src 'sha256-" + java.util.Base64.getEncoder().encodeToString(hash) + "';")
        .doesNotContain("unsafe");
  }

  @Test
  void should_let_every_chart_be_reached_by_keyboard_and_say_its_name() {
    List<Element> charts =
        Parsed.elements(Parsed.xml(PAGE)).stream()
            .filter(e -> e.hasAttribute("data-frames"))
            .toList();
    assertThat(charts).hasSize(7);
    for (Element chart : charts) {
      Element box = (Element) chart.getParentNode();
      assertThat(box.getAttribute("tabindex")).isEqualTo("0");
      assertThat(box.getAttribute("role")).isEqualTo("group");
      assertThat(box.getAttribute("aria-label")).isNotBlank();
      assertThat(((Element) box.getParentNode()).getTagName()).isEqualTo("figure");
    }
  }

  @Test
  void should_ask_the_four_questions_in_their_order_before_anything_else() {
    List<String> headings =
        Parsed.elements(Parsed.xml(PAGE)).stream()
            .filter(e -> e.getTagName().equals("h2"))
            .map(Element::getTextContent)
            .toList();
    for (Question question : Question.values()) {
      assertThat(headings.get(question.ordinal())).contains(question.words());
    }
  }

  @Test
  void should_name_every_id_once_and_link_to_what_exists() {
    List<Element> elements = Parsed.elements(Parsed.xml(PAGE));
    List<String> ids =
        elements.stream().map(e -> e.getAttribute("id")).filter(i -> !i.isEmpty()).toList();
    assertThat(ids).doesNotHaveDuplicates();
    Set<String> targets =
        elements.stream()
            .filter(e -> e.getTagName().equals("a"))
            .map(e -> e.getAttribute("href").substring(1))
            .collect(Collectors.toSet());
    assertThat(targets).isNotEmpty();
    assertThat(ids).containsAll(targets);
  }

  @Test
  void should_head_every_column_and_caption_or_name_every_table() {
    for (Element element : Parsed.elements(Parsed.xml(PAGE))) {
      if (element.getTagName().equals("table")) {
        boolean named =
            !element.getAttribute("aria-label").isEmpty()
                || element.getElementsByTagName("caption").getLength() == 1;
        assertThat(named).isTrue();
      }
      if (element.getTagName().equals("th")) {
        assertThat(element.getAttribute("scope")).isIn("row", "col");
      }
    }
  }

  @Test
  void should_say_what_is_missing_and_what_is_never_judged() {
    String text = Parsed.xml(PAGE).getDocumentElement().getTextContent();
    assertThat(text)
        .contains("Missing: motor.rings-at-rest.")
        .contains("a lifted brush are not computed")
        .contains("contactor/welded")
        .contains("no overload relay in the rotor")
        .contains("resistors.enclosure")
        .contains("Accepted by plant engineer until 2027-06-30.")
        .contains("<![CDATA[ x ]]>")
        .contains("00ff");
  }

  @Test
  void should_never_round_a_use_to_one() {
    assertThat(ProtectionPart.use(0.9999)).isEqualTo("0.999");
    assertThat(ProtectionPart.use(1.0001)).isEqualTo("1.001");
    assertThat(ProtectionPart.use(1.0)).isEqualTo("1.00");
    assertThat(ProtectionPart.use(0.26)).isEqualTo("0.26");
  }

  @Test
  void should_write_the_same_bytes_twice() {
    assertThat(page(CrusherReview.plain())).isEqualTo(PAGE);
  }

  private static String page(Review review) {
    return ReviewHtml.text(new Dossier(review, INPUTS, List.of(), List.of(), "0.1.0"));
  }
}
