package sliprung.record;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import sliprung.chart.Band;
import sliprung.review.Review;
import sliprung.sensitivity.MeasureFirst;

/**
 * Everything that a record is written from.
 *
 * @param review what was found
 * @param inputs files it was made from
 * @param values values of the starter file as typed and as taken
 * @param bands devices that measure stator current, for the time-current sheet
 * @param program version of the program
 * @param measureFirst which inputs to measure first
 */
public record Dossier(
    Review review,
    List<InputFile> inputs,
    List<AsRead> values,
    List<Band> bands,
    String program,
    MeasureFirst measureFirst) {
  private static final int SHORT = 12;

  /** A dossier without what to measure first. */
  public Dossier(
      Review review,
      List<InputFile> inputs,
      List<AsRead> values,
      List<Band> bands,
      String program) {
    this(review, inputs, values, bands, program, MeasureFirst.NONE);
  }

  /** Copies the lists. */
  public Dossier {
    inputs = List.copyOf(inputs);
    values = List.copyOf(values);
    bands = List.copyOf(bands);
  }

  /**
   * A short name of exactly these inputs, this date and this version: the first letters of the
   * SHA-256 over a line for each file (its hash and name), then the date and the version.
   */
  public String fingerprint() {
    StringBuilder lines = new StringBuilder();
    inputs.forEach(f -> lines.append(f.sha256()).append(' ').append(f.name()).append('\n'));
    lines.append(review.date()).append('\n').append(program).append('\n');
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256")
              .digest(lines.toString().getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(hash).substring(0, SHORT);
    } catch (NoSuchAlgorithmException impossible) {
      // every Java has it
      throw new IllegalStateException(impossible);
    }
  }
}
