package sliprung.outside;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

class OutsideTableTest {
  private static final String HEADER = "# work: W\n# place: p. 1\n# checked: from memory\n";

  @Test
  void should_read_origin_columns_and_rows() {
    OutsideTable table = OutsideTable.parse("t", HEADER + "case,a,b\nfirst, 1.250 ,\nsecond,2,x\n");
    assertThat(table.origin()).containsEntry("checked", "from memory");
    assertThat(table.rows()).hasSize(2);
    OutsideTable.Row first = table.rows().get(0);
    assertThat(first.name()).isEqualTo("first");
    assertThat(first.number("a")).isEqualTo(1.25);
    assertThat(first.has("b")).isFalse();
    assertThat(first.numberOr("b", 7.0)).isEqualTo(7.0);
    assertThat(table.rows().get(1).text("b")).isEqualTo("x");
  }

  @Test
  void should_take_tolerance_from_printed_digits() {
    assertThat(OutsideTable.halfLastDigit("1.250")).isBetween(0.0005, 0.00050001);
    assertThat(OutsideTable.halfLastDigit("1300")).isBetween(0.5, 0.50001);
    assertThat(OutsideTable.halfLastDigit("1.3E3")).isBetween(50.0, 50.001);
  }

  @Test
  void should_refuse_a_table_that_does_not_name_its_origin() {
    assertThatThrownBy(() -> OutsideTable.parse("t", "# work: W\n# place: p\ncase\nx\n"))
        .hasMessageContaining("checked");
  }

  @Test
  void should_refuse_a_row_of_another_length() {
    assertThatThrownBy(() -> OutsideTable.parse("t", HEADER + "case,a\nx\n"))
        .hasMessageContaining("1 cells");
  }
}
