package sliprung.config;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import sliprung.curve.CurveLibrary;

/** Reads a starter file. A mistake of the user's is a {@link Diagnostic}, never an exception. */
public final class StarterReader {
  /** Largest file that is read, bytes: a description has some thousand. */
  static final int LARGEST_BYTES = 1024 * 1024;

  private static final int FORMAT = 1;

  private final CurveLibrary library;
  private final Set<String> knownRules;

  /**
   * A reader.
   *
   * @param library laws and gates a file may name
   * @param knownRules names of rules that {@code margins} may name
   */
  public StarterReader(CurveLibrary library, Set<String> knownRules) {
    this.library = library;
    this.knownRules = Set.copyOf(knownRules);
  }

  /** Reads a file; curve files from its folder or a curves folder. */
  public StarterReading read(Path file) {
    String name = file.toString();
    Place start = new Place(name, 1, 1);
    byte[] bytes;
    try {
      if (!Files.exists(file)) {
        return refused(start, "expected a starter file but found no file of that name");
      }
      if (!Files.isRegularFile(file)) {
        return refused(start, "expected a starter file but found something that is not a file");
      }
      if (Files.size(file) > LARGEST_BYTES) {
        return refused(start, tooLarge());
      }
      bytes = Files.readAllBytes(file);
    } catch (IOException | SecurityException e) {
      return refused(start, "expected a starter file but found one that cannot be read");
    }
    Path folder = file.toAbsolutePath().getParent();
    return read(
        name, bytes, folder == null ? CurveFiles.NONE : new CurveFolder(folder, Path.of("")));
  }

  /**
   * Reads a text in memory.
   *
   * @param name for messages
   * @param text of the file
   * @param curves where curve files come from
   */
  public StarterReading read(String name, String text, CurveFiles curves) {
    SourceText source = SourceText.of(name, text);
    return read(source, text.getBytes(StandardCharsets.UTF_8), curves);
  }

  /**
   * Reads bytes in memory.
   *
   * @param name for messages
   * @param bytes of the file, UTF-8
   * @param curves where curve files come from
   */
  public StarterReading read(String name, byte[] bytes, CurveFiles curves) {
    SourceText.Decoded decoded = SourceText.decode(name, bytes);
    if (decoded.mistake().isPresent()) {
      return new StarterReading.Refused(List.of(decoded.mistake().get()));
    }
    return read(decoded.source(), bytes, curves);
  }

  private StarterReading read(SourceText source, byte[] bytes, CurveFiles curves) {
    if (bytes.length > LARGEST_BYTES) {
      return refused(new Place(source.name(), 1, 1), tooLarge());
    }
    InputFile input = new InputFile(source.name(), bytes, source.text());
    return new StarterAssembly(source, input, library, knownRules, curves).read();
  }

  private static String tooLarge() {
    return "expected a file of at most " + LARGEST_BYTES / 1024 + " KiB but found a larger one";
  }

  private static StarterReading refused(Place place, String message) {
    return new StarterReading.Refused(
        List.of(new Diagnostic(place, "", message, Optional.empty(), "")));
  }

  /** Checks the version of a format. */
  static void version(Field field, String format) {
    String text = field.rawText();
    if (!text.equals(String.valueOf(FORMAT))) {
      field.mistake(
          "expected version "
              + FORMAT
              + " of the "
              + format
              + " format but found "
              + field.value().found());
    }
  }
}
