package sliprung.rulebook;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * The figures of one practice: wanted margins and the standards' numbers that rules use, each with
 * its clause and mark. Data, one resource a practice.
 */
public final class Practice {
  private final String name;
  private final Map<String, Figure> figures;

  /**
   * One figure.
   *
   * @param key such as {@code wanted.trip/start} or {@code AC-3.breaking}
   * @param value dimensionless, or in the unit of the key
   * @param clause standard and clause or table
   * @param mark {@code verified}, {@code from memory}, {@code ours} for a wanted margin of our own
   */
  public record Figure(String key, double value, String clause, String mark) {}

  private Practice(String name, Map<String, Figure> figures) {
    this.name = name;
    this.figures = figures;
  }

  /** Reads the practice of that name from the program's resources. */
  public static Practice named(String name) {
    Map<String, Figure> figures = new TreeMap<>();
    read("common", figures);
    read(name, figures);
    return new Practice(name, figures);
  }

  private static void read(String resource, Map<String, Figure> into) {
    String path = "/sliprung/practice/" + resource + ".csv";
    try (InputStream stream = Practice.class.getResourceAsStream(path)) {
      if (stream == null) {
        throw new IllegalStateException("no practice data at " + path);
      }
      BufferedReader reader =
          new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8));
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (line.isBlank() || line.startsWith("#")) {
          continue;
        }
        String[] cells = line.split(";", -1);
        if (cells.length != 4) {
          throw new IllegalStateException(path + ": four cells expected in: " + line);
        }
        Figure figure =
            new Figure(
                cells[0].trim(),
                Double.parseDouble(cells[1].trim()),
                cells[2].trim(),
                cells[3].trim());
        into.put(figure.key(), figure);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Its name, {@code iec} or {@code nec}. */
  public String name() {
    return name;
  }

  /** A figure that must be there. */
  public Figure figure(String key) {
    return find(key).orElseThrow(() -> new IllegalStateException(name + " has no figure " + key));
  }

  /** A figure, if the practice has it. */
  public Optional<Figure> find(String key) {
    return Optional.ofNullable(figures.get(key));
  }

  /**
   * The same practice with another value of one of its figures, as a user's own judgement of a
   * limit would have it.
   *
   * @param key of a figure that is there
   * @param value in place of its own
   */
  public Practice with(String key, double value) {
    Figure own = figure(key);
    Map<String, Figure> changed = new TreeMap<>(figures);
    changed.put(key, new Figure(key, value, own.clause(), own.mark()));
    return new Practice(name, changed);
  }

  /** Every figure by key. */
  public Map<String, Figure> figures() {
    return new TreeMap<>(figures);
  }
}
