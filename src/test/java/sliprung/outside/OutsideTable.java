package sliprung.outside;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;

/**
 * A table of figures from outside the project: {@code src/test/resources/outside/NAME.csv}.
 *
 * <p>Lines starting with {@code #} come first and say where the figures are from; three are
 * required: {@code # work: …}, {@code # place: …} (table, clause, example, page) and {@code #
 * checked: …} (who looked it up where and when, or {@code from memory}). Then one line of column
 * names, then one line a row: cells separated by commas, trimmed; an empty cell is absent; no cell
 * holds a comma.
 */
public final class OutsideTable {
  private static final List<String> REQUIRED = List.of("work", "place", "checked");

  private final Map<String, String> origin;
  private final List<Row> rows;

  private OutsideTable(Map<String, String> origin, List<Row> rows) {
    this.origin = Map.copyOf(origin);
    this.rows = List.copyOf(rows);
  }

  /** Reads {@code outside/NAME.csv} of the test resources. */
  public static OutsideTable read(String name) {
    String path = "/outside/" + name + ".csv";
    try (InputStream in =
        Objects.requireNonNull(OutsideTable.class.getResourceAsStream(path), path)) {
      return parse(path, new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new IllegalStateException(path, e);
    }
  }

  /** Reads the text of a table; {@code path} appears in messages. */
  static OutsideTable parse(String path, String text) {
    Map<String, String> origin = new LinkedHashMap<>();
    List<Row> rows = new ArrayList<>();
    List<String> columns = null;
    for (String line : text.lines().toList()) {
      if (line.isBlank()) {
        continue;
      }
      if (line.startsWith("#")) {
        int colon = line.indexOf(':');
        if (colon > 0) {
          origin.put(line.substring(1, colon).trim(), line.substring(colon + 1).trim());
        }
        continue;
      }
      List<String> cells = Stream.of(line.split(",", -1)).map(String::trim).toList();
      if (columns == null) {
        columns = cells;
      } else {
        rows.add(row(path, columns, cells));
      }
    }
    for (String key : REQUIRED) {
      if (origin.getOrDefault(key, "").isEmpty()) {
        throw new IllegalStateException(path + ": no line '# " + key + ": …'");
      }
    }
    if (rows.isEmpty()) {
      throw new IllegalStateException(path + ": no rows");
    }
    return new OutsideTable(origin, rows);
  }

  private static Row row(String path, List<String> columns, List<String> cells) {
    if (cells.size() != columns.size()) {
      throw new IllegalStateException(path + ": " + cells.size() + " cells in " + cells);
    }
    Map<String, String> map = new LinkedHashMap<>();
    for (int i = 0; i < cells.size(); i++) {
      map.put(columns.get(i), cells.get(i));
    }
    return new Row(map);
  }

  /** What the {@code #} lines say, by their key. */
  public Map<String, String> origin() {
    return origin;
  }

  /** All rows, one or more. */
  public List<Row> rows() {
    return rows;
  }

  /** One dynamic test a row, named by its first cell; for a method marked {@code @TestFactory}. */
  public Stream<DynamicTest> tests(Consumer<Row> check) {
    return rows.stream().map(row -> DynamicTest.dynamicTest(row.name(), () -> check.accept(row)));
  }

  /**
   * One row.
   *
   * @param cells text by column name
   */
  public record Row(Map<String, String> cells) {

    /** The first cell. */
    public String name() {
      return cells.values().iterator().next();
    }

    /** Whether the cell is there and not empty. */
    public boolean has(String column) {
      return !cells.getOrDefault(column, "").isEmpty();
    }

    /** A cell's text; it must be there. */
    public String text(String column) {
      if (!has(column)) {
        throw new IllegalStateException("no " + column + " in " + cells);
      }
      return cells.get(column);
    }

    /** A cell's number. */
    public double number(String column) {
      return Double.parseDouble(text(column));
    }

    /** A cell's number, or another where the cell is empty. */
    public double numberOr(String column, double otherwise) {
      return has(column) ? number(column) : otherwise;
    }

    /** Half a unit of the last digit printed in a cell: {@code 0.0005} for {@code 1.204}. */
    public double halfLastDigit(String column) {
      return OutsideTable.halfLastDigit(text(column));
    }
  }

  /** Half a unit of the last digit of a printed number. A hair is added for binary rounding. */
  public static double halfLastDigit(String printed) {
    int scale = new java.math.BigDecimal(printed).scale();
    return 0.5000001 * Math.pow(10.0, -scale);
  }
}
