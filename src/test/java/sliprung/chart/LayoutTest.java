package sliprung.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.List;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.junit.jupiter.api.Test;

/** Labels, axes and texts of charts. */
class LayoutTest {

  @Test
  void should_keep_labels_apart_and_in_their_order() {
    double[] placed = EndLabels.spread(new double[] {50, 52, 10}, 17, 0, 200);
    assertThat(placed[2]).isEqualTo(10);
    assertThat(placed[0]).isEqualTo(50);
    assertThat(placed[1] - placed[0]).isGreaterThanOrEqualTo(17);
  }

  @Test
  void should_push_labels_back_from_the_far_bound() {
    double[] placed = EndLabels.spread(new double[] {99, 100}, 17, 0, 100);
    assertThat(placed[1]).isEqualTo(100);
    assertThat(placed[0]).isEqualTo(83);
  }

  @Test
  void should_number_every_decade_of_an_axis_both_ends_included() {
    DecadeAxis axis = new DecadeAxis("seconds", 0.01, 1000);
    List<NumberTick> ticks =
        axis.refreshTicksVertical(
            new BufferedImage(1, 1, BufferedImage.TYPE_INT_RGB).createGraphics(),
            new Rectangle2D.Double(0, 0, 100, 100),
            RectangleEdge.LEFT);
    assertThat(ticks)
        .filteredOn(t -> t.getTickType() == TickType.MAJOR)
        .extracting(NumberTick::getText)
        .containsExactly("0.01", "0.1", "1", "10", "100", "1\u00a0000");
    assertThat(ticks).filteredOn(t -> t.getTickType() == TickType.MINOR).hasSize(5 * 8);
  }

  @Test
  void should_place_decades_at_even_distances() {
    Frame frame =
        new Frame(
            new Rectangle2D.Double(0, 0, 300, 300),
            new DecadeAxis("A", 1, 1000),
            new DecadeAxis("s", 1, 1000));
    assertThat(frame.x(10)).isEqualTo(100, org.assertj.core.api.Assertions.within(1e-9));
    assertThat(frame.y(100)).isEqualTo(100, org.assertj.core.api.Assertions.within(1e-9));
  }

  @Test
  void should_break_and_cut_text_without_losing_words() {
    assertThat(Lines.broken("one two three", 7)).containsExactly("one two", "three");
    assertThat(Lines.cut("abcdef", 4)).isEqualTo("abc…");
    assertThat(Lines.printable("a\u0000b\nc\uD800")).isEqualTo("a\uFFFDb c\uFFFD");
  }

  @Test
  void should_refuse_a_band_whose_edges_do_not_fit() {
    double[] two = {1, 2};
    assertThatThrownBy(() -> new Band("F1", new double[] {2, 1}, two, two, two))
        .isInstanceOf(IllegalArgumentException.class);
    assertThatThrownBy(() -> new Band("F1", two, new double[] {1}, two, two))
        .isInstanceOf(IllegalArgumentException.class);
  }

  @Test
  void should_name_steps_as_a_range_where_they_follow_each_other() {
    assertThat(TimeCurrentSheet.steps(List.of(2))).isEqualTo("step 2");
    assertThat(TimeCurrentSheet.steps(List.of(1, 2, 3))).isEqualTo("steps 1–3");
    assertThat(TimeCurrentSheet.steps(List.of(1, 3))).isEqualTo("steps 1, 3");
  }
}
