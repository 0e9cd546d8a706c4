package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sliprung.review.CrusherReview;
import sliprung.review.Review;

class ProfileCsvTest {
  private static final Review REVIEW = CrusherReview.plain();
  private static final String TEXT = ProfileCsv.text(REVIEW);

  @Test
  void should_end_every_line_with_cr_lf_and_have_ten_cells_in_it() {
    assertThat(TEXT).endsWith("\r\n");
    for (String line : TEXT.split("\r\n")) {
      assertThat(line.split(",", -1)).hasSize(10);
    }
  }

  @Test
  void should_begin_at_rest_with_the_supply_frequency_in_the_rotor() {
    List<String> lines = List.of(TEXT.split("\r\n"));
    assertThat(lines.get(0)).startsWith("time_s,step,closed_by,speed_rpm,");
    String[] first = lines.get(1).split(",");
    assertThat(first[0]).isEqualTo("0.0");
    assertThat(first[2]).isEqualTo("K1");
    assertThat(first[3]).isEqualTo("0.0");
    assertThat(first[9]).isEqualTo("50.0");
  }

  @Test
  void should_never_hand_a_formula_to_a_spreadsheet() {
    assertThat(ProfileCsv.cell("=1+1")).isEqualTo("'=1+1");
    assertThat(ProfileCsv.cell("@x")).isEqualTo("'@x");
    assertThat(ProfileCsv.cell("+A1")).isEqualTo("'+A1");
    assertThat(ProfileCsv.cell("-A1")).isEqualTo("'-A1");
    assertThat(ProfileCsv.cell("\t=1")).startsWith("'");
  }

  @Test
  void should_quote_what_would_break_a_line() {
    assertThat(ProfileCsv.cell("a,\"b\"")).isEqualTo("\"a,\"\"b\"\"\"");
    assertThat(ProfileCsv.cell("a\nb")).isEqualTo("\"a\nb\"");
    assertThat(ProfileCsv.cell("K11")).isEqualTo("K11");
  }
}
