package sliprung.record;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import sliprung.chart.Picture;
import sliprung.chart.Svg;
import sliprung.review.Review;

/** Writes the record of a review into a directory: every file of it or none. */
public final class RecordWriter {
  private RecordWriter() {}

  /**
   * Every file of a record by its name, not yet written. What takes longest is made beside the
   * rest.
   *
   * @param paper of the PDF; empty: no PDF
   */
  public static Map<String, byte[]> files(Dossier dossier, Optional<Paper> paper) {
    Review review = dossier.review();
    CompletableFuture<String> json =
        CompletableFuture.supplyAsync(
            () ->
                ReviewJson.text(
                    review, dossier.inputs(), dossier.program(), dossier.measureFirst()));
    Contents contents = Contents.of(dossier);
    Optional<CompletableFuture<byte[]>> pdf =
        paper.map(p -> CompletableFuture.supplyAsync(() -> ReviewPdf.bytes(contents, p)));
    Map<String, String> drawn = contents.pictures().drawn();
    Map<String, String> texts = new LinkedHashMap<>();
    texts.put("review.html", ReviewHtml.text(contents, drawn));
    texts.put("review.json", json.join());
    texts.put("profile.csv", ProfileCsv.text(review));
    for (Picture picture : contents.pictures().all()) {
      texts.put(picture.name() + ".svg", Svg.file(picture, drawn.get(picture.name())));
    }
    Map<String, byte[]> files = new LinkedHashMap<>();
    texts.forEach((name, text) -> files.put(name, text.getBytes(StandardCharsets.UTF_8)));
    pdf.ifPresent(p -> files.put("review.pdf", p.join()));
    return files;
  }

  /**
   * Writes the files into a directory, which is made where it is missing. Files of the same name
   * are replaced; if anything fails, everything is as it was.
   */
  public static void write(Path directory, Map<String, byte[]> files) throws IOException {
    write(Map.of(directory, files));
  }

  /**
   * Writes the records of several reviews: every file of every record, or none.
   *
   * @param records the files of each record by the directory that it goes into
   */
  public static void write(Map<Path, Map<String, byte[]>> records) throws IOException {
    WholeOrNothing.write(records);
  }
}
