package sliprung.config;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Set;
import java.util.stream.Collectors;
import sliprung.starter.Starter;

/** Starter files of the test resources, and the reader for them. */
final class StarterFiles {
  static final StarterReader READER =
      new StarterReader(
          CurveLibraryReader.builtIn(), Set.of("trip/start", "held/exposure", "locked/sequence"));

  private StarterFiles() {}

  static String text(String resource) {
    try {
      return Files.readString(Path.of("src/test/resources", resource));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static String winch() {
    return text("starters/winch.yaml");
  }

  /** The sound winch with some text replaced, once. */
  static String winchWith(String... oldAndNew) {
    String text = winch();
    for (int i = 0; i < oldAndNew.length; i += 2) {
      if (!text.contains(oldAndNew[i])) {
        throw new IllegalArgumentException("the winch has no '" + oldAndNew[i] + "'");
      }
      text =
          text.replaceFirst(
              java.util.regex.Pattern.quote(oldAndNew[i]),
              java.util.regex.Matcher.quoteReplacement(oldAndNew[i + 1]));
    }
    return text;
  }

  static StarterReading read(String text) {
    return READER.read("winch.yaml", text, CurveFiles.NONE);
  }

  /** Reads a sound text; a mistake fails the test with its message. */
  static Starter starter(String text) {
    StarterReading reading = read(text);
    return reading
        .described()
        .map(StarterReading.Described::starter)
        .orElseThrow(
            () ->
                new AssertionError(
                    reading.diagnostics().stream()
                        .map(Diagnostic::render)
                        .collect(Collectors.joining())));
  }
}
