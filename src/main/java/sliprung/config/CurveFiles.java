package sliprung.config;

import java.util.Map;

/**
 * Where the curve files that a starter names come from: a folder, or the stored inputs of a record.
 */
@FunctionalInterface
public interface CurveFiles {

  /** None can be reached. */
  CurveFiles NONE = path -> new Refusal("no curve files can be reached from here");

  /**
   * The stored inputs of a record.
   *
   * @param files content by the path as written in the starter file
   */
  static CurveFiles stored(Map<String, byte[]> files) {
    return path ->
        files.containsKey(path)
            ? new Content(files.get(path))
            : new Refusal("no stored file of that name");
  }

  /**
   * Loads one.
   *
   * @param path as written in the starter file
   */
  Loaded load(String path);

  /** A file or the reason why not. */
  sealed interface Loaded {}

  /**
   * A file.
   *
   * @param bytes its content
   */
  record Content(byte[] bytes) implements Loaded {}

  /**
   * Why there is none.
   *
   * @param reason end of a sentence: expected a curve file but …
   */
  record Refusal(String reason) implements Loaded {}
}
