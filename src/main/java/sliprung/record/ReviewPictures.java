package sliprung.record;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sliprung.chart.Band;
import sliprung.chart.FirstLimitChart;
import sliprung.chart.FirstLimitDrawing;
import sliprung.chart.MarginDrawing;
import sliprung.chart.MarginOverview;
import sliprung.chart.Picture;
import sliprung.chart.SectionDrawing;
import sliprung.chart.SectionLevels;
import sliprung.chart.StartDrawing;
import sliprung.chart.StartOverTime;
import sliprung.chart.Svg;
import sliprung.chart.TimeCurrentDrawing;
import sliprung.chart.TimeCurrentSheet;
import sliprung.chart.TorqueSpeed;
import sliprung.chart.TorqueSpeedDrawing;
import sliprung.chart.UseDrawing;
import sliprung.chart.UseOverTime;
import sliprung.review.Review;

/**
 * The charts of a review.
 *
 * @param firstLimit for each fault, who is first
 * @param margins every margin against the wanted one
 * @param start the nominal cold start over time, where it was computed
 * @param torque torque against speed, likewise
 * @param use use of every device over time, likewise
 * @param timeCurrent devices and starts on one sheet
 * @param sections temperatures of the bank's sections, where one has data
 */
record ReviewPictures(
    Picture firstLimit,
    List<Picture> margins,
    Optional<Picture> start,
    Optional<Picture> torque,
    Optional<Picture> use,
    Picture timeCurrent,
    Optional<Picture> sections) {

  static ReviewPictures of(Review review, FirstLimitChart firstLimit, List<Band> bands) {
    return new ReviewPictures(
        FirstLimitDrawing.picture(firstLimit),
        MarginDrawing.pictures(MarginOverview.of(review)),
        StartOverTime.of(review).map(StartDrawing::picture),
        TorqueSpeed.of(review).map(TorqueSpeedDrawing::picture),
        UseOverTime.of(review).map(UseDrawing::picture),
        TimeCurrentDrawing.picture(TimeCurrentSheet.of(review, bands)),
        SectionLevels.of(review).map(SectionDrawing::picture));
  }

  /** Every picture there is, in the order of the page. */
  List<Picture> all() {
    List<Picture> all = new ArrayList<>();
    all.add(firstLimit);
    all.addAll(margins);
    start.ifPresent(all::add);
    torque.ifPresent(all::add);
    all.add(timeCurrent);
    use.ifPresent(all::add);
    sections.ifPresent(all::add);
    return all;
  }

  /**
   * Every picture as an {@code svg} element, by its name, in the order of the page. Each is painted
   * on a surface of its own, so they are drawn beside one another.
   */
  Map<String, String> drawn() {
    List<Picture> all = all();
    List<String> elements = all.parallelStream().map(Svg::inline).toList();
    Map<String, String> drawn = new LinkedHashMap<>();
    for (int i = 0; i < all.size(); i++) {
      drawn.put(all.get(i).name(), elements.get(i));
    }
    return drawn;
  }
}
