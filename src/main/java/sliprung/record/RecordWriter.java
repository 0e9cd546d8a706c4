package sliprung.record;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import sliprung.chart.Band;
import sliprung.chart.FirstLimitChart;
import sliprung.chart.Picture;
import sliprung.chart.Svg;
import sliprung.review.Review;

/** Writes the record of a review into a directory: every file of it or none. */
public final class RecordWriter {
  private RecordWriter() {}

  /**
   * Every file of a record by its name, not yet written.
   *
   * @param review what was found
   * @param inputs it was made from
   * @param bands devices that measure stator current, for the time-current sheet
   * @param program version of the program
   */
  public static Map<String, String> files(
      Review review, List<InputFile> inputs, List<Band> bands, String program) {
    Map<String, String> files = new LinkedHashMap<>();
    files.put("review.html", ReviewHtml.text(review, inputs, bands, program));
    files.put("review.json", ReviewJson.text(review, inputs, program));
    files.put("profile.csv", ProfileCsv.text(review));
    for (Picture picture : ReviewPictures.of(review, FirstLimitChart.of(review), bands).all()) {
      files.put(picture.name() + ".svg", Svg.file(picture));
    }
    return files;
  }

  /**
   * Writes the files into a directory, which is made where it is missing. Files of the same name
   * are replaced; if anything fails, everything is as it was.
   */
  public static void write(Path directory, Map<String, String> files) throws IOException {
    Map<String, byte[]> bytes = new LinkedHashMap<>();
    files.forEach((name, text) -> bytes.put(name, text.getBytes(StandardCharsets.UTF_8)));
    WholeOrNothing.write(directory, bytes);
  }
}
