package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class PageScriptTest {
  @Test
  void should_stay_plain_text_in_markup() {
    assertThat(PageScript.text()).doesNotContain("<").doesNotContain("&").isNotBlank();
  }

  @Test
  void should_reach_for_nothing_outside_the_page_and_write_no_markup() {
    String without = PageScript.text().replace("http://www.w3.org/2000/svg", "");
    assertThat(without)
        .doesNotContain("http", "fetch", "XMLHttpRequest", "import(", "WebSocket", "eval")
        .doesNotContain("innerHTML", "outerHTML", "insertAdjacent", "document.write", "Function(")
        .doesNotContain("localStorage", "cookie");
  }

  @Test
  void should_stay_small_enough_to_be_read() {
    assertThat(PageScript.text().lines().count()).isLessThanOrEqualTo(150);
  }
}
